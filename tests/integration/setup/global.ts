const NEEDED = ['DATABASE_URL', 'S3_ENDPOINT', 'S3_BUCKET', 'NEXTAUTH_SECRET']

/**
 * Makes sure that the integration tests stand on the database and the object store that
 * `npm test` makes for them, never on somebody's own.
 * @throws Error saying how to run them
 */
export default function setup(): void {
  const missing = NEEDED.filter((name) => !process.env[name])
  if (missing.length > 0 || process.env.WOADMAP_TESTS !== 'true') {
    throw new Error('Run the integration tests with: npm test -- integration [file…]')
  }
}
