import { namesHref } from '@/components/names/names-place'
import { TextLink } from '@/components/ui/text-link'
import type { ShadeView } from '@/lib/shades/present'

import { ShadeName } from './shade-words'
import type { LinePlace } from './shades-actions'

/** A shade's approved name, or that it has none, leading to where names are found for it. */
export function ShadeNameLink({ place, shade }: { place: LinePlace; shade: ShadeView }) {
  return (
    <TextLink
      href={namesHref(place, `/shades/${shade.id}`)}
      aria-label={`${shade.name ?? 'Not named'}: names for No. ${shade.number}`}
    >
      <ShadeName shade={shade} />
    </TextLink>
  )
}
