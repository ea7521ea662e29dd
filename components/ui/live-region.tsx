import type { ReactNode } from 'react'

/**
 * Speaks its words whenever they change. Keep it mounted and change the words: a region that
 * arrives together with its words is often not spoken.
 */
export function LiveRegion({
  children,
  urgent = false,
  visible = false,
}: {
  children?: ReactNode
  urgent?: boolean
  visible?: boolean
}) {
  return (
    <div
      role={urgent ? 'alert' : 'status'}
      aria-live={urgent ? 'assertive' : 'polite'}
      aria-atomic="true"
      className={visible ? undefined : 'sr-only'}
    >
      {children}
    </div>
  )
}
