import { BRAND, LINE, signIn, signOut } from './support/accounts'
import { expect, test } from './support/test'

test('signed out, a page leads to signing in and back to itself, and a route answers 401', async ({
  page,
}) => {
  await page.goto(`${LINE}/shades`)
  await expect(page).toHaveURL(/\/sign-in\?next=/)
  const answer = await page.request.get(`/api/brands/${BRAND}/photographs/states?ids=x`)
  expect(answer.status()).toBe(401)
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
