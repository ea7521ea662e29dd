import { chromium, type Page } from '@playwright/test'

import accounts from '@/seeders/demo-accounts.json' with { type: 'json' }
import { chromium as launch } from '@/tests/e2e/support/chromium'

import { BRAND, type World } from './world'

/** A tab of a real browser, signed in as the brand's owner; closed when the fault is over. */
export async function openTab(world: World): Promise<Page> {
  const browser = await chromium.launch(launch)
  world.undo(() => browser.close())
  const page = await browser.newPage({ baseURL: world.ground.env.APP_ORIGIN! })
  page.setDefaultTimeout(15_000)
  const owner = accounts.find(({ role, brand }) => role === 'owner' && brand === BRAND)!
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(owner.email)
  await page.getByLabel('Password').fill(owner.password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL(`**/${BRAND}`)
  return page
}
