import { Op } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { colorWordsIn } from '@/lib/naming/color-words'
import { wordsOf } from '@/lib/naming/words'
import { BY_POSITION } from '@/lib/shades/queries'
import { NameIdea, Shade, type Line } from '@/models'

import { NAME_LIMITS } from './constants'
import { canDraftNames } from './policy'
import { NAMEABLE_COLUMNS, presentNameable, type HeapIdeaView, type NameableShade } from './present'
import { presentIdeas, readNaming } from './queries'
import type { HeapFilter, ListNameableInput } from './schema'

/** Ideas that lie on no shade and wait for one. */
export const inHeap = ({ id, brandId }: Pick<Line, 'id' | 'brandId'>) =>
  ({ brandId, lineId: id, shadeId: null, state: ['draft', 'returned'] }) as const

/** A page of the heap. */
export interface HeapPage {
  line: Line
  ideas: HeapIdeaView[]
  /** What fits the filter, on all pages. */
  total: number
  /** All of either kind, whatever is searched for. */
  counts: { loose: number; putBy: number }
}

/**
 * A page of the heap, newest first; or of the ideas of the line that were put by, last put by first.
 * Ten queries at most, however many ideas. @throws NotFoundError
 */
export async function listHeap(
  actor: Actor,
  lineSlug: string,
  { q, put, page }: HeapFilter,
): Promise<HeapPage> {
  const { line, asker, frozen } = await readNaming(actor, lineSlug)
  const loose = inHeap(line)
  const putBy = { brandId: line.brandId, lineId: line.id, state: 'put-by' } as const
  const like = { [Op.iLike]: `%${q.replace(/[\\%_]/g, '\\$&')}%` }
  const where = {
    ...(put ? putBy : loose),
    ...(q && { [Op.or]: [{ text: like }, { note: like }] }),
  }
  const [rows, total, ...counts] = await Promise.all([
    NameIdea.findAll({
      where,
      order: [
        [put ? 'stateSince' : 'createdAt', 'DESC'],
        ['text', 'ASC'],
        ['id', 'ASC'],
      ],
      offset: (page - 1) * NAME_LIMITS.heapPage,
      limit: NAME_LIMITS.heapPage,
    }),
    NameIdea.count({ where }),
    NameIdea.count({ where: loose }),
    NameIdea.count({ where: putBy }),
  ])
  const [views, shades] = await Promise.all([
    presentIdeas(rows, { asker, frozen }),
    Shade.findAll({
      attributes: [...NAMEABLE_COLUMNS],
      where: {
        brandId: line.brandId,
        lineId: line.id,
        id: rows.flatMap(({ shadeId }) => shadeId ?? []),
      },
      raw: true,
    }),
  ])
  const byId = new Map(shades.map((shade) => [shade.id, presentNameable(shade)]))
  return {
    line,
    total,
    counts: { loose: counts[0]!, putBy: counts[1]! },
    ideas: views.map((idea) => ({
      ...idea,
      hints: [...new Set(colorWordsIn(wordsOf(idea.text)).map(({ words }) => words))],
      shade: idea.shadeId === null ? null : (byId.get(idea.shadeId) ?? null),
    })),
  }
}

/**
 * The shades that names may be laid on: all but the retired, those that wait for a name first. Two
 * queries. @throws NotFoundError, ForbiddenError
 */
export async function listNameable(
  actor: Actor,
  { lineSlug }: ListNameableInput,
): Promise<{ waiting: NameableShade[]; named: NameableShade[] }> {
  authorize(actor, canDraftNames)
  const line = await getLine(actor, lineSlug)
  const shades = await Shade.findAll({
    attributes: [...NAMEABLE_COLUMNS],
    where: { brandId: actor.brandId, lineId: line.id, status: { [Op.ne]: 'retired' } },
    order: BY_POSITION,
    raw: true,
  })
  return {
    waiting: shades.filter(({ name }) => name === null).map(presentNameable),
    named: shades.filter(({ name }) => name !== null).map(presentNameable),
  }
}
