/**
 * `npm run names -- hear "first" "second"` prints how two names are said and how far apart they
 * sound; `npm run names -- play --lab 45,-20,10` prints wordplay for a shade, best first, as JSON.
 * The product's own code, without database or web. Exits 2 when what was asked makes no sense.
 */
import { parseArgs } from 'node:util'

import { playOnWords } from '@/lib/naming/play'
import { heardApart, pronounceName, respellName } from '@/lib/naming/pronounce'
import { NEAR, SAME } from '@/lib/naming/sound-distance'

const USAGE = `npm run names -- hear "first name" "second name"
npm run names -- play --lab 45,-20,10 [--limit 20] [--fibre wool]…`

function printSpoken(name: string): void {
  const spoken = pronounceName(name)
  if (spoken.sounds.length === 0) throw new RangeError(`“${name}” has nothing to say.`)
  console.log(`${name}: ${respellName(spoken)}`)
  for (const sound of spoken.sounds) console.log(`  ${sound.join(' ')}`)
  for (const { word, source } of spoken.words)
    if (source === 'guess') console.log(`  “${word}” is in no dictionary: guessed by its letters.`)
}

function hear(names: string[]): void {
  const [first, second] = names
  if (!first || !second || names.length > 2) throw new RangeError(USAGE)
  for (const name of [first, second]) printSpoken(name)
  const apart = heardApart(first, second)
  const verdict =
    apart <= SAME ? 'sounds the same' : apart <= NEAR ? 'sounds near' : 'sounds unlike'
  console.log(`${apart.toFixed(3)}: ${verdict} (near is up to ${NEAR})`)
}

function play(lab: string | undefined, limit: string, fibers: string[] | undefined): void {
  const numbers = (lab ?? '').split(',').map(Number)
  const [L, a, b] = numbers
  if (numbers.length !== 3 || !numbers.every(Number.isFinite) || L! < 0 || L! > 100)
    throw new RangeError(USAGE)
  const most = Number(limit)
  if (!Number.isInteger(most) || most < 1) throw new RangeError(USAGE)
  console.log(JSON.stringify(playOnWords([L!, a!, b!], { limit: most, fibers }), null, 2))
}

function main(): number {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: {
      lab: { type: 'string' },
      limit: { type: 'string', default: '20' },
      fibre: { type: 'string', multiple: true },
    },
  })
  const [what, ...rest] = positionals
  if (what === 'hear') hear(rest)
  else if (what === 'play') play(values.lab, values.limit, values.fibre)
  else throw new RangeError(USAGE)
  return 0
}

try {
  process.exitCode = main()
} catch (error) {
  console.error((error as Error).message)
  process.exitCode = 2
}
