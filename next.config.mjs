/** What no answer goes without. What depends on where the product runs is in proxy.ts. */
const EVERYWHERE = {
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'same-origin',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Permissions-Policy': ['camera', 'display-capture', 'geolocation', 'microphone', 'payment', 'usb']
    .map((feature) => `${feature}=()`)
    .join(', '),
}

/** What is no page runs nothing and loads nothing, should a browser show it as one. */
const NO_PAGE = { 'Content-Security-Policy': "default-src 'none'; frame-ancestors 'none'" }

const listed = (headers) => Object.entries(headers).map(([key, value]) => ({ key, value }))

/** @type {import('next').NextConfig} */
export default {
  // `npm test` builds beside a product that may be running from .next.
  distDir: process.env.WOADMAP_DIST_DIR ?? '.next',
  poweredByHeader: false,
  reactStrictMode: true,
  devIndicators: false,
  typedRoutes: true,
  // `npm test` and `npm run typecheck` check types; a first start need not wait for it again.
  typescript: { ignoreBuildErrors: true },
  // Sequelize asks for its dialect modules by name at run time; sharp and argon2 are native.
  serverExternalPackages: [
    'sequelize',
    'pg',
    'pg-hstore',
    'pg-boss',
    'sharp',
    'cmu-pronouncing-dictionary',
    '@node-rs/argon2',
    'pino',
  ],
  headers: () => [
    { source: '/:path*', headers: listed(EVERYWHERE) },
    { source: '/:root(api|_next|livez|readyz)/:path*', headers: listed(NO_PAGE) },
    // The address of these pages holds a token: no other page is to learn it.
    {
      source: '/:page(reset-password|confirm|confirm-email|invitations)/:token',
      headers: listed({ 'Referrer-Policy': 'no-referrer' }),
    },
  ],
  experimental: {
    // A CSV of 5,000 shades travels through a server action; photographs never do.
    serverActions: { bodySizeLimit: '3mb' },
    // forbidden() answers 403 with app/forbidden.tsx.
    authInterrupts: true,
  },
}
