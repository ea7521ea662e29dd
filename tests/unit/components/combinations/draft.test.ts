import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import {
  applyEdit,
  draftOf,
  LEAST_PERCENT,
  MOST_PERCENT,
  percentOf,
  type CombinationDraft,
  type DraftEdit,
} from '@/components/combinations/draft'
import {
  beginHistory,
  doEdit,
  endRun,
  HISTORY_STEPS,
  redo,
  undo,
} from '@/components/combinations/draft-history'
import { PLACE_ROLES } from '@/lib/combinations/constants'

import { draftWith, shadeIdsOf } from './fixtures'

const SHADES = ['fern', 'moss', 'slate', 'peat', 'curlew', 'heather', 'rust', 'dawn'] as const

const shadesArb = fc
  .shuffledSubarray([...SHADES], { minLength: 5, maxLength: 5 })
  .chain((ids) =>
    fc
      .array(fc.boolean(), { minLength: 5, maxLength: 5 })
      .map((filled) => ids.map((id, at) => (filled[at] ? id : null))),
  )

const draftArb: fc.Arbitrary<CombinationDraft> = fc
  .record({
    ids: shadesArb,
    shares: fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 5, maxLength: 5 }),
    roles: fc.shuffledSubarray([...PLACE_ROLES], { minLength: 5, maxLength: 5 }),
    locks: fc.array(fc.boolean(), { minLength: 5, maxLength: 5 }),
  })
  .map(({ ids, shares, roles, locks }) =>
    draftOf({
      title: 'Hillside',
      story: '',
      photographId: null,
      places: ids.map((id, at) => ({
        role: roles[at]!,
        share: shares[at]!,
        locked: locks[at]!,
        shade: id === null ? null : { id },
      })),
    }),
  )

const place = fc.integer({ min: -1, max: 5 })
const percent = fc.oneof(fc.integer({ min: -20, max: 120 }), fc.constant(Number.NaN))
const shadeId = fc.option(fc.constantFrom(...SHADES), { nil: null })
const editArb: fc.Arbitrary<DraftEdit> = fc.oneof(
  fc.record({ kind: fc.constant('place' as const), place, shadeId }),
  fc.record({ kind: fc.constant('swap' as const), place, with: place }),
  fc.record({ kind: fc.constant('edge' as const), place, percent }),
  fc.record({ kind: fc.constant('share' as const), place, percent }),
  fc.record({ kind: fc.constant('role' as const), place, role: fc.constantFrom(...PLACE_ROLES) }),
  fc.record({ kind: fc.constant('lock' as const), place, locked: fc.boolean() }),
  fc.record({ kind: fc.constant('title' as const), title: fc.string() }),
  fc.record({ kind: fc.constant('story' as const), story: fc.string() }),
  fc.record({ kind: fc.constant('photograph' as const), photographId: shadeId }),
  fc.record({
    kind: fc.constant('complete' as const),
    shadeIds: fc.array(shadeId, { maxLength: 6 }),
  }),
)
const editsArb = fc.array(editArb, { maxLength: 30 })

const percents = (draft: CombinationDraft) => draft.places.map(({ share }) => percentOf(share))
describe('the draft of a combination', () => {
  it('keeps shares whole and together 100 %, roles all different and no shade twice, whatever is edited', () => {
    fc.assert(
      fc.property(draftArb, editsArb, (draft, edits) => {
        const after = edits.reduce(applyEdit, draft)
        expect(after.places).toHaveLength(5)
        expect(percents(after).reduce((sum, one) => sum + one, 0)).toBe(100)
        expect(after.places.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12)
        for (const { share } of after.places) {
          expect(percentOf(share)).toBeGreaterThanOrEqual(LEAST_PERCENT)
          expect(share * 100).toBeCloseTo(percentOf(share), 9)
        }
        expect(after.places.map(({ role }) => role).sort()).toEqual([...PLACE_ROLES].sort())
        const filled = shadeIdsOf(after).filter((id) => id !== null)
        expect(new Set(filled).size).toBe(filled.length)
      }),
    )
  })

  it('leaves the shade of a locked place where it is, whatever is edited but the lock', () => {
    fc.assert(
      fc.property(draftArb, editsArb, (draft, edits) => {
        const after = edits.filter(({ kind }) => kind !== 'lock').reduce(applyEdit, draft)
        draft.places.forEach((one, at) => {
          if (one.locked) expect(after.places[at]!.shadeId).toBe(one.shadeId)
        })
      }),
    )
  })

  it('is itself again when an edit changes nothing', () => {
    fc.assert(
      fc.property(draftArb, editArb, (draft, edit) => {
        const after = applyEdit(draft, edit)
        if (JSON.stringify(after) === JSON.stringify(draft)) expect(after).toBe(draft)
      }),
    )
  })

  it('fills only empty, unlocked places when it is completed', () => {
    const draft = applyEdit(draftWith('fern', null, 'slate', null, null), {
      kind: 'lock',
      place: 3,
      locked: true,
    })
    const shadeIds = ['rust', 'moss', 'rust', 'peat', 'slate']
    expect(shadeIdsOf(applyEdit(draft, { kind: 'complete', shadeIds }))).toEqual([
      'fern',
      'moss',
      'slate',
      null,
      // Slate stands in the third place already.
      null,
    ])
  })

  it('swaps with the place a shade comes from, and leaves share and role with the place', () => {
    const draft = draftWith('fern', 'moss', null, null, null)
    const moved = applyEdit(draft, { kind: 'place', place: 1, shadeId: 'fern' })
    expect(shadeIdsOf(moved)).toEqual(['moss', 'fern', null, null, null])
    expect(moved.places.map(({ role }) => role)).toEqual(PLACE_ROLES)
    expect(shadeIdsOf(applyEdit(draft, { kind: 'place', place: 4, shadeId: 'fern' }))).toEqual([
      null,
      'moss',
      null,
      null,
      'fern',
    ])
  })

  it('moves an edge between two places only, down to the least share', () => {
    const draft = draftWith()
    expect(percents(applyEdit(draft, { kind: 'edge', place: 1, percent: 31 }))).toEqual([
      20, 31, 9, 20, 20,
    ])
    expect(percents(applyEdit(draft, { kind: 'edge', place: 1, percent: 90 }))).toEqual([
      20,
      40 - LEAST_PERCENT,
      LEAST_PERCENT,
      20,
      20,
    ])
  })

  it('gives a place a share and lets the others keep their proportions', () => {
    const draft = draftWith()
    expect(percents(applyEdit(draft, { kind: 'share', place: 0, percent: 60 }))).toEqual([
      60, 10, 10, 10, 10,
    ])
    expect(percents(applyEdit(draft, { kind: 'share', place: 4, percent: 400 }))).toEqual([
      LEAST_PERCENT,
      LEAST_PERCENT,
      LEAST_PERCENT,
      LEAST_PERCENT,
      MOST_PERCENT,
    ])
  })

  it('reads shares of nothing and of thirds as whole percents', () => {
    const source = (shares: number[]) => ({
      ...draftWith(),
      photographId: null,
      places: shares.map((share, at) => ({
        role: PLACE_ROLES[at]!,
        share,
        locked: false,
        shade: null,
      })),
    })
    expect(percents(draftOf(source([1, 0, 0, 0, 0])))).toEqual([92, 2, 2, 2, 2])
    expect(percents(draftOf(source([1 / 3, 1 / 3, 1 / 9, 1 / 9, 1 / 9])))).toEqual([
      34, 33, 11, 11, 11,
    ])
  })
})

describe('the history of a draft', () => {
  it('takes every step back, and then every step again', () => {
    fc.assert(
      fc.property(draftArb, editsArb, (draft, edits) => {
        const done = edits.reduce((history, edit) => doEdit(history, edit), beginHistory(draft))
        let back = done
        for (let step = 0; step < edits.length; step += 1) back = undo(back)
        expect(back.present).toEqual(draft)
        let again = back
        for (let step = 0; step < edits.length; step += 1) again = redo(again)
        expect(again.present).toEqual(done.present)
        expect(again.past).toEqual(done.past)
      }),
    )
  })

  it('keeps at least twenty steps and forgets only the oldest', () => {
    expect(HISTORY_STEPS).toBeGreaterThanOrEqual(20)
    let history = beginHistory(draftWith())
    for (let step = 0; step <= HISTORY_STEPS + 5; step += 1) {
      history = doEdit(history, { kind: 'title', title: `Title ${step}` })
    }
    expect(history.past).toHaveLength(HISTORY_STEPS)
    expect(undo(history).present.title).toBe(`Title ${HISTORY_STEPS + 4}`)
  })

  it('takes a run of typing back in one step, until it is ended', () => {
    const type = (history: ReturnType<typeof beginHistory>, title: string) =>
      doEdit(history, { kind: 'title', title }, 'title')
    const typed = type(type(beginHistory(draftWith()), 'Fel'), 'Fell')
    expect(undo(typed).present.title).toBe('Hillside')
    expect(undo(type(endRun(typed), 'Fell asleep')).present.title).toBe('Fell')
  })

  it('holds no step for a run that comes back to where it began', () => {
    const drag = (history: ReturnType<typeof beginHistory>, percent: number) =>
      doEdit(history, { kind: 'edge', place: 0, percent }, 'edge')
    const back = drag(drag(drag(beginHistory(draftWith()), 25), 30), 20)
    expect(back.past).toEqual([])
    expect(drag(back, 25).past).toHaveLength(1)
  })

  it('forgets what was undone when something else is done, but not when nothing is', () => {
    const done = doEdit(beginHistory(draftWith()), { kind: 'title', title: 'Fell' })
    const back = undo(done)
    expect(doEdit(back, { kind: 'title', title: 'Hillside' })).toBe(back)
    expect(redo(doEdit(back, { kind: 'story', story: 'Rain.' })).present.title).toBe('Hillside')
  })
})
