import type { Lane } from '@/lib/combinations/constants'
import type { BoardCard, BoardView } from '@/lib/combinations/present'

/** A card of two shades. */
export const card = (id: string, lane: Lane, values: Partial<BoardCard> = {}): BoardCard => ({
  id,
  lane,
  title: `Title of ${id}`,
  places: [
    [0, 0.2],
    [1, 0.2],
    [null, 0.2],
    [null, 0.2],
    [null, 0.2],
  ],
  photograph: null,
  author: null,
  ...values,
})

/** A board of these cards, which come lane by lane. */
export const boardOf = (cards: BoardCard[], values: Partial<BoardView> = {}): BoardView => ({
  revision: 5,
  cards,
  shades: [
    { id: 's0', label: 'Fern', hex: '#557744', familyId: 'greens' },
    { id: 's1', label: 'Peat', hex: '#443322', familyId: 'browns' },
    { id: 's2', label: 'Whey', hex: '#eeeedd', familyId: null },
  ],
  families: [
    { id: 'greens', name: 'Greens' },
    { id: 'browns', name: 'Browns' },
  ],
  photographs: [{ id: 'p0', title: 'The beck' }],
  authors: [{ id: 'w0', name: 'Anjali Fellgarth' }],
  ...values,
})

/** Three sketches, two on the short list, none chosen. */
export const smallBoard = (values: Partial<BoardView> = {}): BoardView =>
  boardOf(
    [
      ...['a', 'b', 'c'].map((id) => card(id, 'sketched')),
      ...['d', 'e'].map((id) => card(id, 'short-listed')),
    ],
    values,
  )
