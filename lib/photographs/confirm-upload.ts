import { createHash } from 'node:crypto'

import { UniqueConstraintError } from 'sequelize'

import { photographObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { InvalidError, NotFoundError } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { deleteObjects, getObject, headObject } from '@/lib/storage/objects'
import { inTransaction, Photograph } from '@/models'

import { decodePhotograph, PhotographError, sniffPhotograph } from './decode'
import { refuseHiddenMarkup } from './hidden-markup'
import { canUploadPhotographs } from './policy'
import { findSameFile, uuidOrNone } from './queries'
import { readColors } from './read-colors'
import { FORMATS_TAKEN, UPLOAD_MIMES } from './formats'
import type { PhotographIdInput } from './schema'

/** The photograph is taken in, or the line has that file already. */
export type ConfirmAnswer =
  { kind: 'added'; photographId: string } | { kind: 'same'; photographId: string; title: string }

/**
 * Takes in a file that has arrived in the object store: checks that it is what was announced and a
 * whole photograph, and has it read. Confirming again answers the same. A file that is refused is
 * removed with its row.
 * @throws NotFoundError, InvalidError in words, UnavailableError when the store is away
 */
export async function confirmUpload(
  actor: Actor,
  { photographId }: PhotographIdInput,
): Promise<ConfirmAnswer> {
  authorize(actor, canUploadPhotographs)
  const photograph = await Photograph.findOne({
    where: { id: uuidOrNone(photographId), brandId: actor.brandId },
  })
  if (!photograph) throw new NotFoundError()
  if (photograph.state !== 'pending') return { kind: 'added', photographId }

  let contentType: string
  try {
    contentType = await requireWhatWasAnnounced(photograph)
  } catch (error) {
    if (error instanceof PhotographError) await discardUpload(photograph)
    throw error
  }

  try {
    await inTransaction(async (transaction) => {
      const [changed] = await Photograph.update(
        { state: 'waiting', contentType },
        { where: { id: photographId, state: 'pending' }, transaction },
      )
      // Somebody confirmed it a moment ago; that one's job is enough.
      if (changed !== 1) return
      await enqueue('read-photograph', { photographId }, transaction)
      const { fileName, byteLength } = photograph
      await recordActivity(
        actor,
        {
          action: 'photograph.added',
          object: photographObject(photograph),
          after: { fileName, byteLength },
        },
        transaction,
      )
    })
    return { kind: 'added', photographId }
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    const same = await findSameFile(actor, photograph.lineId, photograph.sha256)
    await discardUpload(photograph)
    if (!same) throw new NotFoundError()
    return { kind: 'same', photographId: same.id, title: same.title }
  }
}

/**
 * Gives up an upload that was not confirmed: its row and whatever has arrived of it.
 * @throws NotFoundError
 */
export async function withdrawUpload(
  actor: Actor,
  { photographId }: PhotographIdInput,
): Promise<void> {
  authorize(actor, canUploadPhotographs)
  const photograph = await Photograph.findOne({
    where: { id: uuidOrNone(photographId), brandId: actor.brandId, state: 'pending' },
  })
  if (!photograph) throw new NotFoundError()
  await discardUpload(photograph)
}

/** The row first: without it the object is an orphan, which the sweep would find in any case. */
async function discardUpload({ id, objectKey }: Photograph): Promise<void> {
  await Photograph.destroy({ where: { id, state: 'pending' }, force: true })
  await deleteObjects([objectKey])
}

const NOT_AS_ANNOUNCED = 'The file that arrived is not the one that was sent. Add it again.'

/**
 * What the file is by its bytes; a browser only knows its name.
 * @throws PhotographError for a file to be refused, InvalidError when none has arrived yet
 */
async function requireWhatWasAnnounced(photograph: Photograph): Promise<string> {
  const head = await headObject(photograph.objectKey)
  if (!head) throw new InvalidError('The file has not arrived. Send it again.')
  const { byteLength, contentType, sha256 } = photograph
  if (head.byteLength !== byteLength || head.contentType !== contentType) {
    throw new PhotographError('damaged', NOT_AS_ANNOUNCED)
  }
  const bytes = await getObject(photograph.objectKey)
  if (!bytes || createHash('sha256').update(bytes).digest('hex') !== sha256) {
    throw new PhotographError('damaged', NOT_AS_ANNOUNCED)
  }
  const mime = await sniffPhotograph(bytes)
  if (!(UPLOAD_MIMES as readonly string[]).includes(mime)) {
    throw new PhotographError('format', `Photographs are taken as ${FORMATS_TAKEN}.`)
  }
  refuseHiddenMarkup(bytes)
  readColors((await decodePhotograph(bytes)).image)
  return mime
}
