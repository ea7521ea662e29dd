import { readFileSync } from 'node:fs'

import { BRAND, LINE, signIn, signOut } from './support/accounts'
import { expect, test } from './support/test'

/** A photograph taken in the world: Debian's mate-backgrounds, which the test set-up installs. */
const PHOTOGRAPH = '/usr/share/backgrounds/mate/nature/Dune.jpg'
const SHADES = 'seeders/demo/heronsway-dk.csv'

test('from a new line to a kept combination that a colleague finds and a neighbour does not', async ({
  page,
}) => {
  test.setTimeout(180_000)
  await signIn(page, 'owner')

  await page.getByRole('link', { name: 'Make a line' }).click()
  await page.getByLabel('Name', { exact: true }).fill('Saltmarsh Sport')
  await page.getByLabel('Fibre 1', { exact: true }).fill('wool')
  await page.getByLabel('Per cent of fibre 1').fill('80')
  await page.getByRole('button', { name: 'Add fibre' }).click()
  await page.getByLabel('Fibre 2', { exact: true }).fill('linen')
  await page.getByLabel('Per cent of fibre 2').fill('10')
  await page.getByLabel('Ply').fill('3')
  await page.getByLabel('Net weight of a ball, g').fill('50')
  await page.getByLabel('Length of a ball').fill('150')
  await page.getByLabel('Needle, mm').fill('3.5')
  await page.getByLabel('Stitches to 10 cm').fill('24')
  await page.getByLabel('Rows to 10 cm').fill('32')
  await page.getByLabel('Price of a ball').fill('9.50')
  await page.getByRole('button', { name: 'Make line' }).click()
  await expect(page.getByText('The fibres come to 90 %, not 100 %.')).toBeVisible()
  await page.getByLabel('Per cent of fibre 2').fill('20')
  await page.getByRole('button', { name: 'Make line' }).click()
  await expect(page).toHaveURL(/\/lines\/saltmarsh-sport\/shades$/)

  await page.getByRole('link', { name: 'Import shades' }).first().click()
  await page.locator('input[type=file]').setInputFiles(SHADES)
  await expect(page.getByText('“Plain Ewe” as a draft of its name')).toBeVisible()
  await page.getByRole('button', { name: 'Save 40 shades' }).click()
  await expect(page).toHaveURL(/\/saltmarsh-sport\/shades/)
  // Nobody has approved a name yet.
  await expect(page.getByRole('link', { name: 'No. 11', exact: true })).toBeVisible()
  await expect(page.getByText('Plain Ewe')).toHaveCount(0)
  const chapters = page.getByRole('navigation', { name: 'Chapters of Saltmarsh Sport' })
  await expect(chapters.getByRole('link', { name: /Shades.*40/ })).toBeVisible()

  await chapters.getByRole('link', { name: /Photographs/ }).click()
  await expect(page.getByRole('heading', { name: 'No photograph yet' })).toBeVisible()
  const bytes = readFileSync(PHOTOGRAPH)
  // Dropped on the sheet, as from the desktop.
  const dropped = await page.evaluateHandle((base64) => {
    const data = Uint8Array.from(atob(base64), (character) => character.charCodeAt(0))
    const transfer = new DataTransfer()
    transfer.items.add(new File([data], 'dune_at-noon.jpg', { type: 'image/jpeg' }))
    return transfer
  }, bytes.toString('base64'))
  await page
    .getByRole('heading', { name: 'No photograph yet' })
    .dispatchEvent('drop', { dataTransfer: dropped })
  await page.getByRole('link', { name: 'Open photograph' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Dune at noon' })).toBeVisible()

  // It is read while we look; a reload goes on where it was.
  await page.reload()
  const five = page.getByRole('list', { name: 'The five shades' })
  await expect(five.getByRole('listitem')).toHaveCount(5, { timeout: 60_000 })
  await expect(page.getByRole('heading', { name: 'Proved best' })).toBeVisible()

  const names = await five.locator('p.font-title').allTextContents()
  const [locked] = names
  await five.getByRole('button', { name: `Lock ${locked}`, exact: true }).click()
  await expect(five.getByRole('button', { name: `Unlock ${locked}`, exact: true })).toBeVisible()
  await expect(page).toHaveURL(/lock=/)
  await five.getByRole('button', { name: `Exclude ${names[4]}`, exact: true }).click()
  await expect(page.getByRole('button', { name: `Allow ${names[4]} again` })).toBeVisible()
  const darkest = five.getByRole('paragraph').filter({ hasText: names[4]! })
  await expect(darkest).toHaveCount(0)
  await page.goBack()
  await expect(darkest).toBeVisible()

  await page.getByRole('button', { name: 'Keep combination' }).click()
  const dialog = page.getByRole('dialog', { name: 'Keep these five' })
  await expect(dialog.getByLabel('Title')).toHaveValue('Dune at noon, in five')
  await dialog.getByLabel('Title').fill('Marram and sky')
  await dialog.getByRole('button', { name: 'Keep combination' }).click()
  await page.getByRole('link', { name: 'Marram and sky' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Marram and sky' })).toBeVisible()
  const kept = page.url()
  await signOut(page)

  await signIn(page, 'designer')
  await page.goto(`/${BRAND}/lines/saltmarsh-sport/combinations`)
  await page.getByRole('link', { name: 'Marram and sky' }).click()
  await expect(page).toHaveURL(kept)
  await expect(page.getByText(names[0]!, { exact: true }).first()).toBeVisible()
  await signOut(page)

  await signIn(page, 'neighbour')
  expect((await page.goto(kept))!.status()).toBe(404)
  await expect(page.getByText('Marram and sky')).toHaveCount(0)
})

test('the five are put in another order by keyboard alone, and a delete is taken back', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(`${LINE}/combinations`)
  await page.getByRole('link', { name: 'Low Sun, High Bracken' }).click()
  const handles = page.getByRole('button', { name: /^Move .*, place \d of 5$/ })
  const first = (await handles.first().getAttribute('aria-label'))!.replace(
    /^Move |, place.*$/g,
    '',
  )
  await handles.first().press('Enter')
  const second = page.getByRole('group', { name: `Where ${first} goes` }).getByRole('button', {
    name: /place 2 of 5/,
  })
  await expect(second).toBeFocused()
  await page.keyboard.press('Enter')
  const rows = page.getByRole('region', { name: 'The five places' }).getByRole('listitem')
  await expect(rows.nth(1)).toContainText(first)
  await expect(page.locator('[data-saving=saved]')).toBeVisible()
  await page.reload()
  await expect(rows.nth(1)).toContainText(first)

  await page.getByRole('button', { name: 'Delete combination' }).click()
  await expect(page).toHaveURL(/\/combinations$/)
  await expect(page.getByRole('link', { name: 'Low Sun, High Bracken' })).toHaveCount(0)
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(page.getByRole('link', { name: 'Low Sun, High Bracken' })).toBeVisible()
})

test('the dropper moves by keyboard and offers shades to lock', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto(`${LINE}/photographs`)
  await page.getByRole('link', { name: 'The tarn in bracken time' }).click()
  const dropper = page.getByRole('button', { name: /^Dropper, 50 % across/ })
  await dropper.focus()
  await page.keyboard.press('Shift+ArrowUp')
  await page.keyboard.press('Shift+ArrowLeft')
  await expect(page.getByRole('button', { name: /^Dropper, 45 % across, 45 % down/ })).toBeVisible()
  const panel = page.getByRole('region', { name: 'Dropper' })
  await expect(panel.getByRole('listitem')).toHaveCount(3)
  await panel.getByLabel('Across, %').fill('80')
  await expect(page.getByRole('button', { name: /^Dropper, 80 % across/ })).toBeVisible()
  await panel.getByRole('button', { name: /^Lock/ }).first().click()
  await expect(page).toHaveURL(/lock=/)
  await page.getByRole('button', { name: 'Clear wishes' }).click()
  await expect(page).not.toHaveURL(/lock=/)
})

test('a shade is added by hand, by its colour on screen or by a reading', async ({ page }) => {
  await signIn(page, 'designer')
  for (const kind of ['hex', 'lab']) {
    await page.goto(`${LINE}/shades/new`)
    const number = `H-${kind}`
    await page.getByLabel('Number', { exact: true }).fill(number)
    // What was begun the other way does not come along.
    await page.getByLabel('L*').fill('45')
    if (kind === 'hex') {
      await page.getByText('Screen colour (hex)').click()
      await page.getByRole('textbox', { name: 'Hex' }).fill('#7a8b4f')
    } else {
      await page.getByLabel('a*').fill('-12')
      await page.getByLabel('b*').fill('20,5')
      await page.getByLabel('Read under').selectOption('D65/10')
    }
    await page.getByRole('button', { name: 'Add shade', exact: true }).click()
    await expect(page).toHaveURL(/\/shades$/)
    await page.goto(`${LINE}/shades?view=table&q=${number}`)
    await expect(page.getByRole('link', { name: number }).first()).toBeVisible()
  }
})
