import { isNeutral } from '@/lib/color/families'
import { termOf } from '@/lib/color/family-names'
import { labToOklch } from '@/lib/color/oklch'
import type { Lab } from '@/lib/color/types'

import { percent } from './compose'
import type { ExportCombination, ExportDescription, ExportPhotograph } from './description'

/** A colour in plain words, for those who do not see it: "deep blue", "pale grey". */
export function colorInWords(lab: Lab): string {
  const color = labToOklch(lab)
  if (isNeutral(color)) {
    if (color.l > 0.93) return 'white'
    if (color.l > 0.85 && color.c > 0.012) return 'off-white'
    if (color.l < 0.25) return 'black'
    return color.l > 0.75 ? 'pale grey' : color.l < 0.45 ? 'dark grey' : 'grey'
  }
  const term = termOf(color)
  const weight = color.l > 0.8 ? 'pale ' : color.l < 0.42 ? 'deep ' : color.c < 0.06 ? 'soft ' : ''
  return `${weight}${term}`
}

/** What a combination is made of, in one sentence that needs no eyes. */
export function altText(combination: ExportCombination): string {
  const yarns = combination.shades.map(
    ({ label, lab, share }) => `${label}, ${colorInWords(lab)}, ${percent(share)}`,
  )
  const { photograph } = combination
  const shown = photograph?.bytes ? ` Above it, a photograph: ${ended(photograph.alt)}` : ''
  return `${spaced(combination.title)}: yarn wound round a card in ${yarns.length} bands. From top to bottom: ${yarns.join('; ')}.${shown}`
}

/** What stands under a combination's picture. */
export function captionOf(
  { brand, line }: Pick<ExportDescription, 'brand' | 'line'>,
  { title, shades, photograph }: ExportCombination,
): string {
  const labels = shades.map(({ label }) => label)
  // A comma within a name would make two of it.
  const between = labels.some((label) => label.includes(',')) ? '; ' : ', '
  const five = `${labels.slice(0, -1).join(between)} and ${labels.at(-1)}`
  const credit = photograph?.bytes ? ` Photograph: ${creditOf(photograph)}.` : ''
  return `${spaced(title)}: ${five}, from ${spaced(line)} by ${spaced(brand)}.${credit}`
}

/** Whose a photograph is, and under which licence. */
export const creditOf = ({ credit, licence }: ExportPhotograph): string =>
  `${spaced(credit)} (${licence})`

const spaced = (text: string) => text.replace(/\s+/g, ' ').trim()

const ended = (text: string) => (/[.!?…]$/.test(spaced(text)) ? spaced(text) : `${spaced(text)}.`)
