import { describe, expect, test } from 'vitest'

import { expectedAnswer } from '../../e2e/support/access-matrix'
import { flightRows } from '../../e2e/support/ask'
import { secretsIn } from '../../e2e/support/secrets'

describe('the answer of an action', () => {
  test('is found behind texts that look like rows', () => {
    const text = 'one\n1:{"ok":true}\n'
    const body = `0:{"a":"$@1"}\n2:T${text.length.toString(16)},${text}1:{"ok":false}\n`
    expect(flightRows(Buffer.from(body)).get(1)).toBe('{"ok":false}')
  })

  test('is found when its row comes last, without an end', () => {
    expect(flightRows(Buffer.from('1f:["$"]\n1:{"ok":true}')).get(1)).toBe('{"ok":true}')
  })
})

describe('the search for secrets', () => {
  const texts = { shared: ['Mole’s “Waistcoat” & Co'], studio: ['Kept for us'] }
  const secrets = {
    always: ['$argon2'],
    sessions: [['dyer@a.example', 'a-session']] as const,
    texts: new Map([['a', texts]]),
  }
  const dyer = { name: '', standing: 'member', role: 'dyer', brand: 'a' } as const
  const member = { ...dyer, role: 'owner', email: 'owner@a.example', cookie: '' } as const
  const stranger = { ...member, standing: 'stranger', brand: 'b' } as const

  test.each([
    ['as it is', 'Mole’s “Waistcoat” & Co'],
    ['in HTML', 'Mole’s “Waistcoat” &amp; Co'],
    ['in JSON', JSON.stringify('Mole’s “Waistcoat” & Co').replace('&', '\\u0026')],
    [
      'in JSON in a script',
      JSON.stringify(JSON.stringify('Mole’s “Waistcoat” & Co').replace('&', '\\u0026')),
    ],
  ])('finds a text %s', (_, body) => {
    expect(secretsIn(body, secrets, stranger)).toEqual(['Mole’s “Waistcoat” & Co'])
    expect(secretsIn(body, secrets, member)).toEqual([])
  })

  test('knows what a dyer may not read, and what nobody may', () => {
    const reader = { ...dyer, email: 'dyer@a.example', cookie: '' }
    const body = 'Kept for us, a-session, $argon2id'
    expect(secretsIn(body, secrets, reader)).toEqual(['$argon2', 'Kept for us'])
    expect(secretsIn(body, secrets, member)).toEqual(['$argon2', 'a-session'])
  })
})

describe('a line of the matrix', () => {
  const owner = { name: 'owner', standing: 'member', role: 'owner' } as const
  const dyer = { name: 'dyer', standing: 'member', role: 'dyer' } as const
  const stranger = { name: 'their owner', standing: 'stranger', role: 'owner' } as const
  const removed = { name: 'removed', standing: 'removed' } as const
  const nobody = { name: 'signed out', standing: 'nobody' } as const
  const everybody = [owner, dyer, stranger, removed, nobody]

  test('opens to its roles, in the brand of the address alone', () => {
    const rule = { who: ['owner'] } as const
    expect(everybody.map((one) => expectedAnswer('page', rule, one))).toEqual([
      ...[200, 403, 404, 404],
      '→ /sign-in',
    ])
    expect(everybody.map((one) => expectedAnswer('action', rule, one))).toEqual([
      ...['ok', 'forbidden', 'not-found', 'not-found'],
      'unauthenticated',
    ])
  })

  test('opens to whoever is signed in, with its exceptions', () => {
    const rule = { who: 'signed in', except: { removed: 403, dyer: 409 } } as const
    expect(everybody.map((one) => expectedAnswer('route', rule, one))).toEqual([
      ...[200, 409, 200, 403, 401],
    ])
  })
})
