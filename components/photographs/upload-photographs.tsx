'use client'

import { Camera, ImagePlus } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useRef, useState, type DragEvent, type ReactNode } from 'react'

import { Button } from '@/components/ui/button'
import { cn } from '@/components/ui/cn'
import { LedgerList } from '@/components/ui/ledger'
import { FORMATS_TAKEN, MAX_BYTES, UPLOAD_MIMES } from '@/lib/photographs/formats'

import { UploadRow } from './upload-row'
import { useUploads } from './use-uploads'

const ACCEPT = [...UPLOAD_MIMES, '.tif', '.tiff', '.avif'].join(',')

/** Adds photographs by dropping them on the sheet, from files, or from a phone's camera. */
export function UploadPhotographs({
  brand,
  lineSlug,
  children,
}: {
  brand: string
  lineSlug: string
  /** The sheet that files can be dropped on. */
  children: ReactNode
}) {
  const router = useRouter()
  const files = useRef<HTMLInputElement>(null)
  const camera = useRef<HTMLInputElement>(null)
  const [over, setOver] = useState(false)
  const { uploads, add, cancel, retry, dismiss } = useUploads({ brand, lineSlug }, router.refresh)

  const hasFiles = (event: DragEvent) => event.dataTransfer.types.includes('Files')
  function onDragOver(event: DragEvent) {
    if (!hasFiles(event)) return
    event.preventDefault()
    setOver(true)
  }
  function onDrop(event: DragEvent) {
    if (!hasFiles(event)) return
    event.preventDefault()
    setOver(false)
    add([...event.dataTransfer.files])
  }
  function take(input: HTMLInputElement) {
    add([...(input.files ?? [])])
    // So that the same file can be chosen again.
    input.value = ''
  }

  return (
    <div
      onDragEnter={onDragOver}
      onDragOver={onDragOver}
      onDragLeave={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget as Node | null)) setOver(false)
      }}
      onDrop={onDrop}
    >
      <div
        className={cn(
          'mb-6 flex flex-wrap items-center gap-x-4 gap-y-3 rounded border border-dashed border-rule p-5 print:hidden',
          over && 'border-2 border-woad bg-wash p-[1.1875rem]',
        )}
      >
        <input
          ref={files}
          type="file"
          multiple
          accept={ACCEPT}
          hidden
          aria-label="Photographs from files"
          onChange={({ currentTarget }) => take(currentTarget)}
        />
        <input
          ref={camera}
          type="file"
          accept="image/*"
          capture="environment"
          hidden
          aria-label="A photograph from the camera"
          onChange={({ currentTarget }) => take(currentTarget)}
        />
        <Button
          variant="primary"
          icon={<ImagePlus aria-hidden="true" />}
          onClick={() => files.current?.click()}
        >
          Add photographs
        </Button>
        <span className="hidden pointer-coarse:inline">
          <Button icon={<Camera aria-hidden="true" />} onClick={() => camera.current?.click()}>
            Take a photograph
          </Button>
        </span>
        <p className="max-w-[30rem] text-sm text-ink-faint">
          <span className="pointer-coarse:hidden">or drop them anywhere here. </span>
          {FORMATS_TAKEN}, up to {MAX_BYTES / 1e6} MB each.
        </p>
      </div>
      {uploads.length > 0 ? (
        <section aria-label="Files being added" className="mb-8">
          <LedgerList>
            {uploads.map((upload) => (
              <UploadRow
                key={upload.key}
                upload={upload}
                hrefOf={(id) => `/${brand}/lines/${lineSlug}/photographs/${id}`}
                onCancel={() => cancel(upload.key)}
                onRetry={() => retry(upload.key)}
                onDismiss={() => dismiss(upload.key)}
              />
            ))}
          </LedgerList>
        </section>
      ) : null}
      {children}
    </div>
  )
}
