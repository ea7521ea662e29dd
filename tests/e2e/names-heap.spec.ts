import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

const HEAP = `${LINE}/names/heap`

test('a marketer brings a pile of names, deals them out, accepts, leaves and takes back', async ({
  page,
}) => {
  test.setTimeout(180_000)
  // Nobody else's: what other tests add or deal does not matter.
  const mark = String.fromCharCode(...Array.from({ length: 6 }, () => 97 + Math.random() * 26))
  const named = (words: string) => `${words} ${mark}`
  await signIn(page, 'marketer')
  await page.goto(HEAP)

  // One by one, by the keyboard.
  const form = page.getByRole('form', { name: 'Add a name' })
  await form.getByLabel('Name', { exact: true }).fill(named('Nearly There'))
  await page.keyboard.press('Enter')
  await expect(page.getByRole('button', { name: `${named('Nearly There')}: edit` })).toBeVisible()
  await expect(form.getByLabel('Name', { exact: true })).toBeFocused()

  // Many at once: nothing is saved before it is said so, and bad rows can be taken away.
  await page.getByRole('link', { name: 'Add many names' }).first().click()
  await page.getByText('Paste cells from a spreadsheet instead').click()
  const cells = [
    'Idea\tWhy\tShade',
    `${named('Moss Likely')}\tthe bank above the tarn\t`,
    `${named('nearly  thére')}\t\t`,
    `${named('Far Out')}\t\tno such shade`,
  ]
  await page.getByLabel('Cells').fill(cells.join('\n'))
  await page.getByRole('button', { name: 'Read pasted cells' }).click()
  await expect(
    page.getByText('Row 4, shade: no shade of this line is No. such shade'),
  ).toBeVisible()
  await page.getByText('All 3').click()
  await expect(page.getByText('the heap, draft')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Download bad rows' }).click(),
  ])
  expect(file.suggestedFilename()).toMatch(/^bad-rows-.*\.csv$/)
  await page.getByRole('button', { name: 'Add 1 name' }).click()
  await expect(page).toHaveURL(new RegExp(`${HEAP}$`))
  const moss = page
    .locator('main')
    .getByRole('listitem')
    .filter({ hasText: named('Moss Likely') })
  await expect(moss).toContainText('Colour: moss')
  await expect(page.getByText(named('Far Out'))).toHaveCount(0)

  // Laid by hand on a shade that is chosen by its yarn, and taken back.
  await moss.getByRole('button', { name: /^Lay .* on a shade$/ }).click()
  const dialog = page.getByRole('dialog')
  await dialog.getByRole('listitem').first().getByRole('button').click()
  await expect(moss).toHaveCount(0)
  const laid = page.getByRole('listitem').filter({ hasText: /now on / })
  await laid.getByRole('button', { name: 'Undo' }).click()
  await expect(moss).toBeVisible()

  // Dealt out: accepted one by one, taken back, left, and the ideas without a colour stay.
  await page.getByRole('link', { name: 'Deal the heap' }).click()
  const accept = page.getByRole('button', { name: /^Accept .* for No\./ })
  await expect(accept.first()).toBeVisible()
  await expect(page.getByRole('region', { name: 'No colour comes to mind' })).toContainText(
    named('Nearly There'),
  )
  expect(await violationsOf(page)).toEqual([])
  const open = await accept.count()
  await accept.first().click()
  await expect(page.getByText('Laid on it')).toBeVisible()
  await page.getByRole('button', { name: /^Take .* back to the heap$/ }).click()
  await expect(accept).toHaveCount(open)
  await page
    .getByRole('button', { name: /^Leave .* in the heap$/ })
    .first()
    .click()
  await expect(accept).toHaveCount(open - 1)
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await page.setViewportSize({ width: 1280, height: 900 })

  // Put by, found again there, and deleted.
  await page.goto(`${HEAP}?q=${mark}`)
  await page.getByRole('checkbox', { name: /^Choose all/ }).check()
  const bar = page.getByRole('region', { name: 'Chosen names' })
  await bar.getByRole('button', { name: 'Put by' }).click()
  await expect(page.getByText('No idea fits')).toBeVisible()
  await page.goto(`${HEAP}?put=by&q=${mark}`)
  await page.getByRole('checkbox', { name: /^Choose all/ }).check()
  await bar.getByRole('button', { name: 'Delete names' }).click()
  await expect(page.getByText('No idea fits')).toBeVisible()
})
