import type { KitView } from '@/lib/kits/present'

/** The combinations that are not in a kit, each with why. */
export function LeftOut({ of: leftOut }: { of: KitView['leftOut'] }) {
  return (
    <ul className="space-y-1 text-sm text-ink-soft">
      {leftOut.map(({ id, title, reasons }) => (
        <li key={id}>
          <span className="text-ink">{title}:</span> {reasons.join(' ')}
        </li>
      ))}
    </ul>
  )
}
