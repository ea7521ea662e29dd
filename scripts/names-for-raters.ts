/**
 * `npm run names-for-raters`: the table that raters judge, as Markdown: for each of twenty shades of
 * the demo line its ten best plays on words, with the saying, and an empty column for each rater.
 */
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { playOnWords } from '@/lib/naming/play'
import { demoBrands } from '@/seeders/demo/brands'

const SHADES = 20
const NAMES = 10
const RATERS = 3

const [{ lines }] = demoBrands as [(typeof demoBrands)[number]]
const [line] = lines as [(typeof lines)[number]]
const shades = line.shades.filter(({ status }) => status !== 'retired')
/** Twenty spread over the line, so that every family is judged. */
const chosen = Array.from(
  { length: SHADES },
  (_, at) => shades[Math.floor((at * shades.length) / SHADES)]!,
)

console.log(`# ${line.name}: ${SHADES} shades × ${NAMES} names

Two questions a name, in one mark: is it grammatical, and would you recognise the saying without
being told? **y** for both, **g** for grammar alone, **s** for the saying alone, **n** for neither.
`)
const taken: string[] = []
for (const { number, lab, hex } of chosen) {
  const color: Lab = lab ? [lab.L, lab.a, lab.b] : hexToLab(hex!)
  console.log(`## Shade ${number} (Lab ${color.map((value) => value.toFixed(1)).join(', ')})\n`)
  const raters = Array.from({ length: RATERS }, (_, at) => `rater ${at + 1}`)
  console.log(`| | name | saying | ${raters.join(' | ')} |`)
  console.log(`| --- | --- | --- | ${raters.map(() => '---').join(' | ')} |`)
  const fibers = line.fibers.map(({ fiber }) => fiber)
  playOnWords(color, { fibers, limit: NAMES, taken }).forEach(({ name, source }, at) => {
    // As in the product: what one shade has taken is not proposed to the next.
    taken.push(name)
    console.log(`| ${at + 1} | ${name} | ${source} | ${raters.map(() => ' ').join(' | ')} |`)
  })
  console.log()
}
