/**
 * Who may open or do what: every page, route and server action × every actor → the answer.
 * tests/e2e/access-matrix.spec.ts asks for all of it, and fails on what is not named here.
 *
 * A new page is one line in PAGES, a new route one in ROUTES, a new action one in ACTIONS. The key
 * is the pattern of the address without groups, or the action's export. A parameter of an address
 * (`[shade]`) is filled with the field of that name in Place (places.ts): a new one goes there.
 *
 * `who` says it all in most lines:
 * - roles: members of the brand in the address with one of these roles get `answer`, others of the
 *   brand "forbidden"; people of another brand or of none "not found"; nobody is sent to sign in.
 * - 'signed in': everybody who is signed in gets `answer`; nobody is sent to sign in.
 * - 'anyone': everybody gets `answer`.
 * `except` names what answers otherwise, by actor or by standing.
 *
 * What is sent must be harmless even to those who may do it, and yet reach past the check: an old
 * version ("conflict"), the state a row has already ("ok"), a name that is taken ("conflict"). What
 * cannot be harmless names in `before` the SQL that puts its rows in place for each actor.
 */
import { randomUUID } from 'node:crypto'

import { PLACE_ROLES } from '@/lib/combinations/constants'
import type { ErrorCode } from '@/lib/errors'
import type { Role } from '@/lib/people/constants'

import { LINE_FORM } from '../../fixtures/line-form'

import type { Place } from './places'

/** A status of a page or route, where it leads (`→ /sign-in`), or the code of an action. */
export type Answer = number | ErrorCode | 'ok' | `→ ${string}`

/** What an actor is to the brand in the address. */
export type Standing = 'member' | 'stranger' | 'removed' | 'nobody'

interface Rule {
  who: readonly Role[] | 'signed in' | 'anyone'
  /** What those get who may; 200 of a page or route, 'ok' of an action. */
  answer?: Answer
  except?: Readonly<Record<string, Answer>> & { readonly [standing in Standing]?: Answer }
  /** Row ids that are another brand's, or nobody's, answer this instead of "not found". */
  unknown?: Answer
  /** SQL run before each actor asks, with its values. */
  before?: (place: Place) => readonly [string, readonly unknown[]]
  /** It ends the session it is asked with: each actor asks with one of its own. */
  endsSession?: boolean
}
/** A page, asked with GET. */
export interface PageRule extends Rule {
  query?: string
}
/** A route, asked with the method in its key. */
export interface RouteRule extends Rule {
  query?: (place: Place) => string
  body?: (place: Place) => object
  /** The address, where the pattern alone does not say it. */
  at?: string
}
/** An action made by defineAction takes the brand and `input`; any other one says its `args`. */
export interface ActionRule extends Rule {
  input?: (place: Place) => object
  args?: (place: Place) => readonly unknown[]
}

const OWNER: readonly Role[] = ['owner']
const EDITORS: readonly Role[] = ['owner', 'designer']
const STUDIO: readonly Role[] = ['owner', 'designer', 'marketer']
const EVERYBODY: readonly Role[] = ['owner', 'designer', 'marketer', 'dyer']

const LABEL = { labelWidth: 58, labelSize: 15, labelLines: 2 }

/** Every page. */
export const PAGES: Record<string, PageRule> = {
  '/': {
    who: 'anyone',
    except: { member: '→ /teasel-and-tarn', stranger: '→ /quern-yarn-works' },
  },
  '/sign-in': { who: 'anyone', except: { member: '→ /', stranger: '→ /', removed: '→ /' } },
  '/sign-up': { who: 'anyone', except: { member: '→ /', stranger: '→ /', removed: '→ /' } },
  '/forgotten-password': { who: 'anyone' },
  // The token of the place is in no letter.
  '/confirm/[token]': { who: 'anyone', answer: 404 },
  '/confirm-email/[token]': { who: 'anyone', answer: 404 },
  '/reset-password/[token]': { who: 'anyone', answer: 404 },
  '/invitations/[token]': { who: 'anyone', answer: 404 },
  '/account': { who: 'signed in' },
  '/account/close': { who: 'signed in' },
  '/account/second-factor': { who: 'signed in' },
  '/[brand]': { who: EVERYBODY },
  '/[brand]/team': { who: EVERYBODY },
  '/[brand]/activity': { who: OWNER },
  '/[brand]/security': { who: OWNER },
  '/[brand]/lines/new': { who: OWNER },
  '/[brand]/lines/[line]': { who: EVERYBODY },
  '/[brand]/lines/[line]/edit': { who: OWNER },
  '/[brand]/lines/[line]/shades': { who: EVERYBODY },
  '/[brand]/lines/[line]/shades/families': { who: EVERYBODY },
  '/[brand]/lines/[line]/shades/[shade]': { who: EVERYBODY },
  '/[brand]/lines/[line]/shades/new': { who: EDITORS },
  '/[brand]/lines/[line]/shades/import': { who: EDITORS },
  '/[brand]/lines/[line]/shades/study': { who: EVERYBODY },
  '/[brand]/lines/[line]/photographs': { who: STUDIO },
  '/[brand]/lines/[line]/photographs/[photograph]': { who: STUDIO },
  '/[brand]/lines/[line]/combinations': { who: STUDIO },
  '/[brand]/lines/[line]/combinations/[combination]': { who: STUDIO },
  '/[brand]/lines/[line]/names': { who: STUDIO },
  '/[brand]/lines/[line]/names/together': { who: STUDIO },
  '/[brand]/lines/[line]/names/heap': { who: STUDIO },
  '/[brand]/lines/[line]/names/heap/add': { who: STUDIO },
  '/[brand]/lines/[line]/names/heap/deal': { who: STUDIO },
  '/[brand]/lines/[line]/names/shades/[shade]': { who: STUDIO },
  '/[brand]/lines/[line]/names/review': { who: STUDIO },
  '/[brand]/lines/[line]/names/ideas/[idea]': { who: STUDIO },
  '/[brand]/lines/[line]/names/labels': { who: STUDIO },
  '/[brand]/lines/[line]/names/labels/proof': { who: STUDIO },
  '/[brand]/lines/[line]/names/history': { who: STUDIO },
  '/[brand]/lines/[line]/kits': { who: STUDIO },
  '/[brand]/lines/[line]/kits/[kit]': { who: STUDIO },
}

/** Every method of every route. HEAD answers as GET does, which the test asks as well. */
export const ROUTES: Record<string, RouteRule> = {
  'GET /icon.svg': { who: 'anyone' },
  'GET /livez': { who: 'anyone' },
  'GET /readyz': { who: 'anyone' },
  'GET /api/auth/[...nextauth]': { who: 'anyone', at: '/api/auth/csrf' },
  // Without the token of its own form it leads to signing in, whatever it holds.
  'POST /api/auth/[...nextauth]': {
    who: 'anyone',
    at: '/api/auth/callback/credentials',
    body: () => ({ email: 'owner@teasel.example', password: 'kettle-on-the-fellside' }),
    answer: '→ /api/auth/signin',
  },
  'GET /api/brands/[brand]/activity.csv': { who: OWNER },
  'GET /api/brands/[brand]/lines/[line]/shades.csv': { who: EVERYBODY },
  'GET /api/brands/[brand]/lines/[line]/labels.csv': { who: STUDIO },
  'GET /api/brands/[brand]/lines/[line]/board': { who: STUDIO },
  'GET /api/brands/[brand]/photographs/states': {
    who: STUDIO,
    query: ({ photograph }) => `?ids=${photograph}`,
    // Photographs that are not there are left out of its list.
    unknown: 200,
  },
  'GET /api/brands/[brand]/combinations/[combination]': { who: STUDIO, query: () => '?version=0' },
  'GET /api/brands/[brand]/photographs/[photograph]/cells': { who: STUDIO },
  'GET /api/brands/[brand]/photographs/[photograph]/match': {
    who: STUDIO,
    query: () => '?reading=true',
  },
  'GET /api/brands/[brand]/photographs/[photograph]/derivatives/[name]': { who: STUDIO },
  'GET /api/brands/[brand]/kits/states': {
    who: STUDIO,
    query: ({ kit }) => `?ids=${kit}`,
    // Kits that are not there are left out of its list.
    unknown: 200,
  },
  // Expired, it leads nowhere and records nothing.
  'GET /api/brands/[brand]/kits/[kit]/download': { who: STUDIO, answer: 409 },
  'GET /api/brands/[brand]/kits/[kit]/pictures/[picture]': { who: STUDIO, answer: 404 },
  'POST /api/brands/[brand]/photographs': {
    who: EDITORS,
    // A file that the line has already is not sent again.
    body: ({ line, sha256 }) => ({
      lineSlug: line,
      fileName: 'hillside.jpg',
      contentType: 'image/jpeg',
      byteLength: 1_000,
      sha256,
    }),
  },
  // Confirmed already, it answers so.
  'POST /api/brands/[brand]/photographs/[photograph]/confirm': { who: EDITORS },
  'DELETE /api/brands/[brand]/photographs/[photograph]/upload': {
    who: EDITORS,
    at: '/api/brands/[brand]/photographs/[pending]/upload',
    before: ({ photograph, pending }) => [
      `INSERT INTO photographs (id, brand_id, line_id, title, file_name, object_key, content_type,
         byte_length, sha256)
       SELECT $2, brand_id, line_id, 'Not yet arrived', 'late.jpg', 'originals/none/' || $2::uuid,
         'image/jpeg', 1, sha256 FROM photographs WHERE id = $1 ON CONFLICT DO NOTHING`,
      [photograph, pending],
    ],
  },
}

/** Every server action. */
export const ACTIONS: Record<string, ActionRule> = {
  signOutAction: { who: 'anyone', args: () => [], answer: '→ /sign-in', endsSession: true },

  // Whoever asks is let in as far as the form.
  signUpAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  confirmSignUpAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  requestPasswordResetAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  resetPasswordAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  confirmEmailChangeAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  joinAsNewPersonAction: { who: 'anyone', args: () => [{}], answer: 'invalid' },
  acceptInvitationAction: {
    who: 'signed in',
    args: ({ token }) => [{ token }],
    answer: 'not-found',
  },
  signOutForInvitationAction: {
    who: 'anyone',
    args: () => ['one'],
    answer: '→ /invitations/one',
    endsSession: true,
  },

  // About oneself alone: what a form lacks is asked for.
  changeNameAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  requestEmailChangeAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  changePasswordAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  endSessionAction: {
    who: 'signed in',
    args: () => [{ sessionId: randomUUID() }],
    answer: 'not-found',
  },
  endOtherSessionsAction: { who: 'signed in', args: () => [{ all: true }], answer: 'invalid' },
  closeAccountAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  beginSecondFactorAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  confirmSecondFactorAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  renewRecoveryCodesAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },
  removeSecondFactorAction: { who: 'signed in', args: () => [{}], answer: 'invalid' },

  // The owner of the brand is of it already: no letter goes out.
  inviteMembersAction: {
    who: OWNER,
    input: ({ ownerEmail }) => ({ emails: ownerEmail, role: 'dyer', requestKey: randomUUID() }),
  },
  resendInvitationAction: {
    who: OWNER,
    input: () => ({ invitationId: randomUUID() }),
    answer: 'not-found',
  },
  withdrawInvitationAction: {
    who: OWNER,
    input: () => ({ invitationId: randomUUID() }),
    answer: 'not-found',
  },
  changeRoleAction: {
    who: OWNER,
    input: () => ({ membershipId: randomUUID(), role: 'dyer', was: 'dyer' }),
    answer: 'not-found',
  },
  removeMemberAction: {
    who: OWNER,
    input: () => ({ membershipId: randomUUID() }),
    answer: 'not-found',
  },
  leaveBrandAction: { who: EVERYBODY, input: () => ({ really: true }), answer: 'invalid' },
  requireSecondFactorAction: { who: OWNER, input: () => ({ required: false }) },

  createLineAction: {
    who: OWNER,
    // The brand has a line of that name.
    input: ({ lineName }) => ({ ...LINE_FORM, name: lineName, requestKey: randomUUID() }),
    answer: 'conflict',
  },
  updateLineAction: {
    who: OWNER,
    input: ({ line, lineName }) => ({ ...LINE_FORM, name: lineName, lineSlug: line, version: -1 }),
    answer: 'conflict',
  },

  createShadeAction: {
    who: EDITORS,
    input: ({ line, shadeNumber }) => ({
      lineSlug: line,
      number: shadeNumber,
      name: null,
      status: 'target',
      color: { kind: 'hex', hex: '#888888' },
      requestKey: randomUUID(),
    }),
    answer: 'conflict',
  },
  updateShadeAction: {
    who: EDITORS,
    input: ({ line, shade }) => ({ lineSlug: line, shadeId: shade, version: -1, status: 'target' }),
    answer: 'conflict',
  },
  setShadeStatusAction: {
    who: EDITORS,
    input: ({ line, shade, shadeStatus }) => ({
      lineSlug: line,
      shadeIds: [shade],
      status: shadeStatus,
    }),
  },
  reorderShadesAction: {
    who: EDITORS,
    input: ({ line, shade, shadePlace }) => ({
      lineSlug: line,
      shadeIds: [shade],
      place: shadePlace,
    }),
  },
  // Unconfirmed, shades that a combination holds are not deleted but shown in their use.
  deleteShadesAction: {
    who: EDITORS,
    input: ({ line, five }) => ({ lineSlug: line, shadeIds: five, confirmed: false }),
  },
  restoreShadesAction: {
    who: EDITORS,
    input: ({ line, shade }) => ({ lineSlug: line, shadeIds: [shade] }),
  },
  previewImportAction: {
    who: EDITORS,
    input: ({ line }) => ({ lineSlug: line, text: CSV, terms: null, mapping: null }),
  },
  importShadesAction: {
    who: EDITORS,
    // Nobody has seen a preview of that revision.
    input: ({ line }) => ({
      lineSlug: line,
      text: CSV,
      terms: null,
      mapping: COLUMNS,
      shadesRevision: -1,
    }),
    answer: 'conflict',
  },

  // An edit of families says first whether it saw them as they are, whatever rows it names.
  ...Object.fromEntries(
    Object.entries<(place: Place) => object>({
      sortIntoFamiliesAction: () => ({ count: null }),
      renameFamilyAction: ({ shade }) => ({ familyId: shade, name: 'Mine now' }),
      mergeFamiliesAction: ({ shade }) => ({ familyId: shade, intoId: shade }),
      splitFamilyAction: ({ shade }) => ({ familyId: shade }),
      moveShadesToFamilyAction: ({ shade }) => ({ shadeIds: [shade], familyId: null }),
      pinShadesAction: ({ shade }) => ({ shadeIds: [shade], pinned: true }),
      orderFamilyShadesAction: ({ shade }) => ({ familyId: shade, shadeIds: null }),
      orderFamiliesAction: ({ shade }) => ({ familyIds: [shade] }),
      restoreFamiliesAction: () => ({ former: { count: null, families: [], shades: [] } }),
    }).map(([action, input]): [string, ActionRule] => [
      action,
      {
        who: action === 'renameFamilyAction' ? STUDIO : EDITORS,
        input: (place) => ({ lineSlug: place.line, version: -1, ...input(place) }),
        answer: 'conflict',
        unknown: 'conflict',
      },
    ]),
  ),
  // Both only look.
  checkNameAction: {
    who: STUDIO,
    input: ({ line, shade }) => ({ lineSlug: line, shadeId: shade, text: 'Thyme Will Tell' }),
  },
  proposeNamesAction: {
    who: STUDIO,
    input: ({ line, shade }) => ({ lineSlug: line, shadeId: shade }),
  },

  previewSortAction: { who: EDITORS, input: ({ line }) => ({ lineSlug: line, count: 5 }) },

  deletePhotographsAction: {
    who: EDITORS,
    input: ({ spare }) => ({ photographIds: [spare] }),
    before: ({ spare }) => ['UPDATE photographs SET deleted_at = NULL WHERE id = $1', [spare]],
  },
  restorePhotographsAction: {
    who: EDITORS,
    input: ({ photograph }) => ({ photographIds: [photograph] }),
  },
  updatePhotographAction: {
    who: STUDIO,
    input: ({ photograph }) => ({
      photographId: photograph,
      version: -1,
      title: 'Mine now',
      photographer: '',
      licence: 'own-work',
      licenceNote: '',
      licenceUrl: '',
      sourceUrl: '',
      altText: '',
    }),
    answer: 'conflict',
  },
  // It waits to be read already.
  rereadPhotographAction: {
    who: EDITORS,
    input: ({ waiting }) => ({ photographId: waiting }),
    before: ({ waiting }) => [
      `UPDATE photographs SET state = 'waiting', failure = NULL WHERE id = $1`,
      [waiting],
    ],
  },
  // The submit that kept it, sent again.
  keepCombinationAction: {
    who: EDITORS,
    input: ({ line, photograph, five, requestKey }) => ({
      lineSlug: line,
      photographId: photograph,
      reading: 'true',
      title: 'Kept once',
      places: five.map((shadeId) => ({ shadeId, share: 0.2 })),
      requestKey,
    }),
  },

  // The submit that kept one, sent as if it had begun it.
  sketchCombinationAction: {
    who: EDITORS,
    input: ({ line, requestKey }) => ({ lineSlug: line, requestKey }),
  },
  // Its neighbour is in no lane.
  moveCombinationAction: {
    who: EDITORS,
    input: ({ combination, requestKey }) => ({
      combinationId: combination,
      from: 'chosen',
      lane: 'short-listed',
      after: requestKey,
      before: null,
    }),
    answer: 'conflict',
  },
  // Whole, which a marketer may not; the title alone is in combinations.test.ts.
  saveCombinationAction: {
    who: EDITORS,
    input: ({ combination, five }) => ({
      combinationId: combination,
      version: -1,
      title: 'Mine now',
      story: '',
      photographId: null,
      places: five.map((shadeId, at) => ({
        shadeId,
        share: 0.2,
        role: PLACE_ROLES[at],
        locked: false,
      })),
    }),
    answer: 'conflict',
  },
  deleteCombinationAction: {
    who: EDITORS,
    input: ({ spareCombination }) => ({ combinationId: spareCombination }),
    before: ({ spareCombination }) => [
      'UPDATE combinations SET deleted_at = NULL WHERE id = $1',
      [spareCombination],
    ],
  },
  restoreCombinationAction: {
    who: EDITORS,
    input: ({ combination }) => ({ combinationId: combination }),
  },

  // How names are set, dated and locked is saved only as it was seen, and nobody has seen that.
  ...Object.fromEntries(
    Object.entries<object>({
      saveNamingSettingsAction: {
        ...LABEL,
        care: '',
        themes: [],
        printOn: null,
        reviewerIds: [],
      },
      freezeNamesAction: {},
      liftFreezeAction: { reason: 'Mine now.' },
    }).map(([action, input]): [string, ActionRule] => [
      action,
      {
        who: OWNER,
        input: ({ line }) => ({ lineSlug: line, version: -1, ...input }),
        answer: 'conflict',
        unknown: 'conflict',
      },
    ]),
  ),
  previewLabelsAction: {
    who: STUDIO,
    input: ({ line }) => ({ lineSlug: line, ...LABEL }),
    unknown: 'ok',
  },

  // The submit that asked for it, sent again.
  requestKitAction: {
    who: STUDIO,
    input: ({ line, combination, requestKey }) => ({
      lineSlug: line,
      combinationIds: [combination],
      requestKey,
    }),
  },
  deleteKitAction: {
    who: STUDIO,
    input: ({ spareKit }) => ({ kitId: spareKit }),
    before: ({ kit, spareKit }) => [
      `INSERT INTO kits (id, brand_id, line_id, state, selection)
       SELECT $2, brand_id, line_id, 'failed', selection FROM kits WHERE id = $1
       ON CONFLICT DO NOTHING`,
      [kit, spareKit],
    ],
  },

  // The submit that wrote it down, sent again.
  previewIdeasAction: {
    who: STUDIO,
    input: ({ line }) => ({ lineSlug: line, text: 'Plum Job', kind: 'lines' }),
  },
  listNameableAction: { who: STUDIO, input: ({ line }) => ({ lineSlug: line }) },
  dealIdeasAction: { who: STUDIO, input: ({ line }) => ({ lineSlug: line, without: [] }) },
  addIdeaAction: {
    who: STUDIO,
    input: ({ line, shade, ideaText, requestKey }) => ({
      lineSlug: line,
      shadeId: shade,
      text: ideaText,
      requestKey,
    }),
  },
  addIdeasAction: {
    who: STUDIO,
    input: ({ line, shade, ideaText, requestKey }) => ({
      lineSlug: line,
      ideas: [{ text: ideaText, shadeId: shade }],
      requestKey,
    }),
  },
  editIdeaAction: {
    who: STUDIO,
    input: ({ line, idea }) => ({ lineSlug: line, ideaId: idea, version: -1, note: 'Mine now' }),
    answer: 'conflict',
  },
  // It lies there already.
  placeIdeasAction: {
    who: STUDIO,
    input: ({ line, idea, shade }) => ({
      lineSlug: line,
      placements: [{ ideaId: idea, shadeId: shade }],
    }),
  },
  // What is in review is not deleted.
  deleteIdeasAction: {
    who: STUDIO,
    input: ({ line, idea }) => ({ lineSlug: line, ideaIds: [idea] }),
    answer: 'conflict',
  },
  restoreIdeasAction: {
    who: STUDIO,
    input: ({ line, idea }) => ({ lineSlug: line, ideaIds: [idea] }),
  },
  // A move that its state does not let it make, and a decision on what it was before.
  ...Object.fromEntries(
    Object.entries<(place: Place) => string>({
      sendForReviewAction: ({ idea }) => idea,
      recallIdeasAction: ({ spareIdea }) => spareIdea,
      putByIdeasAction: ({ spareIdea }) => spareIdea,
      takeUpIdeasAction: ({ idea }) => idea,
    }).map(([action, ideaOf]): [string, ActionRule] => [
      action,
      {
        who: STUDIO,
        input: (place) => ({ lineSlug: place.line, ideaIds: [ideaOf(place)] }),
        answer: 'conflict',
      },
    ]),
  ),
  // No marketer or designer is appointed to decide on the line's names.
  ...Object.fromEntries(
    ['approveNameAction', 'returnNameAction', 'reopenNameAction', 'unlockNameAction'].map(
      (action): [string, ActionRule] => [
        action,
        {
          who: OWNER,
          input: ({ line, idea }) => ({
            lineSlug: line,
            ideaId: idea,
            version: -1,
            reason: 'It is another’s.',
          }),
          answer: 'conflict',
        },
      ],
    ),
  ),
  // Of a round that has passed.
  voteAction: {
    who: OWNER,
    input: ({ line, idea }) => ({ lineSlug: line, ideaId: idea, round: -1, vote: 'yes' }),
    answer: 'conflict',
  },
  // The submit that made it, sent again by each of them.
  addRemarkAction: {
    who: STUDIO,
    input: ({ line, idea, requestKey }) => ({
      lineSlug: line,
      ideaId: idea,
      text: 'Said once.',
      requestKey,
    }),
  },
  recordSearchAction: {
    who: STUDIO,
    input: ({ line, idea, requestKey }) => ({
      lineSlug: line,
      ideaId: idea,
      register: 'A register',
      searchedBy: 'Somebody',
      searchedOn: '2026-11-01',
      outcome: 'nothing found',
      requestKey,
    }),
  },
  // Nobody of them recorded it.
  removeSearchAction: {
    who: OWNER,
    input: ({ line, search }) => ({ lineSlug: line, searchId: search }),
    before: ({ idea, search }) => [
      `INSERT INTO name_searches (id, brand_id, idea_id, register, searched_by, searched_on, outcome)
       SELECT $2, brand_id, id, 'A register', 'Somebody', '2026-11-01', 'nothing found'
       FROM name_ideas WHERE id = $1 ON CONFLICT DO NOTHING`,
      [idea, search],
    ],
  },
}

const CSV = 'number,hex\nNobody has this,#808080\n'
const COLUMNS = {
  number: 0,
  name: null,
  status: null,
  L: null,
  a: null,
  b: null,
  illuminant: null,
  observer: null,
  hex: 1,
  order: null,
}

/** How each kind of thing says no. */
const REFUSALS = {
  page: { nobody: '→ /sign-in', stranger: 404, role: 403 },
  route: { nobody: 401, stranger: 404, role: 403 },
  action: { nobody: 'unauthenticated', stranger: 'not-found', role: 'forbidden' },
} as const
/** A page, a route or an action. */
export type Kind = keyof typeof REFUSALS

/** What the matrix says an actor gets. */
export function expectedAnswer(
  kind: Kind,
  rule: Rule,
  actor: { name: string; standing: Standing; role?: Role },
): Answer {
  const { who, except = {} } = rule
  const otherwise = except[actor.name] ?? except[actor.standing]
  if (otherwise !== undefined) return otherwise
  const allowed = rule.answer ?? (kind === 'action' ? 'ok' : 200)
  if (who === 'anyone') return allowed
  const { nobody, stranger, role } = REFUSALS[kind]
  if (actor.standing === 'nobody') return nobody
  if (who === 'signed in') return allowed
  if (actor.standing !== 'member') return stranger
  return who.includes(actor.role!) ? allowed : role
}
