import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

const KITS = `${LINE}/kits`

test('a marketer builds a kit, follows it, looks through it, copies from it and takes it away', async ({
  page,
  context,
}) => {
  test.setTimeout(240_000)
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  await signIn(page, 'marketer')
  await page.goto(KITS)
  await expect(page.getByRole('heading', { level: 1, name: 'Kits' })).toBeVisible()

  // Whichever lanes they stand in, two combinations are ticked by the keyboard.
  const form = page.getByRole('form', { name: 'Build a kit' })
  const folded = form.locator('details:not([open]) > summary')
  while ((await folded.count()) > 0) await folded.first().click()
  const ticked = form.getByRole('checkbox', { checked: true })
  while ((await ticked.count()) > 0) await ticked.first().uncheck()
  await expect(form.getByRole('button', { name: 'Build kit' })).toBeDisabled()
  for (const at of [0, 1]) {
    await form.getByRole('checkbox').nth(at).focus()
    await page.keyboard.press('Space')
  }
  await expect(form.getByText(/2 combinations go in|1 combination goes in/)).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  await form.getByRole('button', { name: 'Build kit' }).click()
  await expect(form.getByText('The kit is begun.')).toBeVisible()

  const first = page.getByRole('region', { name: 'Built so far' }).getByRole('listitem').first()
  await expect(first.getByText(/^Ready/)).toBeVisible({ timeout: 120_000 })
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await page.setViewportSize({ width: 1280, height: 900 })

  // Its page shows the pictures as they lie in the file, and the texts.
  await first.getByRole('heading').getByRole('link').click()
  await expect(page.getByRole('heading', { level: 1, name: /^Kit of/ })).toBeVisible()
  const picture = page.getByRole('img', { name: 'The picture of 1200 × 630 pixels' }).first()
  await picture.scrollIntoViewIfNeeded()
  await expect
    .poll(() => picture.evaluate((image) => (image as HTMLImageElement).naturalWidth))
    .toBe(1200)
  await page
    .getByRole('button', { name: /^Copy Alt text/ })
    .first()
    .click()
  expect(await page.evaluate(() => navigator.clipboard.readText())).toContain('wound round a card')
  expect(await violationsOf(page)).toEqual([])
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await page.setViewportSize({ width: 1280, height: 900 })

  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: /^Download/ }).click(),
  ])
  expect(await file.failure()).toBeNull()
  expect(file.url()).toContain('X-Amz-Expires=600')

  // Deleted, it is gone from the list; the confirmation says what stays.
  await page.getByRole('button', { name: /^Delete/ }).click()
  const dialog = page.getByRole('alertdialog', { name: 'Delete this kit?' })
  await expect(dialog).toContainText('The combinations stay.')
  expect(await violationsOf(page)).toEqual([])
  await dialog.getByRole('button', { name: 'Delete kit' }).click()
  await expect(page).toHaveURL(new RegExp(`${KITS}$`))
  await expect(page.getByRole('heading', { level: 1, name: 'Kits' })).toBeVisible()
})

test('a kit’s address ticks the combinations it names, and nonsense ticks what is chosen', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(`${KITS}?combinations=nonsense`)
  await expect(page.getByRole('form', { name: 'Build a kit' })).toBeVisible()
  const box = page.getByRole('checkbox').last()
  const title = await box.evaluate((input) => input.closest('label')!.textContent)
  await page.goto(`${LINE}/combinations`)
  const link = page.getByRole('link', { name: title!, exact: true }).first()
  const id = (await link.getAttribute('href'))!.split('/').at(-1)!
  await page.goto(`${KITS}?combinations=${id}`)
  await expect(page.getByRole('checkbox', { checked: true })).toHaveCount(1)
  await expect(page.getByRole('checkbox', { name: title!, checked: true })).toBeVisible()
})
