import { hexToLab } from '../color/srgb'
import type { Lab } from '../color/types'

/**
 * What words of sayings call to mind that are no things with a colour themselves: a saying of water
 * suits a blue, one of the heart a red. Judged here.
 */
const EVOKED = `
  soaked 8b9ba8 8fb5bd 6fa0b5, skin e8b89a, tide 4a8296 6fa5b5, water 5f9fb0 8fc0cc, waters 5f9fb0, ocean 2f6f8f, sail 9fc0d0 e8e2d2,
  sailing 9fc0d0, boat 6f94a5, ship 6f94a5, fish 8fa0a5, heaven a9cbe6, heavens a9cbe6, air c5dcea, wind b5c8cf, weather 8b9ba8,
  cold c5d8e6, cool a5c8cf, warm d98f4a, heat d9532a, hot d9532a, burn d9532a, light f3e8b5, dark 2a2b3f, bright f5d04a,
  heart b8324a, love c84060, kiss d0607a, sweet eca5b5, tears 9fc0d8, joy f5cf4a, happy f5cf4a, merry c0392b, peace dfe6e0,
  money 5f8a4a d6a92f, bank 5f8a4a, penny 9a5a35, luck 4f8a4a, king 6f3a8c d6a92f, queen 6f3a8c, crown d6a92f, glory d6a92f,
  bread b5793f, cake e8c89a, dream 9a94c8, dreams 9a94c8, sleep 5a608f, bed a9a5c0, owl 8f7350, wise 6f6f8a,
  garden 5f8f4a, tree 4f7a3f, trees 4f7a3f, bush 4f7a3f, leaf 5f8a3c, roots 6f5138, spring 9fc85a, summer f2c94a, autumn b5622a,
  winter c5d8e6, ground 6f5a45, earth 6a4f38, dust b5a68c, mud 6f5a45, road 77736b, town 9a6a55, home b5793f, house b5793f,
  bird 8f9aa5, birds 8f9aa5, feather b5aaa0, worm c58f80, dog 9a7650, horse 7a5236, horses 7a5236, cat 5a5652, cats 5a5652,
  beans 6b8a43, potato c0a06a, apples a8c04d, garlic ece4d0, silver c2c5c8, golden d6a92f, diamond dfe8ec, glass c5dcd8,
  old 8f8270, age 8f8270, time 8f8270, tea a5612a, kettle 4a4c50, pot 6a5a4c, wine 6b1f35, moon e0dfd3, moons e0dfd3, stars f0ead0,
  clock a58a5a, wool e8dfcb, sheep e8dfcb,
  fleece e8dfcb d6d3b8, ewe e8dfcb, lamb f0e8d8, ram c9bda8, flock e8dfcb, tweed 7d7160 6f6a5a, twine c9ac78, flax d8c08a, linen ded2ba,
  life 7fa548, new 9fc85a, fresh 9fd8b4, grave 4a4c50, shadow 5d5f69, wood 6a4f38,
  music 6f5aa0, dance c0507a, song c0a040, heather 9a6f97, rainy 8b9ba8, day b5d0e6, morning f5d9a0, dawn e9b8a8,
  devil b02a20, angels f0ead8, hay d3b869, field 8fa54f, oats d9c39a, honey dd9f2e, milk f4f0e4, butter f3dd86,
  salt ecebe4, stone a09a90, stones a09a90, rock 7d7d78, rocks 7d7d78, iron 5a5c60, steel 7f8a94, gold d6a92f`

const byWord = new Map<string, readonly Lab[]>(
  EVOKED.trim()
    .split(/,\s*/)
    .map((entry) => {
      const [word, ...hexes] = entry.trim().split(/\s+/)
      return [word!, hexes.map(hexToLab)]
    }),
)

/** The colours that a word of a saying calls to mind; none for most. */
export const evokedBy = (word: string): readonly Lab[] => byWord.get(word) ?? []
