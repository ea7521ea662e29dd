import type { Actor } from '@/lib/auth/actor'
import type { LetterContent } from '@/lib/mail/letter'

import type { NameMoveKind } from './constants'

/** How many names, or reasons, a letter spells out; the others it counts. */
const SPELT_OUT = 12

const inWords = new Intl.ListFormat('en-GB')

/** "“Stem the Dyed”, “Thyme Will Tell” and 38 more". */
export function spellOut(names: readonly string[]): string {
  const spelt = names.slice(0, SPELT_OUT).map((name) => `“${name}”`)
  const more = names.length - spelt.length
  return inWords.format(more > 0 ? [...spelt, `${more} more`] : spelt)
}

/** Tells a reviewer of all the names that were sent for review together. */
export function reviewLetter(
  { personName, brandName, brandSlug }: Pick<Actor, 'personName' | 'brandName' | 'brandSlug'>,
  { name, line, names }: { name: string; line: { name: string; slug: string }; names: string[] },
): LetterContent {
  const many = names.length === 1 ? 'one name' : `${names.length} names`
  return {
    kind: 'names-to-review',
    subject: `${many.replace(/^o/, 'O')} to review for ${line.name}`,
    name,
    paragraphs: [
      `${personName} has sent ${many} of ${line.name} (${brandName}) for review: ${spellOut(names)}.`,
    ],
    action: { label: 'Open the review', path: `/${brandSlug}/lines/${line.slug}/names/review` },
  }
}

/** What was decided about an idea, and by whom; nobody when that account is gone. */
export interface Decision {
  ideaId: string
  text: string
  move: DecidingMove
  reason: string
  by: string | null
}
/** The moves that decide about an idea. */
export type DecidingMove = Extract<
  NameMoveKind,
  'approve' | 'return' | 'put-by' | 'displace' | 'reopen'
>

/** What somebody did to the names that `of` speaks of. */
const DECIDED: Record<DecidingMove, (by: string, of: string) => string> = {
  approve: (by, of) => `${by} approved ${of}.`,
  return: (by, of) => `${by} returned ${of}`,
  'put-by': (by, of) => `${by} put by ${of}.`,
  displace: (by, of) => `${by} approved another name in the stead of ${of}, which is put by now.`,
  reopen: (by, of) => `${by} opened ${of} again, which had been approved`,
}

const SUBJECTS: Record<DecidingMove, (name: string) => string> = {
  approve: (name) => `${name} is approved`,
  return: (name) => `${name} was returned`,
  'put-by': (name) => `${name} was put by`,
  displace: (name) => `${name} was put by`,
  reopen: (name) => `${name} is open again`,
}

/** Tells an author of all that was decided about their names of a line together. */
export function decisionLetter(
  { brandName, brandSlug }: { brandName: string; brandSlug: string },
  {
    name,
    line,
    decisions,
  }: { name: string; line: { name: string; slug: string }; decisions: readonly Decision[] },
): LetterContent {
  const [first] = decisions
  const names = `/${brandSlug}/lines/${line.slug}/names`
  const alone = decisions.length === 1
  return {
    kind: 'names-decided',
    subject: alone
      ? SUBJECTS[first!.move](`“${first!.text}”`)
      : `${decisions.length} of your names for ${line.name} were decided on`,
    name,
    paragraphs: [
      alone
        ? `Your name for ${line.name} (${brandName}) was decided on.`
        : `Your names for ${line.name} (${brandName}) were decided on.`,
      ...together(decisions),
      ...withReasons(decisions),
    ],
    action: alone
      ? { label: 'Open the name', path: `${names}/ideas/${first!.ideaId}` }
      : { label: 'Open the history', path: `${names}/history` },
  }
}

const SOMEBODY = 'Somebody who has left'

/** One sentence for all that one person decided alike. */
function together(decisions: readonly Decision[]): string[] {
  const alike = new Map<string, Decision[]>()
  for (const one of decisions.filter(({ reason }) => reason === '')) {
    const key = JSON.stringify([one.move, one.by])
    alike.set(key, [...(alike.get(key) ?? []), one])
  }
  return [...alike.values()].map((some) => {
    const { move, by } = some[0]!
    const said = DECIDED[move](by ?? SOMEBODY, spellOut(some.map(({ text }) => text)))
    return said.replace(/([^.])$/, '$1.')
  })
}

/** One sentence for each that was given a reason, as far as a letter goes. */
function withReasons(decisions: readonly Decision[]): string[] {
  const given = decisions.filter(({ reason }) => reason !== '')
  const spelt = given.slice(0, SPELT_OUT).map(({ move, by, text, reason }) => {
    const said = DECIDED[move](by ?? SOMEBODY, `“${text}”`)
    return `${said.replace(/\.$/, '')}: ${reason}`
  })
  const more = given.length - spelt.length
  return more > 0 ? [...spelt, `Of ${more} more the history tells why.`] : spelt
}
