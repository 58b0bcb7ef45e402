import type { NextConfig } from 'next';

/** Headers that never vary; the nonce'd Content-Security-Policy is made per request in proxy.ts. */
const FIXED_HEADERS = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(self), microphone=(), geolocation=()' },
];

const config: NextConfig = {
  output: 'standalone',
  poweredByHeader: false,
  reactStrictMode: true,
  typedRoutes: true,
  // Types are a part of `npm test` over the whole tree; a build does not repeat it.
  typescript: { ignoreBuildErrors: true },
  agentRules: false,
  images: { unoptimized: true },
  serverExternalPackages: [
    'drizzle-orm',
    'rate-limiter-flexible',
    'sharp',
    '@node-rs/argon2',
    'pino',
    'nodemailer',
    'postgres',
    'pg-boss',
  ],
  experimental: { agentUpgrade: false },
  headers: async () => [{ source: '/:path*', headers: FIXED_HEADERS }],
};

export default config;
