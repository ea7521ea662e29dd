'use client'

import { useEffect, useRef, type KeyboardEvent, type MouseEvent } from 'react'
import useSWRImmutable from 'swr/immutable'

import { PhotographPicture } from '@/components/photographs/photograph-picture'
import type { PhotographView } from '@/lib/photographs/present'

import { veilOutside, type CellMap } from './region'
import { touchPicture, type Point } from './touch'
import type { TouchedColor } from './types'

async function fetchCells(url: string): Promise<CellMap> {
  const answer = await fetch(url)
  if (!answer.ok) throw new Error(`cells answered ${answer.status}`)
  return {
    width: Number(answer.headers.get('X-Map-Width')),
    height: Number(answer.headers.get('X-Map-Height')),
    cells: new Uint8Array(await answer.arrayBuffer()),
  }
}

const STEPS: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
}
const keep = (value: number) => Math.min(1, Math.max(0, value))

/** Props of {@link TouchPicture}. */
export interface TouchPictureProps {
  brand: string
  photograph: PhotographView
  /** Per cell, the index of its place; and the place whose region is shown, if one is. */
  assignment: readonly number[]
  shown: number | null
  /** Where the dropper is, once it is in use. */
  point: Point | null
  onTouch: (point: Point, color: TouchedColor | null) => void
}

/**
 * The photograph, with the region of one of the five left clear and the rest veiled, and a dropper:
 * press the picture, or move the cross with the arrow keys (with Shift further).
 */
export function TouchPicture({
  brand,
  photograph,
  assignment,
  shown,
  point,
  onTouch,
}: TouchPictureProps) {
  const frame = useRef<HTMLDivElement>(null)
  const canvas = useRef<HTMLCanvasElement>(null)
  const cross = point ?? { x: 0.5, y: 0.5 }
  const { data: map } = useSWRImmutable(
    shown === null ? null : `/api/brands/${brand}/photographs/${photograph.id}/cells`,
    fetchCells,
    { keepPreviousData: true },
  )

  useEffect(() => {
    const context = canvas.current?.getContext('2d')
    if (!context || !map || shown === null) return
    const veil = veilOutside(map, assignment, shown)
    context.putImageData(new ImageData(veil, map.width, map.height), 0, 0)
  }, [map, assignment, shown])

  function touch(to: Point) {
    const image = frame.current?.querySelector('img')
    onTouch(to, image ? touchPicture(image, to) : null)
  }

  // On click, not on pointer down: a finger that scrolls the page past the picture asks for nothing.
  function press(event: MouseEvent<HTMLDivElement>) {
    // The cross pressed by keyboard stays where it is.
    if (event.detail === 0) return touch(cross)
    const box = event.currentTarget.getBoundingClientRect()
    touch({
      x: keep((event.clientX - box.left) / box.width),
      y: keep((event.clientY - box.top) / box.height),
    })
  }

  function move(event: KeyboardEvent) {
    const step = STEPS[event.key]
    if (!step) return
    event.preventDefault()
    const far = event.shiftKey ? 0.05 : 0.005
    touch({ x: keep(cross.x + step[0] * far), y: keep(cross.y + step[1] * far) })
  }

  return (
    <div ref={frame} className="relative cursor-crosshair touch-manipulation" onClick={press}>
      <PhotographPicture
        priority
        photograph={photograph}
        sizes="(min-width: 1280px) 45vw, (min-width: 720px) 60vw, 100vw"
      />
      <canvas
        ref={canvas}
        aria-hidden="true"
        width={map?.width ?? 1}
        height={map?.height ?? 1}
        className={`pointer-events-none absolute inset-0 size-full transition-opacity duration-200 motion-reduce:transition-none ${shown !== null && map ? 'opacity-100' : 'opacity-0'}`}
      />
      {photograph.fallbackSrc ? (
        <button
          type="button"
          aria-label={`Dropper, ${Math.round(cross.x * 100)} % across, ${Math.round(cross.y * 100)} % down. Arrow keys move it, with Shift further.`}
          onKeyDown={move}
          style={{ left: `${cross.x * 100}%`, top: `${cross.y * 100}%` }}
          className={`absolute size-8 -translate-x-1/2 -translate-y-1/2 cursor-crosshair rounded-full print:hidden ${point ? '' : 'opacity-0 focus-visible:opacity-100'}`}
        >
          <svg viewBox="0 0 32 32" aria-hidden="true" className="size-8">
            <circle cx="16" cy="16" r="9" fill="none" stroke="#fff" strokeWidth="4" />
            <circle cx="16" cy="16" r="9" fill="none" stroke="#141413" strokeWidth="1.5" />
            <path d="M16 1v6M16 25v6M1 16h6M25 16h6" stroke="#fff" strokeWidth="4" />
            <path d="M16 1v6M16 25v6M1 16h6M25 16h6" stroke="#141413" strokeWidth="1.5" />
          </svg>
        </button>
      ) : null}
    </div>
  )
}
