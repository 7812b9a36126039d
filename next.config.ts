import type { NextConfig } from 'next';

/** What every answer carries, pages and files alike; the policy of pages is made in proxy.ts. */
const EVERY_ANSWER = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  {
    key: 'Permissions-Policy',
    value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=(), screen-wake-lock=(self)',
  },
];

/** Data, tiles and built files are never documents of their own. */
const NO_DOCUMENT = [
  {
    key: 'Content-Security-Policy',
    value: "default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
  },
];

const TWO_YEARS_S = 63_072_000;

const config: NextConfig = {
  // These load native code or optional drivers by name, which a bundler can't follow.
  serverExternalPackages: ['sequelize', 'mariadb', '@node-rs/argon2', 'umzug', 'sharp', 'pino'],
  poweredByHeader: false,
  reactStrictMode: true,
  headers: () =>
    Promise.resolve([
      { source: '/:path*', headers: EVERY_ANSWER },
      {
        source: '/:path*',
        // Over plain HTTP a browser ignores it, and a proxy that ends TLS says that it did.
        has: [{ type: 'header', key: 'x-forwarded-proto', value: 'https' }],
        headers: [
          {
            key: 'Strict-Transport-Security',
            value: `max-age=${TWO_YEARS_S}; includeSubDomains`,
          },
        ],
      },
      { source: '/api/:path*', headers: NO_DOCUMENT },
      { source: '/tiles/:path*', headers: NO_DOCUMENT },
      { source: '/_next/static/:path*', headers: NO_DOCUMENT },
    ]),
  turbopack: { root: import.meta.dirname },
};

export default config;
