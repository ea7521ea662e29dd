import { describe, expect, it } from 'vitest'
import { z } from 'zod'

import { InvalidError } from '@/lib/errors'
import { gatherInput } from '@/lib/server/gather-input'

const query = (text: string) => new URLSearchParams(text)

describe('the input of a route', () => {
  it('is what its address, its query string and its body say', () => {
    expect(gatherInput({ photograph: 'p' }, query('apart=3'), { title: 'Moss' })).toEqual({
      photograph: 'p',
      apart: '3',
      title: 'Moss',
    })
  })

  it.each<[string, Record<string, string>, string, object]>([
    ['in the body what the address says', { photograph: 'p' }, '', { photograph: 'q' }],
    ['in the query what the address says', { photograph: 'p' }, 'photograph=q', {}],
    ['in the query what the body says', {}, 'byteLength=1', { byteLength: 2 }],
    ['twice in the query', {}, 'ids=a&ids=b', {}],
  ])('is refused when it says again %s', (_, params, text, body) => {
    expect(() => gatherInput(params, query(text), body)).toThrow(InvalidError)
  })

  it('keeps a field that is named like a prototype, for the schema to refuse', () => {
    const body = JSON.parse('{"__proto__": {"role": "owner"}, "constructor": 1}') as object
    const input = gatherInput({}, query(''), body)
    expect(Object.keys(input).sort()).toEqual(['__proto__', 'constructor'])
    expect(Object.getPrototypeOf(input)).toBe(Object.prototype)
    expect(z.strictObject({}).safeParse(input).success).toBe(false)
  })
})
