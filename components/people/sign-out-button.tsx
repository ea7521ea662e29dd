'use client'

import { signOut } from 'next-auth/react'
import { useState } from 'react'

import { Button } from '@/components/ui/button'

/** Ends the session here and on the server, then shows the sign-in page. */
export function SignOutButton() {
  const [pending, setPending] = useState(false)
  return (
    <Button
      variant="quiet"
      size="small"
      pending={pending}
      onClick={() => {
        setPending(true)
        signOut({ callbackUrl: '/sign-in' }).catch(() => setPending(false))
      }}
    >
      Sign out
    </Button>
  )
}
