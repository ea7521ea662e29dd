import { signIn, type Who } from './support/accounts'
import {
  BOARD_SCRIPT_BAR,
  overflowOf,
  SCRIPT_BAR,
  scriptBytesOf,
  violationsOf,
} from './support/page-checks'
import { ACCOUNT_PAGES, PAGES, SIGNED_OUT } from './support/pages'
import { expect, test, type Page } from './support/test'

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
    context,
  }) => {
    test.setTimeout(240_000)
    const problems: string[] = []
    context.on('weberror', (error) => problems.push(String(error.error())))
    await signIn(page, role)
    const left = ALL.values()
    let closedPages = 0
    const lookThrough = async (tab: Page) => {
      for (const { name, roles } of left) {
        const opens = roles.includes(role)
        await tab.setViewportSize({ width: 1280, height: 900 })
        const response = await tab.goto(addresses.get(name)!)
        expect(response!.status(), `${name} as ${role}`).toBe(opens ? 200 : 403)
        await expect(tab.getByRole('heading', { level: 1 }), name).toBeVisible()
        // What says that a page is closed is the same page everywhere, and a designer's page is an
        // owner's with less on it.
        if (!opens && closedPages++ > 0) continue
        if (role !== 'designer') expect(await violationsOf(tab), `${name} as ${role}`).toEqual([])
        await tab.setViewportSize({ width: 320, height: 640 })
        expect(await overflowOf(tab), `${name} at 320 px`).toBeLessThanOrEqual(0)
      }
    }
    // Two at a time: while one is loaded the other is gone through.
    await Promise.all([page, await context.newPage()].map(lookThrough))
    expect(problems).toEqual([])
  })
}

test('no page needs more script before it answers than its bar', async ({ page }) => {
  await signIn(page, 'owner')
  for (const address of SIGNED_OUT) addresses.set(address, address)
  addresses.set('a second factor', '/account/second-factor')
  for (const [name, address] of addresses) {
    const drags = name === 'combinations' || name === 'a combination'
    const bar = drags ? BOARD_SCRIPT_BAR : SCRIPT_BAR
    expect(await scriptBytesOf(page, address), name).toBeLessThanOrEqual(bar)
  }
})
