import { fleissKappa } from './fleiss-kappa'

/** What a rater may write: good in both, grammar alone, the saying alone, neither. */
export const MARKS = ['y', 'g', 's', 'n'] as const
export type Mark = (typeof MARKS)[number]

/** One name as one rater judged it. */
export interface Judged {
  shade: string
  name: string
  mark: Mark
}

/** Names that are to be judged, by shade. */
export interface Dealt {
  shade: string
  hex: string
  names: readonly string[]
}

/** The sheet that one rater fills, as Markdown; without the sayings, which the rater has to hear. */
export function writeSheet(title: string, dealt: readonly Dealt[]): string {
  const shades = dealt.map(
    ({ shade, hex, names }) =>
      `## Shade ${shade} (${hex})\n\n| | name | mark | saying heard |\n| --- | --- | --- | --- |\n` +
      names.map((name, at) => `| ${at + 1} | ${name} |  |  |`).join('\n'),
  )
  return `# ${title}

Read each name aloud once, and look nothing up. Write the saying that you hear, if you hear one, and a
mark: **y** when it is well-formed English and you knew the saying at once, **g** for well formed alone,
**s** for the saying alone, **n** for neither. A y without the saying beside it counts as g.

${shades.join('\n\n')}
`
}

/**
 * What stands in a filled sheet. Throws RangeError at a line with no mark, or one that there is not.
 */
export function readSheet(text: string): Judged[] {
  const judged: Judged[] = []
  let shade = ''
  for (const line of text.split('\n')) {
    shade = /^## Shade (\S+)/.exec(line)?.[1] ?? shade
    const cells = line.split('|').map((cell) => cell.trim())
    if (!/^\d+$/.test(cells[1] ?? '')) continue
    const [, , name, written, saying] = cells
    const mark = MARKS.find((one) => one === written?.toLowerCase())
    if (!mark) throw new RangeError(`Shade ${shade}, “${name}”: “${written}” is no mark.`)
    judged.push({ shade, name: name!, mark: mark === 'y' && !saying ? 'g' : mark })
  }
  return judged
}

const percent = (share: number): string => `${(100 * share).toFixed(1)} %`
const told = (kappa: number | null): string => (kappa === null ? 'undefined' : kappa.toFixed(3))

/**
 * The table of counts by shade and the raters' agreement, as Markdown. Throws RangeError when the
 * sheets are fewer than two or not of the same names in the same order.
 */
export function countSheets(sheets: readonly (readonly Judged[])[]): string {
  const [first, ...others] = sheets
  if (!first || others.length === 0) throw new RangeError('Give the filled sheets of all raters.')
  const same = (one: Judged, other: Judged | undefined) =>
    one.shade === other?.shade && one.name === other.name
  for (const sheet of others)
    if (sheet.length !== first.length || !first.every((one, at) => same(one, sheet[at])))
      throw new RangeError('The sheets are not of the same names in the same order.')

  const marks = first.map((_, at) => sheets.map((sheet) => sheet[at]!.mark))
  const agreed = marks.map(
    (those) => those.filter((mark) => mark === 'y').length > sheets.length / 2,
  )
  const shades = [...new Set(first.map(({ shade }) => shade))]
  const rows = shades.map((shade) => {
    const at = first.flatMap((one, number) => (one.shade === shade ? [number] : []))
    const counts = sheets.map((sheet) => at.filter((number) => sheet[number]!.mark === 'y').length)
    return { shade, counts, majority: at.filter((number) => agreed[number]).length, of: at.length }
  })
  const five = rows.filter(({ majority }) => majority >= 5).length
  const both = fleissKappa(
    marks.map((those) => {
      const yes = those.filter((mark) => mark === 'y').length
      return [yes, those.length - yes]
    }),
  )
  const all = fleissKappa(
    marks.map((those) => MARKS.map((mark) => those.filter((one) => one === mark).length)),
  )
  const raters = sheets.map((_, at) => `rater ${at + 1}`)
  return `| shade | ${raters.join(' | ')} | majority | of |
| --- | ${raters.map(() => '---').join(' | ')} | --- | --- |
${rows.map(({ shade, counts, majority, of }) => `| ${shade} | ${counts.join(' | ')} | ${majority} | ${of} |`).join('\n')}

Shades with at least five names that a majority marked y: ${five} of ${rows.length}. Names that a majority
marked y: ${agreed.filter(Boolean).length} of ${marks.length}.

| agreement | observed | by chance | Fleiss' kappa |
| --- | --- | --- | --- |
| y or not | ${percent(both.observed)} | ${percent(both.byChance)} | ${told(both.kappa)} |
| y, g, s, n | ${percent(all.observed)} | ${percent(all.byChance)} | ${told(all.kappa)} |
`
}
