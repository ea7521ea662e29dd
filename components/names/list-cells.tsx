'use client'

import { createContext, use } from 'react'

import { AppLink } from '@/components/ui/app-link'
import { EditableCell } from '@/components/ui/editable-cell'
import { Status } from '@/components/ui/status'
import { TextLink } from '@/components/ui/text-link'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ActionResult } from '@/lib/errors'
import type { NameRow } from '@/lib/names/present'

import { inShort } from './finding-words'
import { IdeaState } from './idea-state'
import { othersInWords, votesInWords } from './list-words'
import { namesHref, type NamesPlace } from './names-place'

/** What the cells of the list stand in and save with. */
export interface ListTerms {
  place: NamesPlace
  save: (row: NameRow, text: string) => Promise<ActionResult<unknown>>
  /** The shades whose findings are shown. */
  opened: ReadonlySet<string>
  toggle: (shadeId: string) => void
}

/** Hands the cells their terms: columns must stay the same objects, or an edit would be lost. */
export const ListContext = createContext<ListTerms | null>(null)

function useTerms(): ListTerms {
  const terms = use(ListContext)
  if (!terms) throw new Error('A cell of the list of names stands outside it.')
  return terms
}

/** The page on which a shade gets its name. */
const benchHref = (place: NamesPlace, { id }: NameRow) => namesHref(place, `/shades/${id}`)

/** The wound shade, which leads to where it gets its name. */
export function ShadeCell({ row }: { row: NameRow }) {
  const { place } = useTerms()
  return (
    <AppLink
      href={benchHref(place, row)}
      aria-label={`Find names for ${row.label}`}
      className="inline-block rounded"
    >
      <WoundSample hex={row.hex} className="max-sm:h-8 max-sm:w-auto" />
    </AppLink>
  )
}

/**
 * The name that stands for the shade, typed in place while it is nobody's to decide. On a phone,
 * state and checks stand under it.
 */
export function NameCell({ row }: { row: NameRow }) {
  const { place, save } = useTerms()
  const { idea } = row
  const others = othersInWords(row)
  return (
    <div className="min-w-40">
      {!idea || idea.canEdit ? (
        <EditableCell
          label={`Name for No. ${row.number}`}
          value={idea?.text ?? ''}
          onSave={(text) => save(row, text)}
        >
          {idea ? (
            <span className="font-title">{idea.text}</span>
          ) : (
            <span className="text-ink-faint">Write a name</span>
          )}
        </EditableCell>
      ) : (
        <AppLink
          href={namesHref(place, `/ideas/${idea.id}`)}
          className="inline-flex min-h-8 items-center font-title hover:underline pointer-coarse:min-h-11"
        >
          {idea.text}
        </AppLink>
      )}
      {others ? (
        <TextLink
          href={benchHref(place, row)}
          className="flex min-h-6 w-fit items-center text-sm print:hidden pointer-coarse:min-h-11"
        >
          {others}
        </TextLink>
      ) : null}
      <div className="mt-1 sm:hidden">
        <StateCell row={row} />
        <ChecksCell row={row} />
      </div>
    </div>
  )
}

/** How far the name has come, and what was said of it while it is in review. */
export function StateCell({ row: { idea, retired } }: { row: NameRow }) {
  const said = idea?.state === 'in-review' ? votesInWords(idea.votes) : ''
  return (
    <span className="flex flex-col whitespace-nowrap">
      {idea ? (
        <IdeaState state={idea.state} locked={idea.locked} />
      ) : (
        <Status kind="none">No name yet</Status>
      )}
      {said ? <span className="text-sm text-ink-faint">{said}</span> : null}
      {retired ? <span className="text-sm text-ink-faint">Retired shade</span> : null}
    </span>
  )
}

/** The checks in short; pressing them shows what was found. */
export function ChecksCell({ row }: { row: NameRow }) {
  const { opened, toggle } = useTerms()
  if (!row.idea) return null
  const { findings, text } = row.idea
  const short = inShort(findings)
  if (!findings || findings.length === 0)
    return (
      <span className="flex">
        <Status kind={findings ? 'done' : 'none'}>{short}</Status>
      </span>
    )
  const isWarned = findings.some(({ grade }) => grade === 'warning')
  return (
    <button
      type="button"
      aria-label={`${short} about ${text}`}
      aria-expanded={opened.has(row.id)}
      aria-controls={opened.has(row.id) ? findingsId(row) : undefined}
      onClick={() => toggle(row.id)}
      className="flex min-h-8 items-center whitespace-nowrap pointer-coarse:min-h-11 hover:[&_.short]:decoration-ink"
    >
      <Status kind={isWarned ? 'attention' : 'none'}>
        <span className="short underline decoration-rule underline-offset-[3px]">{short}</span>
      </Status>
    </button>
  )
}

/** Where the findings of a row stand. */
export const findingsId = ({ id }: Pick<NameRow, 'id'>): string => `findings-${id}`
