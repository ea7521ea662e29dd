import { randomUUID } from 'node:crypto'

import type { BrowserContext, Locator } from '@playwright/test'
import { generateKeyBetween } from 'fractional-indexing'

import { BRAND, LINE, signIn } from './support/accounts'
import { database } from './support/database'
import { violationsOf } from './support/page-checks'
import { expect, test, type Page } from './support/test'

/** A combination made for one test: the line's first three shades, and two empty places. */
async function makeSketch(title: string): Promise<{ address: string; names: string[] }> {
  const client = await database()
  try {
    const { rows: shades } = await client.query<{ id: string; label: string }>(
      `SELECT shades.id, COALESCE(shades.name, 'No. ' || number) AS label
       FROM shades JOIN lines ON lines.id = line_id JOIN brands ON brands.id = lines.brand_id
       WHERE brands.slug = $1 AND lines.slug = 'heronsway-dk' AND deleted_at IS NULL
         AND status <> 'retired' AND shades.name IS NOT NULL
       ORDER BY shades.position, shades.id LIMIT 8`,
      [BRAND],
    )
    const id = randomUUID()
    const { rows: lines } = await client.query<{ brand: string; line: string; first: string }>(
      `SELECT lines.brand_id AS brand, lines.id AS line, min(rank) AS first
       FROM lines JOIN brands ON brands.id = lines.brand_id
         LEFT JOIN combinations ON line_id = lines.id AND lane = 'sketched'
       WHERE brands.slug = $1 AND lines.slug = 'heronsway-dk' GROUP BY lines.id`,
      [BRAND],
    )
    const { brand, line, first } = lines[0]!
    await client.query(
      `INSERT INTO combinations (id, brand_id, line_id, title, rank) VALUES ($1, $2, $3, $4, $5)`,
      [id, brand, line, title, generateKeyBetween(null, first)],
    )
    await client.query(
      `INSERT INTO combination_places (brand_id, combination_id, place, shade_id, share, role)
       SELECT brand_id, $1, place, shade, 0.2,
         CASE place WHEN 1 THEN 'MC' ELSE 'CC' || (place - 1) END
       FROM combinations, unnest($2::uuid[]) WITH ORDINALITY AS five (shade, place)
       WHERE combinations.id = $1`,
      [id, [...shades.slice(0, 3).map((one) => one.id), null, null]],
    )
    return { address: `${LINE}/combinations/${id}`, names: shades.map(({ label }) => label) }
  } finally {
    await client.end()
  }
}

const places = (page: Page) => page.getByRole('region', { name: 'The five places' })
const rows = (page: Page) => places(page).getByRole('listitem')
const tray = (page: Page) => page.getByRole('region', { name: 'Shades', exact: true })
const hand = (page: Page) => page.getByRole('group', { name: /^Where .* goes$/ })
const spoken = (page: Page) => page.locator('[data-said]').getByRole('status')
const share = (page: Page, place: number) => page.getByLabel(`Share of place ${place}, %`)
const edge = (page: Page, place: number) => page.getByRole('slider').nth(place - 1)

const saved = (page: Page) =>
  expect(page.locator('[data-saving=saved]')).toBeVisible({ timeout: 15_000 })

async function open(page: Page, address: string) {
  await page.goto(address)
  await expect(rows(page)).toHaveCount(5)
  // Edits are taken from when the tab's storage has been read.
  await saved(page)
}

const trayShade = (page: Page, name: string) =>
  tray(page).getByRole('button', { name: new RegExp(`^${name}`) })

async function centre(of: Locator): Promise<[number, number]> {
  await of.scrollIntoViewIfNeeded()
  const { x, y, width, height } = (await of.boundingBox())!
  return [x + width / 2, y + height / 2]
}

/** The names in the five places, top to bottom. */
const standing = (page: Page) => rows(page).locator('p.font-title').allTextContents()

test('by keyboard alone a sketch is filled, ordered, weighed, told of, and undone after a reload', async ({
  page,
}) => {
  test.setTimeout(120_000)
  const { address, names } = await makeSketch('By keyboard')
  const [one, two, three, , five] = names as [string, string, string, string, string]
  await signIn(page, 'designer')
  await open(page, address)

  await trayShade(page, five).focus()
  await page.keyboard.press('Enter')
  await expect(spoken(page)).toContainText(`${five} taken up`)
  await expect(hand(page).getByRole('button', { name: /place 1 of 5/ })).toBeFocused()
  await page.keyboard.press('Escape')
  await expect(spoken(page)).toContainText(`${five} is back where it was`)
  await expect(trayShade(page, five)).toBeFocused()
  expect(await standing(page)).toEqual([one, two, three, 'Empty', 'Empty'])

  await page.keyboard.press('Enter')
  for (let tab = 0; tab < 3; tab += 1) await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  await expect(spoken(page)).toHaveText(`${five}, place 4 of 5.`)
  await expect(trayShade(page, five)).toBeFocused()
  await expect(trayShade(page, five)).toContainText('In place 4')

  await places(page)
    .getByRole('button', { name: `Move ${one}, place 1 of 5` })
    .focus()
  await page.keyboard.press('Enter')
  await page.keyboard.press('Enter')
  await expect(spoken(page)).toHaveText(`${one}, place 2 of 5. ${two}, place 1 of 5.`)
  expect(await standing(page)).toEqual([two, one, three, five, 'Empty'])

  await edge(page, 1).focus()
  for (let press = 0; press < 3; press += 1) await page.keyboard.press('ArrowDown')
  await expect(edge(page, 1)).toHaveAttribute('aria-valuetext', `${two} 23 %, ${one} 17 %`)
  await page.keyboard.press('Escape')
  await expect(share(page, 1)).toHaveValue('20 %')
  await page.keyboard.press('PageUp')
  await expect(share(page, 1)).toHaveValue('15 %')
  await share(page, 5).focus()
  await page.keyboard.type('36')
  await page.keyboard.press('Enter')
  const shares = await places(page)
    .getByLabel(/^Share of place/)
    .evaluateAll((all) => all.map((input) => parseInt((input as HTMLInputElement).value, 10)))
  expect(shares[4]).toBe(36)
  expect(shares.reduce((sum, percent) => sum + percent, 0)).toBe(100)

  await page.getByLabel('Role of place 5').selectOption('MC')
  await expect(page.getByLabel('Role of place 1')).toHaveValue('CC4')
  await places(page).getByRole('button', { name: 'Lock place 1' }).press('Enter')
  await expect(spoken(page)).toContainText('locked')
  await page.getByRole('button', { name: 'Rename combination' }).press('Enter')
  await page.keyboard.press('Control+a')
  await page.keyboard.type('Weighed by keyboard')
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1, name: 'Weighed by keyboard' })).toBeVisible()
  await page.getByLabel('Story').focus()
  await page.keyboard.type('Rain went over.')
  await saved(page)

  await page.reload()
  await saved(page)
  await expect(page.getByLabel('Story')).toHaveValue('Rain went over.')
  expect(await standing(page)).toEqual([two, one, three, five, 'Empty'])
  await expect(page.getByRole('button', { name: 'Undo' })).toBeEnabled()
  for (let step = 0; step < 8; step += 1) await page.keyboard.press('Control+z')
  await expect(page.getByRole('button', { name: 'Undo' })).toBeDisabled()
  await expect(page.getByRole('heading', { level: 1, name: 'By keyboard' })).toBeVisible()
  expect(await standing(page)).toEqual([one, two, three, 'Empty', 'Empty'])
  await page.keyboard.press('Control+Shift+z')
  await expect(spoken(page)).toHaveText('Done again: place 4.')
  await saved(page)
})

test('by single presses alone a shade is placed, two places swapped, a share changed, a photograph chosen', async ({
  page,
}) => {
  const { address, names } = await makeSketch('By presses')
  const [one, two, three, , five, six] = names as [string, string, string, string, string, string]
  await signIn(page, 'designer')
  await open(page, address)

  await trayShade(page, five).click()
  await hand(page)
    .getByRole('button', { name: `Put ${five} in place 4 of 5: empty` })
    .click()
  await trayShade(page, six).click()
  await places(page)
    .getByRole('button', { name: `Put ${six} in place 5 of 5: empty` })
    .click()
  await places(page)
    .getByRole('button', { name: `Move ${one}, place 1 of 5` })
    .click()
  await places(page)
    .getByRole('button', { name: `Put ${one} in place 3 of 5: ${three}` })
    .click()
  expect(await standing(page)).toEqual([three, two, one, five, six])
  await page.getByRole('button', { name: 'More of place 2' }).click()
  await expect(share(page, 2)).toHaveValue('21 %')
  await places(page)
    .getByRole('button', { name: `Take ${two} out` })
    .click()
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(spoken(page)).toHaveText('Undone: place 2.')
  await places(page)
    .getByRole('button', { name: `Take ${six} out` })
    .click()
  await page.getByRole('button', { name: 'Complete the five' }).click()
  await page.getByText('Opposite hues').click()
  await page.getByRole('button', { name: 'Fill the empty place' }).click()
  await expect(page.getByText('Empty', { exact: true })).toHaveCount(0)
  await page.getByRole('button', { name: 'Undo' }).click()
  await page.getByRole('button', { name: 'Undo' }).click()
  await page.getByRole('button', { name: `Neighbours of ${three}` }).click()
  await page.getByRole('dialog').getByRole('button', { name: /^Take/ }).first().click()
  expect((await standing(page))[0]).not.toBe(three)
  await page.getByRole('button', { name: 'Undo' }).click()
  expect(await standing(page)).toEqual([three, two, one, five, six])
  await page.getByLabel('Photograph').selectOption({ index: 1 })
  await saved(page)

  await trayShade(page, one).click()
  await hand(page)
    .getByRole('button', { name: `Leave ${one}` })
    .click()
  await tray(page).getByLabel('Search shades').fill(six)
  await expect(tray(page).getByRole('listitem')).toHaveCount(1)
  await page.reload()
  await saved(page)
  expect(await standing(page)).toEqual([three, two, one, five, six])
  await expect(page.getByLabel('Photograph')).not.toHaveValue('')
})

test('shades are dragged to places, edges to shares, and Escape puts back what hangs at the pointer', async ({
  page,
}) => {
  const { address, names } = await makeSketch('By dragging')
  const [one, two, three, , five] = names as [string, string, string, string, string]
  await signIn(page, 'designer')
  await page.setViewportSize({ width: 1440, height: 1000 })
  await open(page, address)

  const drag = async (what: Locator, to: () => Locator) => {
    const [x, y] = await centre(what)
    await page.mouse.move(x, y)
    await page.mouse.down()
    await page.mouse.move(x + 12, y + 12, { steps: 3 })
    await expect(hand(page)).toBeVisible()
    const { x: left, y: top, width, height } = (await to().boundingBox())!
    await page.mouse.move(left + width / 2, top + height / 2, { steps: 8 })
  }
  await drag(trayShade(page, five), () => hand(page).getByRole('button', { name: /place 4 of 5/ }))
  await expect(spoken(page)).toHaveText(`${five}, place 4 of 5`)
  await page.mouse.up()
  expect(await standing(page)).toEqual([one, two, three, five, 'Empty'])

  await page.evaluate(() => window.scrollTo(0, 0))
  await drag(places(page).getByRole('button', { name: `Move ${one}, place 1 of 5` }), () =>
    rows(page).nth(1),
  )
  await page.keyboard.press('Escape')
  await page.mouse.up()
  await expect(spoken(page)).toHaveText(`${one} is back where it was.`)
  expect(await standing(page)).toEqual([one, two, three, five, 'Empty'])
  await drag(places(page).getByRole('button', { name: `Move ${one}, place 1 of 5` }), () =>
    rows(page).nth(1),
  )
  await page.mouse.up()
  expect(await standing(page)).toEqual([two, one, three, five, 'Empty'])

  const [x, y] = await centre(edge(page, 2))
  await page.mouse.move(x, y)
  await page.mouse.down()
  await page.mouse.move(x, y + 30, { steps: 5 })
  await expect(share(page, 2)).not.toHaveValue('20 %')
  await page.keyboard.press('Escape')
  await expect(share(page, 2)).toHaveValue('20 %')
  await page.mouse.up()
  await page.mouse.move(x, y)
  await page.mouse.down()
  await page.mouse.move(x, y + 30, { steps: 5 })
  await page.mouse.up()
  const moved = parseInt(await share(page, 2).inputValue(), 10)
  expect(moved).toBeGreaterThan(24)
  await expect(share(page, 3)).toHaveValue(`${40 - moved} %`)
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(share(page, 2)).toHaveValue('20 %')
  await saved(page)
})

async function openAs(context: BrowserContext, who: 'owner' | 'designer', address: string) {
  const page = await context.newPage()
  await signIn(page, who)
  await open(page, address)
  return page
}

test('of two editors the second sees what the first changed within 5 seconds, and is asked where both changed the same', async ({
  browser,
}) => {
  test.setTimeout(120_000)
  const { address, names } = await makeSketch('Between two')
  const [one, two, three, four, five] = names as [string, string, string, string, string]
  const [hers, his] = [await browser.newContext(), await browser.newContext()]
  const owner = await openAs(hers, 'owner', address)
  const designer = await openAs(his, 'designer', address)

  await trayShade(owner, five).click()
  await hand(owner)
    .getByRole('button', { name: /place 4 of 5/ })
    .click()
  await expect(rows(designer).nth(3)).toContainText(five, { timeout: 6_500 })
  await expect(designer.getByText('Changed by somebody else just now: place 4.')).toBeVisible()

  // Cut off, so that both change the same before either hears of the other.
  await his.setOffline(true)
  await designer.getByLabel('Story').fill('His story.')
  await trayShade(designer, four).click()
  await hand(designer)
    .getByRole('button', { name: /place 5 of 5/ })
    .click()
  await designer.getByRole('button', { name: 'More of place 1' }).click()
  await owner.getByLabel('Story').fill('Her story.')
  await places(owner)
    .getByRole('button', { name: `Take ${two} out` })
    .click()
  await saved(owner)
  await his.setOffline(false)

  const conflict = designer.getByRole('alert').filter({ hasText: 'saved first' })
  await expect(conflict).toBeVisible({ timeout: 20_000 })
  const story = conflict.getByRole('row', { name: /^Story/ })
  await expect(story).toContainText('Her story.')
  await expect(story).toContainText('His story.')
  await expect(conflict.getByRole('row')).toHaveCount(2)
  expect(await violationsOf(designer)).toEqual([])
  await expect(owner.getByLabel('Story')).toHaveValue('Her story.')
  await conflict.getByRole('button', { name: 'Take theirs' }).click()
  await saved(designer)
  await expect(designer.getByLabel('Story')).toHaveValue('Her story.')
  // What only one of them touched is joined: her empty place, his shade and share.
  for (const page of [designer, owner]) {
    await expect(rows(page).nth(4)).toContainText(four, { timeout: 6_500 })
    expect(await standing(page)).toEqual([one, 'Empty', three, five, four])
    await expect(share(page, 1)).toHaveValue('21 %')
  }
  await designer.getByRole('button', { name: 'Undo' }).click()
  await expect(designer.getByLabel('Story')).toHaveValue('His story.')
  await saved(designer)
  await expect(owner.getByLabel('Story')).toHaveValue('His story.', { timeout: 6_500 })
  await hers.close()
  await his.close()
})

test('what is done without a connection is kept, also over a reload, and saved when it is back', async ({
  page,
  context,
}) => {
  test.setTimeout(120_000)
  const { address, names } = await makeSketch('Without a connection')
  const five = names[4]!
  await signIn(page, 'designer')
  await open(page, address)

  // Pages still come, but nothing is saved: the way a write is lost.
  await context.route('**/*', (route) =>
    route.request().method() === 'POST' ? route.abort('connectionfailed') : route.continue(),
  )
  await trayShade(page, five).click()
  await hand(page)
    .getByRole('button', { name: /place 4 of 5/ })
    .click()
  const waiting = page.getByText('Not saved yet: no connection, trying again').first()
  await expect(waiting).toBeVisible()
  page.on('dialog', (dialog) => void dialog.accept())
  await page.reload()
  await expect(rows(page).nth(3)).toContainText(five)
  await expect(waiting).toBeVisible()

  await context.unroute('**/*')
  await context.setOffline(true)
  await page.getByLabel('Story').fill('Written on a train.')
  await expect(waiting).toBeVisible()
  await context.setOffline(false)
  await saved(page)

  const elsewhere = await context.newPage()
  await elsewhere.goto(address)
  await expect(elsewhere.getByLabel('Story')).toHaveValue('Written on a train.')
  await expect(rows(elsewhere).nth(3)).toContainText(five)
})

test('what can be pressed is at least 24 pixels high and wide, and nothing breaks WCAG while a shade is held', async ({
  page,
}) => {
  test.setTimeout(120_000)
  const { address, names } = await makeSketch('Measured')
  await signIn(page, 'designer')
  for (const width of [1440, 390, 320]) {
    await page.setViewportSize({ width, height: 844 })
    await open(page, address)
    await trayShade(page, names[4]!).click()
    await expect(hand(page)).toBeVisible()
    expect(await violationsOf(page), `${width} px`).toEqual([])
    const small = await page
      .locator('main, [role=group], aside')
      .locator('button, select, input:not([type=radio]), textarea, [role=slider]')
      .evaluateAll((all) =>
        all
          .map((one) => [one.getAttribute('aria-label') ?? one.textContent, one] as const)
          .map(([name, one]) => ({ name, ...one.getBoundingClientRect().toJSON() }))
          .filter(({ width: wide, height }) => wide < 24 || height < 24),
      )
    expect(small, `${width} px`).toEqual([])
    expect(
      await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      ),
    ).toBeLessThanOrEqual(0)
    await page.keyboard.press('Escape')
  }
})

test('a marketer reads a combination and changes its title only', async ({ page }) => {
  const { address, names } = await makeSketch('For the post')
  await signIn(page, 'marketer')
  await open(page, address)
  await expect(tray(page)).toHaveCount(0)
  await expect(page.getByRole('slider')).toHaveCount(0)
  await expect(places(page).getByRole('button')).toHaveCount(0)
  await expect(rows(page).first()).toContainText(names[0]!)
  await page.getByRole('button', { name: 'Rename combination' }).click()
  await page.getByLabel('Title').fill('For the post in June')
  await page.getByLabel('Title').press('Enter')
  await saved(page)
  await page.reload()
  await expect(page.getByRole('heading', { level: 1, name: 'For the post in June' })).toBeVisible()
})
