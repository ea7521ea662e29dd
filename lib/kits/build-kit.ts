import { createHash } from 'node:crypto'

import { buildKit as buildFiles, stepsOf, type BuiltKit } from '@/lib/exports/build-kit'
import { PICTURE_SIZES } from '@/lib/exports/constants'
import { pictureName } from '@/lib/exports/file-names'
import { Rasteriser } from '@/lib/exports/rasterise'
import { deleteObjects, putObject } from '@/lib/storage/objects'
import { Brand, Kit, Line, type Combination } from '@/models'
import type { KitEntry, KitLeftOut } from '@/models/Kit'

import { findCandidates } from './candidates'
import { KIT_LIMITS } from './constants'
import { describeKit, MissingPhotographError } from './describe'
import { reasonsAgainst } from './fitness'
import { kitKey } from './keys'

const DAY = 24 * 60 * 60 * 1000
const UNBUILT = { state: ['waiting', 'building'] }

/** The kit was deleted, or given up, while it was built. */
class GoneError extends Error {}

/**
 * The work of the job `build-kit`: sorts out what cannot go in, draws and writes the rest, stores
 * the zip under the kit's own key and says that it is ready. Doing it again, after any interruption,
 * ends the same. What is wrong with the selection becomes the kit's failure, in words.
 * @throws whatever may pass by itself (the store or the database away): the job is tried again
 */
export async function buildKit(kitId: string): Promise<void> {
  const kit = await Kit.findOne({ where: { id: kitId, ...UNBUILT } })
  if (!kit) return
  const { brandId, lineId, selection } = kit
  const [brand, line, found] = await Promise.all([
    Brand.findByPk(brandId, { rejectOnEmpty: true }),
    Line.findOne({ where: { id: lineId, brandId }, rejectOnEmpty: true }),
    findCandidates({ brandId, lineId, id: selection }),
  ])
  const { fit, leftOut } = sortOut(selection, found)
  if (fit.length === 0) {
    const failure = 'None of its combinations could go in: see below what each is missing.'
    await setUnbuilt(kitId, { state: 'failed', failure, leftOut })
    return
  }
  const total = stepsOf(fit.length)
  const rasteriser = new Rasteriser()
  try {
    await setUnbuilt(kitId, { state: 'building', done: 0, total, leftOut })
    const description = await describeKit(brand.name, line, fit)
    const built = await buildFiles(description, rasteriser, (done) =>
      // The last step is the store's.
      setUnbuilt(kitId, { done: Math.min(done, total - 1) }),
    )
    await store(kit, built, fit, total)
  } catch (error) {
    if (error instanceof GoneError) return
    if (!(error instanceof MissingPhotographError)) throw error
    await failKit(
      kitId,
      `A copy of the photograph ${error.photographTitle} is gone from the picture store. Read that photograph again, then build the kit again.`,
    )
  } finally {
    rasteriser.close()
  }
}

/** Says why a kit could not be built. */
export async function failKit(kitId: string, failure: string): Promise<void> {
  await Kit.update({ state: 'failed', failure }, { where: { id: kitId, ...UNBUILT } })
}

async function store(
  kit: Kit,
  { zip, files, texts }: BuiltKit,
  fit: readonly Combination[],
  total: number,
): Promise<void> {
  const objectKey = kitKey(kit)
  await putObject(objectKey, zip, 'application/zip')
  const titles = new Map(fit.map(({ id, title }) => [id, title]))
  const contents = texts.map(({ id, name, alt, caption, html }): KitEntry => ({
    id,
    title: titles.get(id) ?? '',
    alt,
    caption,
    html,
    pictures: PICTURE_SIZES.flatMap(({ width, height }) => {
      const file = files.find(({ path }) => path === pictureName(name, { width, height }))
      if (!file || file.offset === null) return []
      return { width, height, offset: file.offset, byteLength: file.byteLength }
    }),
  }))
  try {
    await setUnbuilt(kit.id, {
      state: 'ready',
      failure: null,
      done: total,
      total,
      contents,
      objectKey,
      byteLength: zip.length,
      sha256: createHash('sha256').update(zip).digest('hex'),
      expiresAt: new Date(Date.now() + KIT_LIMITS.keptDays * DAY),
    })
  } catch (error) {
    // Built by another try meanwhile, it is that one's file too.
    if (error instanceof GoneError && !(await isReady(kit.id))) await deleteObjects([objectKey])
    throw error
  }
}

const isReady = async (id: string) => (await Kit.count({ where: { id, state: 'ready' } })) > 0

async function setUnbuilt(id: string, values: Partial<Kit['_creationAttributes']>): Promise<void> {
  const [changed] = await Kit.update(values, { where: { id, ...UNBUILT } })
  if (changed === 0) throw new GoneError()
}

/** The combinations that can go in, in the order asked for, and why the others cannot. */
function sortOut(selection: readonly string[], found: readonly Combination[]) {
  const byId = new Map(found.map((combination) => [combination.id, combination]))
  const fit: Combination[] = []
  const leftOut: KitLeftOut[] = []
  for (const id of selection) {
    const combination = byId.get(id)
    const reasons = combination ? reasonsAgainst(combination) : ['It has been deleted.']
    if (combination && reasons.length === 0) fit.push(combination)
    else leftOut.push({ id, title: combination?.title ?? 'A combination', reasons })
  }
  return { fit, leftOut }
}
