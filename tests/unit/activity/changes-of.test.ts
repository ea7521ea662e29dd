import { describe, expect, it } from 'vitest'

import { changesOf } from '@/lib/activity/changes-of'

describe('what an edit changed', () => {
  it('is the fields that differ, as they were and as they are', () => {
    const before = { name: 'Moss', number: '14', fibres: [{ fibre: 'wool', percent: 100 }] }
    const after = { name: 'Fern', number: '14', fibres: [{ percent: 100, fibre: 'wool' }] }
    expect(changesOf(before, after)).toEqual({ before: { name: 'Moss' }, after: { name: 'Fern' } })
  })

  it('leaves out a field that was left alone, and says null of one that was not there', () => {
    expect(changesOf({ name: 'Moss' }, { name: undefined, note: 'new' })).toEqual({
      before: { note: null },
      after: { note: 'new' },
    })
  })

  it('is nothing when every field is as it was', () => {
    expect(changesOf({ name: 'Moss', at: new Date(0) }, { at: new Date(0) })).toBeNull()
  })
})
