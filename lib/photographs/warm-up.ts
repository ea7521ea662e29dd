import { matchPhotograph, READING_KINDS } from '@/lib/color/match'
import { readPhotographColors } from '@/lib/color/photograph-colors'
import { srgbToLab } from '@/lib/color/srgb'

import { decodePhotograph } from './decode'
import sharp from './sharp'

/**
 * Reads and matches a small made-up picture, so that the first real one in a cold process is not
 * the slow one (about 140 ms more). Call it once when a process starts.
 */
export async function warmUpReading(): Promise<void> {
  const side = 64
  const pixels = Buffer.from(
    Array.from({ length: side * side * 3 }, (_, at) => {
      const pixel = Math.floor(at / 3)
      return [pixel % side, Math.floor(pixel / side), (pixel * 7) % side][at % 3]! * 4
    }),
  )
  const raw = { width: side, height: side, channels: 3 } as const
  const { image } = await decodePhotograph(await sharp(pixels, { raw }).jpeg().toBuffer())
  const colors = readPhotographColors(image)
  const shades = Array.from({ length: 48 }, (_, s) => ({
    id: String(s),
    lab: srgbToLab((s % 4) / 3, (Math.floor(s / 4) % 4) / 3, Math.floor(s / 16) / 2),
  }))
  for (const kind of READING_KINDS) matchPhotograph(colors, shades, kind)
}
