import type { Failure } from '@/lib/errors'
import { FORMATS_TAKEN, MAX_BYTES, UPLOAD_MIMES } from '@/lib/photographs/formats'

/** What is being done with a file that is on its way. */
export type UploadStep = 'preparing' | 'sending' | 'checking'

/** How it ended. A refusal is about the file; a failure can be tried again. */
export type UploadOutcome =
  | { kind: 'added'; photographId: string }
  | { kind: 'same'; photographId: string; title: string }
  | { kind: 'refused' | 'failed'; message: string }
  | { kind: 'cancelled' }

/** Props of {@link uploadFile}. */
export interface UploadJob {
  brand: string
  lineSlug: string
  file: File
  signal: AbortSignal
  onStep: (step: UploadStep) => void
  /** 0 to 1 of the bytes sent. */
  onProgress: (sent: number) => void
}

type Asked =
  | { kind: 'upload'; photographId: string; post: { url: string; fields: Record<string, string> } }
  | { kind: 'same'; photographId: string; title: string }
type Confirmed = Extract<UploadOutcome, { kind: 'added' | 'same' }>

const BY_ENDING: Record<string, string> = {
  tif: 'image/tiff',
  tiff: 'image/tiff',
  avif: 'image/avif',
}
const UNREACHED =
  'Woadmap could not be reached. The file is kept here: check the connection and retry.'

/** A browser does not always know a TIFF or an AVIF; what the file is, the server looks up. */
const typeOf = ({ type, name }: File): string =>
  type || (BY_ENDING[name.split('.').at(-1)?.toLowerCase() ?? ''] ?? '')

/** Why a file need not be sent at all, in words; null when it may be. */
export function refusalOf(file: File): string | null {
  if (file.size === 0) return 'The file is empty.'
  if (file.size > MAX_BYTES)
    return `The file is larger than ${MAX_BYTES / 1e6} MB. Export a smaller copy.`
  if (!(UPLOAD_MIMES as readonly string[]).includes(typeOf(file))) {
    return `Photographs are taken as ${FORMATS_TAKEN}. Export it as one of these.`
  }
  return null
}

/** An answer of the server that ends the upload. */
class Ended extends Error {
  constructor(readonly outcome: UploadOutcome) {
    super(outcome.kind)
  }
}

async function ask<Answer>(url: string, init: RequestInit): Promise<Answer> {
  const answer = await fetch(url, init)
  if (answer.ok) return (await answer.json()) as Answer
  const failure = (await answer.json().catch(() => null)) as Failure | null
  const message = failure?.fieldErrors
    ? Object.values(failure.fieldErrors).flat().join(' ')
    : failure?.message
  const about = ['invalid', 'forbidden', 'not-found', 'conflict'].includes(failure?.code ?? '')
  throw new Ended({ kind: about ? 'refused' : 'failed', message: message ?? UNREACHED })
}

async function sha256(file: File): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', await file.arrayBuffer())
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('')
}

function send(
  { url, fields }: Extract<Asked, { kind: 'upload' }>['post'],
  { file, signal, onProgress }: UploadJob,
): Promise<void> {
  return new Promise((resolve, reject) => {
    const form = new FormData()
    for (const [name, value] of Object.entries(fields)) form.append(name, value)
    form.append('file', file)
    const request = new XMLHttpRequest()
    const broken = () =>
      reject(
        new Ended({
          kind: 'failed',
          message: 'Sending broke off. The file is kept here: retry when the connection is back.',
        }),
      )
    request.upload.onprogress = ({ loaded, total }) => onProgress(total ? loaded / total : 0)
    request.onload = () => (request.status < 300 ? resolve() : broken())
    request.onerror = broken
    request.onabort = () => reject(new Ended({ kind: 'cancelled' }))
    signal.addEventListener('abort', () => request.abort(), { once: true })
    request.open('POST', url)
    request.send(form)
  })
}

/**
 * Takes one file all the way: announces it, sends it straight to the object store, and has it
 * confirmed. Cancelling gives the announcement back. Never throws.
 */
export async function uploadFile(job: UploadJob): Promise<UploadOutcome> {
  const { brand, lineSlug, file, signal, onStep } = job
  const refusal = refusalOf(file)
  if (refusal) return { kind: 'refused', message: refusal }
  const photographs = `/api/brands/${brand}/photographs`
  let announced: string | undefined
  try {
    onStep('preparing')
    const asked = await ask<Asked>(photographs, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      signal,
      body: JSON.stringify({
        lineSlug,
        fileName: file.name,
        contentType: typeOf(file),
        byteLength: file.size,
        sha256: await sha256(file),
      }),
    })
    if (asked.kind === 'same') return asked
    announced = asked.photographId
    if (signal.aborted) throw new Ended({ kind: 'cancelled' })
    onStep('sending')
    await send(asked.post, job)
    onStep('checking')
    // Not to be cancelled any more: the file may be taken in already.
    return await ask<Confirmed>(`${photographs}/${announced}/confirm`, { method: 'POST' })
  } catch (error) {
    const outcome: UploadOutcome =
      error instanceof Ended
        ? error.outcome
        : signal.aborted
          ? { kind: 'cancelled' }
          : { kind: 'failed', message: UNREACHED }
    if (outcome.kind === 'cancelled' && announced) {
      // If this does not arrive, the sweep does it.
      void fetch(`${photographs}/${announced}/upload`, { method: 'DELETE' }).catch(() => {})
    }
    return outcome
  }
}
