import { PlainPage } from '@/components/layout/plain-page'
import { LinkButton } from '@/components/ui/link-button'
import { NotFoundState } from '@/components/ui/states'
import { LINK_MINUTES } from '@/lib/people/constants'

/** A whole page: the link of a letter is not, or no longer, good. */
export function DeadLink({ href, label }: { href: string; label: string }) {
  return (
    <PlainPage homeHref="/">
      <NotFoundState
        heading="h1"
        title="This link is no longer good"
        action={
          <LinkButton href={href} variant="primary">
            {label}
          </LinkButton>
        }
      >
        <p>
          A link works once, within {LINK_MINUTES} minutes, and only the newest one that was sent.
          Nothing was changed.
        </p>
      </NotFoundState>
    </PlainPage>
  )
}
