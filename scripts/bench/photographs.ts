import { existsSync, readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'

import { isMatch, matchPhotograph, type Match, type MatchShade } from '@/lib/color/match'
import { readPhotographColors, type PhotographColors } from '@/lib/color/photograph-colors'
import { decodePhotograph } from '@/lib/photographs/decode'
import sharp from '@/lib/photographs/sharp'

const FOLDER = '/usr/share/backgrounds/mate'

/** One picture of the collection. */
export interface Photograph {
  name: string
  /** A camera's picture, or one that was drawn. */
  group: 'photograph' | 'drawn'
  bytes: Buffer
  megapixels: number
  colors: PhotographColors
}

/**
 * Every raster picture of Debian's mate-backgrounds. The JPEGs of nature/ and abstract/ are
 * photographs; its PNGs and desktop/ are drawn. What cannot be read is named with the reason.
 */
export async function photographs(): Promise<Photograph[]> {
  if (!existsSync(FOLDER))
    throw new Error(`No photographs in ${FOLDER}: apt-get install mate-backgrounds`)
  const names = (readdirSync(FOLDER, { recursive: true }) as string[])
    .filter((name) => /\.(jpe?g|png)$/i.test(name))
    .sort()
  const read: Photograph[] = []
  for (const name of names) {
    const bytes = readFileSync(path.join(FOLDER, name))
    try {
      const { image, width, height } = await decodePhotograph(bytes)
      read.push({
        name,
        group: /\.jpe?g$/i.test(name) && !name.startsWith('desktop') ? 'photograph' : 'drawn',
        bytes,
        megapixels: (width * height) / 1e6,
        colors: readPhotographColors(image),
      })
    } catch (error) {
      console.log(`Left out: ${name}: ${(error as Error).message}`)
    }
  }
  const taken = read.filter(({ group }) => group === 'photograph').length
  console.log(
    `${read.length} pictures of mate-backgrounds: ${taken} photographs, ${read.length - taken} drawn`,
  )
  return read
}

/** The true reading. */
export function trueFive(
  colors: Pick<PhotographColors, 'cells'>,
  line: readonly MatchShade[],
  apart?: number,
): Match {
  const match = matchPhotograph(colors, line, 'true', { apart })
  if (!isMatch(match)) throw new Error(match.unavailable)
  return match
}

/** Everything from a file's bytes to its five. */
export const matchFile = async (bytes: Buffer, line: readonly MatchShade[]): Promise<Match> =>
  trueFive(readPhotographColors((await decodePhotograph(bytes)).image), line)

/** sharp's own decode and shrink of a file, and nothing else. */
export const shrinkAlone = (bytes: Buffer): Promise<Buffer> =>
  sharp(bytes).resize(320, 320, { fit: 'inside' }).raw().toBuffer()
