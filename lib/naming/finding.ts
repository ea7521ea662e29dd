/**
 * What a check found about a name: something to know, or something to mend. Nothing here forbids a
 * name: people do.
 */
export interface Finding {
  check: 'same' | 'sound' | 'color' | 'fiber' | 'wording' | 'label' | 'line'
  grade: 'note' | 'warning'
  /** one sentence: what is the matter */
  what: string
  /** one sentence: why that matters, or how it was found */
  why: string
  sure: 'certain' | 'likely' | 'perhaps'
}

/** Another name that a new one must be told apart from. */
export interface OtherName {
  name: string
  /** where it stands, in words: `shade 14`, `Heronsway DK 14, retired` */
  where: string
}
