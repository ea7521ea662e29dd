import { col, fn, literal, Op, type Order, type WhereOptions } from 'sequelize'
import type { Fn, Literal } from 'sequelize/types/utils'
import { z } from 'zod'

import { authorize, type Actor } from '@/lib/auth/actor'
import { deltaE00 } from '@/lib/color/ciede2000'
import { screenColor } from '@/lib/color/gamut'
import type { Lab } from '@/lib/color/types'
import { canReadCombinations } from '@/lib/combinations/policy'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { Shade, type Line } from '@/models'

import { canReadShades } from './policy'
import {
  presentShade,
  SHADE_VIEW_COLUMNS,
  type ShadeRow,
  type ShadeUses,
  type ShadeView,
} from './present'
import { BOOK_FAMILY_SQL, bookGroups } from './sample-book'
import { SHADE_LIMITS, SHADE_STATUSES, type ShadeSort } from './constants'
import type { ShadeTableFilter } from './schema'
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
const BY_NUMBER = [
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

/** Neutrals first, then round the hues; light to dark. */
// Made of constants alone, in sample-book.ts.
// eslint-disable-next-line sql/fixed
const BY_BOOK: Order = [literal(BOOK_FAMILY_SQL), ['labL', 'DESC'], ...BY_POSITION]

/** A page of the sample book, by family. Three queries. @throws NotFoundError */
export async function readSampleBook(
  actor: Actor,
  lineSlug: string,
  page: number,
): Promise<{ line: Line; groups: { family: string; shades: ShadeView[] }[]; total: number }> {
  authorize(actor, canReadShades)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const limit = SHADE_LIMITS.bookPage
  const [total, rows] = await Promise.all([
    Shade.count({ where }),
    Shade.findAll({ ...VIEW, where, order: BY_BOOK, offset: (page - 1) * limit, limit }),
  ])
  return { line, groups: bookGroups(rows.map(presentShade)), total }
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
