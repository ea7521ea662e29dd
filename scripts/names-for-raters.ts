/**
 * `npm run names-for-raters` prints the sheet that each rater fills, as Markdown: for twenty shades of
 * the demo line the ten best plays on words each. `npm run names-for-raters -- key` prints the same
 * with the sayings. `npm run names-for-raters -- count one.md two.md three.md` reads the filled sheets
 * and prints the counts by shade and the raters' agreement. Exits 2 when what was asked makes no sense.
 */
import { readFileSync } from 'node:fs'

import { screenColor } from '@/lib/color/gamut'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { playOnWords } from '@/lib/naming/play'
import { demoBrands } from '@/seeders/demo/brands'

import { countSheets, readSheet, writeSheet } from './lib/rater-sheets'

const SHADES = 20
const NAMES = 10

function dealNames() {
  const [{ lines }] = demoBrands as [(typeof demoBrands)[number]]
  const [line] = lines as [(typeof lines)[number]]
  const shades = line.shades.filter(({ status }) => status !== 'retired')
  const fibers = line.fibers.map(({ fiber }) => fiber)
  const taken: string[] = []
  // Twenty spread over the line, so that every family is judged.
  const dealt = Array.from({ length: SHADES }, (_, at) => {
    const { number, lab, hex } = shades[Math.floor((at * shades.length) / SHADES)]!
    const color: Lab = lab ? [lab.L, lab.a, lab.b] : hexToLab(hex!)
    const plays = playOnWords(color, { fibers, limit: NAMES, taken })
    // As in the product: what one shade has taken is not proposed to the next.
    taken.push(...plays.map(({ name }) => name))
    return { shade: number, hex: screenColor(color).hex, plays }
  })
  return { title: `${line.name}: ${SHADES} shades × ${NAMES} names`, dealt }
}

function main([what, ...files]: string[]): void {
  if (what === 'count') {
    console.log(countSheets(files.map((file) => readSheet(readFileSync(file, 'utf8')))))
    return
  }
  if (what && what !== 'key')
    throw new RangeError('Ask for nothing, for `key`, or for `count` and files.')
  const { title, dealt } = dealNames()
  if (what === 'key')
    for (const { shade, hex, plays } of dealt) {
      console.log(`\n## Shade ${shade} (${hex})\n`)
      for (const { name, source } of plays) console.log(`- ${name} (${source})`)
    }
  else
    console.log(
      writeSheet(
        title,
        dealt.map(({ plays, ...shade }) => ({ ...shade, names: plays.map(({ name }) => name) })),
      ),
    )
}

try {
  main(process.argv.slice(2))
} catch (error) {
  console.error((error as Error).message)
  process.exitCode = 2
}
