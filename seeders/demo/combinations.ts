import type { DemoCombination } from './types'

/** The combinations the demo keeps; their shades and shares are whatever the match proves best. */
export const demoCombinations: DemoCombination[] = [
  { title: 'Low Sun, High Bracken', photograph: 'tarn-in-bracken-time', reading: 'true' },
  { title: 'Lamps Lit Early', photograph: 'heather-before-dark', reading: 'true' },
  { title: 'Pockets Full of Shore', photograph: 'pebbles-at-low-water', reading: 'contrast' },
  { title: 'Bring the Washing In', photograph: 'meadow-before-rain', reading: 'true' },
  { title: 'Poppies Before the Downpour', photograph: 'meadow-before-rain', reading: 'accent' },
]
