import { QueryTypes, type Transaction } from 'sequelize'
import { beforeAll, expect, it } from 'vitest'

import { down, up } from '@/migrations/2026.12.01T23.00.00-names'
import { sequelize, type Line } from '@/models'
import { makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShade } from '@/tests/factories/shade'

let line: Line

beforeAll(async () => {
  line = await makeLine(await makeBrand())
  const named = [
    { name: 'Moss', status: 'target' as const },
    { name: 'Low Sun', status: 'approved' as const },
    { name: 'Quiet Pond', status: 'retired' as const },
    { name: null, status: 'dipped' as const },
    { name: 'Long Gone', status: 'dipped' as const },
  ]
  for (const [position, values] of named.entries()) {
    const shade = await makeShade(line, { position, ...values })
    if (values.name === 'Long Gone') await shade.destroy()
  }
})

/** Runs the work on the tables as they were before the migration, and leaves no trace of it. */
async function beforeNames(work: (to: Parameters<typeof up>[0]) => Promise<void>): Promise<void> {
  const done = new Error('done')
  const all = sequelize().transaction(async (transaction) => {
    const to = { query: sequelize().getQueryInterface(), transaction }
    await down(to)
    await work(to)
    throw done
  })
  await expect(all).rejects.toBe(done)
}

const read = (sql: string, transaction: Transaction) =>
  sequelize().query(sql, { bind: [line.id], type: QueryTypes.SELECT, transaction })

it('a name that was typed becomes a draft of nobody’s, and a retired shade keeps its own', async () => {
  await beforeNames(async (to) => {
    await up(to)
    const ideas = await read(
      `SELECT i.text, i.state, i.round, author_id, move, to_state FROM name_ideas i
       JOIN name_moves m ON m.idea_id = i.id WHERE i.line_id = $1 ORDER BY i.text`,
      to.transaction,
    )
    const draft = { state: 'draft', round: 0, author_id: null, move: 'add', to_state: 'draft' }
    expect(ideas).toEqual([
      { ...draft, text: 'Long Gone' },
      { ...draft, text: 'Low Sun' },
      { ...draft, text: 'Moss' },
      { ...draft, text: 'Quiet Pond', state: 'approved', to_state: 'approved' },
    ])
    const shades = await read(
      'SELECT name FROM shades WHERE line_id = $1 ORDER BY position',
      to.transaction,
    )
    expect(shades).toEqual([null, null, 'Quiet Pond', null, null].map((name) => ({ name })))
  })
})

it('a brand sees the ideas of no other, once the tables are made', async () => {
  await beforeNames(async (to) => {
    await up(to)
    const closed = await sequelize().query<{ name: string }>(
      `SELECT relname AS name FROM pg_class
       WHERE relname ~ '^(name_|naming_)' AND relkind = 'r' AND NOT relrowsecurity`,
      { type: QueryTypes.SELECT, transaction: to.transaction },
    )
    expect(closed).toEqual([])
  })
})

it('taken back, it gives a shade without a name the name of its draft', async () => {
  const shade = await makeShade(line, { position: 9 })
  await makeIdea(line, shade, { text: 'High Fell' })
  await makeIdea(line, shade, { text: 'Put Away', state: 'put-by' })
  await beforeNames(async ({ transaction }) => {
    const [now] = await read(
      'SELECT name FROM shades WHERE line_id = $1 AND position = 9',
      transaction,
    )
    expect(now).toEqual({ name: 'High Fell' })
  })
})
