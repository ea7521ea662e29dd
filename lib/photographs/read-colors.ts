import {
  readPhotographColors,
  type PhotographColors,
  type PixelImage,
} from '@/lib/color/photograph-colors'

import { PhotographError } from './decode'

/** The colours of a photograph. @throws PhotographError when nothing in it can be seen */
export function readColors(image: PixelImage): PhotographColors {
  try {
    return readPhotographColors(image)
  } catch (error) {
    if (!(error instanceof RangeError)) throw error
    throw new PhotographError(
      'nothing-visible',
      'Nothing in this picture can be seen: it is transparent all over. Export it again, opaque.',
      { cause: error },
    )
  }
}
