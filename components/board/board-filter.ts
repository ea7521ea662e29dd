import type { BoardCard, BoardView } from '@/lib/combinations/present'

/** What the board is narrowed to; empty texts narrow nothing. Ids are of the board's lists. */
export interface BoardFilter {
  q: string
  family: string
  photograph: string
  author: string
}

const FIELDS = ['q', 'family', 'photograph', 'author'] as const

/** The filter of an address; what names nothing on the board narrows nothing. */
export function readFilter(address: { get(name: string): string | null }, board: BoardView) {
  const one = (name: string, things: readonly { id: string }[]) => {
    const id = address.get(name) ?? ''
    return things.some((thing) => thing.id === id) ? id : ''
  }
  const filter: BoardFilter = {
    q: (address.get('q') ?? '').slice(0, 80),
    family: one('family', board.families),
    photograph: one('photograph', board.photographs),
    author: one('author', board.authors),
  }
  return filter
}

/** A filter as the query of an address, "" or with its question mark. */
export function writeFilter(filter: BoardFilter): string {
  const set = FIELDS.filter((name) => filter[name] !== '').map((name) => [name, filter[name]])
  const query = new URLSearchParams(set).toString()
  return query && `?${query}`
}

/** Whether anything is narrowed at all. */
export const isNarrowed = (filter: BoardFilter): boolean =>
  FIELDS.some((name) => filter[name].trim() !== '')

/** The test that a card must pass to be shown. */
export function passes(board: BoardView, filter: BoardFilter): (card: BoardCard) => boolean {
  const words = filter.q.trim().toLowerCase()
  const inFamily = new Set(
    board.shades.flatMap(({ familyId }, at) => (familyId === filter.family ? at : [])),
  )
  const named = new Set(
    board.shades.flatMap(({ label }, at) => (label.toLowerCase().includes(words) ? at : [])),
  )
  const holds = (card: BoardCard, some: ReadonlySet<number>) =>
    card.places.some(([shade]) => shade !== null && some.has(shade))
  return (card) =>
    (!filter.family || holds(card, inFamily)) &&
    (!filter.photograph || at(board.photographs, card.photograph) === filter.photograph) &&
    (!filter.author || at(board.authors, card.author) === filter.author) &&
    (!words || card.title.toLowerCase().includes(words) || holds(card, named))
}

const at = (things: readonly { id: string }[], index: number | null) =>
  index === null ? undefined : things[index]?.id
