import { deltaE00 } from '../color/ciede2000'
import { labToOklch } from '../color/oklch'
import type { Lab } from '../color/types'
import { colorWordsIn } from './color-words'
import type { Finding } from './finding'
import { wordsOf } from './words'

/** ΔE00 (lightness counted half, as on yarn) from where on a name speaks of another colour. */
export const SUGGESTS_ANOTHER = 22

/**
 * Where the plain colour terms hold, in OKLCH: hue from–to in degrees (over 360 where it turns),
 * lightness and chroma from–to. A hundred shades may be called blue, however far from one blue.
 * @source 5th and 95th percentiles over the names of the colour survey (CC0), widened by 10° and a
 *   little lightness and chroma
 */
const REGIONS: Record<string, { h: [number, number]; L: [number, number]; C: [number, number] }> = {
  red: { h: [5, 45], L: [0.3, 0.7], C: [0.1, 0.4] },
  orange: { h: [28, 76], L: [0.5, 0.86], C: [0.1, 0.4] },
  yellow: { h: [82, 130], L: [0.68, 1], C: [0.07, 0.4] },
  green: { h: [105, 175], L: [0.25, 0.96], C: [0.03, 0.4] },
  blue: { h: [185, 288], L: [0.15, 0.97], C: [0.03, 0.4] },
  purple: { h: [290, 350], L: [0.18, 0.82], C: [0.05, 0.4] },
  pink: { h: [322, 393], L: [0.54, 0.94], C: [0.04, 0.4] },
  brown: { h: [25, 106], L: [0.2, 0.68], C: [0.03, 0.16] },
  black: { h: [0, 360], L: [0, 0.27], C: [0, 0.05] },
  white: { h: [0, 360], L: [0.92, 1], C: [0, 0.05] },
  grey: { h: [0, 360], L: [0.3, 0.93], C: [0, 0.04] },
}
REGIONS.gray = REGIONS.grey!

/** Whether a plain colour term (`blue`) may be said of a colour (Lab D65); null for any other word. */
export function isCalled(term: string, lab: Lab): boolean | null {
  const region = REGIONS[term]
  if (!region) return null
  const { l, c, h } = labToOklch(lab)
  const inside = (value: number, [from, to]: [number, number]) => value >= from && value <= to
  return (
    inside(l, region.L) && inside(c, region.C) && (inside(h, region.h) || inside(h + 360, region.h))
  )
}

/** How far the colours that a word calls to mind are from a shade, in ΔE00 with kL 2. */
export const suggestedApart = (labs: readonly Lab[], shade: Lab): number =>
  Math.min(...labs.map((lab) => deltaE00(lab, shade, { kL: 2 })))

/**
 * Whether a name calls to mind another colour than its shade's (Lab D65): none of its colour words
 * is near. A caution: a name may want the contrast.
 */
export function checkColor(name: string, shade: Lab): Finding[] {
  const suggested = colorWordsIn(wordsOf(name)).map(({ words, labs, weak }) => {
    const apart = suggestedApart(labs, shade)
    return {
      words,
      apart,
      weak,
      suits: isCalled(words, shade) === true || apart <= SUGGESTS_ANOTHER,
    }
  })
  if (suggested.length === 0 || suggested.some(({ suits }) => suits)) return []
  const named = suggested.filter(({ weak }) => !weak)
  const nearest = (named.length > 0 ? named : suggested).reduce((a, b) =>
    a.apart <= b.apart ? a : b,
  )
  return [
    {
      check: 'color',
      grade: nearest.weak ? 'note' : 'warning',
      what: `“${nearest.words}” calls another colour to mind.`,
      why: `The nearest colour that goes by it is ΔE00 ${nearest.apart.toFixed(0)} from the shade; up to ${SUGGESTS_ANOTHER} nobody would wonder.`,
      sure: !nearest.weak && nearest.apart > 2 * SUGGESTS_ANOTHER ? 'likely' : 'perhaps',
    },
  ]
}
