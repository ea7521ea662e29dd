import { readFile, stat } from 'node:fs/promises'

import { fileTypeFromBuffer } from 'file-type'

import type { PixelImage } from '@/lib/color/types'
import { InvalidError } from '@/lib/errors'

import {
  FORMATS_TAKEN,
  MAX_BYTES,
  MAX_PIXELS,
  PHOTOGRAPH_FORMATS,
  READING_SIDE,
  type PhotographFormat,
  type PhotographMime,
} from './formats'
import sharp from './sharp'

/** Why a file cannot be read as a photograph. */
export type PhotographFault =
  | 'empty'
  | 'too-large'
  | 'too-many-pixels'
  | 'heic'
  | 'svg'
  | 'format'
  | 'not-a-picture'
  | 'damaged'
  | 'hidden'
  | 'nothing-visible'

/** A file that is no photograph we can read; the message is for the person who brought it. */
export class PhotographError extends InvalidError {
  constructor(
    readonly fault: PhotographFault,
    message: string,
    options?: { cause?: unknown },
  ) {
    super(message)
    if (options) this.cause = options.cause
  }
}

/** A photograph made small enough to read. */
export interface DecodedPhotograph {
  /** Upright, within 320×320, first frame only; Display P3 where the file is. */
  image: PixelImage
  /** Of the original, upright. */
  width: number
  height: number
  format: PhotographFormat
  decodeMs: number
}

const AGAIN = `Save it as ${FORMATS_TAKEN} and add it again.`

/**
 * What a file is, by its bytes and never by its name. Throws PhotographError, naming the formats
 * taken, when that is nothing we read.
 */
export async function sniffPhotograph(bytes: Buffer): Promise<PhotographMime> {
  if (bytes.length === 0)
    throw new PhotographError('empty', 'The file is empty. Add the photograph again.')
  const mime = (await fileTypeFromBuffer(bytes).catch(() => undefined))?.mime as string | undefined
  if (mime === 'image/apng') return 'image/png'
  if (mime && mime in PHOTOGRAPH_FORMATS) return mime as PhotographMime
  if (mime?.startsWith('image/hei')) {
    // The generic brands of ISO 23008-12 say only “HEIF”; an AVIF names itself further on.
    if (bytes.subarray(8, bytes.readUInt32BE(0)).includes('avif')) return 'image/avif'
    throw new PhotographError('heic', `This is a HEIC picture, which cannot be read here. ${AGAIN}`)
  }
  // A TIFF whose directory is cut off goes unrecognised, though its first four bytes name it.
  if (['II*\0', 'MM\0*'].includes(bytes.toString('latin1', 0, 4))) return 'image/tiff'
  const start = bytes.subarray(0, 4096).toString('latin1')
  if (/<svg[\s>]/i.test(start))
    throw new PhotographError('svg', `This is an SVG drawing, not a photograph. ${AGAIN}`)
  if (mime?.startsWith('image/'))
    throw new PhotographError('format', `Pictures of the type ${mime} are not read here. ${AGAIN}`)
  throw new PhotographError(
    'not-a-picture',
    `This file is not a picture. Photographs are taken as ${FORMATS_TAKEN}.`,
  )
}

const DAMAGED = 'The picture is damaged or cut short. Export it again from where it came.'

/** D50-adapted colorants of Display P3. @source its ICC profile, SMPTE EG 432-1 */
const P3_COLORANTS = {
  rXYZ: [0.5151, 0.2412, -0.0011],
  gXYZ: [0.292, 0.6922, 0.0419],
  bXYZ: [0.1571, 0.0666, 0.7841],
}

/** Whether an ICC profile has the primaries of Display P3. @source ICC.1:2022 § 7.3, § 10.31 */
function isDisplayP3(icc: Buffer): boolean {
  if (icc.length < 132) return false
  const tags = new Map<string, number>()
  const count = Math.min(icc.readUInt32BE(128), 100, Math.floor((icc.length - 132) / 12))
  for (let tag = 0; tag < count; tag++) {
    const at = 132 + tag * 12
    tags.set(icc.toString('latin1', at, at + 4), icc.readUInt32BE(at + 4))
  }
  return Object.entries(P3_COLORANTS).every(([name, xyz]) => {
    const at = tags.get(name)
    if (at === undefined || at + 20 > icc.length) return false
    return xyz.every(
      (value, axis) => Math.abs(icc.readInt32BE(at + 8 + axis * 4) / 65536 - value) < 0.003,
    )
  })
}

const tooLarge = () =>
  new PhotographError(
    'too-large',
    `The file is larger than ${MAX_BYTES / 1e6} MB. Export a smaller copy and add that.`,
  )

/**
 * Decodes a photograph (its bytes, or the path of a file) and shrinks it to be read. Colours come
 * through the embedded profile to sRGB, except that Display P3 stays as wide as it is. Throws
 * PhotographError for everything that is not a whole picture within the limits.
 */
export async function decodePhotograph(input: Buffer | string): Promise<DecodedPhotograph> {
  const started = performance.now()
  if (typeof input === 'string' && (await stat(input)).size > MAX_BYTES) throw tooLarge()
  const bytes = typeof input === 'string' ? await readFile(input) : input
  if (bytes.length > MAX_BYTES) throw tooLarge()
  const mime = await sniffPhotograph(bytes)
  try {
    const { autoOrient, icc, space } = await sharp(bytes, { limitInputPixels: false }).metadata()
    const { width, height } = autoOrient
    if (width * height > MAX_PIXELS)
      throw new PhotographError(
        'too-many-pixels',
        `The picture has more than ${MAX_PIXELS / 1e6} megapixels. Export a smaller copy and add that.`,
      )
    const picture = sharp(bytes, { failOn: 'error', limitInputPixels: MAX_PIXELS })
      .autoOrient()
      .resize(READING_SIDE, READING_SIDE, { fit: 'inside', withoutEnlargement: true })
      .toColourspace('srgb')
      .ensureAlpha()
    // sharp takes 16-bit pictures with any profile to Display P3 and leaves them there, unsaid.
    const deep = icc !== undefined && space === 'rgb16'
    const wide = icc !== undefined && space === 'srgb' && isDisplayP3(icc)
    if (wide) picture.keepIccProfile()
    const { data, info } = await picture.raw().toBuffer({ resolveWithObject: true })
    return {
      image: {
        width: info.width,
        height: info.height,
        data: new Uint8Array(data.buffer, data.byteOffset, data.length),
        space: wide || deep ? 'display-p3' : 'srgb',
      },
      width,
      height,
      format: PHOTOGRAPH_FORMATS[mime],
      decodeMs: performance.now() - started,
    }
  } catch (error) {
    if (error instanceof PhotographError) throw error
    throw new PhotographError('damaged', DAMAGED, { cause: error })
  }
}
