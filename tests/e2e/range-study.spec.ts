import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

const STUDY = `${LINE}/shades/study`

test('near-twins are asked for in the address, and every figure has a table', async ({ page }) => {
  test.setTimeout(180_000)
  await signIn(page, 'designer')
  await page.goto(STUDY)
  await expect(page.getByRole('heading', { level: 1, name: 'Range study' })).toBeVisible()

  // Another limit is another address; nonsense in it is the default.
  await page.getByLabel('Under ΔE00').fill('12')
  await page.getByRole('button', { name: 'Show pairs' }).click()
  await expect(page).toHaveURL(/twins=12$/)
  await expect(page.getByText(/pairs? under ΔE00 12/)).toBeVisible()
  await page.goto(`${STUDY}?twins=nonsense`)
  await expect(page.getByLabel('Under ΔE00')).toHaveValue('4')

  // Every figure has its table, open on a phone too without breaking anything.
  await page.goto(`${STUDY}?twins=12`)
  for (const summary of await page.locator('main summary').all()) await summary.click()
  await expect(page.getByRole('table')).toHaveCount(6)
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  expect(await violationsOf(page)).toEqual([])
  await page.setViewportSize({ width: 1280, height: 900 })

  // A pair leads to its shades.
  const [name] = await page
    .getByRole('table', { name: /Near-twins/ })
    .getByRole('link')
    .allInnerTexts()
  await page
    .getByRole('table', { name: /Near-twins/ })
    .getByRole('link')
    .first()
    .click()
  await expect(page.getByRole('heading', { level: 1, name: name! })).toBeVisible()
})

test('an owner fills a gap with a target shade, and takes it back', async ({ page }) => {
  test.setTimeout(180_000)
  await signIn(page, 'owner')
  await page.goto(STUDY)

  // The target takes the number proposed, and can be taken back.
  const gaps = page.getByRole('region', { name: 'Gaps' })
  const number = gaps.getByLabel('Number').first()
  const proposed = await number.inputValue()
  await gaps.getByRole('button', { name: 'Add as target shade: gap A' }).click()
  await expect(page.getByText(`Target shade ${proposed} added.`)).toBeVisible({ timeout: 30_000 })
  await expect(gaps).toBeFocused()
  await expect(number).not.toHaveValue(proposed)
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(page.getByText('The target shade is taken back.')).toBeVisible({ timeout: 30_000 })
  await expect(number).toHaveValue(proposed)

  // A number that is taken is refused at its field, and stays typed.
  await number.fill('13')
  await gaps.getByRole('button', { name: 'Add as target shade: gap A' }).click()
  await expect(gaps.getByText(/^No. 13 is taken by/)).toBeVisible({ timeout: 30_000 })
  await expect(number).toHaveValue('13')
})

test('a dyer reads the study and adds nothing', async ({ page }) => {
  await signIn(page, 'dyer')
  await page.goto(STUDY)
  await expect(page.getByRole('heading', { name: 'Gap A' })).toBeVisible()
  await expect(page.getByRole('button', { name: /target shade/ })).toHaveCount(0)
})
