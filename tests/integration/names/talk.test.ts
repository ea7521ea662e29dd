import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError, InvalidError, NotFoundError } from '@/lib/errors'
import { addRemark } from '@/lib/names/add-remark'
import { NAME_LIMITS } from '@/lib/names/constants'
import { presentIdeas, readNaming } from '@/lib/names/queries'
import { recordSearch } from '@/lib/names/record-search'
import { removeSearch } from '@/lib/names/remove-search'
import { vote } from '@/lib/names/vote'
import {
  Activity,
  NameRemark,
  NameReviewer,
  NameSearch,
  NameVote,
  type Brand,
  type Line,
  type NameIdea,
  type Shade,
} from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShade } from '@/tests/factories/shade'

const HOUR = 3_600_000

let brand: Brand
let owner: Actor
let reviewer: Actor
let marketer: Actor
let line: Line
let shade: Shade
let idea: NameIdea

beforeAll(async () => {
  brand = await makeBrand()
  owner = await makeActor(brand)
  reviewer = await makeActor(brand, 'designer')
  marketer = await makeActor(brand, 'marketer')
})

beforeEach(async () => {
  line = await makeLine(brand)
  shade = await makeShade(line)
  await NameReviewer.create({ brandId: brand.id, lineId: line.id, personId: reviewer.personId })
  idea = await makeIdea(line, shade, { state: 'in-review', authorId: marketer.personId })
})

const told = (action: string) =>
  Activity.findAll({
    where: { brandId: brand.id, action, objectId: idea.id },
    order: [['createdAt', 'ASC']],
    raw: true,
  })

describe('a vote', () => {
  const say = (
    actor: Actor,
    said: 'yes' | 'unsure' | 'no' | null,
    { comment = '', round = idea.round } = {},
  ) => vote(actor, { lineSlug: line.slug, ideaId: idea.id, round, vote: said, comment })
  const votes = () => NameVote.findAll({ where: { ideaId: idea.id }, raw: true })

  it('is one for each who decides: the last word counts', async () => {
    await say(owner, 'no', { comment: 'Too like No. 4.' })
    await say(owner, 'yes')
    await say(reviewer, 'unsure', { comment: 'Say it aloud.' })
    expect(await votes()).toHaveLength(2)
    const { asker, frozen } = await readNaming(reviewer, line.slug)
    const [view] = await presentIdeas([idea], { asker, frozen })
    expect(view!.votes.map(({ vote: said, comment, mine }) => [said, comment, mine])).toEqual([
      ['yes', '', false],
      ['unsure', 'Say it aloud.', true],
    ])
    expect(view!.canVote).toBe(true)
  })

  it('can be taken back; the same again, and nothing taken back, are not recorded', async () => {
    await say(owner, 'yes')
    await say(owner, 'yes')
    await say(owner, null)
    await say(owner, null)
    expect(await votes()).toEqual([])
    expect((await told('name.voted')).map(({ after }) => after)).toEqual([
      { vote: 'yes' },
      { vote: null },
    ])
  })

  it('that comes twice at once is one', async () => {
    await Promise.all([say(owner, 'yes'), say(owner, 'yes'), say(owner, 'yes')])
    expect(await votes()).toHaveLength(1)
    expect(await told('name.voted')).toHaveLength(1)
  })

  it('is not for whoever decides nothing, nor for the idea’s author', async () => {
    await expect(say(marketer, 'yes')).rejects.toThrow(ForbiddenError)
    await idea.update({ wordedById: reviewer.personId })
    await expect(say(reviewer, 'yes')).rejects.toThrow(ForbiddenError)
    await idea.update({ wordedById: owner.personId })
    await expect(say(owner, 'yes')).rejects.toThrow(ForbiddenError)
    expect(await votes()).toEqual([])
  })

  it('is refused for a round that has passed, and for what is in review no more', async () => {
    await expect(say(owner, 'yes', { round: idea.round - 1 })).rejects.toThrow(ConflictError)
    await idea.update({ state: 'returned' })
    await expect(say(owner, 'yes')).rejects.toThrow(ConflictError)
    expect(await votes()).toEqual([])
  })
})

describe('a remark', () => {
  const remark = (actor: Actor, text: string, requestKey = randomUUID()) =>
    addRemark(actor, { lineSlug: line.slug, ideaId: idea.id, text, requestKey })

  it('may be made by whoever reads names, whatever the state, and stays theirs', async () => {
    for (const state of ['in-review', 'approved', 'returned', 'put-by', 'draft'] as const) {
      await idea.update({ state })
      await remark(marketer, `While it is ${state}.`)
    }
    const remarks = await NameRemark.findAll({ where: { ideaId: idea.id }, raw: true })
    expect(remarks.map(({ personId }) => personId)).toEqual(Array(5).fill(marketer.personId))
    expect(await told('name.remarked')).toHaveLength(5)
  })

  it('is one, however often its submit comes', async () => {
    const key = randomUUID()
    const made = await Promise.all([1, 2, 3].map(() => remark(owner, 'Say it aloud.', key)))
    expect(new Set(made.map(({ id }) => id)).size).toBe(1)
    expect(await told('name.remarked')).toHaveLength(1)
  })

  it('is not added to a talk that is full', async () => {
    const { perIdea } = NAME_LIMITS
    await NameRemark.bulkCreate(
      Array.from({ length: perIdea - 1 }, () => ({
        brandId: brand.id,
        ideaId: idea.id,
        personId: null,
        text: 'More.',
      })),
    )
    await remark(owner, 'The last.')
    await expect(remark(owner, 'One more.')).rejects.toThrow(ConflictError)
    expect(await NameRemark.count({ where: { ideaId: idea.id } })).toBe(perIdea)
  })
})

describe('a search of a register', () => {
  const day = (moment: number) => new Date(moment).toISOString().slice(0, 10)
  const record = (actor: Actor, values: object = {}) =>
    recordSearch(actor, {
      lineSlug: line.slug,
      ideaId: idea.id,
      register: 'The register of the hill farms',
      searchedBy: 'Wren Fell',
      searchedOn: '2026-11-30',
      outcome: 'nothing found',
      note: '',
      requestKey: randomUUID(),
      ...values,
    })
  const remove = (actor: Actor, { id }: NameSearch, lineSlug = line.slug) =>
    removeSearch(actor, { lineSlug, searchId: id })

  it('is recorded once a submit, with who searched and when', async () => {
    const requestKey = randomUUID()
    const made = await Promise.all([1, 2].map(() => record(marketer, { requestKey })))
    expect(made[1]!.id).toBe(made[0]!.id)
    expect(await NameSearch.findAll({ where: { ideaId: idea.id }, raw: true })).toMatchObject([
      { searchedBy: 'Wren Fell', searchedOn: '2026-11-30', recordedById: marketer.personId },
    ])
    expect(await told('name.search-recorded')).toHaveLength(1)
  })

  it('may have been made on a day that has begun somewhere, and on no later one', async () => {
    await record(owner, { searchedOn: day(Date.now() + 13.9 * HOUR) })
    await expect(record(owner, { searchedOn: day(Date.now() + 38.1 * HOUR) })).rejects.toThrow(
      InvalidError,
    )
  })

  it('is removed by whoever recorded it or by an owner, which is kept', async () => {
    const [one, two] = await Promise.all([record(marketer), record(marketer)])
    await expect(remove(reviewer, one!)).rejects.toThrow(ForbiddenError)
    await remove(marketer, one!)
    await remove(owner, two!)
    await expect(remove(owner, two!)).rejects.toThrow(NotFoundError)
    expect(await NameSearch.count({ where: { ideaId: idea.id } })).toBe(0)
    expect(await told('name.search-removed')).toHaveLength(2)
  })

  it('is not found by way of another line', async () => {
    const search = await record(owner)
    const elsewhere = await makeLine(brand)
    await expect(remove(owner, search, elsewhere.slug)).rejects.toThrow(NotFoundError)
    expect(await NameSearch.count({ where: { id: search.id } })).toBe(1)
  })

  it('is not added to a record that is full', async () => {
    await NameSearch.bulkCreate(
      Array.from({ length: NAME_LIMITS.perIdea }, () => ({
        brandId: brand.id,
        ideaId: idea.id,
        register: 'R',
        searchedBy: 'W',
        searchedOn: '2026-11-30',
        outcome: 'nothing found' as const,
        recordedById: null,
      })),
    )
    await expect(record(owner)).rejects.toThrow(ConflictError)
  })
})
