import { DatabaseError, UniqueConstraintError, ValidationErrorItem } from 'sequelize'
import { describe, expect, it } from 'vitest'

import { serializeError } from '@/lib/logger'

describe('an error in the log', () => {
  it('keeps its kind, words, place, code and cause', () => {
    const cause = new TypeError('not a function')
    const error = Object.assign(new Error('It broke.', { cause }), { code: 'E_BROKE' })
    expect(serializeError(error)).toMatchObject({
      type: 'Error',
      message: 'It broke.',
      stack: expect.stringContaining('logger.test.ts'),
      code: 'E_BROKE',
      cause: { type: 'TypeError', message: 'not a function' },
    })
  })

  it('of the database says its code, and nothing of the statement’s values', () => {
    const original = Object.assign(new Error('syntax error'), {
      code: '42601',
      sql: "UPDATE people SET password_hash = '$argon2id$canary'",
      parameters: ['$argon2id$canary'],
      detail: 'Key (token_hash)=(canary) already exists.',
    })
    const item = new ValidationErrorItem(
      'taken',
      'unique violation',
      'tokenHash',
      'canary',
      null as never,
      '',
      '',
      [],
    )
    for (const error of [
      new DatabaseError(original),
      new UniqueConstraintError({ message: 'taken', errors: [item], parent: original }),
    ]) {
      const logged = serializeError(error)
      expect(logged).toMatchObject({ code: '42601' })
      expect(JSON.stringify(logged)).not.toContain('canary')
    }
  })

  it('that is none is left as it is', () => {
    expect(serializeError('a word')).toBe('a word')
  })
})
