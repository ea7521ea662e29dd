import { col, fn, Op, where, type WhereOptions } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { Activity, Membership, Person } from '@/models'

import { ACTIVITY_KINDS, ACTIVITY_LIMITS } from './constants'
import { canReadActivity } from './policy'
import type { ActivityFilter, ActivityPage } from './schema'

const DAY = 24 * 60 * 60 * 1000

/** Newest first; as the table's index has them. */
const NEWEST_FIRST: [string, string][] = [
  ['createdAt', 'DESC'],
  ['id', 'ASC'],
]
const WITH_NAME = { model: Person, as: 'person', attributes: ['id', 'name'] }

function whereOf(actor: Actor, { person, what, from, to }: ActivityFilter): WhereOptions<Activity> {
  return {
    brandId: actor.brandId,
    ...(person && { personId: person === 'former' ? null : person }),
    ...(what && {
      [Op.and]: [isOfKind(what.split('.')[0]!), isKind(what) ? {} : { action: what }],
    }),
    ...((from ?? to) && {
      createdAt: {
        ...(from && { [Op.gte]: new Date(from) }),
        ...(to && { [Op.lt]: new Date(Date.parse(to) + DAY) }),
      },
    }),
  }
}

/** An entry, with the name of the person it is about where it is about one whose account stands. */
export interface ActivityRow {
  entry: Activity
  about: string | null
}

/** An entry that is about a person names them by id alone, so that a closed account leaves no name. */
async function withNames(entries: Activity[]): Promise<ActivityRow[]> {
  const ids = entries.flatMap(({ objectKind, objectId }) =>
    objectKind === 'person' && objectId ? [objectId] : [],
  )
  const people = await Person.findAll({
    where: { id: [...new Set(ids)] },
    attributes: ['id', 'name'],
  })
  const names = new Map(people.map(({ id, name }) => [id, name]))
  return entries.map((entry) => ({ entry, about: names.get(entry.objectId ?? '') ?? null }))
}

/** As an index has it. */
const isOfKind = (kind: string) => where(fn('split_part', col('action'), '.', 1), kind)
const isKind = (what: string) => what in ACTIVITY_KINDS

/**
 * A page of the record, newest first: from the newest entry, or from the one after `before`. It
 * costs the same however far back it reaches. At most three queries.
 * @returns the entries, and the last one's id when there are older ones
 */
export async function listActivity(
  actor: Actor,
  { before, ...filter }: ActivityPage,
): Promise<{ entries: ActivityRow[]; older: string | null }> {
  authorize(actor, canReadActivity)
  const { perPage } = ACTIVITY_LIMITS
  const { brandId } = actor
  const last = before ? await Activity.findOne({ where: { brandId, id: before } }) : null
  const rows = await Activity.findAll({
    where: { [Op.and]: [whereOf(actor, filter), last ? isAfter(last) : {}] },
    include: [WITH_NAME],
    order: NEWEST_FIRST,
    limit: perPage + 1,
  })
  const entries = rows.slice(0, perPage)
  return {
    entries: await withNames(entries),
    older: rows.length > perPage ? entries.at(-1)!.id : null,
  }
}

const isAfter = ({ createdAt, id }: Activity): WhereOptions<Activity> => ({
  createdAt: { [Op.lte]: createdAt },
  [Op.or]: [{ createdAt: { [Op.lt]: createdAt } }, { id: { [Op.gt]: id } }],
})

/** The newest entries that fit, as many as a CSV file takes. Two queries. */
export async function listActivityForCsv(
  actor: Actor,
  filter: ActivityFilter,
): Promise<ActivityRow[]> {
  authorize(actor, canReadActivity)
  const entries = await Activity.findAll({
    where: whereOf(actor, filter),
    include: [WITH_NAME],
    order: NEWEST_FIRST,
    limit: ACTIVITY_LIMITS.csvRows,
  })
  return withNames(entries)
}

/** The brand's members by name, for the filter. One query. */
export async function listActivityPeople(actor: Actor): Promise<{ id: string; name: string }[]> {
  authorize(actor, canReadActivity)
  const memberships = await Membership.findAll({
    where: { brandId: actor.brandId },
    include: [WITH_NAME],
    order: [['person', 'name', 'ASC']],
  })
  return memberships.map(({ person }) => ({ id: person!.id, name: person!.name }))
}
