'use client'

import { ChevronsUpDown } from 'lucide-react'
import { useRef, type KeyboardEvent, type PointerEvent } from 'react'

import { LEAST_PERCENT } from './draft'

const STEPS: Record<string, number> = {
  ArrowUp: 1,
  ArrowRight: 1,
  ArrowDown: -1,
  ArrowLeft: -1,
  PageUp: 5,
  PageDown: -5,
}

/** Props of {@link EdgeSlider}. */
export interface EdgeSliderProps {
  /** What the bands above and below the edge are called, and their percents. */
  above: { name: string; percent: number }
  below: { name: string; percent: number }
  /** How many pixels one percent is high, when it is asked for. */
  pixelsPerPercent: () => number
  /** While it is dragged: the percent above, or null when the drag is given up. */
  onPreview: (percent: number | null) => void
  /** Let go, or moved by a key: the percent above. */
  onMove: (percent: number) => void
  /** Left by the keyboard. */
  onLeave: () => void
  className?: string
  style?: React.CSSProperties
}

/**
 * The edge between two bands: dragged, or moved by the arrow keys. Its value is the share of the
 * band below, so that up is more. Escape puts it back.
 */
export function EdgeSlider({
  above,
  below,
  pixelsPerPercent,
  onPreview,
  onMove,
  onLeave,
  className,
  style,
}: EdgeSliderProps) {
  const drag = useRef<{ y: number; start: number; percent: number } | null>(null)
  const onFocus = useRef(above.percent)
  const both = above.percent + below.percent
  const clamped = (percent: number) =>
    Math.max(LEAST_PERCENT, Math.min(both - LEAST_PERCENT, Math.round(percent)))

  function begin(event: PointerEvent<HTMLDivElement>) {
    if (event.button !== 0) return
    event.preventDefault()
    event.currentTarget.setPointerCapture(event.pointerId)
    event.currentTarget.focus()
    drag.current = { y: event.clientY, start: above.percent, percent: above.percent }
  }
  function move(event: PointerEvent) {
    if (!drag.current) return
    const { y, start } = drag.current
    drag.current.percent = clamped(start + (event.clientY - y) / pixelsPerPercent())
    onPreview(drag.current.percent)
  }
  function end(keeps: boolean) {
    if (!drag.current) return
    const { start, percent } = drag.current
    drag.current = null
    onPreview(null)
    if (keeps && percent !== start) {
      onMove(percent)
      onLeave()
      onFocus.current = percent
    }
  }
  function onKeyDown(event: KeyboardEvent) {
    const step = STEPS[event.key]
    if (event.key === 'Escape') {
      if (drag.current) end(false)
      else onMove(onFocus.current)
    } else if (step !== undefined) onMove(clamped(above.percent - step))
    else if (event.key === 'Home') onMove(clamped(100))
    else if (event.key === 'End') onMove(clamped(0))
    else return
    event.preventDefault()
  }

  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={`Edge between ${above.name} and ${below.name}`}
      aria-orientation="vertical"
      aria-valuemin={LEAST_PERCENT}
      aria-valuemax={both - LEAST_PERCENT}
      aria-valuenow={below.percent}
      aria-valuetext={`${above.name} ${above.percent} %, ${below.name} ${below.percent} %`}
      onFocus={() => (onFocus.current = above.percent)}
      onBlur={() => {
        end(true)
        onLeave()
      }}
      onKeyDown={onKeyDown}
      onPointerDown={begin}
      onPointerMove={move}
      onPointerUp={() => end(true)}
      onPointerCancel={() => end(false)}
      style={style}
      className={`flex size-6 cursor-row-resize touch-none items-center justify-center rounded border border-rule bg-sheet text-ink hover:border-ink ${className ?? ''}`}
    >
      <ChevronsUpDown aria-hidden="true" className="size-4" />
    </div>
  )
}
