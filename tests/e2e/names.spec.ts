import { copyRow } from './support/places'
import { database } from './support/database'
import { letterTo } from './support/letters'
import { overflowOf, violationsOf } from './support/page-checks'
import { makeBrandWithPeople, type TestPerson } from './support/people'
import { expect, test, type Locator, type Page } from './support/test'

const NAMES = ['Kettle Off the Hob', 'Larkless Morning', 'Peg and Barrow'] as const

/** A line after the demo's, in a brand of its own: three shades, one of them in a combination. */
async function makeLine(slug: string): Promise<void> {
  const client = await database()
  try {
    const { rows } = await client.query<Record<'brand' | 'line' | 'combination', string>>(
      `SELECT brands.id AS brand, lines.id AS line,
         (SELECT id FROM combinations WHERE line_id = lines.id AND deleted_at IS NULL LIMIT 1)
           AS combination
       FROM brands, lines WHERE brands.slug = $1 AND lines.slug = 'heronsway-dk'`,
      [slug],
    )
    const [demo] = rows
    const own = { brand_id: demo!.brand, request_key: null }
    const line = await copyRow(client, 'lines', demo!.line, { ...own, name: 'Wether DK' })
    const demoShades = await client.query<{ id: string }>(
      'SELECT id FROM shades WHERE line_id = $1 AND deleted_at IS NULL ORDER BY position LIMIT 3',
      [demo!.line],
    )
    const inLine = { ...own, line_id: line, family_id: null, family_position: null, name: null }
    const shades: string[] = []
    for (const [at, { id }] of demoShades.rows.entries())
      shades.push(await copyRow(client, 'shades', id, { ...inLine, number: `${at + 1}` }))
    const combination = await copyRow(client, 'combinations', demo!.combination, {
      ...own,
      line_id: line,
      photograph_id: null,
      created_by_id: null,
      title: 'Hob and hearth',
    })
    await client.query(
      `INSERT INTO combination_places (brand_id, combination_id, place, role, shade_id, share)
       VALUES ($1, $2, 1, 'MC', $3, 1)`,
      [demo!.brand, combination, shades[0]],
    )
    await client.query(
      `INSERT INTO name_reviewers (brand_id, line_id, person_id)
       SELECT brand_id, $2, person_id FROM memberships WHERE brand_id = $1 AND role = 'designer'`,
      [demo!.brand, line],
    )
  } finally {
    await client.end()
  }
}

async function signInAs(page: Page, { email, password }: TestPerson) {
  await page.context().clearCookies()
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.keyboard.press('Enter')
  await expect(page).not.toHaveURL(/sign-in/)
}

test('names are drafted, reviewed by keyboard alone, approved, and stand wherever their shade does', async ({
  page,
}) => {
  // Three people sign in, each by the form.
  test.setTimeout(120_000)
  const { slug, people } = await makeBrandWithPeople('Wether & Wold', [
    'owner',
    'marketer',
    'designer',
  ])
  await makeLine(slug)
  const line = `/${slug}/lines/heronsway-dk`
  const inFront = (name: string) => page.getByRole('heading', { level: 2, name, exact: true })
  const region = page.getByRole('region', { name: 'Names in review' })
  const spoken = region.getByRole('status').first()

  // A marketer drafts in the list and sends all of it at once.
  await signInAs(page, people.marketer)
  await page.goto(`${line}/names`)
  for (const [at, name] of NAMES.entries()) {
    const cell = page.getByRole('button', { name: `Name for No. ${at + 1}: edit` })
    await cell.press('Enter')
    await page.getByRole('textbox', { name: `Name for No. ${at + 1}` }).fill(name)
    await page.keyboard.press('Enter')
    await expect(cell).toBeFocused()
    await page.getByLabel(`Choose ${name}`).check()
  }
  await page
    .getByRole('region', { name: 'Chosen names' })
    .getByRole('button', { name: 'Send for review' })
    .click()
  await expect(page.getByText('3 names sent for review.')).toBeVisible()

  // They see the review and may talk, and the keys of a decision do nothing for them.
  await page.goto(`${line}/names/review`)
  await expect(inFront(NAMES[0])).toBeVisible()
  await page.keyboard.press('a')
  await expect(spoken).toHaveText('That is not yours to decide.')
  await page.keyboard.press('t')
  await page.keyboard.type('The colour of old aluminium.')
  await page.keyboard.press('Control+Enter')
  await expect(page.getByText('The colour of old aluminium.', { exact: true })).toBeVisible()

  // The appointed reviewer says what they think without a mouse.
  await signInAs(page, people.designer)
  await page.goto(`${line}/names/review`)
  await expect(inFront(NAMES[0])).toBeVisible()
  await page.keyboard.press('c')
  await page.keyboard.type('It says kitchen.')
  await page.keyboard.press('Escape')
  await page.keyboard.press('y')
  await expect(spoken).toHaveText('You said: Yes.')
  await expect(region.getByRole('listitem').filter({ hasText: 'It says kitchen.' })).toContainText(
    'The designer (you)',
  )
  expect(await violationsOf(page)).toEqual([])
  await page.keyboard.press('ArrowRight')
  await expect(inFront(NAMES[1])).toBeFocused()
  await page.keyboard.press('r')
  await page.keyboard.type('Larks are what people look for here.')
  await page.keyboard.press('Control+Enter')
  await expect(inFront(NAMES[2])).toBeFocused()
  await expect(spoken).toContainText('2 names are left.')

  // A press that comes before the name can have been read is not taken.
  const pressOnceRead = (key: string, then: Locator) =>
    expect(async () => {
      await page.keyboard.press(key)
      await expect(then).toBeFocused({ timeout: 500 })
    }).toPass()

  // The owner sees what was said, takes one decision back, and comes to the end.
  await signInAs(page, people.owner)
  await page.goto(`${line}/names/review`)
  await expect(inFront(NAMES[0])).toBeVisible()
  await expect(region.getByText('It says kitchen.')).toBeVisible()
  await page.keyboard.press('a')
  await expect(inFront(NAMES[2])).toBeFocused()
  await page.keyboard.press('z')
  await expect(inFront(NAMES[0])).toBeFocused()
  await pressOnceRead('a', inFront(NAMES[2]))
  await pressOnceRead('p', inFront('Every name is decided'))
  await expect(region.getByText(/In this sitting: 1 approved, 1 put by\./)).toBeVisible()
  await expect(region.getByText('1 of 3 shades have a name.')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])

  // The approved name stands in the sample book and on the board; the others show their number.
  await page.goto(`${line}/shades`)
  const book = page.locator('main')
  await expect(book.getByRole('link', { name: NAMES[0] })).toBeVisible()
  await expect(book.getByRole('link', { name: 'No. 2' })).toBeVisible()
  await page.goto(`${line}/combinations`)
  await expect(page.locator('main').getByText(NAMES[0]).first()).toBeVisible()

  // All three came to the reviewer in one letter.
  await letterTo(people.designer.email, '3 names to review for Wether DK')
})

test('a name has a page with its moves, its searches and its history, on a phone too', async ({
  page,
}) => {
  const { slug, people } = await makeBrandWithPeople('Wether & Wold', ['owner'])
  await makeLine(slug)
  const line = `/${slug}/lines/heronsway-dk`
  await signInAs(page, people.owner)
  await page.setViewportSize({ width: 320, height: 700 })
  await page.goto(`${line}/names`)
  const cell = page.getByRole('button', { name: 'Name for No. 1: edit' })
  await cell.press('Enter')
  await page.getByRole('textbox', { name: 'Name for No. 1' }).fill(NAMES[0])
  await page.keyboard.press('Enter')
  await expect(cell).toBeFocused()
  await page.getByLabel(`Choose ${NAMES[0]}`).check()
  await page
    .getByRole('region', { name: 'Chosen names' })
    .getByRole('button', { name: 'Send for review' })
    .click()
  await expect(page.getByText('1 name sent for review.')).toBeVisible()
  await page.goto(`${line}/names/review`)
  expect(await overflowOf(page)).toBe(0)
  await page.getByRole('link', { name: /^Open the page of this name/ }).click()
  await expect(page.getByRole('heading', { level: 1, name: NAMES[0] })).toBeVisible()

  // The only owner may approve their own; to open it again asks why.
  await page.getByRole('button', { name: 'Approve name' }).press('Enter')
  await page.getByRole('button', { name: 'Open name again' }).press('Enter')
  await page.getByRole('textbox', { name: 'Why is it opened again?' }).fill('The hob is gas.')
  await page.keyboard.press('Control+Enter')
  await expect(page.getByRole('button', { name: 'Take back from review' })).toBeVisible()
  await page.getByRole('button', { name: 'Take back from review' }).press('Enter')
  await page.getByRole('textbox', { name: 'The thought behind it' }).fill('Steam, then quiet.')
  await page.getByRole('button', { name: 'Save words' }).press('Enter')
  await expect(page.getByText(`“${NAMES[0]}” saved.`)).toBeVisible()

  await page.getByRole('button', { name: 'Record search' }).press('Enter')
  const form = page.getByRole('form', { name: 'Record search' })
  await expect(form.getByLabel('Register')).toBeFocused()
  await form.getByRole('button', { name: 'Record search' }).press('Enter')
  await expect(form.getByText('Say which register.')).toBeVisible()
  await form.getByLabel('Register').fill('The register of the county')
  await form.getByLabel('Searched by').fill('The owner')
  await form.getByLabel('Searched on').fill('2026-11-20')
  await form.getByRole('button', { name: 'Record search' }).press('Enter')
  await expect(page.getByText('The owner, 20 November 2026')).toBeVisible()
  await expect(page.getByText(/This is not a clearance search/)).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  expect(await overflowOf(page)).toBe(0)

  const history = page
    .locator('section')
    .filter({ has: page.getByRole('heading', { level: 2, name: 'History' }) })
  await expect(history.getByText('The hob is gas.')).toBeVisible()
  await expect(history.getByRole('listitem')).toHaveCount(5)
  await page.getByRole('button', { name: 'Delete name' }).press('Enter')
  await expect(page).toHaveURL(new RegExp(`${line}/names$`))
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(page.getByText(`“${NAMES[0]}” is back.`)).toBeVisible()
})
