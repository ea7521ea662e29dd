import { literal, Op, type ProjectionAlias, type Transaction, type WhereOptions } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { getObject } from '@/lib/storage/objects'
import { Line, Photograph, Reading } from '@/models'

import { derivativeKey, derivativeName } from './keys'
import { canReadPhotographs } from './policy'
import { PHOTOGRAPH_LIMITS, type Derivative, type PhotographStanding } from './constants'
import type { GalleryFilter } from './schema'

const CONFIRMED = { [Op.ne]: 'pending' as const }
const SHOWN: Record<NonNullable<GalleryFilter['state']>, string[]> = {
  ready: ['ready'],
  reading: ['waiting', 'reading'],
  failed: ['failed'],
}
/** Only what tells whether a stored match is stale. */
const READING_AGE = { model: Reading, as: 'reading', attributes: ['id', 'shadesRevision'] }

function whereOf({ q, state, missing }: GalleryFilter): WhereOptions {
  const like = { [Op.iLike]: `%${q.replace(/[\\%_]/g, '\\$&')}%` }
  return {
    ...(q && { [Op.or]: [{ title: like }, { photographer: like }, { altText: like }] }),
    ...(missing === 'licence' && { licence: null }),
    ...(missing === 'alt' && { altText: '' }),
    state: state ? SHOWN[state] : CONFIRMED,
  }
}

/** A page of a line's photographs, newest first. Two queries. */
export async function listPhotographs(
  actor: Actor,
  line: Line,
  filter: GalleryFilter,
): Promise<{ photographs: Photograph[]; total: number }> {
  authorize(actor, canReadPhotographs)
  const where = { ...whereOf(filter), brandId: actor.brandId, lineId: line.id }
  const [total, photographs] = await Promise.all([
    Photograph.count({ where }),
    Photograph.findAll({
      where,
      include: [READING_AGE],
      order: [
        ['createdAt', 'DESC'],
        ['id', 'ASC'],
      ],
      limit: PHOTOGRAPH_LIMITS.perPage,
      offset: (filter.page - 1) * PHOTOGRAPH_LIMITS.perPage,
    }),
  ])
  return { photographs, total }
}

/** The line's photographs to choose one from, newest first; the last of many are left out. */
export async function listPhotographChoices(actor: Actor, line: Line): Promise<Photograph[]> {
  authorize(actor, canReadPhotographs)
  return Photograph.findAll({
    where: { brandId: actor.brandId, lineId: line.id, state: CONFIRMED },
    order: [
      ['createdAt', 'DESC'],
      ['id', 'ASC'],
    ],
    limit: PHOTOGRAPH_LIMITS.choices,
  })
}

/** How many photographs of a line stand how. */
export interface PhotographCounts {
  all: number
  reading: number
  failed: number
  withoutLicence: number
  withoutAltText: number
}

const NOTHING: PhotographCounts = {
  all: 0,
  reading: 0,
  failed: 0,
  withoutLicence: 0,
  withoutAltText: 0,
}

/** What is counted, each in an index of its own (migrations, list-indexes). */
const COUNTS: Record<keyof PhotographCounts, ReturnType<typeof literal>> = {
  all: literal(`(SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
      AND c.state <> 'pending')`),
  reading: literal(`(SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
      AND c.state IN ('waiting', 'reading'))`),
  failed: literal(`(SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
      AND c.state = 'failed')`),
  withoutLicence: literal(`(SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
      AND c.state <> 'pending' AND c.licence IS NULL)`),
  withoutAltText: literal(`(SELECT count(*)::int FROM photographs c
    WHERE c.brand_id = "Line".brand_id AND c.line_id = "Line".id AND c.deleted_at IS NULL
      AND c.state <> 'pending' AND c.alt_text = '')`),
}

/** Counts a line's photographs. One query. */
export async function countPhotographs(actor: Actor, line: Line): Promise<PhotographCounts> {
  authorize(actor, canReadPhotographs)
  const counts = await Line.findOne({
    attributes: Object.entries(COUNTS).map(([name, count]): ProjectionAlias => [count, name]),
    where: { brandId: actor.brandId, id: line.id },
    raw: true,
  })
  // Another brand's line, like one that is gone, has nothing in it.
  return (counts as PhotographCounts | null) ?? NOTHING
}

/**
 * One photograph of a line, with what was read from it or only how old that is.
 * @throws NotFoundError
 */
export async function getPhotograph(
  actor: Actor,
  lineSlug: string,
  photographId: string,
  { withReading = false, transaction }: { withReading?: boolean; transaction?: Transaction } = {},
): Promise<{ line: Line; photograph: Photograph }> {
  authorize(actor, canReadPhotographs)
  const line = await getLine(actor, lineSlug, transaction)
  const photograph = await Photograph.findOne({
    where: {
      id: uuidOrNone(photographId),
      brandId: actor.brandId,
      lineId: line.id,
      state: CONFIRMED,
    },
    include: [withReading ? { model: Reading, as: 'reading' } : READING_AGE],
    transaction: transaction ?? null,
  })
  if (!photograph) throw new NotFoundError()
  return { line, photograph }
}

/** An address may hold anything; what is no uuid names nothing. @throws NotFoundError */
export function uuidOrNone(id: string): string {
  if (!/^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(id)) throw new NotFoundError()
  return id
}

/** Where these photographs stand; one that is gone is left out. One query. */
export async function listStandings(
  actor: Actor,
  photographIds: readonly string[],
): Promise<PhotographStanding[]> {
  authorize(actor, canReadPhotographs)
  const photographs = await Photograph.findAll({
    attributes: ['id', 'state', 'failure'],
    where: { id: [...photographIds], brandId: actor.brandId, state: CONFIRMED },
  })
  return photographs.map(({ id, state, failure }) => ({ id, state, failure }))
}

/**
 * The bytes of a photograph's copy by its file name.
 * @throws NotFoundError, UnavailableError when the store is away
 */
export async function getDerivative(
  actor: Actor,
  photographId: string,
  name: string,
): Promise<{ body: Buffer; format: Derivative['format'] }> {
  authorize(actor, canReadPhotographs)
  const photograph = await Photograph.findOne({
    attributes: ['id', 'brandId', 'sha256', 'derivatives'],
    where: { id: uuidOrNone(photographId), brandId: actor.brandId },
  })
  const derivative = photograph?.derivatives.find((one) => derivativeName(photograph, one) === name)
  const body = derivative && (await getObject(derivativeKey(photograph!, derivative)))
  if (!body) throw new NotFoundError()
  return { body, format: derivative!.format }
}

/** The photograph of a line that holds the same file, if there is one. */
export function findSameFile(
  actor: Actor,
  lineId: string,
  sha256: string,
): Promise<Photograph | null> {
  return Photograph.findOne({
    attributes: ['id', 'title'],
    where: { brandId: actor.brandId, lineId, sha256, state: CONFIRMED },
  })
}
