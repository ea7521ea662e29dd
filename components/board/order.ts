import { LANES, type Lane } from '@/lib/combinations/constants'

/** The ids of each lane's combinations, top to bottom. */
export type Order = Readonly<Record<Lane, readonly string[]>>

/** Where a card goes: right under one card and right above another, null at the lane's ends. */
export interface Place {
  lane: Lane
  after: string | null
  before: string | null
}

/** A card that goes somewhere, and the lane it was seen in. */
export interface Move extends Place {
  combinationId: string
  from: Lane
}

/** The order of cards that come lane by lane, each top to bottom. */
export function orderOf(cards: readonly { id: string; lane: Lane }[]): Order {
  const inLane = (lane: Lane) => cards.filter((card) => card.lane === lane).map(({ id }) => id)
  return Object.fromEntries(LANES.map((lane) => [lane, inLane(lane)])) as unknown as Order
}

/** The lane a card is in and its index there; null when it is on no lane. */
export function find(order: Order, id: string): { lane: Lane; at: number } | null {
  for (const lane of LANES) {
    const at = order[lane].indexOf(id)
    if (at >= 0) return { lane, at }
  }
  return null
}

/** Between which cards a card stands now; null when it is on no lane. */
export function placeOf(order: Order, id: string): Place | null {
  const stands = find(order, id)
  if (!stands) return null
  const { lane, at } = stands
  return { lane, after: order[lane][at - 1] ?? null, before: order[lane][at + 1] ?? null }
}

/**
 * Between which cards of the whole lane a card goes, when it is put at index `at` among those of
 * the lane that are shown (`shown`, without the card itself): right under the one shown above it,
 * or, at the top, right above the first that is shown.
 */
export function placeAmong(
  order: Order,
  id: string,
  { lane, at, shown }: { lane: Lane; at: number; shown: readonly string[] },
): Place {
  const others = order[lane].filter((other) => other !== id)
  const above = shown[at - 1]
  if (above !== undefined) {
    return { lane, after: above, before: others[others.indexOf(above) + 1] ?? null }
  }
  const below = shown[0] ?? others[0]
  if (below === undefined) return { lane, after: null, before: null }
  return { lane, after: others[others.indexOf(below) - 1] ?? null, before: below }
}

/**
 * The order after a move. A card that is on no lane goes nowhere; one whose neighbours have both
 * left goes to the top, until the server has said what becomes of it.
 */
export function applyMove(
  order: Order,
  { combinationId, lane, after, before }: Pick<Move, 'combinationId' | keyof Place>,
): Order {
  if (!find(order, combinationId)) return order
  const without = Object.fromEntries(
    LANES.map((one) => [one, order[one].filter((id) => id !== combinationId)]),
  ) as unknown as Order
  const others = without[lane]
  const above = after === null ? -1 : others.indexOf(after)
  const below = before === null ? -1 : others.indexOf(before)
  const at = above >= 0 ? above + 1 : Math.max(0, below)
  return { ...without, [lane]: others.toSpliced(at, 0, combinationId) }
}

/** Whether a card stands where the place says already. */
export function standsAt(order: Order, id: string, place: Place): boolean {
  const now = placeOf(order, id)
  return now?.lane === place.lane && now.after === place.after && now.before === place.before
}

/**
 * The move that brings a card back to where it stood, or as near as its former neighbours still
 * allow; null when it is on no lane.
 */
export function moveBack(order: Order, id: string, { lane, after, before }: Place): Move | null {
  const from = find(order, id)?.lane
  if (!from) return null
  const others = order[lane].filter((other) => other !== id)
  const above = after === null ? -1 : others.indexOf(after)
  const below = before === null ? others.length : others.indexOf(before)
  const at = above >= 0 ? above + 1 : after === null ? 0 : Math.max(0, below)
  return {
    combinationId: id,
    from,
    lane,
    after: others[at - 1] ?? null,
    before: others[at] ?? null,
  }
}
