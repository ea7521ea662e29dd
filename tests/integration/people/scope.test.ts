import { randomUUID } from 'node:crypto'

import { ConnectionError, QueryTypes } from 'sequelize'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { asActor, type Actor } from '@/lib/auth/actor'
import { actorIn, findSignedInPerson } from '@/lib/auth/sessions'
import { openSession } from '@/lib/auth/sign-in'
import { getLineWithMargin } from '@/lib/lines/queries'
import { Brand, Line, sequelize } from '@/models'
import { withinScope, withWhomever } from '@/models/scope'
import { makeActor } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'

// As the web server connects, and with one connection for whoever asks.
vi.hoisted(() => {
  process.env.DATABASE_URL = process.env.DATABASE_WEB_URL
  process.env.DATABASE_POOL_MAX = '1'
})
afterAll(() => sequelize().close())

/** A brand with one line, and the session of its owner. */
interface Side {
  actor: Actor
  lineSlug: string
  sessionId: string
}

async function makeSide(name: string): Promise<Side> {
  const id = randomUUID()
  const { actor, lineSlug } = await withinScope({ brandId: id }, async () => {
    const brand = await Brand.create({ id, name, slug: `brand-${id}` })
    const line = await makeLine(brand)
    return { actor: await makeActor(brand), lineSlug: line.slug }
  })
  const attempt = { address: '192.0.2.1', userAgent: 'A browser' }
  return { actor, lineSlug, sessionId: await openSession(actor.personId, attempt) }
}

let ours: Side
let theirs: Side
beforeAll(async () => {
  ours = await makeSide('Ours')
  theirs = await makeSide('Theirs')
})

/** What a request for the line's page reads, and every line that its connection shows. */
async function openLine({ actor: { brandSlug }, lineSlug, sessionId }: Side) {
  const person = await findSignedInPerson(sessionId)
  const actor = actorIn(person!, brandSlug)!
  return asActor(actor, async () => {
    const { line } = await getLineWithMargin(actor, lineSlug)
    const visible = await Line.findAll({ attributes: ['brandId'], raw: true })
    return { person: person!.id, brand: line.brandId, brands: visible.map((one) => one.brandId) }
  })
}

const answerOf = ({ actor: { personId, brandId } }: Side) => ({
  person: personId,
  brand: brandId,
  brands: [brandId],
})

type Connection = { query: (...args: unknown[]) => unknown }

/** The one connection of the pool, made where there is none. */
async function theConnection(): Promise<Connection> {
  const { connectionManager } = sequelize() as unknown as {
    connectionManager: {
      getConnection(): Promise<Connection>
      releaseConnection(connection: Connection): void
    }
  }
  const connection = await connectionManager.getConnection()
  connectionManager.releaseConnection(connection)
  return connection
}

const namesScope = (text: unknown) => typeof text === 'string' && text.includes('set_config')

/** Has the server refuse the next statement that names a scope. */
async function failNextScope(): Promise<void> {
  const connection = await withWhomever(theConnection)
  const ask = connection.query.bind(connection)
  connection.query = (text, ...rest) => {
    if (!namesScope(text)) return ask(text, ...rest)
    connection.query = ask
    return ask('SELECT 1 / 0')
  }
}

/** Does the work and counts how often the connection was told for whom it speaks. */
async function countScopes(work: () => Promise<void>): Promise<number> {
  const connection = await withWhomever(theConnection)
  const ask = connection.query.bind(connection)
  let told = 0
  connection.query = (text, ...rest) => {
    if (namesScope(text)) told += 1
    return ask(text, ...rest)
  }
  await work()
  connection.query = ask
  return told
}

describe('one connection', () => {
  it('that requests of two brands share, statement by statement, shows each its own', async () => {
    const sides = Array.from({ length: 60 }, (_, at) => (at % 3 === 0 ? ours : theirs))
    expect(await Promise.all(sides.map(openLine))).toEqual(sides.map(answerOf))
  })

  it('is told for whom it speaks once as long as that stays, and anew before another reads', async () => {
    const told = await countScopes(async () => {
      for (const side of [ours, ours, ours, theirs, ours]) {
        expect(await openLine(side)).toEqual(answerOf(side))
      }
    })
    // The connection may have spoken for somebody else before the first.
    expect(told).toBeLessThanOrEqual(3)
    expect(told).toBeGreaterThanOrEqual(2)
  })

  it('that was asked who is behind a session shows nobody’s rows to who comes next', async () => {
    await openLine(ours)
    await findSignedInPerson(theirs.sessionId)
    expect(await Line.count()).toBe(0)
    await openLine(ours)
    await findSignedInPerson(theirs.sessionId)
    const { brandId } = theirs.actor
    const seen = await withinScope({ brandId }, () => Line.findAll())
    expect(seen.map((line) => line.brandId)).toEqual([brandId])
  })

  it('that could not be told for whom it speaks answers nothing, and is not used again', async () => {
    expect(await openLine(ours)).toEqual(answerOf(ours))
    await failNextScope()
    // It spoke for ours last; whatever comes next must not be answered as theirs or as ours.
    const refused = await asActor(theirs.actor, () => Line.findAll()).catch(
      (error: unknown) => error,
    )
    expect(refused).toBeInstanceOf(ConnectionError)
    expect(await openLine(theirs)).toEqual(answerOf(theirs))
    expect(await openLine(ours)).toEqual(answerOf(ours))
  })

  it('fails for one of many at once, and the others get their own', async () => {
    await failNextScope()
    const sides = Array.from({ length: 20 }, (_, at) => (at % 2 === 0 ? ours : theirs))
    const answers = await Promise.allSettled(sides.map(openLine))
    const failed = answers.filter(({ status }) => status === 'rejected')
    expect(failed).toHaveLength(1)
    for (const [at, answer] of answers.entries()) {
      if (answer.status === 'fulfilled') expect(answer.value).toEqual(answerOf(sides[at]!))
    }
  })
})

describe('the function that tells who is behind a session', () => {
  it('tells of that session alone, and opens no table to who asks', async () => {
    const people = await Promise.all(
      [ours, theirs].map(({ sessionId }) => findSignedInPerson(sessionId)),
    )
    expect(people.map((one) => one!.memberships.map(({ brandId }) => brandId))).toEqual([
      [ours.actor.brandId],
      [theirs.actor.brandId],
    ])
    expect(await findSignedInPerson(randomUUID())).toBeNull()
    expect(await Line.count()).toBe(0)
    expect(await Brand.count()).toBe(0)
  })

  it('is not led astray by a temporary table that bears the name of one of ours', async () => {
    await sequelize().query('CREATE TEMPORARY TABLE sessions AS TABLE sessions')
    try {
      await sequelize().query('UPDATE pg_temp.sessions SET person_id = $1', {
        bind: [theirs.actor.personId],
      })
      expect((await findSignedInPerson(ours.sessionId))!.id).toBe(ours.actor.personId)
    } finally {
      await sequelize().query('DROP TABLE pg_temp.sessions')
    }
  })

  it('is one of three that answer as the owner of the tables, open to the web’s role by name', async () => {
    const functions = await sequelize().query<{ name: string; everybody: boolean }>(
      `SELECT proname AS name, EXISTS (
         SELECT FROM aclexplode(coalesce(proacl, acldefault('f', proowner))) WHERE grantee = 0
       ) AS everybody
       FROM pg_proc WHERE prosecdef AND pronamespace = 'public'::regnamespace ORDER BY 1`,
      { type: QueryTypes.SELECT },
    )
    expect(functions).toEqual(
      ['brand_of_invitation', 'forget_person', 'session_of'].map((name) => ({
        name,
        everybody: false,
      })),
    )
  })
})
