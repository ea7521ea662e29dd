import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { editIdea } from '@/lib/names/edit-idea'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { placeIdeas } from '@/lib/names/place-ideas'
import { vote } from '@/lib/names/vote'
import { NameIdea, NameMove, NameVote, Shade, type Brand, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

/** How often two meet: whoever comes first is chance. */
const MEETINGS = 12

let brand: Brand
let one: Actor
let other: Actor
let marketer: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  brand = await makeBrand()
  one = await makeActor(brand)
  other = await makeActor(brand)
  marketer = await makeActor(brand, 'marketer')
})

beforeEach(async () => {
  line = await makeLine(brand)
  shades = await makeShades(line, MEETINGS)
})

const inReview = (shade: Shade, text = 'Thyme Will Tell') =>
  makeIdea(line, shade, { text, state: 'in-review', authorId: marketer.personId })
const approve = (actor: Actor, { id, version }: NameIdea) =>
  decideIdea(actor, 'approve', { lineSlug: line.slug, ideaId: id, version, reason: '' })
const sendBack = (actor: Actor, { id, version }: NameIdea) =>
  decideIdea(actor, 'return', { lineSlug: line.slug, ideaId: id, version, reason: 'Too long.' })
const bulk = (
  actor: Actor,
  move: 'recall' | 'put-by' | 'send',
  { id }: NameIdea,
  seen: { from?: 'in-review' } = {},
) => moveIdeas(actor, move, { lineSlug: line.slug, ideaIds: [id], ...seen })
const movesOf = async ({ id: ideaId }: NameIdea) =>
  (await NameMove.findAll({ where: { ideaId }, order: [['createdAt', 'ASC']] })).map(
    ({ move }) => move,
  )

type Decision = (actor: Actor, idea: NameIdea) => Promise<unknown>
const DECISIONS: Record<string, Decision> = {
  approve,
  return: sendBack,
  'put-by': (actor, idea) => bulk(actor, 'put-by', idea, { from: 'in-review' }),
  recall: (actor, idea) => bulk(actor, 'recall', idea),
}
const PAIRS = Object.keys(DECISIONS).flatMap((first, at) =>
  Object.keys(DECISIONS)
    .slice(at)
    .map((second) => [first, second] as const),
)

describe('of two who decide on a name at the same moment', () => {
  it.each(PAIRS)(
    'to %s and to %s, one has decided and the other is told',
    async (first, second) => {
      for (const shade of shades.slice(0, MEETINGS / 2)) {
        const idea = await inReview(shade)
        const ended = await Promise.allSettled([
          DECISIONS[first]!(one, idea),
          DECISIONS[second]!(other, idea),
        ])
        const refused = ended.flatMap((end) => (end.status === 'rejected' ? [end.reason] : []))
        expect(refused).toEqual([expect.any(ConflictError)])
        const made = ended[0]!.status === 'fulfilled' ? first : second
        expect(await movesOf(idea)).toEqual(['add', made])
        const name = made === 'approve' ? idea.text : null
        expect((await shade.reload()).name).toBe(name)
      }
    },
  )

  it('one name of a shade stands, and whoever had not seen it is told', async () => {
    for (const shade of shades) {
      const rivals = await Promise.all([inReview(shade, 'Moss Have'), inReview(shade, 'Moss Be')])
      const ended = await Promise.allSettled([approve(one, rivals[0]), approve(other, rivals[1])])
      const at = ended.findIndex(({ status }) => status === 'fulfilled')
      expect(ended[1 - at]).toMatchObject({ status: 'rejected', reason: expect.any(ConflictError) })
      const approved = await NameIdea.findAll({ where: { shadeId: shade.id, state: 'approved' } })
      expect(approved.map(({ text }) => text)).toEqual([rivals[at]!.text])
      expect((await shade.reload()).name).toBe(rivals[at]!.text)
      // Having looked again, they may still prefer the other.
      const loser = await rivals[1 - at]!.reload()
      await approve(one, loser)
      expect(await movesOf(rivals[at]!)).toEqual(['add', 'approve', 'displace'])
      expect((await shade.reload()).name).toBe(loser.text)
    }
  })

  it('both approvals of different shades stand', async () => {
    const ideas = await Promise.all(shades.map((shade, at) => inReview(shade, `Name ${at}`)))
    await Promise.all(ideas.map((idea, at) => approve(at % 2 ? one : other, idea)))
    const named = await Shade.findAll({ where: { lineId: line.id }, order: ['position'] })
    expect(named.map(({ name }) => name)).toEqual(ideas.map(({ text }) => text))
    expect(named.every(({ version }) => version === 2)).toBe(true)
  })
})

describe('what is decided is what was seen:', () => {
  const resend = async (idea: NameIdea) => {
    await bulk(marketer, 'recall', idea)
    const { version } = await idea.reload()
    await editIdea(marketer, {
      lineSlug: line.slug,
      ideaId: idea.id,
      version,
      text: 'Something Else',
    })
    await bulk(marketer, 'send', idea)
  }

  it('a name that was reworded and sent anew is not approved unseen', async () => {
    const idea = await inReview(shades[0]!)
    const seen = await NameIdea.findByPk(idea.id, { rejectOnEmpty: true })
    await resend(idea)
    await expect(approve(one, seen)).rejects.toThrow(ConflictError)
    await expect(sendBack(one, seen)).rejects.toThrow(ConflictError)
    await expect(approve(one, await seen.reload())).resolves.toMatchObject({ state: 'approved' })
  })

  it('a vote on the words of an earlier round does not count on the new ones', async () => {
    const idea = await inReview(shades[0]!)
    const said = { lineSlug: line.slug, ideaId: idea.id, comment: '' }
    await vote(one, { ...said, round: idea.round, vote: 'yes' })
    await resend(idea)
    await expect(vote(other, { ...said, round: 1, vote: 'no' })).rejects.toThrow(ConflictError)
    expect(await NameVote.count({ where: { ideaId: idea.id, round: 2 } })).toBe(0)
  })

  it('a draft that is reworded, or laid elsewhere, while it is sent is not sent unchecked', async () => {
    for (const shade of shades) {
      const text = 'Thyme Will Tell'
      const idea = await makeIdea(line, shade, { text, authorId: marketer.personId })
      const { id, version } = idea
      const change =
        shades.indexOf(shade) % 2
          ? editIdea(one, { lineSlug: line.slug, ideaId: id, version, text: 'Bastard Amber' })
          : placeIdeas(one, { lineSlug: line.slug, placements: [{ ideaId: id, shadeId: null }] })
      const [sent, changed] = await Promise.allSettled([bulk(marketer, 'send', idea), change])
      await idea.reload()
      if (sent.status === 'fulfilled') {
        expect(changed.status).toBe('rejected')
        expect(idea).toMatchObject({ state: 'in-review', text, shadeId: shade.id })
      } else {
        expect(sent.reason).toBeInstanceOf(ConflictError)
        expect(idea.state).toBe('draft')
      }
    }
  })
})
