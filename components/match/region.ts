import { NO_CELL } from '@/lib/color/photograph-colors'

/** Which cell each pixel of the small picture belongs to. */
export interface CellMap {
  width: number
  height: number
  /** One byte a pixel, row by row; NO_CELL where nothing is visible. */
  cells: Uint8Array
}

/** The veil over what is not the region: a neutral of L* 45, so that light and dark both show. */
const VEIL = [107, 107, 107, 210] as const

/**
 * A picture that veils everything but the region of one of the five.
 * @param assignment per cell, the index of its place
 * @returns `width`×`height` RGBA
 */
export function veilOutside(
  { width, height, cells }: CellMap,
  assignment: readonly number[],
  place: number,
): Uint8ClampedArray<ArrayBuffer> {
  const veil = new Uint8ClampedArray(width * height * 4)
  for (let at = 0; at < width * height; at++) {
    const cell = cells[at]!
    if (cell !== NO_CELL && assignment[cell] === place) continue
    veil.set(VEIL, at * 4)
  }
  return veil
}
