'use client'

import { useEffect, useRef, type ReactNode } from 'react'

/** Stands in place of a form once it has done its work; the keyboard and the voice go to it. */
export function Done({
  title,
  action,
  children,
}: {
  title: ReactNode
  action?: ReactNode
  children?: ReactNode
}) {
  const place = useRef<HTMLDivElement>(null)
  useEffect(() => place.current?.focus(), [])
  return (
    <div ref={place} tabIndex={-1} role="status" className="space-y-3 outline-none">
      <p className="font-semibold break-words">{title}</p>
      {children ? <div className="space-y-3 text-ink-soft">{children}</div> : null}
      {action ? <div className="pt-2">{action}</div> : null}
    </div>
  )
}
