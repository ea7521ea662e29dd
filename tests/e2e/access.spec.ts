import { BRAND, LINE, signIn, signOut } from './support/accounts'
import { PAGES } from './support/pages'
import { expect, test } from './support/test'

const UNKNOWN = '/no-such-brand/lines/heronsway-dk'

test('signed out, a page leads to signing in and back to itself, and a route answers 401', async ({
  page,
}) => {
  await page.goto(`${LINE}/shades`)
  await expect(page).toHaveURL(/\/sign-in\?next=/)
  const answer = await page.request.get(`/api/brands/${BRAND}/photographs/states?ids=x`)
  expect(answer.status()).toBe(401)
})

test("another brand's pages and routes answer exactly as those of no brand at all", async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signIn(page, 'owner')
  const addresses: string[] = []
  for (const { find } of PAGES) addresses.push(await find(page))
  await page.goto(addresses.find((address) => /\/photographs\/[0-9a-f-]{36}/.test(address))!)
  const copy = (await page.locator('main img').first().getAttribute('src'))!
  await signOut(page)
  await signIn(page, 'neighbour')
  const titleOf = async (address: string) => {
    const response = await page.goto(address)
    expect(response!.status(), address).toBe(404)
    return page.getByRole('heading', { level: 1 }).textContent()
  }
  const unknown = await titleOf(`${UNKNOWN}/shades`)
  for (const address of addresses) expect(await titleOf(address), address).toBe(unknown)

  const routes = [
    `photographs/states?ids=00000000-0000-4000-8000-000000000000`,
    'lines/heronsway-dk/shades.csv',
    ...addresses
      .flatMap((address) => /\/photographs\/([0-9a-f-]{36})/.exec(address)?.[1] ?? [])
      .flatMap((id) => [`photographs/${id}/match?reading=true`, `photographs/${id}/cells`]),
  ]
  for (const route of routes) {
    const [theirs, none] = await Promise.all(
      [BRAND, 'no-such-brand'].map((brand) => page.request.get(`/api/brands/${brand}/${route}`)),
    )
    expect(theirs!.status(), route).toBe(404)
    expect(await theirs!.json()).toEqual(await none!.json())
  }
  expect(copy).toMatch(/^\/api\//)
  expect((await page.request.get(copy)).status()).toBe(404)
})

test('a write from another site is refused, whoever is signed in', async ({ page }) => {
  await signIn(page, 'owner')
  for (const origin of ['https://elsewhere.example', undefined]) {
    const answer = await page.request.post(`/api/brands/${BRAND}/photographs`, {
      data: {},
      headers: origin ? { origin } : {},
    })
    expect(answer.status()).toBe(403)
  }
})

test('after signing out the old cookie opens nothing', async ({ page, context }) => {
  await signIn(page, 'owner')
  const cookies = await context.cookies()
  await signOut(page)
  await context.addCookies(cookies)
  await page.goto(`/${BRAND}`)
  await expect(page).toHaveURL(/\/sign-in/)
})

test('a wrong password is told in words and keeps the address', async ({ page }) => {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill('owner@teasel.example')
  await page.getByLabel('Password').fill('not this one')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('alert').filter({ hasText: 'do not fit together' })).toBeVisible()
  await expect(page.getByLabel('E-mail')).toHaveValue('owner@teasel.example')
})
