import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

import AxeBuilder from '@axe-core/playwright'
import { TOTP } from 'otpauth'

import { signOut } from './support/accounts'
import { makeBrandWithPeople, type TestPerson } from './support/people'
import { expect, test, type Page } from './support/test'

const ADDRESS = '/account/second-factor'
const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

/** What is wrong with the page as it stands: what axe finds, and what a small phone cuts off. */
async function expectGood(page: Page) {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze()
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([])
  const size = page.viewportSize()!
  await page.setViewportSize({ width: 320, height: 640 })
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  )
  expect(overflow).toBeLessThanOrEqual(0)
  await page.setViewportSize(size)
}

async function signInAs(page: Page, { email, password }: TestPerson, code?: string) {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  if (code === undefined) return
  await page.getByLabel('Code').fill(code)
  await page.getByRole('button', { name: 'Sign in' }).click()
}

/** The subjects of the letters that somebody has been sent, as the local mail server files them. */
function subjectsTo({ email }: TestPerson): string[] {
  const folder = join(process.env.WOADMAP_LOCAL!, 'mail')
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .map((name) => JSON.parse(readFileSync(join(folder, name), 'utf8')))
    .filter(({ to }: { to: string[] }) => to.includes(email))
    .map(({ subject }: { subject: string }) => subject)
}

/** An authenticator: codes one after another, none twice. */
function authenticatorOf(secret: string) {
  const totp = new TOTP({ secret })
  let last = 0
  return () => {
    last = Math.max(last + 1, totp.counter())
    return totp.generate({ timestamp: last * 30_000 })
  }
}

/** From a page that offers it to the recovery codes. */
async function setUp(page: Page, { password }: TestPerson) {
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Set up second factor' }).click()
  await expect(page.getByRole('img', { name: /picture of the secret/ })).toBeVisible()
  const address = await page.getByRole('link', { name: 'Open authenticator' }).getAttribute('href')
  const secret = new URL(address!).searchParams.get('secret')!
  await expect(page.getByText(secret.match(/.{4}/g)!.join(' '), { exact: true })).toBeVisible()
  const nextCode = authenticatorOf(secret)
  await page.getByLabel('Code').fill(nextCode())
  await page.getByRole('button', { name: 'Confirm code' }).click()
  await expect(page.getByRole('heading', { name: 'Keep your recovery codes' })).toBeFocused()
  const codes = await page
    .getByRole('list', { name: 'Recovery codes' })
    .locator('li')
    .allInnerTexts()
  expect(codes).toHaveLength(10)
  return { nextCode, codes }
}

test('a second factor is set up, and from then on signing in asks for a code, or a recovery code', async ({
  page,
}) => {
  test.setTimeout(120_000)
  const { slug, people } = await makeBrandWithPeople('Sedge & Stile', ['owner'])
  await signInAs(page, people.owner)
  await expect(page).toHaveURL(new RegExp(`/${slug}$`))

  await page.goto(ADDRESS)
  await expect(page.getByText('Not in use')).toBeVisible()
  await expectGood(page)
  await page.getByLabel('Password').fill('not this one')
  await page.getByRole('button', { name: 'Set up second factor' }).click()
  await expect(page.getByText('That is not your password. Nothing was changed.')).toBeVisible()

  // Who comes back in the middle goes on with the code, or begins again.
  await page.getByLabel('Password').fill(people.owner.password)
  await page.getByRole('button', { name: 'Set up second factor' }).click()
  await expect(page.getByRole('heading', { name: /Show this/ })).toBeVisible()
  await expectGood(page)
  await page.getByLabel('Code').fill('000000')
  await page.getByRole('button', { name: 'Confirm code' }).click()
  await expect(page.getByText('That code is not good')).toBeVisible()
  await page.reload()
  await expect(page.getByText('Being set up')).toBeVisible()
  await expectGood(page)
  await page.getByLabel('Password').fill(people.owner.password)
  await page.getByRole('button', { name: 'Begin again' }).click()
  await expect(page.getByRole('heading', { name: /Show this/ })).toBeVisible()
  await page.getByRole('button', { name: 'Leave it for now' }).click()
  await page.getByRole('button', { name: 'Begin again' }).waitFor()
  await page.getByLabel('Password').fill(people.owner.password)
  await page.getByRole('button', { name: 'Begin again' }).click()
  const link = page.getByRole('link', { name: 'Open authenticator' })
  const secret = new URL((await link.getAttribute('href'))!).searchParams.get('secret')!
  const nextCode = authenticatorOf(secret)
  await page.getByLabel('Code').fill(nextCode())
  await page.getByRole('button', { name: 'Confirm code' }).click()

  await expect(page.getByRole('heading', { name: 'Keep your recovery codes' })).toBeFocused()
  await expectGood(page)
  const list = page.getByRole('list', { name: 'Recovery codes' })
  const codes = await list.getByRole('listitem').allInnerTexts()
  expect(codes).toHaveLength(10)
  const downloading = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Download codes' }).click()
  const text = readFileSync(await (await downloading).path(), 'utf8')
  for (const one of [...codes, people.owner.email]) expect(text).toContain(one)
  await page.getByRole('button', { name: 'I have kept my codes' }).click()
  await expect(page.getByText('10 recovery codes are left')).toBeVisible()
  await expectGood(page)
  await page.reload()
  await expect(page.getByText('In use', { exact: true })).toBeVisible()
  for (const code of [...codes, secret]) expect(await page.content()).not.toContain(code)

  await page.getByRole('link', { name: 'Go to Sedge & Stile' }).click()
  await signOut(page)
  await signInAs(page, people.owner, nextCode())
  await expect(page).toHaveURL(new RegExp(`/${slug}$`))

  await signOut(page)
  await signInAs(page, people.owner, codes[3])
  await expect(page.getByText('You signed in with a recovery code')).toBeVisible()
  await expect(page.getByText('9 recovery codes are left')).toBeVisible()
  await expectGood(page)

  await page.getByRole('button', { name: 'Remove second factor' }).click()
  const dialog = page.getByRole('dialog', { name: 'Remove second factor' })
  await expect(dialog).toBeVisible()
  await expectGood(page)
  await dialog.getByLabel('Password').fill(people.owner.password)
  await dialog.getByLabel('Code').fill(codes[4]!)
  await dialog.getByRole('button', { name: 'Remove second factor' }).click()
  await expect(page.getByText('Not in use')).toBeVisible()
  await expect
    .poll(() => subjectsTo(people.owner).sort(), { timeout: 20_000 })
    .toEqual([
      'A recovery code was used',
      'Your second factor is in use',
      'Your second factor was removed',
    ])
})

test('a brand that requires a second factor shuts out who has none, and lets them in once they have', async ({
  page,
  browser,
}) => {
  test.setTimeout(120_000)
  const { slug, people } = await makeBrandWithPeople('Bracken & Beck', ['owner', 'designer'])
  const other = await browser.newContext()
  const theirs = await other.newPage()
  await signInAs(theirs, people.designer)
  await expect(theirs).toHaveURL(new RegExp(`/${slug}$`))
  const states = `/api/brands/${slug}/photographs/states?ids=00000000-0000-4000-8000-000000000000`
  expect((await theirs.request.get(states)).status()).toBe(200)

  await signInAs(page, people.owner)
  await expect(page).toHaveURL(new RegExp(`/${slug}$`))
  await page.goto(`/${slug}/security`)
  const setting = page.getByRole('switch', { name: 'Require a second factor' })
  await expect(setting).toBeDisabled()
  await expectGood(page)
  await page.getByRole('link', { name: 'Set up your second factor' }).click()
  await setUp(page, people.owner)
  await page.getByRole('button', { name: 'I have kept my codes' }).click()
  await page.getByRole('link', { name: 'Decide whether Bracken & Beck requires one' }).click()
  await expect(page.getByText('The designer has none.')).toBeVisible()
  await setting.check()
  await expect(page.getByText(/The designer sees nothing of the brand until/)).toBeVisible()
  await expectGood(page)

  for (const address of [`/${slug}`, `/${slug}/security`, `/${slug}/lines/new`]) {
    await theirs.goto(address)
    await expect(theirs, address).toHaveURL(new RegExp(`${ADDRESS}$`))
  }
  await expect(theirs.getByText('Bracken & Beck asks for a second factor')).toBeVisible()
  await expectGood(theirs)
  const refused = await theirs.request.get(states)
  expect(refused.status()).toBe(403)
  expect(await refused.json()).toMatchObject({
    code: 'forbidden',
    message: expect.stringContaining('Bracken & Beck asks everybody for a second factor'),
  })

  await setUp(theirs, people.designer)
  await theirs.getByRole('button', { name: 'I have kept my codes' }).click()
  await expect(theirs.getByText(/so it cannot be removed/)).toBeVisible()
  await expect(theirs.getByRole('button', { name: 'Remove second factor' })).toHaveCount(0)
  await theirs.getByRole('link', { name: 'Go to Bracken & Beck' }).click()
  await expect(theirs.getByRole('heading', { level: 1, name: 'Lines' })).toBeVisible()
  expect((await theirs.request.get(states)).status()).toBe(200)
  await other.close()
})
