/**
 * Where labels go so that none covers the next: as near their marks as can be, in the marks' order,
 * at least `gap` apart and within `from`–`to` as far as they fit.
 */
export function spreadLabels(
  marks: readonly number[],
  gap: number,
  from: number,
  to: number,
): number[] {
  const order = marks.map((_, index) => index).sort((one, other) => marks[one]! - marks[other]!)
  // Neighbours that would overlap move as one, about the middle of their marks.
  const blocks: { first: number; count: number; at: number }[] = []
  const place = (first: number, count: number) => {
    const members = order.slice(first, first + count)
    const middle = members.reduce((sum, index, rank) => sum + marks[index]! - rank * gap, 0) / count
    return Math.max(from, Math.min(middle, to - (count - 1) * gap))
  }
  for (let rank = 0; rank < order.length; rank++) {
    let block = { first: rank, count: 1, at: place(rank, 1) }
    for (;;) {
      const before = blocks.at(-1)
      if (!before || before.at + before.count * gap <= block.at) break
      blocks.pop()
      const count = before.count + block.count
      block = { first: before.first, count, at: place(before.first, count) }
    }
    blocks.push(block)
  }
  const places = new Array<number>(marks.length).fill(from)
  for (const { first, count, at } of blocks) {
    for (let rank = 0; rank < count; rank++) places[order[first + rank]!] = at + rank * gap
  }
  return places
}

/** A point of a figure. */
export type PlotPoint = readonly [x: number, y: number]

/**
 * The corners of the convex outline about some points, in order round it.
 * @source Andrew (1979) Inf. Process. Lett. 9(5):216–219, the monotone chain
 */
export function outlineOf(points: readonly PlotPoint[]): PlotPoint[] {
  const sorted = [...points].sort((one, other) => one[0] - other[0] || one[1] - other[1])
  const half = (ordered: readonly PlotPoint[]) => {
    const chain: PlotPoint[] = []
    for (const point of ordered) {
      while (chain.length > 1 && turn(chain.at(-2)!, chain.at(-1)!, point) <= 0) chain.pop()
      chain.push(point)
    }
    return chain.slice(0, -1)
  }
  return sorted.length < 2 ? sorted : [...half(sorted), ...half(sorted.reverse())]
}

const turn = (from: PlotPoint, over: PlotPoint, to: PlotPoint): number =>
  (over[0] - from[0]) * (to[1] - from[1]) - (over[1] - from[1]) * (to[0] - from[0])
