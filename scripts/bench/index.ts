/** `npm run bench -- match`: prints each figure beside its bar; exits 1 when one misses. */
import { benchMatch } from './match'

/** One measured figure beside what it has to reach. */
export interface Figure {
  what: string
  value: string
  bar: string
  /** Out of reach: the proven optimum itself lies beyond the bar on these pictures. */
  met: boolean | 'out of reach'
}

const BENCHES: Record<string, () => Promise<Figure[]>> = {
  match: benchMatch,
}

async function main(names: string[]): Promise<number> {
  const unknown = names.filter((name) => !(name in BENCHES))
  if (names.length === 0 || unknown.length > 0) {
    console.error(`Say what to measure: npm run bench -- ${Object.keys(BENCHES).join(' | ')}`)
    return 1
  }
  let missed = 0
  for (const name of names) {
    const figures = await BENCHES[name]!()
    const width = (key: 'what' | 'value') =>
      Math.max(...figures.map((figure) => figure[key].length))
    for (const { what, value, bar, met } of figures) {
      console.log(
        `${(met === true ? 'met' : met || 'MISSED').padEnd(12)}  ${what.padEnd(width('what'))}  ${value.padEnd(width('value'))}  bar: ${bar}`,
      )
      if (!met) missed++
    }
  }
  console.log(missed === 0 ? 'Every figure meets its bar.' : `${missed} missed.`)
  return missed === 0 ? 0 : 1
}

process.exitCode = await main(process.argv.slice(2))
