import { COMBINATION_LIMITS } from '@/lib/combinations/constants'

import { percentOf, type CombinationDraft } from './draft'
import { PLACE_PARTS, type DraftPart } from './draft-merge'
import type { Saving } from './editor-store'

/** How things are called that a draft holds by id. */
export interface Names {
  shade: (id: string | null) => string
  photograph: (id: string | null) => string
}

/** "place 2 of 5", for the place at 1. */
export const placeInWords = (at: number): string =>
  `place ${at + 1} of ${COMBINATION_LIMITS.places}`

/** A part as it is named to a person: "Title", "Place 2". */
export const partInWords = (part: DraftPart): string => part[0]!.toUpperCase() + part.slice(1)

/** What a draft holds in a part, in words. */
export function heldInWords(draft: CombinationDraft, part: DraftPart, names: Names): string {
  switch (part) {
    case 'title':
    case 'story':
      return draft[part].trim() || 'left empty'
    case 'photograph':
      return names.photograph(draft.photographId)
    case 'shares':
      return draft.places.map(({ share }) => `${percentOf(share)} %`).join(', ')
    case 'roles':
      return draft.places.map(({ role }) => role).join(', ')
    default: {
      const { shadeId, locked } = draft.places[PLACE_PARTS.indexOf(part)]!
      return `${names.shade(shadeId)}${locked ? ', locked' : ''}`
    }
  }
}

/** Where the saving stands, as a word or a sentence. */
export function savingInWords(saving: Saving): string {
  switch (saving.kind) {
    case 'saved':
      return 'Saved'
    case 'waiting':
    case 'saving':
      return 'Saving'
    case 'unreached':
      return 'Not saved yet: no connection, trying again'
    case 'refused':
      return `Not saved yet: ${saving.words}`
    case 'conflict':
      return 'Not saved yet: somebody else changed the same'
  }
}

/** "Undone: title and place 2." */
export function stepInWords(done: string, parts: readonly DraftPart[]): string {
  return parts.length > 0 ? `${done}: ${parts.join(' and ')}.` : `${done}.`
}
