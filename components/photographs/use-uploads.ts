'use client'

import { useEffect, useRef, useState } from 'react'

import { uploadFile, type UploadOutcome, type UploadStep } from './upload-file'

/** A file in the list of uploads. */
export interface Upload {
  key: string
  file: File
  step: UploadStep | 'queued' | 'ended'
  /** 0 to 1. */
  sent: number
  outcome?: UploadOutcome
}

/** This many files are on their way at once. */
const AT_ONCE = 3

const isUnderWay = ({ step }: Upload) => step !== 'queued' && step !== 'ended'

/**
 * The files being added to a line: some at a time, each to be cancelled or tried again by itself.
 * Leaving the page while any is on its way asks first.
 * @param onAdded called after each file that the line has now; the answer to an earlier try may have
 * been lost, so that it was taken in then
 */
export function useUploads(
  place: { brand: string; lineSlug: string },
  onAdded: () => void,
): {
  uploads: Upload[]
  add: (files: readonly File[]) => void
  cancel: (key: string) => void
  retry: (key: string) => void
  dismiss: (key: string) => void
} {
  const [uploads, setUploads] = useState<Upload[]>([])
  const aborts = useRef(new Map<string, AbortController>())
  const busy = uploads.some(({ step }) => step !== 'ended')

  const change = (key: string, changes: Partial<Upload>) =>
    setUploads((all) => all.map((one) => (one.key === key ? { ...one, ...changes } : one)))

  async function run({ key, file }: Upload) {
    const abort = new AbortController()
    aborts.current.set(key, abort)
    const outcome = await uploadFile({
      ...place,
      file,
      signal: abort.signal,
      onStep: (step) => change(key, { step }),
      onProgress: (sent) => change(key, { sent }),
    })
    aborts.current.delete(key)
    change(key, { step: 'ended', outcome })
    if (outcome.kind === 'added' || outcome.kind === 'same') onAdded()
  }

  useEffect(() => {
    const free = AT_ONCE - uploads.filter(isUnderWay).length
    for (const upload of uploads.filter(({ step }) => step === 'queued').slice(0, free)) {
      if (aborts.current.has(upload.key)) continue
      void run(upload)
    }
  })

  useEffect(() => {
    if (!busy) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [busy])

  return {
    uploads,
    add: (files) =>
      setUploads((all) => [
        ...all,
        ...files.map((file) => ({
          key: crypto.randomUUID(),
          file,
          step: 'queued' as const,
          sent: 0,
        })),
      ]),
    cancel: (key) => {
      const abort = aborts.current.get(key)
      if (abort) abort.abort()
      else change(key, { step: 'ended', outcome: { kind: 'cancelled' } })
    },
    retry: (key) =>
      setUploads((all) =>
        all.map((one) =>
          one.key === key ? { key, file: one.file, step: 'queued' as const, sent: 0 } : one,
        ),
      ),
    dismiss: (key) => setUploads((all) => all.filter((one) => one.key !== key)),
  }
}
