/** `npm run bench -- match board kit names`: prints figures beside their bars; exits 1 when one misses. */
import { printFigures, type Figure } from '../lib/figures.mjs'
import { benchBoard } from './board'
import { benchKit } from './kit'
import { benchMatch } from './match'
import { benchNames } from './names'

const BENCHES: Record<string, () => Promise<Figure[]>> = {
  match: benchMatch,
  board: benchBoard,
  kit: benchKit,
  names: benchNames,
}

async function main(names: string[]): Promise<number> {
  const unknown = names.filter((name) => !(name in BENCHES))
  if (names.length === 0 || unknown.length > 0) {
    console.error(`Say what to measure: npm run bench -- ${Object.keys(BENCHES).join(' | ')}`)
    return 1
  }
  const figures: Figure[] = []
  for (const name of names) figures.push(...(await BENCHES[name]!()))
  return printFigures(figures)
}

process.exitCode = await main(process.argv.slice(2))
