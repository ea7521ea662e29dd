'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { ImportSource, type CsvSource } from '@/components/shades/import-source'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Field } from '@/components/ui/field'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Spinner } from '@/components/ui/spinner'
import { Textarea } from '@/components/ui/textarea'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { IdeasPreview } from '@/lib/names/present'
import type { PreviewIdeasInput } from '@/lib/names/schema'

import { namesInWords, type HeapActions } from './heap-actions'
import { HeapRows } from './heap-rows'
import { namesHref, type NamesPlace } from './names-place'

/** A pile of names on its way into a line: pasted or chosen, looked over, and only then added. */
export function HeapImport({
  place,
  actions,
}: {
  place: NamesPlace
  actions: Pick<HeapActions, 'preview' | 'addMany' | 'remove'>
}) {
  const router = useRouter()
  const [pasted, setPasted] = useState('')
  const [file, setFile] = useState<CsvSource>()
  const [looked, setLooked] = useState<{ turn: number; name: string; preview: IdeasPreview }>()
  const [withThere, setWithThere] = useState(false)
  const [problem, setProblem] = useState<string>()
  const [reading, setReading] = useState(false)
  const [saving, setSaving] = useState(false)
  const asked = useRef(0)
  // One for what is looked at, so that an answer that was lost adds nothing twice.
  const requestKey = useRef<string>(undefined)
  const { brand, lineSlug } = place

  async function look(name: string, text: string, kind: PreviewIdeasInput['kind']) {
    const turn = (asked.current += 1)
    setLooked(undefined)
    setWithThere(false)
    requestKey.current = undefined
    // More than this does not reach the server.
    if (text.length > NAME_LIMITS.importText) {
      setProblem(`${name} is over 500 kB. Bring it in smaller parts. Nothing was read.`)
      return
    }
    setReading(true)
    const answer = await reach(actions.preview(brand, { lineSlug, text, kind }))
    // Only the last question's answer counts.
    if (turn !== asked.current) return
    setReading(false)
    if (answer.ok) setLooked({ turn, name, preview: answer.data })
    setProblem(
      answer.ok ? undefined : (Object.values(answer.fieldErrors ?? {})[0]?.[0] ?? answer.message),
    )
  }

  const going = (looked?.preview.rows ?? []).filter(
    ({ outcome }) => outcome === 'new' || (withThere && outcome === 'there'),
  )

  async function save() {
    setSaving(true)
    requestKey.current ??= crypto.randomUUID()
    const answer = await reach(
      actions.addMany(brand, {
        lineSlug,
        ideas: going.map(({ text, note, shade }) => ({ text, note, shadeId: shade?.id ?? null })),
        requestKey: requestKey.current,
      }),
    )
    setSaving(false)
    if (!answer.ok) {
      setProblem(answer.message)
      return
    }
    const { ideaIds } = answer.data
    toastUndo(`${namesInWords(ideaIds.length)} added.`, () => void undo(ideaIds))
    router.push(namesHref(place, '/heap') as never)
  }

  async function undo(ideaIds: string[]) {
    const answer = await reach(actions.remove(brand, { lineSlug, ideaIds }))
    if (answer.ok) toastDone(`${namesInWords(ideaIds.length)} taken out again.`)
    else toastProblem(answer.message)
    router.refresh()
  }

  const counts = looked?.preview.counts
  return (
    <div>
      <section aria-label="Names one a line">
        <Field
          label="Names, one a line"
          hint="From a notebook, a call, a letter. Dashes, bullets and numbers before them are left out."
        >
          <Textarea
            rows={6}
            className="max-h-96 min-h-40"
            value={pasted}
            onChange={({ target }) => setPasted(target.value)}
          />
        </Field>
        <Button
          variant="primary"
          className="mt-3"
          disabled={pasted.trim() === ''}
          onClick={() => {
            setFile(undefined)
            void look('Pasted names', pasted, 'lines')
          }}
        >
          Preview names
        </Button>
      </section>
      <SheetSection title="Or a file, with notes and shades">
        <ImportSource
          source={file}
          holds="names"
          most={NAME_LIMITS.importText}
          loud={false}
          onChoose={(source) => {
            setFile(source)
            void look(source.name, source.text, 'csv')
          }}
          onProblem={setProblem}
        />
      </SheetSection>
      <LiveRegion>
        {reading
          ? 'Reading the names…'
          : counts
            ? `${counts.new} new, ${counts.there} there already, ${counts.bad} bad.`
            : ''}
      </LiveRegion>
      {problem ? (
        <Notice kind="error" className="mt-6">
          {problem}
        </Notice>
      ) : null}
      {reading ? (
        <p className="mt-6 flex items-center gap-2">
          <Spinner /> Reading the names…
        </p>
      ) : null}
      {looked && counts ? (
        <SheetSection title="What would happen" aside="Nothing is saved yet">
          <ColumnsRead preview={looked.preview} />
          <HeapRows key={looked.turn} preview={looked.preview} fileName={looked.name} />
          <div className="mt-6 border-t border-hairline pt-4">
            {counts.there > 0 ? (
              <Checkbox
                label={
                  counts.there === 1
                    ? 'Add the one that is there already as well'
                    : `Add the ${counts.there} that are there already as well`
                }
                checked={withThere}
                onChange={({ target }) => {
                  setWithThere(target.checked)
                  requestKey.current = undefined
                }}
                className="mb-3"
              />
            ) : null}
            <div className="flex flex-wrap items-center gap-x-4 gap-y-3">
              <Button
                variant="primary"
                disabled={going.length === 0}
                pending={saving}
                pendingLabel="Adding names…"
                onClick={() => void save()}
              >
                {going.length === 0 ? 'Nothing to add' : `Add ${namesInWords(going.length)}`}
              </Button>
              {counts.bad > 0 && going.length > 0 ? (
                <p className="text-ink-soft">
                  {counts.bad === 1
                    ? 'The bad row is left out.'
                    : `The ${counts.bad} bad rows are left out.`}
                </p>
              ) : null}
            </div>
          </div>
        </SheetSection>
      ) : null}
    </div>
  )
}

/** Which columns of a file were read for what; nothing of names one a line. */
function ColumnsRead({ preview: { columns, unread } }: { preview: IdeasPreview }) {
  if (columns.length === 0) return null
  const passed = unread.length > 0 ? ` Passed over: ${unread.join(', ')}.` : ''
  return (
    <p className="mb-4 max-w-measure text-ink-soft">
      Read: {columns.join(', ')}.{passed}
    </p>
  )
}
