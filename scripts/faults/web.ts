import {
  cpSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs'
import { join } from 'node:path'
import { randomBytes, randomUUID } from 'node:crypto'
import { setTimeout as sleep } from 'node:timers/promises'

import type { Page } from '@playwright/test'

import { must, type Fault } from './fault'
import { openTab } from './tab'
import { BRAND, FAULT_LINE, LINE, seconds, until, type World } from './world'

const OPEN = 20

/** What happens to the web server and between it and browsers. */
export const WEB_FAULTS: readonly Fault[] = [
  {
    name: 'web-told-to-stop',
    what: `the web server is told to stop (SIGTERM) with ${OPEN} saves open`,
    expected:
      'it answers them, takes no more, and ends within 4 s; the next one has every acknowledged save, and each is there once when asked again',
    async run(world) {
      const { fleet } = world.ground
      const letGo = await world.hold('LOCK TABLE shades IN EXCLUSIVE MODE')
      const shades = Array.from({ length: OPEN }, () => world.newShade())
      const saving = shades.map((shade) =>
        world.saveShade(shade).then(
          (answer) => (answer.ok ? 'saved' : answer.code),
          () => 'cut',
        ),
      )
      await world.waitForLocked(8)
      const began = performance.now()
      const stopping = fleet.stop('web')
      await sleep(300)
      const late = await world.owner.ask('/livez').then(
        ({ status }) => `answered ${status}`,
        () => 'refused',
      )
      must(late === 'refused', `a visitor who came after that was ${late}`)
      await letGo()
      const how = await stopping
      const took = performance.now() - began
      const answers = await Promise.all(saving)
      await world.startWeb()
      const tally = (said: string) => answers.filter((answer) => answer === said).length
      const cut = tally('cut')
      // By itself: 143 is what Next.js says when it was told to stop.
      must(
        how === 0 || how === 143,
        `it ended by ${how} after ${seconds(took)}; ${cut} requests were cut`,
      )
      must(cut === 0, `${cut} of ${OPEN} requests were cut`)
      for (const shade of shades) {
        const again = await world.saveShade(shade)
        must(again.ok, `asked again: ${JSON.stringify(again)}`)
        must((await world.countShades(shade)) === 1, 'a save is there twice')
      }
      return `${tally('saved')} saved, ${OPEN - tally('saved') - cut} told to try again, ${cut} cut; ended by itself after ${seconds(took)}; each there once`
    },
  },
  {
    name: 'ten-posts',
    what: 'ten identical posts at once: of a shade, of a line, of a combination',
    expected: 'one row each, and all ten get the same answer',
    async run(world) {
      const ten = <T>(work: () => Promise<T>) => Promise.all(Array.from({ length: 10 }, work))
      const shade = world.newShade()
      const line = {
        ...(await lineValues(world)),
        name: `Line of ten posts ${randomUUID().slice(0, 8)}`,
        requestKey: randomUUID(),
      }
      const combination = await combinationValues(world)
      const shades = await ten(() => world.saveShade(shade))
      const lines = await ten(() =>
        world.owner.act('createLineAction', `/${BRAND}/lines/new`, line),
      )
      const page = `/${BRAND}/lines/${LINE}/photographs/${combination.photographId}`
      const combinations = await ten(() =>
        world.owner.act('keepCombinationAction', page, combination),
      )
      for (const answers of [shades, lines, combinations]) {
        const different = new Set(answers.map((answer) => JSON.stringify(answer)))
        must(
          different.size === 1 && answers[0]!.ok,
          `${different.size} answers: ${[...different].join(' / ').slice(0, 600)}`,
        )
      }
      must((await world.countShades(shade)) === 1, 'the shade is there more than once')
      for (const [table, key] of [
        ['lines', line.requestKey],
        ['combinations', combination.requestKey],
      ]) {
        const rows = await world.count(`${table} WHERE request_key = $1`, [key])
        must(rows === 1, `${rows} rows in ${table}`)
      }
      return 'one shade, one line, one combination of five; ten times the same answer'
    },
  },
  {
    name: 'deploy-under-open-tab',
    what: 'a new build is deployed under a tab with a form half filled in',
    expected:
      'with the same actions it saves; when they are no longer the same it is told so in words, and what was typed stays',
    within: 120,
    async run(world) {
      const { fleet, dist } = world.ground
      const page = await openTab(world)
      world.undo(async () => {
        await fleet.stop('web')
        await world.startWeb()
      })

      const same = await typeShade(page, world)
      await fleet.stop('web')
      await world.startWeb(redeploy(dist, { renameActions: false }))
      await page.getByRole('button', { name: 'Add shade', exact: true }).click()
      await until('it is saved', async () => (await world.countShades(same)) === 1)

      const other = await typeShade(page, world)
      await fleet.stop('web')
      await world.startWeb(redeploy(dist, { renameActions: true }))
      // What the tab has not loaded yet is no longer there under its old name.
      await page.route('**/_next/static/**', (route) => route.fulfill({ status: 404 }))
      await page.getByRole('button', { name: 'Add shade', exact: true }).click()
      const told = page.getByRole('alert').filter({ hasText: /updated/i })
      const words = await told.textContent().catch(() => null)
      must(words, `told: ${(await page.getByRole('alert').allTextContents()).join(' / ')}`)
      const kept = await page.getByLabel('Number', { exact: true }).inputValue()
      must(kept === other.number, `the form holds “${kept}”`)
      must((await world.countShades(other)) === 0, 'it was saved nevertheless')
      return `saved under another build; without its action: “${words}”, the form as typed`
    },
  },
]

async function typeShade(page: Page, world: World) {
  const shade = world.newShade()
  // A tab that finds another build loads its page anew, and may do so just now.
  await until('the form opens', () =>
    page.goto(`/${BRAND}/lines/${FAULT_LINE}/shades/new`).then(
      () => true,
      () => false,
    ),
  )
  await page.getByLabel('Number', { exact: true }).fill(shade.number)
  await page.getByLabel(/^Name/).fill(shade.name)
  for (const [label, value] of [
    [/^L\*/, '55'],
    [/^a\*/, '-16'],
    [/^b\*/, '30'],
  ] as const) {
    await page.getByLabel(label).fill(value)
  }
  await page.getByLabel('Read under').selectOption('D65/10')
  return shade
}

/**
 * The build as a later one would be: under another build id and, when asked, with other ids for its
 * actions, as after a change of the key they are made with.
 * @returns the folder of the new build
 */
function redeploy(dist: string, { renameActions }: { renameActions: boolean }): string {
  const next = `${dist}-redeployed`
  rmSync(next, { recursive: true, force: true })
  cpSync(dist, next, {
    recursive: true,
    filter: (path) => !path.startsWith(join(dist, 'cache')),
  })
  const id = readFileSync(join(dist, 'BUILD_ID'), 'utf8')
  const changes = new Map([[id, randomBytes(id.length).toString('hex').slice(0, id.length)]])
  if (renameActions) {
    const manifest = JSON.parse(
      readFileSync(join(dist, 'server/server-reference-manifest.json'), 'utf8'),
    ) as { node: Record<string, unknown> }
    for (const action of Object.keys(manifest.node)) {
      changes.set(action, action.slice(0, 2) + randomBytes(20).toString('hex'))
    }
  }
  renameSync(join(next, 'static', id), join(next, 'static', changes.get(id)!))
  const anyOf = new RegExp([...changes.keys()].join('|'), 'g')
  for (const path of readdirSync(next, { recursive: true, encoding: 'utf8' })) {
    const file = join(next, path)
    if (!statSync(file).isFile() || !/(\.(js|json|html|rsc|meta)|BUILD_ID)$/.test(file)) continue
    const text = readFileSync(file, 'utf8')
    const changed = text.replace(anyOf, (found) => changes.get(found)!)
    if (changed !== text) writeFileSync(file, changed)
  }
  return next
}

/** The form of a line that the brand has. */
async function lineValues(world: World) {
  const [row] = await world.query<Record<string, unknown>>(
    `SELECT fibres, ply, weight_number, currency FROM lines WHERE slug = $1`,
    [LINE],
  )
  return {
    fibres: row!.fibres,
    ply: row!.ply,
    weightNumber: row!.weight_number,
    currency: row!.currency,
    netGrams: 100,
    length: 225,
    lengthUnit: 'm',
    needleMm: 4,
    gaugeStitches: 22,
    gaugeRows: 30,
    price: 21.5,
    launchDate: '',
  }
}

/** Five shades of the demo's line to keep under one of its photographs. */
export async function combinationValues(world: World) {
  const [photograph] = await world.query<{ id: string }>(
    `SELECT p.id FROM photographs p JOIN lines l ON l.id = p.line_id
     WHERE l.slug = $1 AND p.state = 'ready' ORDER BY p.created_at LIMIT 1`,
    [LINE],
  )
  const shades = await world.query<{ id: string }>(
    `SELECT s.id FROM shades s JOIN lines l ON l.id = s.line_id
     WHERE l.slug = $1 AND s.deleted_at IS NULL ORDER BY s.position LIMIT 5`,
    [LINE],
  )
  return {
    lineSlug: LINE,
    photographId: photograph!.id,
    reading: 'true',
    title: 'Kept on a bad day',
    places: shades.map(({ id }) => ({ shadeId: id, share: 0.2 })),
    requestKey: randomUUID(),
  }
}
