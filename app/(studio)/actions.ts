'use server'

import { redirect } from 'next/navigation'

import { endThisSession } from '@/lib/server/sign-out'

/** Ends the session of this browser; also works before the page's script has arrived. */
export async function signOutAction(): Promise<never> {
  await endThisSession()
  redirect('/sign-in')
}
