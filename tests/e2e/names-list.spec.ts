import { expect, test, type Page } from './support/test'
import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'

const LIST = `${LINE}/names`

const row = (page: Page, text: string) => page.getByRole('row').filter({ hasText: text }).first()
/** What a name is written into. */
const cell = (page: Page, label: string) => page.getByRole('button', { name: `${label}: edit` })
const field = (page: Page, label: string) => page.getByRole('textbox', { name: label, exact: true })

test('names are written in the list, sent for review together, taken back and put by', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signIn(page, 'marketer')
  await page.goto(`${LIST}?state=none`)
  const free = page.getByRole('button', { name: /^Name for No\. .+: edit$/ })
  const labels = (
    await free.evaluateAll((all) => all.map((one) => one.getAttribute('aria-label')!))
  )
    .slice(0, 2)
    .map((label) => label.replace(/: edit$/, ''))
  const [first, second] = labels as [string, string]

  // By keyboard; what was written is changed at once.
  await page.goto(LIST)
  await cell(page, first).press('Enter')
  await field(page, first).fill('Wicker Wether')
  await page.keyboard.press('Enter')
  await expect(cell(page, first)).toBeFocused()
  await page.keyboard.press('Enter')
  await field(page, first).fill('Wicker Weather')
  await page.keyboard.press('Enter')
  await expect(row(page, 'Wicker Weather')).toContainText('Draft')

  // A name that is nothing is not saved, one whose wording is warned of is.
  await cell(page, second).click()
  await field(page, second).fill('Moth and Candle')
  await page.keyboard.press('Enter')
  const warned = row(page, 'Moth and Candle')
  await expect(warned).toContainText('warning')
  await cell(page, second).click()
  await field(page, second).fill(' ')
  await page.keyboard.press('Enter')
  await expect(page.getByText('Write a name.')).toBeVisible()
  await page.keyboard.press('Escape')

  await warned.getByRole('button', { name: /warning.* about Moth and Candle/ }).click()
  await expect(page.getByText('Knitters fear moths')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])

  // One goes, one stays and says why.
  await page.getByLabel('Choose Wicker Weather').check()
  await page.getByLabel('Choose Moth and Candle').check()
  const bar = page.getByRole('region', { name: 'Chosen names' })
  await bar.getByRole('button', { name: 'Send for review' }).click()
  await expect(page.getByText('1 name sent for review.')).toBeVisible()
  await expect(page.getByText('1 name stayed as it was')).toBeVisible()
  await expect(row(page, 'Wicker Weather')).toContainText('In review')
  await expect(bar).toContainText('1 name chosen')

  await page.getByLabel('Choose Moth and Candle').uncheck()
  await page.getByLabel('Choose Wicker Weather').check()
  await bar.getByRole('button', { name: 'Take back names' }).click()
  await expect(row(page, 'Wicker Weather')).toContainText('Draft')

  // What is put by stands for the shade no more.
  await page.getByLabel('Choose Wicker Weather').check()
  await page.getByLabel('Choose Moth and Candle').check()
  await bar.getByRole('button', { name: 'Put names by' }).click()
  await expect(cell(page, first)).toHaveText('Write a name')
  await page.getByRole('button', { name: 'Take up again' }).click()
  await expect(row(page, 'Wicker Weather')).toContainText('Draft')

  // The address holds what is asked for.
  await page.getByLabel('Search number or name').fill('wicker w')
  await expect(page).toHaveURL(/\?q=wicker\+w$/)
  await expect(row(page, 'Moth and Candle')).toBeHidden()
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await expect(row(page, 'Wicker Weather')).toContainText('Draft')
})
