'use client'

import { RotateCcw } from 'lucide-react'
import { useState } from 'react'

import { Button, type ButtonProps } from '@/components/ui/button'
import { toastProblem } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'

/** The action that has a photograph read again; the page is rendered anew by it. */
export type RereadPhotograph = (
  brand: string,
  input: { photographId: string },
) => Promise<ActionResult<unknown>>

/** Props of {@link ReadAgainButton}. */
export interface ReadAgainButtonProps extends Pick<ButtonProps, 'variant' | 'size'> {
  brand: string
  photographId: string
  reread: RereadPhotograph
}

/** Has a photograph read again. */
export function ReadAgainButton({
  brand,
  photographId,
  reread,
  variant,
  size,
}: ReadAgainButtonProps) {
  const [pending, setPending] = useState(false)

  async function readAgain() {
    setPending(true)
    const answer = await reread(brand, { photographId }).catch(() => null)
    setPending(false)
    if (answer?.ok) return
    toastProblem(
      'The photograph was not read again',
      answer?.message ?? 'Woadmap could not be reached. Check the connection and try again.',
    )
  }

  return (
    <Button
      variant={variant}
      size={size}
      icon={<RotateCcw aria-hidden="true" />}
      pending={pending}
      pendingLabel="Asking for a reading…"
      onClick={() => void readAgain()}
    >
      Read photograph again
    </Button>
  )
}
