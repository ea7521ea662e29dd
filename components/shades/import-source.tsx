'use client'

import { FileText, Upload } from 'lucide-react'
import { useId, useState, type DragEvent } from 'react'

import { Button } from '@/components/ui/button'
import { buttonClass } from '@/components/ui/button-class'
import { cn } from '@/components/ui/cn'
import { Field } from '@/components/ui/field'
import { Textarea } from '@/components/ui/textarea'

import { decodeText } from './decode-text'

/** The text of a CSV file and what it was called. */
export interface CsvSource {
  name: string
  text: string
  encoding: string | null
}

/** Where the text comes from: a file chosen or dropped, or pasted cells. */
export function ImportSource({
  source,
  holds,
  most,
  loud = true,
  onChoose,
  onProblem,
}: {
  source: CsvSource | undefined
  /** "shades" */
  holds: string
  /** Characters of one file. */
  most: number
  /** Choosing a file is the one action of the page. */
  loud?: boolean
  onChoose: (source: CsvSource) => void
  onProblem: (problem: string | undefined) => void
}) {
  const id = useId()
  const [pasted, setPasted] = useState('')
  const [over, setOver] = useState(false)

  async function take(file: File | undefined) {
    if (!file) return
    onProblem(undefined)
    // Four bytes a character is the most that UTF-8 takes.
    if (file.size > 4 * most) {
      onProblem(`${file.name} is too large for a list of ${holds}. Nothing was read.`)
      return
    }
    try {
      const decoded = decodeText(new Uint8Array(await file.arrayBuffer()))
      if ('problem' in decoded) onProblem(`${file.name}: ${decoded.problem}`)
      else onChoose({ name: file.name, ...decoded })
    } catch {
      onProblem(`${file.name} could not be opened. Choose it again.`)
    }
  }

  const drop = (event: DragEvent) => {
    event.preventDefault()
    setOver(false)
    void take(event.dataTransfer.files[0])
  }

  return (
    <section aria-label="The file">
      <div
        onDragOver={(event) => {
          event.preventDefault()
          setOver(true)
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={cn(
          'flex flex-wrap items-center gap-x-4 gap-y-3 rounded border border-dashed p-5',
          over ? 'border-woad bg-wash' : 'border-rule',
        )}
      >
        <input
          id={id}
          type="file"
          accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
          className="peer sr-only"
          onChange={(event) => {
            void take(event.target.files?.[0])
            // The same file, mended meanwhile, may be chosen again.
            event.target.value = ''
          }}
        />
        <label
          htmlFor={id}
          className={`${buttonClass(source || !loud ? 'secondary' : 'primary')} cursor-pointer peer-focus-visible:outline-2 peer-focus-visible:outline-offset-2`}
        >
          <Upload aria-hidden="true" />
          {source ? 'Choose another file' : 'Choose a CSV file'}
        </label>
        {source ? (
          <p className="flex min-w-0 items-center gap-2">
            <FileText aria-hidden="true" className="size-4 shrink-0" />
            <span className="min-w-0 break-words">{source.name}</span>
            {source.encoding === 'windows-1252' ? (
              <span className="text-sm text-ink-faint">read as Windows-1252</span>
            ) : null}
          </p>
        ) : (
          <p className="text-ink-soft">or drop it here. Nothing is saved before you say so.</p>
        )}
      </div>
      <details className="mt-3">
        <summary className="inline-flex min-h-8 items-center text-woad underline underline-offset-2 pointer-coarse:min-h-11">
          Paste cells from a spreadsheet instead
        </summary>
        <div className="mt-2 space-y-3">
          <Field
            label="Cells"
            hint="Copy them with their header row. Tabs, commas and semicolons are understood."
          >
            <Textarea
              rows={5}
              spellCheck={false}
              className="font-mono max-h-72 text-sm"
              value={pasted}
              onChange={(event) => setPasted(event.target.value)}
            />
          </Field>
          <Button
            disabled={pasted.trim() === ''}
            onClick={() => onChoose({ name: 'Pasted cells', text: pasted, encoding: null })}
          >
            Read pasted cells
          </Button>
        </div>
      </details>
    </section>
  )
}
