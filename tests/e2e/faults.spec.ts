import type pg from 'pg'

import { BRAND, LINE, signIn } from './support/accounts'
import { crashDatabase, database } from './support/database'
import { expect, test, type Page } from './support/test'

async function fillLine(page: Page, name: string) {
  await page.goto(`/${BRAND}/lines/new`)
  await page.getByLabel('Name', { exact: true }).fill(name)
  await page.getByLabel('Fibre 1', { exact: true }).fill('wool')
  await page.getByLabel('Per cent of fibre 1').fill('100')
  const numbers = {
    Ply: '3',
    'Net weight of a ball, g': '100',
    'Length of a ball': '225',
    'Needle, mm': '4',
    'Stitches to 10 cm': '22',
    'Rows to 10 cm': '30',
    'Price of a ball': '21.50',
  }
  for (const [label, value] of Object.entries(numbers)) await page.getByLabel(label).fill(value)
}

const countLines = async (client: pg.Client, name: string) =>
  (await client.query('SELECT count(*)::int AS n FROM lines WHERE name = $1', [name])).rows[0].n

test('a restart of the database during a save is told, keeps the form, and makes one row after all', async ({
  page,
}) => {
  const name = 'Line of the lost connection'
  await signIn(page, 'owner')
  await fillLine(page, name)
  let client = await database()
  try {
    await client.query('BEGIN; LOCK TABLE lines IN EXCLUSIVE MODE')
    await page.getByRole('button', { name: 'Make line' }).click()
    const waiting = 'SELECT count(*)::int AS n FROM pg_locks WHERE NOT granted'
    await expect
      .poll(async () => (await client.query(waiting)).rows[0].n, { intervals: [50] })
      .toBeGreaterThan(0)
    await crashDatabase(client)
    const told = page.getByRole('alert').filter({ hasText: 'database did not answer' })
    await expect(told).toBeVisible()
    await expect(page.getByLabel('Name', { exact: true })).toHaveValue(name)
    await expect(async () => (client = await database())).toPass()
    expect(await countLines(client, name)).toBe(0)
    await page.getByRole('button', { name: 'Make line' }).click()
    await expect(page).toHaveURL(/\/lines\/line-of-the-lost-connection\/shades/)
    expect(await countLines(client, name)).toBe(1)
  } finally {
    await client.end()
  }
})

test('a save whose answer is lost makes one row, and saying it again gives that one', async ({
  page,
}) => {
  const name = 'Line of the lost answer'
  await signIn(page, 'owner')
  await fillLine(page, name)
  const client = await database()
  try {
    // The server does its work; the browser never hears of it.
    await page.route('**/lines/new', async (route) => {
      if (route.request().method() !== 'POST') return route.fallback()
      await route.fetch()
      await route.abort('connectionreset')
    })
    await page.getByRole('button', { name: 'Make line' }).click()
    await expect(
      page.getByRole('alert').filter({ hasText: 'Nothing you typed is lost' }),
    ).toBeVisible()
    expect(await countLines(client, name)).toBe(1)
    await page.unroute('**/lines/new')
    await page.getByRole('button', { name: 'Make line' }).click()
    await expect(page).toHaveURL(/\/lines\/line-of-the-lost-answer\/shades/)
    expect(await countLines(client, name)).toBe(1)
  } finally {
    await client.end()
  }
})

test('a store that breaks off mid-upload keeps the file in the list, and a retry brings it in once', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(`${LINE}/photographs`)
  await page.route(`${process.env.S3_PUBLIC_ENDPOINT ?? process.env.S3_ENDPOINT}/**`, (route) =>
    route.abort('connectionreset'),
  )
  const file = '/usr/share/backgrounds/mate/nature/Storm.jpg'
  await page.getByLabel('Photographs from files').setInputFiles(file)
  const rows = page.getByRole('region', { name: 'Files being added' })
  await expect(rows.getByText('Sending broke off. The file is kept here')).toBeVisible()
  await page.unrouteAll()
  await rows.getByRole('button', { name: 'Retry Storm.jpg' }).click()
  await expect(rows.getByRole('link', { name: 'Open photograph' })).toBeVisible({ timeout: 20_000 })
  await page.getByLabel('Photographs from files').setInputFiles(file)
  await expect(rows.getByText('The line has this file already')).toBeVisible()
  const client = await database()
  try {
    const same = await client.query(
      `SELECT count(*)::int AS n FROM photographs WHERE file_name = 'Storm.jpg' AND deleted_at IS NULL`,
    )
    expect(same.rows[0].n).toBe(1)
  } finally {
    await client.end()
  }
})
