/** A point of any space of three axes. */
export type Point = readonly [number, number, number]

const minus = (one: Point, other: Point): Point => [
  one[0] - other[0],
  one[1] - other[1],
  one[2] - other[2],
]
const dot = (one: Point, other: Point): number =>
  one[0] * other[0] + one[1] * other[1] + one[2] * other[2]

/** Where, from the first of the corners, the rest of the flat through them is nearest the origin. */
function affineWeights(corners: readonly Point[]): number[] | null {
  const [base] = corners
  const edges = corners.slice(1).map((corner) => minus(corner, base!))
  const rows = edges.map((edge) => [...edges.map((other) => dot(edge, other)), -dot(edge, base!)])
  const size = edges.length
  const scale = Math.max(...rows.map((row, at) => row[at]!))
  for (let at = 0; at < size; at++) {
    let pivot = at
    for (let row = at + 1; row < size; row++) {
      if (Math.abs(rows[row]![at]!) > Math.abs(rows[pivot]![at]!)) pivot = row
    }
    ;[rows[at], rows[pivot]] = [rows[pivot]!, rows[at]!]
    const lead = rows[at]![at]!
    if (Math.abs(lead) < 1e-12 * scale) return null
    for (let row = 0; row < size; row++) {
      if (row === at) continue
      const times = rows[row]![at]! / lead
      for (let column = at; column <= size; column++) {
        rows[row]![column]! -= times * rows[at]![column]!
      }
    }
  }
  const weights = rows.map((row, at) => row[size]! / row[at]!)
  return [1 - weights.reduce((sum, weight) => sum + weight, 0), ...weights]
}

/** Under this a corner counts for nothing. */
const NO_WEIGHT = 1e-12

/**
 * The point of the convex hull of n points that is nearest to another, and how far it is: 0 inside.
 * Flat hulls, lines and single points are hulls like any other. Some ten passes over the points.
 * Throws RangeError when there are none.
 * @source Wolfe (1976) Math. Programming 11:128–149, the nearest point of a polytope
 */
export function nearestInHull(
  points: readonly Point[],
  to: Point,
): { point: Point; distance: number } {
  if (points.length === 0) throw new RangeError('There is no hull of no points.')
  let start = points[0]!
  let extent = 0
  let least = Infinity
  for (const point of points) {
    const away = minus(point, to)
    const squared = dot(away, away)
    if (squared < least) [start, least] = [point, squared]
    extent = Math.max(extent, squared)
  }
  // Relative to `to`, so that the point sought is the one nearest the origin.
  let nearest = minus(start, to)
  let corners = [{ point: start, away: nearest, weight: 1 }]
  // Exact arithmetic ends by itself; rounding might go round in a circle.
  for (let turn = 0; turn < 100; turn++) {
    let ahead = start
    let along = Infinity
    for (const point of points) {
      const here = dot(point, nearest)
      if (here < along) [ahead, along] = [point, here]
    }
    const gain = dot(nearest, nearest) + dot(to, nearest) - along
    if (gain <= 1e-12 * extent || corners.some(({ point }) => point === ahead)) break
    corners.push({ point: ahead, away: minus(ahead, to), weight: 0 })
    for (let inside = false; !inside;) {
      const wanted = affineWeights(corners.map(({ away }) => away))
      if (!wanted) {
        // The new corner lies in the flat of the others, to rounding: they are as good as can be.
        corners = corners.filter(({ weight }) => weight > 0)
        turn = 100
        break
      }
      const steps = corners.flatMap(({ weight }, at) =>
        wanted[at]! > NO_WEIGHT ? [] : [weight / (weight - wanted[at]! || 1)],
      )
      inside = steps.length === 0
      const step = Math.min(1, ...steps)
      corners = corners
        .map((corner, at) => ({
          ...corner,
          weight: corner.weight + step * (wanted[at]! - corner.weight),
        }))
        .filter(({ weight }) => weight > NO_WEIGHT)
    }
    nearest = [0, 0, 0]
    for (const { away, weight } of corners) {
      nearest = [
        nearest[0] + weight * away[0],
        nearest[1] + weight * away[1],
        nearest[2] + weight * away[2],
      ]
    }
  }
  return {
    point: [to[0] + nearest[0], to[1] + nearest[1], to[2] + nearest[2]],
    distance: Math.sqrt(dot(nearest, nearest)),
  }
}

/**
 * Of some points, those that the hull cannot do without: equal ones once, none inside or on a side.
 * O(n²).
 */
export function cornersOfHull(points: readonly Point[]): Point[] {
  const corners = new Set(points)
  for (const point of points) {
    corners.delete(point)
    const needed = corners.size === 0 || nearestInHull([...corners], point).distance > 1e-9
    if (needed) corners.add(point)
  }
  return [...corners]
}
