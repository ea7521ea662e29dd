import type { ReactNode } from 'react'

import { StudioShell } from '@/components/layout/studio-shell'
import { SignOutButton } from '@/components/people/sign-out-button'
import { canReadActivity } from '@/lib/activity/policy'
import type { Actor } from '@/lib/auth/actor'
import { getPerson } from '@/lib/auth/get-actor'
import type { LineChapters } from '@/lib/lines/present'
import { ROLE_WORDS } from '@/lib/people/constants'

import { signOutAction } from './actions'

/** The studio's frame for one brand and, within a line, its chapters. */
export async function Shell({
  actor,
  chapters,
  children,
}: {
  actor: Actor
  chapters?: LineChapters
  children: ReactNode
}) {
  const person = await getPerson()
  return (
    <StudioShell
      brand={{ name: actor.brandName, href: `/${actor.brandSlug}` }}
      brands={person?.memberships.map(({ brandName, brandSlug }) => ({
        name: brandName,
        href: `/${brandSlug}`,
      }))}
      brandPages={[
        { label: 'Team', href: `/${actor.brandSlug}/team` },
        ...(canReadActivity(actor)
          ? [{ label: 'Activity record', href: `/${actor.brandSlug}/activity` }]
          : []),
      ]}
      person={{ name: actor.personName, role: ROLE_WORDS[actor.role] }}
      signOut={<SignOutButton signOut={signOutAction} />}
      {...chapters}
    >
      {children}
    </StudioShell>
  )
}
