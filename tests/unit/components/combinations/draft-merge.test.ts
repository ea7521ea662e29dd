import { describe, expect, it } from 'vitest'

import { applyEdit, type CombinationDraft, type DraftEdit } from '@/components/combinations/draft'
import { beginHistory, doEdit, redo, undo } from '@/components/combinations/draft-history'
import { differingParts, joinDrafts, rebaseHistory } from '@/components/combinations/draft-merge'

import { draftWith, shadeIdsOf } from './fixtures'

const base = draftWith('fern', 'moss', 'slate', null, null)
const edited = (...edits: DraftEdit[]): CombinationDraft => edits.reduce(applyEdit, base)
const put = (place: number, shadeId: string): DraftEdit => ({ kind: 'place', place, shadeId })
const title = (words: string): DraftEdit => ({ kind: 'title', title: words })

describe('two drafts joined', () => {
  it('holds what both changed when they touched different things', () => {
    const mine = edited(title('Fell'), put(3, 'rust'))
    const theirs = edited(
      put(4, 'peat'),
      { kind: 'share', place: 0, percent: 40 },
      { kind: 'story', story: 'After rain.' },
    )
    const { draft, conflicts } = joinDrafts(base, mine, theirs)
    expect(conflicts).toEqual([])
    expect(shadeIdsOf(draft)).toEqual(['fern', 'moss', 'slate', 'rust', 'peat'])
    expect(draft.title).toBe('Fell')
    expect(draft.story).toBe('After rain.')
    expect(differingParts(draft, theirs)).toEqual(['title', 'place 4'])
  })

  it('names each field and each place that both changed, and prefers who is asked for', () => {
    const mine = edited(title('Fell'), put(0, 'rust'), put(3, 'dawn'))
    const theirs = edited(title('Tarn'), put(0, 'peat'))
    expect(joinDrafts(base, mine, theirs).conflicts).toEqual(['title', 'place 1'])
    expect(joinDrafts(base, mine, theirs, 'mine').draft).toEqual(mine)
    const taken = joinDrafts(base, mine, theirs, 'theirs').draft
    expect(taken.title).toBe('Tarn')
    expect(shadeIdsOf(taken)).toEqual(['peat', 'moss', 'slate', 'dawn', null])
  })

  it('is no conflict when both did the same', () => {
    expect(joinDrafts(base, edited(title('Fell')), edited(title('Fell '))).conflicts).toEqual([])
  })

  it('takes shares as one thing, and roles as one, since each depends on the others', () => {
    const mine = edited({ kind: 'edge', place: 0, percent: 30 })
    const theirs = edited({ kind: 'edge', place: 3, percent: 30 })
    expect(joinDrafts(base, mine, theirs).conflicts).toEqual(['shares'])
    expect(
      joinDrafts(
        base,
        edited({ kind: 'role', place: 0, role: 'CC1' }),
        edited({ kind: 'role', place: 2, role: 'CC3' }),
      ).conflicts,
    ).toEqual(['roles'])
  })

  it('never holds a shade twice: the places that differ are a conflict then', () => {
    const mine = edited(put(3, 'rust'))
    const theirs = edited(put(4, 'rust'))
    const { draft, conflicts } = joinDrafts(base, mine, theirs)
    expect(conflicts).toEqual(['place 4', 'place 5'])
    expect(shadeIdsOf(draft)).toEqual(shadeIdsOf(mine))
    expect(shadeIdsOf(joinDrafts(base, mine, theirs, 'theirs').draft)).toEqual(shadeIdsOf(theirs))
  })
})

describe('a history on top of what somebody else saved', () => {
  it('undoes what was done here and leaves theirs alone', () => {
    const history = doEdit(beginHistory(base), put(3, 'rust'))
    const rebased = rebaseHistory(history, base, edited(title('Tarn')))
    expect(rebased.present.title).toBe('Tarn')
    const back = undo(rebased).present
    expect(back.title).toBe('Tarn')
    expect(shadeIdsOf(back)).toEqual(shadeIdsOf(base))
    expect(shadeIdsOf(redo(undo(rebased)).present)).toEqual(shadeIdsOf(history.present))
  })

  it('makes taking theirs a step that can be undone', () => {
    const history = doEdit(beginHistory(base), title('Fell'))
    const rebased = rebaseHistory(history, base, edited(title('Tarn')), 'theirs')
    expect(rebased.present.title).toBe('Tarn')
    expect(undo(rebased).present.title).toBe('Fell')
  })

  it('has no step that changes nothing', () => {
    const history = doEdit(beginHistory(base), title('Tarn'))
    expect(rebaseHistory(history, base, edited(title('Tarn'))).past).toEqual([])
  })
})
