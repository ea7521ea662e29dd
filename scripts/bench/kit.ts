import { readFileSync } from 'node:fs'

import { windBands } from '@/components/yarn/card-strokes'
import { deltaE00 } from '@/lib/color/ciede2000'
import { screenColor } from '@/lib/color/gamut'
import { decodeChannel, hexToLab, srgbToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { PLACE_ROLES } from '@/lib/combinations/constants'
import { buildKit, drawingsOf, type CombinationDrawing } from '@/lib/exports/build-kit'
import { PICTURE_SIZES } from '@/lib/exports/constants'
import type { ExportCombination, ExportDescription } from '@/lib/exports/description'
import { Rasteriser, type Pixels } from '@/lib/exports/rasterise'
import sharp from '@/lib/photographs/sharp'

import { demoPhotographs } from '../../seeders/demo/photographs'
import { readShades } from '../../seeders/demo/read-shades'
import type { Figure } from '../lib/figures.mjs'

const COMBINATIONS = 12
/** How often each is measured, in turns. */
const RUNS = 5
const TIMES_BAR = 3
const COLOR_BAR = 0.5

/**
 * The figures of the kit: how long one of twelve combinations takes beside the encoding of its
 * pictures, and how near each drawn band comes to its shade.
 */
export async function benchKit(): Promise<Figure[]> {
  const description = await describe()
  const rasteriser = new Rasteriser()
  try {
    return [
      await timesOfEncoding(description, rasteriser),
      ...(await drawnMeans(description, rasteriser)),
    ]
  } finally {
    rasteriser.close()
  }
}

const median = (values: readonly number[]) =>
  values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)]!

async function timed(work: () => Promise<unknown>): Promise<number> {
  const began = performance.now()
  await work()
  return performance.now() - began
}

/** Twelve of the demo's own: its shades, its photographs at the width that a kit draws from. */
async function describe(): Promise<ExportDescription> {
  const shades = readShades('./heronsway-dk.csv').map(({ number, lab, hex }) => ({
    number,
    lab: (lab ? [lab.L, lab.a, lab.b] : hexToLab(hex!)) satisfies Lab,
  }))
  const photographs = await Promise.all(
    demoPhotographs.map(async (photograph) => ({
      ...photograph,
      bytes: await sharp(
        readFileSync(new URL(`../../seeders/demo/photographs/${photograph.file}`, import.meta.url)),
      )
        .resize({ width: 1600 })
        .webp({ quality: 80 })
        .toBuffer(),
    })),
  )
  const combinations = Array.from({ length: COMBINATIONS }, (_, index): ExportCombination => {
    const { title, photographer, altText, bytes } = photographs[index % photographs.length]!
    return {
      id: String(index),
      title: `${title}, ${index + 1}`,
      story: 'The bracken has gone over and the water has not noticed yet.',
      shades: PLACE_ROLES.map((role, place) => {
        const shade = shades[(index * 7 + place * 11) % shades.length]!
        const { number, lab } = shade
        return {
          label: `No. ${number}`,
          number,
          lab,
          illuminant: 'D65',
          observer: 10,
          hex: screenColor(lab).hex,
          share: [0.31, 0.24, 0.19, 0.16, 0.1][place]!,
          role,
        }
      }),
      photograph: {
        title,
        credit: photographer,
        licence: 'own work',
        licenceUrl: '',
        sourceUrl: '',
        alt: altText,
        bytes,
      },
    }
  })
  return { brand: 'Teasel & Tarn', line: 'Heronsway DK', combinations, asOf: new Date(0) }
}

/** The same pixels as the kit's pictures, combination by combination, as the kit encodes them. */
async function pixelsOf(
  description: ExportDescription,
  rasteriser: Rasteriser,
): Promise<Pixels[][]> {
  const all: Pixels[][] = []
  for (const combination of description.combinations) {
    const drawings = drawingsOf(description, combination)
    const photograph = combination.photograph?.bytes ?? null
    const pixels = await rasteriser.pixels({ drawings, photograph })
    all.push(drawings.map(({ width, height }, at) => ({ data: pixels[at]!, width, height })))
  }
  return all
}

async function timesOfEncoding(
  description: ExportDescription,
  rasteriser: Rasteriser,
): Promise<Figure> {
  const pictures = await pixelsOf(description, rasteriser)
  const build = () => buildKit(description, rasteriser)
  const encode = async () => {
    for (const pixels of pictures) await rasteriser.encode(pixels)
  }
  // The job process lives long: neither is measured at its very first.
  await build()
  await encode()
  const times: { build: number; encode: number }[] = []
  for (let run = 0; run < RUNS; run++)
    times.push({ build: await timed(build), encode: await timed(encode) })
  const built = median(times.map((one) => one.build))
  const encoded = median(times.map((one) => one.encode))
  const seconds = (ms: number) => `${(ms / 1000).toFixed(2)} s`
  return {
    what: `Building a kit of ${COMBINATIONS}, beside encoding its PNGs alone`,
    value: `${(built / encoded).toFixed(2)} × (${seconds(built)}, ${seconds(encoded)})`,
    bar: `under ${TIMES_BAR} ×`,
    met: built / encoded < TIMES_BAR,
  }
}

/** The farthest that a drawn band's mean lies from its shade, at each size. */
async function drawnMeans(
  description: ExportDescription,
  rasteriser: Rasteriser,
): Promise<Figure[]> {
  const worst = PICTURE_SIZES.map(() => 0)
  for (const combination of description.combinations) {
    // Even shares, so that no band is a few threads only.
    const even = {
      ...combination,
      photograph: null,
      shades: combination.shades.map((shade) => ({ ...shade, share: 0.2 })),
    }
    const drawings = drawingsOf(description, even)
    const pixels = await rasteriser.pixels({ drawings, photograph: null })
    drawings.forEach((drawing, at) => {
      worst[at] = Math.max(worst[at]!, farthestBand(drawing, even, pixels[at]!))
    })
  }
  return PICTURE_SIZES.map(({ width, height }, at) => ({
    what: `Drawn mean of wound yarn beside its shade, ${width} × ${height}`,
    value: `ΔE00 ${worst[at]!.toFixed(2)} at the most`,
    bar: `within ${COLOR_BAR}`,
    met: worst[at]! <= COLOR_BAR,
  }))
}

function farthestBand(
  { composition: { card }, width }: CombinationDrawing,
  { shades }: ExportCombination,
  pixels: Buffer,
): number {
  const { shape, area } = card
  const bands = shades.map(({ hex, share, label }) => ({ hex, share, name: label }))
  const misses = windBands(shape, bands).map(({ y, height }, index) => {
    // Whole threads and whole turns, clear of the slit, the notches, and of the band's rise.
    const thirds = Math.floor(height / shape.pitch / 3) - 1
    const mean = meanOf(pixels, width, {
      x: area.x + shape.width * 0.3,
      y: area.y + y + shape.pitch - shape.rise / 2,
      width: Math.round((shape.width * 0.5) / shape.pitch) * shape.pitch,
      height: thirds * 3 * shape.pitch,
    })
    return deltaE00(mean, hexToLab(shades[index]!.hex))
  })
  return Math.max(...misses)
}

const encodeLight = (light: number) =>
  light <= 0.0031308 ? light * 12.92 : 1.055 * light ** (1 / 2.4) - 0.055

/** The mean of a rectangle of pixels, taken in linear light. */
function meanOf(
  pixels: Buffer,
  stride: number,
  area: { x: number; y: number; width: number; height: number },
): Lab {
  const sums: [number, number, number] = [0, 0, 0]
  let count = 0
  for (let y = Math.ceil(area.y); y < Math.floor(area.y + area.height); y++) {
    for (let x = Math.ceil(area.x); x < Math.floor(area.x + area.width); x++) {
      for (const channel of [0, 1, 2] as const)
        sums[channel] += decodeChannel(pixels[(y * stride + x) * 3 + channel]! / 255)
      count++
    }
  }
  const [red, green, blue] = sums.map((sum) => encodeLight(sum / count))
  return srgbToLab(red!, green!, blue!)
}
