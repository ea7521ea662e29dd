import { readFileSync } from 'node:fs'
import { join } from 'node:path'

import type pg from 'pg'
import sharp from 'sharp'

import { BRAND, LINE, signIn, signOut } from './support/accounts'
import { database } from './support/database'
import { expect, test, type Page } from './support/test'

let client: pg.Client
test.beforeAll(async () => {
  client = await database()
})
test.afterAll(() => client.end())

interface LogLine {
  msg: string
  requestId?: string
  reference?: string
  [field: string]: unknown
}

/** All that a process of the product has said so far. */
const textOf = (name: 'web' | 'jobs') =>
  readFileSync(join(process.env.WOADMAP_LOCAL!, 'logs', `${name}.log`), 'utf8')

/** The lines of its log. */
function logOf(name: 'web' | 'jobs'): LogLine[] {
  return textOf(name)
    .split('\n')
    .flatMap((line) => (line.startsWith('{') ? [JSON.parse(line)] : []))
}

const rowsOf = async (condition: string, values: unknown[] = []) =>
  (
    await client.query(
      `SELECT activities.*, people.email FROM activities LEFT JOIN people ON people.id = person_id
       WHERE ${condition} ORDER BY activities.created_at`,
      values,
    )
  ).rows

async function renameCombination(page: Page, from: string, to: string) {
  await page.goto(`${LINE}/combinations`)
  await page.getByRole('link', { name: from }).first().click()
  await page.getByRole('button', { name: 'Rename combination' }).click()
  await page.getByLabel('Title').fill(to)
  await page.getByLabel('Title').press('Enter')
  await expect(page.locator('[data-saving=saved]')).toBeVisible()
  await expect(page.getByRole('heading', { level: 1 })).toContainText(to)
}

test('what a colleague did stands in the owner’s record, is narrowed, opened in detail and taken away', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await renameCombination(page, 'Lamps Lit Early', 'Lamps Lit Late')
  await renameCombination(page, 'Lamps Lit Late', 'Lamps Lit Early')
  await expect(page.getByRole('link', { name: 'Activity record' })).toHaveCount(0)
  await signOut(page)

  await signIn(page, 'owner')
  await page.getByRole('link', { name: 'Activity record' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Activity record')
  const sheet = page.getByRole('main')
  const entries = sheet.getByRole('listitem')
  const renamed = entries.filter({
    hasText: 'renamed the combination Lamps Lit Early to Lamps Lit Late',
  })
  await expect(renamed).toHaveCount(1)
  await expect(renamed.getByText('was Lamps Lit Early; now Lamps Lit Late')).toBeHidden()
  await renamed.getByText('In detail').click()
  await expect(renamed.getByText('was Lamps Lit Early; now Lamps Lit Late')).toBeVisible()

  await page.getByLabel('What', { exact: true }).selectOption({ label: 'Combination renamed' })
  await page.getByLabel('Who', { exact: true }).selectOption({ label: 'Anjali Fellgarth' })
  await page.getByRole('button', { name: 'Show entries' }).click()
  await expect(page).toHaveURL(/what=combination\.renamed/)
  await page.getByRole('link', { name: 'Show all', exact: true }).click()
  await expect(entries.filter({ hasText: 'signed in' }).first()).toBeVisible()
  await page.getByLabel('What', { exact: true }).selectOption({ label: 'Combination renamed' })
  await page.getByRole('button', { name: 'Show entries' }).click()
  await expect(entries.filter({ hasText: 'signed in' })).toHaveCount(0)
  await expect(renamed).toHaveCount(1)

  const [file] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: 'Save as CSV' }).click(),
  ])
  expect(file.suggestedFilename()).toBe(`${BRAND}-activity.csv`)
  const text = readFileSync(await file.path(), 'utf8')
  expect(text).toContain('renamed the combination Lamps Lit Early to Lamps Lit Late')
  expect(text).not.toContain('signed in')

  await page.goto(`/${BRAND}/activity?what=activity`)
  await expect(
    entries.filter({ hasText: 'took this record away as a CSV file' }).first(),
  ).toBeVisible()
  await page.goto(`/${BRAND}/activity?from=2000-01-01&to=2000-01-02`)
  await expect(page.getByRole('heading', { name: 'No entry fits that' })).toBeVisible()
  await page.goto(`/${BRAND}/activity?what=nonsense&person=%27&from=x&before=y`)
  await expect(entries.filter({ hasText: 'signed in' }).first()).toBeVisible()
})

test('what a role does not include is refused and recorded, once a minute for the same thing', async ({
  page,
}) => {
  await signIn(page, 'dyer')
  for (let times = 0; times < 3; times++) {
    expect((await page.goto(`/${BRAND}/activity`))!.status()).toBe(403)
    expect((await page.request.get(`/api/brands/${BRAND}/activity.csv`)).status()).toBe(403)
  }
  const refused = "action = 'access.refused' AND people.email LIKE 'dyer%'"
  const asked = async () => (await rowsOf(refused)).map(({ after }) => after)
  await expect.poll(asked).toContainEqual({ page: `/${BRAND}/activity` })
  await expect.poll(asked).toContainEqual({ asked: 'exportActivity' })
  const rows = await asked()
  expect(rows.filter(({ page: one }) => one === `/${BRAND}/activity`)).toHaveLength(1)
  expect(rows.filter(({ asked: one }) => one === 'exportActivity')).toHaveLength(1)
  await page.goto(`/${BRAND}`)
  await signOut(page)
  await signIn(page, 'owner')
  await page.goto(`/${BRAND}/activity?what=access`)
  await expect(page.getByText(`was refused the page /${BRAND}/activity`).first()).toBeVisible()
  await expect(page.getByText('was refused: export activity').first()).toBeVisible()
})

test('a refusal that cannot be recorded is still a refusal, and the log says so', async ({
  page,
}) => {
  await signIn(page, 'dyer')
  await client.query('REVOKE INSERT ON activities FROM woadmap_web')
  try {
    const answer = await page.goto(`${LINE}/edit`)
    expect(answer!.status()).toBe(403)
    const requestId = answer!.headers()['x-request-id']
    await expect
      .poll(() => logOf('web').filter((line) => line.requestId === requestId))
      .toContainEqual(expect.objectContaining({ msg: 'a refusal was not recorded' }))
  } finally {
    await client.query('GRANT INSERT ON activities TO woadmap_web')
  }
})

test('one request’s id stands in its answer, its log line, the record, the job and the job’s log line', async ({
  page,
}) => {
  await signIn(page, 'designer')
  await page.goto(`${LINE}/photographs`)
  const picture = sharp({
    create: {
      width: 400,
      height: 300,
      channels: 3,
      background: '#6a7b4f',
      noise: { type: 'gaussian', mean: 120, sigma: 30 },
    },
  })
  const confirmed = page.waitForResponse((response) => response.url().endsWith('/confirm'))
  await page.getByLabel('Photographs from files').setInputFiles({
    name: 'request.jpg',
    mimeType: 'image/jpeg',
    buffer: await picture.jpeg().toBuffer(),
  })
  const answer = await confirmed
  expect(answer.status()).toBe(200)
  const requestId = answer.headers()['x-request-id']!
  expect(requestId).toMatch(/^[0-9a-f-]{36}$/)

  const [row] = await rowsOf('request_id = $1', [requestId])
  expect(row).toMatchObject({ action: 'photograph.added', email: 'designer@teasel.example' })
  await expect
    .poll(() => logOf('web').filter((line) => line.requestId === requestId))
    .toEqual([expect.objectContaining({ msg: 'request', method: 'POST', status: 200 })])
  const jobs = await client.query(
    `SELECT data FROM pgboss.job WHERE name = 'read-photograph' AND data->>'requestId' = $1`,
    [requestId],
  )
  expect(jobs.rows).toEqual([{ data: { photographId: row.object_id, requestId } }])
  await expect
    .poll(() => logOf('jobs').filter((line) => line.requestId === requestId), { timeout: 20_000 })
    .toContainEqual(expect.objectContaining({ msg: 'job done', job: 'read-photograph' }))
})

test('an error that nobody expected is masked, and its reference finds its log line', async ({
  page,
  complaints,
}) => {
  await signIn(page, 'owner')
  await client.query('ALTER TABLE combinations RENAME TO combinations_away')
  try {
    const response = await page.goto(`${LINE}/combinations`)
    expect(response!.status()).toBe(500)
    const told = page.getByRole('alert').filter({ hasText: 'This page could not be read' })
    await expect(told).toBeVisible()
    await expectLogged(await told.textContent(), await response!.text())
    // React says in the console that the server has left out the error's words.
    for (const complaint of complaints.splice(0)) expect(complaint).toContain('React error #441')
  } finally {
    await client.query('ALTER TABLE combinations_away RENAME TO combinations')
  }

  await client.query('ALTER TABLE shades RENAME TO shades_away')
  try {
    const answer = await page.request.get(`/api/brands/${BRAND}/lines/heronsway-dk/shades.csv`)
    expect(answer.status()).toBe(500)
    const { message, ...rest } = await answer.json()
    expect(rest).toEqual({ ok: false, code: 'unexpected' })
    await expectLogged(message, message)
  } finally {
    await client.query('ALTER TABLE shades_away RENAME TO shades')
  }
})

test('nor does signing in tell more, nor open, while it cannot be done', async ({ page }) => {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill('owner@teasel.example')
  await page.getByLabel('Password').fill('not asked for')
  await client.query('ALTER TABLE people RENAME TO people_away')
  try {
    const answered = page.waitForResponse((one) => one.url().includes('/callback/credentials'))
    await page.getByRole('button', { name: 'Sign in' }).click()
    const told = page.getByRole('alert').filter({ hasText: 'Something went wrong on our side' })
    await expect(told).toBeVisible()
    await expectLogged(await told.textContent(), await (await answered).text())
  } finally {
    await client.query('ALTER TABLE people_away RENAME TO people')
  }
  await expect(page).toHaveURL(/\/sign-in/)
})

/** The reference in the words shown finds one line of the log, which says what the words do not. */
async function expectLogged(words: string | null, sent: string) {
  const reference = /reference ([0-9a-f]{8})\b/.exec(words ?? '')?.[1]
  expect(reference).toBeDefined()
  const lines = () => logOf('web').filter((line) => line.reference === reference)
  await expect.poll(lines).not.toHaveLength(0)
  const [line] = lines()
  const { message } = line!.err as { message: string }
  expect(line!.requestId).toMatch(new RegExp(`^${reference}`))
  expect(message).toMatch(/relation "\w+" does not exist/)
  for (const secret of [message, 'does not exist', 'SequelizeDatabaseError', 'SELECT']) {
    expect(sent).not.toContain(secret)
  }
  expect(textOf('web')).not.toContain('parameters:')
}
