import { LANE_WORDS, type Lane } from '@/lib/combinations/constants'
import { VOTE_WORDS, type NameVoteKind } from '@/lib/names/constants'
import { ROLE_WORDS, type Role } from '@/lib/people/constants'

/** The bounds of what the activity record shows and keeps. */
export const ACTIVITY_LIMITS = {
  perPage: 50,
  /** Entries of one CSV file; older ones are reached by its dates. */
  csvRows: 10_000,
  /** How many things of one change are named; the others are counted. */
  named: 20,
} as const

/** What an entry says besides who, when and what: its thing's name, and what was different. */
export interface Told {
  label: string
  before: Readonly<Record<string, unknown>>
  after: Readonly<Record<string, unknown>>
}

/** "the shade Moss of Heronsway DK", or "3 shades of Heronsway DK". */
const shades = ({ label, after }: Told) =>
  after.count ? `${String(after.count)} shades of ${label}` : `the shade ${label}`

const photographs = ({ label, after }: Told) =>
  after.count ? `${String(after.count)} photographs` : `the photograph ${label}`

/** "the shade Moss" or "3 shades" of a family's line. */
const familyShades = ({ after }: Told) =>
  after.count === 1
    ? `the shade ${String((after.named as string[])[0])}`
    : `${String(after.count)} shades`

const combinationsOf = ({ count }: Told['after']) =>
  count === 1 ? 'one combination' : `${String(count)} combinations`

/** "the name Moss of Heronsway DK", or "3 names of Heronsway DK". */
const names = ({ label, after }: Told) =>
  after.count ? `${String(after.count)} names of ${label}` : `the name ${label}`

/** "approved the name …", with the reason where one was given. */
const because = (verb: string) => (told: Told) =>
  `${verb} ${names(told)}${told.after.reason ? `: ${String(told.after.reason)}` : ''}`

const role = (values: Told['after']) => ROLE_WORDS[values.role as Role] ?? 'no role'

const laneWords = (values: Told['after']) => LANE_WORDS[values.lane as Lane] ?? 'no lane'

/** "restoreCombination" → "restore combination". */
const inWords = (name: unknown) =>
  String(name)
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase()

/** The words of one action. */
export interface ActionWords {
  /** As the filter and the CSV name it. */
  label: string
  /** What follows the person's name. */
  says: (told: Told) => string
  /** The sentence leaves nothing to be told in detail. */
  saysAll?: true
}

/** Everything the record tells of, by the name it is kept under: the one table of its words. */
export const ACTIONS = {
  'session.opened': { label: 'Signed in', says: () => 'signed in' },
  'session.refused': {
    label: 'Sign-in refused',
    says: () => 'was refused at sign-in: the password or the code was wrong',
  },
  'session.ended': {
    label: 'Session ended',
    says: ({ after }) =>
      after.ended ? `ended ${String(after.ended)} other sessions` : 'ended a session',
    saysAll: true,
  },
  'access.refused': {
    label: 'Access refused',
    says: ({ after }) =>
      after.page
        ? `was refused the page ${String(after.page)}`
        : `was refused: ${inWords(after.asked)}`,
    saysAll: true,
  },
  'activity.exported': {
    label: 'Record exported',
    says: () => 'took this record away as a CSV file',
  },
  'brand.created': { label: 'Brand made', says: ({ label }) => `made the brand ${label}` },
  'brand.second-factor-requirement-changed': {
    label: 'Second factor required or not',
    says: ({ after }) =>
      after.required
        ? 'made a second factor required of everybody'
        : 'made a second factor a matter of choice',
  },
  'membership.invited': {
    label: 'Member invited',
    says: ({ after }) => `invited somebody as ${role(after)}`,
  },
  'membership.invitation-resent': {
    label: 'Invitation sent again',
    says: ({ label }) => `sent an invitation as ${label} again`,
  },
  'membership.withdrawn': {
    label: 'Invitation withdrawn',
    says: ({ label }) => `withdrew an invitation as ${label}`,
  },
  'membership.joined': {
    label: 'Member joined',
    says: ({ after }) => `joined as ${role(after)}`,
  },
  'membership.role-changed': {
    label: 'Role changed',
    says: ({ label, before, after }) =>
      `changed the role of ${label} from ${role(before)} to ${role(after)}`,
  },
  'membership.removed': {
    label: 'Member removed',
    says: ({ label, before }) => `removed ${label}, who was ${role(before)}`,
  },
  'membership.left': { label: 'Member left', says: () => 'left the brand' },
  'person.name-changed': { label: 'Name changed', says: () => 'changed their name' },
  'person.password-changed': { label: 'Password changed', says: () => 'changed their password' },
  'person.password-reset': { label: 'Password reset', says: () => 'chose a new password by mail' },
  'person.email-change-requested': {
    label: 'E-mail change asked for',
    says: () => 'asked to change their e-mail address',
  },
  'person.email-changed': {
    label: 'E-mail changed',
    says: () => 'changed their e-mail address',
  },
  'person.second-factor-set': {
    label: 'Second factor set up',
    says: () => 'set up a second factor for their account',
  },
  'person.second-factor-replaced': {
    label: 'Second factor replaced',
    says: () => 'set up another authenticator in place of theirs',
  },
  'person.second-factor-removed': {
    label: 'Second factor removed',
    says: () => 'removed the second factor from their account',
  },
  'person.recovery-codes-renewed': {
    label: 'Recovery codes renewed',
    says: () => 'made new recovery codes',
  },
  'person.recovery-code-used': {
    label: 'Recovery code used',
    says: ({ after }) => `signed in with a recovery code; ${String(after.left)} are left`,
  },
  'person.account-closed': { label: 'Account closed', says: () => 'closed their account' },
  'line.created': { label: 'Line made', says: ({ label }) => `made the line ${label}` },
  'line.updated': { label: 'Line changed', says: ({ label }) => `changed the line ${label}` },
  'shade.created': { label: 'Shade added', says: (told) => `added ${shades(told)}` },
  'shade.updated': { label: 'Shade changed', says: (told) => `changed ${shades(told)}` },
  'shade.status-set': {
    label: 'Status of shades set',
    says: (told) => `set ${shades(told)} to ${String(told.after.status)}`,
  },
  'shade.reordered': {
    label: 'Shades ordered',
    says: (told) => `moved ${shades(told)} to place ${String(told.after.place)}`,
  },
  'shade.deleted': { label: 'Shades deleted', says: (told) => `deleted ${shades(told)}` },
  'shade.restored': {
    label: 'Shades brought back',
    says: (told) => `brought back ${shades(told)}`,
  },
  'shade.imported': {
    label: 'Shades imported',
    says: ({ label, after }) =>
      `imported shades into ${label}: ${String(after.new)} new, ${String(after.changed)} changed`,
  },
  'shade.exported': {
    label: 'Shades exported',
    says: ({ label, after }) =>
      `took the ${String(after.count)} shades of ${label} away as a CSV file`,
  },
  'family.sorted': {
    label: 'Shades sorted into families',
    says: ({ label, after }) =>
      `sorted the shades of ${label} into ${String(after.families)} families anew`,
  },
  'family.renamed': {
    label: 'Family renamed',
    says: ({ label, after }) => `renamed the family ${label} to ${String(after.name)}`,
    saysAll: true,
  },
  'family.merged': {
    label: 'Families merged',
    says: ({ label, after }) => `put the family ${label} into ${String(after.into)}`,
  },
  'family.split': {
    label: 'Family split',
    says: ({ label, after }) => `split ${String(after.name)} off the family ${label}`,
  },
  'family.shades-moved': {
    label: 'Shades moved to a family',
    says: (told) => `moved ${familyShades(told)} to the family ${told.label}`,
  },
  'family.shades-pinned': {
    label: 'Shades pinned in their family',
    says: (told) => `pinned ${familyShades(told)} of ${told.label} in their family`,
  },
  'family.shades-unpinned': {
    label: 'Shades let go from their family',
    says: (told) => `unpinned ${familyShades(told)} of ${told.label}`,
  },
  'family.shades-ordered': {
    label: 'Shades of a family ordered',
    says: ({ label, after }) =>
      after.order === 'by hand'
        ? `put the shades of the family ${label} in another order`
        : `put the shades of the family ${label} in order from light to dark`,
    saysAll: true,
  },
  'family.ordered': {
    label: 'Families ordered',
    says: ({ label }) => `put the families of ${label} in another order`,
  },
  'family.put-back': {
    label: 'Change of families taken back',
    says: ({ label }) => `put the families of ${label} back as they were`,
  },
  'photograph.added': {
    label: 'Photograph added',
    says: ({ label }) => `added the photograph ${label}`,
  },
  'photograph.updated': {
    label: 'Photograph’s details changed',
    says: ({ label }) => `changed the details of the photograph ${label}`,
  },
  'photograph.reread': {
    label: 'Photograph read again',
    says: ({ label }) => `had the photograph ${label} read again`,
  },
  'photograph.deleted': {
    label: 'Photographs deleted',
    says: (told) => `deleted ${photographs(told)}`,
  },
  'photograph.restored': {
    label: 'Photographs brought back',
    says: (told) => `brought back ${photographs(told)}`,
  },
  'combination.kept': {
    label: 'Combination kept',
    says: ({ label }) => `kept the combination ${label}`,
  },
  'combination.sketched': {
    label: 'Combination begun',
    says: ({ label }) => `began the combination ${label}`,
  },
  'combination.moved': {
    label: 'Combination moved',
    says: ({ label, before, after }) =>
      after.lane === before.lane
        ? `moved the combination ${label} within ${laneWords(after)}`
        : `moved the combination ${label} from ${laneWords(before)} to ${laneWords(after)}`,
    saysAll: true,
  },
  'combination.renamed': {
    label: 'Combination renamed',
    says: ({ label, after }) => `renamed the combination ${label} to ${String(after.title)}`,
  },
  'combination.edited': {
    label: 'Combination changed',
    says: ({ label }) => `changed the combination ${label}`,
  },
  'combination.deleted': {
    label: 'Combination deleted',
    says: ({ label }) => `deleted the combination ${label}`,
  },
  'combination.restored': {
    label: 'Combination brought back',
    says: ({ label }) => `brought back the combination ${label}`,
  },
  'kit.requested': {
    label: 'Kit asked for',
    says: ({ label, after }) => `asked for a kit of ${combinationsOf(after)} of ${label}`,
    saysAll: true,
  },
  'kit.downloaded': {
    label: 'Kit downloaded',
    says: ({ label, after }) => `took away a kit of ${combinationsOf(after)} of ${label}`,
    saysAll: true,
  },
  'kit.deleted': {
    label: 'Kit deleted',
    says: ({ label, before }) => `deleted a kit of ${combinationsOf(before)} of ${label}`,
    saysAll: true,
  },
  'name.added': { label: 'Names written down', says: (told) => `wrote down ${names(told)}` },
  'name.reworded': { label: 'Name changed', says: (told) => `changed ${names(told)}` },
  'name.placed': { label: 'Names laid on shades', says: (told) => `laid ${names(told)} elsewhere` },
  'name.sent': {
    label: 'Names sent for review',
    says: (told) => `sent ${names(told)} for review`,
  },
  'name.recalled': {
    label: 'Names taken back from review',
    says: (told) => `took ${names(told)} back from review`,
  },
  'name.approved': { label: 'Name approved', says: because('approved'), saysAll: true },
  'name.returned': { label: 'Name returned', says: because('returned'), saysAll: true },
  'name.put-by': { label: 'Names put by', says: (told) => `put by ${names(told)}` },
  'name.taken-up': {
    label: 'Names taken up again',
    says: (told) => `took up ${names(told)} again`,
  },
  'name.reopened': { label: 'Name opened again', says: because('opened again'), saysAll: true },
  'name.unlocked': { label: 'Name unlocked', says: because('unlocked'), saysAll: true },
  'name.deleted': { label: 'Names deleted', says: (told) => `deleted ${names(told)}` },
  'name.restored': { label: 'Names brought back', says: (told) => `brought back ${names(told)}` },
  'name.voted': {
    label: 'Name voted on',
    says: ({ label, after }) => {
      const said = VOTE_WORDS[after.vote as NameVoteKind]
      return said
        ? `said “${said}” to the name ${label}`
        : `took back their word on the name ${label}`
    },
    saysAll: true,
  },
  'name.remarked': { label: 'Remark on a name', says: (told) => `remarked on ${names(told)}` },
  'name.search-recorded': {
    label: 'Search of marks recorded',
    says: ({ label, after }) =>
      `recorded a search of ${String(after.register)} for the name ${label}`,
  },
  'name.search-removed': {
    label: 'Search of marks removed',
    says: ({ label, before }) =>
      `removed the record of a search of ${String(before.register)} for the name ${label}`,
  },
  'name.settings-changed': {
    label: 'Naming settings changed',
    says: ({ label }) => `changed how names of ${label} are set, dated and reviewed`,
  },
  'name.frozen': {
    label: 'Names locked',
    says: ({ label }) => `locked the approved names of ${label} for the label printer`,
  },
  'name.freeze-lifted': {
    label: 'Lock of names lifted',
    says: ({ label, after }) => `lifted the lock on the names of ${label}: ${String(after.reason)}`,
    saysAll: true,
  },
  'name.labels-exported': {
    label: 'Labels exported',
    says: ({ label, after }) => `took ${String(after.count)} labels of ${label} away as a CSV file`,
  },
} as const satisfies Record<`${string}.${string}`, ActionWords>
/** One of ACTIONS: the noun and what happened to it. */
export type ActivityAction = keyof typeof ACTIONS

/** The nouns of ACTIONS, as the filter heads them. */
export const ACTIVITY_KINDS = {
  session: 'Signing in',
  access: 'Refusals',
  activity: 'This record',
  brand: 'The brand',
  membership: 'Team',
  person: 'Accounts',
  line: 'Lines',
  shade: 'Shades',
  family: 'Tonal families',
  photograph: 'Photographs',
  combination: 'Combinations',
  kit: 'Kits',
  name: 'Names',
} as const satisfies Record<KindOf<ActivityAction>, string>
/** One of ACTIVITY_KINDS. */
export type ActivityKind = keyof typeof ACTIVITY_KINDS

type KindOf<Action extends string> = Action extends `${infer Kind}.${string}` ? Kind : never

/** Fields whose names in the code are no words. */
export const FIELD_WORDS: Readonly<Record<string, string>> = {
  labL: 'L',
  labA: 'a',
  labB: 'b',
  priceMinor: 'price in hundredths',
  altText: 'alt text',
  netGrams: 'net weight in grams',
  needleMm: 'needle in mm',
  named: 'among them',
  count: 'how many',
}
