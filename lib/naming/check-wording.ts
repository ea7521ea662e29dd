import { englishDataset, englishRecommendedTransformers, RegExpMatcher } from 'obscenity'
import retextEnglish from 'retext-english'
import retextEquality from 'retext-equality'
import retextProfanities from 'retext-profanities'
import { unified } from 'unified'
import { VFile } from 'vfile'

import { COLOR_THINGS } from './color-things'
import type { Finding } from './finding'
import { stemOf, wordsOf } from './words'

const matcher = new RegExpMatcher({ ...englishDataset.build(), ...englishRecommendedTransformers })
const reader = unified()
  .use(retextEnglish)
  .use(retextEquality)
  // 0 is hardly ever meant badly (black, blow, bag): names would be full of it.
  .use(retextProfanities, { sureness: 1 })

/**
 * What the kept lists stumble over and a name may well say: black and white are colours here, kings
 * and aunts are themselves, and sayings have devils, cracks and balls.
 */
const LET_BE: ReadonlySet<string> = new Set([
  ...COLOR_THINGS.filter(({ kind }) => kind === 'color').map(({ word }) => word),
  ...(
    'he him his she her hers man men woman women boy boys girl girls king kings queen queens lord lady ' +
    'father fathers mother mothers son sons daughter daughters brother sister aunt uncle grandmother ' +
    'easy simple simply just obvious devil crack cracks ball balls nip nips'
  ).split(' '),
])

/** Words that a yarn should not carry, and why; ours. */
const OURS: Readonly<Record<string, string>> = {
  ...because('Knitters fear moths, and so does whoever sells wool.', 'moth mothy motheaten'),
  ...because('It promises trouble with the yarn.', 'mildew itchy scratchy pilling pill bleed bleeding fade faded shrink shrunk tangle tangled stain stained musty mouldy moldy'),
  ...because('It takes one colour of skin for everybody’s.', 'nude flesh fleshtone skintone'),
  ...because('It names a people as an ornament.', 'oriental tribal ethnic exotic native aboriginal navajo apache cherokee hindu aztec inca maori eskimo inuit gypsy romany squaw papoose zulu geisha'),
  ...because('It recalls slavery or empire.', 'slave plantation colonial master coolie nigger negro'),
  ...because('It makes light of illness of the mind.', 'crazy insane psycho lunatic schizo bipolar bedlam madhouse'),
  ...because('It makes light of a body or a disability.', 'lame crippled spastic dumb retarded midget dwarf fatty'),
  ...because('It brings death or wounds to a soft thing.', 'corpse blood bloody murder suicide cancer plague gore slaughter noose'),
  ...because('It belongs to a faith that may not wish it on a label.', 'buddha allah jesus christ krishna ganesh torah quran voodoo'),
} // prettier-ignore

function because(reason: string, words: string): Record<string, string> {
  return Object.fromEntries(words.split(' ').map((word) => [word, reason]))
}

const warn = (what: string, why: string, sure: Finding['sure']): Finding => ({
  check: 'wording',
  grade: 'warning',
  what,
  why,
  sure,
})

/**
 * Whether a name holds words that are rude, hurtful, or wrong on a yarn, each with its reason. Who
 * keeps such a name says why.
 */
export function checkWording(name: string): Finding[] {
  const findings: Finding[] = []
  const told = new Set<string>()
  for (const word of wordsOf(name)) {
    const reason = OURS[word] ?? OURS[stemOf(word)]
    if (!reason || told.has(word)) continue
    told.add(word)
    findings.push(warn(`“${word}” is better left out.`, reason, 'likely'))
  }
  if (matcher.hasMatch(name))
    findings.push(
      warn(
        'It holds a rude word.',
        'Found by a list of obscenities, also where letters are disguised.',
        'likely',
      ),
    )
  const file = new VFile(name)
  reader.runSync(reader.parse(file), file)
  for (const { actual, expected, source } of file.messages) {
    const word = (actual ?? '').toLowerCase()
    if (told.has(word) || LET_BE.has(word)) continue
    told.add(word)
    if (source === 'retext-profanities') {
      const why = 'A kept list of words that offend some people holds it.'
      findings.push(warn(`“${actual}” can be taken as an insult.`, why, 'perhaps'))
      continue
    }
    const rather = expected?.length
      ? `; it proposes ${expected.map((w) => `“${w}”`).join(' or ')}`
      : ''
    const why = `A kept list of words to be careful with holds it${rather}.`
    findings.push({ ...warn(`“${actual}” may leave somebody out.`, why, 'perhaps'), grade: 'note' })
  }
  return findings
}
