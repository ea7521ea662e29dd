import { randomUUID } from 'node:crypto'

import { describe, expect, it } from 'vitest'

import {
  galleryFilterSchema,
  photographStatesSchema,
  updatePhotographSchema,
} from '@/lib/photographs/schema'

const DETAILS = {
  photographId: randomUUID(),
  version: 1,
  title: 'The tarn',
  photographer: '',
  licence: '' as const,
  licenceNote: '',
  licenceUrl: '',
  sourceUrl: '',
  altText: '',
}

const faultsOf = (changes: object) =>
  (updatePhotographSchema.safeParse({ ...DETAILS, ...changes }).error?.issues ?? []).map(
    ({ path }) => path.join('.'),
  )

describe('what is said about a photograph', () => {
  it.each([
    ['no licence yet', {}, []],
    ['own work', { licence: 'own-work' }, []],
    ['CC0', { licence: 'cc0' }, []],
    ['a permission without a word on it', { licence: 'permission' }, ['licenceNote']],
    ['a permission', { licence: 'permission', licenceNote: 'By letter, 3 May 2026' }, []],
    ['another licence that is not named', { licence: 'other' }, ['licenceNote']],
    ['CC BY without name and link', { licence: 'cc-by' }, ['photographer', 'licenceUrl']],
    [
      'CC BY',
      { licence: 'cc-by', photographer: 'A. Fell', licenceUrl: 'https://licence.example/by' },
      [],
    ],
    ['a link that runs a script', { sourceUrl: 'javascript:alert(1)' }, ['sourceUrl']],
    ['a link without its scheme', { sourceUrl: 'www.site.example/a' }, ['sourceUrl']],
    ['no title', { title: '   ' }, ['title']],
    ['a field that does not exist', { state: 'ready' }, ['']],
  ])('%s', (_, changes, faults) => {
    expect(faultsOf(changes)).toEqual(faults)
  })
})

describe('the gallery’s filter', () => {
  it('leaves out what does not fit, so that any address shows a page', () => {
    expect(
      galleryFilterSchema.parse({ q: 'x'.repeat(500), state: 'gone', missing: ['a'], page: '-3' }),
    ).toEqual({ q: '', state: null, missing: null, page: 1 })
  })

  it('takes what fits', () => {
    const filter = { q: 'tarn', state: 'failed', missing: 'alt', page: '2' }
    expect(galleryFilterSchema.parse(filter)).toEqual({ ...filter, page: 2 })
  })
})

describe('the photographs a page follows', () => {
  it('are some, and by id', () => {
    const ids = Array.from({ length: 101 }, () => randomUUID())
    const parse = (list: string[]) => photographStatesSchema.safeParse({ ids: list.join(',') })
    expect(parse(ids.slice(0, 100)).success).toBe(true)
    expect(parse(ids).success).toBe(false)
    expect(parse([]).success).toBe(false)
    expect(parse(['1 OR 1=1']).success).toBe(false)
  })
})
