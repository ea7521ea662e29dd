import { createRequire } from 'node:module'

import { openSync, type Font } from 'fontkit'

import type { FontMetrics } from '@/lib/naming/label'

/** The metrics of the face that labels are set in, read from the font file of its package. */
export function loadLabelFont(
  file = '@fontsource/besley/files/besley-latin-400-normal.woff',
): FontMetrics {
  const font = openSync(createRequire(import.meta.url).resolve(file)) as Font
  const advances = new Map<string, number | null>()
  const pairs = new Map<string, number>()
  const advance = (character: string): number | null => {
    if (!advances.has(character)) {
      const code = character.codePointAt(0)!
      const known = font.hasGlyphForCodePoint(code)
      advances.set(character, known ? font.glyphForCodePoint(code).advanceWidth : null)
    }
    return advances.get(character)!
  }
  const kerning = (left: string, right: string): number => {
    const pair = left + right
    if (!pairs.has(pair)) {
      const [first, second] = [advance(left), advance(right)]
      const known = first !== null && second !== null
      pairs.set(pair, known ? font.layout(pair).advanceWidth - first - second : 0)
    }
    return pairs.get(pair)!
  }
  return { unitsPerEm: font.unitsPerEm, advance, kerning }
}
