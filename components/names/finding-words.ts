import type { Finding } from '@/lib/naming/finding'

/** What each check looks for, as a heading. */
export const CHECK_WORDS: Record<Finding['check'], string> = {
  same: 'Same or near',
  sound: 'Sounds like',
  color: 'Another colour',
  fiber: 'Implies a fibre',
  wording: 'Wording',
  label: 'Label',
  line: 'All together',
}

/** How sure a check is, in words. */
export const SURE_WORDS: Record<Finding['sure'], string> = {
  certain: 'certain',
  likely: 'likely',
  perhaps: 'perhaps',
}

const count = (many: number, noun: string) => `${many} ${noun}${many === 1 ? '' : 's'}`

/** "2 warnings, 1 note", "Nothing found", or "Not checked yet". */
export function inShort(findings: readonly Finding[] | null): string {
  if (findings === null) return 'Not checked yet'
  const warnings = findings.filter(({ grade }) => grade === 'warning').length
  const notes = findings.length - warnings
  const parts = [
    ...(warnings > 0 ? [count(warnings, 'warning')] : []),
    ...(notes > 0 ? [count(notes, 'note')] : []),
  ]
  return parts.join(', ') || 'Nothing found'
}

const folded = (text: string) => text.normalize('NFC').trim().replace(/\s+/g, ' ').toLowerCase()

/** Whether two names are the same words, capitals aside. */
export const sameWords = (one: string, other: string): boolean => folded(one) === folded(other)
