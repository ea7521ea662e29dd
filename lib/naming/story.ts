import { deltaE00 } from '../color/ciede2000'
import type { Lab } from '../color/types'
import { COLOR_THINGS, type ColorThing, type ThingKind } from './color-things'
import { impliedFibers } from './fiber-words'

/** A plain name of things that have the shade's colour. */
export interface StoryName {
  name: string
  /** the things whose colour it is, nearest first */
  things: string[]
  /** ΔE00 from the shade to the nearest of them */
  colorApart: number
  why: string
  /** 0–1 */
  score: number
}

/** What a colour story is asked for. */
export interface StoryWishes {
  /** words of the world the line tells of, as nouns: `harbour`, `lantern` */
  themes?: readonly string[]
  /** the fibres of the yarn, lower case */
  fibers?: readonly string[]
  /** how many names at most; 24 unless told */
  limit?: number
}

/** What is said of things of a kind that are lighter than commonly, as commonly, or darker. */
const SAID_OF: Record<ThingKind, readonly [lighter: string, common: string, darker: string]> = {
  plant: ['young pale faded', 'wild late summer', 'winter shaded rain-dark'],
  fruit: ['unripe early', 'ripe windfall bottled', 'late stewed'],
  food: ['warm buttered', 'fresh homely Sunday', 'well-done midnight'],
  drink: ['weak milky', 'warm fireside', 'strong winter'],
  mineral: ['dry chalky sunlit', 'river weathered', 'wet deep'],
  metal: ['bright polished', 'old brushed', 'dull buried'],
  weather: ['thin high', 'early passing', 'heavy late'],
  water: ['shallow bright', 'still quiet', 'deep cold'],
  land: ['far sunlit', 'upper nearer', 'evening autumn'],
  animal: ['young pale', 'quiet small', 'old winter'],
  fire: ['low first', 'kindled', 'banked last'],
  dye: ['first pale', 'slow', 'double deep'],
  color: ['soft pale', 'plain quiet', 'deep dark'],
  house: ['sunlit', 'grandmother’s kitchen', 'upstairs winter'],
}

/** Where things grow and lie, for kinds that do. */
const PLACES: Partial<Record<ThingKind, string>> = {
  plant: 'bank lane hollow gate wall walk',
  fruit: 'orchard basket hedge shelf',
  mineral: 'path step wall ledge',
  weather: 'morning field window',
  water: 'edge bend crossing',
  fire: 'corner hearth',
  animal: 'wood field',
  food: 'tin table pantry',
}

const LIGHTER = 6
const FAR = 16
const AT_MOST_OF_ONE_THING = 3
const AGAIN = 0.05

const clamp = (value: number): number => Math.max(0, Math.min(1, value))
const titled = (words: string): string =>
  words
    .split(' ')
    .map((word) =>
      ['and', 'in', 'at', 'by', 'the', 'of', 'on'].includes(word)
        ? word
        : word[0]!.toUpperCase() + word.slice(1),
    )
    .join(' ')

interface Near {
  thing: ColorThing
  apart: number
}

interface Draft {
  words: string
  things: readonly Near[]
  /** 0–1: how much the pattern is worth */
  worth: number
}

/** What makes the better name: a plain colour word is what is left when nothing else is. */
const AS_NAME: Partial<Record<ThingKind, number>> = {
  color: 0.85,
  food: 0.95,
  house: 0.9,
  animal: 0.95,
}

/** Everything that may be said of one thing near the shade. */
function draftsOf({ thing, apart }: Near, shade: Lab, themes: readonly string[]): Draft[] {
  const { word, kind, lab } = thing
  const things = [{ thing, apart }]
  const lighter = shade[0] - lab[0]
  const said = SAID_OF[kind][lighter > LIGHTER ? 0 : lighter < -LIGHTER ? 2 : 1].split(' ')
  const places = PLACES[kind]?.split(' ') ?? []
  const noun = thing.grammar !== 'adjective'
  return [
    ...(noun ? said.map((quality) => ({ words: `${quality} ${word}`, things, worth: 0.9 })) : []),
    ...(noun ? places.map((place) => ({ words: `${word} ${place}`, things, worth: 0.86 })) : []),
    ...themes.flatMap((theme) => [
      { words: `${theme} ${word}`, things, worth: noun ? 1 : 0 },
      { words: `${word} ${theme}`, things, worth: noun ? 0.95 : 1 },
      ...(noun && kind !== 'color'
        ? [{ words: `${word} by the ${theme}`, things, worth: 0.92 }]
        : []),
    ]),
  ]
}

/**
 * Plain names for a shade (Lab D65), best first: things of its colour with what is said of such
 * things when they are lighter or darker than commonly, where they lie, each other, and the words of
 * the line's own world. The same shade and words give the same names.
 */
export function tellColorStory(
  shade: Lab,
  { themes = [], fibers = ['wool'], limit = 24 }: StoryWishes = {},
): StoryName[] {
  const near = COLOR_THINGS.map((thing) => ({ thing, apart: deltaE00(thing.lab, shade) }))
    .filter(({ apart }) => apart < FAR)
    .sort((a, b) => a.apart - b.apart || (a.thing.word < b.thing.word ? -1 : 1))
  const words = themes.map((theme) => theme.trim().toLowerCase()).filter(Boolean)
  const nouns = near.filter(({ thing }) => thing.grammar !== 'adjective' && thing.kind !== 'color')
  const pairs = nouns.slice(0, 8).flatMap((one, at) =>
    nouns
      .slice(at + 1, 8)
      .filter(({ thing }) => thing.kind !== one.thing.kind && thing.word !== one.thing.word)
      .map((other) => ({
        words: `${one.thing.word} and ${other.thing.word}`,
        things: [one, other],
        worth: 0.88,
      })),
  )
  const drafts: Draft[] = [...near.flatMap((one) => draftsOf(one, shade, words)), ...pairs]
  const scored = drafts
    .filter(({ worth }) => worth > 0)
    .map((draft) => ({
      draft,
      score:
        draft.worth *
        Math.min(...draft.things.map(({ thing }) => AS_NAME[thing.kind] ?? 1)) *
        clamp(1 - Math.max(...draft.things.map(({ apart }) => apart)) / (2 * FAR)),
    }))
    .sort((a, b) => b.score - a.score || (a.draft.words < b.draft.words ? -1 : 1))
  return choose(scored, limit, fibers)
}

/** The best, each worth less for every word of it that was said before. */
function choose(
  scored: { draft: Draft; score: number }[],
  limit: number,
  fibers: readonly string[],
): StoryName[] {
  const told = new Map<string, number>()
  const times = (word: string) => told.get(word) ?? 0
  const worth = ({ draft, score }: (typeof scored)[number]) =>
    score - AGAIN * draft.words.split(' ').reduce((sum, word) => sum + times(word), 0)
  const chosen: StoryName[] = []
  let left = scored
  while (chosen.length < limit && left.length > 0) {
    const best = left.reduce((a, b) => (worth(b) > worth(a) ? b : a))
    const { words, things } = best.draft
    const name = titled(words)
    if (!chosen.some((other) => other.name === name) && impliedFibers(name, fibers).length === 0) {
      for (const word of words.split(' ')) told.set(word, times(word) + 1)
      chosen.push({
        name,
        things: things.map(({ thing }) => thing.word),
        colorApart: things[0]!.apart,
        why: `${things.map(({ thing, apart }) => `${thing.word} is ΔE00 ${apart.toFixed(0)}`).join(' and ')} from the shade.`,
        score: best.score,
      })
    }
    left = left.filter(
      (one) =>
        one !== best &&
        one.draft.things.every(({ thing }) => times(thing.word) < AT_MOST_OF_ONE_THING),
    )
  }
  return chosen
}
