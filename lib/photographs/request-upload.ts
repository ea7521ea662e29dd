import { randomUUID } from 'node:crypto'

import { authorize, type Actor } from '@/lib/auth/actor'
import { spend } from '@/lib/auth/rate-limits'
import { ConflictError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { presignUpload, requireObjectStore } from '@/lib/storage/objects'
import { inTransaction, Line, Photograph } from '@/models'

import { draftTitle } from './draft-title'
import { originalKey } from './keys'
import { canUploadPhotographs } from './policy'
import { findSameFile } from './queries'
import { PHOTOGRAPH_LIMITS } from './constants'
import type { RequestUploadInput } from './schema'

/** Where to send a file, or the photograph of the line that already is that file. */
export type UploadAnswer =
  | {
      kind: 'upload'
      photographId: string
      /** A form of the object store, good for five minutes; the file goes last. */
      post: { url: string; fields: Record<string, string> }
    }
  | { kind: 'same'; photographId: string; title: string }

/**
 * Expects a file: a pending photograph, and a form that takes exactly that file. Asking again for
 * the same file gives the same photograph with a fresh form.
 * @throws NotFoundError, ConflictError, TooManyError, UnavailableError when the store is away (nothing is kept)
 */
export async function requestUpload(
  actor: Actor,
  { lineSlug, ...file }: RequestUploadInput,
): Promise<UploadAnswer> {
  authorize(actor, canUploadPhotographs)
  const line = await getLine(actor, lineSlug)
  const same = await findSameFile(actor, line.id, file.sha256)
  if (same) return { kind: 'same', photographId: same.id, title: same.title }
  await spend('upload', actor.brandId, 'Adding photographs')
  await requireObjectStore()
  const photograph = await expectFile(actor, line, file)
  const { url, fields } = await presignUpload({ ...file, key: photograph.objectKey })
  return { kind: 'upload', photographId: photograph.id, post: { url, fields } }
}

function expectFile(
  { brandId, personId }: Actor,
  { id: lineId }: Line,
  file: Omit<RequestUploadInput, 'lineSlug'>,
): Promise<Photograph> {
  return inTransaction(async (transaction) => {
    // One after the other within a line, so that the same file is expected once.
    await Line.findOne({ where: { brandId, id: lineId }, lock: true, transaction })
    const pending = await Photograph.findOne({
      where: {
        brandId,
        lineId,
        uploadedById: personId,
        state: 'pending',
        sha256: file.sha256,
        byteLength: file.byteLength,
        contentType: file.contentType,
      },
      transaction,
    })
    // A fresh start of the clock that sweeps what never arrives.
    if (pending) {
      pending.changed('updatedAt', true)
      return pending.save({ transaction })
    }
    const count = await Photograph.count({ where: { brandId, lineId }, transaction })
    if (count >= PHOTOGRAPH_LIMITS.perLine) {
      throw new ConflictError(
        `A line holds at most ${PHOTOGRAPH_LIMITS.perLine} photographs. Delete some, then add this one.`,
      )
    }
    const id = randomUUID()
    return Photograph.create(
      {
        ...file,
        id,
        brandId,
        lineId,
        uploadedById: personId,
        title: draftTitle(file.fileName),
        objectKey: originalKey({ id, brandId }),
      },
      { transaction },
    )
  })
}
