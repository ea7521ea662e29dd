import { shadeLabel } from '@/lib/shades/present'
import type { Combination, Family, Line, NameIdea, Photograph, Shade } from '@/models'

import { ACTIVITY_LIMITS } from './constants'
import type { ActivityEntry, ActivityObject } from './record'

/** A line as the record names it. */
export const lineObject = ({ id, name }: Pick<Line, 'id' | 'name'>): ActivityObject => ({
  kind: 'line',
  id,
  label: name,
})

/** A shade as the record names it: "Moss of Heronsway DK". */
export const shadeObject = (
  shade: Pick<Shade, 'id' | 'number' | 'name'>,
  line: Pick<Line, 'name'>,
): ActivityObject => ({
  kind: 'shade',
  id: shade.id,
  label: `${shadeLabel(shade)} of ${line.name}`,
})

/** A tonal family as the record names it: "Blues of Heronsway DK". */
export const familyObject = (
  { id, name }: Pick<Family, 'id' | 'name'>,
  line: Pick<Line, 'name'>,
): ActivityObject => ({ kind: 'family', id, label: `${name} of ${line.name}` })

/** A photograph as the record names it. */
export const photographObject = ({
  id,
  title,
}: Pick<Photograph, 'id' | 'title'>): ActivityObject => ({ kind: 'photograph', id, label: title })

/** A combination as the record names it. */
export const combinationObject = ({
  id,
  title,
}: Pick<Combination, 'id' | 'title'>): ActivityObject => ({ kind: 'combination', id, label: title })

/** An idea for a name as the record names it: "Thyme Will Tell of Heronsway DK". */
export const ideaObject = (
  { id, text }: Pick<NameIdea, 'id' | 'text'>,
  line: Pick<Line, 'name'>,
): ActivityObject => ({ kind: 'name', id, label: `${text} of ${line.name}` })

/** What a change of several things is recorded with. */
type Recorded = Pick<ActivityEntry, 'object' | 'after'>

/** How many there are, and what the first few are called. */
export const countAndName = (labels: readonly string[]) => ({
  count: labels.length,
  named: labels.slice(0, ACTIVITY_LIMITS.named),
})

/** A change of shades of one line: of the one shade, or of the line with how many they are. */
export function recordedShades(
  shades: readonly Pick<Shade, 'id' | 'number' | 'name'>[],
  line: Pick<Line, 'id' | 'name'>,
): Recorded {
  if (shades.length === 1) return { object: shadeObject(shades[0]!, line) }
  return { object: lineObject(line), after: countAndName(shades.map(shadeLabel)) }
}

/** A change of photographs: of the one, or of how many they are. */
export function recordedPhotographs(
  photographs: readonly Pick<Photograph, 'id' | 'title'>[],
): Recorded {
  if (photographs.length === 1) return { object: photographObject(photographs[0]!) }
  return { after: countAndName(photographs.map(({ title }) => title)) }
}

/** A change of ideas of one line: of the one, or of the line with how many they are. */
export function recordedIdeas(
  ideas: readonly Pick<NameIdea, 'id' | 'text'>[],
  line: Pick<Line, 'id' | 'name'>,
): Recorded {
  if (ideas.length === 1) return { object: ideaObject(ideas[0]!, line) }
  return { object: lineObject(line), after: countAndName(ideas.map(({ text }) => text)) }
}
