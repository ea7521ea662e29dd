'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { reach } from '@/components/reach'
import { SheetSection } from '@/components/layout/sheet-header'
import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Spinner } from '@/components/ui/spinner'
import { toastDone } from '@/components/ui/toast'
import type { ImportPreview } from '@/lib/shades/present'
import { SHADE_LIMITS, type CsvMapping, type ReadingTerms } from '@/lib/shades/constants'

import { ImportColumns } from './import-columns'
import { ImportRows } from './import-rows'
import { ImportSource, type CsvSource } from './import-source'
import { shadesHref, type LinePlace, type ShadesActions } from './shades-actions'

/** A CSV file on its way into a line: chosen, its columns named, looked at, and only then saved. */
export function ImportShades({
  place,
  actions,
}: {
  place: LinePlace
  actions: Pick<ShadesActions, 'preview' | 'import'>
}) {
  const router = useRouter()
  const [source, setSource] = useState<CsvSource>()
  const [terms, setTerms] = useState<ReadingTerms | null>(null)
  const [preview, setPreview] = useState<ImportPreview>()
  const [problem, setProblem] = useState<string>()
  const [reading, setReading] = useState(false)
  const [saving, setSaving] = useState(false)
  const asked = useRef(0)
  const { brand, lineSlug } = place

  async function look(
    from: CsvSource,
    mapping: CsvMapping | null,
    under: ReadingTerms | null,
  ): Promise<void> {
    const turn = (asked.current += 1)
    setReading(true)
    const answer = await reach(
      actions.preview(brand, { lineSlug, text: from.text, mapping, terms: under }),
    )
    // Only the last question's answer counts.
    if (turn !== asked.current) return
    setReading(false)
    if (answer.ok) {
      setPreview(answer.data)
      setProblem(undefined)
    } else {
      setProblem(Object.values(answer.fieldErrors ?? {})[0]?.[0] ?? answer.message)
      if (mapping === null) setPreview(undefined)
    }
  }

  function choose(next: CsvSource) {
    setPreview(undefined)
    setTerms(null)
    // More than this does not reach the server, which would look like a lost connection.
    if (new TextEncoder().encode(next.text).length > SHADE_LIMITS.importText) {
      setSource(undefined)
      setProblem(`${next.name} is over 2.5 MB. Import it in smaller parts. Nothing was read.`)
      return
    }
    setSource(next)
    void look(next, null, null)
  }

  async function save() {
    if (!source || !preview) return
    setSaving(true)
    const { mapping, shadesRevision } = preview
    const answer = await reach(
      actions.import(brand, { lineSlug, text: source.text, mapping, terms, shadesRevision }),
    )
    setSaving(false)
    if (answer.ok) {
      const { new: added, changed, unchanged, bad } = answer.data
      const left = bad > 0 ? ` ${bad} bad left out.` : ''
      toastDone(`${added} added, ${changed} changed, ${unchanged} as they were.${left}`)
      router.push(shadesHref(place) as never)
      return
    }
    if (answer.code === 'conflict') await look(source, mapping, terms)
    setProblem(answer.message)
  }

  const counts = preview?.counts
  const good = counts ? counts.new + counts.changed : 0
  return (
    <div>
      <ImportSource
        source={source}
        holds="shades"
        most={SHADE_LIMITS.importText}
        onChoose={choose}
        onProblem={setProblem}
      />
      <LiveRegion>
        {reading
          ? 'Reading the file…'
          : counts
            ? `${counts.new} new, ${counts.changed} changed, ${counts.unchanged} unchanged, ${counts.bad} bad.`
            : ''}
      </LiveRegion>
      {problem ? (
        <Notice kind="error" className="mt-6">
          {problem}
        </Notice>
      ) : null}
      {reading && !preview ? (
        <p className="mt-6 flex items-center gap-2">
          <Spinner /> Reading the file…
        </p>
      ) : null}
      {source && preview ? (
        <>
          <ImportColumns
            preview={preview}
            terms={terms}
            onMapping={(mapping) => {
              setPreview({ ...preview, mapping })
              void look(source, mapping, terms)
            }}
            onTerms={(next) => {
              setTerms(next)
              void look(source, preview.mapping, next)
            }}
          />
          {preview.problems.length === 0 ? (
            <SheetSection
              title="What would happen"
              aside={reading ? 'Reading the file…' : 'Nothing is saved yet'}
            >
              <ImportRows
                // A new file starts on its first row.
                key={source.name + source.text.length}
                preview={preview}
                fileName={source.name}
              />
              <div className="mt-6 flex flex-wrap items-center gap-x-4 gap-y-3 border-t border-hairline pt-4">
                <Button
                  variant="primary"
                  disabled={good === 0 || reading}
                  pending={saving}
                  pendingLabel="Saving shades…"
                  onClick={() => void save()}
                >
                  {good === 0
                    ? 'Nothing to save'
                    : good === 1
                      ? 'Save 1 shade'
                      : `Save ${good} shades`}
                </Button>
                {preview.counts.bad > 0 && good > 0 ? (
                  <p className="text-ink-soft">
                    {preview.counts.bad === 1
                      ? 'The bad row is left out.'
                      : `The ${preview.counts.bad} bad rows are left out.`}
                  </p>
                ) : null}
              </div>
            </SheetSection>
          ) : null}
        </>
      ) : null}
    </div>
  )
}
