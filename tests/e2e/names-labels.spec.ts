import { randomUUID } from 'node:crypto'

import { BRAND, signIn } from './support/accounts'
import { database } from './support/database'
import { overflowOf, violationsOf } from './support/page-checks'
import { copyRow } from './support/places'
import { expect, test } from './support/test'

const PX_PER_MM = 96 / 25.4
const SLUG = `labels-${randomUUID()}`
const LABELS = `/${BRAND}/lines/${SLUG}/names/labels`

/** A copy of the demo's line with three of its shades, two of them named: locks hold the whole line. */
test.beforeAll(async () => {
  const client = await database()
  const { rows: shades } = await client.query(
    `SELECT shades.id, shades.brand_id, line_id FROM shades JOIN lines ON lines.id = line_id
     WHERE lines.slug = 'heronsway-dk' AND deleted_at IS NULL ORDER BY position LIMIT 3`,
  )
  const { brand_id, line_id } = shades[0]
  const line = await copyRow(client, 'lines', line_id, {
    slug: SLUG,
    name: 'Labelled DK',
    request_key: null,
  })
  const names = ['Thyme Will Tell', 'Olive and Let Live', null]
  for (const [at, name] of names.entries()) {
    const shade = await copyRow(client, 'shades', shades[at].id, {
      line_id: line,
      family_id: null,
      number: `L${at + 1}`,
      request_key: null,
      name,
      status: 'approved',
    })
    if (name)
      await client.query(
        `INSERT INTO name_ideas (brand_id, line_id, shade_id, text, state)
         VALUES ($1, $2, $3, $4, 'approved')`,
        [brand_id, line, shade, name],
      )
  }
  await client.end()
})

test.afterAll(async () => {
  const client = await database()
  await client.query('DELETE FROM shades USING lines WHERE lines.id = line_id AND slug = $1', [
    SLUG,
  ])
  await client.query('DELETE FROM lines WHERE slug = $1', [SLUG])
  await client.end()
})

test('an owner sets the label, locks names, opens one and then all, and takes them to the printer', async ({
  page,
}) => {
  test.setTimeout(120_000)
  await signIn(page, 'owner')
  await page.goto(LABELS)
  await expect(page.getByText('2 of 3 shades of Labelled DK named')).toBeVisible()
  await expect(page.getByRole('link', { name: 'No. L3' })).toBeVisible()

  // The label follows what is typed before it is saved.
  const form = page.getByRole('form', { name: 'Settings of names' })
  await expect(form.getByText('All 2 names fit')).toBeVisible()
  await form.getByText('One', { exact: true }).click()
  await form.getByLabel('Room for the name, mm').fill('34')
  await expect(form.getByText('2 of 2 names do not fit', { exact: true })).toBeVisible()
  await expect(form.getByRole('img', { name: /mm too wide/ })).toBeVisible()
  await form.getByText('Up to two', { exact: true }).click()
  await expect(form.getByText('All 2 names fit')).toBeVisible()
  await form.getByLabel('Care in words').fill('Wash by hand.')
  await form.getByLabel('Theme words').fill('harbour, low tide')
  await form.getByLabel('Print date').fill('2001-01-01')
  await form.getByRole('button', { name: 'Save settings' }).click()
  await expect(form.getByText('That day is past. Choose today or a later one.')).toBeVisible()
  await form.getByLabel('Print date').fill('2099-03-20')
  await form.getByRole('button', { name: 'Save settings' }).click()
  await expect(page.getByText('Open until 20 March 2099')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])

  await page.getByRole('button', { name: 'Lock names now' }).click()
  await page.getByRole('alertdialog').getByRole('button', { name: 'Lock names' }).click()
  await expect(page.getByText(/^Locked since/)).toBeVisible()

  // One name is opened, with a reason.
  const row = page.getByRole('row', { name: /Thyme Will Tell/ })
  await row.getByRole('button', { name: 'Unlock Thyme Will Tell…' }).click()
  const dialog = page.getByRole('dialog')
  await dialog.getByRole('button', { name: 'Unlock name' }).click()
  await expect(dialog.getByText('Say why: it stands in the history.')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  await dialog.getByLabel('Reason').fill('A slip of the pen.')
  await dialog.getByRole('button', { name: 'Unlock name' }).click()
  await expect(row.getByText('Unlocked')).toBeVisible()
  await page.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(page)).toBeLessThanOrEqual(0)
  await page.setViewportSize({ width: 1280, height: 900 })

  // The proof has its true size on paper.
  await page.goto(`${LABELS}/proof`)
  await page.emulateMedia({ media: 'print' })
  const widthOf = async (name: RegExp) =>
    (await page.getByRole('img', { name }).boundingBox())!.width / PX_PER_MM
  expect(await widthOf(/A line of 100 mm/)).toBeCloseTo(100.4, 1)
  expect(await widthOf(/No\. L1$/)).toBeCloseTo(34 + 8, 1)
  await expect(page.getByText('not on this sheet: No. L3.')).toBeVisible()
  await page.emulateMedia({ media: null })
  const file = await page.request.get(`/api/brands/${BRAND}/lines/${SLUG}/labels.csv`)
  expect((await file.text()).split('\r\n').slice(1)).toEqual([
    expect.stringMatching(/^L1,Thyme Will Tell,.*,Wash by hand\.,$/),
    expect.stringMatching(/^L2,Olive and Let Live,.*,Wash by hand\.,$/),
    '',
  ])

  await page.goto(LABELS)
  await page.getByRole('button', { name: 'Lift the lock…' }).click()
  await dialog.getByLabel('Reason').fill('The printer is late.')
  await dialog.getByRole('button', { name: 'Lift the lock' }).click()
  await expect(page.getByText('Open, without a print date')).toBeVisible()
  await expect(form.getByLabel('Print date')).toHaveValue('')

  await page.getByRole('link', { name: 'History', exact: true }).click()
  await expect(page.getByText('A slip of the pen.')).toBeVisible()
  await expect(page.getByText(/lifted the lock .*The printer is late\./)).toBeVisible()
})
