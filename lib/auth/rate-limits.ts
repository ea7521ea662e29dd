import { RateLimiterMemory, RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'

import { TooManyError } from '@/lib/errors'
import { sequelize } from '@/models'

import { RATE_LIMITS, type RateLimit } from './constants'
import { digest } from './seal'

const limiters = new Map<RateLimit, RateLimiterPostgres>()

/**
 * Counts live in PostgreSQL, so that all instances share them and a restart keeps them. While the
 * database is away each process counts for itself.
 */
function limiterOf(name: RateLimit): RateLimiterPostgres {
  const known = limiters.get(name)
  if (known) return known
  const terms = { ...RATE_LIMITS[name], keyPrefix: name }
  const made = new RateLimiterPostgres({
    ...terms,
    storeClient: sequelize(),
    storeType: 'sequelize',
    tableName: 'rate_limits',
    tableCreated: true,
    clearExpiredByTimeout: false,
    insuranceLimiter: new RateLimiterMemory(terms),
  })
  limiters.set(name, made)
  return made
}

/** Neither an e-mail address nor a network address is kept: only what is left of it hashed. */
const keyOf = (key: string) => digest(key.toLowerCase()).slice(0, 32)

function inWords(seconds: number): string {
  if (seconds < 90) return `${seconds} seconds`
  return `${Math.ceil(seconds / 60)} minutes`
}

/** Counts one, or `count` at once. @throws TooManyError when the limit does not hold them */
export async function spend(name: RateLimit, key: string, what = 'That', count = 1): Promise<void> {
  try {
    await limiterOf(name).consume(keyOf(key), count)
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error
    const seconds = Math.max(1, Math.ceil(error.msBeforeNext / 1000))
    throw new TooManyError(
      `${what} was asked for too often. Try again in ${inWords(seconds)}.`,
      seconds,
    )
  }
}

/** Takes one count, or `count`, back: what was spent turned out to be all right. */
export async function refund(name: RateLimit, key: string, count = 1): Promise<void> {
  await limiterOf(name).reward(keyOf(key), count)
}

/** Forgets all counts of a key. */
export async function forgive(name: RateLimit, key: string): Promise<void> {
  await limiterOf(name).delete(keyOf(key))
}
