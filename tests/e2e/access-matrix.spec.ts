import { join } from 'node:path'

import { expect, test } from '@playwright/test'
import type pg from 'pg'

import {
  ACTIONS,
  expectedAnswer,
  PAGES,
  ROUTES,
  type ActionRule,
  type PageRule,
  type RouteRule,
} from './support/access-matrix'
import {
  changeStandings,
  clearActors,
  makeActors,
  openSessionOf,
  type MatrixActor,
} from './support/actors'
import {
  actionQuestion,
  ask,
  pageQuestion,
  routeQuestion,
  type Question,
  type Reply,
} from './support/ask'
import { database } from './support/database'
import { bypassAddresses, bypassHeaders, partsOf } from './support/bypasses'
import {
  clearPlace,
  findModels,
  makePlace,
  withRowsOf,
  withUnknownRows,
  wordsOf,
  type Place,
} from './support/places'
import { findSurface } from './support/product-surface'
import { findSecrets, secretsIn, secretsInLogs, type Secrets } from './support/secrets'

const ORIGIN = process.env.APP_ORIGIN!
/** The same build without its proxy, on the same database. */
const BARE_ORIGIN = process.env.WITHOUT_PROXY_ORIGIN!
const BRANDS = ['teasel-and-tarn', 'quern-yarn-works'] as const

const surface = findSurface(process.env.WOADMAP_DIST_DIR!)

let client: pg.Client
let models: NonNullable<Awaited<ReturnType<typeof findModels>>>
let ours: Place
let theirs: Place
let actors: MatrixActor[]
let secrets: Secrets

test.beforeAll(async () => {
  client = await database()
  const demo = async () => (models = (await findModels(client))!)
  await expect.poll(demo, { timeout: 60_000 }).not.toBeNull()
  ours = await makePlace(client, models, BRANDS[0], 'heronsway-dk')
  theirs = await makePlace(client, models, BRANDS[1], 'hopper-sock')
  actors = await makeActors(client, ORIGIN, BRANDS)
  for (const actor of actors.filter(({ email }) => email)) {
    const { status } = await ask(ORIGIN, page(`/${homeOf(actor)}`), actor.cookie)
    expect(status, `${actor.name} at home`).toBe(200)
  }
  secrets = await findSecrets(client)
  await changeStandings(client)
})

test.afterAll(async () => {
  await clearActors(client)
  for (const place of [ours, theirs]) if (place) await clearPlace(client, models, place)
  await client.end()
})

const homeOf = ({ brand }: MatrixActor) => brand ?? BRANDS[0]
const page = (address: string): Question => ({ kind: 'page', method: 'GET', address })
const actorNamed = (name: string) => actors.find((actor) => actor.name === name)!

type Entry = { key: string } & (
  | { kind: 'page'; rule: PageRule }
  | { kind: 'route'; rule: RouteRule }
  | { kind: 'action'; rule: ActionRule }
)
const entries: readonly Entry[] = [
  ...Object.entries(PAGES).map(([key, rule]) => ({ kind: 'page' as const, key, rule })),
  ...Object.entries(ROUTES).map(([key, rule]) => ({ kind: 'route' as const, key, rule })),
  ...Object.entries(ACTIONS).map(([key, rule]) => ({ kind: 'action' as const, key, rule })),
]
const inBrand = entries.filter(({ rule }) => Array.isArray(rule.who))

function questionOf(entry: Entry, place: Place): Question {
  if (entry.kind === 'page') return pageQuestion(entry.key, entry.rule, place)
  if (entry.kind === 'route') return routeQuestion(entry.key, entry.rule, place)
  return actionQuestion(entry.key, entry.rule, place, surface)
}

/** Asks as this actor, and says what they should not have been told. */
async function askAs(
  origin: string,
  actor: MatrixActor,
  question: Question,
  headers?: Record<string, string>,
  cookie = actor.cookie,
): Promise<Reply & { told: string[] }> {
  const reply = await ask(origin, question, cookie, headers)
  const told = secretsIn(reply.body, secrets, actor)
  const { method, address } = question
  return {
    ...reply,
    told: told.map((one) => `${actor.name} reads “${one}” at ${method} ${address}`),
  }
}

/** Does the work on all of them, a few at a time. */
async function forEachOf<T>(all: readonly T[], work: (one: T) => Promise<void>): Promise<void> {
  const rest = all.values()
  const worker = async () => {
    for (const one of rest) await work(one)
  }
  await Promise.all(Array.from({ length: 6 }, worker))
}

test('the matrix names every page, route and server action, and nothing that is gone', () => {
  const expectSame = (what: string, rules: object, found: Iterable<string>) =>
    expect.soft([...found].sort(), what).toEqual(Object.keys(rules).sort())
  expectSame('pages', PAGES, surface.pages.keys())
  expectSame('routes', ROUTES, surface.routes)
  expectSame('actions', ACTIONS, surface.actions.keys())
})

const NAMES = [
  ...['owner', 'marketer', 'designer', 'dyer'].flatMap((role) => [role, `their ${role}`]),
  ...['removed', 'demoted', 'signed out', 'ended'],
]
for (const [where, origin] of [
  ['', ORIGIN],
  [' without the proxy', BARE_ORIGIN],
] as const) {
  for (const name of NAMES) {
    test(`${name}: everything answers as the matrix says${where}`, async () => {
      test.setTimeout(120_000)
      const actor = actorNamed(name)
      const problems: string[] = []
      await forEachOf(entries, async (entry) => {
        const { kind, key, rule } = entry
        if (rule.before) await client.query(...sqlOf(rule.before(ours)))
        const cookie =
          rule.endsSession && actor.email ? await openSessionOf(origin, actor.email) : actor.cookie
        const reply = await askAs(origin, actor, questionOf(entry, ours), {}, cookie)
        const expected = expectedAnswer(kind, rule, actor)
        if (reply.answer !== expected) problems.push(`${key}: ${reply.answer}, not ${expected}`)
        problems.push(...reply.told)
      })
      expect(problems).toEqual([])
    })
  }

  test(`what is another brand's answers exactly as what does not exist${where}`, async () => {
    test.setTimeout(120_000)
    const problems: string[] = []
    let asked = 0
    for (const [actor, own, other] of [
      ...['owner', 'dyer'].map((name) => [actorNamed(name), ours, theirs] as const),
      [actorNamed('their owner'), theirs, ours] as const,
    ]) {
      const mine = inBrand.filter(({ rule }) => rule.who.includes(actor.role!))
      await forEachOf(mine, async (entry) => {
        const { kind, key, rule } = entry
        const refused = expectedAnswer(kind, rule, { name: '', standing: 'stranger' })
        for (const [foreign, unknown, expected] of [
          [withRowsOf(other, own), withUnknownRows(own), rule.unknown ?? refused],
          [{ ...own, line: other.line }, { ...own, line: 'no-such-line' }, refused],
          [other, { ...other, brand: 'no-such-brand' }, refused],
        ] as const) {
          const [question, asIfNone] = [foreign, unknown].map((place) =>
            askedInstead(questionOf(entry, own), questionOf(entry, place)),
          )
          if (!question) continue
          asked++
          const reply = await askAs(origin, actor, question)
          const none = await ask(origin, asIfNone!, actor.cookie)
          const about = `${actor.name}, ${key}`
          if (reply.answer !== expected) problems.push(`${about}: ${reply.answer}`)
          if (none.answer !== reply.answer) problems.push(`${about}: ${none.answer} for unknown`)
          problems.push(...reply.told)
          const known = new Set(wordsOf(none.body, unknown))
          const more = wordsOf(reply.body, foreign).filter((word) => !known.delete(word))
          const differing = [...more, ...known]
          if (differing.length > 0) problems.push(`${about}: differs in ${differing.slice(0, 9)}`)
        }
      })
    }
    expect(problems).toEqual([])
    expect(asked).toBeGreaterThan(80)
  })
}

/** The question about other rows, null when it does not name any. An action is sent from its own page. */
function askedInstead(own: Question, other: Question): Question | null {
  const question = own.action ? { ...other, address: own.address } : other
  // A new key of the submit is no other row.
  const rowsOf = ({ address, body }: Question) =>
    address + body?.replace(/"requestKey":"[^"]+"/, '')
  return rowsOf(question) === rowsOf(own) ? null : question
}

const sqlOf = ([sql, values]: readonly [string, readonly unknown[]]): [string, unknown[]] => [
  sql,
  [...values],
]

test('without the proxy there is none: a page itself sends to sign in', async () => {
  const locationOf = async (origin: string) =>
    (await fetch(`${origin}/${ours.brand}`, { redirect: 'manual' })).headers.get('location')
  expect(await locationOf(ORIGIN)).toContain('next=')
  expect(await locationOf(BARE_ORIGIN)).toBe('/sign-in')
})

test('no header and no spelling of an address opens what is closed', async () => {
  test.setTimeout(240_000)
  const reads = inBrand
    .filter(({ kind, key }) => kind === 'page' || key.startsWith('GET '))
    .map((entry) => ({ entry, question: questionOf(entry, ours) }))
  const tries = reads.flatMap(({ entry, question }) => {
    const { address } = question
    const path = entry.kind === 'page' ? surface.pages.get(entry.key)! : null
    return [
      ...bypassHeaders(address, path ? partsOf(path, ours) : null).map((headers) => ({
        question,
        headers,
      })),
      ...bypassAddresses(address).map((other) => ({
        question: { ...question, address: other },
        headers: {},
      })),
      ...['HEAD', 'POST'].map((method) => ({ question: { ...question, method }, headers: {} })),
      // What is asked for is open; the header names what is not.
      ...['x-original-url', 'x-rewrite-url', 'x-invoke-path', 'x-matched-path'].map((header) => ({
        question: { ...question, address: '/sign-in' },
        headers: { [header]: address },
      })),
    ]
  })
  const problems: string[] = []
  const outsiders = ['signed out', 'their owner'].map(actorNamed)
  await forEachOf(tries, async ({ question, headers }) => {
    for (const actor of outsiders) {
      const reply = await askAs(ORIGIN, actor, question, headers)
      const about = `${actor.name} with ${JSON.stringify(headers)}`
      problems.push(...reply.told.map((one) => `${one} ${about}`))
      if (reply.status >= 500)
        problems.push(`${question.method} ${question.address}: ${reply.status} ${about}`)
    }
  })
  expect(problems).toEqual([])
  expect(tries.length).toBeGreaterThan(500)
})

test('those who belong there are told by the same requests, so that the search would find it', async () => {
  const owner = actorNamed('owner')
  const stranger = actorNamed('their owner')
  const address = `/${ours.brand}/lines/${ours.line}/photographs/${ours.photograph}`
  const path = surface.pages.get('/[brand]/lines/[line]/photographs/[photograph]')!
  for (const headers of [{}, { RSC: '1' }, bypassHeaders(address, partsOf(path, ours)).at(-1)!]) {
    const { body } = await ask(ORIGIN, page(address), owner.cookie, headers)
    expect(secretsIn(body, secrets, stranger), JSON.stringify(headers)).not.toEqual([])
  }
})

test("an action of one's own brand, sent to another brand's page, brings nothing of that page", async () => {
  const stranger = actorNamed('their owner')
  const entry = inBrand.find(({ key }) => key === 'setShadeStatusAction')!
  const question = questionOf(entry, theirs)
  const own = await ask(ORIGIN, question, stranger.cookie)
  expect(own.answer).toBe('ok')
  // The page it is sent from comes back anew with the answer.
  expect(secretsIn(own.body, secrets, actorNamed('owner'))).not.toEqual([])
  const abroad = { ...question, address: questionOf(entry, ours).address }
  for (const headers of [{}, { 'x-action-forwarded': '1' }] as Record<string, string>[]) {
    expect((await askAs(ORIGIN, stranger, abroad, headers)).told).toEqual([])
  }
})

test('no write is taken from another site, whoever is signed in', async () => {
  const owner = actorNamed('owner')
  const problems: string[] = []
  const writes = inBrand.filter(({ kind, key }) => kind === 'action' || !/^(\/|GET )/.test(key))
  const elsewhere = { origin: 'https://elsewhere.example', 'sec-fetch-site': 'cross-site' }
  await forEachOf(writes, async (entry) => {
    if (entry.rule.before) await client.query(...sqlOf(entry.rule.before(ours)))
    const question = questionOf(entry, ours)
    for (const headers of [elsewhere, { ...elsewhere, 'x-forwarded-host': 'elsewhere.example' }]) {
      const { answer } = await askAs(ORIGIN, owner, question, headers)
      // The framework itself answers 500 to an action from elsewhere.
      if (![403, 'forbidden', 500].includes(answer)) problems.push(`${entry.key}: ${answer}`)
    }
  })
  expect(problems).toEqual([])
  expect(writes.length).toBeGreaterThan(20)
})

test('of next-auth only what the sign-in form asks for is open', async () => {
  const { cookie } = actorNamed('owner')
  for (const what of ['session', 'signin', 'signout', 'error', 'verify-request', '_log']) {
    for (const method of ['GET', 'POST']) {
      const question = { kind: 'route', method, address: `/api/auth/${what}` } as const
      expect((await ask(ORIGIN, question, cookie)).answer, `${method} ${what}`).toBe(404)
    }
  }
})

test('the logs hold no secret', () => {
  const { files, found } = secretsInLogs(join(process.env.WOADMAP_LOCAL!, 'logs'), secrets)
  expect(files).toEqual(expect.arrayContaining(['web.log', 'jobs.log', 'postgres.log']))
  expect(found).toEqual([])
})
