import { COMBINATION_LIMITS } from '@/lib/combinations/constants'

import type { CombinationDraft } from './draft'
import type { DraftHistory } from './draft-history'

/**
 * What two people can change without touching the same thing. The shares are one thing, since they
 * sum to 100 %, and so are the roles, since each is given once.
 */
export type DraftPart = 'title' | 'story' | 'photograph' | 'shares' | 'roles' | `place ${number}`

/** The parts that stand in places: "place 1" to "place 5". */
export const PLACE_PARTS = Array.from(
  { length: COMBINATION_LIMITS.places },
  (_, at) => `place ${at + 1}` as const,
)

/** Every part, as a page names them from top to bottom. */
export const DRAFT_PARTS: readonly DraftPart[] = [
  'title',
  ...PLACE_PARTS,
  'shares',
  'roles',
  'photograph',
  'story',
]

/** What a part holds, as one text. Space around a text is not a difference. */
function held({ title, story, photographId, places }: CombinationDraft, part: DraftPart): string {
  switch (part) {
    case 'title':
      return title.trim()
    case 'story':
      return story.trim()
    case 'photograph':
      return photographId ?? ''
    case 'shares':
      return places.map(({ share }) => Math.round(share * 100)).join()
    case 'roles':
      return places.map(({ role }) => role).join()
    default: {
      const place = places[PLACE_PARTS.indexOf(part)]
      return `${place?.shadeId ?? ''} ${place?.locked}`
    }
  }
}

function take(into: CombinationDraft, from: CombinationDraft, part: DraftPart): CombinationDraft {
  switch (part) {
    case 'title':
      return { ...into, title: from.title }
    case 'story':
      return { ...into, story: from.story }
    case 'photograph':
      return { ...into, photographId: from.photographId }
    default:
      return {
        ...into,
        places: into.places.map((place, at) => {
          const { shadeId, locked, share, role } = from.places[at]!
          if (part === 'shares') return { ...place, share }
          if (part === 'roles') return { ...place, role }
          return PLACE_PARTS[at] === part ? { ...place, shadeId, locked } : place
        }),
      }
  }
}

/** The parts in which two drafts differ. */
export const differingParts = (one: CombinationDraft, other: CombinationDraft): DraftPart[] =>
  DRAFT_PARTS.filter((part) => held(one, part) !== held(other, part))

/** Whether there is nothing to save between two drafts. */
export const isSame = (one: CombinationDraft, other: CombinationDraft): boolean =>
  differingParts(one, other).length === 0

const holdsTwice = ({ places }: CombinationDraft): boolean => {
  const filled = places.flatMap(({ shadeId }) => shadeId ?? [])
  return new Set(filled).size < filled.length
}

/** Two people's drafts joined, and the parts both changed, each in another way. */
export interface Joined {
  draft: CombinationDraft
  conflicts: DraftPart[]
}

/**
 * Joins two drafts that began as `base`: each part as whoever changed it left it. Where both
 * changed a part, it stands as in `preferred` and is named in `conflicts`; so are all places that
 * differ when the join would hold a shade twice.
 */
export function joinDrafts(
  base: CombinationDraft,
  mine: CombinationDraft,
  theirs: CombinationDraft,
  preferred: 'mine' | 'theirs' = 'mine',
): Joined {
  const changed = new Set(differingParts(base, mine))
  const differing = differingParts(mine, theirs)
  const theirsToo = new Set(differingParts(base, theirs))
  const conflicts = new Set(differing.filter((part) => changed.has(part) && theirsToo.has(part)))
  let draft = theirs
  for (const part of changed) {
    if (!conflicts.has(part) || preferred === 'mine') draft = take(draft, mine, part)
  }
  if (holdsTwice(draft)) {
    const places = differing.filter((part) => part.startsWith('place'))
    const from = preferred === 'mine' ? mine : theirs
    for (const part of places) {
      conflicts.add(part)
      draft = take(draft, from, part)
    }
  }
  return { draft, conflicts: DRAFT_PARTS.filter((part) => conflicts.has(part)) }
}

/**
 * A history on top of what somebody else saved: in every step what they changed stands as they left
 * it, unless it was changed here too. Taking theirs is a step that can be undone.
 */
export function rebaseHistory(
  { past, present, future }: DraftHistory,
  base: CombinationDraft,
  theirs: CombinationDraft,
  preferred: 'mine' | 'theirs' = 'mine',
): DraftHistory {
  const onTop = (draft: CombinationDraft) => joinDrafts(base, draft, theirs).draft
  const mine = onTop(present)
  const now = joinDrafts(base, present, theirs, preferred).draft
  const before = [...past.map(onTop), ...(isSame(mine, now) ? [] : [mine])]
  return {
    past: before.filter((draft, at) => !isSame(draft, before[at + 1] ?? now)),
    present: now,
    future: future.map(onTop),
    run: null,
  }
}
