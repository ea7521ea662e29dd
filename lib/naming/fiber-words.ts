import { heardApart } from './pronounce'
import { headWords, SMALL_WORDS, stemOf, wordsOf } from './words'

/** A fibre, or an animal known for its fur, that a name may seem to promise. */
export interface ImpliedFiber {
  /** the word of the name that does it */
  word: string
  /** what it promises: `silk`, `fur of a mink` */
  implies: string
  /** the word itself, or one that sounds like it or is spelled nearly like it */
  how: 'named' | 'sounds alike' | 'spelled alike'
  /** 0–1 */
  sure: number
  /** the rule that restricts it: fibres in any yarn, in wool, or fur */
  rule: '16 CFR 303.18' | '16 CFR 300.24' | '16 CFR 303.9'
}

/** What each fibre is called; the first is the fibre itself. */
const FIBERS: readonly (readonly string[])[] = [
  ['wool', 'lambswool', 'woollen', 'woolen', 'worsted'],
  ['merino', 'wool'],
  ['silk', 'silken', 'silky', 'tussah', 'mulberry silk', 'satin', 'chiffon', 'organza'],
  ['cashmere', 'cashgora', 'pashmina', 'kashmir'],
  ['mohair', 'angora goat', 'kid mohair'],
  ['angora'],
  ['alpaca', 'suri', 'huacaya'],
  ['llama'],
  ['vicuna', 'guanaco'],
  ['camel', 'camelhair'],
  ['yak'],
  ['qiviut', 'muskox'],
  ['possum'],
  ['linen', 'flax'],
  ['cotton', 'pima'],
  ['hemp'],
  ['jute'],
  ['ramie'],
  ['nettle fibre'],
  ['bamboo'],
  ['rayon', 'viscose', 'modal'],
  ['lyocell', 'tencel'],
  ['nylon', 'polyamide'],
  ['acrylic'],
  ['polyester'],
  ['lurex', 'lame'],
]

/** Breeds are wool: naming one where there is none of it misleads, but any wool is a wool. */
const FUR =
  'fox mink sable ermine beaver rabbit hare otter lynx chinchilla raccoon squirrel badger seal muskrat marten stoat weasel fur'.split(
    ' ',
  )

/** Words that sound like a fibre and are so common that nobody takes them for it. */
const INNOCENT = new Set(
  'will well wall while wheel hall hull full fool pull bull well-worn sick sulk sink milk lemon lining listen line linnet ' +
    'woman women linger linden hump him hymn jut cute yeah back yuck yank cash casual cattle caught cotter gotten rotten modal model ' +
    'medal meddle moral mayor more hair mower harrow ram rainy crayon suit sure surly satire sat in seal steel camel calm came yolk ' +
    'yak for fir far fun few hare here hair heir mint mink think wood would wolf woe flex flux flask flack flakes black hem lama llama lame lamb ' +
    'fear fair four fire fur otter utter odor other rabid sail feel deal fill steal saddle stable sadle bother bower box folks socks flocks ' +
    'silt sill sulky silly skill still milky filled wields wolds world wheels word'.split(' '),
)
for (const word of [
  'silk',
  'mink',
  'hare',
  'fur',
  'seal',
  'camel',
  'yak',
  'lame',
  'llama',
  'modal',
])
  INNOCENT.delete(word)

const ALIKE = 0.14

/**
 * The fibres and furs that a name may seem to promise and the yarn does not hold. `fibers` are the
 * yarn's, lower case; a yarn of merino, or of any breed, is of wool.
 * @source 16 CFR 303.18 and 300.24 (words that imply, sound like, or are nearly spelled like a fibre
 *   that is not present), 16 CFR 303.9 (names of fur-bearing animals)
 */
export function impliedFibers(name: string, fibers: readonly string[]): ImpliedFiber[] {
  const held = new Set(fibers.flatMap((fiber) => fiber.toLowerCase().split(/\s+/)))
  if (['merino', 'lambswool', 'shetland', 'bluefaced'].some((breed) => held.has(breed)))
    held.add('wool')
  const words = wordsOf(name)
  const absent = (found: Found | null) =>
    found && !found.fibers.some((fiber) => held.has(fiber)) ? [found.implied] : []
  const single = headWords(words).flatMap((word) => absent(byWord(word)))
  if (single.length > 0) return single
  // Two words that are one to the ear: mo hair, merry no.
  return words
    .slice(1)
    .flatMap((word, before) =>
      SMALL_WORDS.has(word) || SMALL_WORDS.has(words[before]!)
        ? []
        : absent(byWord(`${words[before]} ${word}`)),
    )
}

interface Found {
  fibers: readonly string[]
  implied: ImpliedFiber
}

const remembered = new Map<string, Found | null>()
const MOST_REMEMBERED = 20_000

function byWord(word: string): Found | null {
  const known = remembered.get(word)
  if (known !== undefined) return known
  const found = lookAt(word)
  if (remembered.size >= MOST_REMEMBERED) remembered.clear()
  remembered.set(word, found)
  return found
}

/** Two words must come nearer to be taken for one. */
const ALIKE_AS_TWO = 0.12

function lookAtTwo(words: string): Found | null {
  for (const names of FIBERS)
    for (const name of names) {
      if (name.length < 5 || Math.abs(name.length + 1 - words.length) > 3) continue
      if (heardApart(words, name) <= ALIKE_AS_TWO)
        return { fibers: names, implied: implied(words, names[0]!, 'sounds alike', 0.5) }
    }
  return null
}

function lookAt(word: string): Found | null {
  if (word.includes(' ')) return lookAtTwo(word)
  const stem = stemOf(word)
  for (const names of FIBERS)
    if (names.includes(word) || names.includes(stem))
      return { fibers: names, implied: implied(word, names[0]!, 'named', 0.95) }
  if (FUR.includes(stem) || FUR.includes(word)) {
    const implies = stem === 'fur' ? 'fur' : `fur of a ${stem}`
    return {
      fibers: [stem],
      implied: { word, implies, how: 'named', sure: 0.6, rule: '16 CFR 303.9' },
    }
  }
  if (INNOCENT.has(word) || INNOCENT.has(stem) || word.length < 3) return null
  for (const names of FIBERS)
    for (const name of names) {
      if (name.includes(' ') || Math.abs(name.length - stem.length) > 3) continue
      // In the word whole: cashmerely, silkworm.
      if (name.length >= 4 && stem.includes(name) && stem !== name)
        return { fibers: names, implied: implied(word, names[0]!, 'spelled alike', 0.7) }
      if (name.length >= 4 && heardApart(stem, name) <= ALIKE)
        return { fibers: names, implied: implied(word, names[0]!, 'sounds alike', 0.6) }
    }
  return null
}

const implied = (
  word: string,
  fiber: string,
  how: ImpliedFiber['how'],
  sure: number,
): ImpliedFiber => ({
  word,
  implies: fiber,
  how,
  sure,
  rule: [
    'wool',
    'merino',
    'cashmere',
    'mohair',
    'angora',
    'alpaca',
    'llama',
    'vicuna',
    'camel',
  ].includes(fiber)
    ? '16 CFR 300.24'
    : '16 CFR 303.18',
})
