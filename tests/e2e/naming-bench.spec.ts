import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

const ROW = /\/shades\/[0-9a-f-]{36}$/

test('a name is checked as it is typed, written down, and sent for review from the bench', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signIn(page, 'marketer')
  await page.goto(`${LINE}/shades`)
  const shades = await page
    .locator('main a')
    .evaluateAll((links) => links.map((link) => link.getAttribute('href') ?? ''))
  const shade = shades.filter((href) => ROW.test(href)).at(-1)!
  await page.goto(shade.replace('/shades/', '/names/shades/'))

  // What is made up comes by itself; a word of an absent fibre is warned of while it is typed.
  const field = page.getByRole('textbox', { name: 'Name', exact: true })
  await field.pressSequentially('Cashmere if you can')
  await expect(page.getByText('Implies a fibre')).toBeVisible()
  await expect(page.getByText(/Heard as/).first()).toBeVisible()
  const band = page.getByRole('img', { name: /^Ball band/ })
  await expect(band).toHaveAccessibleName(/Cashmere if you can/)
  await expect(page.getByRole('list', { name: 'Wordplay' })).toBeVisible()
  expect(await violationsOf(page)).toEqual([])

  // By keyboard from here on.
  const name = `Bench test ${Date.now()}`
  await field.fill(name)
  await expect(band).toHaveAccessibleName(/Bench test/)
  await field.press('Enter')
  const row = page.getByRole('listitem', { name })
  await expect(row).toContainText('Draft')
  await expect(field).toHaveValue('')
  await expect(field).toBeFocused()
  await row.getByRole('button', { name: 'Change words' }).press('Enter')
  await expect(row.getByRole('textbox', { name: 'Name', exact: true })).toBeFocused()
  await page.keyboard.type(' again')
  await page.keyboard.press('Enter')
  const reworded = page.getByRole('listitem', { name: `${name} again` })
  await expect(reworded.getByRole('button', { name: 'Change words' })).toBeFocused()
  await reworded.getByRole('button', { name: 'Send for review' }).press('Enter')
  await expect(reworded).toContainText('In review')

  // A name that was made up is an idea with one press, and says where it comes from.
  const made = page.getByRole('list', { name: 'Wordplay' }).getByRole('listitem').first()
  const play = (await made.locator('p').first().textContent())!
  await made.getByRole('button', { name: 'Take as idea' }).press('Enter')
  await expect(made.getByRole('button', { name: 'Among the ideas' })).toBeFocused()
  const taken = page.getByRole('listitem', { name: play, exact: true })
  await expect(taken).toContainText('Plays on')
  await taken.getByRole('button', { name: 'Delete' }).press('Enter')
  await expect(taken).toBeHidden()

  await page.setViewportSize({ width: 320, height: 700 })
  expect(await overflowOf(page)).toBe(0)
})
