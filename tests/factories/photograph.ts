import { createHash, randomFillSync, randomUUID } from 'node:crypto'

import sharp from 'sharp'

import type { Actor } from '@/lib/auth/actor'
import { originalKey } from '@/lib/photographs/keys'
import { requestUpload } from '@/lib/photographs/request-upload'
import type { RequestUploadInput } from '@/lib/photographs/schema'
import { Photograph, type Line } from '@/models'

const BANDS = [
  [222, 214, 196],
  [176, 116, 56],
  [110, 128, 70],
  [104, 118, 136],
  [58, 46, 38],
]

/** A small picture of five bands, different at every call. */
export function makePicture({ width = 640, height = 400 } = {}): Promise<Buffer> {
  const pixels = Buffer.alloc(width * height * 3)
  for (let at = 0; at < width * height; at++) {
    const band = BANDS[Math.floor((Math.floor(at / width) * 5) / height)]!
    for (let c = 0; c < 3; c++) pixels[at * 3 + c] = band[c]! + ((at * 7 + c) % 9)
  }
  randomFillSync(pixels, 0, width * 3)
  return sharp(pixels, { raw: { width, height, channels: 3 } })
    .jpeg({ quality: 92 })
    .toBuffer()
}

/** What a browser would announce of these bytes. */
export function announce(
  line: Line,
  bytes: Buffer,
  changes: Partial<RequestUploadInput> = {},
): RequestUploadInput {
  return {
    lineSlug: line.slug,
    fileName: 'hillside.jpg',
    contentType: 'image/jpeg',
    byteLength: bytes.length,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    ...changes,
  }
}

/** Sends bytes with the form of an upload, as a browser does. */
export async function sendTo(
  post: { url: string; fields: Record<string, string> },
  bytes: Buffer,
): Promise<Response> {
  const form = new FormData()
  for (const [name, value] of Object.entries(post.fields)) form.append(name, value)
  form.append('file', new Blob([new Uint8Array(bytes)], { type: post.fields['Content-Type'] }))
  return fetch(post.url, { method: 'POST', body: form })
}

/** Announces and sends a file, up to but not including its confirmation. */
export async function uploadTo(
  actor: Actor,
  line: Line,
  bytes: Buffer,
  changes: Partial<RequestUploadInput> = {},
): Promise<string> {
  const answer = await requestUpload(actor, announce(line, bytes, changes))
  if (answer.kind !== 'upload') throw new Error('The line has that file already.')
  const response = await sendTo(answer.post, bytes)
  if (!response.ok) throw new Error(`The store answered ${response.status}.`)
  return answer.photographId
}

/** A photograph's row alone, ready and without a reading, for tests that look at no picture. */
export function makePhotograph(
  { brandId, id: lineId }: Pick<Line, 'brandId' | 'id'>,
  values: Partial<Pick<Photograph, 'title' | 'state' | 'altText' | 'licence'>> = {},
): Promise<Photograph> {
  const id = randomUUID()
  return Photograph.create({
    id,
    brandId,
    lineId,
    title: 'A photograph',
    fileName: 'a.jpg',
    objectKey: originalKey({ id, brandId }),
    contentType: 'image/jpeg',
    byteLength: 1,
    sha256: createHash('sha256').update(id).digest('hex'),
    uploadedById: null,
    state: 'ready',
    ...values,
  })
}
