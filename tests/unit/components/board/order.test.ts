import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import {
  applyMove,
  find,
  moveBack,
  orderOf,
  placeAmong,
  placeOf,
  standsAt,
  type Order,
} from '@/components/board/order'
import { LANES } from '@/lib/combinations/constants'

import { smallBoard } from './fixtures'

const order = orderOf(smallBoard().cards)
const put = (now: Order, id: string, lane: (typeof LANES)[number], at: number) =>
  applyMove(now, {
    combinationId: id,
    ...placeAmong(now, id, { lane, at, shown: now[lane].filter((other) => other !== id) }),
  })

/** A board of up to twelve cards in any lanes, one of its cards, and a place for it. */
const moves = fc.array(fc.constantFrom(...LANES), { minLength: 1, maxLength: 12 }).chain((lanes) =>
  fc.record({
    order: fc.constant(orderOf(lanes.map((lane, n) => ({ id: `c${n}`, lane })))),
    id: fc.nat(lanes.length - 1).map((n) => `c${n}`),
    lane: fc.constantFrom(...LANES),
    at: fc.nat(12),
  }),
)

describe('the order of the board', () => {
  it('puts a card at an index of a lane, its own or another', () => {
    expect(put(order, 'a', 'sketched', 1).sketched).toEqual(['b', 'a', 'c'])
    expect(put(order, 'a', 'short-listed', 2)).toEqual({
      sketched: ['b', 'c'],
      'short-listed': ['d', 'e', 'a'],
      chosen: [],
    })
    expect(put(order, 'e', 'chosen', 0).chosen).toEqual(['e'])
  })

  it('of the cards that are shown, a card goes right under the one above it', () => {
    // b is filtered out: c shown above means under c, d shown first means above d.
    expect(placeAmong(order, 'd', { lane: 'sketched', at: 1, shown: ['a', 'c'] })).toEqual({
      lane: 'sketched',
      after: 'a',
      before: 'b',
    })
    expect(placeAmong(order, 'd', { lane: 'sketched', at: 0, shown: ['c'] })).toEqual({
      lane: 'sketched',
      after: 'b',
      before: 'c',
    })
    expect(placeAmong(order, 'd', { lane: 'sketched', at: 0, shown: [] })).toEqual({
      lane: 'sketched',
      after: null,
      before: 'a',
    })
  })

  it('no move loses or doubles a card, and every other keeps its order', () => {
    fc.assert(
      fc.property(moves, ({ order: before, id, lane, at }) => {
        const after = put(before, id, lane, Math.min(at, before[lane].length))
        expect(LANES.flatMap((one) => after[one]).sort()).toEqual(
          LANES.flatMap((one) => before[one]).sort(),
        )
        expect(find(after, id)!.lane).toBe(lane)
        for (const one of LANES) {
          expect(after[one].filter((other) => other !== id)).toEqual(
            before[one].filter((other) => other !== id),
          )
        }
      }),
    )
  })

  it('taking a move back gives the order of before', () => {
    fc.assert(
      fc.property(moves, ({ order: before, id, lane, at }) => {
        const was = placeOf(before, id)!
        const after = put(before, id, lane, Math.min(at, before[lane].length))
        const back = moveBack(after, id, was)!
        expect(back.from).toBe(lane)
        expect(applyMove(after, back)).toEqual(before)
      }),
    )
  })

  it('a way back whose neighbours have gone leads as near as they allow', () => {
    const was = placeOf(order, 'b')!
    const now = put(put(put(order, 'b', 'chosen', 0), 'a', 'chosen', 0), 'c', 'chosen', 0)
    expect(moveBack(now, 'b', was)).toMatchObject({ lane: 'sketched', after: null, before: null })
    const beside = put(put(order, 'b', 'chosen', 0), 'a', 'chosen', 0)
    expect(moveBack(beside, 'b', was)).toMatchObject({ after: null, before: 'c' })
  })

  it('knows where a card stands already, and nothing of a card that is gone', () => {
    expect(standsAt(order, 'b', { lane: 'sketched', after: 'a', before: 'c' })).toBe(true)
    expect(standsAt(order, 'b', { lane: 'sketched', after: null, before: 'a' })).toBe(false)
    expect(placeOf(order, 'x')).toBeNull()
    expect(moveBack(order, 'x', placeOf(order, 'a')!)).toBeNull()
    expect(
      applyMove(order, { combinationId: 'x', lane: 'chosen', after: null, before: null }),
    ).toBe(order)
  })
})
