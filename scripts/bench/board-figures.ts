/** Measures the board on the database of this environment; writes the figures to the file given. */
import { writeFileSync } from 'node:fs'

import { orderNow } from '@/components/board/board-state'
import { LANES } from '@/lib/combinations/constants'
import { getBoard } from '@/lib/combinations/get-board'
import { sequelize } from '@/models'
import { lanesOf, makeBoard, moveAtOnce, openBoard, type Editor } from '@/tests/factories/board'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

import type { Figure } from '../lib/figures.mjs'
import { seededRandom } from './line'
import { ms, timed } from './measure'

const MOVES = 100
const SEEDS = [1, 2, 3]

async function boards(): Promise<Figure[]> {
  const { owner } = await makeActors(await makeBrand())
  const measured = []
  for (const count of [30, 300]) {
    const line = await makeLine({ id: owner.brandId })
    const { id: photographId } = await makePhotograph(line)
    const values = { createdById: owner.personId, photographId }
    await makeBoard(line, await makeShades(line, 40), count, values)
    // The first time, everything is cold.
    await getBoard(owner, line.slug)
    const [{ answer, queries }, took] = await timed(() =>
      countQueries(() => getBoard(owner, line.slug)),
    )
    const { queries: idle } = await countQueries(() => getBoard(owner, line.slug, answer!.revision))
    measured.push({ queries, idle, took, bytes: JSON.stringify(answer).length })
  }
  const [few, many] = [measured[0]!, measured[1]!]
  return [
    {
      what: 'board: queries at 30 and at 300 combinations',
      value: `${few.queries} and ${many.queries} (${ms(many.took)}, ${Math.round(many.bytes / 1000)} kB of JSON at 300)`,
      bar: 'the same',
      met: few.queries === many.queries,
    },
    {
      what: 'board: queries of a look when nothing has changed',
      value: String(many.idle),
      bar: '1',
      met: many.idle === 1,
    },
  ]
}

async function editors(): Promise<Figure> {
  let refused = 0
  let untold = 0
  let apart = 0
  for (const seed of SEEDS) {
    const { owner, designer } = await makeActors(await makeBrand())
    const line = await makeLine({ id: owner.brandId })
    await makeBoard(line, await makeShades(line, 8), 30)
    const both = [await openBoard(owner, line.slug), await openBoard(designer, line.slug)]
    await moveAtOnce(both, MOVES, [seededRandom(seed), seededRandom(seed + 1_000)])
    const kept = JSON.stringify(await lanesOf(line))
    for (const editor of both) {
      const told = editor.store.read().refused.length
      refused += editor.refusals
      untold += editor.refusals - told
      if (JSON.stringify(seenBy(editor)) !== kept) apart += 1
    }
  }
  return {
    what: `board: ${MOVES} random moves of each of two editors, ${SEEDS.length} times`,
    value: `${apart} orders differ, ${untold} of ${refused} refusals untold`,
    bar: 'none, none',
    met: apart === 0 && untold === 0 && refused > 0,
  }
}

function seenBy({ store }: Editor) {
  const state = store.read()
  const titles = new Map(state.board.cards.map(({ id, title }) => [id, title]))
  const order = orderNow(state)
  return Object.fromEntries(LANES.map((lane) => [lane, order[lane].map((id) => titles.get(id))]))
}

const [file] = process.argv.slice(2)
try {
  writeFileSync(file!, JSON.stringify([...(await boards()), await editors()]))
} finally {
  await sequelize().close()
}
