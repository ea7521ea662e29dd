import { authorize, type Actor } from '@/lib/auth/actor'
import { screenColor } from '@/lib/color/gamut'
import { getLine } from '@/lib/lines/queries'
import { shadeLabel } from '@/lib/shades/present'
import { Combination, CombinationPlace, Family, Person, Photograph, Shade } from '@/models'

import { LANES, type Lane } from './constants'
import { canReadCombinations } from './policy'
import type { BoardCard, BoardView } from './present'

type PlaceRow = Pick<CombinationPlace, 'combinationId' | 'shadeId' | 'share'>

/**
 * All combinations of a line as its board, lane by lane in their order. Seven queries, however many
 * there are; one with `known`, when nothing has changed since that revision.
 * @returns null when nothing has changed
 * @throws NotFoundError
 */
export async function getBoard(
  actor: Actor,
  lineSlug: string,
  known?: number,
): Promise<BoardView | null> {
  authorize(actor, canReadCombinations)
  // Read first: what changes while the rest is read is fetched once more, never missed.
  const { id: lineId, boardRevision: revision } = await getLine(actor, lineSlug)
  if (known === revision) return null
  const inLine = { brandId: actor.brandId, lineId }
  const rows = await Combination.findAll({
    attributes: ['id', 'title', 'lane', 'photographId', 'createdById'],
    where: inLine,
    order: [
      ['rank', 'ASC'],
      ['id', 'ASC'],
    ],
    raw: true,
  })
  const idsOf = (field: 'photographId' | 'createdById') => [
    ...new Set(rows.flatMap((row) => row[field] ?? [])),
  ]
  const [places, photographs, people, families] = await Promise.all([
    CombinationPlace.findAll({
      attributes: ['combinationId', 'shadeId', 'share'],
      where: { brandId: actor.brandId, combinationId: rows.map(({ id }) => id) },
      order: [['place', 'ASC']],
      raw: true,
    }),
    Photograph.findAll({
      attributes: ['id', 'title'],
      where: { ...inLine, id: idsOf('photographId') },
      order: [['title', 'ASC']],
      raw: true,
    }),
    Person.findAll({
      attributes: ['id', 'name'],
      where: { id: idsOf('createdById') },
      order: [['name', 'ASC']],
      raw: true,
    }),
    Family.findAll({
      attributes: ['id', 'name'],
      where: inLine,
      order: [['position', 'ASC']],
      raw: true,
    }),
  ])
  const shades = await Shade.findAll({
    attributes: ['id', 'number', 'name', 'labL', 'labA', 'labB', 'familyId'],
    where: { ...inLine, id: [...new Set(places.flatMap(({ shadeId }) => shadeId ?? []))] },
    // A deleted shade stays in its combinations as it was.
    paranoid: false,
    order: [['position', 'ASC']],
    raw: true,
  })
  return {
    revision,
    cards: inLanes(rows, { places, shades, photographs, people }),
    shades: shades.map((shade) => ({
      id: shade.id,
      label: shadeLabel(shade),
      hex: screenColor([shade.labL, shade.labA, shade.labB]).hex,
      familyId: shade.familyId,
    })),
    families,
    photographs,
    authors: people,
  }
}

type Identified = readonly { id: string }[]

/** The cards lane by lane, their parts by where they stand in the lists. */
function inLanes(
  rows: readonly Pick<Combination, 'id' | 'title' | 'lane' | 'photographId' | 'createdById'>[],
  lists: {
    places: readonly PlaceRow[]
    shades: Identified
    photographs: Identified
    people: Identified
  },
): BoardCard[] {
  const [shade, photograph, author] = [lists.shades, lists.photographs, lists.people].map(indexIn)
  const held = new Map<string, BoardCard['places']>()
  for (const { combinationId, shadeId, share } of lists.places) {
    const places = held.get(combinationId) ?? []
    held.set(combinationId, [...places, [shade!(shadeId), Math.round(share * 1000) / 1000]])
  }
  const cardOf = (row: (typeof rows)[number]): BoardCard => ({
    id: row.id,
    title: row.title,
    lane: row.lane,
    places: held.get(row.id) ?? [],
    photograph: photograph!(row.photographId),
    author: author!(row.createdById),
  })
  const of = (lane: Lane) => rows.filter((row) => row.lane === lane).map(cardOf)
  return LANES.flatMap(of)
}

function indexIn(things: Identified): (id: string | null) => number | null {
  const indices = new Map(things.map(({ id }, at) => [id, at]))
  return (id) => (id === null ? null : (indices.get(id) ?? null))
}
