import { QueryTypes } from 'sequelize'

import type { Actor } from '@/lib/auth/actor'
import { listFamilies, IN_FAMILY } from '@/lib/families/queries'
import {
  presentShade,
  SHADE_VIEW_COLUMNS,
  type ShadeRow,
  type ShadeView,
} from '@/lib/shades/present'
import { NameIdea, sequelize, Shade, type NameRemark } from '@/models'

import { movable } from './change-names'
import { NAME_LIMITS } from './constants'
import { isDecider } from './moves'
import { presentRemark, type ReviewItem, type ReviewPage } from './present'
import { namesOf, presentIdeas, readNaming, type Naming } from './queries'

/** Shades shown on either side of the one whose name is looked at. */
const EITHER_SIDE = 2
/** Remarks shown beside a name; the others stand on its own page. */
const REMARKS = 20

type Queued = Pick<NameIdea, 'id' | 'shadeId' | 'stateSince'>

/**
 * The stretch of the names in review that holds this idea: of one that is in review no more, what
 * followed it; of none, the first. Thirteen queries at most, however many names there are.
 * @throws NotFoundError
 */
export async function readReview(
  actor: Actor,
  lineSlug: string,
  ideaId: string | null,
): Promise<ReviewPage> {
  const naming = await readNaming(actor, lineSlug)
  const { line, asker, frozen } = naming
  const inLine = { brandId: line.brandId, lineId: line.id }
  const [families, rows, inReview, asked, counts] = await Promise.all([
    listFamilies(actor, line.id),
    Shade.findAll({
      attributes: [...SHADE_VIEW_COLUMNS],
      where: inLine,
      order: IN_FAMILY,
      raw: true,
    }) as Promise<ShadeRow[]>,
    NameIdea.findAll({
      attributes: ['id', 'shadeId', 'stateSince'],
      where: { ...inLine, state: 'in-review' },
      raw: true,
    }),
    ideaId === null
      ? null
      : NameIdea.findOne({
          attributes: ['id', 'shadeId', 'stateSince'],
          where: { ...inLine, id: ideaId },
          raw: true,
        }),
    NameIdea.count({ where: { ...inLine, state: ['draft', 'returned'] }, group: ['state'] }),
  ])
  const shades = rows.map(presentShade)
  const shadeById = new Map(shades.map((shade) => [shade.id, shade]))
  const inOrder = byShade(shadeById)
  // A name whose shade was deleted waits until the shade is brought back.
  const queue = inReview
    .filter(({ shadeId }) => shadeId !== null && shadeById.has(shadeId))
    .sort(inOrder)
  const start = stretchOf(
    queue,
    asked && shadeById.has(asked.shadeId ?? '') ? asked : null,
    inOrder,
  )
  const end = start + NAME_LIMITS.page
  const countOf = (state: string) => counts.find((one) => one.state === state)?.count ?? 0
  const wanted = shades.filter(({ status }) => status !== 'retired')
  return {
    items: await readItems(naming, queue.slice(start, end), shades, (familyId) => {
      const family = families.find(({ id }) => id === familyId)
      return family?.name ?? null
    }),
    total: queue.length,
    start,
    before: queue[start - 1]?.id ?? null,
    after: queue[end]?.id ?? null,
    standing: {
      shades: wanted.length,
      named: wanted.filter(({ name }) => name !== null).length,
      drafts: countOf('draft'),
      returned: countOf('returned'),
    },
    decides: isDecider(asker),
    frozen,
  }
}

/** As the shades stand in the line, those of one shade as they were sent. */
const byShade = (shadeById: ReadonlyMap<string, ShadeView>) => (one: Queued, other: Queued) => {
  const [a, b] = [shadeById.get(one.shadeId!)!, shadeById.get(other.shadeId!)!]
  return (
    a.position - b.position ||
    a.id.localeCompare(b.id) ||
    one.stateSince.getTime() - other.stateSince.getTime() ||
    one.id.localeCompare(other.id)
  )
}

/** Where the stretch begins that holds the idea, or would if it were in the queue. */
function stretchOf(
  queue: readonly Queued[],
  asked: Queued | null,
  inOrder: (one: Queued, other: Queued) => number,
): number {
  if (!asked || queue.length === 0) return 0
  const at = queue.findIndex((one) => one.id === asked.id || inOrder(one, asked) >= 0)
  const place = at === -1 ? queue.length - 1 : at
  return place - (place % NAME_LIMITS.page)
}

async function readItems(
  { line, asker, frozen }: Naming,
  stretch: readonly Queued[],
  shades: readonly ShadeView[],
  familyName: (familyId: string | null) => string | null,
): Promise<ReviewItem[]> {
  if (stretch.length === 0) return []
  const { brandId } = line
  const ids = stretch.map(({ id }) => id)
  const [ideas, ofShades, remarks] = await Promise.all([
    NameIdea.findAll({ where: { brandId, id: ids } }),
    NameIdea.findAll({
      where: {
        brandId,
        shadeId: stretch.map(({ shadeId }) => shadeId!),
        state: ['approved', 'in-review'],
      },
      attributes: ['id', 'shadeId', 'text', 'state', 'authorId', 'wordedById', 'unlockedAt'],
    }),
    sequelize().query<RemarkRow>(NEWEST_REMARKS, {
      bind: { brandId, ids, most: REMARKS },
      type: QueryTypes.SELECT,
    }),
  ])
  const [views, people] = await Promise.all([
    presentIdeas(ideas, { asker, frozen }),
    namesOf(remarks.map(({ personId }) => personId)),
  ])
  const viewById = new Map(views.map((view) => [view.id, view]))
  const shadeById = new Map(shades.map((shade) => [shade.id, shade]))
  return stretch.flatMap(({ id, shadeId }): ReviewItem[] => {
    const idea = viewById.get(id)
    const shade = shadeById.get(shadeId!)
    // Decided between two of the queries.
    if (!idea || !shade) return []
    const others = ofShades.filter((other) => other.shadeId === shade.id && other.id !== id)
    const held = others.find(({ state }) => state === 'approved')
    const said = remarks.filter(({ ideaId }) => ideaId === id)
    return [
      {
        idea,
        shade,
        family: familyName(shade.familyId),
        beside: besideOf(shade, shades),
        held: held ? { text: held.text, locked: movable(held, frozen).locked } : null,
        rivals: others.filter(({ state }) => state === 'in-review').map(({ text }) => text),
        remarks: said.map((remark) => presentRemark(remark as unknown as NameRemark, people)),
        remarkCount: said[0]?.total ?? 0,
      },
    ]
  })
}

function besideOf(shade: ShadeView, shades: readonly ShadeView[]): ShadeView[] {
  if (shade.familyId === null) return [shade]
  const family = shades.filter(({ familyId }) => familyId === shade.familyId)
  const at = family.indexOf(shade)
  return family.slice(Math.max(0, at - EITHER_SIDE), at + EITHER_SIDE + 1)
}

type RemarkRow = Pick<NameRemark, 'id' | 'ideaId' | 'personId' | 'text' | 'createdAt'> & {
  total: number
}

/** The newest remarks of each idea, oldest first. */
const NEWEST_REMARKS = `SELECT remark.id, remark.idea_id AS "ideaId", remark.person_id AS "personId",
    remark.text, remark.created_at AS "createdAt", remark.total::integer AS total
  FROM unnest($ids::uuid[]) AS wanted (id)
  CROSS JOIN LATERAL (
    SELECT *, count(*) OVER () AS total FROM name_remarks
    WHERE brand_id = $brandId AND idea_id = wanted.id
    ORDER BY created_at DESC, id DESC LIMIT $most
  ) AS remark
  ORDER BY remark.created_at, remark.id`
