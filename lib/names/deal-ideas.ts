import { Op } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { IN_FAMILY, listFamilies } from '@/lib/families/queries'
import { getLine } from '@/lib/lines/queries'
import { colorWordsIn } from '@/lib/naming/color-words'
import { dealHeap, type NamelessShade } from '@/lib/naming/deal'
import { wordsOf } from '@/lib/naming/words'
import { NameIdea, Shade } from '@/models'

import { NAME_LIMITS } from './constants'
import { inHeap } from './list-heap'
import { canDraftNames } from './policy'
import { NAMEABLE_COLUMNS, presentNameable, type DealtShadeView, type DealView } from './present'
import type { DealIdeasInput } from './schema'

/** The columns of a shade that dealing looks at. */
const COLUMNS = [...NAMEABLE_COLUMNS, 'familyId'] as const
type ShadeRow = Pick<Shade, (typeof COLUMNS)[number]>

const NO_FAMILY = { id: 'none', name: 'Not in a family yet' }

/**
 * Proposes which idea of the heap goes to which shade that has no name, approved or in review, and
 * moves nothing. What is beyond the limits waits for the next deal, the newest ideas and the last
 * shades of the sample book. Five queries; about half a second at the limits.
 * @throws NotFoundError, ForbiddenError
 */
export async function dealIdeas(
  actor: Actor,
  { lineSlug, without }: DealIdeasInput,
): Promise<DealView> {
  authorize(actor, canDraftNames)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const [families, shades, ideas, inReview] = await Promise.all([
    listFamilies(actor, line.id),
    Shade.findAll({
      attributes: [...COLUMNS],
      where: { ...where, status: { [Op.ne]: 'retired' } },
      order: IN_FAMILY,
      raw: true,
    }) as Promise<ShadeRow[]>,
    NameIdea.findAll({
      attributes: ['id', 'text', 'note'],
      where: { ...inHeap(line), id: { [Op.notIn]: without } },
      order: [
        ['createdAt', 'ASC'],
        ['id', 'ASC'],
      ],
      raw: true,
    }),
    NameIdea.findAll({
      attributes: ['text', 'shadeId'],
      where: { ...where, state: 'in-review' },
      raw: true,
    }),
  ])
  const book = [...families, NO_FAMILY].map(({ id, name }) => ({
    id,
    name,
    shades: shades.filter(({ familyId }) => (familyId ?? NO_FAMILY.id) === id),
  }))
  const { waiting, beyond: shadesBeyond } = waitingShades(book, inReview)
  // Of no use to the dealing, which costs ideas by shades.
  const isHinted = ({ text }: NameIdea) => colorWordsIn(wordsOf(text)).length > 0
  const hinted = ideas.filter(isHinted)
  const unhinted = ideas.filter((idea) => !isHinted(idea))
  const { dealt, left } = dealHeap(
    hinted.slice(0, NAME_LIMITS.dealt).map(({ id, text }) => ({ id, name: text })),
    waiting,
  )
  const ideaById = new Map(ideas.map((idea) => [idea.id, idea]))
  const waits = new Set(waiting.map(({ id }) => id))
  const byShade = new Map(
    dealt.map(({ shadeId, ideaId, fit, why }) => {
      const { text, note } = ideaById.get(ideaId)!
      return [shadeId, { ideaId, text, note, fit, why }]
    }),
  )
  const shown = shades.length <= NAME_LIMITS.dealt
  return {
    families: book
      .map(({ id, name, shades: held }) => ({
        id,
        name,
        shades: held
          .map((shade): DealtShadeView => ({
            ...presentNameable(shade),
            waits: waits.has(shade.id),
            dealt: byShade.get(shade.id) ?? null,
          }))
          // Of a very long line only what waits is shown, without what stands beside it.
          .filter((shade) => shown || shade.waits),
      }))
      .filter((family) => family.shades.some((shade) => shade.dealt)),
    left: [
      ...left.map(({ ideaId, why }) => ({ ideaId, text: ideaById.get(ideaId)!.text, why })),
      ...unhinted.map(({ id, text }) => ({ ideaId: id, text, why: 'no colour' as const })),
    ],
    ideas: ideas.length,
    waiting: waiting.length,
    beyond: { ideas: Math.max(0, hinted.length - NAME_LIMITS.dealt), shades: shadesBeyond },
  }
}

/** The shades that wait for a name, in the order of the book, with what stands beside them there. */
function waitingShades(
  book: readonly { shades: readonly ShadeRow[] }[],
  inReview: readonly Pick<NameIdea, 'text' | 'shadeId'>[],
): { waiting: NamelessShade[]; beyond: number } {
  const names = new Map<string, string[]>()
  for (const { text, shadeId } of inReview)
    names.set(shadeId!, [...(names.get(shadeId!) ?? []), text])
  const namesOf = ({ id, name }: ShadeRow) => [
    ...(name === null ? [] : [name]),
    ...(names.get(id) ?? []),
  ]
  const all = book.flatMap(({ shades }) => {
    const open = shades.filter((shade) => namesOf(shade).length === 0)
    return shades.flatMap((shade, at): NamelessShade[] => {
      if (!open.includes(shade)) return []
      const beside = [shades[at - 1], shades[at + 1]].flatMap((one) => one ?? [])
      return [
        {
          id: shade.id,
          lab: [shade.labL, shade.labA, shade.labB],
          neighbours: beside.flatMap(namesOf),
          beside: beside.filter((one) => open.includes(one)).map(({ id }) => id),
          need: open.length / shades.length,
        },
      ]
    })
  })
  const waiting = all.slice(0, NAME_LIMITS.dealtShades)
  return { waiting, beyond: all.length - waiting.length }
}
