import { col, fn, literal, Op, QueryTypes, type Order, type WhereOptions } from 'sequelize'
import type { Fn, Literal } from 'sequelize/types/utils'
import { z } from 'zod'

import { authorize, type Actor } from '@/lib/auth/actor'
import { deltaE00 } from '@/lib/color/ciede2000'
import { screenColor } from '@/lib/color/gamut'
import type { Lab } from '@/lib/color/types'
import { canReadCombinations } from '@/lib/combinations/policy'
import { NotFoundError } from '@/lib/errors'
import { listFamilies } from '@/lib/families/queries'
import { getLine } from '@/lib/lines/queries'
import { sequelize, Shade, type Line } from '@/models'

import { canReadShades } from './policy'
import {
  presentShade,
  SHADE_VIEW_COLUMNS,
  type ShadeRow,
  type ShadeUses,
  type ShadeView,
} from './present'
import { SHADE_LIMITS, SHADE_STATUSES, type BookOrder, type ShadeSort } from './constants'
import type { SampleBookFilter, ShadeTableFilter } from './schema'
import { findUses } from './uses'

/** The line's own order; ties fall by age. */
export const BY_POSITION: [string, 'ASC'][] = [
  ['position', 'ASC'],
  ['createdAt', 'ASC'],
  ['id', 'ASC'],
]

/** What a photograph may be matched to: every shade that is still made, or will be. */
export const MATCHABLE = { status: { [Op.ne]: 'retired' } }

const VIEW = { attributes: [...SHADE_VIEW_COLUMNS] as string[], raw: true } as const
const COLOR_COLUMNS = ['id', 'labL', 'labA', 'labB'] as string[]

type ColorRow = Pick<Shade, 'id' | 'labL' | 'labA' | 'labB'>
const labOf = (row: ColorRow): Lab => [row.labL, row.labA, row.labB]

/**
 * The shades a photograph may be matched to: all of the line that are neither deleted nor retired,
 * in its order. One query; empty for a line of another brand.
 */
export async function listMatchShades(actor: Actor, lineId: string): Promise<ShadeView[]> {
  authorize(actor, canReadShades)
  const rows = await Shade.findAll({
    ...VIEW,
    where: { brandId: actor.brandId, lineId, ...MATCHABLE },
    order: BY_POSITION,
  })
  return rows.map(presentShade)
}

/** All shades of a line in its order, retired ones too. Two queries. @throws NotFoundError */
export async function listAllShades(
  actor: Actor,
  lineSlug: string,
): Promise<{ line: Line; shades: ShadeRow[] }> {
  authorize(actor, canReadShades)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  return { line, shades: await Shade.findAll({ ...VIEW, where, order: BY_POSITION }) }
}

/** Numbers as people count: by what stands before the first digits, then by those as a number. */
export const BY_NUMBER = [
  literal(`lower(regexp_replace(number, '[0-9].*$', ''))`),
  literal(`substring(number from '[0-9]+')::numeric`),
  literal(`lower(number)`),
]
const STATUS_ORDER = fn('array_position', [...SHADE_STATUSES], col('status'))

const SORTS: Record<ShadeSort, readonly (Literal | Fn)[]> = {
  order: [literal('position')],
  number: BY_NUMBER,
  name: [literal('lower(name)')],
  status: [STATUS_ORDER],
  L: [literal('lab_l')],
  a: [literal('lab_a')],
  b: [literal('lab_b')],
}

function orderOf({ sort, dir }: ShadeTableFilter): Order {
  const direction = dir === 'desc' ? 'DESC NULLS LAST' : 'ASC NULLS LAST'
  const chosen = SORTS[sort].map((by): [Literal | Fn, string] => [by, direction])
  return [...chosen, ...BY_POSITION]
}

function whereOf(actor: Actor, line: Line, { q, status }: ShadeTableFilter): WhereOptions<Shade> {
  const like = { [Op.iLike]: `%${q.replace(/[\\%_]/g, '\\$&')}%` }
  return {
    brandId: actor.brandId,
    lineId: line.id,
    ...(status.length > 0 && { status }),
    ...(q && { [Op.or]: [{ number: like }, { name: like }] }),
  }
}

/**
 * A page of the shade table. Three queries, however many rows; with `outside` the colours of all
 * shades that fit are looked at, since what a screen can show is computed and not stored.
 * @throws NotFoundError
 */
export async function listShadeTable(
  actor: Actor,
  lineSlug: string,
  filter: ShadeTableFilter,
): Promise<{ line: Line; shades: ShadeView[]; total: number }> {
  authorize(actor, canReadShades)
  const line = await getLine(actor, lineSlug)
  const where = whereOf(actor, line, filter)
  const order = orderOf(filter)
  const offset = (filter.page - 1) * SHADE_LIMITS.tablePage
  const limit = SHADE_LIMITS.tablePage
  if (!filter.outside) {
    const [total, rows] = await Promise.all([
      Shade.count({ where }),
      Shade.findAll({ ...VIEW, where, order, offset, limit }),
    ])
    return { line, shades: rows.map(presentShade), total }
  }
  const all = await Shade.findAll({ attributes: COLOR_COLUMNS, where, order, raw: true })
  const outside = all.filter((row) => !screenColor(labOf(row)).inGamut)
  const ids = outside.slice(offset, offset + limit).map(({ id }) => id)
  const rows = await Shade.findAll({ ...VIEW, where: { ...where, id: ids }, order })
  return { line, shades: rows.map(presentShade), total: outside.length }
}

/** A part of the sample book's page with what stands in its margin. */
export interface BookGroup {
  /** Names it among the groups. */
  id: string
  /** Null where the whole book is one part. */
  heading: string | null
  /** How many shades it has on all pages together. */
  total: number
  shades: ShadeView[]
}

/** A page of the sample book. */
export interface SampleBookPage {
  line: Line
  groups: BookGroup[]
  total: number
}

/**
 * A page of the sample book: by family (shades that are in none come last), by lightness, or by
 * number. Four queries at most, however many shades. @throws NotFoundError
 */
export async function readSampleBook(
  actor: Actor,
  lineSlug: string,
  { order, page }: SampleBookFilter,
): Promise<SampleBookPage> {
  authorize(actor, canReadShades)
  const line = await getLine(actor, lineSlug)
  const from = (page - 1) * SHADE_LIMITS.bookPage
  return order === 'family' ? readByFamily(actor, line, from) : readInOneOrder(line, order, from)
}

const NO_FAMILY = 'Not in a family yet'

async function readByFamily(actor: Actor, line: Line, from: number): Promise<SampleBookPage> {
  const { brandId, id: lineId } = line
  const [families, counted] = await Promise.all([
    listFamilies(actor, lineId),
    Shade.count({ where: { brandId, lineId }, group: ['familyId'] }),
  ])
  const counts = new Map(
    (counted as unknown as { familyId: string | null; count: number }[]).map(
      ({ familyId, count }) => [familyId, Number(count)],
    ),
  )
  let passed = 0
  const parts = [...families, { id: null, name: NO_FAMILY }].map(({ id, name }) => {
    const total = counts.get(id) ?? 0
    const begins = Math.max(0, from - passed)
    const ends = Math.min(total, from + SHADE_LIMITS.bookPage - passed)
    passed += total
    return { id, name, total, begins, size: Math.max(0, ends - begins) }
  })
  const shown = parts.filter(({ size }) => size > 0)
  const rows = await sequelize().query<ShadeRow>(BOOK_PAGE, {
    bind: {
      brandId,
      lineId,
      families: shown.map(({ id }) => id),
      begins: shown.map(({ begins }) => begins),
      sizes: shown.map(({ size }) => size),
    },
    type: QueryTypes.SELECT,
  })
  return {
    line,
    total: passed,
    groups: shown.map(({ id, name, total }) => ({
      id: id ?? 'none',
      heading: name,
      total,
      shades: rows.filter(({ familyId }) => familyId === id).map(presentShade),
    })),
  }
}

/** Each family's part of a page, and that of no family, along its own stretch of shades_book. */
const BOOK_PAGE = `SELECT shade.id, number, name, lab_l AS "labL", lab_a AS "labA", lab_b AS "labB",
    illuminant, observer, hex, status, position, shade.family_id AS "familyId",
    family_pinned AS "familyPinned", family_position AS "familyPosition", version
  FROM unnest($families::uuid[], $begins::integer[], $sizes::integer[])
    WITH ORDINALITY AS part (family_id, begins, size, place)
  CROSS JOIN LATERAL (
    (SELECT id FROM shades
      WHERE line_id = $lineId AND brand_id = $brandId AND deleted_at IS NULL
        AND family_id = part.family_id
      ORDER BY family_position, lab_l DESC, position, created_at, id
      OFFSET part.begins LIMIT part.size)
    UNION ALL
    (SELECT id FROM shades
      WHERE line_id = $lineId AND brand_id = $brandId AND deleted_at IS NULL
        AND part.family_id IS NULL AND family_id IS NULL
      ORDER BY family_position, lab_l DESC, position, created_at, id
      OFFSET part.begins LIMIT part.size)
  ) AS found
  JOIN shades AS shade ON shade.id = found.id
  ORDER BY part.place, family_position, lab_l DESC, position, created_at, shade.id`

/** Shades in one order, put together by ten steps of lightness, or not at all. */
async function readInOneOrder(
  line: Line,
  order: Exclude<BookOrder, 'family'>,
  offset: number,
): Promise<SampleBookPage> {
  const where = { brandId: line.brandId, lineId: line.id }
  const byLightness: Order = [['labL', 'DESC'], ...BY_POSITION]
  const byNumber: Order = [
    ...BY_NUMBER.map((by): [Literal, string] => [by, 'ASC NULLS LAST']),
    ...BY_POSITION,
  ]
  const [total, rows] = await Promise.all([
    Shade.count({ where }),
    Shade.findAll({
      ...VIEW,
      where,
      order: order === 'lightness' ? byLightness : byNumber,
      offset,
      limit: SHADE_LIMITS.bookPage,
    }),
  ])
  const shades = rows.map(presentShade)
  const groups = order === 'lightness' ? byTens(shades) : []
  if (order === 'number' && total > 0) groups.push({ id: 'all', heading: null, total, shades })
  return { line, total, groups }
}

/** Shades from light to dark, put together by ten steps of L*. */
function byTens(shades: readonly ShadeView[]): BookGroup[] {
  const groups: BookGroup[] = []
  for (const shade of shades) {
    const ten = Math.min(90, Math.floor(shade.lab[0] / 10) * 10)
    const id = `L${ten}`
    if (groups.at(-1)?.id !== id) {
      groups.push({ id, heading: `L* ${ten} to ${ten + 10}`, total: 0, shades: [] })
    }
    const group = groups.at(-1)!
    group.shades.push(shade)
    group.total += 1
  }
  return groups
}

/** How many neighbours a shade's page names. */
const NEIGHBOURS = 5

/** A shade with what stands about it. */
export interface ShadeDetail {
  line: Line
  shade: ShadeView
  /** The nearest in the line, nearest first, with their ΔE00. */
  neighbours: { shade: ShadeView; difference: number }[]
  /** Null for a role that does not see combinations. */
  uses: ShadeUses | null
}

/**
 * One shade, its nearest neighbours in the line by CIEDE2000 and where it is used. Five queries.
 * @throws NotFoundError
 */
export async function getShade(
  actor: Actor,
  lineSlug: string,
  shadeId: string,
): Promise<ShadeDetail> {
  authorize(actor, canReadShades)
  if (!z.uuid().safeParse(shadeId).success) throw new NotFoundError()
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const [shade, all, uses] = await Promise.all([
    Shade.findOne({ ...VIEW, where: { ...where, id: shadeId } }),
    Shade.findAll({ attributes: COLOR_COLUMNS, where, raw: true }),
    canReadCombinations(actor) ? findUses(actor, [shadeId]) : null,
  ])
  if (!shade) throw new NotFoundError()
  const nearest = all
    .filter(({ id }) => id !== shade.id)
    .map((other) => ({
      id: other.id,
      difference: deltaE00(labOf(shade), labOf(other)),
    }))
    .sort((one, other) => one.difference - other.difference)
    .slice(0, NEIGHBOURS)
  const rows = await Shade.findAll({
    ...VIEW,
    where: { ...where, id: nearest.map(({ id }) => id) },
  })
  const byId = new Map(rows.map((row) => [row.id, presentShade(row)]))
  return {
    line,
    shade: presentShade(shade),
    neighbours: nearest.flatMap(({ id, difference }) => {
      const neighbour = byId.get(id)
      return neighbour ? [{ shade: neighbour, difference }] : []
    }),
    uses,
  }
}
