import type { DemoPhotograph } from './types'

const photographer = 'Anjali Fellgarth'
const licence = 'own-work'

/** The demo's photographs: every one is our own, rendered by scripts/render-photographs.ts. */
export const demoPhotographs: DemoPhotograph[] = [
  {
    slug: 'tarn-in-bracken-time',
    title: 'The tarn in bracken time',
    photographer,
    licence,
    altText:
      'Fells rust-coloured with autumn bracken above a still, dark tarn that reflects them, hazy blue hills behind.',
    file: 'tarn-in-bracken-time.jpg',
  },
  {
    slug: 'heather-before-dark',
    title: 'Heather, just before dark',
    photographer,
    licence,
    altText:
      'A moor covered in purple heather at dusk, ridges fading into mist under a sky of apricot and grey cloud.',
    file: 'heather-before-dark.jpg',
  },
  {
    slug: 'pebbles-at-low-water',
    title: 'Pebbles at low water',
    photographer,
    licence,
    altText:
      'Grey, buff, russet and slate-blue pebbles on a beach, a few veined with white, with a grey-green sea out of focus beyond.',
    file: 'pebbles-at-low-water.jpg',
  },
  {
    slug: 'wall-with-lichen',
    title: 'Wall end, lichen side',
    photographer,
    licence,
    altText:
      'A dry stone wall in low sunlight, its grey and brown stones spotted with mustard, sage and white lichen, moss in the joints.',
    file: 'wall-with-lichen.jpg',
  },
  {
    slug: 'birches-in-mist',
    title: 'Birches in mist',
    photographer,
    licence,
    altText:
      'White birch trunks in an autumn wood, their gold leaves fading into pale mist over a floor of fallen leaves.',
    file: 'birches-in-mist.jpg',
  },
  {
    slug: 'meadow-before-rain',
    title: 'Meadow, ten minutes before rain',
    photographer,
    licence,
    altText:
      'A sunlit meadow of yellow flowers with a few red poppies, under a heavy blue-grey storm cloud.',
    file: 'meadow-before-rain.jpg',
  },
]
