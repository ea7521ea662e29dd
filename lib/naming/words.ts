const DIGITS = ['zero', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine']

/**
 * The words of a name as they are said: lower case, no accents or punctuation, `&` as “and”, a
 * figure digit by digit. “Hip, Hip & Haw” is hip, hip, and, haw.
 */
export function wordsOf(text: string): string[] {
  return text
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
    .replace(/[’‘ʼ`]/g, "'")
    .replace(/æ/g, 'ae')
    .replace(/œ/g, 'oe')
    .replace(/ø/g, 'o')
    .replace(/ß/g, 'ss')
    .replace(/&/g, ' and ')
    .replace(/\d/g, (digit) => ` ${DIGITS[Number(digit)]} `)
    .split(/[^a-z']+/)
    .map((word) => word.replace(/^'+|'+$/g, ''))
    .filter(Boolean)
}

/** Words that carry no name of their own. */
export const SMALL_WORDS: ReadonlySet<string> = new Set(
  (
    'a an the and or of to in on at by for with from as is it its be my your his her our their ' +
    "but nor so than into up out o'"
  ).split(' '),
)

/** The words by which a name is known: without small ones, unless there are only small ones. */
export function headWords(words: readonly string[]): string[] {
  const heads = words.filter((word) => !SMALL_WORDS.has(word))
  return heads.length > 0 ? heads : [...words]
}

/** A word without its possessive and the commonest plural: `lamb's` and `lambs` are `lamb`. */
export function stemOf(word: string): string {
  const bare = word.replace(/'s?$/, '')
  if (/(?:[^s]s)$/.test(bare) && bare.length > 3) {
    if (/ies$/.test(bare) && bare.length > 4) return `${bare.slice(0, -3)}y`
    if (/(?:ch|sh|x|z|ss)es$/.test(bare)) return bare.slice(0, -2)
    if (!/(?:us|is)$/.test(bare)) return bare.slice(0, -1)
  }
  return bare
}
