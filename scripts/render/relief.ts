import { fbm2, mix, smoothstep } from './noise'
import { blur, makePicture, type Picture } from './picture'

/** Heights of a surface seen face on, in units of which `unitPixels` pixels make one. */
export interface Relief {
  width: number
  height: number
  data: Float32Array
}

/**
 * Lights a surface face on by a low warm sun (x right, y down, z towards the eye) and a blue sky:
 * shading, cast shadows and dark hollows.
 */
export function lightRelief(
  relief: Relief,
  color: Picture,
  unitPixels: number,
  sun: { x: number; y: number; z: number },
): Picture {
  const { width, height, data } = relief
  const near = { width, height, data: new Float32Array(data) }
  blur(near, unitPixels * 0.02)
  const wide = { width, height, data: new Float32Array(data) }
  blur(wide, unitPixels * 0.11)
  const out = makePicture(width, height)
  for (let py = 0; py < height; py++) {
    for (let px = 0; px < width; px++) {
      const at = py * width + px
      const h = data[at]!
      const right = data[at + (px < width - 1 ? 1 : 0)]!
      const below = data[at + (py < height - 1 ? width : 0)]!
      const nx = (h - right) * unitPixels
      const ny = (h - below) * unitPixels
      const n = 1 / Math.hypot(nx, ny, 1)
      const facing = Math.max(0, (nx * sun.x + ny * sun.y + sun.z) * n)
      let open = 1
      for (let s = 2; s < unitPixels * 0.9 && open > 0; s *= 1.16) {
        const qx = Math.round(px + sun.x * s)
        const qy = Math.round(py + sun.y * s)
        if (qx < 0 || qy < 0 || qx >= width || qy >= height) break
        const room = h + (sun.z * s) / unitPixels - data[qy * width + qx]!
        open = Math.min(open, 1 + (room * unitPixels) / (s * 0.22))
      }
      const hollow = Math.min(
        1,
        Math.max(0.08, 1 - (wide.data[at]! - h) * 3.6 - (near.data[at]! - h) * 5),
      )
      const direct = facing * Math.max(0, Math.min(1, open))
      // Low sun is warm, and the shade is lit by blue sky.
      const drift = mix(
        0.8,
        1.1,
        smoothstep(-0.5, 0.5, fbm2(px / unitPixels / 3, py / unitPixels / 3, 2, 40)),
      )
      out.data[at * 3] = color.data[at * 3]! * (2.35 * direct * drift + 0.3 * hollow)
      out.data[at * 3 + 1] = color.data[at * 3 + 1]! * (2.06 * direct * drift + 0.36 * hollow)
      out.data[at * 3 + 2] = color.data[at * 3 + 2]! * (1.62 * direct * drift + 0.47 * hollow)
    }
  }
  return out
}
