import type { ReactNode } from 'react'

import { LINK_MINUTES } from '@/lib/people/constants'

import { Done } from './done'

/** Stands in place of a form once a letter is on its way, whoever has the address. */
export function LetterSent({ to, children }: { to: string; children: ReactNode }) {
  return (
    <Done title={`We have sent a letter to ${to}.`}>
      {children}
      <p>
        A link in it is good for {LINK_MINUTES} minutes. If nothing has come after a few, look among
        the unwanted letters.
      </p>
    </Done>
  )
}
