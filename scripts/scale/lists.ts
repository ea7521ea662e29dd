import { QueryTypes, type BindOrReplacements } from 'sequelize'

import type { Actor } from '@/lib/auth/actor'
import { getBoard } from '@/lib/combinations/get-board'
import { getLine } from '@/lib/lines/queries'
import { PHOTOGRAPH_LIMITS } from '@/lib/photographs/constants'
import { countPhotographs, listPhotographs } from '@/lib/photographs/queries'
import { galleryFilterSchema } from '@/lib/photographs/schema'
import { SHADE_LIMITS } from '@/lib/shades/constants'
import { listShadeTable, readSampleBook } from '@/lib/shades/queries'
import { shadeTableSchema } from '@/lib/shades/schema'
import { sequelize } from '@/models'

import { timed } from '../bench/measure'
import { printFigures, type Figure } from '../lib/figures.mjs'
import { say } from '../lib/say.mjs'
import { fillBrand, fillLine, settle, type LineSize } from './fill'

/** A step may take this many times what the one before it took, and touch this many pages. */
const TIME_BAR = 1.5
const BUFFERS_BAR = 2
const OTHER_BRANDS = 100
/** Each list is read this many times at each step. */
const RUNS = 61

/** Lines in which every list fills its first page, ten times as many, and a hundred times. */
const STEPS: { name: string; size: LineSize }[] = [
  { name: '1×', size: { shades: 200, photographs: 24, combinations: 24 } },
  { name: '10×', size: { shades: 2_000, photographs: 240, combinations: 240 } },
  {
    name: '100×',
    // As many shades and photographs as a line may hold.
    size: {
      shades: SHADE_LIMITS.perLine,
      photographs: PHOTOGRAPH_LIMITS.perLine,
      combinations: 2_400,
    },
  },
]

type Read = (actor: Actor, lineSlug: string) => Promise<unknown>

const LISTS: Record<string, Read> = {
  'sample book': (actor, slug) => readSampleBook(actor, slug, { order: 'family', page: 1 }),
  'shade table': (actor, slug) => listShadeTable(actor, slug, shadeTableSchema.parse({})),
  gallery: async (actor, slug) => {
    const line = await getLine(actor, slug)
    await listPhotographs(actor, line, galleryFilterSchema.parse({}))
    await countPhotographs(actor, line)
  },
  // The board itself is whole on one page; this is what every open one asks every few seconds.
  'board, nothing new': (actor, slug) => getBoard(actor, slug, FIRST_REVISION),
}

/** Of a board on which nobody has moved anything. */
const FIRST_REVISION = 1

interface Cost {
  ms: number
  /** What the yardstick took meanwhile, in milliseconds. */
  yardstick: number
  buffers: number
}

/** As much work whatever the tables hold: what makes it slower is the machine. */
const yardstick = () => sequelize().query('SELECT n, md5(n::text) FROM generate_series(1, 500) n')

const slugOf = (step: number) => `line-${step}`

/**
 * What a list costs at each step, and the pages touched. Reads take turns, and the time is what the
 * fastest tenth stayed below: whatever else the machine does only adds to it.
 */
async function costsOf(read: Read, actor: Actor): Promise<Cost[]> {
  const times = STEPS.map((): number[] => [])
  const yards: number[] = []
  for (let run = 0; run < RUNS; run++) {
    yards.push((await timed(yardstick))[1])
    for (let turn = 0; turn < STEPS.length; turn++) {
      const step = (run + turn) % STEPS.length
      times[step]!.push((await timed(() => read(actor, slugOf(step))))[1])
    }
  }
  const costs: Cost[] = []
  for (const [step, ms] of times.entries())
    costs.push({
      ms: lowestTenth(ms),
      yardstick: lowestTenth(yards),
      buffers: await buffersOf(() => read(actor, slugOf(step))),
    })
  return costs
}

const lowestTenth = (values: number[]) =>
  values.sort((one, other) => one - other)[Math.floor(values.length / 10)]!

interface Asked {
  sql: string
  bind: BindOrReplacements | undefined
}

/** The statements that this work asks, as they are asked. */
async function statementsOf(work: () => Promise<unknown>): Promise<Asked[]> {
  const asked: Asked[] = []
  const made = sequelize() as unknown as { query: (...given: unknown[]) => Promise<unknown> }
  const { query } = made
  made.query = (...given) => {
    const [sql, options] = given as [string, { bind?: BindOrReplacements } | undefined]
    asked.push({ sql, bind: options?.bind })
    return query.apply(made, given)
  }
  await work()
  made.query = query
  return asked
}

/** How many pages of shared buffers the queries of this work touch. */
async function buffersOf(work: () => Promise<unknown>): Promise<number> {
  let buffers = 0
  for (const { sql, bind } of await statementsOf(work)) {
    if (!/^\s*SELECT/.test(sql)) continue
    const [row] = await sequelize().query<{ 'QUERY PLAN': [{ Plan: Record<string, number> }] }>(
      `EXPLAIN (ANALYZE, BUFFERS, FORMAT JSON) ${sql}`,
      { type: QueryTypes.SELECT, bind },
    )
    const { Plan } = row!['QUERY PLAN'][0]
    buffers += Plan['Shared Hit Blocks']! + Plan['Shared Read Blocks']!
  }
  return buffers
}

function compare(what: string, before: Cost, after: Cost): Figure[] {
  const figure = (unit: 'ms' | 'buffers', most: number): Figure => {
    const machine = unit === 'ms' ? after.yardstick / before.yardstick : 1
    const ratio = after[unit] / before[unit] / machine
    const [from, to] = [before, after].map((cost) => cost[unit].toFixed(unit === 'ms' ? 1 : 0))
    return {
      what: `${what}: ${unit === 'ms' ? 'time' : 'shared buffers'}`,
      value: `${ratio.toFixed(2)} (${from} → ${to}${unit === 'ms' ? ' ms' : ''}${
        machine === 1 ? '' : `, on a machine ${machine.toFixed(2)} times as slow`
      })`,
      bar: `≤ ${most}`,
      met: ratio <= most,
    }
  }
  return [figure('ms', TIME_BAR), figure('buffers', BUFFERS_BAR)]
}

async function measureLists(): Promise<Figure[]> {
  const brandId = await fillBrand('scale')
  const actor: Actor = {
    personId: brandId,
    personName: 'Nobody',
    brandId,
    brandSlug: 'scale',
    brandName: 'scale',
    role: 'owner',
  }
  say('Filling three lines of one brand')
  for (const [step, { size }] of STEPS.entries()) await fillLine(brandId, slugOf(step), size)
  await settle()
  const measure = async () => {
    const costs: Record<string, Cost[]> = {}
    for (const [list, read] of Object.entries(LISTS)) costs[list] = await costsOf(read, actor)
    return costs
  }
  // The first time, everything is cold.
  await measure()
  const alone = await measure()
  say(`Filling ${OTHER_BRANDS} other brands`)
  for (let n = 1; n <= OTHER_BRANDS; n++) {
    await fillLine(await fillBrand(`other-${n}`), slugOf(0), STEPS[0]!.size)
  }
  await settle()
  await measure()
  const beside = await measure()
  return Object.keys(LISTS).flatMap((list) => [
    ...STEPS.slice(1).flatMap(({ name }, step) =>
      compare(`${list}, ${name} rows`, alone[list]![step]!, alone[list]![step + 1]!),
    ),
    ...compare(`${list}, beside ${OTHER_BRANDS} other brands`, alone[list]![0]!, beside[list]![0]!),
  ])
}

/** Fills the empty database of this environment and prints what its lists cost beside the bars. */
try {
  process.exitCode = printFigures(await measureLists())
} finally {
  await sequelize().close()
}
