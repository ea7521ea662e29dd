'use client'

import {
  DndContext,
  DragOverlay,
  MouseSensor,
  pointerWithin,
  TouchSensor,
  useDroppable,
  useSensor,
  useSensors,
  type DragEndEvent,
} from '@dnd-kit/core'
import { Settings2 } from 'lucide-react'
import dynamic from 'next/dynamic'
import { useRouter } from 'next/navigation'
import { useId, useState, type KeyboardEvent, type ReactNode } from 'react'

import type { LinePlace } from '@/components/shades/shades-actions'
import { Button } from '@/components/ui/button'
import { cn } from '@/components/ui/cn'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { EmptyState } from '@/components/ui/states'
import { Ground } from '@/components/yarn/ground'
import type { FamilyWithShades } from '@/lib/families/present'

import {
  shadesInWords,
  withMovedShades,
  type FamiliesActions,
  type FamiliesRights,
} from './families-actions'
import { CarriedTile, FamilyTile, StillTile } from './family-tile'
import { useFamilies } from './use-families'

// What is opened by a press comes with it.
const FamilyTools = dynamic(() => import('./family-tools').then((it) => it.FamilyTools))
const ChosenBar = dynamic(() => import('./chosen-bar').then((it) => it.ChosenBar))
const OrderShades = dynamic(() => import('./order-shades').then((it) => it.OrderShades))
const SortDialog = dynamic(() => import('./sort-dialog').then((it) => it.SortDialog))

/** Props of {@link FamiliesEditor}. */
export interface FamiliesEditorProps {
  place: LinePlace
  version: number
  /** How many families were asked for last; null left it open. */
  count: number | null
  families: FamilyWithShades[]
  /** Shades that are in no family. */
  unplaced: number
  can: FamiliesRights
  actions: FamiliesActions
}

/**
 * The families of a line with their shades. A shade goes to another family by dragging, or by
 * choosing shades and then the family; each family is named, merged, split and ordered beside its
 * name; every edit can be taken back.
 */
export function FamiliesEditor({
  place,
  version,
  count,
  families: saved,
  unplaced,
  can,
  actions,
}: FamiliesEditorProps) {
  const { brand } = place
  const router = useRouter()
  const id = useId()
  const { families, edit, pending, spoken, speak, problem } = useFamilies(
    place,
    version,
    saved,
    actions.restore,
  )
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set())
  const [open, setOpen] = useState<{ familyId: string; what: 'tools' | 'order' }>()
  const [sorting, setSorting] = useState(false)
  const [carried, setCarried] = useState<string>()
  const [sought, setSought] = useState(0)
  const sensors = useSensors(
    useSensor(MouseSensor, { activationConstraint: { distance: 6 } }),
    // A finger that moves at once scrolls the page.
    useSensor(TouchSensor, { activationConstraint: { delay: 220, tolerance: 8 } }),
  )

  const shades = families.flatMap((family) => family.shades)
  const standing = new Set(shades.map((shade) => shade.id))
  // What has gone from the line meanwhile is no longer chosen.
  const held = new Set([...chosen].filter((shadeId) => standing.has(shadeId)))

  function choose(shadeId: string) {
    const next = new Set(held)
    if (!next.delete(shadeId)) next.add(shadeId)
    setChosen(next)
    setSought(0)
    speak(
      next.size > 0
        ? `${shadesInWords(next.size)} chosen. M leads to the choice of a family.`
        : 'No shade chosen.',
    )
  }

  function onTileKey(event: KeyboardEvent, shadeId: string) {
    if (event.key === 'Escape') setChosen(new Set())
    if (event.key !== 'm' || event.ctrlKey || event.metaKey || event.altKey) return
    event.preventDefault()
    if (held.size === 0) setChosen(new Set([shadeId]))
    setSought(sought + 1)
  }

  const labelOf = (shadeIds: ReadonlySet<string>) =>
    shadeIds.size === 1
      ? shades.find((shade) => shadeIds.has(shade.id))!.label
      : shadesInWords(shadeIds.size)

  async function move(shadeIds: ReadonlySet<string>, familyId: string | null) {
    const target = families.find((family) => family.id === familyId)
    setChosen(new Set())
    setSought(0)
    const answer = await edit({
      send: (base) => actions.move(brand, { ...base, shadeIds: [...shadeIds], familyId }),
      done: `${labelOf(shadeIds)} moved to ${target?.name ?? 'a new family'} and pinned.`,
      meanwhile: target && withMovedShades(families, shadeIds, target.id),
    })
    if (!answer.ok) setChosen(shadeIds)
  }

  const pin = (pinned: boolean) =>
    edit({
      send: (base) => actions.pin(brand, { ...base, shadeIds: [...held], pinned }),
      done: `${labelOf(held)} ${pinned ? 'pinned' : 'unpinned'}.`,
    })

  function onDragEnd({ active, over }: DragEndEvent) {
    setCarried(undefined)
    const shadeId = String(active.id)
    const goes = held.has(shadeId) ? held : new Set([shadeId])
    const isThere = families
      .find((family) => family.id === over?.id)
      ?.shades.some((shade) => shade.id === shadeId)
    if (over && !isThere) void move(goes, String(over.id))
  }

  if (families.length === 0) {
    return (
      <EmptyState
        title="Not sorted into families yet"
        action={
          can.edit ? (
            <Button
              variant="primary"
              pending={pending}
              pendingLabel="Sorting shades…"
              onClick={() =>
                void edit({
                  send: (base) => actions.sort(brand, { ...base, count: null }),
                  done: 'The shades are sorted into families.',
                })
              }
            >
              Sort shades into families
            </Button>
          ) : null
        }
      >
        {can.edit
          ? 'Neutrals will stand apart, and the other shades by hue, each family from light to dark. You can change whatever you like afterwards.'
          : 'The families will stand here once the owner or designer has sorted the shades.'}
      </EmptyState>
    )
  }

  const list = (
    <Ground>
      {families.map((family) => (
        <FamilySection
          key={family.id}
          family={family}
          drops={can.edit}
          open={open?.familyId === family.id}
          onToggle={
            can.rename
              ? () =>
                  setOpen(
                    open?.familyId === family.id
                      ? undefined
                      : { familyId: family.id, what: 'tools' },
                  )
              : undefined
          }
        >
          {open?.familyId === family.id && open.what === 'tools' ? (
            <FamilyTools
              key={family.name}
              brand={brand}
              family={family}
              families={families}
              actions={actions}
              can={can}
              edit={edit}
              onOrder={() => setOpen({ familyId: family.id, what: 'order' })}
              onDone={() => setOpen(undefined)}
            />
          ) : null}
          {open?.familyId === family.id && open.what === 'order' ? (
            <OrderShades
              family={family}
              onLeave={() => setOpen(undefined)}
              onSave={(shadeIds) => {
                setOpen(undefined)
                void edit({
                  send: (base) =>
                    actions.orderShades(brand, { ...base, familyId: family.id, shadeIds }),
                  done: shadeIds
                    ? `The order of ${family.name} is saved.`
                    : `${family.name} goes from light to dark again.`,
                })
              }}
            />
          ) : (
            <ul
              role="list"
              className="-m-1.5 grid grid-cols-[repeat(auto-fill,minmax(6rem,1fr))] gap-x-1 gap-y-2 sm:grid-cols-[repeat(auto-fill,minmax(6.75rem,1fr))]"
            >
              {family.shades.map((shade) => (
                <li key={shade.id}>
                  {can.edit ? (
                    <FamilyTile
                      shade={shade}
                      chosen={held.has(shade.id)}
                      onChoose={() => choose(shade.id)}
                      onKey={(event) => onTileKey(event, shade.id)}
                    />
                  ) : (
                    <StillTile shade={shade} />
                  )}
                </li>
              ))}
            </ul>
          )}
        </FamilySection>
      ))}
    </Ground>
  )
  const carriedShade = shades.find((shade) => shade.id === carried)

  return (
    <>
      <LiveRegion>{spoken}</LiveRegion>
      {can.edit ? (
        <div className="mb-4 flex flex-wrap items-center justify-between gap-x-6 gap-y-2 print:hidden">
          <p className="max-w-measure text-ink-soft">
            Drag a shade to another family, or press shades to choose them and then say where they
            go.
          </p>
          <Button aria-haspopup="dialog" onClick={() => setSorting(true)}>
            Sort anew
          </Button>
          {sorting ? (
            <SortDialog
              place={place}
              version={version}
              count={count}
              actions={actions}
              edit={edit}
              onClose={() => setSorting(false)}
            />
          ) : null}
        </div>
      ) : null}
      {unplaced > 0 ? (
        <Notice className="mb-4">
          {unplaced === 1
            ? '1 shade is in no family yet. Sort anew to place it.'
            : `${unplaced} shades are in no family yet. Sort anew to place them.`}
        </Notice>
      ) : null}
      {problem ? (
        <Notice
          kind="error"
          className="mb-4"
          actions={
            problem.overtaken && (
              <Button size="small" onClick={() => router.refresh()}>
                Show them as they are now
              </Button>
            )
          }
        >
          {problem.words}
        </Notice>
      ) : null}
      {can.edit ? (
        <DndContext
          id={id}
          sensors={sensors}
          collisionDetection={pointerWithin}
          onDragStart={({ active }) => setCarried(String(active.id))}
          onDragCancel={() => setCarried(undefined)}
          onDragEnd={onDragEnd}
          // The keyboard's way is choosing; what it says is spoken above.
          accessibility={{ announcements: SILENT }}
        >
          {list}
          <DragOverlay dropAnimation={null}>
            {carriedShade ? (
              <CarriedTile shade={carriedShade} count={held.has(carriedShade.id) ? held.size : 1} />
            ) : null}
          </DragOverlay>
        </DndContext>
      ) : (
        list
      )}
      {held.size > 0 ? (
        <ChosenBar
          families={families}
          chosen={held}
          pending={pending}
          sought={sought}
          onMove={(familyId) => void move(held, familyId)}
          onPin={(pinned) => void pin(pinned)}
          onClear={() => setChosen(new Set())}
        />
      ) : null}
    </>
  )
}

const nothing = () => undefined
const SILENT = {
  onDragStart: nothing,
  onDragOver: nothing,
  onDragEnd: nothing,
  onDragCancel: nothing,
}

/** One family: its name in the margin, what belongs to it beside. */
function FamilySection({
  family: { id, name, shades, ordered },
  drops,
  open,
  onToggle,
  children,
}: {
  family: FamilyWithShades
  drops: boolean
  open: boolean
  onToggle?: () => void
  children: ReactNode
}) {
  const { setNodeRef, isOver } = useDroppable({ id, disabled: !drops })
  return (
    <section
      ref={setNodeRef}
      aria-label={name}
      className={cn(
        'gap-x-6 border-b border-hairline py-4 first:pt-0 last:border-b-0 last:pb-0 lg:grid lg:grid-cols-[9rem_minmax(0,1fr)]',
        isOver && 'bg-wash',
      )}
    >
      <div className="mb-2 flex items-start justify-between gap-2 lg:mb-0 lg:block">
        <div>
          <h2 className="text-lg">{name}</h2>
          <p className="text-sm text-ink-soft">
            {shadesInWords(shades.length)}
            {ordered ? ', ordered by hand' : ''}
          </p>
        </div>
        {onToggle ? (
          <Button
            size="small"
            variant="quiet"
            icon={<Settings2 aria-hidden="true" />}
            aria-expanded={open}
            className="-ml-2.5 print:hidden"
            onClick={onToggle}
          >
            Edit<span className="sr-only"> {name}</span>
          </Button>
        ) : null}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  )
}
