import { fn, literal, Op, QueryTypes, where, type Order, type WhereOptions } from 'sequelize'
import type { Fn, Literal } from 'sequelize/types/utils'

import type { Actor } from '@/lib/auth/actor'
import { screenColor } from '@/lib/color/gamut'
import type { FamilyView } from '@/lib/families/present'
import { IN_FAMILY, listFamilies } from '@/lib/families/queries'
import type { Finding } from '@/lib/naming/finding'
import { shadeLabel } from '@/lib/shades/present'
import { BY_NUMBER, BY_POSITION } from '@/lib/shades/queries'
import { NameIdea, sequelize, Shade, type Line } from '@/models'

import { checkName, readCheckGround, type CheckGround } from './check-name'
import { LISTED_STATES, NAME_LIMITS, NAME_STATES, type NameSort, type NameState } from './constants'
import { LEADING_ID, LEADING_TEXT, LISTED_STATE } from './leading-idea'
import type { NameRow, NamesInNumbers } from './present'
import { presentIdeas, readNaming, type Naming } from './queries'
import type { NameListFilter } from './schema'

/** A page of the list of names. */
export interface NameList {
  line: Line
  rows: NameRow[]
  /** Shades that fit, on all pages together. */
  total: number
  numbers: NamesInNumbers
  families: FamilyView[]
  /** Names are locked for the label printer. */
  frozen: boolean
  /** yyyy-mm-dd; null while undecided. */
  printOn: string | null
  /** Drafts of the line that were not checked to sort or narrow the list, since they are too many. */
  unsifted: number
}

const ROW_COLUMNS = ['id', 'number', 'name', 'labL', 'labA', 'labB', 'status', 'familyId'] as const
type RowOfShade = Pick<Shade, (typeof ROW_COLUMNS)[number]> & { leadingId: string | null }
const ROW = { attributes: [...ROW_COLUMNS, [LEADING_ID, 'leadingId']], raw: true } as never

const SORTS: Record<Exclude<NameSort, 'checks'>, readonly (Literal | Fn)[]> = {
  order: [literal('position')],
  number: BY_NUMBER,
  name: [fn('lower', LEADING_TEXT)],
  state: [fn('array_position', [...LISTED_STATES], LISTED_STATE)],
  family: [literal(`(SELECT f.position FROM families f WHERE f.id = "Shade".family_id)`)],
}

function orderOf({ sort, dir }: NameListFilter): Order {
  if (sort === 'checks') return BY_POSITION
  const direction = dir === 'desc' ? 'DESC NULLS LAST' : 'ASC NULLS LAST'
  const chosen = SORTS[sort].map((by): [Literal | Fn, string] => [by, direction])
  return [...chosen, ...(sort === 'family' ? IN_FAMILY : BY_POSITION)]
}

function whereOf(line: Line, { q, state, family }: NameListFilter): WhereOptions<Shade> {
  const like = { [Op.iLike]: `%${q.replace(/[\\%_]/g, '\\$&')}%` }
  return {
    brandId: line.brandId,
    lineId: line.id,
    ...(family && { familyId: family === 'none' ? null : family }),
    [Op.and]: [
      ...(state.length > 0 ? [where(LISTED_STATE, { [Op.in]: state })] : []),
      ...(q ? [{ [Op.or]: [{ number: like }, where(LEADING_TEXT, like)] }] : []),
    ],
  }
}

/** Reads what names are checked against when it is first asked for, and then no more. */
function groundOf(line: Line): () => Promise<CheckGround> {
  let ground: Promise<CheckGround> | undefined
  return () => (ground ??= readCheckGround(line))
}

type Checkable = Pick<NameIdea, 'id' | 'text' | 'shadeId' | 'state' | 'findings'>
const isLoose = ({ state }: Pick<NameIdea, 'state'>) => state === 'draft' || state === 'returned'

/**
 * A page of a line's shades with the names that stand for them. Up to sixteen queries, however many
 * rows. What is a draft is checked as it is read; to sort or narrow by what is found, so are the
 * drafts of the whole line, the first {@link NAME_LIMITS.sifted} of them.
 * @throws ForbiddenError, NotFoundError
 */
export async function listNames(
  actor: Actor,
  lineSlug: string,
  filter: NameListFilter,
): Promise<NameList> {
  const naming = await readNaming(actor, lineSlug)
  const { line, settings, frozen } = naming
  const ground = groundOf(line)
  const [families, numbers, found] = await Promise.all([
    listFamilies(actor, line.id),
    readNumbers(line),
    filter.warned || filter.sort === 'checks'
      ? findByChecks(line, filter, ground)
      : findPage(line, filter),
  ])
  const { shades, total, checked, unsifted } = found
  const rows = await presentRows(naming, { shades, families, checked, ground })
  const printOn = settings?.printOn ?? null
  return { line, rows, total, numbers, families, frozen, printOn, unsifted }
}

/** Shades of a page in their order, and what has been found about their names on the way. */
interface FoundPage {
  shades: RowOfShade[]
  total: number
  checked: ReadonlyMap<string, Finding[]>
  unsifted: number
}

const offsetOf = ({ page }: NameListFilter) => (page - 1) * NAME_LIMITS.page

async function findPage(line: Line, filter: NameListFilter): Promise<FoundPage> {
  const terms = { where: whereOf(line, filter), order: orderOf(filter) }
  const [total, shades] = await Promise.all([
    Shade.count({ where: terms.where }),
    readRows({ ...terms, offset: offsetOf(filter), limit: NAME_LIMITS.page }),
  ])
  return { shades, total, checked: new Map(), unsifted: 0 }
}

const readRows = async (terms: object): Promise<RowOfShade[]> =>
  (await Shade.findAll({ ...(ROW as object), ...terms })) as unknown as RowOfShade[]

/** What a draft has is found anew at each look, so that the database can neither sort nor narrow by it. */
async function findByChecks(
  line: Line,
  filter: NameListFilter,
  ground: () => Promise<CheckGround>,
): Promise<FoundPage> {
  const all = await readRows({ where: whereOf(line, filter), order: orderOf(filter) })
  const ideas = await NameIdea.findAll({
    attributes: ['id', 'text', 'shadeId', 'state', 'findings'],
    where: {
      brandId: line.brandId,
      lineId: line.id,
      id: all.flatMap((row) => row.leadingId ?? []),
    },
    raw: true,
  })
  const byId = new Map(ideas.map((idea) => [idea.id, idea]))
  const inOrder = all.map(({ leadingId }) => byId.get(leadingId ?? ''))
  const loose = inOrder.flatMap((idea) => (idea && isLoose(idea) ? [idea] : []))
  const checked = await checkLoose(loose.slice(0, NAME_LIMITS.sifted), ground)
  const weighed = all.map((row, at) => {
    const idea = inOrder[at]
    return { row, weight: weightOf(idea && (checked.get(idea.id) ?? idea.findings)) }
  })
  const fitting = filter.warned ? weighed.filter(({ weight }) => (weight ?? 0) >= WARNING) : weighed
  if (filter.sort === 'checks') {
    const way = filter.dir === 'desc' ? -1 : 1
    // What is not checked comes last either way.
    const place = (weight: number | null) => (weight === null ? Infinity : way * weight)
    fitting.sort((one, other) => order(place(one.weight), place(other.weight)))
  }
  const from = offsetOf(filter)
  return {
    shades: fitting.slice(from, from + NAME_LIMITS.page).map(({ row }) => row),
    total: fitting.length,
    checked,
    unsifted: Math.max(0, loose.length - NAME_LIMITS.sifted),
  }
}

const order = (one: number, other: number) => (one === other ? 0 : one < other ? -1 : 1)

/** A warning weighs more than any number of notes. */
const WARNING = 1_000

function weightOf(findings: readonly Finding[] | null | undefined): number | null {
  if (!findings) return null
  return findings.reduce((sum, { grade }) => sum + (grade === 'warning' ? WARNING : 1), 0)
}

/** Checks ideas that have not been sent, by id; of none it asks nothing. */
async function checkLoose(
  ideas: readonly Checkable[],
  ground: () => Promise<CheckGround>,
): Promise<Map<string, Finding[]>> {
  if (ideas.length === 0) return new Map()
  const against = await ground()
  return new Map(
    ideas.map(({ id, text, shadeId }) => [
      id,
      checkName(against, { text, shadeId, ideaId: id }).findings,
    ]),
  )
}

async function presentRows(
  { line, asker, frozen }: Naming,
  {
    shades,
    families,
    checked,
    ground,
  }: Pick<FoundPage, 'shades' | 'checked'> & {
    families: readonly FamilyView[]
    ground: () => Promise<CheckGround>
  },
): Promise<NameRow[]> {
  const inLine = { brandId: line.brandId, lineId: line.id }
  const [leading, counted] = await Promise.all([
    NameIdea.findAll({ where: { ...inLine, id: shades.flatMap((row) => row.leadingId ?? []) } }),
    NameIdea.count({
      where: { ...inLine, shadeId: shades.map(({ id }) => id) },
      group: ['shadeId', 'state'],
    }),
  ])
  const unchecked = leading.filter((idea) => isLoose(idea) && !checked.has(idea.id))
  const found = new Map([...checked, ...(await checkLoose(unchecked, ground))])
  const views = await presentIdeas(leading, { asker, frozen })
  const ideas = new Map(
    views.map((idea) => [idea.id, { ...idea, findings: found.get(idea.id) ?? idea.findings }]),
  )
  const familyNames = new Map(families.map(({ id, name }) => [id, name]))
  const counts = counted as unknown as { shadeId: string; state: NameState; count: number }[]
  return shades.map((shade) => {
    const idea = ideas.get(shade.leadingId ?? '') ?? null
    const others = counts
      .filter(({ shadeId }) => shadeId === shade.id)
      .map(({ state, count }) => [state, Number(count) - (idea?.state === state ? 1 : 0)] as const)
    return {
      id: shade.id,
      number: shade.number,
      label: shadeLabel(shade),
      hex: screenColor([shade.labL, shade.labA, shade.labB]).hex,
      retired: shade.status === 'retired',
      family: familyNames.get(shade.familyId ?? '') ?? null,
      idea,
      others: Object.fromEntries(others.filter(([, count]) => count > 0)),
    }
  })
}

/** Ideas of a line by state and place; those on deleted shades count for nothing. */
const NUMBERS = `SELECT i.state, i.shade_id IS NULL AS loose, count(*)::int AS count
  FROM name_ideas i LEFT JOIN shades s ON s.id = i.shade_id
  WHERE i.brand_id = $brandId AND i.line_id = $lineId AND i.deleted_at IS NULL
    AND s.deleted_at IS NULL
  GROUP BY 1, 2`

/** How far the names of a line have come. Two queries. */
async function readNumbers({ id: lineId, brandId }: Line): Promise<NamesInNumbers> {
  const [shades, counted] = await Promise.all([
    Shade.count({ where: { brandId, lineId } }),
    sequelize().query<{ state: NameState; loose: boolean; count: number }>(NUMBERS, {
      bind: { brandId, lineId },
      type: QueryTypes.SELECT,
    }),
  ])
  const sum = (fits: (one: (typeof counted)[number]) => boolean) =>
    counted.filter(fits).reduce((total, { count }) => total + count, 0)
  const onShades = Object.fromEntries(
    NAME_STATES.map((state) => [state, sum((one) => one.state === state && !one.loose)]),
  ) as NamesInNumbers['onShades']
  return {
    shades,
    named: onShades.approved,
    onShades,
    heap: sum(({ state, loose }) => loose && state !== 'put-by'),
  }
}
