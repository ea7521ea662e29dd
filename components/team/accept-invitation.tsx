'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { ActionResult } from '@/lib/errors'

/** Joins with the account that is signed in. */
export function AcceptInvitation({
  token,
  brandName,
  accept,
}: {
  token: string
  brandName: string
  accept: (input: { token: string }) => Promise<ActionResult<{ brandSlug: string }>>
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string>()

  async function join() {
    setPending(true)
    setProblem(undefined)
    const answer = await reach(accept({ token }))
    if (!answer.ok) {
      setPending(false)
      setProblem(answer.message)
      return
    }
    router.push(`/${answer.data.brandSlug}` as never)
  }

  return (
    <div className="space-y-5">
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <Button
        variant="primary"
        pending={pending}
        pendingLabel="Joining…"
        onClick={() => void join()}
      >
        Join {brandName}
      </Button>
    </div>
  )
}
