'use client'

import { useId, useSyncExternalStore } from 'react'
import { GROUND_COOKIE, GROUNDS, parseGround, type GroundName } from './grounds'

const CHANGED = 'woadmap:ground'
const FACES: Record<GroundName, { label: string; hex: string }> = {
  white: { label: 'White', hex: '#ffffff' },
  grey: { label: 'Mid grey', hex: '#777777' },
  black: { label: 'Black', hex: '#000000' },
}

function subscribe(notify: () => void) {
  window.addEventListener(CHANGED, notify)
  return () => window.removeEventListener(CHANGED, notify)
}

const current = (): GroundName => parseGround(document.documentElement.dataset.ground)

function choose(ground: GroundName) {
  document.documentElement.dataset.ground = ground
  document.cookie = `${GROUND_COOKIE}=${ground}; path=/; max-age=31536000; samesite=lax`
  window.dispatchEvent(new Event(CHANGED))
}

/** Chooses the ground under every Ground sheet of the page; the browser remembers it. */
export function GroundSwitch({ className }: { className?: string }) {
  const name = useId()
  const ground = useSyncExternalStore(subscribe, current, () => 'white' as const)
  return (
    <fieldset className={`flex items-center gap-1 print:hidden ${className ?? ''}`}>
      <legend className="float-left mr-2 text-sm text-ink-soft">Ground</legend>
      {GROUNDS.map((value) => (
        <label
          key={value}
          title={FACES[value].label}
          className="has-focus-visible:outline-focus relative inline-flex size-8 items-center justify-center rounded border-2 border-transparent has-checked:border-woad has-focus-visible:outline-2 has-focus-visible:outline-offset-2 pointer-coarse:size-11"
        >
          <input
            type="radio"
            name={name}
            value={value}
            checked={ground === value}
            onChange={() => choose(value)}
            aria-label={FACES[value].label}
            className="absolute inset-0 cursor-pointer appearance-none opacity-0"
          />
          <span
            aria-hidden="true"
            className="size-5 rounded border border-rule"
            style={{ background: FACES[value].hex }}
          />
        </label>
      ))}
    </fieldset>
  )
}
