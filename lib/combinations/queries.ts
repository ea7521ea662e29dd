import type { Transaction, WhereOptions } from 'sequelize'
import { z } from 'zod'

import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { Combination, CombinationPlace, Person, Photograph, Shade } from '@/models'

import { canReadCombinations } from './policy'

/** A combination with its places, shades and photograph, and the name of who kept it. */
export interface KeptCombination {
  combination: Combination
  /** Null when that person's account is gone. */
  keptBy: string | null
}

/** The five places with their shades, deleted ones too, in order; loaded apart from the page. */
const PLACES = {
  model: CombinationPlace,
  as: 'places',
  separate: true,
  order: [['place', 'ASC']] as [string, string][],
  include: [{ model: Shade, as: 'shade', paranoid: false }],
}

async function withNames(rows: Combination[]): Promise<KeptCombination[]> {
  const ids = [...new Set(rows.flatMap(({ createdById }) => createdById ?? []))]
  const people = await Person.findAll({ where: { id: ids }, attributes: ['id', 'name'] })
  const names = new Map(people.map(({ id, name }) => [id, name]))
  return rows.map((combination) => ({
    combination,
    keptBy: names.get(combination.createdById ?? '') ?? null,
  }))
}

async function readCombination(where: WhereOptions): Promise<KeptCombination> {
  const combination = await Combination.findOne({
    where,
    include: [{ model: Photograph, as: 'photograph' }, PLACES],
  })
  if (!combination) throw new NotFoundError()
  const [kept] = await withNames([combination])
  return kept!
}

/**
 * One combination of a line, with everything its page shows.
 * @throws NotFoundError
 */
export async function getCombination(
  actor: Actor,
  lineSlug: string,
  combinationId: string,
): Promise<KeptCombination> {
  authorize(actor, canReadCombinations)
  if (!z.uuid().safeParse(combinationId).success) throw new NotFoundError()
  const line = await getLine(actor, lineSlug)
  return readCombination({ brandId: actor.brandId, lineId: line.id, id: combinationId })
}

/**
 * One combination when it is not of the version known any more, else null. One query while nothing
 * changed.
 * @throws NotFoundError
 */
export async function getNewerCombination(
  actor: Actor,
  combinationId: string,
  version: number,
): Promise<KeptCombination | null> {
  authorize(actor, canReadCombinations)
  const where = { brandId: actor.brandId, id: combinationId }
  const now = await Combination.findOne({ attributes: ['version'], where })
  if (!now) throw new NotFoundError()
  return now.version === version ? null : readCombination(where)
}

/**
 * The row alone, for a command. Each command authorises for itself.
 * @throws NotFoundError
 */
export async function loadCombination(
  actor: Actor,
  combinationId: string,
  { transaction, deleted = false }: { transaction: Transaction; deleted?: boolean },
): Promise<Combination> {
  const combination = await Combination.findOne({
    where: { brandId: actor.brandId, id: combinationId },
    paranoid: !deleted,
    transaction,
  })
  if (!combination) throw new NotFoundError()
  return combination
}
