import { randomUUID } from 'node:crypto'

import { QueryTypes, Sequelize } from 'sequelize'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { digest } from '@/lib/auth/seal'
import {
  Family,
  inTransaction,
  Invitation,
  Kit,
  Line,
  NameRemark,
  NameReviewer,
  NameSearch,
  NameVote,
  NamingSettings,
  Photograph,
  Reading,
  sequelize,
} from '@/models'
import { withinScope } from '@/models/scope'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

/** As the web's role, over one connection of its own. */
const web = new Sequelize(process.env.DATABASE_WEB_URL!, {
  dialect: 'postgres',
  logging: false,
  pool: { max: 1 },
})
afterAll(() => web.close())

let ours: string
let theirs: string
let tables: string[]

beforeAll(async () => {
  const made = await Promise.all(
    ['Ours', 'Theirs'].map(async (name) => {
      const brand = await makeBrand(name)
      const owner = await makeActor(brand)
      await fillBrand(owner)
      return brand.id
    }),
  )
  ours = made[0]!
  theirs = made[1]!
  const found = await sequelize().query<{ name: string }>(
    `SELECT c.relname AS name FROM pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
     JOIN pg_attribute a ON a.attrelid = c.oid AND a.attname = 'brand_id' AND NOT a.attisdropped
     WHERE n.nspname = 'public' AND c.relkind IN ('r', 'p') ORDER BY 1`,
    { type: QueryTypes.SELECT },
  )
  tables = found.map(({ name }) => name)
})

/** A row in every table that has a brand. */
async function fillBrand(owner: Actor): Promise<void> {
  const { brandId, personId } = owner
  const line = await makeLine({ id: brandId })
  const shades = await makeShades(line, 5)
  const photograph = await Photograph.create({
    brandId,
    lineId: line.id,
    title: 'A picture',
    fileName: 'a.jpg',
    objectKey: randomUUID(),
    contentType: 'image/jpeg',
    byteLength: 1,
    sha256: digest(randomUUID()),
    state: 'ready',
  })
  await Reading.create({
    brandId,
    photographId: photograph.id,
    cells: [],
    cellMap: Buffer.alloc(0),
    mapWidth: 0,
    mapHeight: 0,
    striking: [],
    matches: [],
    shadesRevision: 1,
  })
  await makeCombination(line, shades, { photographId: photograph.id })
  const { id: lineId } = line
  await Family.create({ brandId, lineId, name: 'Browns', position: 0 })
  await Kit.create({ brandId, lineId, selection: [], createdById: personId })
  await NamingSettings.create({ brandId, lineId, labelWidth: 58, labelSize: 15, labelLines: 2 })
  await NameReviewer.create({ brandId, lineId, personId })
  const { id: ideaId } = await makeIdea(line, shades[0]!)
  await NameVote.create({ brandId, ideaId, round: 1, personId, vote: 'yes' })
  await NameRemark.create({ brandId, ideaId, personId, text: 'A remark' })
  await NameSearch.create({
    brandId,
    ideaId,
    register: 'A register',
    searchedBy: 'Somebody',
    searchedOn: '2026-11-30',
    outcome: 'nothing found',
    recordedById: personId,
  })
  await Invitation.create({
    brandId,
    email: 'guest@people.example',
    role: 'dyer',
    tokenHash: digest(randomUUID()),
    invitedById: personId,
    expiresAt: new Date(),
  })
  await inTransaction((transaction) =>
    recordActivity(owner, { action: 'line.created' }, transaction),
  )
}

/** What the web's role sees of a table with app.brand set to this. */
async function rowsSeen(table: string, brandId: string): Promise<{ brand_id: string }[]> {
  return web.transaction(async (transaction) => {
    await web.query("SELECT set_config('app.brand', $1, true)", { bind: [brandId], transaction })
    return web.query(`SELECT * FROM ${table}`, { type: QueryTypes.SELECT, transaction })
  })
}

describe('the web’s database role', () => {
  it('is neither the owner of a table, nor exempt, nor a superuser', async () => {
    const [role] = await web.query<Record<string, unknown>>(
      `SELECT rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
         (SELECT count(*)::int FROM pg_class WHERE relowner = pg_roles.oid) AS owned
       FROM pg_roles WHERE rolname = current_user`,
      { type: QueryTypes.SELECT },
    )
    expect(role).toEqual({
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
      owned: 0,
    })
  })

  it('meets row-level security on every table that has a brand', async () => {
    const open = await sequelize().query<{ relname: string }>(
      `SELECT relname FROM pg_class WHERE relname IN (:tables) AND relkind IN ('r', 'p')
       AND relnamespace = 'public'::regnamespace AND NOT relrowsecurity`,
      { type: QueryTypes.SELECT, replacements: { tables: [...tables, 'brands'] } },
    )
    expect(tables.length).toBeGreaterThanOrEqual(9)
    expect(open).toEqual([])
  })

  it('sees no row in any of them when no brand is set', async () => {
    for (const table of [...tables, 'brands']) {
      expect(await web.query(`SELECT * FROM ${table}`, { type: QueryTypes.SELECT }), table).toEqual(
        [],
      )
    }
  })

  it('sees rows of the brand that is set, and of no other', async () => {
    for (const table of tables) {
      const seen = await rowsSeen(table, ours)
      expect(seen.length, table).toBeGreaterThan(0)
      expect(new Set(seen.map(({ brand_id }) => brand_id)), table).toEqual(new Set([ours]))
    }
  })

  it('can neither write into another brand, nor move a row there, nor change or remove one', async () => {
    const inOurs = (sql: string) =>
      web.transaction(async (transaction) => {
        await web.query("SELECT set_config('app.brand', $1, true)", { bind: [ours], transaction })
        return web.query(sql, { bind: [theirs], transaction })
      })
    await expect(
      inOurs("INSERT INTO activities (brand_id, action) VALUES ($1, 'line.made')"),
    ).rejects.toThrow(/row-level security/)
    await expect(inOurs('UPDATE lines SET brand_id = $1')).rejects.toThrow(/row-level security/)
    for (const sql of [
      "UPDATE lines SET name = 'taken' WHERE brand_id = $1 RETURNING id",
      'DELETE FROM lines WHERE brand_id = $1 RETURNING id',
    ]) {
      expect((await inOurs(sql))[0]).toEqual([])
    }
  })

  it('can add to the activity record, and neither change nor remove what stands there', async () => {
    for (const sql of [
      "UPDATE activities SET action = 'x.y'",
      'DELETE FROM activities',
      'TRUNCATE activities',
    ]) {
      await expect(web.query(sql)).rejects.toThrow(/permission denied/)
    }
  })

  it('cannot read a letter it has posted', async () => {
    await expect(web.query('SELECT * FROM letters')).rejects.toThrow(/permission denied/)
  })
})

describe('a pool of connections', () => {
  it('that serves two brands by turns never shows one the rows of the other', async () => {
    const pool = sequelize()
    const askedAs = (brandId: string) =>
      withinScope({ brandId }, () =>
        pool.query<{ brand: string }>("SELECT current_setting('app.brand') AS brand", {
          type: QueryTypes.SELECT,
        }),
      )
    const turns = Array.from({ length: 200 }, (_, at) => (at % 3 === 0 ? ours : theirs))
    const answers = await Promise.all(turns.map(askedAs))
    expect(answers.map(([row]) => row!.brand)).toEqual(turns)
  })

  it('is open to no brand outside of a scope', async () => {
    await withinScope({ brandId: ours }, () => Line.count())
    const brands = await Promise.all(
      Array.from({ length: 20 }, () =>
        sequelize().query<{ brand: string }>(
          "SELECT coalesce(current_setting('app.brand', true), '') AS brand",
          { type: QueryTypes.SELECT },
        ),
      ),
    )
    expect(new Set(brands.map(([row]) => row!.brand))).toEqual(new Set(['']))
  })
})
