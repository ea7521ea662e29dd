import { fontFiles } from '@/lib/exports/typeset'
import type { FontMetrics } from '@/lib/naming/label'

let loaded: FontMetrics | undefined

/** The metrics of the face that labels are set in, all its files together; read once. */
export function labelFont(): FontMetrics {
  return (loaded ??= measure())
}

function measure(): FontMetrics {
  const fonts = fontFiles('title').map(({ font }) => font)
  const advances = new Map<string, number | null>()
  const pairs = new Map<string, number>()
  const fontOf = (character: string) =>
    fonts.find((font) => font.hasGlyphForCodePoint(character.codePointAt(0)!))
  const advance = (character: string): number | null => {
    if (!advances.has(character)) {
      const font = fontOf(character)
      const code = character.codePointAt(0)!
      advances.set(character, font ? font.glyphForCodePoint(code).advanceWidth : null)
    }
    return advances.get(character)!
  }
  const kerning = (left: string, right: string): number => {
    const pair = left + right
    if (!pairs.has(pair)) {
      const font = fontOf(left)
      const [first, second] = [advance(left), advance(right)]
      // Two letters of two files know nothing of each other.
      const known = font && font === fontOf(right) && first !== null && second !== null
      pairs.set(pair, known ? font.layout(pair).advanceWidth - first - second : 0)
    }
    return pairs.get(pair)!
  }
  return { unitsPerEm: fonts[0]!.unitsPerEm, advance, kerning }
}
