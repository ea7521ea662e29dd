import { QueryTypes, type Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { canReadCombinations } from '@/lib/combinations/policy'
import { NotFoundError } from '@/lib/errors'
import { canReadKits } from '@/lib/kits/policy'
import { canReadNames } from '@/lib/names/policy'
import { canReadPhotographs } from '@/lib/photographs/policy'
import { Line, sequelize, Shade } from '@/models'

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

/** Who may open a chapter, and see how much stands in it. */
const CHAPTERS = {
  shades: canReadLines,
  photographs: canReadPhotographs,
  combinations: canReadCombinations,
  names: canReadNames,
  kits: canReadKits,
}

/** How many rows stand in a chapter; a chapter that the role may not open is left out. */
export type ChapterCounts = {
  shades: number
  photographs?: number
  combinations?: number
  /** Shades with an approved name. */
  names?: number
  kits?: number
}

/**
 * A line, the names and addresses of all the brand's lines, and what stands in each chapter that
 * `chapters` names. Written out, since every page of a line asks it and to compose it costs more
 * than to answer it.
 */
const LINE_WITH_MARGIN = /* sql */ `
SELECT l.*,
  (SELECT json_agg(json_build_object('slug', s.slug, 'name', s.name) ORDER BY s.name)
    FROM lines s WHERE s.brand_id = l.brand_id) AS siblings,
  CASE WHEN 'shades' = ANY ($chapters::text[]) THEN (SELECT count(*)::int FROM shades c
    WHERE c.brand_id = l.brand_id AND c.line_id = l.id AND c.deleted_at IS NULL) END AS shades,
  CASE WHEN 'photographs' = ANY ($chapters::text[]) THEN (SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = l.brand_id AND c.line_id = l.id AND c.deleted_at IS NULL
      AND c.state <> 'pending') END AS photographs,
  CASE WHEN 'combinations' = ANY ($chapters::text[]) THEN (SELECT count(*)::int FROM combinations c
    WHERE c.brand_id = l.brand_id AND c.line_id = l.id AND c.deleted_at IS NULL) END AS combinations,
  CASE WHEN 'names' = ANY ($chapters::text[]) THEN (SELECT count(*)::int FROM shades c
    WHERE c.brand_id = l.brand_id AND c.line_id = l.id AND c.deleted_at IS NULL
      AND c.name IS NOT NULL) END AS names,
  CASE WHEN 'kits' = ANY ($chapters::text[]) THEN (SELECT count(*)::int FROM kits c
    WHERE c.brand_id = l.brand_id AND c.line_id = l.id) END AS kits
FROM lines l WHERE l.brand_id = $brandId AND l.slug = $lineSlug`

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
  const chapters = Object.entries(CHAPTERS).flatMap(([name, opens]) => (opens(actor) ? name : []))
  const line: Line | null = await sequelize().query(LINE_WITH_MARGIN, {
    bind: { brandId: actor.brandId, lineSlug, chapters },
    type: QueryTypes.SELECT,
    model: Line,
    mapToModel: true,
    plain: true,
  })
  if (!line) throw new NotFoundError()
  const beside = line.dataValues as unknown as ChapterCounts & {
    siblings: Pick<Line, 'slug' | 'name'>[]
  }
  const counts = Object.fromEntries(
    chapters.map((name) => [name, beside[name as keyof ChapterCounts]]),
  ) as ChapterCounts
  return { line, lines: beside.siblings, counts }
}
