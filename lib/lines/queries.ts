import { Op, type Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { canReadCombinations } from '@/lib/combinations/policy'
import { NotFoundError } from '@/lib/errors'
import { canReadPhotographs } from '@/lib/photographs/policy'
import { Combination, Line, Photograph, Shade } from '@/models'

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

/** The names and addresses of all the brand's lines, for the switch between them. */
export async function listLineNames(actor: Actor): Promise<Pick<Line, 'slug' | 'name'>[]> {
  authorize(actor, canReadLines)
  return Line.findAll({
    where: { brandId: actor.brandId },
    attributes: ['slug', 'name'],
    order: [['name', 'ASC']],
  })
}

/** How much stands in each chapter of a line that this role may open. At most three counts. */
export async function countChapters(
  actor: Actor,
  line: Line,
): Promise<{ shades: number; photographs?: number; combinations?: number }> {
  authorize(actor, canReadLines)
  const where = { brandId: actor.brandId, lineId: line.id }
  const countPhotographs = () =>
    Photograph.count({ where: { ...where, state: { [Op.ne]: 'pending' } } })
  const [shades, photographs, combinations] = await Promise.all([
    Shade.count({ where }),
    canReadPhotographs(actor) ? countPhotographs() : undefined,
    canReadCombinations(actor) ? Combination.count({ where }) : undefined,
  ])
  return {
    shades,
    ...(photographs !== undefined && { photographs }),
    ...(combinations !== undefined && { combinations }),
  }
}
