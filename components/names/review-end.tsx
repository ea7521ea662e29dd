import type { RefObject } from 'react'

import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { EmptyState } from '@/components/ui/states'
import { Status } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ReviewPage } from '@/lib/names/present'

import { namesHref, type NamesPlace } from './names-place'
import type { Sitting } from './use-review'

const names = (many: number) => (many === 1 ? '1 name' : `${many} names`)

/** Where the review ends: what this sitting did, what is left, and where to go on. */
export function ReviewEnd({
  place,
  review,
  sitting,
  heading,
  onShow,
}: {
  place: NamesPlace
  review: ReviewPage
  sitting: Sitting
  heading: RefObject<HTMLHeadingElement | null>
  onShow: (ideaId: string) => void
}) {
  const { total, items, before, standing } = review
  const { shades, named, drafts, returned } = standing
  const made = [
    [sitting.approve, 'approved'],
    [sitting.return, 'returned'],
    [sitting['put-by'], 'put by'],
    [sitting.recall, 'taken back'],
  ].filter(([many]) => Boolean(many))
  if (total === 0 && made.length === 0)
    return (
      <EmptyState
        title="No name waits for review"
        action={
          <LinkButton variant="primary" href={namesHref(place)}>
            Go to the list of names
          </LinkButton>
        }
      >
        <p>
          Names that are sent for review stand here one at a time, with their shade, its neighbours,
          the checks and what was said.
        </p>
        <Named shades={shades} named={named} />
      </EmptyState>
    )
  const waiting = [
    ...(drafts > 0 ? [`${names(drafts)} still in draft`] : []),
    ...(returned > 0 ? [`${names(returned)} returned to whoever wrote them`] : []),
  ]
  return (
    <div className="max-w-measure space-y-4 py-6">
      <h2 ref={heading} tabIndex={-1} className="text-2xl outline-none">
        {total === 0 ? 'Every name is decided' : 'You have been through them all'}
      </h2>
      {made.length > 0 ? (
        <p>
          In this sitting: {made.map(([many, word]) => `${many} ${word}`).join(', ')}. Others who
          wrote them are told by letter.
        </p>
      ) : null}
      <Named shades={shades} named={named} />
      {waiting.length > 0 ? (
        <p className="text-ink-soft">Not here yet: {waiting.join('; ')}.</p>
      ) : null}
      {total > 0 ? (
        <section aria-labelledby="still-open">
          <h3 id="still-open" className="text-lg">
            {total === 1 ? '1 name is still in review' : `${total} names are still in review`}
          </h3>
          <ul role="list" className="mt-2 divide-y divide-hairline border-y border-hairline">
            {items.map(({ idea, shade }) => (
              <li key={idea.id}>
                <button
                  type="button"
                  className="group flex min-h-11 w-full items-center gap-3 py-1.5 text-left"
                  onClick={() => onShow(idea.id)}
                >
                  <WoundSample hex={shade.hex} className="h-7 w-auto" />
                  <span className="min-w-0 grow font-title break-words group-hover:underline">
                    {idea.text}
                  </span>
                  <span className="text-sm text-ink-faint">No. {shade.number}</span>
                </button>
              </li>
            ))}
          </ul>
          {before === null ? null : (
            <Button className="mt-3" onClick={() => onShow(before)}>
              Look at those before
            </Button>
          )}
        </section>
      ) : null}
      <div className="flex flex-wrap gap-3 pt-2">
        <LinkButton href={namesHref(place)} variant={total === 0 ? 'primary' : 'secondary'}>
          Go to the list of names
        </LinkButton>
        <LinkButton href={namesHref(place, '/together')}>See them all together</LinkButton>
      </div>
    </div>
  )
}

function Named({ shades, named }: { shades: number; named: number }) {
  if (shades > 0 && named === shades)
    return (
      <p>
        <Status kind="done">
          {shades === 1 ? 'The one shade has its name.' : `All ${shades} shades have their names.`}
        </Status>
      </p>
    )
  return (
    <p>
      {named} of {shades} shades have a name.
    </p>
  )
}
