import { ellipse, stroke, type Layer, type Rgb } from './picture'

/** A blade or stem that leaves the ground upright and leans over, thinner towards its tip; pixels. */
export function blade(
  layer: Layer,
  x: number,
  y: number,
  height: number,
  lean: number,
  width: number,
  root: Rgb,
  tip: Rgb,
): void {
  const parts = height > 60 ? 7 : 4
  let fromX = x
  let fromY = y
  let from = root
  for (let i = 1; i <= parts; i++) {
    const t = i / parts
    const toX = x + lean * t * t
    const toY = y - height * (t - 0.22 * t * t * Math.min(1, Math.abs(lean) / height))
    const to: Rgb = [
      root[0] + (tip[0] - root[0]) * t,
      root[1] + (tip[1] - root[1]) * t,
      root[2] + (tip[2] - root[2]) * t,
    ]
    const r0 = (width / 2) * (1 - ((i - 1) / parts) ** 1.6 * 0.9)
    const r1 = (width / 2) * (1 - t ** 1.6 * 0.9)
    stroke(layer, fromX, fromY, toX, toY, r0, r1, from, to)
    fromX = toX
    fromY = toY
    from = to
  }
}

/** An open flower seen at a slant: petals around a heart; `size` is its width in pixels. */
export function flower(
  layer: Layer,
  x: number,
  y: number,
  size: number,
  petals: number,
  turn: number,
  tilt: number,
  color: Rgb,
  heart: Rgb,
): void {
  if (size < 5) {
    ellipse(layer, x, y, size / 2, (size / 2) * tilt, 0, color, 1, 0.35)
    return
  }
  for (let i = 0; i < petals; i++) {
    const angle = turn + (i / petals) * Math.PI * 2
    const dx = Math.cos(angle)
    const dy = Math.sin(angle) * tilt
    const lit = 0.82 + 0.28 * (1 - dy) - 0.1 * (i % 2)
    const petal: Rgb = [color[0] * lit, color[1] * lit, color[2] * lit]
    const along = Math.atan2(dy, dx)
    const reach = size * 0.27 * Math.hypot(dx, dy)
    ellipse(
      layer,
      x + dx * size * 0.27,
      y + dy * size * 0.27,
      reach + size * 0.05,
      size * 0.17,
      along,
      petal,
      1,
      0.2,
    )
  }
  ellipse(layer, x, y, size * 0.11, size * 0.11 * tilt, 0, heart, 1, 0.3)
}
