import { LANE_WORDS, type Lane } from '@/lib/combinations/constants'
import type { BoardCard, BoardView } from '@/lib/combinations/present'
import type { CardBand } from '@/components/yarn/card-strokes'

/** "Fog over the tarn, place 2 of 7 in Short-listed"; `at` from 0. */
export const standsInWords = (
  title: string,
  { lane, at, of }: { lane: Lane; at: number; of: number },
): string => `${title}, place ${at + 1} of ${of} in ${LANE_WORDS[lane]}`

/** The places of a card as bands, top to bottom; empty ones are left bare. */
export const bandsOf = ({ shades }: Pick<BoardView, 'shades'>, { places }: BoardCard): CardBand[] =>
  places.map(([shade, share]) => {
    const held = shade === null ? undefined : shades[shade]
    return { hex: held?.hex ?? null, share, name: held?.label ?? 'empty' }
  })

/** The shades of a card by name, and how many places are empty still. */
export function shadesInWords(board: Pick<BoardView, 'shades'>, card: BoardCard): string {
  const names = card.places.flatMap(([shade]) =>
    shade === null ? [] : (board.shades[shade]?.label ?? []),
  )
  const empty = card.places.length - names.length
  if (names.length === 0) return 'No shade chosen yet'
  return empty > 0 ? `${names.join(', ')}; ${empty} of 5 places empty` : names.join(', ')
}
