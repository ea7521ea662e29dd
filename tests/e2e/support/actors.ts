import type pg from 'pg'

import type { Role } from '@/lib/people/constants'

import { signIn } from '../../../scripts/lib/sign-in.mjs'
import accounts from '../../../seeders/demo-accounts.json' with { type: 'json' }

import type { Standing } from './access-matrix'
import { copyRow } from './places'

/** Somebody who asks. */
export interface MatrixActor {
  name: string
  /** What they are to the first brand. */
  standing: Standing
  role?: Role
  /** The slug of the brand they are a member of. */
  brand?: string
  /** Who they sign in as; nobody is nobody. */
  email?: string
  /** What their browser sends. */
  cookie: string
}

const DOMAIN = 'matrix.example'
// The people made here have the password of the account they are a copy of.
const MODEL = accounts[0]!
// None is the end of another, so that one can be told from the other in a text.
/** What somebody of the matrix is called. */
export const calledAs = (name: string): string => `Here as ${name}`
const emailOf = (name: string) => `as-${name.replaceAll(' ', '-')}@${DOMAIN}`
const ROLES: readonly Role[] = ['owner', 'marketer', 'designer', 'dyer']

/**
 * Signs in somebody of the matrix.
 * @returns the cookies of the new session, as a browser sends them
 */
export async function openSessionOf(origin: string, email: string): Promise<string> {
  const cookie = await signIn(origin, { email, password: MODEL.password })
  if (!cookie) throw new Error(`${email} could not sign in.`)
  return cookie
}

/**
 * Everybody of the matrix: each role of both brands, one who was removed from the first brand and
 * one who was made a dyer there after signing in, nobody, and nobody with the cookie of a session
 * that has ended.
 */
export async function makeActors(
  client: pg.Client,
  origin: string,
  [first, second]: readonly [string, string],
): Promise<MatrixActor[]> {
  await clearActors(client)
  const add = async (name: string, standing: Standing, brand: string, role: Role) => {
    const email = emailOf(name)
    await addMember(client, { email, name: calledAs(name), brand, role })
    return { name, standing, role, brand, email, cookie: await openSessionOf(origin, email) }
  }
  const members: MatrixActor[] = []
  for (const role of ROLES) members.push(await add(role, 'member', first, role))
  for (const role of ROLES) members.push(await add(`their ${role}`, 'stranger', second, role))
  const removed = await add('removed', 'removed', first, 'owner')
  const demoted = await add('demoted', 'member', first, 'owner')
  const ended = await add('ended', 'nobody', first, 'owner')
  return [
    ...members,
    { name: 'removed', standing: 'removed', email: removed.email, cookie: removed.cookie },
    { ...demoted, role: 'dyer' },
    { name: 'signed out', standing: 'nobody', cookie: '' },
    { name: 'ended', standing: 'nobody', cookie: ended.cookie },
  ]
}

/** What befalls them after they have signed in; their very next request must know of it. */
export async function changeStandings(client: pg.Client): Promise<void> {
  const idOf = (name: string) => `(SELECT id FROM people WHERE email = '${emailOf(name)}')`
  await client.query(`DELETE FROM memberships WHERE person_id = ${idOf('removed')}`)
  await client.query(`UPDATE memberships SET role = 'dyer' WHERE person_id = ${idOf('demoted')}`)
  await client.query(`DELETE FROM sessions WHERE person_id = ${idOf('ended')}`)
}

async function addMember(
  client: pg.Client,
  { email, name, brand, role }: { email: string; name: string; brand: string; role: Role },
): Promise<void> {
  const model = await client.query(
    `SELECT people.id AS person, memberships.id AS membership,
       (SELECT id FROM brands WHERE slug = $2) AS brand
     FROM people JOIN memberships ON person_id = people.id WHERE email = $1`,
    [MODEL.email, brand],
  )
  const { person, membership, brand: brand_id } = model.rows[0]
  const person_id = await copyRow(client, 'people', person, { email, name })
  await copyRow(client, 'memberships', membership, { brand_id, person_id, role })
}

/** Removes the people that makeActors added. */
export async function clearActors(client: pg.Client): Promise<void> {
  await client.query(`DELETE FROM people WHERE email LIKE '%@${DOMAIN}'`)
}
