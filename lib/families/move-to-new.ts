import { randomUUID } from 'node:crypto'

import { isNeutral } from '@/lib/color/families'
import { labToOklch } from '@/lib/color/oklch'

import {
  withMoved,
  withNames,
  type ArrangedFamily,
  type ArrangedShade,
  type Arrangement,
} from './arrangement'

/** Shades put into a family of their own, pinned, named by their colours, behind another family. */
export function moveToNew(
  before: Arrangement,
  shades: readonly ArrangedShade[],
  behind: ArrangedFamily,
): { after: Arrangement; made: ArrangedFamily } {
  const id = randomUUID()
  const neutral = shades.every(({ lab }) => isNeutral(labToOklch(lab)))
  const place = before.families.indexOf(behind) + 1
  const families = [...before.families]
  families.splice(place, 0, { id, name: '', nameGiven: false, neutral })
  const ids = new Set(shades.map((shade) => shade.id))
  const moved = withMoved({ ...before, families }, ids, id, true)
  const after = withNames(moved, (family) => family.id === id)
  return { after, made: after.families[place]! }
}
