'use client'

import type { ReactNode } from 'react'
import { LinkButton } from '@/components/ui/link-button'
import { ForbiddenState, NotFoundState } from '@/components/ui/states'
import { PlainPage } from './plain-page'
import { Sheet } from './sheet'

/** Where the page stands: by itself, or as a sheet in the studio's frame. */
type Frame = 'plain' | 'sheet'

function Framed({ frame, children }: { frame: Frame; children: ReactNode }) {
  return frame === 'sheet' ? (
    <Sheet>{children}</Sheet>
  ) : (
    <PlainPage homeHref="/">{children}</PlainPage>
  )
}

const home = <LinkButton href="/">Go to your lines</LinkButton>

/** A whole page: nothing stands at its address, for this person. */
export function NotFoundPage({ frame }: { frame: Frame }) {
  return (
    <Framed frame={frame}>
      <NotFoundState heading="h1" title="Nothing stands at this address" action={home}>
        <p>It may have been removed or renamed, or it belongs to a brand you are not part of.</p>
      </NotFoundState>
    </Framed>
  )
}

/** A whole page: the person's role does not open it. */
export function ForbiddenPage({ frame }: { frame: Frame }) {
  return (
    <Framed frame={frame}>
      <ForbiddenState heading="h1" title="This is not part of your role" action={home}>
        <p>
          Your role in this brand does not open this page. An owner of the brand can change that.
        </p>
      </ForbiddenState>
    </Framed>
  )
}
