import type { Locator, Page } from '@playwright/test'

import { LINE, signIn } from './support/accounts'
import { overflowOf, SCRIPT_BAR, scriptBytesOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

// Both edit the families of one line.
test.describe.configure({ mode: 'serial' })

const family = (page: Page, name: string) => page.getByRole('region', { name, exact: true })
const tiles = (section: Locator) => section.getByRole('listitem').getByRole('button')
/** The name of the shade on a tile. */
const nameOn = async (tile: Locator) => (await tile.locator('span').nth(0).textContent())!.trim()

/** The families of the page, in order. */
const names = (page: Page) => page.locator('main section[aria-label] h2').allTextContents()

async function undo(page: Page, said: string | RegExp): Promise<void> {
  const toast = page.locator('[data-sonner-toast]').filter({ hasText: said })
  await toast.getByRole('button', { name: 'Undo' }).click()
  await expect(page.getByText('The families are as they were.').last()).toBeVisible()
}

test('families are edited by keyboard alone, and every edit is taken back', async ({ page }) => {
  test.setTimeout(120_000)
  await signIn(page, 'designer')
  await page.goto(`${LINE}/shades/families`)
  const before = await names(page)
  expect(before[0]).toBe('Neutrals')
  const [one, two] = [before[1]!, before[2]!]
  const first = tiles(family(page, one)).first()
  const shade = await nameOn(first)

  // Two shades are chosen; M leads to where they go.
  await first.focus()
  await page.keyboard.press('Space')
  await expect(first).toHaveAttribute('aria-pressed', 'true')
  await expect(page.getByRole('status').filter({ hasText: '1 shade chosen' })).toBeAttached()
  await page.keyboard.press('m')
  const target = page.getByLabel('Family to move them to')
  await expect(target).toBeFocused()
  await page.keyboard.press('ArrowDown')
  await page.keyboard.press('ArrowDown')
  await expect(target.locator('option:checked')).toHaveText(two)
  await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  const moved = tiles(family(page, two)).filter({ hasText: shade })
  await expect(moved).toContainText('pinned')
  expect(await violationsOf(page)).toEqual([])

  // Sorting anew leaves it there.
  await page.getByRole('button', { name: 'Sort anew' }).press('Enter')
  const dialog = page.getByRole('dialog', { name: 'Sort shades anew' })
  await expect(dialog.getByText(/pinned stays put/)).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  await dialog.getByLabel('Hue families').focus()
  await page.keyboard.type('5')
  await expect(dialog.getByText(/Gone then/)).toBeVisible()
  await dialog.getByRole('button', { name: 'Sort shades' }).press('Enter')
  await expect(dialog).toBeHidden()
  await expect(
    page.getByRole('button', { pressed: false }).filter({ hasText: shade }),
  ).toContainText('pinned')
  await undo(page, 'sorted anew')
  await expect.poll(() => names(page)).toEqual(before)

  // Back to where it came from, and let go.
  await moved.focus()
  await page.keyboard.press('m')
  await page.keyboard.press('ArrowDown')
  await page.keyboard.press('ArrowDown')
  await expect(target.locator('option:checked')).toHaveText(one)
  await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  const back = tiles(family(page, one)).filter({ hasText: shade })
  await expect(back).toContainText('pinned')
  await back.press('Space')
  await page.getByRole('button', { name: 'Unpin shades' }).press('Enter')
  await expect(back).not.toContainText('pinned')

  // A name, in place.
  await family(page, two)
    .getByRole('button', { name: `Edit ${two}` })
    .press('Enter')
  const name = page.getByLabel('Name', { exact: true })
  await expect(name).toBeFocused()
  await name.fill(before[0]!)
  await page.keyboard.press('Enter')
  await expect(page.getByText('Another family is called Neutrals already.')).toBeVisible()
  await name.fill('Bracken and bark')
  await page.keyboard.press('Enter')
  await expect(family(page, 'Bracken and bark')).toBeVisible()
  await undo(page, 'Bracken and bark')
  await expect(family(page, two)).toBeVisible()
})

test('families are edited with single presses, by dragging, and seen by who may only look', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signIn(page, 'owner')
  await page.goto(`${LINE}/shades/families`)
  expect(await scriptBytesOf(page, `${LINE}/shades/families`)).toBeLessThanOrEqual(SCRIPT_BAR)
  const before = await names(page)
  const [one, two] = [before[1]!, before[2]!]

  // Chosen, then told where.
  const shade = tiles(family(page, two)).first()
  const label = await nameOn(shade)
  await shade.click()
  const bar = page.getByRole('region', { name: 'Chosen shades' })
  await bar.getByLabel('Family to move them to').selectOption({ label: 'A new family' })
  await bar.getByRole('button', { name: 'Move shades' }).click()
  await expect.poll(async () => (await names(page)).length).toBe(before.length + 1)
  await undo(page, 'a new family')
  await expect.poll(() => names(page)).toEqual(before)

  // Dragged.
  const from = (await tiles(family(page, two)).filter({ hasText: label }).boundingBox())!
  const to = (await family(page, one).boundingBox())!
  await page.mouse.move(from.x + 20, from.y + 20)
  await page.mouse.down()
  await page.mouse.move(from.x + 40, from.y + 10, { steps: 3 })
  await page.mouse.move(to.x + to.width / 2, to.y + to.height / 2, { steps: 6 })
  await page.mouse.up()
  await expect(tiles(family(page, one)).filter({ hasText: label })).toContainText('pinned')
  await undo(page, `${label} moved`)
  await expect(tiles(family(page, two)).filter({ hasText: label })).toBeVisible()

  // Merged, split, ordered.
  const edit = (name: string) =>
    family(page, name)
      .getByRole('button', { name: `Edit ${name}` })
      .click()
  await edit(two)
  await page.getByLabel('Put all its shades into').selectOption({ label: one })
  await page.getByRole('button', { name: 'Merge families' }).click()
  await expect(family(page, two)).toHaveCount(0)
  await undo(page, 'went into')
  await expect.poll(() => names(page)).toEqual(before)
  const large = (
    await page
      .locator('main section[aria-label]')
      .evaluateAll((all) =>
        all
          .map(
            (one) => [one.getAttribute('aria-label')!, one.querySelectorAll('li').length] as const,
          )
          .sort((a, b) => b[1] - a[1]),
      )
  )[0]![0]
  await edit(large)
  await page.getByRole('button', { name: 'Split family' }).click()
  await expect.poll(async () => (await names(page)).length).toBe(before.length + 1)
  await undo(page, 'split in two')
  await expect.poll(() => names(page)).toEqual(before)
  await page.getByRole('button', { name: 'Order shades' }).click()
  const order = page.getByRole('list', { name: `Order of ${large}` })
  const second = await order.getByRole('listitem').nth(1).locator('.font-title').textContent()
  await order.getByRole('button', { name: `Move ${second} up` }).click()
  await page.getByRole('button', { name: 'Save order' }).click()
  await expect(tiles(family(page, large)).first()).toContainText(second!)
  await expect(family(page, large).getByText('ordered by hand')).toBeVisible()
  await undo(page, `The order of ${large}`)
  await expect(family(page, large).getByText('ordered by hand')).toHaveCount(0)
  expect(await names(page)).toEqual(before)

  await page.setViewportSize({ width: 320, height: 640 })
  await tiles(family(page, one)).first().click()
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  expect(await violationsOf(page)).toEqual([])
})
