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
    '@node-rs/argon2',
    'pino',
  ],
  experimental: {
    // A CSV of 5,000 shades travels through a server action; photographs never do.
    serverActions: { bodySizeLimit: '3mb' },
    // forbidden() answers 403 with app/forbidden.tsx.
    authInterrupts: true,
  },
}
