import { authorize, type Actor } from '@/lib/auth/actor'
import { findGaps } from '@/lib/color/gaps'
import { screenColor } from '@/lib/color/gamut'
import { lightnessLadder, nearTwins } from '@/lib/color/range-study'
import { pairsLost, seenAs, VISIONS, type Vision } from '@/lib/color/vision'
import { getLine } from '@/lib/lines/queries'
import { Family, Shade, type Line } from '@/models'

import { termsOf } from './color'
import { STUDY_LIMITS } from './constants'
import { nextNumbers } from './next-number'
import { canReadShades } from './policy'
import {
  presentShade,
  SHADE_VIEW_COLUMNS,
  type RangeStudy,
  type ShadeView,
  type StudiedFamily,
  type Told,
} from './present'
import { BY_POSITION } from './queries'

/** A line and its study; null when it has more shades than can be studied while somebody waits. */
export interface LineStudy {
  line: Line
  shadeCount: number
  study: RangeStudy | null
}

/**
 * Studies the range of a line: its shades that are not retired, near-twins under `twins` ΔE00. Three
 * queries. Every pair is compared: about 0.1 s for 500 shades.
 * @throws NotFoundError
 */
export async function readRangeStudy(
  actor: Actor,
  lineSlug: string,
  { twins: limit }: { twins: number },
): Promise<LineStudy> {
  authorize(actor, canReadShades)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const [rows, families] = await Promise.all([
    Shade.findAll({
      attributes: [...SHADE_VIEW_COLUMNS] as string[],
      raw: true,
      where,
      order: BY_POSITION,
      limit: STUDY_LIMITS.shades + 1,
    }),
    Family.findAll({ attributes: ['id', 'name'], raw: true, where, order: ['position', 'id'] }),
  ])
  const shadeCount = rows.length
  if (shadeCount > STUDY_LIMITS.shades) return { line, shadeCount, study: null }

  const shades = rows.filter(({ status }) => status !== 'retired').map(presentShade)
  const labs = shades.map(({ lab }) => lab)
  const at = (index: number): ShadeView => shades[index]!
  const pairOf = <Pair extends { first: number; second: number }>(pair: Pair) => ({
    ...pair,
    first: at(pair.first),
    second: at(pair.second),
  })
  const told = <Pair, Shown>(pairs: Pair[], show: (pair: Pair) => Shown): Told<Shown> => ({
    pairs: pairs.slice(0, STUDY_LIMITS.pairs).map(show),
    total: pairs.length,
  })

  const twins = nearTwins(labs, limit)
  const nearest = twins[0] ?? nearTwins(labs, Infinity)[0]
  const lostPairs = pairsLost(labs)
  const lostTo = (vision: Vision) =>
    told(
      lostPairs.filter((pair) => pair.vision === vision),
      (pair) => {
        const seen = (index: number) => screenColor(seenAs(labs[index]!, vision)).hex
        return { ...pairOf(pair), seen: [seen(pair.first), seen(pair.second)] as [string, string] }
      },
    )
  const gaps = findGaps(labs)
  const numbers = nextNumbers(
    rows.map(({ number }) => number),
    gaps.length,
  )
  const wide = shades.filter(({ observer }) => observer === 10).length
  return {
    line,
    shadeCount,
    study: {
      shadeCount: shades.length,
      retiredCount: rows.length - shades.length,
      isMixed: wide > 0 && wide < shades.length,
      terms: termsOf({ observer: 2 * wide > shades.length ? 10 : 2 }),
      twins: told(twins, pairOf),
      nearest: nearest ? pairOf(nearest) : null,
      lost: Object.fromEntries(VISIONS.map((vision) => [vision, lostTo(vision)])) as Record<
        Vision,
        ReturnType<typeof lostTo>
      >,
      families: studyFamilies(shades, families),
      gaps: gaps.map(({ target, nearest }, index) => ({
        lab: target,
        hex: screenColor(target).hex,
        number: numbers[index]!,
        nearest: nearest.map(({ index: shade, deltaE }) => ({ shade: at(shade), deltaE })),
      })),
    },
  }
}

/** The families that hold shades, in the sample book's order, and those in none last. */
function studyFamilies(
  shades: readonly ShadeView[],
  families: readonly Pick<Family, 'id' | 'name'>[],
): StudiedFamily[] {
  const none = { id: null, name: families.length > 0 ? 'In no family' : 'The whole line' }
  return [...families, none].flatMap(({ id, name }) => {
    const members = shades.filter(({ familyId }) => familyId === id)
    if (members.length === 0) return []
    const { order, ...ladder } = lightnessLadder(members.map(({ lab }) => lab))
    return [{ id, name, shades: order.map((index) => members[index]!), ladder }]
  })
}
