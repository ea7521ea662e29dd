import { createHash } from 'node:crypto'
import { promisify } from 'node:util'
import { deflate } from 'node:zlib'

import { Op, type Transaction } from 'sequelize'

import { strikingColors } from '@/lib/color/striking'
import { enqueue } from '@/lib/jobs/queue'
import { BY_POSITION, MATCHABLE } from '@/lib/shades/queries'
import { getObject } from '@/lib/storage/objects'
import { inTransaction, Line, Photograph, Reading, Shade } from '@/models'

import { computeMatches } from './compute-matches'
import { decodePhotograph, PhotographError } from './decode'
import { makeCopies } from './make-copies'
import { readColors } from './read-colors'

const compress = promisify(deflate)

/**
 * The work of the job `read-photograph`: reads a photograph's colours, matches them to the line's
 * shades, makes the first copies for the screen, and says that it is ready. Doing it twice ends the
 * same. What is wrong with the picture itself becomes the photograph's failure, in words.
 * @throws whatever may pass by itself (the store or the database away): the job is tried again
 */
export async function readPhotograph(photographId: string): Promise<void> {
  const photograph = await Photograph.findByPk(photographId)
  if (!photograph || photograph.state === 'pending' || photograph.state === 'ready') return
  await setState(photographId, { state: 'reading', failure: null })
  try {
    const original = await getOriginal(photograph)
    const { image, width, height } = await decodePhotograph(original)
    const colors = readColors(image)
    // The line's revision before its shades: a change in between leaves the reading marked stale.
    const line = await Line.findByPk(photograph.lineId, { rejectOnEmpty: true })
    const shades = await listShadesToMatch(line)
    const reading = {
      brandId: photograph.brandId,
      photographId,
      cells: colors.cells,
      cellMap: await compress(colors.cellMap),
      mapWidth: colors.width,
      mapHeight: colors.height,
      striking: strikingColors(image),
      matches: computeMatches(colors.cells, shades),
      shadesRevision: line.shadesRevision,
    }
    const derivatives = await makeCopies(photograph, original, 'webp')
    await inTransaction(async (transaction) => {
      const [changed] = await setState(
        photographId,
        { state: 'ready', failure: null, width, height, derivatives },
        transaction,
      )
      // Deleted meanwhile: nothing to keep.
      if (changed === 0) return
      await Reading.bulkCreate([reading], {
        conflictAttributes: ['photographId'],
        updateOnDuplicate: [...(Object.keys(reading) as (keyof typeof reading)[]), 'updatedAt'],
        transaction,
      })
      await enqueue('copy-photograph', { photographId }, transaction)
    })
  } catch (error) {
    if (!(error instanceof PhotographError)) throw error
    await failReading(photographId, error.message)
  }
}

/** Says why a photograph could not be read. */
export async function failReading(photographId: string, failure: string): Promise<void> {
  await setState(photographId, { state: 'failed', failure })
}

/** The work of the job `copy-photograph`: the copies in the slower, smaller format. */
export async function copyPhotograph(photographId: string): Promise<void> {
  const photograph = await Photograph.findByPk(photographId)
  if (photograph?.state !== 'ready') return
  const original = await getOriginal(photograph)
  const copies = await makeCopies(photograph, original, 'avif')
  const others = photograph.derivatives.filter(({ format }) => format !== 'avif')
  await Photograph.update(
    { derivatives: [...others, ...copies] },
    { where: { id: photographId, state: 'ready', sha256: photograph.sha256 } },
  )
}

/** The file that was confirmed. @throws PhotographError when it is gone or another */
async function getOriginal({ objectKey, sha256 }: Photograph): Promise<Buffer> {
  const original = await getObject(objectKey)
  if (!original) {
    throw new PhotographError('empty', 'Its file is gone from the picture store. Add it again.')
  }
  // The form that it was sent with takes a file for minutes after the confirmation.
  if (createHash('sha256').update(original).digest('hex') !== sha256) {
    throw new PhotographError('damaged', 'Its file is not the one that was added. Add it again.')
  }
  return original
}

function setState(
  photographId: string,
  values: Partial<Photograph['_creationAttributes']>,
  transaction: Transaction | null = null,
): Promise<[number]> {
  return Photograph.update(values, {
    where: { id: photographId, state: { [Op.ne]: 'pending' } },
    transaction,
  })
}

async function listShadesToMatch({ brandId, id: lineId }: Line) {
  const shades = await Shade.findAll({
    attributes: ['id', 'labL', 'labA', 'labB'],
    where: { brandId, lineId, ...MATCHABLE },
    order: BY_POSITION,
  })
  return shades.map(({ id, labL, labA, labB }) => ({ id, lab: [labL, labA, labB] as const }))
}
