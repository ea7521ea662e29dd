import { readFileSync } from 'node:fs'
import { join } from 'node:path'

import { ROOT } from './paths.mjs'

/** The owner of the demo's first brand: {email, password}. */
export function demoOwner() {
  const accounts = JSON.parse(readFileSync(join(ROOT, 'seeders/demo-accounts.json'), 'utf8'))
  return accounts.find(({ role }) => role === 'owner')
}

/**
 * Tries to sign in over HTTP, as next-auth's own form does.
 * @param {string} origin of the product
 * @param {{email: string, password: string}} account
 * @param {Record<string, string>} headers what else the browser says of itself
 * @returns {Promise<Response>} 200, and the session's cookie, when it succeeded
 */
export async function trySigningIn(origin, { email, password }, headers = {}) {
  const form = await fetch(`${origin}/api/auth/csrf`)
  const { csrfToken } = await form.json()
  return fetch(`${origin}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: { cookie: cookiesOf(form), origin, ...headers },
    body: new URLSearchParams({ email, password, csrfToken, json: 'true' }),
  })
}

/**
 * Signs in over HTTP.
 * @param {string} origin of the product
 * @param {{email: string, password: string}} account
 * @returns {Promise<string>} the Cookie header of a signed-in browser; '' when refused
 */
export async function signIn(origin, account) {
  const cookies = cookiesOf(await trySigningIn(origin, account))
  return cookies.includes('woadmap.session=') ? cookies : ''
}

/** @param {Response} response */
function cookiesOf(response) {
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ')
}
