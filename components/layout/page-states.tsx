import { LinkButton } from '@/components/ui/link-button'
import { ForbiddenState, NotFoundState } from '@/components/ui/states'

const home = <LinkButton href="/">Go to your lines</LinkButton>

/** A whole page: nothing stands at its address, for this person. */
export function NotFoundPage() {
  return (
    <NotFoundState heading="h1" title="Nothing stands at this address" action={home}>
      <p>It may have been removed or renamed, or it belongs to a brand you are not part of.</p>
    </NotFoundState>
  )
}

/** A whole page: the person's role does not open it. */
export function ForbiddenPage() {
  return (
    <ForbiddenState heading="h1" title="This is not part of your role" action={home}>
      <p>Your role in this brand does not open this page. An owner of the brand can change that.</p>
    </ForbiddenState>
  )
}
