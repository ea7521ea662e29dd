import { gzipSync } from 'node:zlib'

import AxeBuilder from '@axe-core/playwright'

import { signIn, type Who } from './support/accounts'
import { ACCOUNT_PAGES, PAGES, SIGNED_OUT } from './support/pages'
import { expect, test, type Page } from './support/test'

const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']
const ROLES: readonly Who[] = ['owner', 'marketer', 'designer', 'dyer']

const ALL = [...PAGES, ...ACCOUNT_PAGES]

/** Addresses by the name of their page, looked up once as the owner. */
const addresses = new Map<string, string>()

test.beforeAll(async ({ browser }) => {
  const page = await browser.newPage()
  await signIn(page, 'owner')
  for (const { name, find } of ALL) addresses.set(name, await find(page))
  await page.close()
})

async function violationsOf(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze()
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)
}

test('the pages before signing in are accessible', async ({ page }) => {
  for (const address of SIGNED_OUT) {
    await page.goto(address)
    await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
    expect(await violationsOf(page), address).toEqual([])
  }
})

for (const role of ROLES) {
  test(`as ${role}, every page opens or says why not, is accessible, and fits a small phone`, async ({
    page,
  }) => {
    test.setTimeout(240_000)
    const problems: string[] = []
    page.on('pageerror', (error) => problems.push(error.message))
    await signIn(page, role)
    for (const { name, roles } of ALL) {
      const address = addresses.get(name)!
      await page.setViewportSize({ width: 1280, height: 900 })
      const response = await page.goto(address)
      expect(response!.status(), `${name} as ${role}`).toBe(roles.includes(role) ? 200 : 403)
      await expect(page.getByRole('heading', { level: 1 }), name).toBeVisible()
      expect(await violationsOf(page), `${name} as ${role}`).toEqual([])
      await page.setViewportSize({ width: 320, height: 640 })
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      )
      expect(overflow, `${name} at 320 px`).toBeLessThanOrEqual(0)
    }
    expect(problems).toEqual([])
  })
}

/** Bytes of script, gzipped, that a page may need before it answers. */
const SCRIPT_BAR = 200_000

test('no page needs more script before it answers than its bar', async ({ page }) => {
  await signIn(page, 'owner')
  const sizes = new Map<string, number>()
  const sizeOf = async (source: string) => {
    const known = sizes.get(source)
    if (known !== undefined) return known
    const size = gzipSync(await (await page.request.get(source)).body()).length
    sizes.set(source, size)
    return size
  }
  for (const address of SIGNED_OUT) addresses.set(address, address)
  addresses.set('a second factor', '/account/second-factor')
  for (const [name, address] of addresses) {
    const html = await (await page.request.get(address)).text()
    // What is loaded after the page stands in no script tag; what is for old browsers is not loaded.
    const tags = [...html.matchAll(/<script[^>]+src="([^"]+)"[^>]*>/g)]
    const sources = tags.filter(([tag]) => !/nomodule/i.test(tag)).map(([, source]) => source!)
    expect(sources.length, name).toBeGreaterThan(3)
    const parts = await Promise.all(sources.map(sizeOf))
    expect(
      parts.reduce((sum, part) => sum + part, 0),
      name,
    ).toBeLessThanOrEqual(SCRIPT_BAR)
  }
})
