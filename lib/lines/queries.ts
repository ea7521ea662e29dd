import { literal, type ProjectionAlias, type Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { canReadCombinations } from '@/lib/combinations/policy'
import { NotFoundError } from '@/lib/errors'
import { canReadKits } from '@/lib/kits/policy'
import { canReadPhotographs } from '@/lib/photographs/policy'
import { Line, Shade } from '@/models'

import { canReadLines } from './policy'

/** A page of a brand's lines, newest first, with how many shades each has. Three queries. */
export async function listLines(
  actor: Actor,
  { page, perPage }: { page: number; perPage: number },
): Promise<{ lines: { line: Line; shadeCount: number }[]; total: number }> {
  authorize(actor, canReadLines)
  const { rows, count } = await Line.findAndCountAll({
    where: { brandId: actor.brandId },
    order: [
      ['createdAt', 'DESC'],
      ['id', 'ASC'],
    ],
    limit: perPage,
    offset: (page - 1) * perPage,
  })
  const counts = (await Shade.count({
    where: { brandId: actor.brandId, lineId: rows.map(({ id }) => id) },
    group: ['lineId'],
  })) as unknown as { lineId: string; count: number }[]
  const byLine = new Map(counts.map(({ lineId, count: shades }) => [lineId, Number(shades)]))
  return {
    lines: rows.map((line) => ({ line, shadeCount: byLine.get(line.id) ?? 0 })),
    total: count,
  }
}

/**
 * One line of the actor's brand by its slug.
 * @throws NotFoundError
 */
export async function getLine(
  actor: Actor,
  lineSlug: string,
  transaction?: Transaction,
): Promise<Line> {
  authorize(actor, canReadLines)
  const line = await Line.findOne({
    where: { brandId: actor.brandId, slug: lineSlug },
    transaction: transaction ?? null,
  })
  if (!line) throw new NotFoundError()
  return line
}

/** What stands in each chapter, counted beside the line's row, and who may open it. */
const CHAPTERS = {
  shades: {
    opens: canReadLines,
    count: literal(`(SELECT count(*)::int FROM shades c
      WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL)`),
  },
  photographs: {
    opens: canReadPhotographs,
    count: literal(`(SELECT count(*)::int FROM photographs c
      WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
        AND c.state <> 'pending')`),
  },
  combinations: {
    opens: canReadCombinations,
    count: literal(`(SELECT count(*)::int FROM combinations c
      WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL)`),
  },
  kits: {
    opens: canReadKits,
    count: literal(`(SELECT count(*)::int FROM kits c
      WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id)`),
  },
}

/** How many rows stand in a chapter; a chapter that the role may not open is left out. */
export type ChapterCounts = {
  shades: number
  photographs?: number
  combinations?: number
  kits?: number
}

/** The names and addresses of all the brand's lines, for the switch between them. */
const SIBLINGS =
  literal(`(SELECT json_agg(json_build_object('slug', s.slug, 'name', s.name) ORDER BY s.name)
  FROM lines s WHERE s.brand_id = "Line".brand_id)`)

/**
 * One line of the actor's brand by its slug, with what its margin shows: the brand's lines, and how
 * much stands in each chapter that this role may open. One query, since every page of a line asks it.
 * @throws NotFoundError
 */
export async function getLineWithMargin(
  actor: Actor,
  lineSlug: string,
): Promise<{ line: Line; lines: Pick<Line, 'slug' | 'name'>[]; counts: ChapterCounts }> {
  authorize(actor, canReadLines)
  const open = Object.entries(CHAPTERS).filter(([, { opens }]) => opens(actor))
  const line = await Line.findOne({
    attributes: {
      include: [
        [SIBLINGS, 'siblings'],
        ...open.map(([name, { count }]): ProjectionAlias => [count, name]),
      ],
    },
    where: { brandId: actor.brandId, slug: lineSlug },
  })
  if (!line) throw new NotFoundError()
  const beside = line.dataValues as unknown as ChapterCounts & {
    siblings: Pick<Line, 'slug' | 'name'>[]
  }
  const counts = Object.fromEntries(
    open.map(([name]) => [name, beside[name as keyof ChapterCounts]]),
  ) as ChapterCounts
  return { line, lines: beside.siblings, counts }
}
