'use client'

import { useRef, useState, type ReactNode } from 'react'

import { Sheet } from '@/components/layout/sheet'
import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Fabric } from '@/components/yarn/fabric'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WrapCard } from '@/components/yarn/wrap-card'
import { isMatch, type Match, type NoMatch } from '@/lib/color/match'
import type { PhotographView, StrikingColorView } from '@/lib/photographs/present'

import { DropperPanel } from './dropper-panel'
import { FiveRows } from './five-rows'
import { KeepDialog, type KeepCombination } from './keep-dialog'
import { ProofNotes } from './proof-notes'
import { ReadingChoice } from './reading-choice'
import { StrikingChips } from './striking-chips'
import { touchPicture, type Point } from './touch'
import { TouchPicture } from './touch-picture'
import { READING_WORDS, type MatchShadeView, type TouchedColor } from './types'
import { useMatch, type MatchState } from './use-match'
import { useWishes, type WishesControl } from './use-wishes'
import { WishesBar } from './wishes-bar'

/** Props of {@link MatchSheet}. */
export interface MatchSheetProps {
  brand: string
  lineSlug: string
  photograph: PhotographView
  /** The shades it may be matched to. */
  shades: readonly MatchShadeView[]
  /** The stored matches of the five readings. */
  matches: readonly (Match | NoMatch)[]
  striking: readonly StrikingColorView[]
  /** Absent for those who may not keep. */
  keep?: KeepCombination
  /** The head of the sheet and what stands under it. */
  head: ReactNode
  foot: ReactNode
}

/** A photograph and its five shades, side by side, to be bent and kept. */
export function MatchSheet(props: MatchSheetProps) {
  const { brand, lineSlug, photograph, shades, matches, striking, keep, head, foot } = props
  const control = useWishes()
  const state = useMatch({ brand, photographId: photograph.id }, matches, control)
  const { reading } = control.wishes
  const known = new Set(shades.map(({ id }) => id))
  const matched = state.match && isMatch(state.match) ? state.match : null
  const found = matched?.places.every(({ shadeId }) => known.has(shadeId)) ? matched : null

  const [held, setHeld] = useState<string | null>(null)
  const [pointed, setPointed] = useState<number | null>(null)
  const [point, setPoint] = useState<Point | null>(null)
  const [touched, setTouched] = useState<TouchedColor | null>(null)
  const picture = useRef<HTMLDivElement>(null)
  const heldAt = found?.places.findIndex(({ shadeId }) => shadeId === held) ?? -1
  const shown = pointed ?? (heldAt < 0 ? null : heldAt)

  function touch(to: Point | null, color: TouchedColor | null) {
    setPoint(to)
    setTouched(color)
  }
  function hold(shadeId: string | null) {
    setHeld(shadeId)
    // On a phone the picture may have been scrolled past.
    if (shadeId) picture.current?.scrollIntoView({ block: 'nearest' })
  }

  return (
    <Sheet notes={<ProofNotes match={found} shades={shades} asked={control.any} />}>
      {head}
      <ReadingChoice
        reading={reading}
        unavailable={new Set(matches.filter((one) => !isMatch(one)).map(({ kind }) => kind))}
        onChange={(kind) => control.change({ reading: kind })}
      />
      <div className="mt-5 grid gap-x-10 gap-y-8 min-[1000px]:grid-cols-2 print:grid-cols-2">
        <div className="min-w-0 space-y-4">
          <div ref={picture}>
            <TouchPicture
              brand={brand}
              photograph={photograph}
              assignment={found?.assignment ?? []}
              shown={found ? shown : null}
              point={point}
              onTouch={touch}
            />
          </div>
          <DropperPanel
            shades={shades}
            point={point}
            touched={touched}
            control={control}
            onMove={(to) => {
              const image = picture.current?.querySelector('img')
              touch(to, image ? touchPicture(image, to) : null)
            }}
            onAway={() => touch(null, null)}
          />
          {found ? <Wound match={found} shades={shades} title={photograph.title} /> : null}
        </div>
        <div className="min-w-0 space-y-5">
          <p className="text-ink-soft">{READING_WORDS[reading]}</p>
          <Answer state={state} found={found} shades={shades} control={control} />
          {found ? (
            <FiveRows
              match={found}
              shades={shades}
              control={control}
              held={held}
              onHold={hold}
              onPoint={setPointed}
            />
          ) : null}
          {keep && found ? (
            <div className="print:hidden">
              <KeepDialog
                brand={brand}
                lineSlug={lineSlug}
                photograph={photograph}
                match={found}
                disabled={state.pending}
                keep={keep}
              />
            </div>
          ) : null}
          <WishesBar control={control} shades={shades} held={found?.apart ?? null} />
        </div>
        <StrikingChips colors={striking} shades={shades} control={control} />
      </div>
      {foot}
    </Sheet>
  )
}

interface OfMatch {
  match: Match
  shades: readonly MatchShadeView[]
}

function bandsOf({ match, shades }: OfMatch) {
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  return match.places.flatMap(({ shadeId, share }) => {
    const shade = byId.get(shadeId)
    return shade ? [{ hex: shade.hex, share, name: shade.label }] : []
  })
}

/** The five as yarn: wound on a card, and as cloth. */
function Wound({ title, ...of }: OfMatch & { title: string }) {
  const bands = bandsOf(of)
  return (
    <div className="space-y-2">
      <Ground className="flex items-center justify-center gap-5 border border-hairline p-4">
        <WrapCard
          key={bands.map(({ name }) => name).join()}
          bands={bands}
          title={title}
          className="w-[54%] max-w-[13.25rem] min-w-0"
        />
        <Fabric bands={bands} kind="stripes" className="w-[42%] max-w-[11rem] min-w-0" />
      </Ground>
      <GroundSwitch />
    </div>
  )
}

/** Says which five there are, or why there are none. */
function Answer({
  state: { match, pending, problem, retry },
  found,
  shades,
  control,
}: {
  state: MatchState
  /** The match, if all of its five are in the line still. */
  found: Match | null
  shades: readonly MatchShadeView[]
  control: WishesControl
}) {
  const none = match && !isMatch(match) ? match.unavailable : null
  const gone = match && isMatch(match) && !found
  const five = found ? bandsOf({ match: found, shades }) : []
  return (
    <div aria-busy={pending}>
      <LiveRegion>
        {pending || gone ? '' : (none ?? `Five shades: ${five.map(({ name }) => name).join(', ')}`)}
      </LiveRegion>
      {problem ? (
        <Notice
          kind="error"
          actions={
            <>
              <Button size="small" onClick={retry}>
                Match again
              </Button>
              <Button size="small" variant="quiet" onClick={control.clear}>
                Clear wishes
              </Button>
            </>
          }
        >
          {problem}
        </Notice>
      ) : null}
      {none ? <Notice title="Not for this photograph">{none}</Notice> : null}
      {gone ? (
        <Notice title="One of the five has left the line">
          Read the photograph again to match it to the shades of now.
        </Notice>
      ) : null}
    </div>
  )
}
