import { MonitorX } from 'lucide-react'

import { cn } from '@/components/ui/cn'
import { Status, type StatusKind } from '@/components/ui/status'
import type { ShadeView } from '@/lib/shades/present'
import type { ShadeStatus } from '@/lib/shades/constants'

/** The statuses of a shade as they are shown. */
export const STATUS_WORDS: Record<ShadeStatus, string> = {
  target: 'Target',
  dipped: 'Dipped',
  approved: 'Approved',
  retired: 'Retired',
}

const STATUS_KINDS: Record<ShadeStatus, StatusKind> = {
  target: 'none',
  dipped: 'waiting',
  approved: 'done',
  retired: 'retired',
}

/** A shade's status as icon and word. */
export function ShadeStatusWord({ status }: { status: ShadeStatus }) {
  return <Status kind={STATUS_KINDS[status]}>{STATUS_WORDS[status]}</Status>
}

/** A shade's approved name, or that it has none. */
export function ShadeName({ shade }: { shade: Pick<ShadeView, 'name'> }) {
  return shade.name ? (
    <span className="font-title">{shade.name}</span>
  ) : (
    <span className="text-ink-faint">Not named</span>
  )
}

/** Says that a screen cannot show the shade and shows a less vivid stand-in. */
export function BeyondScreen({ className }: { className?: string }) {
  return (
    <span
      className={cn('inline-flex items-center gap-1.5 text-sm text-ink-soft', className)}
      title="This colour lies outside sRGB: the screen shows a less vivid stand-in."
    >
      <MonitorX aria-hidden="true" className="size-4 shrink-0" strokeWidth={1.75} />
      Beyond the screen
    </span>
  )
}

/** A reading with two decimals and a true minus sign. */
export const showReading = (value: number): string => value.toFixed(2).replace('-', '−')

/** Where a shade's colour comes from: its terms, or the hex it was entered as. */
export function showTerms(
  shade: Pick<ShadeView, 'observer' | 'illuminant' | 'enteredHex'>,
): string {
  const terms = `${shade.illuminant}, ${shade.observer}°`
  return shade.enteredHex ? `${terms}, from ${shade.enteredHex}` : terms
}
