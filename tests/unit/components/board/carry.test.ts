import { describe, expect, it } from 'vitest'

import { carriedBy, type Carry } from '@/components/board/use-carry'

const others = { sketched: ['a', 'b', 'c'], 'short-listed': ['d'], chosen: [] }
const held: Carry = { id: 'x', lane: 'sketched', at: 2, by: 'keys' }

describe('a card that is carried by keys', () => {
  it.each([
    ['ArrowUp', held, { lane: 'sketched', at: 1 }],
    ['ArrowDown', held, { lane: 'sketched', at: 3 }],
    ['Home', held, { lane: 'sketched', at: 0 }],
    ['End', held, { lane: 'sketched', at: 3 }],
    ['ArrowRight', held, { lane: 'short-listed', at: 1 }],
    ['ArrowLeft', { ...held, lane: 'chosen' as const, at: 0 }, { lane: 'short-listed', at: 0 }],
    ['ArrowUp', { ...held, at: 0 }, { at: 0 }],
    ['ArrowDown', { ...held, at: 3 }, { at: 3 }],
  ])('%s', (key, from, to) => {
    expect(carriedBy(key, from, others)).toMatchObject({ id: 'x', by: 'keys', ...to })
  })

  it('stays at the first and the last lane, and heeds no other key', () => {
    expect(carriedBy('ArrowLeft', held, others)).toBeNull()
    expect(carriedBy('ArrowRight', { ...held, lane: 'chosen', at: 0 }, others)).toBeNull()
    expect(carriedBy('a', held, others)).toBeNull()
  })
})
