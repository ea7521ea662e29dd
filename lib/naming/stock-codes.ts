import { headWords, wordsOf } from './words'

/** The initials by which a warehouse would call a name: of all its words, up to four, `SD`. */
export function initialsOf(name: string): string {
  const heads = headWords(wordsOf(name)).slice(0, 4)
  return heads.map((word) => word[0]!.toUpperCase()).join('')
}

/** What a name could be called by in short, the most natural first. */
function* codesFor(name: string): Generator<string> {
  const heads = headWords(wordsOf(name))
  const letters = heads.map((word) => word.toUpperCase().replace(/[^A-Z]/g, ''))
  const initials = initialsOf(name)
  if (initials.length >= 2) yield initials
  const [first = 'X', second = ''] = letters
  const rest = first.slice(1)
  const consonants = rest.replace(/[AEIOUY]/g, '')
  for (const letter of consonants + rest) yield `${first[0]}${letter}${second.slice(0, 1)}`
  for (const letter of second.slice(1)) yield `${first[0]}${second[0]}${letter}`
  for (const one of rest) for (const two of rest + second) yield `${first[0]}${one}${two}`
  for (let number = 2; ; number++) yield `${initials || 'X'}${number}`
}

/**
 * A short code for each name, in the order given, no two alike: its initials where they are free, or
 * the next most natural letters. `taken` are codes in use elsewhere.
 */
export function proposeCodes(names: readonly string[], taken: readonly string[] = []): string[] {
  const used = new Set(taken.map((code) => code.toUpperCase()))
  return names.map((name) => {
    for (const code of codesFor(name)) {
      if (code.length < 2 || used.has(code)) continue
      used.add(code)
      return code
    }
    throw new RangeError('Codes never run out.')
  })
}
