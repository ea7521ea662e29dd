import type { Development } from '../develop'
import { fbm2, makeRandom, mix, noise2, smoothstep } from '../noise'
import {
  blend,
  blur,
  composite,
  ellipse,
  halve,
  makeLayer,
  makePicture,
  paint,
  scale,
  stroke,
  type Layer,
  type Picture,
  type Rgb,
} from '../picture'

/** How this picture is developed. */
export const development: Development = {
  exposure: 1.08,
  contrast: 0.32,
  vignette: 0.28,
  bloom: 0.12,
}

const mist = scale(paint('#d6d3c8'), 1.05)
const mistLow = paint('#b9b09c')
const bark = paint('#d8d3c6')
const barkShade = paint('#8f8a86')
const mark = paint('#2e2826')
const golds = ['#c58a1e', '#d9a93a', '#b4702a', '#e0bd5c', '#9a5a2a', '#a99a3a'].map(paint)
const fallen = ['#9a5f2c', '#b98136', '#7a4a28', '#c79b4c', '#63402a', '#86803f'].map(paint)

const LAYERS = 9

/** An autumn birch wood, trunk behind trunk into mist. */
export function render(width: number, height: number): Picture {
  const w = width * 2
  const h = height * 2
  const picture = makePicture(w, h)
  backdrop(picture)
  const random = makeRandom(777)
  for (let step = 0; step < LAYERS; step++) {
    const nearness = step / (LAYERS - 1)
    const layer = makeLayer(w, h)
    const veil = 0.9 * (1 - nearness) ** 1.5
    const horizon = h * 0.66
    const foot = horizon + nearness ** 1.8 * h * 0.3
    const trunks = Math.round(mix(26, 4, nearness ** 0.7))
    for (let t = 0; t < trunks; t++) {
      const thick = w * mix(0.0022, 0.021, nearness ** 1.7) * (0.65 + random() * 0.7)
      tree(
        layer,
        random,
        ((t + random() * 0.9) / trunks) * w * 1.1 - w * 0.05,
        foot + (random() - 0.5) * h * 0.03,
        thick,
        veil,
      )
    }
    litter(layer, random, foot, nearness, veil)
    const sigma = nearness > 0.93 ? w * 0.0016 : nearness < 0.4 ? w * 0.0007 * (1 - nearness) : 0
    if (sigma > 0) blur(layer, sigma)
    composite(picture, layer)
    drift(picture, nearness, foot)
  }
  return halve(picture)
}

function backdrop({ width, height, data }: Picture): void {
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const v = y / height
      const glow = Math.exp(-(((x / width - 0.62) / 0.36) ** 2) - ((v - 0.34) / 0.34) ** 2)
      const far = smoothstep(-0.3, 0.5, fbm2((x / width) * 5, v * 3.2, 4, 3))
      let color = blend(mist, paint('#c9b98a'), 0.4 * far * smoothstep(0.75, 0.2, v))
      color = blend(color, mistLow, smoothstep(0.52, 0.8, v))
      color = scale(color, 0.74 + 0.5 * glow)
      data.set(color, (y * width + x) * 3)
    }
  }
}

function tree(
  layer: Layer,
  random: () => number,
  x: number,
  foot: number,
  thick: number,
  veil: number,
): void {
  const { height } = layer
  const lean = (random() - 0.5) * 0.07 * height
  const through = (color: Rgb): Rgb => blend(color, mist, veil)
  const sides = 11
  // The trunk as strips, light from the right, so that it turns.
  for (let s = 0; s < sides; s++) {
    const across = (s + 0.5) / sides - 0.5
    const lit = 0.55 + 0.75 * smoothstep(-0.5, 0.35, across)
    const tone = through(scale(blend(barkShade, bark, smoothstep(-0.5, 0.2, across)), lit))
    stroke(
      layer,
      x + across * thick * 2,
      foot,
      x + lean + across * thick * 1.3,
      -height * 0.05,
      (thick / sides) * 1.4,
      (thick / sides) * 0.95,
      scale(tone, 0.86),
      tone,
    )
  }
  const marks = Math.round(40 + thick * 1.2)
  for (let m = 0; m < marks; m++) {
    const up = random() ** 0.8
    const y = foot * (1 - up)
    const at = x + lean * up
    const reach = thick * (0.12 + random() ** 2 * 0.85)
    const side = (random() - 0.5) * thick * 1.5
    ellipse(
      layer,
      at + side,
      y,
      reach,
      Math.max(0.7, thick * 0.05 * (0.4 + random() * 1.6)),
      (random() - 0.5) * 0.25,
      through(mark),
      0.55 + 0.35 * random(),
    )
  }
  for (let b = 0; b < 15; b++) {
    const up = 0.36 + random() * 0.62
    const side = random() < 0.5 ? -1 : 1
    const long = thick * (4 + random() * 8) * (1.3 - up * 0.7)
    let at = { x: x + lean * up, y: foot * (1 - up) }
    let climb = 0.9 + random() * 0.5
    const parts = 6
    for (let part = 0; part < parts; part++) {
      // A birch's branch rises, bends over, and hangs at its end.
      const to = { x: at.x + (side * long) / parts, y: at.y - (long / parts) * climb }
      const taper = 1 - part / parts
      stroke(
        layer,
        at.x,
        at.y,
        to.x,
        to.y,
        thick * 0.05 * taper + 0.4,
        thick * 0.04 * taper + 0.2,
        through(scale(mark, 1.7)),
      )
      climb -= 0.28 + random() * 0.16
      at = to
      const leaves = Math.round(5 + thick * 0.5)
      for (let l = 0; l < leaves; l++) {
        const size = Math.max(1.1, thick * (0.07 + random() * 0.1))
        const gold = golds[Math.floor(random() * golds.length)]!
        ellipse(
          layer,
          at.x + (random() - 0.5) * long * 0.34,
          at.y + (random() - 0.35) * long * 0.42,
          size,
          size * (0.45 + random() * 0.4),
          random() * 3,
          through(scale(gold, 0.75 + random() * 0.95)),
          0.9,
          0.25,
        )
      }
    }
  }
}

function litter(
  layer: Layer,
  random: () => number,
  foot: number,
  nearness: number,
  veil: number,
): void {
  const { width, height } = layer
  const bottom = Math.min(height, foot + height * (0.03 + 0.2 * nearness))
  const size = width * mix(0.0012, 0.0058, nearness ** 1.4)
  const count = Math.round(mix(5200, 2600, nearness))
  for (let l = 0; l < count; l++) {
    const depth = random()
    const x = random() * width
    const y =
      mix(foot - height * 0.02, bottom + height * 0.02, depth) +
      noise2(x / 190, nearness * 9, 5) * height * 0.012
    const leaf = fallen[Math.floor(random() * fallen.length)]!
    const s = size * (0.6 + random() * 0.8) * (0.75 + depth * 0.5)
    ellipse(
      layer,
      x,
      y,
      s,
      s * (0.28 + random() * 0.3),
      (random() - 0.5) * 1.4,
      blend(scale(leaf, 0.45 + random() * 0.95), mist, veil * 0.95),
      0.95,
      0.3,
    )
  }
}

function drift(picture: Picture, nearness: number, foot: number): void {
  if (nearness > 0.85) return
  const { width, height, data } = picture
  for (let y = 0; y < height; y++) {
    const band = Math.exp(-(((y - foot) / (height * 0.16)) ** 2)) * 0.34 * (1 - nearness)
    if (band < 0.004) continue
    for (let x = 0; x < width; x++) {
      const thick =
        band * (0.55 + 0.9 * fbm2((x / width) * 6, (y / height) * 9 + nearness * 7, 3, 21))
      const at = (y * width + x) * 3
      for (let c = 0; c < 3; c++)
        data[at + c] = mix(data[at + c]!, mist[c]!, Math.max(0, Math.min(1, thick)))
    }
  }
}
