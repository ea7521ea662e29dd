'use client'

import { Check } from 'lucide-react'
import { useEffect, useRef, useState, type FormEvent, type ReactNode } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { cn } from '@/components/ui/cn'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LedgerList } from '@/components/ui/ledger'
import { Notice } from '@/components/ui/notice'
import { Spinner } from '@/components/ui/spinner'
import { Status } from '@/components/ui/status'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { IdeaView, ProposedNames } from '@/lib/names/present'

import type { BenchActions } from './bench-actions'
import { sameWords } from './finding-words'
import type { NamesPlace } from './names-place'

type Play = ProposedNames['plays'][number]
type Told = ProposedNames['story'][number]

/** What is done with a name that was made up; the note says how it came about. */
interface Taking {
  ideas: readonly IdeaView[]
  take: (name: string, note: string) => Promise<boolean>
  tryOut: (name: string, note: string) => void
}

/** How many of each are shown until more are asked for. */
const FIRST = 10

/** "harbour, lantern" as words, each once. */
const wordsIn = (text: string): string[] => [
  ...new Set(
    text
      .split(',')
      .map((word) => word.trim().toLowerCase())
      .filter(Boolean),
  ),
]

/** Names made up for a shade: wordplay, and a colour story with theme words. */
export function BenchProposals({
  place: { brand, lineSlug },
  shadeId,
  themes,
  propose,
  ...taking
}: Taking & {
  place: NamesPlace
  shadeId: string
  themes: readonly string[]
  propose: BenchActions['propose']
}) {
  const [words, setWords] = useState(themes.join(', '))
  const [made, setMade] = useState<ProposedNames>()
  const [problem, setProblem] = useState<{ message: string; fields?: Record<string, string[]> }>()
  const [pending, setPending] = useState(true)
  const begun = useRef(false)

  async function ask(asked: string[]) {
    setPending(true)
    setProblem(undefined)
    const answer = await reach(propose(brand, { lineSlug, shadeId, themes: asked }))
    setPending(false)
    if (answer.ok) setMade(answer.data)
    else setProblem({ message: answer.message, fields: answer.fieldErrors })
  }

  useEffect(() => {
    if (begun.current) return
    begun.current = true
    void ask([...themes])
  })

  function tell(event: FormEvent) {
    event.preventDefault()
    if (!pending) void ask(wordsIn(words))
  }

  const waits = (
    <p className="flex items-center gap-2 text-ink-soft">
      <Spinner /> Making names up for this shade…
    </p>
  )
  const failed = problem ? (
    <Notice
      kind="error"
      actions={
        <Button size="small" onClick={() => void ask(wordsIn(words))}>
          Try again
        </Button>
      }
    >
      {problem.message}
    </Notice>
  ) : null
  const none = 'Nothing that fits this colour comes to mind beyond what you have.'

  return (
    <>
      <SheetSection title="Wordplay" aside="sayings with a word that suits the shade">
        {made ? (
          <Proposed
            label="Wordplay"
            of={made.plays}
            none={none}
            row={(play) => <PlayRow key={play.name} play={play} {...taking} />}
          />
        ) : (
          (failed ?? waits)
        )}
      </SheetSection>
      <SheetSection title="Colour story" aside="things of the shade’s colour, in plain words">
        <form
          noValidate
          onSubmit={tell}
          className="mb-4 flex max-w-measure flex-wrap items-end gap-3 print:hidden"
        >
          <Field
            label="Theme words"
            hint="Of the world the line tells of, with commas between: harbour, lantern."
            error={problem?.fields?.themes}
            className="grow basis-64"
          >
            <Input
              value={words}
              onChange={(event) => setWords(event.target.value)}
              maxLength={NAME_LIMITS.themes * (NAME_LIMITS.theme + 2)}
              autoComplete="off"
            />
          </Field>
          <Button type="submit" pending={pending && made !== undefined} className="mb-6">
            Make up anew
          </Button>
        </form>
        {made ? (
          <>
            {failed}
            <Proposed
              label="Colour story"
              className="border-b-0 lg:grid lg:grid-cols-2 lg:gap-x-12 [&>li]:border-b"
              of={made.story}
              none={none}
              row={(told) => <StoryRow key={told.name} told={told} {...taking} />}
            />
          </>
        ) : problem ? null : (
          waits
        )}
      </SheetSection>
    </>
  )
}

function Proposed<T>({
  label,
  of,
  none,
  row,
  className,
}: {
  label: string
  className?: string
  of: readonly T[]
  none: string
  row: (one: T) => ReactNode
}) {
  const [all, setAll] = useState(false)
  const list = useRef<HTMLUListElement>(null)
  if (of.length === 0) return <p className="text-ink-soft">{none}</p>
  return (
    <>
      <LedgerList ref={list} aria-label={label} className={cn('border-t-0', className)}>
        {(all ? of : of.slice(0, FIRST)).map(row)}
      </LedgerList>
      {of.length > FIRST && !all ? (
        <Button
          variant="quiet"
          className="mt-2"
          onClick={() => {
            setAll(true)
            // The button goes; the keyboard goes on with the first that came.
            setTimeout(() =>
              list.current?.children[FIRST]?.querySelector<HTMLElement>('button')?.focus(),
            )
          }}
        >
          Show {of.length - FIRST} more
        </Button>
      ) : null}
    </>
  )
}

function PlayRow({ play, ...taking }: Taking & { play: Play }) {
  const { name, source, swapped, heardAs, why, fits } = play
  return (
    <ProposedRow
      name={name}
      shown={<Swapped name={name} word={swapped.to} />}
      note={`Plays on “${source}”: ${swapped.to} for ${swapped.from}.`}
      fits={fits}
      {...taking}
    >
      <p className="text-ink-soft">
        From “{source}”, heard as {heardAs}.
      </p>
      <p className="text-sm text-ink-faint">{why}</p>
    </ProposedRow>
  )
}

/** A name with the word that was set in told apart from the rest of the saying. */
function Swapped({ name, word }: { name: string; word: string }) {
  return name
    .split(/([\p{L}'’]+)/u)
    .map((part, at) =>
      part.toLowerCase() === word.toLowerCase() ? <em key={at}>{part}</em> : part,
    )
}

function StoryRow({ told, ...taking }: Taking & { told: Told }) {
  const { name, why, fits } = told
  return (
    <ProposedRow name={name} shown={name} note={`Of its colour: ${why}`} fits={fits} {...taking}>
      <p className="text-sm text-ink-faint">{why}</p>
    </ProposedRow>
  )
}

function ProposedRow({
  name,
  shown,
  note,
  fits,
  ideas,
  take,
  tryOut,
  children,
}: Taking & { name: string; shown: ReactNode; note: string; fits: boolean; children: ReactNode }) {
  const [pending, setPending] = useState(false)
  const taken = ideas.some(({ text }) => sameWords(text, name))
  return (
    <li className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 py-2.5">
      <div className="max-w-measure min-w-0 grow basis-60">
        <p className="font-title text-lg">{shown}</p>
        {children}
        {fits ? null : <Status kind="attention">Too wide for the ball band</Status>}
      </div>
      <div className="flex flex-wrap items-center gap-2 print:hidden">
        {taken ? null : (
          <Button
            size="small"
            variant="quiet"
            className="-ml-2.5"
            aria-label={`Try name: ${name}`}
            onClick={() => tryOut(name, note)}
          >
            Try name
          </Button>
        )}
        {/* One button before and after, so that the keyboard stays where it is. */}
        <Button
          size="small"
          variant={taken ? 'quiet' : 'secondary'}
          pending={pending}
          icon={taken ? <Check aria-hidden="true" /> : undefined}
          aria-disabled={taken || pending || undefined}
          aria-label={taken ? `Among the ideas: ${name}` : `Take as idea: ${name}`}
          onClick={() => {
            if (taken || pending) return
            setPending(true)
            void take(name, note).then(() => setPending(false))
          }}
        >
          {taken ? 'Among the ideas' : 'Take as idea'}
        </Button>
      </div>
    </li>
  )
}
