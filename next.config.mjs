/** Headers that are the same for every answer, uploads and static files included; proxy.ts adds the policy with a nonce. */
const securityHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  {
    key: 'Permissions-Policy',
    value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=(), display-capture=(), browsing-topics=()',
  },
];

/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  // `forbidden()` and its page, so that a refusal is a 403 and not a page of its own making.
  experimental: { authInterrupts: true },
  // `next dev` is met at the same address as the built pages.
  allowedDevOrigins: ['127.0.0.1'],
  serverExternalPackages: ['sequelize', 'graphile-worker', 'piscina', 'esbuild', 'pino', '@node-rs/argon2'],
  distDir: process.env.HALFMARK_DIST_DIR ?? '.next',
  headers: () => Promise.resolve([{ source: '/:path*', headers: securityHeaders }]),
};

export default config;
