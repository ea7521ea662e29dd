import { TriangleAlert } from 'lucide-react'
import { cn } from '@/components/ui/cn'

/** What must stand wherever shades are judged, exported or printed. */
export const SCREEN_CAUTION =
  'Print and screen are not a shade approval; judge against the wound standard in daylight or under a D65 lamp.'

/** {@link SCREEN_CAUTION} on the sheet; `printOnly` keeps it for paper. */
export function ScreenCaution({
  printOnly,
  className,
}: {
  printOnly?: boolean
  className?: string
}) {
  return (
    <p
      className={cn(
        'max-w-measure items-start gap-2 text-sm text-ink-faint',
        printOnly ? 'hidden print:flex' : 'flex',
        className,
      )}
    >
      <TriangleAlert aria-hidden="true" className="mt-px size-4 shrink-0" />
      <span>{SCREEN_CAUTION}</span>
    </p>
  )
}
