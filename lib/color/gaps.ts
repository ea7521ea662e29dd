import { converter, modeDlab, modeLab65, useMode as registerMode } from 'culori/fn'

import { deltaE00Row, packLabs } from './ciede2000'
import { screenColor } from './gamut'
import { cornersOfHull, nearestInHull, type Point } from './hull'
import type { Lab } from './types'

for (const mode of [modeLab65, modeDlab]) {
  registerMode(mode as Parameters<typeof registerMode>[0])
}
const toEven = converter('dlab')
const fromEven = converter('lab65')

/** Lab D65 to DIN99o, where distances are even enough for balls. @source DIN 6176:2018 */
export function labToDin99o([l, a, b]: Lab): Point {
  const even = toEven({ mode: 'lab65', l, a, b })
  return [even.l, even.a, even.b]
}

/** DIN99o to Lab D65. @source DIN 6176:2018 */
export function din99oToLab([l, a, b]: Point): Lab {
  const lab = fromEven({ mode: 'dlab', l, a, b })
  return [lab.l, lab.a, lab.b]
}

/** A gap is told when its middle is this ΔE00 from every shade: twice the limit of near-twins. */
export const LEAST_GAP = 8
/** No more than these are told. */
export const MOST_GAPS = 6
/** A ball is found to within this of the largest there is, in DIN99o. */
export const GAP_TOLERANCE = 0.5
const ROUNDING = 1e-6
/** What writing a colour to one decimal of Lab moves it in DIN99o at most. */
const ONE_DECIMAL = 0.15

/** An empty region of a line's range. */
export interface Gap {
  /** Its middle in Lab D65, to one decimal: the colour to aim for. */
  target: Lab
  /** Radius of the empty ball in DIN99o, no shade and no target before it inside. */
  radius: number
  /** The shades about it, as indices of those given, nearest first, with their ΔE00. */
  nearest: { index: number; deltaE: number }[]
}

const distanceOf = (one: Point, other: Point): number => {
  const l = one[0] - other[0]
  const a = one[1] - other[1]
  const b = one[2] - other[2]
  return Math.sqrt(l * l + a * a + b * b)
}

const nearestOf = (to: Point, points: readonly Point[]): number => {
  let nearest = Infinity
  for (const point of points) nearest = Math.min(nearest, distanceOf(to, point))
  return nearest
}

/** A cube of DIN99o; what is found out of it once serves every search. */
interface Cube {
  middle: Point
  half: number
  /** Half its diagonal. */
  reach: number
  /** From its middle to the nearest shade, later to the nearest target. */
  empty: number
  /** The shades that one of its points could be nearest to. */
  near: Point[]
  /** How many targets it has been told of. */
  told: number
  /** The colour of the hull nearest its middle; null when the whole cube is out of the hull. */
  inside?: { target: Lab; point: Point; onScreen: boolean } | null
  eighths?: Cube[]
}

function makeCube(shades: readonly Point[], middle: Point, half: number): Cube {
  const reach = half * Math.sqrt(3)
  const distances = shades.map((shade) => distanceOf(middle, shade))
  const empty = Math.min(...distances)
  const near = shades.filter((_, at) => distances[at]! <= empty + 2 * reach + ONE_DECIMAL)
  return { middle, half, reach, empty, near, told: 0 }
}

function boxOf(shades: readonly Point[]): Cube {
  const sides = ([0, 1, 2] as const).map((axis) => shades.map((point) => point[axis]))
  const low = sides.map((side) => Math.min(...side))
  const high = sides.map((side) => Math.max(...side))
  const [l, a, b] = low.map((value, axis) => (value + high[axis]!) / 2)
  const widest = Math.max(...high.map((value, axis) => value - low[axis]!))
  return makeCube(shades, [l!, a!, b!], widest / 2)
}

function eighthsOf(cube: Cube): Cube[] {
  const half = cube.half / 2
  const [l, a, b] = cube.middle.map((value) => [value - half, value + half])
  cube.eighths ??= l!.flatMap((l) =>
    a!.flatMap((a) => b!.map((b) => makeCube(cube.near, [l, a, b], half))),
  )
  return cube.eighths
}

const toOneDecimal = (value: number): number => Math.round(value * 10) / 10 + 0

function insideOf(cube: Cube, hull: readonly Point[]): Cube['inside'] {
  if (cube.inside === undefined) {
    const { point, distance } = nearestInHull(hull, cube.middle)
    if (distance > cube.reach + ROUNDING) return (cube.inside = null)
    // What is told is what is judged: the colour as it is written down.
    const target = din99oToLab(point).map(toOneDecimal) as unknown as Lab
    const { inGamut } = screenColor(target)
    cube.inside = { target, point: labToDin99o(target), onScreen: inGamut }
  }
  return cube.inside
}

/**
 * The largest ball with its middle in the hull and on the screen and neither shade nor target
 * inside, to GAP_TOLERANCE. Cubes are halved level by level: none can hold the middle of a larger
 * ball than its own middle's way to the nearest point and half its diagonal.
 */
function largestBall(
  box: Cube,
  hull: readonly Point[],
  targets: readonly Point[],
): { target: Lab; middle: Point; radius: number } | null {
  let best: { target: Lab; middle: Point } | null = null
  let radius = 0
  for (let level = [box]; level.length > 0;) {
    const open: Cube[] = []
    for (const cube of level) {
      cube.empty = Math.min(cube.empty, nearestOf(cube.middle, targets.slice(cube.told)))
      cube.told = targets.length
      if (cube.empty + cube.reach <= radius + GAP_TOLERANCE) continue
      const inside = insideOf(cube, hull)
      if (!inside) continue
      if (inside.onScreen) {
        const { target, point: middle } = inside
        const least = Math.min(nearestOf(middle, cube.near), nearestOf(middle, targets))
        if (least > radius) [best, radius] = [{ target, middle }, least]
      }
      if (cube.reach > GAP_TOLERANCE) open.push(cube)
    }
    level = open
      .filter(({ empty, reach }) => empty + reach > radius + GAP_TOLERANCE)
      .flatMap(eighthsOf)
  }
  return best && { ...best, radius }
}

/**
 * The largest empty regions inside the range that shades already span, the largest first; each
 * counts those before it as filled. The range is the convex hull of the shades in DIN99o, and a
 * region the ball about a point of it that holds no shade; only points that sRGB can show are
 * targets, since of what can be dyed only the shades themselves tell. A region is told when its
 * target is LEAST_GAP ΔE00 from every shade and every target before it, and at most MOST_GAPS are.
 * The same shades give the same regions. About 15 ms a region for 500 shades.
 * @source DIN 6176:2018 (DIN99o); largest empty ball by branch and bound, the search is ours
 */
export function findGaps(shades: readonly Lab[]): Gap[] {
  if (shades.length < 2) return []
  const points = shades.map(labToDin99o)
  const hull = cornersOfHull(points)
  const box = boxOf(points)
  const targets: Point[] = []
  const labs = [...shades]
  const gaps: Gap[] = []
  while (gaps.length < MOST_GAPS) {
    const ball = largestBall(box, hull, targets)
    if (!ball) break
    const { target } = ball
    const differences = new Float64Array(labs.length)
    deltaE00Row(target, packLabs(labs), differences)
    if (Math.min(...differences) < LEAST_GAP) break
    const nearest = shades
      .map((_, index) => ({ index, deltaE: differences[index]! }))
      .sort((one, other) => one.deltaE - other.deltaE)
      .slice(0, 3)
    gaps.push({ target, radius: ball.radius, nearest })
    targets.push(ball.middle)
    labs.push(target)
  }
  return gaps
}
