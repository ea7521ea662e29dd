import { afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { mailServer, sendLetter, sendLetters } from '@/lib/mail/send-letters'
import { deleteIdeas } from '@/lib/names/delete-ideas'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { tellDecisions } from '@/lib/names/tell-decisions'
import {
  Letter,
  Membership,
  NameMove,
  NameReviewer,
  Person,
  type Brand,
  type Line,
  type NameIdea,
  type Shade,
} from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'
import { lettersTo } from '@/tests/integration/setup/letters'
import { makeMailServer, type TestMailServer } from '@/tests/integration/setup/mail-server'

const MINUTE = 60_000

let brand: Brand
let owner: Actor
let second: Actor
let reviewer: Actor
let marketer: Actor
let designer: Actor
let appointedDyer: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  // Letters that other files left.
  await Letter.destroy({ where: {} })
})

beforeEach(async () => {
  brand = await makeBrand('Teasel & Tarn')
  owner = await makeActor(brand)
  second = await makeActor(brand)
  reviewer = await makeActor(brand, 'marketer')
  marketer = await makeActor(brand, 'marketer')
  designer = await makeActor(brand, 'designer')
  appointedDyer = await makeActor(brand, 'dyer')
  line = await makeLine(brand)
  shades = await makeShades(line, 40)
  for (const { personId } of [reviewer, appointedDyer])
    await NameReviewer.create({ brandId: brand.id, lineId: line.id, personId })
})

const emailOf = async ({ personId }: Actor) => (await Person.findByPk(personId))!.email
const letters = async (actor: Actor) => lettersTo(await emailOf(actor))
const counts = async (...actors: Actor[]) =>
  (await Promise.all(actors.map(letters))).map(({ length }) => length)
const send = (actor: Actor, ideas: readonly NameIdea[]) =>
  moveIdeas(actor, 'send', { lineSlug: line.slug, ideaIds: ideas.map(({ id }) => id) })
const draftForty = () =>
  Promise.all(
    shades.map((shade, at) =>
      makeIdea(line, shade, { text: `Quiet Pond ${at + 1}`, authorId: marketer.personId }),
    ),
  )

describe('forty names sent for review together', () => {
  it('are one letter to each who decides, and none to whoever sent them or decides nothing', async () => {
    const { moved } = await send(marketer, await draftForty())
    expect(moved).toHaveLength(40)
    expect(await counts(owner, second, reviewer)).toEqual([1, 1, 1])
    expect(await counts(marketer, designer, appointedDyer)).toEqual([0, 0, 0])
    const [letter] = await letters(owner)
    expect(letter!.subject).toBe('40 names to review for A line')
    expect(letter!.text).toContain('“Quiet Pond 1”')
    expect(letter!.text).toContain('and 28 more')
    expect(letter!.text).toContain(`/${brand.slug}/lines/${line.slug}/names/review`)
  })

  it('are told to the other deciders when a decider sends them', async () => {
    await send(reviewer, await draftForty())
    expect(await counts(owner, second, reviewer)).toEqual([1, 1, 0])
  })

  it('are sent once by a click that comes twice', async () => {
    const ideas = await draftForty()
    const ended = await Promise.allSettled([send(marketer, ideas), send(marketer, ideas)])
    expect(ended.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await counts(owner, second, reviewer)).toEqual([1, 1, 1])
  })

  it('leave out those that cannot go, and say of each why', async () => {
    const [good, loose, rude, orphan, open] = await Promise.all([
      makeIdea(line, shades[0]!, { text: 'Quiet Pond' }),
      makeIdea(line, null, { text: 'Still Water' }),
      makeIdea(line, shades[2]!, { text: 'Mothy Moss' }),
      makeIdea(line, shades[3]!, { text: 'Low Sun' }),
      makeIdea(line, shades[4]!, { text: 'High Fell', state: 'in-review' }),
    ])
    await shades[3]!.destroy()
    const { moved, stayed } = await send(marketer, [good!, loose!, rude!, orphan!, open!])
    expect(moved).toEqual([good!.id])
    expect(stayed.map(({ text, why }) => [text, why])).toEqual([
      ['Still Water', expect.stringContaining('heap')],
      ['Mothy Moss', expect.stringContaining('wording')],
      ['Low Sun', expect.stringContaining('deleted')],
      ['High Fell', expect.stringContaining('in review')],
    ])
    expect((await letters(owner))[0]!.subject).toBe('One name to review for A line')
    await rude!.update({ wordingReason: 'It is the moth that is drawn on the band.' })
    expect((await send(marketer, [rude!])).moved).toEqual([rude!.id])
  })
})

describe('a mail server that is down', () => {
  let server: TestMailServer | undefined
  afterEach(() => server?.close())

  it('delays the letters of a review and loses none', async () => {
    await Letter.destroy({ where: {} })
    await send(marketer, await draftForty())
    const waiting = await Letter.findAll()
    expect(waiting).toHaveLength(3)
    const away = mailServer('smtp://127.0.0.1:1')
    for (const { id } of waiting) await expect(sendLetter(id, away)).rejects.toThrow(/ECONNREFUSED/)
    await expect(sendLetters(away)).rejects.toThrow(/ECONNREFUSED/)
    expect(await Letter.count({ where: { sentAt: null, failedAt: null } })).toBe(3)
    server = await makeMailServer(() => null)
    expect(await sendLetters(mailServer(server.url))).toEqual({ sent: 3, left: 0 })
    expect(new Set(server.taken).size).toBe(3)
    expect(await sendLetters(mailServer(server.url))).toEqual({ sent: 0, left: 0 })
  })
})

describe('an author', () => {
  const mine = (text: string, at: number) =>
    makeIdea(line, shades[at]!, { text, state: 'in-review', authorId: marketer.personId })
  const decide = (move: 'approve' | 'return' | 'reopen', idea: NameIdea, reason = '', by = owner) =>
    idea
      .reload()
      .then(({ id, version }) =>
        decideIdea(by, move, { lineSlug: line.slug, ideaId: id, version, reason }),
      )
  const later = (minutes: number) => Date.now() + minutes * MINUTE

  it('is told once of what was decided together, when the deciders have been still', async () => {
    const [first, next] = await Promise.all([mine('Quiet Pond', 0), mine('Low Sun', 1)])
    await decide('approve', first!)
    await decide('return', next!, 'Another line has it.', second)
    await tellDecisions()
    expect(await counts(marketer)).toEqual([0])
    await Promise.all([tellDecisions(later(1.1)), tellDecisions(later(1.1))])
    await tellDecisions(later(30))
    const [letter, ...more] = await letters(marketer)
    expect(more).toEqual([])
    expect(letter!.subject).toBe('2 of your names for A line were decided on')
    expect(letter!.text).toContain('approved “Quiet Pond”.')
    expect(letter!.text).toContain('returned “Low Sun”: Another line has it.')
    expect(await counts(owner, second, designer)).toEqual([0, 0, 0])
  })

  it('waits no longer than ten minutes, however busy the deciders are', async () => {
    const [first, next] = await Promise.all([mine('Quiet Pond', 0), mine('Low Sun', 1)])
    await decide('approve', first!)
    await NameMove.update(
      { createdAt: new Date(Date.now() - 10 * MINUTE) },
      { where: { ideaId: first!.id, move: 'approve' } },
    )
    await decide('approve', next!)
    await tellDecisions()
    expect(await counts(marketer)).toEqual([1])
  })

  it('is told what stands now of a name that was decided on twice', async () => {
    const idea = await mine('Quiet Pond', 0)
    await decide('approve', idea)
    await decide('reopen', idea, 'Heard as rude.')
    await tellDecisions(later(2))
    const [letter] = await letters(marketer)
    expect(letter!.subject).toBe('“Quiet Pond” is open again')
    expect(letter!.text).toContain('Heard as rude.')
  })

  it('is told when another name comes in the stead of theirs', async () => {
    const held = await mine('Quiet Pond', 0)
    await decide('approve', held)
    await tellDecisions(later(2))
    const rival = await makeIdea(line, shades[0]!, { text: 'Low Sun', state: 'in-review' })
    await decide('approve', rival)
    await tellDecisions(later(4))
    const [, letter] = await letters(marketer)
    expect(letter!.text).toContain('another name in the stead of “Quiet Pond”')
  })

  it('is not written to about what they decided themselves, or put by as a draft', async () => {
    const own = await makeIdea(line, shades[0]!, {
      state: 'in-review',
      authorId: reviewer.personId,
    })
    await decide('return', own, 'On second thoughts.', reviewer)
    const draft = await makeIdea(line, shades[1]!, { authorId: reviewer.personId })
    await moveIdeas(marketer, 'put-by', { lineSlug: line.slug, ideaIds: [draft.id] })
    await tellDecisions(later(2))
    expect(await counts(reviewer)).toEqual([0])
    // Noted all the same: nothing waits for ever.
    const waiting = { ideaId: [own.id, draft.id], move: ['return', 'put-by'], toldAt: null }
    expect(await NameMove.count({ where: waiting })).toBe(0)
  })

  it('is told of a name that was put by in review, also when it is deleted since', async () => {
    const idea = await mine('Quiet Pond', 0)
    await moveIdeas(owner, 'put-by', { lineSlug: line.slug, ideaIds: [idea.id] })
    await deleteIdeas(owner, { lineSlug: line.slug, ideaIds: [idea.id] })
    await tellDecisions(later(2))
    expect((await letters(marketer))[0]!.subject).toBe('“Quiet Pond” was put by')
  })

  it('who has left the brand, or gone to the dye house, is told nothing', async () => {
    const [one, two] = await Promise.all([
      mine('Quiet Pond', 0),
      makeIdea(line, shades[1]!, { state: 'in-review', authorId: designer.personId }),
    ])
    await decide('approve', one!)
    await decide('approve', two!)
    await Membership.destroy({ where: { personId: marketer.personId } })
    await Membership.update({ role: 'dyer' }, { where: { personId: designer.personId } })
    await tellDecisions(later(2))
    expect(await counts(marketer, designer)).toEqual([0, 0])
  })
})
