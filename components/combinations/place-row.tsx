'use client'

import { Lock, LockOpen, Minus, Plus, X } from 'lucide-react'
import { useState, type ReactNode } from 'react'

import { cn } from '@/components/ui/cn'
import { controlClass } from '@/components/ui/field'
import { IconButton } from '@/components/ui/icon-button'
import { Select } from '@/components/ui/select'
import { WoundSample } from '@/components/yarn/wound-sample'
import { PLACE_ROLES, type PlaceRole } from '@/lib/combinations/constants'
import type { ShadeView } from '@/lib/shades/present'

import { LEAST_PERCENT, MOST_PERCENT, percentOf, type DraftPlace } from './draft'
import { placeInWords } from './draft-words'
import { useHeldDrag, usePlaceDrop } from './editor-drag'

/** Props of {@link PlaceRow}. */
export interface PlaceRowProps {
  /** From 0. */
  at: number
  place: DraftPlace
  /** Null while the place is empty. */
  shade: ShadeView | null
  /** The shade was deleted from the line since. */
  gone: boolean
  canEdit: boolean
  /** What pressing the sample would do, when something is held that could be put here. */
  puts: string | null
  /** This place is what is held. */
  held: boolean
  onPress: () => void
  onRole: (role: PlaceRole) => void
  onShare: (percent: number) => void
  onLock: (locked: boolean) => void
  onEmpty: () => void
  /** What else can be done with the place. */
  more?: ReactNode
}

/** One of the five places: its yarn, name, role, share and lock. */
export function PlaceRow(props: PlaceRowProps) {
  const { at, place, shade, gone, canEdit, puts, held, onPress } = props
  const { locked, role, share } = place
  const name = shade?.label ?? 'Empty'
  const { setNode, isOver } = usePlaceDrop(at, 'row', locked || !canEdit)
  return (
    <li
      ref={setNode}
      className={cn('flex gap-3 py-3', isOver && 'outline-focus outline-2 outline-offset-1')}
    >
      {canEdit ? (
        <SampleButton {...{ at, shade, locked, puts, held, onPress }} />
      ) : (
        <Sample shade={shade} />
      )}
      <div className="min-w-0 grow">
        <div className="flex items-start justify-between gap-2">
          <div className="min-w-0">
            <p
              className={cn(
                'font-title text-lg leading-tight break-words',
                !shade && 'text-ink-faint',
              )}
            >
              {name}
            </p>
            <p className="text-sm text-ink-faint">
              <span className={canEdit ? 'hidden print:inline' : undefined}>
                {role} · {percentOf(share)} %{locked ? ' · locked' : ''}
                {shade?.name || gone ? ' · ' : ''}
              </span>
              {shade?.name ? `No. ${shade.number}` : ''}
              {gone ? `${shade?.name ? ' · ' : ''}no longer in the line` : ''}
            </p>
          </div>
          {canEdit ? <PlaceButtons {...props} /> : null}
        </div>
        {canEdit ? <PlaceControls {...props} /> : null}
      </div>
    </li>
  )
}

function Sample({ shade }: { shade: ShadeView | null }) {
  return shade ? (
    <WoundSample hex={shade.hex} />
  ) : (
    <span className="block h-[46px] w-[84px] shrink-0 rounded border border-dashed border-rule" />
  )
}

/** Takes the shade of the place up, or puts what is held here. */
function SampleButton({
  at,
  shade,
  locked,
  puts,
  held,
  onPress,
}: Pick<PlaceRowProps, 'at' | 'shade' | 'puts' | 'held' | 'onPress'> & { locked: boolean }) {
  const { setNode, listeners, isDragging } = useHeldDrag(
    { kind: 'place', place: at },
    'row',
    locked || !shade,
  )
  const label = puts ?? `${shade ? `Move ${shade.label}` : 'Empty'}, ${placeInWords(at)}`
  return (
    <button
      ref={setNode}
      type="button"
      {...listeners}
      aria-label={label}
      aria-pressed={held}
      disabled={locked || (!shade && !puts)}
      onClick={onPress}
      className={cn(
        'shrink-0 touch-manipulation self-start rounded outline-offset-2 disabled:cursor-default',
        shade && !locked && 'cursor-grab',
        (held || puts) && 'outline-focus outline-2',
        held && 'outline-dashed',
        isDragging && 'opacity-40',
      )}
    >
      <Sample shade={shade} />
    </button>
  )
}

/** What can be done with the shade that stands in the place. */
function PlaceButtons({ at, place: { locked }, shade, onLock, onEmpty, more }: PlaceRowProps) {
  return (
    <div className="-mt-1.5 flex shrink-0 items-center print:hidden">
      {more}
      <IconButton
        label={locked ? `Unlock place ${at + 1}` : `Lock place ${at + 1}`}
        icon={locked ? <Lock /> : <LockOpen />}
        aria-pressed={locked}
        onClick={() => onLock(!locked)}
      />
      <IconButton
        label={shade ? `Take ${shade.label} out` : `Place ${at + 1} is empty`}
        icon={<X />}
        disabled={locked || !shade}
        onClick={onEmpty}
      />
    </div>
  )
}

function PlaceControls({ at, place: { role, share }, onRole, onShare }: PlaceRowProps) {
  const percent = percentOf(share)
  const where = `place ${at + 1}`
  return (
    <div className="mt-1.5 flex items-center gap-1 print:hidden">
      <Select
        aria-label={`Role of ${where}`}
        value={role}
        className="w-21"
        onChange={({ target }) => onRole(target.value as PlaceRole)}
      >
        {PLACE_ROLES.map((one) => (
          <option key={one}>{one}</option>
        ))}
      </Select>
      <IconButton
        label={`Less of ${where}`}
        icon={<Minus />}
        disabled={percent <= LEAST_PERCENT}
        onClick={() => onShare(percent - 1)}
      />
      <PercentInput label={`Share of ${where}, %`} percent={percent} onChange={onShare} />
      <IconButton
        label={`More of ${where}`}
        icon={<Plus />}
        disabled={percent >= MOST_PERCENT}
        onClick={() => onShare(percent + 1)}
      />
    </div>
  )
}

/** A whole number of percent: Enter or leaving it is done, Escape leaves it as it was. */
function PercentInput({
  label,
  percent,
  onChange,
}: {
  label: string
  percent: number
  onChange: (percent: number) => void
}) {
  const [typed, setTyped] = useState<string | null>(null)
  function done() {
    const number = Number(typed)
    if (typed?.trim() && Number.isFinite(number)) onChange(number)
    setTyped(null)
  }
  return (
    <input
      type="text"
      inputMode="numeric"
      aria-label={label}
      value={typed ?? `${percent} %`}
      onFocus={({ target }) => {
        setTyped(String(percent))
        requestAnimationFrame(() => target.select())
      }}
      onChange={({ target }) => setTyped(target.value)}
      onBlur={done}
      onKeyDown={({ key, currentTarget }) => {
        if (key === 'Escape') setTyped(String(percent))
        if (key === 'Enter') {
          done()
          currentTarget.blur()
        }
      }}
      className={controlClass('h-9 w-14! px-1! text-center pointer-coarse:h-11')}
    />
  )
}
