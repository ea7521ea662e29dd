import { readdirSync, readFileSync } from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'

import type { Page } from '@playwright/test'

import { must, type Fault } from './fault'
import { openTab } from './tab'
import { BRAND, FAULT_LINE, LINE, PATIENCE, seconds, until, type World } from './world'

/** The answer to a save that must have failed in words that say what to do. */
function mustBeTold(
  answer: { ok: boolean; code?: string; message?: string },
  while_: string,
): void {
  must(
    !answer.ok && answer.code === 'unavailable' && /try again/i.test(answer.message ?? ''),
    `a save while ${while_} was answered ${JSON.stringify(answer)}`,
  )
}

/** Saves again what was answered in the negative: it is there once, and that is said. */
async function mustSaveOnce(world: World, shade: ReturnType<World['newShade']>): Promise<void> {
  const again = await world.saveShade(shade)
  must(again.ok, `saving again was answered ${JSON.stringify(again)}`)
  const rows = await world.countShades(shade)
  must(rows === 1, `saving again left ${rows} rows`)
}

/** Opens a page that cannot be read. @returns after how long that was said, in milliseconds */
async function openInTab(tab: Page, path: string): Promise<number> {
  const began = performance.now()
  void tab.goto(path).catch(() => {})
  await tab.getByRole('heading', { name: 'could not be read' }).waitFor()
  return performance.now() - began
}

/** PostgreSQL's first process and all its children. */
function postgresProcesses(world: World): number[] {
  const first = world.ground.fleet.pidOf('postgres')
  must(first, 'PostgreSQL does not run')
  const children = readdirSync('/proc').filter((pid) => {
    if (!/^\d+$/.test(pid)) return false
    try {
      return (
        /^PPid:\s*(\d+)/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] === String(first)
      )
    } catch {
      return false
    }
  })
  return [first, ...children.map(Number)]
}

const signalAll = (pids: readonly number[], signal: NodeJS.Signals) => {
  for (const pid of pids) {
    try {
      process.kill(pid, signal)
    } catch {
      // It has ended by itself.
    }
  }
}

/** What happens to the database and to the way there. */
export const DATABASE_FAULTS: readonly Fault[] = [
  {
    name: 'postgres-killed',
    what: 'PostgreSQL is killed (kill -9) during a save',
    expected:
      'the save fails in words, nothing of it is kept, what was saved before stays; saving again makes one row',
    async run(world) {
      const before = await world.saveShade()
      must(before.ok, 'the save before it failed')
      await world.hold('LOCK TABLE shades IN EXCLUSIVE MODE')
      const shade = world.newShade()
      const saving = world.saveShade(shade)
      await world.waitForLocked(1)
      signalAll(postgresProcesses(world), 'SIGKILL')
      const answer = await saving
      mustBeTold(answer, 'PostgreSQL was killed')
      await until('PostgreSQL runs again', () =>
        world.query('SELECT 1').then(
          () => true,
          () => false,
        ),
      )
      const recovered = await world.healthy()
      must((await world.countShades(shade)) === 0, 'half of the save was kept')
      await mustSaveOnce(world, shade)
      return `told in words, ready ${seconds(recovered)} after the database was, saved once when asked again`
    },
  },
  {
    name: 'commit-unanswered',
    what: 'the connection to PostgreSQL breaks between commit and its answer',
    expected: 'a clear answer; the same request again gives the row that was made the first time',
    async run(world) {
      const { webDatabase } = world.gates
      let committed = false
      webDatabase.tamper((way, chunk, cut) => {
        if (way === 'out' && chunk.includes('INSERT INTO "shades"')) committed = false
        // PostgreSQL says COMMIT when it has committed; nobody hears of it.
        if (way === 'back' && chunk.includes('COMMIT\0')) {
          committed = true
          cut()
          return null
        }
        return chunk
      })
      world.undo(() => webDatabase.tamper(undefined))
      const shade = world.newShade()
      const answer = await world.saveShade(shade)
      mustBeTold(answer, 'the answer to a commit was lost')
      must(committed, 'no commit was seen on the way')
      await world.mend()
      const [row] = await world.query<{ id: string }>('SELECT id FROM shades WHERE number = $1', [
        shade.number,
      ])
      must(row, 'the commit had not happened')
      const again = await world.saveShade(shade)
      must(again.ok && again.data.id === row.id, `again was answered ${JSON.stringify(again)}`)
      must((await world.countShades(shade)) === 1, 'there are two rows')
      return 'told in words; again gave the first row, and there is one'
    },
  },
  {
    name: 'answer-lost',
    what: 'the connection to the browser breaks between commit and answer',
    expected: 'the same request again gives the answer of the first time, and one row',
    async run(world) {
      const letGo = await world.hold('LOCK TABLE shades IN EXCLUSIVE MODE')
      const shade = world.newShade()
      const gone = new AbortController()
      const saving = world.saveShade(shade, { signal: gone.signal }).then(
        () => 'answered',
        () => 'cut',
      )
      await world.waitForLocked(1)
      gone.abort()
      must((await saving) === 'cut', 'the answer came before it was cut')
      await letGo()
      await until('the row is there', async () => (await world.countShades(shade)) === 1)
      const [row] = await world.query<{ id: string }>('SELECT id FROM shades WHERE number = $1', [
        shade.number,
      ])
      const again = await world.saveShade(shade)
      must(again.ok && again.data.id === row!.id, `again was answered ${JSON.stringify(again)}`)
      must((await world.countShades(shade)) === 1, 'there are two rows')
      return 'the row was made without its browser; again gave that one'
    },
  },
  {
    name: 'postgres-frozen',
    what: 'PostgreSQL is frozen for 10 s (SIGSTOP to all its processes)',
    expected:
      'pages, routes and saves are answered in words within 4 s, /livez stays up, /readyz says no within 1 s; then all works',
    async run(world) {
      const tab = await openTab(world)
      // Connections at hand, as in the middle of a day.
      await Promise.all([1, 2, 3].map(() => world.owner.ask(`/${BRAND}/lines/${LINE}/edit`)))
      // One save is in the middle of its transaction, one has not begun.
      const letGo = await world.hold('LOCK TABLE shades IN EXCLUSIVE MODE')
      const midway = world.newShade()
      const saving = world.saveShade(midway)
      await world.waitForLocked(1)
      const pids = postgresProcesses(world)
      const thaw = () => signalAll(pids, 'SIGCONT')
      world.undo(thaw)
      signalAll(pids, 'SIGSTOP')
      const frozen = performance.now()
      const opening = openInTab(tab, `/${BRAND}/lines/${LINE}/edit`)
      // When something else is missed first, nobody waits for it any more.
      opening.catch(() => {})
      const shade = world.newShade()
      const [save, page, route, ready, alive] = await Promise.all([
        world.saveShade(shade),
        world.owner.ask(`/${BRAND}/lines/${LINE}/edit`),
        world.owner.json(`/api/brands/${BRAND}/photographs/states?ids=${NOBODY}`),
        world.owner.ask('/readyz'),
        world.owner.ask('/livez'),
      ])
      mustBeTold(save, 'PostgreSQL was frozen')
      mustBeTold(await saving, 'PostgreSQL froze in its midst')
      must(page.status === 500, `a page answered ${page.status}`)
      const shown = await opening
      must(shown < PATIENCE, `a browser was told after ${seconds(shown)}`)
      must(route.status === 503, `a route answered ${route.status}`)
      must(ready.status === 503 && ready.ms < 1_500, `/readyz: ${ready.status} in ${ready.ms} ms`)
      must(alive.status === 200, `/livez answered ${alive.status}`)
      await sleep(Math.max(0, 10_000 - (performance.now() - frozen)))
      thaw()
      await letGo()
      const recovered = await world.healthy()
      for (const one of [shade, midway]) await mustSaveOnce(world, one)
      const slowest = Math.max(page.ms, route.ms, shown)
      return `answered within ${seconds(slowest)} (/readyz ${seconds(ready.ms)}), ready ${seconds(recovered)} after the thaw, saved once`
    },
  },
  {
    name: 'pool-exhausted',
    what: 'every connection of the web server is taken by saves that wait',
    expected: 'those and all others are answered in words within 4 s; then all works, each once',
    async run(world) {
      const letGo = await world.hold('LOCK TABLE shades IN EXCLUSIVE MODE')
      const most = Number(world.ground.env.DATABASE_POOL_MAX)
      const shades = Array.from({ length: most }, () => world.newShade())
      const saving = shades.map((shade) => world.saveShade(shade))
      // The first gives up before long: on a slow machine not all of them get there.
      await Promise.race([world.waitForLocked(most), sleep(1_000)])
      const others = [
        world.owner.json(`/api/brands/${BRAND}/photographs/states?ids=${NOBODY}`),
        world.owner.json(`/api/brands/${BRAND}/photographs/states?ids=${NOBODY}`),
      ]
      const saved = await Promise.all(saving)
      const routes = await Promise.all(others)
      for (const answer of saved) mustBeTold(answer, 'the pool was exhausted')
      for (const { status } of routes)
        must(status === 503 || status === 200, `a route answered ${status}`)
      await letGo()
      const recovered = await world.healthy()
      for (const shade of shades) await mustSaveOnce(world, shade)
      return `${shades.length} saves told in words, other routes ${routes.map(({ status }) => status).join(', ')}; ready after ${seconds(recovered)}, each saved once when asked again`
    },
  },
  {
    name: 'row-locked',
    what: 'somebody holds the lock on the row that is to be saved',
    expected: 'the save fails in words within 4 s and changes nothing; the same form then saves',
    async run(world) {
      const made = await world.saveShade()
      must(made.ok, 'the shade could not be made')
      const { id } = made.data
      const letGo = await world.hold('SELECT 1 FROM shades WHERE id = $1 FOR UPDATE', [id])
      const change = {
        lineSlug: FAULT_LINE,
        shadeId: id,
        version: 0,
        status: 'dipped',
      }
      const [{ version }] = (await world.query<{ version: number }>(
        'SELECT version FROM shades WHERE id = $1',
        [id],
      )) as [{ version: number }]
      const save = () =>
        world.owner.act('updateShadeAction', `/${BRAND}/lines/${FAULT_LINE}/shades/new`, {
          ...change,
          version,
        })
      mustBeTold(await save(), 'the row was locked')
      await letGo()
      const again = await save()
      must(again.ok, `after the lock the save was answered ${JSON.stringify(again)}`)
      world.acknowledge('shades', id, { status: change.status, version: version + 1 })
      return 'told in words, nothing changed; the same form saved once the lock was gone'
    },
  },
]

const NOBODY = '00000000-0000-4000-8000-000000000000'
