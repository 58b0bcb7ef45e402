import next from 'eslint-config-next/core-web-vitals';
import nextTypes from 'eslint-config-next/typescript';

const config = [
  {
    ignores: [
      '.next/**',
      'data/**',
      'node_modules/**',
      'coverage/**',
      'next-env.d.ts',
      'db/migrations/**',
      'out/**',
    ],
  },
  ...next,
  ...nextTypes,
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': 'error',
      eqeqeq: ['error', 'always'],
      'no-console': 'error',
      // Photos are private: they never pass through the framework's shared image cache.
      '@next/next/no-img-element': 'off',
    },
  },
  { files: ['scripts/**', 'tests/**', '*.config.*'], rules: { 'no-console': 'off' } },
];

export default config;
