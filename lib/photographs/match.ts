import { promisify } from 'node:util'
import { inflate } from 'node:zlib'

import { authorize, type Actor } from '@/lib/auth/actor'
import { matchPhotograph, type Match, type NoMatch } from '@/lib/color/match'
import { InvalidError, NotFoundError } from '@/lib/errors'
import { BY_POSITION, MATCHABLE } from '@/lib/shades/queries'
import { Photograph, Reading, Shade } from '@/models'

import { canReadPhotographs } from './policy'
import { uuidOrNone } from './queries'
import type { MatchWishes } from './wishes'

const decompress = promisify(inflate)

/** How long a proof may take before the best found so far is shown with its gap, in milliseconds. */
const BUDGET = 2_000

async function loadReading(
  actor: Actor,
  photographId: string,
  attributes: (keyof Reading)[],
): Promise<{ photograph: Photograph; reading: Reading }> {
  authorize(actor, canReadPhotographs)
  const photograph = await Photograph.findOne({
    attributes: ['id', 'lineId'],
    where: { id: uuidOrNone(photographId), brandId: actor.brandId },
    include: [{ model: Reading, as: 'reading', attributes, required: true }],
  })
  if (!photograph?.reading) throw new NotFoundError()
  return { photograph, reading: photograph.reading }
}

/**
 * Matches a photograph that has been read to its line's shades anew, under a designer's wishes. Two
 * queries; within 100 ms for a line of 48 shades.
 * @throws NotFoundError; InvalidError in words when the wishes contradict themselves
 */
export async function matchWithWishes(
  actor: Actor,
  {
    photographId,
    reading: kind,
    lock,
    exclude,
    apart,
  }: MatchWishes & {
    photographId: string
  },
): Promise<Match | NoMatch> {
  const { photograph, reading } = await loadReading(actor, photographId, ['id', 'cells'])
  const rows = await Shade.findAll({
    attributes: ['id', 'labL', 'labA', 'labB'],
    where: { brandId: actor.brandId, lineId: photograph.lineId, ...MATCHABLE },
    order: BY_POSITION,
    raw: true,
  })
  const shades = rows.map(({ id, labL, labA, labB }) => ({ id, lab: [labL, labA, labB] as const }))
  const wishes = { locked: lock, excluded: exclude, ...(apart !== undefined && { apart }) }
  try {
    return matchPhotograph(reading, shades, kind, wishes, {
      now: () => performance.now(),
      budgetMs: BUDGET,
    })
  } catch (error) {
    if (error instanceof RangeError) throw new InvalidError(error.message)
    throw error
  }
}

/**
 * Which cell of the reading each pixel of the small picture belongs to.
 * @returns `cells`: width×height bytes, row by row; 255 where nothing is visible
 */
export async function getCellMap(
  actor: Actor,
  { photographId }: { photographId: string },
): Promise<{ width: number; height: number; cells: Buffer }> {
  const { reading } = await loadReading(actor, photographId, [
    'id',
    'cellMap',
    'mapWidth',
    'mapHeight',
  ])
  return {
    width: reading.mapWidth,
    height: reading.mapHeight,
    cells: await decompress(reading.cellMap),
  }
}
