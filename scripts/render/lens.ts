import { blur, type Picture } from './picture'

/**
 * Blurs what lies away from the plane of focus, in place. `depth`: metres a pixel; `strength`:
 * blur in pixels for a difference of one dioptre. Three blurred copies, mixed by depth.
 */
export function focus(
  picture: Picture,
  depth: Float32Array,
  plane: number,
  strength: number,
  widest = 14,
): void {
  const { width, height, data } = picture
  const sigmas = [widest / 6, widest / 2.4, widest]
  const copies = sigmas.map((sigma) => {
    const copy = { width, height, data: new Float32Array(data) }
    blur(copy, sigma)
    return copy.data
  })
  const levels = [0, ...sigmas]
  const sharp = new Float32Array(data)
  for (let i = 0; i < depth.length; i++) {
    const wanted = Math.min(widest, Math.abs(1 / depth[i]! - 1 / plane) * strength)
    let step = 0
    while (step < 2 && wanted > levels[step + 1]!) step++
    const t = (wanted - levels[step]!) / (levels[step + 1]! - levels[step]!)
    const from = step === 0 ? sharp : copies[step - 1]!
    const to = copies[step]!
    for (let c = 0; c < 3; c++) {
      const at = i * 3 + c
      data[at] = from[at]! * (1 - t) + to[at]! * t
    }
  }
}
