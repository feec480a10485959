/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  serverExternalPackages: ['sequelize', 'graphile-worker', 'piscina', 'pino', '@node-rs/argon2'],
  distDir: process.env.HALFMARK_DIST_DIR ?? '.next',
};

export default config;
