import type { Actor } from '@/lib/auth/actor'
import type { LetterContent } from '@/lib/mail/letter'

/** How many names a letter spells out; the others it counts. */
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
