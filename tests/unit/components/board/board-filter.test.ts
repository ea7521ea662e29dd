import { describe, expect, it } from 'vitest'

import { isNarrowed, passes, readFilter, writeFilter } from '@/components/board/board-filter'

import { boardOf, card } from './fixtures'

const board = boardOf([
  card('a', 'sketched', { title: 'Fog over the tarn', photograph: 0 }),
  card('b', 'chosen', { title: 'Low sun', author: 0, places: [[2, 1]] }),
])
const found = (query: string) => {
  const fits = passes(board, readFilter(new URLSearchParams(query), board))
  return board.cards.filter(fits).map(({ id }) => id)
}

describe('the filter of the board', () => {
  it.each([
    ['', ['a', 'b']],
    ['q=FOG', ['a']],
    ['q=whey', ['b']],
    ['q=%20sun%20', ['b']],
    ['q=nothing', []],
    ['family=greens', ['a']],
    ['photograph=p0', ['a']],
    ['author=w0', ['b']],
    ['author=w0&q=fern', []],
  ])('“%s” finds %j', (query, ids) => {
    expect(found(query)).toEqual(ids)
  })

  it('names in an address that stand for nothing narrow nothing', () => {
    const filter = readFilter(new URLSearchParams('family=blues&author=x&page=9'), board)
    expect(isNarrowed(filter)).toBe(false)
    expect(writeFilter(filter)).toBe('')
  })

  it('is written into the address as it is read from it', () => {
    const query = '?q=low+sun&family=browns&photograph=p0&author=w0'
    expect(writeFilter(readFilter(new URLSearchParams(query), board))).toBe(query)
  })
})
