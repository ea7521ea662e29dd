import { parseHex } from '@/lib/color/srgb'

import type { ExportDescription, ExportShade } from './description'
import { fileNames, slugOf } from './file-names'
import { escapeMarkup } from './svg'

/** Where our part of a token's `$extensions` stands. */
export const EXTENSION = 'woadmap.measured'

const placeName = ({ role }: ExportShade) => slugOf(role)

/**
 * The shades as design tokens: a group a combination, a colour a place. The value is what a screen
 * shows; the measured Lab, which no colour space of the format holds, stands beside it.
 * @source Design Tokens Community Group, Format Module and Color Module 2025.10
 */
export function designTokens({ line, combinations }: ExportDescription): string {
  const names = fileNames(combinations)
  const groups = combinations.map((combination) => [
    names.get(combination.id),
    {
      $description: combination.title,
      ...Object.fromEntries(combination.shades.map((shade) => [placeName(shade), token(shade)])),
    },
  ])
  const file = { $description: line, $type: 'color', ...Object.fromEntries(groups) }
  return `${JSON.stringify(file, null, 2)}\n`
}

function token({ label, hex, share, lab, illuminant, observer }: ExportShade) {
  const components = (parseHex(hex) ?? []).map((channel) => Math.round(channel * 1e5) / 1e5)
  return {
    $type: 'color',
    $description: label,
    $value: { colorSpace: 'srgb', components, alpha: 1, hex },
    $extensions: {
      [EXTENSION]: { L: lab[0], a: lab[1], b: lab[2], illuminant, observer, share },
    },
  }
}

/** The shades as CSS custom properties: `--low-sun-mc`. */
export function styleSheet({ combinations }: ExportDescription): string {
  const names = fileNames(combinations)
  const properties = combinations.flatMap((combination) => [
    `  /* ${comment(combination.title)} */`,
    ...combination.shades.map(
      (shade) =>
        `  --${names.get(combination.id)}-${placeName(shade)}: ${shade.hex}; /* ${comment(shade.label)} */`,
    ),
  ])
  return [':root {', ...properties, '}', ''].join('\n')
}

/** Words inside a comment; they cannot end it, nor a style element around it. */
const comment = (words: string) =>
  escapeMarkup(words.replace(/\s+/g, ' ').replaceAll('*/', '* /').trim())
