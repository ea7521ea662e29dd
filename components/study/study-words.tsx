import { TextLink } from '@/components/ui/text-link'
import { shadesHref, type LinePlace } from '@/components/shades/shades-actions'
import type { Vision } from '@/lib/color/vision'
import type { ShadeView } from '@/lib/shades/present'

/** A difference or a lightness, with one decimal. */
export const showNumber = (value: number): string => value.toFixed(1).replace('-', '−')

/** "1 pair", "335 pairs". */
export const showCount = (count: number, one: string): string =>
  `${count.toLocaleString('en-GB')} ${one}${count === 1 ? '' : 's'}`

/** The three visions as they are told. */
export const VISION_WORDS: Record<Vision, { name: string; lacks: string }> = {
  protan: {
    name: 'Protan',
    lacks: 'Long-wave cones missing: reds look dark, and red and green alike.',
  },
  deutan: { name: 'Deutan', lacks: 'Middle-wave cones missing: red and green look alike.' },
  tritan: {
    name: 'Tritan',
    lacks: 'Short-wave cones missing, which is rare: blue and green look alike.',
  },
}

/** A shade by its name, which leads to its page. */
export function ShadeLink({
  place,
  shade,
  className,
}: {
  place: LinePlace
  shade: ShadeView
  className?: string
}) {
  return (
    // A study holds hundreds of them, most of which nobody follows.
    <TextLink href={shadesHref(place, `/${shade.id}`)} prefetch={false} className={className}>
      {shade.label}
    </TextLink>
  )
}

/** The names of a pair, one under the other, each tall enough for a finger. */
export function PairNames({
  place,
  first,
  second,
}: {
  place: LinePlace
  first: ShadeView
  second: ShadeView
}) {
  const name = 'block w-fit py-0.5 leading-5 break-words pointer-coarse:py-1.5'
  return (
    <p className="font-title">
      <ShadeLink place={place} shade={first} className={name} />
      <span className="sr-only"> and </span>
      <ShadeLink place={place} shade={second} className={name} />
    </p>
  )
}
