import type { NextConfig } from 'next';
import { SECURITY_HEADERS, STRICT_TRANSPORT } from './lib/security/headers';

const config: NextConfig = {
  // Static files do not pass proxy.ts, which dresses everything else.
  headers: () =>
    Promise.resolve([
      {
        source: '/:file(_next/static/.*|icon.svg|favicon.ico|robots.txt)',
        headers: [
          ...Object.entries(SECURITY_HEADERS).map(([key, value]) => ({ key, value })),
          { key: 'content-security-policy', value: "frame-ancestors 'none'" },
          { key: 'strict-transport-security', value: STRICT_TRANSPORT },
        ],
      },
    ]),
  // The tests build beside a running product, never over it.
  distDir: process.env.MARLWICK_BUILD_DIR ?? '.next',
  poweredByHeader: false,
  reactStrictMode: true,
  // Types are checked once, over everything, by `npm run types` (the first stage of `npm test`); the build need not do it again.
  typescript: { ignoreBuildErrors: true },
  // Native and dynamic modules that the bundler must leave to Node.
  serverExternalPackages: [
    'knex',
    'pg',
    'rate-limiter-flexible',
    '@node-rs/argon2',
    'pino',
    'nodemailer',
    'mailparser',
  ],
  // Forms, never files: uploads will have a route of their own.
  experimental: { serverActions: { bodySizeLimit: '512kb' } },
};

export default config;
