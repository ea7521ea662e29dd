import { LINE, signIn } from './support/accounts'
import { overflowOf, violationsOf } from './support/page-checks'
import { expect, test, type Page } from './support/test'

const BOARD = `${LINE}/combinations`

const lane = (page: Page, name: string) =>
  page.getByRole('region', { name: new RegExp(`^${name}`) })
const titles = (page: Page, name: string) =>
  lane(page, name).getByRole('listitem').getByRole('link').allTextContents()
const handle = (page: Page, title: string) =>
  page.getByRole('button', { name: new RegExp(`^Move ${title}, place`) })
const spoken = (page: Page) => page.locator('main').getByRole('status').first()
const sent = (page: Page) =>
  page.waitForResponse(
    (answer) => answer.request().method() === 'POST' && answer.url().includes('/combinations'),
  )

test('by keyboard alone: a card goes to another lane, back by Escape, and taken back by Ctrl+Z', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(BOARD)
  const title = 'Half a Tide Left'
  const before = await titles(page, 'Short-listed')
  const at = before.indexOf(title) + 1
  await handle(page, title).focus()
  await page.keyboard.press('Space')
  await expect(spoken(page)).toContainText(
    `${title}, place ${at} of ${before.length} in Short-listed`,
  )
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('Home')
  await expect(spoken(page)).toContainText(new RegExp(`${title}, place 1 of \\d in Chosen`))
  await expect(handle(page, title)).toBeFocused()
  expect(await violationsOf(page)).toEqual([])
  await page.keyboard.press('Escape')
  await expect(spoken(page)).toContainText(`${title} is back where it was`)
  expect(await titles(page, 'Short-listed')).toEqual(before)
  await expect(handle(page, title)).toBeFocused()

  await page.keyboard.press('Space')
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('Home')
  const answered = sent(page)
  await page.keyboard.press('Space')
  await expect(spoken(page)).toContainText(/^Put down\. .* place 1 of \d in Chosen/)
  await expect(handle(page, title)).toBeFocused()
  expect((await answered).ok()).toBe(true)
  await page.reload()
  expect((await titles(page, 'Chosen'))[0]).toBe(title)

  // What was reloaded has no way back; what is moved now has.
  await handle(page, title).focus()
  await page.keyboard.press('Space')
  await page.keyboard.press('ArrowLeft')
  await page.keyboard.press('End')
  await page.keyboard.press('Enter')
  await expect(spoken(page)).toContainText(/^Put down\. .* in Short-listed/)
  await page.keyboard.press('Control+z')
  await expect(spoken(page)).toContainText(/^Taken back\. .* place 1 of \d in Chosen/)
  expect((await titles(page, 'Chosen'))[0]).toBe(title)
})

test('by single presses alone: a card is put in its place from a list, undone, selected for a kit, deleted and brought back', async ({
  page,
}) => {
  await signIn(page, 'owner')
  await page.goto(BOARD)
  const title = 'The Long Way Down'
  const before = await titles(page, 'Sketched')
  await handle(page, title).click()
  const dialog = page.getByRole('dialog', { name: `Move ${title}` })
  await dialog.getByText('Chosen', { exact: true }).click()
  const place = dialog.getByLabel('Place')
  const under = await place.locator('option').nth(1).textContent()
  await place.selectOption({ index: 1 })
  expect(await violationsOf(page)).toEqual([])
  await dialog.getByRole('button', { name: 'Move combination' }).click()
  await expect(spoken(page)).toContainText(/^Put down\. .* place 2 of \d in Chosen/)
  const [first, second] = await titles(page, 'Chosen')
  expect(under).toContain(`under ${first}`)
  expect(second).toBe(title)
  await page.getByRole('button', { name: 'Undo move' }).click()
  await expect.poll(() => titles(page, 'Sketched')).toEqual(before)
  await expect(page.getByRole('button', { name: 'Undo move' })).toBeDisabled()

  // A dialog that is left leaves everything.
  await handle(page, title).click()
  await page.getByRole('button', { name: 'Leave it' }).click()
  await expect(dialog).toBeHidden()
  expect(await titles(page, 'Sketched')).toEqual(before)

  await page.getByLabel(`Select ${title}`).check()
  const bar = page.getByRole('region', { name: 'Selected combinations' })
  await expect(bar).toContainText('1 selected')
  await expect(bar.getByRole('link', { name: 'Build a kit' })).toHaveAttribute(
    'href',
    new RegExp(`${LINE}/kits\\?combinations=[0-9a-f-]{36}$`),
  )
  expect(await violationsOf(page)).toEqual([])
  await bar.getByRole('button', { name: 'Delete combination' }).click()
  await expect(page.getByRole('link', { name: title })).toHaveCount(0)
  await page.getByRole('button', { name: 'Undo', exact: true }).click()
  await expect(page.getByRole('link', { name: title })).toBeVisible()
  expect(await titles(page, 'Sketched')).toEqual(before)
})

test('by the mouse: a card is dragged into another lane and within it, and stays', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(BOARD)
  const title = 'Mustard on the North Side'
  const drag = async (to: string, y: 'above' | 'below') => {
    const from = (await page.getByRole('img', { name: new RegExp(`^${title}:`) }).boundingBox())!
    const target = (await page.getByRole('img', { name: new RegExp(`^${to}:`) }).boundingBox())!
    await page.mouse.move(from.x + 20, from.y + 20)
    await page.mouse.down()
    await page.mouse.move(from.x + 40, from.y + 40, { steps: 3 })
    const edge = y === 'above' ? target.y + 4 : target.y + target.height - 4
    await page.mouse.move(target.x + 30, edge, { steps: 8 })
  }
  const [top, next] = await titles(page, 'Short-listed')
  await drag(top!, 'below')
  await expect(spoken(page)).toContainText(`${title}, place 2 of`)
  await page.keyboard.press('Escape')
  await expect(spoken(page)).toContainText(`${title} is back where it was`)
  await page.mouse.up()
  expect((await titles(page, 'Short-listed')).slice(0, 2)).toEqual([top, next])

  await drag(top!, 'below')
  const first = sent(page)
  await page.mouse.up()
  await first
  expect((await titles(page, 'Short-listed')).slice(0, 3)).toEqual([top, title, next])
  await drag(top!, 'above')
  const second = sent(page)
  await page.mouse.up()
  await second
  await page.reload()
  expect((await titles(page, 'Short-listed')).slice(0, 3)).toEqual([title, top, next])
})

test('what one moves the other sees within 5 s, and a move beside what has gone is refused in words', async ({
  page,
  browser,
}) => {
  await signIn(page, 'designer')
  await page.goto(BOARD)
  const context = await browser.newContext()
  const other = await context.newPage()
  await signIn(other, 'owner')
  await other.goto(BOARD)

  const title = 'Lamps Lit Early'
  await handle(page, title).focus()
  await page.keyboard.press('Space')
  await page.keyboard.press('ArrowRight')
  await page.keyboard.press('End')
  const moved = sent(page)
  await page.keyboard.press('Space')
  await moved
  await expect(lane(other, 'Chosen').getByRole('link', { name: title })).toBeVisible({
    timeout: 5_000,
  })

  // The other hears of nothing any more, and moves a card under one that has left the lane.
  await other.route('**/api/brands/**/board*', (route) => route.abort())
  await handle(page, title).focus()
  await page.keyboard.press('Space')
  await page.keyboard.press('ArrowLeft')
  const back = sent(page)
  await page.keyboard.press('Space')
  await back
  const [stale] = await titles(other, 'Sketched')
  await handle(other, stale!).click()
  const dialog = other.getByRole('dialog')
  await dialog.getByText('Chosen', { exact: true }).click()
  const place = dialog.getByLabel('Place')
  const under = place.locator('option', { hasText: `under ${title}` })
  await place.selectOption((await under.getAttribute('value'))!)
  await dialog.getByRole('button', { name: 'Move combination' }).click()
  await expect(other.locator('main').getByRole('alert')).toContainText(
    `“${stale}” was not moved: the combinations beside its new place have been moved or deleted meanwhile`,
  )
  expect(await titles(other, 'Sketched')).toContain(stale)
  await other.unroute('**/api/brands/**/board*')
  await expect(lane(other, 'Short-listed').getByRole('link', { name: title })).toBeVisible()
  await context.close()
})

test('without a connection a move is kept, said so, kept over a reload, and sent once it is back', async ({
  page,
  complaints,
}) => {
  await signIn(page, 'designer')
  await page.goto(BOARD)
  const title = 'Breath on the Window'
  const cutOff = (route: import('@playwright/test').Route) =>
    route.request().method() === 'POST' ? route.abort() : route.continue()
  await page.route('**/combinations*', cutOff)
  await handle(page, title).click()
  const dialog = page.getByRole('dialog')
  await dialog.getByText('Chosen', { exact: true }).click()
  await dialog.getByRole('button', { name: 'Move combination' }).click()
  await expect(page.getByText('One move is kept here and sent as soon as')).toBeVisible()
  expect(await titles(page, 'Chosen')).toContain(title)
  await page.reload()
  await expect(page.getByText('One move is kept here and sent as soon as')).toBeVisible()
  expect(await titles(page, 'Chosen')).toContain(title)
  await page.unroute('**/combinations*', cutOff)
  const answered = sent(page)
  await page.getByRole('button', { name: 'Send moves again' }).click()
  await answered
  await expect(page.getByText('One move is kept here')).toBeHidden()
  await page.reload()
  expect(await titles(page, 'Chosen')).toContain(title)
  complaints.length = 0
})

test('the filter is in the address, and finds by title, shade, photograph and author', async ({
  page,
}) => {
  await signIn(page, 'marketer')
  await page.goto(BOARD)
  await page.getByLabel('Search title or shade').fill('prickly aunt')
  await expect(page).toHaveURL(/\?q=prickly\+aunt$/)
  await expect(page.locator('main').getByRole('listitem').getByRole('link')).toHaveText([
    'The Long Way Down',
  ])
  await page.reload()
  await expect(page.getByLabel('Search title or shade')).toHaveValue('prickly aunt')
  await expect(page.locator('main').getByRole('listitem').getByRole('link')).toHaveText([
    'The Long Way Down',
  ])
  await page.getByLabel('Photograph').selectOption({ label: 'Birches in mist' })
  await page.getByRole('button', { name: 'Show all combinations' }).click()
  await expect(page).toHaveURL(/\/combinations$/)
  await page.getByLabel('Author').selectOption({ index: 1 })
  await expect(page).toHaveURL(/\?author=/)
  // Who only looks has neither handles nor deletion, but may choose for a kit.
  await expect(page.getByRole('button', { name: /^Move / })).toHaveCount(0)
  await page.getByRole('button', { name: 'Select all in Chosen' }).click()
  const bar = page.getByRole('region', { name: 'Selected combinations' })
  await expect(bar.getByRole('link', { name: 'Build a kit' })).toBeVisible()
  await expect(bar.getByRole('button', { name: /^Delete/ })).toHaveCount(0)
})

test('a combination is begun with five empty places and opens', async ({ page }) => {
  await signIn(page, 'designer')
  await page.goto(BOARD)
  await page.getByRole('button', { name: 'Sketch a combination' }).click()
  await expect(page).toHaveURL(/\/combinations\/[0-9a-f-]{36}$/, { timeout: 20_000 })
  await expect(page.getByRole('heading', { level: 1 })).toContainText('A new sketch')
  await page.goto(BOARD)
  expect((await titles(page, 'Sketched'))[0]).toBe('A new sketch')
})

test('on a phone one lane is shown at a time, nothing is cut off, and all can be pressed', async ({
  page,
}) => {
  await page.setViewportSize({ width: 320, height: 640 })
  await signIn(page, 'designer')
  await page.goto(BOARD)
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await expect(lane(page, 'Chosen')).toBeHidden()
  await page
    .getByRole('group', { name: 'Lane shown' })
    .getByRole('button', { name: /^Chosen/ })
    .click()
  await expect(lane(page, 'Chosen')).toBeVisible()
  await expect(lane(page, 'Sketched')).toBeHidden()
  expect(await violationsOf(page)).toEqual([])
  const small = await page
    .locator('main :is(a, button, select, input:not([type=checkbox]), label:has([type=checkbox]))')
    .evaluateAll((all) =>
      all
        .filter((one) => one.checkVisibility())
        .filter((one) => {
          const { width, height } = one.getBoundingClientRect()
          // A link in running text is as high as its line.
          return one.tagName !== 'A' && (width < 24 || height < 24)
        })
        .map((one) => one.outerHTML),
    )
  expect(small).toEqual([])
})

test('with 300 combinations no lane draws more than it shows, and the last is reached by keyboard', async ({
  page,
}) => {
  await signIn(page, 'designer')
  const answer = await page.request.get(`/api/brands/teasel-and-tarn/lines/heronsway-dk/board`)
  const board = (await answer.json()) as { revision: number; cards: Record<string, unknown>[] }
  const many = Array.from({ length: 300 }, (_, n) => ({
    ...board.cards[n % board.cards.length],
    id: `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`,
    title: `Of three hundred, no. ${n}`,
    lane: ['sketched', 'short-listed', 'chosen'][Math.floor(n / 100)],
  }))
  await page.route('**/heronsway-dk/board*', (route) =>
    route.fulfill({ json: { ...board, revision: board.revision + 1_000, cards: many } }),
  )
  await page.goto(BOARD)
  await expect(page.getByText('300 on the board')).toBeVisible()
  for (const name of ['Sketched', 'Short-listed', 'Chosen']) {
    expect(await lane(page, name).getByRole('listitem').count()).toBeLessThan(20)
  }
  const first = page.getByRole('button', { name: /no\. 0, place 1 of 100 in Sketched/ })
  await first.focus()
  await page.keyboard.press('Space')
  await page.keyboard.press('End')
  await expect(spoken(page)).toContainText('no. 0, place 100 of 100 in Sketched')
  await expect(page.getByRole('button', { name: /no\. 0, place 100 of 100/ })).toBeFocused()
  expect(await lane(page, 'Sketched').getByRole('listitem').count()).toBeLessThan(20)
  await page.keyboard.press('Escape')
  await expect(first).toBeFocused()
})
