import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import { requestPasswordReset } from '@/lib/people/request-password-reset'
import { signUp } from '@/lib/people/sign-up'
import { signIn } from '@/lib/auth/sign-in'
import type { Brand } from '@/models'
import { makeBrand } from '@/tests/factories/brand'
import { makePerson } from '@/tests/factories/person'

const RUNS = 31
/** How far apart the medians may be. */
const BAR = 1.2

let brand: Brand
let known: string[]

beforeAll(async () => {
  // A new person for every run, since asking is limited by address.
  brand = await makeBrand()
  const people = Array.from({ length: RUNS }, () => makePerson({ brand, role: 'dyer' }))
  known = (await Promise.all(people)).map(({ email }) => email)
})

const median = (times: number[]) => times.sort((a, b) => a - b)[Math.floor(times.length / 2)]!
const unknown = () => `${randomUUID()}@people.example`

/** Medians in milliseconds, taken by turns so that a busy moment falls on both. */
async function medians(ask: (email: string) => Promise<unknown>): Promise<[number, number]> {
  for (let at = 0; at < 3; at++) await ask(unknown())
  const times: [number[], number[]] = [[], []]
  for (const email of known) {
    for (const [kind, one] of [email, unknown()].entries()) {
      const start = performance.now()
      await ask(one)
      times[kind]!.push(performance.now() - start)
    }
  }
  return [median(times[0]), median(times[1])]
}

describe('how long it takes does not tell whether an address has an account:', () => {
  it.each([
    [
      'asking for a new password',
      (email: string) => requestPasswordReset({ email }, { address: randomUUID() }),
    ],
    [
      'signing up',
      (email: string) =>
        signUp(
          { email, name: 'A name', brandName: 'A brand', password: 'three hills and a ford' },
          { address: randomUUID() },
        ),
    ],
    [
      'signing in with a wrong password',
      (email: string) =>
        signIn({ email, password: 'not this one', address: randomUUID(), userAgent: '' }),
    ],
  ])('%s', async (what, ask) => {
    const [withAccount, without] = await medians(ask)
    console.info(`${what}: ${withAccount.toFixed(2)} and ${without.toFixed(2)} ms`)
    expect(withAccount / without).toBeLessThan(BAR)
    expect(without / withAccount).toBeLessThan(BAR)
  })
})
