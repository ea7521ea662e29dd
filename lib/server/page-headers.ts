import { randomBytes } from 'node:crypto'

import { env } from '@/lib/env'

/** The header that a page's scripts are let in by; Next.js reads the nonce out of it. */
export const POLICY = 'Content-Security-Policy'

/**
 * The headers of a page that depend on where the product runs or differ at every request; the
 * others stand in next.config.mjs.
 * @source Content Security Policy Level 3; RFC 6797
 */
export function makePageHeaders(): Record<string, string> {
  const { APP_ORIGIN, NODE_ENV, S3_ENDPOINT, S3_PUBLIC_ENDPOINT } = env()
  const nonce = randomBytes(16).toString('base64')
  const secure = APP_ORIGIN.startsWith('https:')
  const store = new URL(S3_PUBLIC_ENDPOINT ?? S3_ENDPOINT).origin
  // While developing, React rebuilds the server's stack traces by eval.
  const development = NODE_ENV === 'development' ? " 'unsafe-eval'" : ''
  const policy = [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development}`,
    // Colours, shares and places are style attributes, and toasts and dialogs bring style sheets.
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:",
    // A photograph goes from the browser to the object store.
    `connect-src 'self' ${store}`,
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
    ...(secure ? ['upgrade-insecure-requests'] : []),
  ]
  return {
    [POLICY]: policy.join('; '),
    ...(secure && { 'Strict-Transport-Security': 'max-age=31536000' }),
  }
}
