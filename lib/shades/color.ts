import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import type { Shade } from '@/models'

import type { ReadingTerms } from './constants'
import type { ShadeColor } from './schema'

/** The columns of a shade that say its colour. */
export type ColorColumns = Pick<Shade, 'labL' | 'labA' | 'labB' | 'illuminant' | 'observer' | 'hex'>

/** The terms of a shade's Lab. */
export const termsOf = ({ observer }: Pick<Shade, 'observer'>): ReadingTerms =>
  observer === 10 ? 'D65/10' : 'D65/2'

/**
 * A colour as entered, as columns. A reading is kept to the last digit; a hex gives Lab D65/2° and
 * is kept beside it.
 */
export function colorColumns(color: ShadeColor): ColorColumns {
  const lab: Lab = color.kind === 'lab' ? [color.L, color.a, color.b] : hexToLab(color.hex)
  return {
    labL: lab[0],
    labA: lab[1],
    labB: lab[2],
    illuminant: 'D65',
    observer: color.kind === 'lab' && color.terms === 'D65/10' ? 10 : 2,
    hex: color.kind === 'hex' ? color.hex : null,
  }
}

/** Whether two shades record the same colour; of two hex entries only the hex counts. */
export function isSameColor(one: ColorColumns, other: ColorColumns): boolean {
  if (one.hex !== null || other.hex !== null) return one.hex === other.hex
  return (
    one.labL === other.labL &&
    one.labA === other.labA &&
    one.labB === other.labB &&
    one.observer === other.observer
  )
}

const twoDecimals = (value: number) => value.toFixed(2).replace('-', '−')

/** A colour in words: "L 54.20, a −12.00, b 8.10 (D65, 10°)" or "#7a8b4f". */
export function describeColor(color: ColorColumns): string {
  if (color.hex) return color.hex
  const [l, a, b] = [color.labL, color.labA, color.labB].map(twoDecimals)
  return `L ${l}, a ${a}, b ${b} (${color.illuminant}, ${color.observer}°)`
}
