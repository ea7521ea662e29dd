import { screenColor } from '@/lib/color/gamut'
import type { Finding } from '@/lib/naming/finding'
import type { Play } from '@/lib/naming/play'
import type { StoryName } from '@/lib/naming/story'
import type { LabelSetting, SetName } from '@/lib/naming/label'
import type { Role } from '@/lib/people/constants'
import { shadeLabel, type ShadeView } from '@/lib/shades/present'
import type {
  NameIdea,
  NameMove,
  NameRemark,
  NameSearch,
  NameVote,
  NamingSettings,
  Shade,
} from '@/models'

import { movable } from './change-names'
import { labelOf } from './check-name'
import type { NameMoveKind, NameState, NameVoteKind, SearchOutcome, StateMove } from './constants'
import { isOwn, movesOpen, reasonAgainstVote, type Asker } from './moves'

export type { CheckedName } from './check-name'

/** Names made up for a shade, best first; `fits` says whether the ball band has room for one. */
export interface ProposedNames {
  plays: (Play & { fits: boolean })[]
  story: (StoryName & { fits: boolean })[]
}

/** Who did something; null once that account is gone. */
export type Someone = { id: string; name: string } | null

/** What reviewers said of an idea in its round. */
export interface VoteView {
  person: Someone
  vote: NameVoteKind
  comment: string
  /** It is the reader's own. */
  mine: boolean
  /** ISO 8601. */
  at: string
}

/** An idea as it leaves the server, to one reader. */
export interface IdeaView {
  id: string
  shadeId: string | null
  text: string
  note: string
  state: NameState
  /** ISO 8601. */
  stateSince: string
  round: number
  version: number
  /** As found when it was sent for review; null before. */
  findings: Finding[] | null
  wordingReason: string
  author: Someone
  /** Whose words they are now; the author mostly. */
  wordedBy: Someone
  /** The reader brought it or worded it. */
  isOwn: boolean
  /** Approved, and locked for the label printer. */
  locked: boolean
  /** The moves that the reader may make now. */
  moves: StateMove[]
  canEdit: boolean
  canDelete: boolean
  canVote: boolean
  votes: VoteView[]
}

/** For whom ideas are presented. */
export interface Reader {
  asker: Asker
  frozen: boolean
  /** Names by id of whoever may be named. */
  people: ReadonlyMap<string, string>
}

const someone = (people: Reader['people'], id: string | null): Someone => {
  const name = id === null ? undefined : people.get(id)
  return id !== null && name !== undefined ? { id, name } : null
}

/** An idea with what was said of it in its round. */
export function presentIdea(
  idea: NameIdea,
  votes: readonly NameVote[],
  { asker, frozen, people }: Reader,
): IdeaView {
  const open = movable(idea, frozen)
  const own = isOwn(idea, asker.personId)
  const drafts = asker.role !== 'dyer'
  const loose = idea.state === 'draft' || idea.state === 'returned'
  return {
    id: idea.id,
    shadeId: idea.shadeId,
    text: idea.text,
    note: idea.note,
    state: idea.state,
    stateSince: idea.stateSince.toISOString(),
    round: idea.round,
    version: idea.version,
    findings: idea.findings,
    wordingReason: idea.wordingReason,
    author: someone(people, idea.authorId),
    wordedBy: someone(people, idea.wordedById),
    isOwn: own,
    locked: open.locked,
    moves: movesOpen(open, asker),
    canEdit: drafts && loose,
    canDelete: drafts && (loose || idea.state === 'put-by') && (own || asker.role === 'owner'),
    canVote: reasonAgainstVote(open, asker) === null,
    votes: votes
      .filter((vote) => vote.ideaId === idea.id && vote.round === idea.round)
      .map((vote) => presentVote(vote, { asker, people })),
  }
}

function presentVote(
  vote: NameVote,
  { asker, people }: Pick<Reader, 'asker' | 'people'>,
): VoteView {
  return {
    person: someone(people, vote.personId),
    vote: vote.vote,
    comment: vote.comment,
    mine: vote.personId === asker.personId,
    at: vote.updatedAt.toISOString(),
  }
}

/** A shade in the list of names. */
export interface NameRow {
  /** The shade's. */
  id: string
  number: string
  /** The approved name, or "No. 14". */
  label: string
  /** `#rrggbb` for a screen. */
  hex: string
  /** The shade is no longer made. */
  retired: boolean
  /** The tonal family's name; null while it is in none. */
  family: string | null
  /**
   * The idea that stands for the shade: what is approved, else what is in review, else what was
   * drafted or returned last. A draft's findings are those of now.
   */
  idea: IdeaView | null
  /** Its other ideas, by state. */
  others: Partial<Record<NameState, number>>
}

/** How far the names of a line have come. */
export interface NamesInNumbers {
  shades: number
  /** Shades with an approved name. */
  named: number
  /** Ideas on shades, by state. */
  onShades: Record<NameState, number>
  /** Loose ideas that are not put by. */
  heap: number
}

/** A name as it stands among all names of its line. */
export interface TogetherRow {
  /** The shade's. */
  id: string
  number: string
  hex: string
  family: string | null
  ideaId: string
  name: string
  state: 'approved' | 'in-review'
  /** A stock code that no other name of the line has. */
  code: string
  /** The saying it plays on; null when we know none. */
  source: string | null
}

/** A line of the history of names. */
export interface MoveView {
  id: string
  ideaId: string
  move: NameMoveKind
  from: NameState | null
  to: NameState
  /** What the idea said then. */
  text: string
  shadeId: string | null
  reason: string
  person: Someone
  /** ISO 8601. */
  at: string
}

/** A move as its view. */
export const presentMove = (move: NameMove, people: Reader['people']): MoveView => ({
  id: move.id,
  ideaId: move.ideaId,
  move: move.move,
  from: move.fromState,
  to: move.toState,
  text: move.text,
  shadeId: move.shadeId,
  reason: move.reason,
  person: someone(people, move.personId),
  at: move.createdAt.toISOString(),
})

/** A remark in the talk about an idea. */
export interface RemarkView {
  id: string
  text: string
  person: Someone
  /** ISO 8601. */
  at: string
}

/** A remark as its view. */
export const presentRemark = (remark: NameRemark, people: Reader['people']): RemarkView => ({
  id: remark.id,
  text: remark.text,
  person: someone(people, remark.personId),
  at: remark.createdAt.toISOString(),
})

/** A search in a register of marks, as somebody recorded it. */
export interface SearchView {
  id: string
  register: string
  searchedBy: string
  /** yyyy-mm-dd */
  searchedOn: string
  outcome: SearchOutcome
  note: string
}

/** A search as its view. */
export const presentSearch = (search: NameSearch): SearchView => ({
  id: search.id,
  register: search.register,
  searchedBy: search.searchedBy,
  searchedOn: search.searchedOn,
  outcome: search.outcome,
  note: search.note,
})

/** A shade as something that names are laid on. */
export interface NameableShade {
  id: string
  number: string
  /** The name, or "No. 14" while it has none. */
  label: string
  hex: string
}

/** The columns that {@link presentNameable} needs. */
export const NAMEABLE_COLUMNS = ['id', 'number', 'name', 'labL', 'labA', 'labB'] as const

/** A shade row as something that names are laid on. */
export const presentNameable = (
  shade: Pick<Shade, (typeof NAMEABLE_COLUMNS)[number]>,
): NameableShade => ({
  id: shade.id,
  number: shade.number,
  label: shadeLabel(shade),
  hex: screenColor([shade.labL, shade.labA, shade.labB]).hex,
})

/** An idea of the heap, or one that was put by. */
export interface HeapIdeaView extends IdeaView {
  /** What in it calls a colour to mind: "thyme"; ideas without stay in the heap when it is dealt. */
  hints: string[]
  /** What it lay on when it was put by. */
  shade: NameableShade | null
}

/** What would become of a row that somebody brings. */
export interface IdeaRowView {
  /** As a spreadsheet counts, the header being row 1; of names one a line, the line. */
  row: number
  /** `there`: the line, or a row before it, has that name already. */
  outcome: 'new' | 'there' | 'bad'
  text: string
  note: string
  /** Null goes to the heap. */
  shade: NameableShade | null
  /** Where the name is already: "No. 14, approved", "row 3". */
  where: string | null
  errors: string[]
}

/** What adding a pile of names would do. */
export interface IdeasPreview {
  /** How the columns of a file were read: "name from “Idea”"; none of names one a line. */
  columns: string[]
  /** Headers of columns that were passed over. */
  unread: string[]
  counts: Record<IdeaRowView['outcome'], number>
  rows: IdeaRowView[]
  /** The bad rows with their reasons, to take away. */
  badCsv: string | null
}

/** A shade of the page that shows how the heap was dealt. */
export interface DealtShadeView extends NameableShade {
  /** It waits for a name, so that one could be dealt to it. */
  waits: boolean
  dealt: { ideaId: string; text: string; note: string; fit: number; why: string } | null
}

/** How the heap would be dealt out; nothing has moved. */
export interface DealView {
  /** The families that got a name, in their order, each light to dark. */
  families: { id: string; name: string; shades: DealtShadeView[] }[]
  /** Ideas that stay in the heap, and why. */
  left: {
    ideaId: string
    text: string
    why: 'no colour' | 'no shade near' | 'another suits better'
  }[]
  /** What there was to deal: ideas in the heap, and shades that wait for a name. */
  ideas: number
  waiting: number
  /** Ideas and shades beyond what is dealt at once. */
  beyond: { ideas: number; shades: number }
}

/** The name that a shade has now. */
export interface HeldByShade {
  text: string
  /** Names are locked, and this one is not unlocked: no other can take its place. */
  locked: boolean
}

/** A name in review with all that a reviewer looks at. */
export interface ReviewItem {
  idea: IdeaView
  shade: ShadeView
  /** The name of its tonal family; null while it is in none. */
  family: string | null
  /** Its family around it in the order of the book, itself among them. */
  beside: ShadeView[]
  /** Null while the shade has no name. */
  held: HeldByShade | null
  /** The other names in review for the same shade. */
  rivals: string[]
  /** The newest, oldest first. */
  remarks: RemarkView[]
  /** How many there are in all. */
  remarkCount: number
}

/** What has come of a line's names so far. */
export interface NamesStanding {
  /** Shades, without retired ones. */
  shades: number
  /** Shades with an approved name, without retired ones. */
  named: number
  drafts: number
  returned: number
}

/** A stretch of the names in review, in the order of the line's shades. */
export interface ReviewPage {
  items: ReviewItem[]
  /** Names in review on all stretches. */
  total: number
  /** How many stand before this stretch. */
  start: number
  /** The last of the stretch before, and the first of the one after. */
  before: string | null
  after: string | null
  standing: NamesStanding
  /** The reader decides on names. */
  decides: boolean
  frozen: boolean
}

/** A search, and whether the reader may take it off the record. */
export type RecordedSearch = SearchView & { canRemove: boolean }

/** A move with the shade it was laid on then; null for the heap. */
export type ToldMove = MoveView & { shadeLabel: string | null }

/** An idea with all that was said and done about it. */
export interface IdeaDetail {
  idea: IdeaView
  /** Null in the heap, and when its shade was deleted. */
  shade: ShadeView | null
  /** The other name that the shade has now. */
  held: HeldByShade | null
  /** What the checks say: as sent for review, or now while its words may still change. */
  findings: Finding[]
  /** They were kept when it was sent. */
  findingsKept: boolean
  /** Its wording is warned of: it needs a reason to be sent. */
  needsReason: boolean
  remarks: RemarkView[]
  searches: RecordedSearch[]
  /** Oldest first. */
  moves: ToldMove[]
  /** The reader decides on names. */
  decides: boolean
  frozen: boolean
}

/** How the names of a line are set and dated. */
export interface NamingSettingsView {
  /** mm, pt, lines */
  label: LabelSetting
  care: string
  themes: string[]
  /** yyyy-mm-dd; null while undecided. */
  printOn: string | null
  /** Approved names are locked. */
  frozen: boolean
  /** 0 while nobody has set anything. */
  version: number
}

/** The settings, or what holds while there are none. */
export const presentSettings = (
  settings: NamingSettings | null,
  frozen: boolean,
): NamingSettingsView => ({
  label: labelOf(settings),
  care: settings?.care ?? '',
  themes: settings?.themes ?? [],
  printOn: settings?.printOn ?? null,
  frozen,
  version: settings?.version ?? 0,
})

/** An approved name as it goes on its ball band. */
export interface LabelView {
  shadeId: string
  number: string
  ideaId: string
  version: number
  name: string
  set: SetName
  /** Locked for the label printer. */
  locked: boolean
  /** An owner unlocked it while the others are locked. */
  unlocked: boolean
  canUnlock: boolean
}

/** A shade that goes on no ball band by name, and how far its furthest idea has come. */
export interface UnnamedView {
  shadeId: string
  number: string
  state: NameState | null
}

/** The label as it would be set, and whether all names of the line fit on it. */
export interface LabelsPreview {
  setting: LabelSetting
  /** The widest name; the line's own while it has none. */
  sample: { number: string; name: string; set: SetName }
  /** Names that are approved or in review. */
  total: number
  /** Those that do not fit, the widest first; a few of them. */
  misfits: { number: string; name: string; set: SetName }[]
  /** How many do not fit. */
  misfitCount: number
}

/** Somebody who decides on names, or could be appointed to. */
export interface ReviewerView {
  personId: string
  name: string
  role: Role
  isReviewer: boolean
}

/** An entry of the history of a line's names. */
export interface NameHistoryEntry {
  id: string
  person: Someone
  /** ISO 8601. */
  at: string
  /** "14:05", in UTC. */
  time: string
  told:
    | { move: MoveView; shade: string | null }
    /** What follows the person's name, or says it all where nobody did it. */
    | { sentence: string; byItself: boolean }
}

/** The entries of one day. */
export interface NameHistoryDay {
  /** yyyy-mm-dd, in UTC. */
  date: string
  /** "Tuesday 1 December 2026". */
  heading: string
  entries: NameHistoryEntry[]
}
