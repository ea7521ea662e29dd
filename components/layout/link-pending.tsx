'use client'

import { useLinkStatus } from 'next/link'

import { Spinner } from '@/components/ui/spinner'

/**
 * Inside a link: says that its page is on its way. Pages have no loading file of their own, since
 * an answer that has begun can no longer say "not found" or "forbidden" by its status.
 */
export function LinkPending() {
  const { pending } = useLinkStatus()
  return pending ? <Spinner /> : null
}
