import type { Finding } from './finding'
import { heardApart } from './pronounce'
import { NEAR } from './sound-distance'
import { sourceOf } from './source-of'
import { initialsOf, proposeCodes } from './stock-codes'
import { headWords, stemOf, wordsOf } from './words'

/** One shade of a line that has a name. */
export interface NamedShade {
  id: string
  /** `14` */
  number: string
  name: string
  /** the tonal family it stands in; shades are given in the order of the line */
  family: string | null
}

/** What stands out when the names of a line are looked at together. */
export interface LineReport {
  findings: Finding[]
  /** a short code for each shade, by id; no two alike */
  codes: Readonly<Record<string, string>>
  /** characters of the shortest, the middle and the longest name; null without names */
  lengths: { least: number; middle: number; most: number } | null
  /** how many names play on a saying, and which saying each does, by id */
  wordplay: { share: number; sources: Readonly<Record<string, string>> }
}

/** More of a line than this in one manner, and the manner tires. */
const MUCH_WORDPLAY = 0.7
const OFTEN = 3
/** Longest name against the middle one. */
const SPREAD = 2.2

const list = (shades: readonly NamedShade[]): string =>
  shades.map(({ number, name }) => `${number} “${name}”`).join(', ')

function groupBy(
  shades: readonly NamedShade[],
  keysOf: (shade: NamedShade) => Iterable<string>,
): Map<string, NamedShade[]> {
  const groups = new Map<string, NamedShade[]>()
  for (const shade of shades)
    for (const key of new Set(keysOf(shade))) groups.set(key, [...(groups.get(key) ?? []), shade])
  return groups
}

/** Looks at the names of a line together; a pair of neighbours and a pun on each name are looked for. */
export function checkLine(shades: readonly NamedShade[]): LineReport {
  const findings: Finding[] = []
  const find = (what: string, why: string, grade: Finding['grade'] = 'note') =>
    findings.push({ check: 'line', grade, what, why, sure: 'certain' })

  const heads = new Map(
    shades.map((shade) => [shade.id, headWords(wordsOf(shade.name)).map(stemOf)]),
  )
  for (const [word, those] of groupBy(shades, ({ id }) => heads.get(id)!))
    if (those.length >= OFTEN)
      find(
        `“${word}” stands in ${those.length} names: ${list(those)}.`,
        'A word that comes back too often no longer tells shades apart.',
      )

  for (const [initials, those] of groupBy(shades, ({ name }) => [initialsOf(name)]))
    if (initials && those.length > 1)
      find(
        `${list(those)} have the initials ${initials}.`,
        'As stock codes they would collide; each has a code of its own below.',
      )

  for (const [at, shade] of shades.entries()) {
    const next = shades[at + 1]
    if (!next || shade.family === null || shade.family !== next.family) continue
    const alike = alikeBy(shade, next, heads)
    if (alike)
      find(
        `${list([shade, next])} stand side by side and ${alike}.`,
        'Neighbours of one family are the ones that customers mix up.',
        'warning',
      )
  }

  const lengths = [...shades.map(({ name }) => name.length)].sort((a, b) => a - b)
  const middle = lengths[lengths.length >> 1]
  const longest = shades.filter(
    ({ name }) => middle && name.length > SPREAD * middle && name.length > 20,
  )
  if (longest.length > 0)
    find(
      `${list(longest)} ${longest.length > 1 ? 'are' : 'is'} far longer than the rest.`,
      'On a row of ball bands one long name looks like a mistake.',
    )

  const sources = Object.fromEntries(
    shades.flatMap(({ id, name }) => {
      const found = sourceOf(name)
      return found ? [[id, found.source]] : []
    }),
  )
  const share = shades.length > 0 ? Object.keys(sources).length / shades.length : 0
  if (shades.length >= 5 && share > MUCH_WORDPLAY)
    find(
      `${Math.round(100 * share)} % of the names play on a saying.`,
      'A plain name here and there lets the jokes breathe.',
    )
  for (const [source, those] of groupBy(shades, ({ id }) => (sources[id] ? [sources[id]] : [])))
    if (those.length > 1)
      find(`${list(those)} play on the same saying, “${source}”.`, 'A joke works once.', 'warning')

  const codes = proposeCodes(shades.map(({ name }) => name))
  return {
    findings,
    codes: Object.fromEntries(shades.map(({ id }, at) => [id, codes[at]!])),
    lengths: middle ? { least: lengths[0]!, middle, most: lengths.at(-1)! } : null,
    wordplay: { share, sources },
  }
}

function alikeBy(
  one: NamedShade,
  other: NamedShade,
  heads: ReadonlyMap<string, readonly string[]>,
): string | null {
  const [mine, theirs] = [heads.get(one.id)!, heads.get(other.id)!]
  const shared = mine.find((word) => theirs.includes(word))
  if (shared) return `share “${shared}”`
  if (heardApart(one.name, other.name, NEAR) <= NEAR) return 'sound alike'
  if (mine[0] && mine[0].slice(0, 4) === theirs[0]?.slice(0, 4)) return 'begin alike'
  return null
}
