import { isVowel, type Sound } from './arpabet'

/** Letters, what they sound like, and what must follow (a pattern on the rest of the word). */
type Rule = readonly [letters: string, sound: string, follows?: RegExp, begins?: true]

const SOFT = /^[eiy]/
const END = /^$/
/** One consonant, then a final e: the e is silent and the vowel before it is long. */
const MAGIC = /^(?:[bcdfgklmnprstvz]|th|st)e(?:$|s$|d$|ly$|ful$)/

/** Tried from the top: the first rule that fits is taken. */
// prettier-ignore
const RULES: readonly Rule[] = [
  ['eaux', 'OW'], ['eau', 'OW'], ['augh', 'AO'], ['ough', 'AO T', /^t/], ['ough', 'OW'],
  ['tion', 'SH AH N'], ['sion', 'ZH AH N'], ['cian', 'SH AH N'], ['tious', 'SH AH S'],
  ['cious', 'SH AH S'], ['ture', 'CH ER', END], ['sure', 'ZH ER', END], ['igh', 'AY'],
  ['eigh', 'EY'], ['tch', 'CH'], ['dge', 'JH'], ['sch', 'SH'], ['que', 'K', END],
  ['ous', 'AH S', END], ['ess', 'EH S', END], ['ey', 'IY', END], ['ey', 'EY'], ['ay', 'EY'],
  ['ai', 'EY', /^[^r]/], ['air', 'EH R'], ['are', 'EH R', /^(?:$|s$)/], ['ear', 'IH R'],
  ['eer', 'IH R'], ['ere', 'IH R', END], ['ire', 'AY ER', END], ['ore', 'AO R', END],
  ['oar', 'AO R'], ['oor', 'AO R'], ['our', 'AO R'], ['ure', 'Y UH R', END], ['arr', 'AE R'],
  ['err', 'EH R'], ['orr', 'AO R'], ['wor', 'W ER'], ['war', 'W AO R'], ['wa', 'W AA', /^[^rk]/],
  ['qu', 'K W'], ['wh', 'W'], ['wr', 'R', undefined, true], ['kn', 'N', undefined, true],
  ['gn', 'N', undefined, true], ['ps', 'S', undefined, true], ['mb', 'M', END], ['gh', 'G', undefined, true],
  ['gh', ''], ['ph', 'F'], ['th', 'TH'], ['sh', 'SH'], ['ch', 'CH'], ['ck', 'K'], ['ng', 'NG', END],
  ['nk', 'NG K'], ['ngl', 'NG G L'], ['sc', 'S', SOFT], ['cc', 'K S', SOFT], ['ss', 'S'],
  ['ee', 'IY'], ['ea', 'IY'], ['ie', 'IY', /^[^rt]/], ['ie', 'AY', END], ['ei', 'EY'], ['oa', 'OW'],
  ['oo', 'UW'], ['ou', 'AW'], ['oe', 'OW', END], ['ow', 'OW', /^(?:$|s$|n)/], ['ow', 'AW'],
  ['oi', 'OY'], ['oy', 'OY'], ['au', 'AO'], ['aw', 'AO'], ['ew', 'UW'], ['ue', 'UW', END],
  ['ui', 'UW', /^t/], ['ar', 'AA R', /^[^aeiouy]|^$/], ['er', 'ER', /^[^aeiouy]|^$/],
  ['ir', 'ER', /^[^aeiouy]|^$/], ['or', 'AO R', /^[^aeiouy]|^$/], ['ur', 'ER', /^[^aeiouy]|^$/],
  ['yr', 'ER', /^[^aeiouy]|^$/], ['le', 'AH L', /^(?:$|s$|d$)/], ['al', 'AH L', END],
  ['en', 'AH N', END], ['on', 'AH N', END], ['in', 'IH N', END], ['ed', 'IH D', END],
  ['ing', 'IH NG', END], ['es', 'Z', END],
  ['a', 'EY', MAGIC], ['e', 'IY', MAGIC], ['i', 'AY', MAGIC], ['o', 'OW', MAGIC], ['u', 'UW', MAGIC],
  ['y', 'AY', MAGIC], ['a', 'AH', END], ['o', 'OW', END], ['i', 'IY', END], ['u', 'UW', END],
  ['y', 'Y', undefined, true], ['y', 'IY', END], ['y', 'IH'], ['e', '', END],
  ['e', 'IY', /^[aou]/], ['i', 'IY', /^[aou]/], ['u', 'UW', /^[aeo]/],
  ['a', 'AE'], ['e', 'EH'], ['i', 'IH'], ['o', 'AA'], ['u', 'AH'],
  ['c', 'S', SOFT], ['c', 'K'], ['g', 'JH', /^[eiy](?!r|g)/], ['g', 'G'], ['x', 'Z', undefined, true],
  ['x', 'K S'], ['j', 'JH'], ['q', 'K'], ['s', 'Z', /^m$/], ['h', 'HH'], ['b', 'B'], ['d', 'D'],
  ['f', 'F'], ['k', 'K'], ['l', 'L'], ['m', 'M'], ['n', 'N'], ['p', 'P'], ['r', 'R'], ['s', 'S'],
  ['t', 'T'], ['v', 'V'], ['w', 'W'], ['z', 'Z'], ["'", ''],
]

const byFirst = new Map<string, Rule[]>()
for (const rule of RULES) {
  const first = rule[0][0]!
  byFirst.set(first, [...(byFirst.get(first) ?? []), rule])
}

/**
 * A guess at how an unknown word is said, by its letters alone; stress on the first syllable. A word
 * of a to z and apostrophes; never empty.
 * @source letter-to-sound rules, common practice; the rules are ours
 */
export function guessSound(word: string): Sound {
  const sounds: string[] = []
  for (let at = 0; at < word.length;) {
    const rest = word.slice(at)
    // Doubled consonants are one sound.
    if (/^([bcdfghjklmnpqrtvwxz])\1/.test(rest) && !/^cc[eiy]/.test(rest)) {
      at++
      continue
    }
    const rule = byFirst
      .get(rest[0]!)
      ?.find(
        ([letters, , follows, begins]) =>
          rest.startsWith(letters) &&
          (!begins || at === 0) &&
          (!follows || follows.test(rest.slice(letters.length))),
      )
    if (rule && rule[1]) sounds.push(...rule[1].split(' '))
    at += rule ? rule[0].length : 1
  }
  let stressed = false
  const marked = sounds.map((sound) => {
    if (!isVowel(sound)) return sound
    const stress = stressed ? 0 : 1
    stressed = true
    return `${sound}${stress}`
  })
  return marked.length > 0 ? marked : ['AH1']
}
