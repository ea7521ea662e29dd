'use client'

import { useEffect, useRef } from 'react'

import { LANES, type Lane } from '@/lib/combinations/constants'

/** A card that is carried: over which lane, and at which index among the cards shown there. */
export interface Carry {
  id: string
  lane: Lane
  /** From 0, among the others that are shown in the lane. */
  at: number
  by: 'pointer' | 'keys'
}

/** The button that moves a card, by its id in the document. */
export const moveButtonId = (combinationId: string): string => `move-${combinationId}`

/**
 * Where a key takes a carried card: arrows one place or one lane on, Home and End to the lane's
 * ends. Null for keys that move nothing.
 * @param others the cards shown in each lane besides the carried one
 */
export function carriedBy(
  key: string,
  { lane, at, ...rest }: Carry,
  others: Readonly<Record<Lane, readonly string[]>>,
): Carry | null {
  const within = (index: number) => Math.max(0, Math.min(others[lane].length, index))
  const beside = (by: 1 | -1): Carry | null => {
    const next = LANES[LANES.indexOf(lane) + by]
    return next ? { ...rest, lane: next, at: Math.min(at, others[next].length) } : null
  }
  switch (key) {
    case 'ArrowUp':
      return { ...rest, lane, at: within(at - 1) }
    case 'ArrowDown':
      return { ...rest, lane, at: within(at + 1) }
    case 'ArrowLeft':
      return beside(-1)
    case 'ArrowRight':
      return beside(1)
    case 'Home':
      return { ...rest, lane, at: 0 }
    case 'End':
      return { ...rest, lane, at: others[lane].length }
    default:
      return null
  }
}

const CARRYING = ['ArrowUp', 'ArrowDown', 'ArrowLeft', 'ArrowRight', 'Home', 'End']

/** Listens to the keys while a card is carried by them; the keyboard stays on its button. */
export function useCarryKeys(
  carry: Carry | null,
  others: Readonly<Record<Lane, readonly string[]>>,
  on: { move: (carry: Carry) => void; drop: () => void; cancel: () => void },
): void {
  const now = useRef({ carry, others, on })
  useEffect(() => {
    now.current = { carry, others, on }
  })
  const carrying = carry?.by === 'keys'
  useEffect(() => {
    if (!carrying) return
    const listen = (event: KeyboardEvent) => {
      const { carry: held, others: around, on: hands } = now.current
      if (!held) return
      if (CARRYING.includes(event.key)) {
        event.preventDefault()
        const moved = carriedBy(event.key, held, around)
        if (moved) hands.move(moved)
      } else if (event.key === ' ' || event.key === 'Enter') {
        event.preventDefault()
        event.stopPropagation()
        hands.drop()
      } else if (event.key === 'Escape' || event.key === 'Tab') {
        if (event.key === 'Escape') event.preventDefault()
        hands.cancel()
      }
    }
    const leave = () => now.current.on.cancel()
    document.addEventListener('keydown', listen, true)
    document.addEventListener('pointerdown', leave, true)
    return () => {
      document.removeEventListener('keydown', listen, true)
      document.removeEventListener('pointerdown', leave, true)
    }
  }, [carrying])
}
