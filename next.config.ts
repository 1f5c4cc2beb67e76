import type { NextConfig } from 'next';

const config: NextConfig = {
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
