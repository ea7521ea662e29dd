'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { toastProblem } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'

/** The action that begins a combination. */
export type SketchCombination = (
  brand: string,
  input: { lineSlug: string; requestKey: string },
) => Promise<ActionResult<{ id: string }>>

/** Begins a combination of five empty places and opens it. */
export function SketchButton({
  brand,
  line,
  here,
  sketch,
}: {
  brand: string
  line: string
  /** The address of the board. */
  here: string
  sketch: SketchCombination
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)
  // The same until it is begun, so that a press whose answer was lost begins no second one.
  const [requestKey, setRequestKey] = useState<string>()

  async function begin() {
    const key = requestKey ?? crypto.randomUUID()
    setRequestKey(key)
    setPending(true)
    const answer = await reach(sketch(brand, { lineSlug: line, requestKey: key }))
    if (answer.ok) {
      router.push(`${here}/${answer.data.id}` as never)
      return
    }
    setPending(false)
    toastProblem(answer.message)
  }

  return (
    <Button
      variant="primary"
      pending={pending}
      pendingLabel="Beginning…"
      onClick={() => void begin()}
    >
      Sketch a combination
    </Button>
  )
}
