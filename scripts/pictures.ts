import { chromium, type Page } from '@playwright/test'

import accounts from '../seeders/demo-accounts.json' with { type: 'json' }
import { chromium as launch } from '../tests/e2e/support/chromium'

/**
 * Takes the pictures of the README from a running product with the demo in it:
 * `npm run pictures [-- http://localhost:3000]`.
 */
const origin = process.argv[2] ?? 'http://localhost:3000'
const LINE = '/teasel-and-tarn/lines/heronsway-dk'
const folder = new URL('../docs/pictures/', import.meta.url).pathname

const browser = await chromium.launch(launch)
const page = await browser.newPage({ baseURL: origin, viewport: { width: 1440, height: 1000 } })
const owner = accounts.find(({ role }) => role === 'owner')!
await page.goto('/sign-in')
await page.getByLabel('E-mail').fill(owner.email)
await page.getByLabel('Password').fill(owner.password)
await page.getByRole('button', { name: 'Sign in' }).click()
await page.waitForURL('**/teasel-and-tarn')

async function take(name: string, address: string, of: Page = page): Promise<void> {
  await of.goto(address, { waitUntil: 'networkidle' })
  // The bands have wound on by then.
  await of.waitForTimeout(1_000)
  await of.screenshot({ path: `${folder}${name}.png` })
  console.log(`${name}.png`)
}

async function first(chapter: string, text: string): Promise<string> {
  await page.goto(`${LINE}/${chapter}`)
  const link = page.locator('main').getByRole('link', { name: text }).first()
  return (await link.getAttribute('href'))!
}

/** The address of a kit of what is chosen; one is built where there is none. */
async function aKit(): Promise<string> {
  await page.goto(`${LINE}/kits`)
  const made = page.getByRole('link', { name: /^Download/ })
  if ((await made.count()) === 0) await page.getByRole('button', { name: 'Build kit' }).click()
  await made.first().waitFor({ timeout: 60_000 })
  const link = page.locator('main').locator(`a[href^="${LINE}/kits/"]`).first()
  return (await link.getAttribute('href'))!
}

/** The address of the naming bench of a shade without a name. */
async function benchOf(label: string): Promise<string> {
  return (await first('shades', label)).replace('/shades/', '/names/shades/')
}

await take('sample-book', `${LINE}/shades`)
await take('families', `${LINE}/shades/families`)
await take('shade-table', `${LINE}/shades?view=table`)
await take('range-study', `${LINE}/shades/study?twins=10`)
const photograph = await first('photographs', 'The tarn in bracken time')
await take('match', photograph)
await take('board', `${LINE}/combinations`)
await take('combination', await first('combinations', 'Low Sun, High Bracken'))
await take('kit', await aKit())
await take('names', `${LINE}/names`)
await take('naming-bench', await benchOf('No. 61'))
await take('names-dealt', `${LINE}/names/heap/deal`)
await take('names-review', `${LINE}/names/review`)
await take('labels', `${LINE}/names/labels`)
await take('team', '/teasel-and-tarn/team')
await take('activity', '/teasel-and-tarn/activity')
await page.setViewportSize({ width: 390, height: 844 })
await take('match-phone', photograph)
await browser.close()
