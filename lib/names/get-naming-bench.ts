import type { Actor } from '@/lib/auth/actor'
import type { Line } from '@/models'
import { NameIdea, Shade } from '@/models'
import { shadeLabel, type ShadeView } from '@/lib/shades/present'
import { BY_POSITION, getShade, type ShadeDetail } from '@/lib/shades/queries'

import type { NameState } from './constants'
import { presentSettings, type IdeaView, type NamingSettingsView } from './present'
import { presentIdeas, readNaming } from './queries'

/** A shade as one comes to it from another. */
export interface ShadeStep {
  id: string
  label: string
}

/** A shade with all that is thought of for its name. */
export interface NamingBench {
  line: Line
  settings: NamingSettingsView
  shade: ShadeView
  neighbours: ShadeDetail['neighbours']
  /** What is decided first, what is put by last; then by age. */
  ideas: IdeaView[]
  /** The shades beside it in the line's order. */
  before: ShadeStep | null
  after: ShadeStep | null
  /** The next in that order that has no approved name, from the beginning again after the last. */
  nextUnnamed: ShadeStep | null
  /** Shades of the line, and how many of them have an approved name. */
  total: number
  named: number
}

const ORDER: readonly NameState[] = ['approved', 'in-review', 'returned', 'draft', 'put-by']
const placeOf = ({ state }: IdeaView) => ORDER.indexOf(state)

/**
 * The naming bench of one shade. Some dozen queries, however many ideas it has.
 * @throws ForbiddenError, NotFoundError
 */
export async function getNamingBench(
  actor: Actor,
  lineSlug: string,
  shadeId: string,
): Promise<NamingBench> {
  const naming = await readNaming(actor, lineSlug)
  const { shade, neighbours } = await getShade(actor, lineSlug, shadeId)
  const where = { brandId: actor.brandId, lineId: naming.line.id }
  const [ideas, shades] = await Promise.all([
    NameIdea.findAll({
      where: { ...where, shadeId },
      order: [
        ['createdAt', 'ASC'],
        ['id', 'ASC'],
      ],
    }),
    Shade.findAll({
      attributes: ['id', 'number', 'name'],
      where,
      order: BY_POSITION,
      raw: true,
    }),
  ])
  const views = await presentIdeas(ideas, naming)
  const at = shades.findIndex(({ id }) => id === shadeId)
  const others = [...shades.slice(at + 1), ...shades.slice(0, Math.max(0, at))]
  const step = (one: (typeof shades)[number] | undefined): ShadeStep | null =>
    one ? { id: one.id, label: shadeLabel(one) } : null
  return {
    line: naming.line,
    settings: presentSettings(naming.settings, naming.frozen),
    shade,
    neighbours,
    ideas: views.sort((a, b) => placeOf(a) - placeOf(b)),
    before: step(shades[at - 1]),
    after: step(shades[at + 1]),
    nextUnnamed: step(others.find(({ name }) => name === null)),
    total: shades.length,
    named: shades.filter(({ name }) => name !== null).length,
  }
}
