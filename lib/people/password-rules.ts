import { plainPassword } from '@/lib/auth/password'

import { PASSWORD_LENGTH } from './constants'

/*
 * How many bits somebody needs who guesses the way people choose: by common passwords, what is
 * known of the person, runs, and single signs. Below GUESSED a password is among the first tried:
 * two common words with a sign or two, one with up to four.
 */
const WORD = 16
const KNOWN = 8
const RUN = 8
const SIGN = 6
const AGAIN = 4
const GUESSED = 45

const ROWS = ['1234567890', 'qwertyuiop', 'asdfghjkl', 'zxcvbnm', 'qwertzuiop', 'azertyuiop']
/** Signs that stand for a letter: "p@ssw0rd". */
const STAND_INS: Record<string, string> = {
  '@': 'a',
  '4': 'a',
  '3': 'e',
  '1': 'i',
  '!': 'i',
  '0': 'o',
  $: 's',
  '5': 's',
  '7': 't',
}

let loading: Promise<{ words: ReadonlySet<string>; longest: number }> | undefined

/** Some 49,000 passwords, loaded when the first is asked about. */
function commonPasswords() {
  return (loading ??= import('@zxcvbn-ts/language-common').then(({ dictionary }) => {
    const words = new Set(dictionary['passwords-common'].map((word) => word.toLowerCase()))
    return { words, longest: Math.max(...[...words].map((word) => word.length)) }
  }))
}

/** What anybody knows of the person and of us, in lower case: names, and parts of the address. */
function knownWords({ email = '', name = '' }: { email?: string; name?: string }): string[] {
  const [local = '', host = ''] = email.split('@')
  const wholes = ['woadmap', email, local, host, name, name.replace(/\s/g, '')]
  return [...wholes, ...`${local} ${host} ${name}`.split(/[^\p{L}\p{N}]+/u)]
    .map((word) => plainPassword(word).toLowerCase())
    .filter((word) => word.length >= 3)
}

/** How one sign follows another: 0 the same, ±1 its neighbour in the alphabet or on a keyboard. */
function steps(from: string, to: string): number[] {
  const byRow = ROWS.filter((row) => row.includes(from) && row.includes(to)).map(
    (row) => row.indexOf(to) - row.indexOf(from),
  )
  const byCode = to.codePointAt(0)! - from.codePointAt(0)!
  return [byCode, ...byRow].filter((step) => Math.abs(step) <= 1)
}

/** Where the longest run that begins at `start` ends: "aaaa", "4321", "asdf". */
function endOfRun(signs: readonly string[], start: number): number {
  const ends = [0, 1, -1].map((step) => {
    let end = start + 1
    while (end < signs.length && steps(signs[end - 1]!, signs[end]!).includes(step)) end++
    return end
  })
  return Math.max(...ends)
}

/** The shortest beginning that gives the whole when said again and again, or the whole. */
function unitOf(signs: readonly string[]): readonly string[] {
  for (let length = 1; length <= signs.length / 2; length++) {
    if (signs.every((sign, at) => sign === signs[at % length])) return signs.slice(0, length)
  }
  return signs
}

/** Bits by the cheapest way to put the signs together. Cost: signs × the longest word. */
function bitsOf(
  signs: readonly string[],
  {
    common,
    known,
    longest,
  }: { common: ReadonlySet<string>; known: ReadonlySet<string>; longest: number },
): number {
  const best = signs.map(() => Infinity).concat(0)
  for (let start = signs.length - 1; start >= 0; start--) {
    const consider = (end: number, bits: number) => {
      best[start] = Math.min(best[start]!, bits + best[end]!)
    }
    consider(start + 1, SIGN)
    const run = endOfRun(signs, start)
    if (run - start >= 3) consider(run, RUN)
    let asTyped = ''
    let read = ''
    for (let end = start; end < Math.min(signs.length, start + longest); end++) {
      asTyped += signs[end]!
      read += STAND_INS[signs[end]!] ?? signs[end]!
      if (/^(19|20)\d\d$/.test(asTyped)) consider(end + 1, RUN)
      for (const word of [asTyped, read]) {
        if (known.has(word)) consider(end + 1, KNOWN)
        else if (common.has(word)) consider(end + 1, WORD)
      }
    }
  }
  return best[0]!
}

/**
 * Why a password cannot be taken, in words, or null. It is judged by its length and by how soon it
 * would be guessed, never by which kinds of signs it has.
 * @source NIST SP 800-63B-4 § 3.1.1.2: length, a blocklist of common, repetitive and sequential
 *   passwords and of words from the context, no composition rules
 */
export async function checkPassword(
  password: string,
  about: { email?: string; name?: string } = {},
): Promise<string | null> {
  const signs = [...plainPassword(password)]
  const { min, max } = PASSWORD_LENGTH
  if (signs.length < min) return `Use at least ${min} characters: this one has ${signs.length}.`
  if (signs.length > max) return `Use at most ${max} characters.`
  const { words: common, longest } = await commonPasswords()
  const known = new Set(knownWords(about))
  const lower = [...signs.join('').toLowerCase()]
  const terms = {
    common,
    known,
    longest: Math.max(longest, ...[...known].map((one) => one.length)),
  }
  const unit = unitOf(lower)
  const bits = bitsOf(unit, terms) + (unit === lower ? 0 : AGAIN)
  if (bits < GUESSED || common.has(lower.join(''))) {
    return 'That is one of the first passwords somebody would try. Three or four words that have nothing to do with each other are better.'
  }
  return null
}
