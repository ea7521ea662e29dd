'use client'

import { useDroppable } from '@dnd-kit/core'

import { cn } from '@/components/ui/cn'
import { LANES, LANE_WORDS, type Lane } from '@/lib/combinations/constants'

/** Which lane is shown where there is room for one only; a card held over a name goes there. */
export function LaneSwitch({
  lane,
  counts,
  onChoose,
}: {
  lane: Lane
  counts: Readonly<Record<Lane, number>>
  onChoose: (lane: Lane) => void
}) {
  return (
    <div
      role="group"
      aria-label="Lane shown"
      className="mb-2 grid grid-cols-3 border-b border-hairline @min-[40rem]/board:hidden"
    >
      {LANES.map((one) => (
        <LaneName
          key={one}
          lane={one}
          count={counts[one]}
          shown={one === lane}
          onChoose={() => onChoose(one)}
        />
      ))}
    </div>
  )
}

function LaneName({
  lane,
  count,
  shown,
  onChoose,
}: {
  lane: Lane
  count: number
  shown: boolean
  onChoose: () => void
}) {
  const { setNodeRef } = useDroppable({ id: `switch-${lane}` })
  return (
    <button
      ref={setNodeRef}
      type="button"
      aria-pressed={shown}
      onClick={onChoose}
      className={cn(
        '-mb-px min-h-11 border-b-2 px-1 py-2 focus-visible:-outline-offset-2',
        shown ? 'border-woad font-semibold' : 'border-transparent text-ink-soft',
      )}
    >
      {LANE_WORDS[lane]} <span className="font-normal text-ink-faint">{count}</span>
    </button>
  )
}
