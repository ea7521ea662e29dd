'use client'

import { Redo2, Undo2, WandSparkles } from 'lucide-react'
import dynamic from 'next/dynamic'
import { useEffect, useId, useMemo, useRef, useState, type ReactNode } from 'react'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { LedgerList } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import { Textarea } from '@/components/ui/textarea'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { COMBINATION_LIMITS } from '@/lib/combinations/constants'
import type { CombinationView } from '@/lib/combinations/present'
import type { PhotographChoice } from '@/lib/photographs/present'
import type { ShadeView } from '@/lib/shades/present'

import { CardStage } from './card-stage'
import { applyEdit, LEAST_PERCENT, type DraftEdit } from './draft'
import { differingParts, joinDrafts } from './draft-merge'
import { placeInWords, stepInWords, type Names } from './draft-words'
import { EditorDrag, type DragTold } from './editor-drag'
import { HandBar } from './hand-bar'
import type { Held } from './held'
import { PhotographField } from './photograph-field'
import { PlaceNeighbours } from './place-neighbours'
import { PlaceRow } from './place-row'
import { SaveStatus } from './save-status'
import type { ShadeOf } from './shade-of'
import { ShadeTray, type TrayFamily } from './shade-tray'
import { TitleField } from './title-field'
import {
  useCombinationEditor,
  useEditorState,
  type SaveCombination,
} from './use-combination-editor'

// The page answers before its cloth is drawn and its pairs are compared.
const AsCloth = dynamic(() => import('@/components/yarn/as-cloth').then((it) => it.AsCloth), {
  ssr: false,
  loading: () => <div className="min-h-[30rem]" />,
})
const ClashNotes = dynamic(
  () => import('@/components/help/clash-notes').then((it) => it.ClashNotes),
  { ssr: false, loading: () => <div className="min-h-32" /> },
)
const CompletePanel = dynamic(() =>
  import('@/components/help/complete-panel').then((it) => it.CompletePanel),
)
// Only those whom somebody overtook need it.
const ConflictNotice = dynamic(() => import('./conflict-notice').then((it) => it.ConflictNotice))

/** Props of {@link CombinationEditor}. */
export interface CombinationEditorProps {
  brand: string
  lineSlug: string
  personId: string
  combination: CombinationView
  /** Of the line, neither deleted nor retired. */
  shades: readonly ShadeView[]
  /** In the order of the sample book. */
  families: readonly TrayFamily[]
  photographs: readonly PhotographChoice[]
  save: SaveCombination
  /** The line under the title. */
  meta: ReactNode
  /** Buttons besides undo and redo. */
  actions?: ReactNode
}

/** A pause in typing after which more is a step of its own, in milliseconds. */
const RUN_PAUSE = 1_500

/** An open combination: five places, the line's shades beside them, and all that is told of it. */
export function CombinationEditor(props: CombinationEditorProps) {
  const { brand, lineSlug, personId, combination, shades, families, photographs, save } = props
  const { canEdit, canRename } = combination
  const { store, heard } = useCombinationEditor({
    brand,
    personId,
    view: combination,
    save,
    knowsPhotograph: (id) => photographs.some((one) => one.id === id),
  })
  const { history, base, theirs, saving, news } = useEditorState(store)

  const [edge, setEdge] = useState<{ place: number; percent: number } | null>(null)
  const draft = edge ? applyEdit(history.present, { kind: 'edge', ...edge }) : history.present
  const [held, setHeld] = useState<Held | null>(null)
  const [dragging, setDragging] = useState(false)
  const [said, setSaid] = useState('')
  // The keyboard goes back to what was taken up.
  const origin = useRef<HTMLElement | null>(null)
  const pause = useRef<ReturnType<typeof setTimeout>>(undefined)

  const known = useMemo(
    () =>
      new Map(
        [...heard.flatMap(({ shade }) => shade ?? []), ...shades].map((one) => [one.id, one]),
      ),
    [heard, shades],
  )
  const gone = useMemo(
    () => new Set(heard.flatMap((place) => (place.gone && place.shade ? place.shade.id : []))),
    [heard],
  )
  const shadeOf: ShadeOf = (id) => (id === null ? null : (known.get(id) ?? null))
  const nameOf = (id: string | null) =>
    id === null ? 'empty' : (shadeOf(id)?.label ?? 'a shade that is gone')
  const names: Names = {
    shade: nameOf,
    photograph: (id) =>
      id === null
        ? 'none'
        : (photographs.find((one) => one.id === id)?.title ?? 'one that is gone'),
  }
  const photograph = photographs.find(({ id }) => id === draft.photographId) ?? null
  const [completing, setCompleting] = useState(false)
  const clothId = useId()
  const cloth = draft.places.flatMap(({ shadeId, share }) => {
    const shade = shadeOf(shadeId)
    return shade ? [{ color: shade.hex, share, name: shade.label }] : []
  })
  const placeOf = (shadeId: string) => draft.places.findIndex((one) => one.shadeId === shadeId)
  const heldShade = held && shadeOf(shadeIdOf(held))
  const heldFrom = held ? (held.kind === 'place' ? held.place : placeOf(held.shadeId)) : -1

  function shadeIdOf(one: Held): string | null {
    return one.kind === 'shade' ? one.shadeId : (draft.places[one.place]?.shadeId ?? null)
  }

  function takeUp(next: Held) {
    origin.current = document.activeElement as HTMLElement | null
    setHeld(next)
    setSaid(`${nameOf(shadeIdOf(next))} taken up. Choose a place; Escape leaves it.`)
  }

  function letGo() {
    setHeld(null)
    setDragging(false)
    requestAnimationFrame(() => origin.current?.focus({ preventScroll: true }))
  }

  function giveUp(one: Held) {
    setSaid(`${nameOf(shadeIdOf(one))} is back where it was.`)
    letGo()
  }

  /** Puts what is held into a place, and says what stands where now. */
  function put(one: Held, place: number) {
    const shadeId = shadeIdOf(one)
    const before = store.getState().history.present
    store.edit(
      one.kind === 'shade'
        ? { kind: 'place', place, shadeId }
        : { kind: 'swap', place: one.place, with: place },
    )
    const after = store.getState().history.present
    const swapped = before.places.findIndex((was) => was.shadeId === shadeId)
    if (before === after) {
      const locked = [place, swapped].find((at) => before.places[at]?.locked)
      setSaid(
        locked === undefined
          ? `${nameOf(shadeId)}, ${placeInWords(place)}.`
          : `${placeInWords(locked)} is locked. ${nameOf(shadeId)} is back where it was.`,
      )
    } else {
      const moved = swapped >= 0 ? after.places[swapped]!.shadeId : null
      setSaid(
        `${nameOf(shadeId)}, ${placeInWords(place)}.` +
          (moved ? ` ${nameOf(moved)}, ${placeInWords(swapped)}.` : ''),
      )
    }
    letGo()
  }

  function edit(change: DraftEdit, words: string) {
    store.edit(change)
    setSaid(words)
  }

  /** Typing goes on as one step until there is a pause. */
  function type(change: DraftEdit) {
    store.edit(change, change.kind)
    clearTimeout(pause.current)
    pause.current = setTimeout(store.endRun, RUN_PAUSE)
  }

  function step(done: 'Undone' | 'Done again') {
    const before = store.getState().history.present
    if (done === 'Undone') store.undo()
    else store.redo()
    setSaid(stepInWords(done, differingParts(before, store.getState().history.present)))
  }

  useEffect(() => {
    function onKeyDown(event: KeyboardEvent) {
      if (event.key === 'Escape' && held && !dragging) giveUp(held)
      if (!(event.ctrlKey || event.metaKey) || event.altKey || event.key.toLowerCase() !== 'z') {
        return
      }
      event.preventDefault()
      step(event.shiftKey ? 'Done again' : 'Undone')
    }
    document.addEventListener('keydown', onKeyDown)
    return () => document.removeEventListener('keydown', onKeyDown)
  })

  const told: DragTold = {
    onTakeUp: (one) => {
      takeUp(one)
      setDragging(true)
    },
    onOver: (one, place) => {
      if (place !== null) setSaid(`${nameOf(shadeIdOf(one))}, ${placeInWords(place)}`)
    },
    onPutDown: (one, place) => (place === null ? giveUp(one) : put(one, place)),
    onGiveUp: giveUp,
  }

  const conflicts = theirs ? joinDrafts(base.draft, history.present, theirs.draft).conflicts : []

  return (
    <EditorDrag dragged={dragging ? heldShade : null} told={told}>
      <Sheet
        notes={
          <>
            <Note title="Story">
              {canEdit ? (
                <Field
                  hideLabel
                  label="Story"
                  hint={`What the five tell, in a few sentences; it goes into the post. At most ${COMBINATION_LIMITS.story.toLocaleString('en-GB')} characters.`}
                >
                  <Textarea
                    className="min-h-28"
                    value={draft.story}
                    maxLength={COMBINATION_LIMITS.story}
                    onChange={({ target }) => type({ kind: 'story', story: target.value })}
                    onBlur={store.endRun}
                  />
                </Field>
              ) : (
                <p className="whitespace-pre-line">{draft.story || 'None written yet.'}</p>
              )}
            </Note>
            <Note title="What clashes">
              <ClashNotes places={draft.places} shadeOf={shadeOf} />
            </Note>
            <Note title="Photograph">
              <PhotographField
                photographId={draft.photographId}
                choices={photographs}
                canEdit={canEdit}
                hrefOf={(id) => `/${brand}/lines/${lineSlug}/photographs/${id}`}
                onChange={(photographId) => {
                  const change = { kind: 'photograph', photographId } as const
                  edit(change, `Photograph: ${names.photograph(photographId)}.`)
                }}
              />
            </Note>
            <Note title="On screen only">
              <ScreenCaution />
            </Note>
          </>
        }
      >
        <SheetHeader
          back={{ href: `/${brand}/lines/${lineSlug}/combinations`, label: 'Combinations' }}
          title={
            canRename ? (
              <TitleField
                title={draft.title}
                onChange={(title) => type({ kind: 'title', title })}
                onDone={store.endRun}
              />
            ) : (
              draft.title
            )
          }
          meta={props.meta}
          actions={
            <>
              {canRename ? (
                <>
                  <SaveStatus saving={saving} />
                  <Button
                    icon={<Undo2 aria-hidden="true" />}
                    disabled={history.past.length === 0}
                    onClick={() => step('Undone')}
                  >
                    Undo
                  </Button>
                  <Button
                    icon={<Redo2 aria-hidden="true" />}
                    disabled={history.future.length === 0}
                    onClick={() => step('Done again')}
                  >
                    Redo
                  </Button>
                </>
              ) : null}
              {props.actions}
            </>
          }
        />
        <div data-said="">
          <LiveRegion>{said}</LiveRegion>
        </div>
        {theirs && conflicts.length > 0 ? (
          <ConflictNotice
            parts={conflicts}
            mine={history.present}
            theirs={theirs.draft}
            names={names}
            onChoose={(preferred) => {
              store.choose(preferred)
              setSaid(preferred === 'mine' ? 'Yours is kept.' : 'Theirs is taken.')
            }}
          />
        ) : null}
        {news.length > 0 ? (
          <p role="status" className="mb-4 text-sm text-ink-soft print:hidden">
            Changed by somebody else just now: {news.join(', ')}.
          </p>
        ) : null}

        <div className="grid gap-x-8 gap-y-8 min-[1000px]:grid-cols-[minmax(0,5fr)_minmax(0,6fr)] print:grid-cols-[75mm_minmax(0,1fr)]">
          <div className="min-w-0">
            <div className="space-y-2 min-[1000px]:[@media(min-height:64rem)]:sticky min-[1000px]:[@media(min-height:64rem)]:top-7">
              <Ground className="border border-hairline p-4 sm:p-6 print:border-0 print:p-0">
                <CardStage
                  draft={draft}
                  shadeOf={shadeOf}
                  canEdit={canEdit}
                  onPreview={setEdge}
                  onMoveEdge={(place, percent) =>
                    store.edit({ kind: 'edge', place, percent }, `edge ${place}`)
                  }
                  onLeaveEdge={store.endRun}
                  onPress={held ? (place) => put(held, place) : undefined}
                />
              </Ground>
              <GroundSwitch />
              <section aria-labelledby={clothId} className="pt-6 print:hidden">
                <h2 id={clothId} className="mb-3 text-xl">
                  As cloth
                </h2>
                <AsCloth bands={cloth} />
              </section>
            </div>
          </div>
          <div className="min-w-0 space-y-8">
            <section aria-label="The five places">
              <LedgerList>
                {draft.places.map((place, at) => {
                  const shade = shadeOf(place.shadeId)
                  const isHeld = held?.kind === 'place' && held.place === at
                  const puts = held && !isHeld && heldShade
                  const where = placeInWords(at)
                  return (
                    <PlaceRow
                      key={at}
                      at={at}
                      place={place}
                      shade={shade}
                      gone={shade !== null && gone.has(shade.id)}
                      canEdit={canEdit}
                      held={isHeld}
                      puts={puts ? `Put ${puts.label} in ${where}: ${nameOf(place.shadeId)}` : null}
                      onPress={() => {
                        if (isHeld) giveUp(held)
                        else if (held) put(held, at)
                        else takeUp({ kind: 'place', place: at })
                      }}
                      onRole={(role) =>
                        edit({ kind: 'role', place: at, role }, `${role}, ${where}.`)
                      }
                      onShare={(percent) => {
                        store.edit({ kind: 'share', place: at, percent })
                        const { places } = store.getState().history.present
                        setSaid(`${Math.round(places[at]!.share * 100)} %, ${where}.`)
                      }}
                      onLock={(locked) =>
                        edit(
                          { kind: 'lock', place: at, locked },
                          `${nameOf(place.shadeId)}, ${where}, ${locked ? 'locked' : 'unlocked'}.`,
                        )
                      }
                      more={
                        shade && !place.locked ? (
                          <PlaceNeighbours
                            place={at}
                            places={draft.places}
                            shade={shade}
                            shades={shades}
                            shadeOf={shadeOf}
                            onChoose={(shadeId) =>
                              edit(
                                { kind: 'place', place: at, shadeId },
                                `${nameOf(shadeId)}, ${where}.`,
                              )
                            }
                          />
                        ) : null
                      }
                      onEmpty={() =>
                        edit(
                          { kind: 'place', place: at, shadeId: null },
                          `${nameOf(place.shadeId)} taken out. ${where} is empty.`,
                        )
                      }
                    />
                  )
                })}
              </LedgerList>
              {canEdit ? (
                <p className="mt-2 text-sm text-ink-faint print:hidden">
                  Press a yarn, then a place; or drag it. Drag the edges of the card, or type a
                  share: each is at least {LEAST_PERCENT} %, together they are always 100 %.
                </p>
              ) : null}
              {canEdit ? (
                <div className="mt-4 print:hidden">
                  <Button
                    icon={<WandSparkles aria-hidden="true" />}
                    aria-expanded={completing}
                    onClick={() => setCompleting(!completing)}
                  >
                    Complete the five
                  </Button>
                  {completing ? (
                    <div className="mt-4 border-l border-rule pl-4">
                      <CompletePanel
                        places={draft.places}
                        shades={shades}
                        shadeOf={shadeOf}
                        photograph={photograph}
                        matchUrl={
                          photograph && `/api/brands/${brand}/photographs/${photograph.id}/match`
                        }
                        onComplete={(shadeIds, words) =>
                          edit({ kind: 'complete', shadeIds }, words)
                        }
                      />
                    </div>
                  ) : null}
                </div>
              ) : null}
            </section>
            <p className="hidden max-w-measure whitespace-pre-line print:block">{draft.story}</p>
            {canEdit ? (
              <ShadeTray
                shades={shades}
                families={families}
                placeOf={placeOf}
                chosen={held?.kind === 'shade' ? held.shadeId : null}
                onChoose={(shadeId) => {
                  if (held?.kind === 'shade' && held.shadeId === shadeId) giveUp(held)
                  else takeUp({ kind: 'shade', shadeId })
                }}
              />
            ) : null}
          </div>
        </div>
      </Sheet>
      {held && heldShade ? (
        <HandBar
          key={shadeIdOf(held)}
          shade={heldShade}
          from={heldFrom}
          places={draft.places}
          shadeOf={shadeOf}
          dragging={dragging}
          onPut={(place) => put(held, place)}
          onGiveUp={() => giveUp(held)}
        />
      ) : null}
    </EditorDrag>
  )
}
