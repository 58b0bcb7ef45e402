import next from 'eslint-config-next/core-web-vitals';
import nextTypes from 'eslint-config-next/typescript';

export default [
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
    },
  },
  { files: ['scripts/**', 'tests/**', '*.config.*'], rules: { 'no-console': 'off' } },
];
