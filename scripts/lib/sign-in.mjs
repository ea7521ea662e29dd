import { readFileSync } from 'node:fs'
import { join } from 'node:path'

import { ROOT } from './paths.mjs'

/** The owner of the demo's first brand: {email, password}. */
export function demoOwner() {
  const accounts = JSON.parse(readFileSync(join(ROOT, 'seeders/demo-accounts.json'), 'utf8'))
  return accounts.find(({ role }) => role === 'owner')
}

/**
 * Signs in over HTTP, as the sign-in page does.
 * @param {string} origin of the product
 * @returns {Promise<string>} the Cookie header of a signed-in browser; '' when refused
 */
export async function signIn(origin, { email, password }) {
  const asked = await fetch(`${origin}/api/auth/csrf`)
  const { csrfToken } = await asked.json()
  const answer = await fetch(`${origin}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: { Cookie: cookiesOf(asked), Origin: origin },
    body: new URLSearchParams({ email, password, csrfToken, json: 'true', callbackUrl: origin }),
  })
  const cookies = cookiesOf(answer)
  return cookies.includes('woadmap.session=') ? cookies : ''
}

function cookiesOf(response) {
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ')
}
