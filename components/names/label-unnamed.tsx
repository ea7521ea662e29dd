import { Status } from '@/components/ui/status'
import { TextLink } from '@/components/ui/text-link'
import type { UnnamedView } from '@/lib/names/present'

import { IdeaState } from './idea-state'
import { namesHref, type NamesPlace } from './names-place'

/** How many shades are named one by one; the others are counted. */
const SHOWN = 60

/** Shades without an approved name, and how far an idea for each has come. */
export function LabelUnnamed({
  place,
  unnamed,
}: {
  place: NamesPlace
  unnamed: readonly UnnamedView[]
}) {
  return (
    <>
      <ul
        role="list"
        className="grid grid-cols-[repeat(auto-fill,minmax(9.5rem,1fr))] gap-x-6 gap-y-1.5"
      >
        {unnamed.slice(0, SHOWN).map(({ shadeId, number, state }) => (
          <li key={shadeId} className="flex flex-wrap items-center gap-x-3">
            <TextLink
              href={namesHref(place, `/shades/${shadeId}`)}
              className="inline-flex min-h-8 items-center pointer-coarse:min-h-11"
            >
              No. {number}
            </TextLink>
            {state ? <IdeaState state={state} /> : <Status kind="none">No idea yet</Status>}
          </li>
        ))}
      </ul>
      {unnamed.length > SHOWN ? (
        <p className="mt-2 text-ink-soft">and {unnamed.length - SHOWN} more</p>
      ) : null}
    </>
  )
}
