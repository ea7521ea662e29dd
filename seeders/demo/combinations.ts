import type { DemoCombination } from './types'

/**
 * The combinations the demo keeps, each laid on top of its lane; their shades and shares are
 * whatever the match proves best.
 */
export const demoCombinations: DemoCombination[] = [
  {
    title: 'Low Sun, High Bracken',
    photograph: 'tarn-in-bracken-time',
    reading: 'true',
    lane: 'chosen',
    by: 'designer',
  },
  {
    title: 'Somebody Has Been Here on Skates',
    photograph: 'tarn-in-bracken-time',
    reading: 'quiet',
    lane: 'sketched',
    by: 'designer',
  },
  {
    title: 'Lamps Lit Early',
    photograph: 'heather-before-dark',
    reading: 'true',
    lane: 'short-listed',
    by: 'designer',
  },
  {
    title: 'The Long Way Down',
    photograph: 'heather-before-dark',
    reading: 'contrast',
    lane: 'sketched',
    by: 'owner',
  },
  {
    title: 'Pockets Full of Shore',
    photograph: 'pebbles-at-low-water',
    reading: 'contrast',
    lane: 'chosen',
    by: 'designer',
  },
  {
    title: 'Half a Tide Left',
    photograph: 'pebbles-at-low-water',
    reading: 'true',
    lane: 'short-listed',
    by: 'owner',
  },
  {
    title: 'Bring the Washing In',
    photograph: 'meadow-before-rain',
    reading: 'true',
    lane: 'short-listed',
    by: 'designer',
  },
  {
    title: 'Poppies Before the Downpour',
    photograph: 'meadow-before-rain',
    reading: 'accent',
    lane: 'chosen',
    by: 'designer',
  },
  {
    title: 'Breath on the Window',
    photograph: 'birches-in-mist',
    reading: 'true',
    lane: 'sketched',
    by: 'designer',
  },
  {
    title: 'A Wall Older Than the Sheep',
    photograph: 'wall-with-lichen',
    reading: 'true',
    lane: 'short-listed',
    by: 'designer',
  },
  {
    title: 'Mustard on the North Side',
    photograph: 'wall-with-lichen',
    reading: 'contrast',
    lane: 'sketched',
    by: 'owner',
  },
]
