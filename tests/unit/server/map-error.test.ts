import { ConnectionRefusedError, DatabaseError, UniqueConstraintError } from 'sequelize'
import { beforeAll, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'

import { ConflictError } from '@/lib/errors'

let failureOf: typeof import('@/lib/server/map-error').failureOf
const logged = vi.hoisted(() => ({ error: vi.fn(), warn: vi.fn() }))
vi.mock('@/lib/logger', () => ({ logger: () => logged }))

beforeAll(async () => {
  ;({ failureOf } = await import('@/lib/server/map-error'))
})

const fromPostgres = (code: string) => {
  const error = Object.assign(new Error('a message of PostgreSQL'), { code, sql: 'SELECT 1' })
  return new DatabaseError(error)
}

describe('what a failure may say', () => {
  it('keeps the words of an expected error', () => {
    const error = new ConflictError('That number is taken.', { number: ['Taken.'] })
    expect(failureOf(error, 'test')).toEqual({
      ok: false,
      code: 'conflict',
      message: 'That number is taken.',
      fieldErrors: { number: ['Taken.'] },
    })
  })

  it('names the fields of a form that does not parse', () => {
    const { error } = z
      .object({ lab: z.object({ L: z.number('A number.') }) })
      .safeParse({ lab: {} })
    expect(failureOf(error, 'test')).toMatchObject({
      code: 'invalid',
      fieldErrors: { 'lab.L': ['A number.'] },
    })
  })

  it.each([
    ['a refused connection', new ConnectionRefusedError(new Error('ECONNREFUSED'))],
    ['a database that shuts down', fromPostgres('57P01')],
    ['a lock that is held', fromPostgres('55P03')],
    ['too many connections', fromPostgres('53300')],
  ])('says that the database did not answer after %s', (_, error) => {
    expect(failureOf(error, 'test')).toMatchObject({ code: 'unavailable' })
  })

  it.each([
    ['an ordinary bug', new TypeError('secret detail of x')],
    ['a constraint nobody expected', new UniqueConstraintError({ message: 'secret detail' })],
    ['a fault in our SQL', fromPostgres('42601')],
  ])('masks %s and logs it under the reference it gives', (_, error) => {
    const failure = failureOf(error, 'test')
    expect(failure.code).toBe('unexpected')
    expect(failure.message).not.toContain('secret')
    const reference = /reference ([0-9a-f]{8})/.exec(failure.message)?.[1]
    expect(logged.error).toHaveBeenLastCalledWith(
      expect.objectContaining({ err: error, reference }),
      expect.any(String),
    )
  })
})
