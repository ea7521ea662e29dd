import { PLACE_ROLES } from '../../lib/combinations/constants'
import { must, type Fault } from './fault'
import type { Visitor } from './visitor'
import { combinationValues } from './web'
import { BRAND, FAULT_LINE, LINE } from './world'

const MOVES = 100

/** A move that the product acknowledged, and the version that it made. */
interface Acknowledged {
  version: number
  title?: string
  order?: string[]
}

/** A row of numbers from 0 to 1 that is the same at every run. @source mulberry32, public domain */
function chance(seed: number): () => number {
  return () => {
    seed = (seed + 0x6d2b79f5) | 0
    let t = Math.imul(seed ^ (seed >>> 15), 1 | seed)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32
  }
}

function shuffled<T>(items: readonly T[], random: () => number): T[] {
  const left = [...items]
  return Array.from(items, () => left.splice(Math.floor(random() * left.length), 1)[0]!)
}

/** Two people at work on the same things. */
export const EDITOR_FAULTS: readonly Fault[] = [
  {
    name: 'two-editors',
    what: `two editors make ${MOVES} random moves on one combination and one line's order at the same time`,
    expected:
      'each move is acknowledged or told to be second; every acknowledged one made its own version, the last one stands, and no half state is ever seen',
    within: 180,
    async run(world) {
      const seed = Math.floor(Math.random() * 1e9)
      const random = chance(seed)
      const kept = await world.owner.act<{ combinationId: string }>(
        'keepCombinationAction',
        `/${BRAND}/lines/${LINE}/photographs/${(await combinationValues(world)).photographId}`,
        await combinationValues(world),
      )
      must(kept.ok, 'the combination could not be kept')
      const id = kept.data.combinationId
      for (let n = 0; n < 5; n++) must((await world.saveShade()).ok, 'a shade could not be made')

      const at = `/${BRAND}/lines/${LINE}/combinations/${id}`
      const acknowledged: Acknowledged[] = []
      let second = 0
      let shadeMoves = 0
      let looks = 0
      let half = ''
      let over = false

      const stand = async () => {
        const [{ title, version }] = (await world.query<{ title: string; version: number }>(
          'SELECT title, version FROM combinations WHERE id = $1',
          [id],
        )) as [{ title: string; version: number }]
        const places = await world.query<{ shade_id: string; place: number }>(
          'SELECT shade_id, place FROM combination_places WHERE combination_id = $1 ORDER BY place',
          [id],
        )
        return { title, version, places }
      }
      const first = await stand()
      const five = first.places.map(({ shade_id }) => shade_id)

      const moveOnce = async (by: Visitor, name: string, n: number): Promise<void> => {
        const kind = random()
        if (kind < 0.3) {
          const shades = await world.query<{ id: string }>(
            `SELECT s.id FROM shades s JOIN lines l ON l.id = s.line_id WHERE l.slug = $1 ORDER BY position`,
            [FAULT_LINE],
          )
          const moved = shades[Math.floor(random() * shades.length)]!
          const answer = await by.act(
            'reorderShadesAction',
            `/${BRAND}/lines/${FAULT_LINE}/shades/new`,
            {
              lineSlug: FAULT_LINE,
              shadeIds: [moved.id],
              place: 1 + Math.floor(random() * shades.length),
            },
          )
          must(answer.ok, `moving a shade was answered ${JSON.stringify(answer)}`)
          shadeMoves++
          return
        }
        const { version, title } = await stand()
        const change =
          kind < 0.75 ? { order: shuffled(five, random) } : { title: `Move ${n} of ${name}` }
        const answer = await by.act<{ version: number }>('saveCombinationAction', at, {
          combinationId: id,
          version,
          title: change.title ?? title,
          places: change.order?.map((shadeId, place) => ({
            shadeId,
            share: 0.2,
            role: PLACE_ROLES[place],
            locked: false,
          })),
        })
        if (answer.ok) acknowledged.push({ version: answer.data.version, ...change })
        else {
          must(answer.code === 'conflict', `a move was answered ${JSON.stringify(answer)}`)
          second++
        }
      }
      const edit = async (by: Visitor, name: string) => {
        for (let n = 0; n < MOVES / 2; n++) await moveOnce(by, name, n)
      }
      const look = async () => {
        while (!over) {
          const places = await world.query<{ place: number }>(
            'SELECT place FROM combination_places WHERE combination_id = $1 ORDER BY place',
            [id],
          )
          const seen = places.map(({ place }) => place).join()
          if (seen !== '1,2,3,4,5') half = seen
          const twice = await world.count(
            `(SELECT 1 FROM shades WHERE deleted_at IS NULL GROUP BY line_id, position HAVING count(*) > 1) AS twice`,
          )
          if (twice > 0) half = 'two shades in one place'
          looks++
        }
      }
      const looking = look()
      try {
        await Promise.all([edit(world.owner, 'the owner'), edit(world.designer, 'the designer')])
      } finally {
        over = true
        await looking
      }

      must(half === '', `a half state was seen: ${half}`)
      const last = await stand()
      const versions = new Set(acknowledged.map(({ version }) => version))
      must(
        versions.size === acknowledged.length &&
          last.version === first.version + acknowledged.length,
        `${acknowledged.length} acknowledged moves made ${last.version - first.version} versions (seed ${seed})`,
      )
      const inOrder = acknowledged.sort((a, b) => a.version - b.version)
      const order = inOrder.findLast((move) => move.order)?.order ?? five
      const title = inOrder.findLast((move) => move.title)?.title ?? first.title
      must(last.title === title, `the title is “${last.title}”, not “${title}” (seed ${seed})`)
      must(
        last.places.map(({ shade_id }) => shade_id).join() === order.join(),
        `the order is not the last acknowledged one (seed ${seed})`,
      )
      world.acknowledge('combinations', id, { title, version: last.version })
      return `${acknowledged.length} moves acknowledged, ${second} told to be second, ${shadeMoves} moves of shades; looked ${looks} times and saw no half state`
    },
  },
]
