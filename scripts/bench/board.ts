import type { Figure } from '../lib/figures.mjs'
import { benchFamilies } from './families'
import { benchLanes } from './lanes'

/** The figures of tonal families and of the board. */
export async function benchBoard(): Promise<Figure[]> {
  return [...(await benchFamilies()), ...(await benchLanes())]
}
