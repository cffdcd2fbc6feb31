/** Next.js: what it leaves unbundled, and the headers that are the same on every answer (`proxy.ts` has the others). */

/** @typedef {{ key: string, value: string }} Header */

/** @type {Header[]} */
const PAGE_HEADERS = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  {
    key: 'Permissions-Policy',
    value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=(), browsing-topics=()',
  },
];

/**
 * An answer of the API opened as a page may draw itself (a plate is an SVG with its font inside) and do nothing else.
 * `nosniff` is already in every answer that the API writes.
 *
 * @type {Header[]}
 */
const API_HEADERS = [
  {
    key: 'Content-Security-Policy',
    value:
      "default-src 'none'; style-src 'unsafe-inline'; img-src data:; font-src data:; frame-ancestors 'none'; sandbox",
  },
  { key: 'Referrer-Policy', value: 'no-referrer' },
];

/** @type {import('next').NextConfig} */
const config = {
  poweredByHeader: false,
  compress: true,
  reactStrictMode: true,
  // `npm run check` has a step for types, over the tests too; a build need not repeat it.
  typescript: { ignoreBuildErrors: true },
  serverExternalPackages: ['@electric-sql/pglite', '@resvg/resvg-js', 'pg', 'pino'],
  headers: async () => [
    { source: '/((?!api/).*)', headers: PAGE_HEADERS },
    { source: '/api/:path*', headers: API_HEADERS },
  ],
};

export default config;
