import { randomUUID } from 'node:crypto'

import { RATE_LIMITS } from '@/lib/auth/constants'

import { trySigningIn } from '../../scripts/lib/sign-in.mjs'
import { crashDatabase, database } from './support/database'
import { expect, test } from './support/test'

const ORIGIN = process.env.APP_ORIGIN!

/** Fails to sign in, from an address that it claims to have. */
const failToSignIn = () =>
  trySigningIn(
    ORIGIN,
    { email: `${randomUUID()}@people.example`, password: 'not this one' },
    {
      'x-forwarded-for': `203.0.113.${Math.floor(Math.random() * 256)}`,
      'x-woadmap-peer': `198.51.100.${Math.floor(Math.random() * 256)}`,
    },
  )

test('wrong passwords shut the door for a while, whatever address is claimed, also when the database restarts', async () => {
  let client = await database()
  const forget = () => client.query('DELETE FROM rate_limits')
  await forget()
  try {
    const { points, duration } = RATE_LIMITS['sign-in-address']
    for (let at = 0; at < points; at++) {
      expect((await failToSignIn()).status).toBe(401)
    }
    const refused = await failToSignIn()
    expect(refused.status).toBe(429)
    const wait = Number(refused.headers.get('retry-after'))
    expect(wait).toBeGreaterThan(duration - 120)
    expect(wait).toBeLessThanOrEqual(duration)

    // The test's database promises no more than that what it has written out survives.
    const { at } = (await client.query('SELECT pg_current_wal_insert_lsn() AS at')).rows[0]
    await expect
      .poll(
        async () =>
          (await client.query('SELECT pg_current_wal_flush_lsn() >= $1 AS is', [at])).rows[0].is,
      )
      .toBe(true)
    await crashDatabase(client)
    await expect(async () => (client = await database())).toPass()
    await expect.poll(async () => (await fetch(`${ORIGIN}/readyz`)).status).toBe(200)
    expect((await failToSignIn()).status).toBe(429)
  } finally {
    // The other tests sign in from the same address.
    await forget()
    await client.end()
  }
})
