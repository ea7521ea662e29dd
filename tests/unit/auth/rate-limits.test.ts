import { Sequelize } from 'sequelize'
import { describe, expect, it, vi } from 'vitest'

import { RATE_LIMITS } from '@/lib/auth/constants'
import { TooManyError } from '@/lib/errors'

// Nothing listens there: a database that is away, from the very start of the process.
const away = vi.hoisted(() => ({ url: 'postgres://nobody@127.0.0.1:1/none' }))
vi.mock('@/models', () => {
  let made: Sequelize | undefined
  return {
    sequelize: () => (made ??= new Sequelize(away.url, { dialect: 'postgres', logging: false })),
  }
})

describe('a limit without a database', () => {
  it('still holds, counted by the process itself', async () => {
    const { spend } = await import('@/lib/auth/rate-limits')
    const { points, duration } = RATE_LIMITS['sign-in-account']
    const attempt = () => spend('sign-in-account', 'somebody@people.example', 'Signing in')
    for (let at = 0; at < points; at++) await attempt()
    const refused = await attempt().catch((error: unknown) => error)
    expect(refused).toBeInstanceOf(TooManyError)
    expect((refused as TooManyError).retryAfter).toBeGreaterThan(duration - 60)
    await spend('sign-in-account', 'another@people.example')
  })
})
