import { expect, type Page } from '@playwright/test'

import accounts from '../../../seeders/demo-accounts.json' with { type: 'json' }

/** Who signs in: a role of the demo's first brand, or the owner of its second. */
export type Who = 'owner' | 'marketer' | 'designer' | 'dyer' | 'neighbour'

/** The demo's first brand and its line. */
export const BRAND = 'teasel-and-tarn'
/** The pages of the demo's line. */
export const LINE = `/${BRAND}/lines/heronsway-dk`

function accountOf(who: Who) {
  return accounts.find(({ role, brand }) =>
    who === 'neighbour' ? brand !== BRAND : brand === BRAND && role === who,
  )!
}

/** Signs in by the form and waits for the brand's page. */
export async function signIn(page: Page, who: Who): Promise<void> {
  const { email, password, brand } = accountOf(who)
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).toHaveURL(new RegExp(`/${brand}$`))
}

/** Signs out by the button in the margin. */
export async function signOut(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Sign out' }).click()
  await expect(page).toHaveURL(/\/sign-in/)
}
