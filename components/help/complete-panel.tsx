'use client'

import { useMemo, useState } from 'react'

import type { DraftPlace } from '@/components/combinations/draft'
import type { ShadeOf } from '@/components/combinations/shade-of'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { RadioGroup } from '@/components/ui/radio-group'
import { Spinner } from '@/components/ui/spinner'
import { Status } from '@/components/ui/status'
import { Ground } from '@/components/yarn/ground'
import { WrapCard } from '@/components/yarn/wrap-card'
import { DEFAULT_APART, type Match } from '@/lib/color/match'
import { completeByRelation, RELATION_KINDS, type RelationKind } from '@/lib/color/relations'
import type { ShadeView } from '@/lib/shades/present'

import {
  inList,
  RELATION_LABELS,
  relationInWords,
  shadesIn,
  strainInWords,
  type NameOf,
} from './help-words'
import { usePhotographFive } from './use-photograph-five'

/** How the empty places are filled. */
type Way = 'photograph' | RelationKind

/** Five shade ids by place, and why. */
interface Proposal {
  shadeIds: string[]
  why: string
  /** What is not as wished, in words. */
  doubt: string | null
}

/** Props of {@link CompletePanel}. */
export interface CompletePanelProps {
  places: readonly DraftPlace[]
  /** Of the line, neither deleted nor retired. */
  shades: readonly ShadeView[]
  shadeOf: ShadeOf
  /** The combination's, if it has one. */
  photograph: { title: string } | null
  /** Where the photograph's match answers; null without one. */
  matchUrl: string | null
  /** Takes five shade ids by place, those in place as they were, and says why in words. */
  onComplete: (shadeIds: string[], words: string) => void
}

/** Fills the empty places: by the photograph, or by a relation of hues inside the line. */
export function CompletePanel(props: CompletePanelProps) {
  const { places, shades, shadeOf, photograph } = props
  const [chosen, setChosen] = useState<Way | null>(null)
  const way = chosen ?? (photograph ? 'photograph' : 'near')
  const obstacle = obstacleTo(places, shades, shadeOf)
  if (obstacle) return <p className="max-w-measure text-ink-soft">{obstacle}</p>
  const ways: readonly Way[] = photograph ? ['photograph', ...RELATION_KINDS] : RELATION_KINDS
  return (
    <div className="space-y-4">
      <RadioGroup
        legend="Fill the empty places by"
        options={ways.map((value) =>
          value === 'photograph'
            ? { value, label: 'The photograph', hint: `What covers “${photograph!.title}” best` }
            : { value, ...RELATION_LABELS[value] },
        )}
        value={way === 'photograph' && !photograph ? 'near' : way}
        onValueChange={setChosen}
      />
      {way === 'photograph' && photograph ? (
        <ByPhotograph {...props} title={photograph.title} />
      ) : (
        <ByRelation {...props} kind={way === 'photograph' ? 'near' : way} />
      )}
    </div>
  )
}

/** Why nothing can be filled, in words; null when something can. */
function obstacleTo(
  places: readonly DraftPlace[],
  shades: readonly ShadeView[],
  shadeOf: ShadeOf,
): string | null {
  const empty = places.filter(({ shadeId }) => shadeId === null)
  if (empty.length === 0) {
    return 'All five places are filled. Empty one, and the line is searched for what belongs there.'
  }
  const shut = places.findIndex(({ shadeId, locked }) => shadeId === null && locked)
  if (shut >= 0) return `Place ${shut + 1} is empty and locked. Unlock it, and it can be filled.`
  const unknown = places.findIndex(({ shadeId }) => shadeId !== null && !shadeOf(shadeId))
  if (unknown >= 0) {
    return `What stood in place ${unknown + 1} is gone. Put another shade there first.`
  }
  if (shades.length < places.length) {
    return 'The line has fewer than five shades. Add shades, and five can be found.'
  }
  return null
}

function ByRelation(props: CompletePanelProps & { kind: RelationKind }) {
  const { places, shades, shadeOf, kind, onComplete } = props
  const key = places.map(({ shadeId }) => shadeId).join()
  const related = useMemo(
    () => completeByRelation(kind, shadesIn(places, shadeOf), shades),
    // Shares, roles and locks change nothing, and every edit makes new places.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [kind, key, shades],
  )
  if (!related) return <p>The line has too few shades left to fill the five.</p>
  const shadeIds = related.places.map(({ shadeId }) => shadeId)
  const nameOf: NameOf = (place) => labelOf(shadeIds[place]!, props)
  const close =
    related.apart < DEFAULT_APART
      ? `Some stand nearer to each other than ΔE00 ${DEFAULT_APART}; the line has no other five.`
      : null
  return (
    <Proposed
      {...props}
      proposal={{
        shadeIds,
        why: relationInWords(related, nameOf),
        doubt: strainInWords(related, nameOf) ?? close,
      }}
      onTake={(words) => onComplete(shadeIds, `${RELATION_LABELS[kind].label}: ${words}`)}
    />
  )
}

const labelOf = (id: string, { shades, shadeOf }: Pick<CompletePanelProps, 'shades' | 'shadeOf'>) =>
  (shadeOf(id) ?? shades.find((shade) => shade.id === id))?.label ?? 'a shade that is gone'

function ByPhotograph(props: CompletePanelProps & { title: string }) {
  const { places, shades, matchUrl, title, onComplete } = props
  const inLine = new Set(shades.map(({ id }) => id))
  const held = places.flatMap(({ shadeId }) => shadeId ?? [])
  const retired = held.find((id) => !inLine.has(id))
  const { match, pending, problem, retry } = usePhotographFive(retired ? null : matchUrl, held)
  if (retired) {
    return (
      <p className="max-w-measure text-ink-soft">
        {labelOf(retired, props)} has left the line, and a match takes shades of the line only.
        Choose a relation of hues, or put another shade in its place.
      </p>
    )
  }
  if (problem) {
    return (
      <Notice
        kind="error"
        title="No five from the photograph"
        actions={
          <Button size="small" onClick={retry}>
            Match again
          </Button>
        }
      >
        {problem}
      </Notice>
    )
  }
  if (!match) {
    return pending ? (
      <p className="flex items-center gap-2 text-ink-soft">
        <Spinner /> Matching “{title}”
      </p>
    ) : null
  }
  const added = match.places.flatMap(({ shadeId }) => (held.includes(shadeId) ? [] : shadeId))
  const shadeIds = places.map(({ shadeId }) => shadeId ?? added.shift()!)
  return (
    <Proposed
      {...props}
      proposal={{ shadeIds, why: proofInWords(match, held.length, shades.length), doubt: null }}
      onTake={(words) => onComplete(shadeIds, `From “${title}”: ${words}`)}
    />
  )
}

function proofInWords({ certified, gap, meanDeltaE }: Match, held: number, line: number): string {
  const kept = held > 0 ? ' together with what is in place' : ''
  const near = `The five are ΔE00 ${meanDeltaE.toFixed(1)} from it on average.`
  return certified
    ? `No others of the line’s ${line} shades cover the photograph better${kept}: proved. ${near}`
    : `The best found in time, at most ${Math.ceil(gap * 100)} % from the best there is${kept}. ${near}`
}

/** What would stand where, and why; one press takes it. */
function Proposed({
  places,
  shadeOf,
  shades,
  proposal: { shadeIds, why, doubt },
  onTake,
}: CompletePanelProps & { proposal: Proposal; onTake: (words: string) => void }) {
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const added = shadeIds.filter((_, at) => places[at]!.shadeId === null)
  const name = (id: string) => labelOf(id, { shades, shadeOf })
  return (
    <div className="space-y-3">
      <Ground className="flex items-center gap-5 border border-hairline p-4">
        <WrapCard
          compact
          title="The five as they would be"
          bands={shadeIds.map((id, at) => ({
            hex: (shadeOf(id) ?? byId.get(id))?.hex ?? '#808080',
            share: places[at]!.share,
            name: name(id),
          }))}
          className="w-24 shrink-0"
        />
        <ol role="list" className="min-w-0 space-y-1">
          {shadeIds.map((id, at) => (
            <li key={id} className="leading-tight">
              <span className="font-title break-words">{name(id)}</span>{' '}
              <span className="text-sm whitespace-nowrap text-ink-faint">
                {places[at]!.shadeId === null ? `new in place ${at + 1}` : 'in place'}
              </span>
            </li>
          ))}
        </ol>
      </Ground>
      <p className="max-w-measure text-ink-soft">{why}</p>
      {doubt ? (
        <p className="max-w-measure">
          <Status kind="attention">{doubt}</Status>
        </p>
      ) : null}
      <Button
        onClick={() =>
          onTake(
            `${inList(added.map(name))} ${added.length === 1 ? 'fills the empty place' : `fill the ${added.length} empty places`}.`,
          )
        }
      >
        {added.length === 1 ? 'Fill the empty place' : `Fill ${added.length} empty places`}
      </Button>
    </div>
  )
}
