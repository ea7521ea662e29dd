import { describe, expect, it } from 'vitest'

import { bandsOf, shadesInWords, standsInWords } from '@/components/board/words'

import { boardOf, card } from './fixtures'

const board = boardOf([])

describe('the words of the board', () => {
  it('say a place by title, place and lane', () => {
    expect(standsInWords('Fog over the tarn', { lane: 'short-listed', at: 1, of: 7 })).toBe(
      'Fog over the tarn, place 2 of 7 in Short-listed',
    )
  })

  it('name the shades of a card, and say what is empty', () => {
    expect(shadesInWords(board, card('a', 'sketched'))).toBe('Fern, Peat; 3 of 5 places empty')
    expect(shadesInWords(board, card('a', 'sketched', { places: [[null, 1]] }))).toBe(
      'No shade chosen yet',
    )
  })

  it('an empty place keeps its share of the card and stays bare', () => {
    expect(bandsOf(board, card('a', 'sketched')).map(({ hex }) => hex)).toEqual([
      '#557744',
      '#443322',
      null,
      null,
      null,
    ])
  })
})
