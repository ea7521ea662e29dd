import { defineConfig, parse as parseTokens } from '@terrazzo/parser'
import { parse as parseCsv } from 'csv-parse/sync'
import { describe, expect, test } from 'vitest'

import { creditsText } from '@/lib/exports/credits'
import { fileNames } from '@/lib/exports/file-names'
import { shadeTable } from '@/lib/exports/table'
import { designTokens, EXTENSION, styleSheet } from '@/lib/exports/tokens'
import { altText, captionOf, colorInWords } from '@/lib/exports/words'
import {
  exportCombination,
  exportDescription,
  exportPhotograph,
  exportShades,
  HOSTILE,
  hostileDescription,
} from '../../factories/kit-description'

describe('design tokens', () => {
  test('are read by a parser of the format, with hostile words too', async () => {
    for (const description of [
      exportDescription(exportCombination()),
      await hostileDescription(),
    ]) {
      const config = defineConfig({}, { cwd: new URL('file:///') })
      const { tokens } = await parseTokens(
        [{ filename: new URL('file:///shades.tokens.json'), src: designTokens(description) }],
        { config },
      )
      expect(Object.keys(tokens)).toHaveLength(5 * description.combinations.length)
    }
  })

  test('hold what a screen shows as the value and the measured Lab beside it', async () => {
    const combination = exportCombination()
    const shade = combination.shades[1]!
    const file = JSON.parse(designTokens(exportDescription(combination)))
    const token = file['low-sun-high-bracken'].cc1
    expect(token.$value.hex).toBe(shade.hex)
    expect(token.$value.colorSpace).toBe('srgb')
    const channels = token.$value.components.map((value: number) =>
      Math.round(value * 255)
        .toString(16)
        .padStart(2, '0'),
    )
    expect(`#${channels.join('')}`).toBe(shade.hex)
    expect(token.$extensions[EXTENSION]).toMatchObject({
      L: shade.lab[0],
      a: shade.lab[1],
      b: shade.lab[2],
      illuminant: 'D65',
      observer: 10,
    })
  })
})

describe('custom properties', () => {
  test('hold each shade under a name of its own, and nothing people wrote can end a comment', async () => {
    const description = await hostileDescription()
    const css = styleSheet(description)
    const bare = css.replace(/\/\*[\s\S]*?\*\//g, '')
    const lines = bare.split('\n').filter((line) => line.trim())
    expect(lines.at(0)).toBe(':root {')
    expect(lines.at(-1)).toBe('}')
    const declared = lines.slice(1, -1).map((line) => {
      const match = /^ {2}(--[a-z][a-z0-9-]*): (#[0-9a-f]{6}); ?$/.exec(line)
      expect(match, line).not.toBeNull()
      return match![1]
    })
    expect(declared).toHaveLength(5 * HOSTILE.length)
    expect(new Set(declared).size).toBe(declared.length)
  })
})

describe('the table', () => {
  test('is CSV of a row a place, with readings to the last digit', () => {
    const shades = exportShades([
      [54.215, -12.03, 8.1],
      ...exportShades()
        .slice(1)
        .map(({ lab }) => lab),
    ])
    const text = shadeTable(exportDescription(exportCombination({ shades })))
    expect(text).toMatch(/\r\n$/)
    const rows = parseCsv(text, { bom: true, columns: true }) as Record<string, string>[]
    expect(rows).toHaveLength(5)
    expect(rows[0]).toMatchObject({
      combination: 'Low Sun, High Bracken',
      place: '1',
      role: 'MC',
      shade: 'No. 1',
      L: '54.215',
      a: '-12.03',
      observer: '10',
    })
  })

  test('runs no formula: text that begins like one begins with an apostrophe', async () => {
    const rows = parseCsv(shadeTable(await hostileDescription()), { bom: true }) as string[][]
    const words = rows.slice(1).flatMap((row) => [row[0]!, row[2]!, row[3]!, row[4]!])
    expect(words.filter((cell) => /^[=+\-@\t\r\n]/.test(cell))).toEqual([])
    expect(words).toContain(`'${HOSTILE[2]}`)
  })
})

describe('words for pictures', () => {
  test('name the shades and say their colours plainly, without codes', async () => {
    const combination = exportCombination({ photograph: await exportPhotograph() })
    const alt = altText(combination)
    expect(alt).toContain('No. 1,')
    expect(alt).toContain('31 %')
    expect(alt).toContain('Bracken above a small dark lake.')
    expect(alt).not.toMatch(/#[0-9a-f]{3}|L\*|\bLab\b/)
    expect(captionOf(exportDescription(), combination)).toBe(
      'Low Sun, High Bracken: No. 1, No. 2, No. 3, No. 4 and No. 5, from Heronsway DK by Teasel & Tarn. Photograph: Ines Thornbeck (Own work).',
    )
  })

  test('keep names with a comma apart from each other', () => {
    const [first, ...rest] = exportShades()
    const shades = [{ ...first!, label: 'Gorse, Naturally' }, ...rest]
    expect(captionOf(exportDescription(), exportCombination({ shades }))).toContain(
      ': Gorse, Naturally; No. 2; No. 3; No. 4 and No. 5, from',
    )
  })

  test('do not speak of a photograph that is not shown', async () => {
    const combination = exportCombination({ photograph: await exportPhotograph({ bytes: null }) })
    expect(altText(combination)).not.toContain('photograph')
    expect(captionOf(exportDescription(), combination)).not.toContain('Photograph')
    expect(creditsText(exportDescription(combination))).toContain('Not shown in the pictures')
  })

  test.each([
    [[97, 0, 1], 'white'],
    [[89, 1.1, 7], 'off-white'],
    [[50, 0, 0], 'grey'],
    [[8, 0, 0], 'black'],
    [[30, 15, -50], 'deep blue'],
    [[45, -30, 30], 'green'],
  ] as const)('call %j %s', (lab, words) => {
    expect(colorInWords(lab)).toBe(words)
  })
})

describe('names of files', () => {
  test('are small letters, digits and hyphens, no two alike', () => {
    const names = [...fileNames(HOSTILE.map((title, id) => ({ id: String(id), title }))).values()]
    for (const name of names) expect(name).toMatch(/^[a-z][a-z0-9]*(-[a-z0-9]+)*$/)
    expect(new Set(names).size).toBe(HOSTILE.length)
  })
})
