import type { Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { uuidOrNone } from '@/lib/photographs/queries'
import { getObjectPart } from '@/lib/storage/objects'
import { Kit, Person, type Combination, type Line } from '@/models'

import { findCandidates } from './candidates'
import { KIT_LIMITS, type KitStanding } from './constants'
import { canReadKits } from './policy'

/** A kit and the name of who asked for it. */
export interface BuiltKit {
  kit: Kit
  /** Null when that person's account is gone. */
  askedBy: string | null
}

/** What a list says of a kit: its texts stay where they are. */
const LISTED = { exclude: ['contents'] }

/** A page of a line's kits, newest first. Four queries. */
export async function listKits(
  actor: Actor,
  lineSlug: string,
  page: number,
): Promise<{ kits: BuiltKit[]; total: number }> {
  authorize(actor, canReadKits)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const { rows, count } = await Kit.findAndCountAll({
    where,
    attributes: LISTED,
    order: [
      ['createdAt', 'DESC'],
      ['id', 'ASC'],
    ],
    limit: KIT_LIMITS.perPage,
    offset: (page - 1) * KIT_LIMITS.perPage,
  })
  return { kits: await withNames(rows), total: count }
}

/** One kit of a line, with its texts. @throws NotFoundError */
export async function getKit(
  actor: Actor,
  lineSlug: string,
  kitId: string,
): Promise<BuiltKit & { line: Line }> {
  authorize(actor, canReadKits)
  const line = await getLine(actor, lineSlug)
  const kit = await loadKit(actor, kitId)
  if (kit.lineId !== line.id) throw new NotFoundError()
  const [built] = await withNames([kit])
  return { ...built!, line }
}

/** The row alone, for a command. Each command authorises for itself. @throws NotFoundError */
export async function loadKit(
  { brandId }: Pick<Actor, 'brandId'>,
  kitId: string,
  transaction: Transaction | null = null,
): Promise<Kit> {
  const kit = await Kit.findOne({ where: { id: uuidOrNone(kitId), brandId }, transaction })
  if (!kit) throw new NotFoundError()
  return kit
}

async function withNames(kits: Kit[]): Promise<BuiltKit[]> {
  const ids = [...new Set(kits.flatMap(({ createdById }) => createdById ?? []))]
  const people = await Person.findAll({ where: { id: ids }, attributes: ['id', 'name'] })
  const names = new Map(people.map(({ id, name }) => [id, name]))
  return kits.map((kit) => ({ kit, askedBy: names.get(kit.createdById ?? '') ?? null }))
}

/** Where these kits stand; one that is gone is left out. One query. */
export async function listKitStandings(
  actor: Actor,
  kitIds: readonly string[],
): Promise<KitStanding[]> {
  authorize(actor, canReadKits)
  const kits = await Kit.findAll({
    attributes: ['id', 'state', 'done', 'total', 'failure'],
    where: { id: [...kitIds], brandId: actor.brandId },
  })
  return kits.map(({ id, state, done, total, failure }) => ({ id, state, done, total, failure }))
}

/** All combinations of a line with what a kit asks of them. Four queries, however many there are. */
export async function listCandidates(actor: Actor, lineSlug: string): Promise<Combination[]> {
  authorize(actor, canReadKits)
  const line = await getLine(actor, lineSlug)
  return findCandidates({ brandId: actor.brandId, lineId: line.id })
}

/**
 * A picture of a kit, read out of its zip, by `<combination>-<width>x<height>.png`.
 * @throws NotFoundError, also once the kit has expired; UnavailableError when the store is away
 */
export async function getKitPicture(actor: Actor, kitId: string, picture: string): Promise<Buffer> {
  authorize(actor, canReadKits)
  const { objectKey, contents } = await loadKit(actor, kitId)
  const [, id, width, height] = /^([0-9a-f-]{36})-(\d+)x(\d+)\.png$/.exec(picture) ?? []
  const part = contents
    .find((entry) => entry.id === id)
    ?.pictures.find((one) => one.width === Number(width) && one.height === Number(height))
  const bytes = objectKey && part ? await getObjectPart(objectKey, part) : null
  if (!bytes) throw new NotFoundError()
  return bytes
}
