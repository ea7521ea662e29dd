import { putObject } from '@/lib/storage/objects'
import type { Photograph } from '@/models'

import { MAX_PIXELS } from './formats'
import { derivativeKey } from './keys'
import type { Derivative } from './constants'
import sharp from './sharp'

/** The widths of the copies in pixels; none is wider than its original. */
const WIDTHS = [480, 960, 1600]
const TALLEST = 3200
/** How each format is made. @source chosen by eye on the demo photographs */
const QUALITY = { webp: { quality: 80 }, avif: { quality: 58, effort: 3 } } as const

/**
 * Makes a photograph's copies for the screen in one format and stores them: upright, in sRGB and
 * without any metadata. Doing it again replaces them by the same.
 * @throws UnavailableError when the store is away
 */
export async function makeCopies(
  photograph: Photograph,
  original: Buffer,
  format: Derivative['format'],
): Promise<Derivative[]> {
  const picture = sharp(original, { failOn: 'error', limitInputPixels: MAX_PIXELS })
    .autoOrient()
    .resize(WIDTHS.at(-1), TALLEST, { fit: 'inside', withoutEnlargement: true })
    .toColourspace('srgb')
  // sharp leaves 16-bit pictures that carry a profile in Display P3 unless it is told.
  const { space, icc } = await picture.metadata()
  if (space === 'rgb16' && icc) picture.withIccProfile('srgb')
  const { data, info } = await picture.raw({ depth: 'uchar' }).toBuffer({ resolveWithObject: true })
  const { width: widest, height, channels } = info
  const raw = { width: widest, height, channels }
  const widths = [...new Set([...WIDTHS.filter((width) => width < widest), widest])]
  const copies: Derivative[] = []
  for (const width of widths) {
    const { data: body, info: made } = await sharp(data, { raw })
      .resize({ width })
      [format](QUALITY[format])
      .toBuffer({ resolveWithObject: true })
    const copy = { format, width: made.width, height: made.height }
    await putObject(derivativeKey(photograph, copy), body, `image/${format}`)
    copies.push(copy)
  }
  return copies
}
