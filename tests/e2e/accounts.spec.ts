import { randomUUID } from 'node:crypto'

import AxeBuilder from '@axe-core/playwright'

import { letterTo, linkIn } from './support/letters'
import { expect, test, type Page } from './support/test'

const PASSWORD = 'three hills and a ford'
const NEW = 'a wether in the lower field'

const makeEmail = () => `${randomUUID().slice(0, 8)}@people.example`

async function signUp(page: Page, email: string, brand: string): Promise<void> {
  await page.goto('/')
  await page.getByRole('link', { name: 'Sign up with your brand' }).click()
  await expect(page.getByRole('heading', { name: 'Sign up with your brand' })).toBeVisible()
  await page.getByLabel('Name of your brand').fill(brand)
  await page.getByLabel('Your name').fill('Isla Farrow')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(PASSWORD)
  await page.getByRole('button', { name: 'Sign up' }).click()
  await expect(page.getByText(`We have sent a letter to ${email}.`)).toBeVisible()
}

async function confirm(page: Page, email: string): Promise<void> {
  await page.goto(linkIn(await letterTo(email, 'Confirm your address')))
  await page.getByLabel('Password').fill(PASSWORD)
  await page.getByRole('button', { name: 'Confirm address' }).click()
}

async function enter(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
}

test('a brand signs up, confirms its address, and stands before its empty lines', async ({
  page,
}) => {
  const [email, brand] = [makeEmail(), `Ash Gill ${randomUUID().slice(0, 4)}`]
  await signUp(page, email, brand)
  await confirm(page, email)
  await expect(page).toHaveURL(new RegExp(`/${brand.toLowerCase().replaceAll(' ', '-')}$`))
  await expect(page.getByRole('heading', { name: 'Lines', level: 1 })).toBeVisible()
  await expect(page.getByText('No line yet')).toBeVisible()
  await page.getByRole('link', { name: 'Make a line' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()

  await page.getByRole('link', { name: 'Isla Farrow' }).first().click()
  await expect(page.getByRole('heading', { name: 'Your account' })).toBeVisible()
  await page.getByLabel('Your name').fill('Isla Ford')
  await page.getByRole('button', { name: 'Save name' }).click()
  await expect(page.getByText('Your name is saved.')).toBeVisible()
  await page.goto('/')
  await expect(page.getByRole('link', { name: 'Isla Ford' }).first()).toBeVisible()
})

test('a link of a letter opened by itself confirms nothing, and works once', async ({ page }) => {
  const email = makeEmail()
  await signUp(page, email, 'Opened Twice')
  const link = linkIn(await letterTo(email, 'Confirm your address'))
  const answer = await page.request.get(link)
  expect(answer.headers()['referrer-policy']).toBe('no-referrer')
  expect(answer.headers()['cache-control']).toMatch(/no-store/)
  await page.request.get(link)
  await confirm(page, email)
  await expect(page.getByRole('heading', { name: 'Lines', level: 1 })).toBeVisible()
  await page.context().clearCookies()
  expect((await page.goto(link))!.status()).toBe(404)
  await expect(page.getByRole('heading', { name: 'no longer good' })).toBeVisible()
})

test('signing up with an address that has an account looks the same, and the letter says so', async ({
  page,
}) => {
  await signUp(page, 'owner@teasel.example', 'Another Teasel')
  const letter = await letterTo('owner@teasel.example', 'You have an account already')
  expect(letter.text).not.toMatch(/[\w-]{43}/)
})

test('a forgotten password is replaced by letter, and the old session is over', async ({
  page,
  browser,
}) => {
  test.setTimeout(120_000)
  const email = makeEmail()
  await signUp(page, email, 'Forgetful Yarns')
  await confirm(page, email)
  await expect(page.getByRole('heading', { name: 'Lines', level: 1 })).toBeVisible()

  const elsewhere = await (await browser.newContext()).newPage()
  await elsewhere.goto('/sign-in')
  await elsewhere.getByRole('link', { name: 'Forgotten password?' }).click()
  await expect(elsewhere.getByRole('heading', { name: 'Forgotten password' })).toBeVisible()
  await elsewhere.getByLabel('E-mail').fill(email)
  await elsewhere.getByRole('button', { name: 'Send a letter' }).click()
  await expect(elsewhere.getByText(`We have sent a letter to ${email}.`)).toBeVisible()
  const letter = await letterTo(email, 'Choose a new password')
  expect(letter.html).toContain(`href="${linkIn(letter)}"`)
  await elsewhere.goto(linkIn(letter))
  const axe = new AxeBuilder({ page: elsewhere }).withTags([
    'wcag2a',
    'wcag2aa',
    'wcag21aa',
    'wcag22aa',
  ])
  expect((await axe.analyze()).violations).toEqual([])

  await elsewhere.getByLabel('New password').fill('password1234')
  await elsewhere.getByRole('button', { name: 'Change password' }).click()
  await expect(elsewhere.getByText('one of the first passwords')).toBeVisible()
  await elsewhere.getByLabel('New password').fill(NEW)
  await elsewhere.getByRole('button', { name: 'Show new password' }).click()
  await expect(elsewhere.getByLabel('New password')).toHaveAttribute('type', 'text')
  await elsewhere.getByRole('button', { name: 'Change password' }).click()
  await expect(elsewhere.getByText('Your password is changed.')).toBeVisible()
  await letterTo(email, 'Your password was changed')

  await page.reload()
  await expect(page).toHaveURL(/\/sign-in/)
  await enter(elsewhere, email, PASSWORD)
  await expect(elsewhere.getByText('do not fit together')).toBeVisible()
  await enter(elsewhere, email, NEW)
  await expect(elsewhere).toHaveURL(/\/forgetful-yarns/)
  await elsewhere.context().close()
})

test('an account changes its address and password, ends another session, and is closed', async ({
  page,
  browser,
}) => {
  test.setTimeout(120_000)
  const [email, next] = [makeEmail(), makeEmail()]
  const brand = `Short Lived ${randomUUID().slice(0, 4)}`
  await signUp(page, email, brand)
  await confirm(page, email)
  await expect(page.getByRole('heading', { name: 'Lines', level: 1 })).toBeVisible()
  const other = await browser.newPage()
  await enter(other, email, PASSWORD)
  await expect(other.getByRole('heading', { name: 'Lines', level: 1 })).toBeVisible()

  await page.goto('/account')
  await expect(page.getByText(/^Chrome on .* · this one$/)).toBeVisible()
  await page.getByRole('button', { name: /^End session/ }).click()
  await expect(page.getByText('is signed out.')).toBeVisible()
  await expect(page.getByRole('button', { name: /^End session/ })).toHaveCount(0)
  await other.reload()
  await expect(other).toHaveURL(/\/sign-in/)
  await other.close()

  await page.getByLabel('New e-mail address').fill(next)
  await page.getByLabel('Your password').fill(PASSWORD)
  await page.getByRole('button', { name: 'Change address' }).click()
  await expect(page.getByText(`We have sent a letter to ${next}.`)).toBeVisible()
  expect((await letterTo(email, 'Your address is about to change')).text).toContain(next)
  await page.goto(linkIn(await letterTo(next, 'Confirm your new address')))
  await page.getByRole('button', { name: 'Use this address' }).click()
  await page.getByRole('link', { name: 'Go to your account' }).click()
  await expect(page.getByText(`You sign in with ${next}.`)).toBeVisible()

  await page.getByLabel('Current password').fill(PASSWORD)
  await page.getByLabel('New password').fill(NEW)
  await page.getByRole('button', { name: 'Change password' }).click()
  await expect(page.getByText('Your password is changed.')).toBeVisible()

  await page.getByRole('link', { name: 'Close your account' }).click()
  await expect(page.getByRole('heading', { name: 'Close your account' })).toBeVisible()
  await page.getByLabel('Password').fill(NEW)
  await page.getByRole('button', { name: 'Close account' }).click()
  await expect(page.getByText(`Type the name of the brand`)).toBeVisible()
  await page.getByLabel(`Type “${brand}” to remove it`).fill(brand)
  await page.getByRole('button', { name: 'Close account' }).click()
  await expect(page.getByText('Your account is closed.')).toBeVisible()
  await enter(page, next, NEW)
  await expect(page.getByText('do not fit together')).toBeVisible()
})
