import { LANE_WORDS, type Lane } from '@/lib/combinations/constants'
import type { BoardCard, BoardView } from '@/lib/combinations/present'
import type { Band } from '@/components/yarn/bands'

/** "Fog over the tarn, place 2 of 7 in Short-listed"; `at` from 0. */
export const standsInWords = (
  title: string,
  { lane, at, of }: { lane: Lane; at: number; of: number },
): string => `${title}, place ${at + 1} of ${of} in ${LANE_WORDS[lane]}`

/** The shades of a card as bands, top to bottom; empty places are left bare. */
export const bandsOf = ({ shades }: Pick<BoardView, 'shades'>, { places }: BoardCard): Band[] =>
  places.flatMap(([shade, share]) => {
    const held = shade === null ? undefined : shades[shade]
    return held ? { hex: held.hex, share, name: held.label } : []
  })

/** The shades of a card by name, and how many places are empty still. */
export function shadesInWords(board: Pick<BoardView, 'shades'>, card: BoardCard): string {
  const names = bandsOf(board, card).map(({ name }) => name)
  const empty = card.places.length - names.length
  if (names.length === 0) return 'No shade chosen yet'
  return empty > 0 ? `${names.join(', ')}; ${empty} of 5 places empty` : names.join(', ')
}
