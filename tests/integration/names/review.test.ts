import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { addRemark } from '@/lib/names/add-remark'
import { NAME_LIMITS } from '@/lib/names/constants'
import { editIdea } from '@/lib/names/edit-idea'
import { getIdea } from '@/lib/names/get-idea'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { readReview } from '@/lib/names/read-review'
import { recordSearch } from '@/lib/names/record-search'
import { vote } from '@/lib/names/vote'
import type { Role } from '@/lib/people/constants'
import { Family, NameIdea, NameReviewer, type Line, type Shade } from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let actors: Record<Role, Actor>
let stranger: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  actors = await makeActors(await makeBrand())
  stranger = await makeActor(await makeBrand())
})

beforeEach(async () => {
  line = await makeLine({ id: actors.owner.brandId })
  shades = await makeShades(line, 6)
})

const inReview = (text: string, shade: Shade) =>
  makeIdea(line, shade, { text, state: 'in-review', authorId: actors.marketer.personId })
const read = (actor: Actor, ideaId: string | null = null) => readReview(actor, line.slug, ideaId)

describe('the names in review', () => {
  it('stand in the order of the shades, those of one shade as they were sent', async () => {
    const late = await inReview('Third shade', shades[2]!)
    const second = await inReview('Second of the first', shades[0]!)
    const first = await inReview('First of the first', shades[0]!)
    await first.update({ stateSince: new Date(Date.now() - 60_000) })
    await makeIdea(line, shades[1]!, { text: 'A draft' })
    const { items, total, standing, decides } = await read(actors.owner)
    expect(items.map(({ idea }) => idea.id)).toEqual([first.id, second.id, late.id])
    expect(items[0]!.rivals).toEqual(['Second of the first'])
    expect({ total, standing, decides }).toEqual({
      total: 3,
      standing: { shades: 6, named: 0, drafts: 1, returned: 0 },
      decides: true,
    })
  })

  it('show two shades of the family on either side, light to dark, and the name that would go', async () => {
    const family = await Family.create({
      brandId: line.brandId,
      lineId: line.id,
      name: 'Greens',
      neutral: false,
      position: 0,
    })
    for (const shade of shades.slice(0, 5)) await shade.update({ familyId: family.id })
    await makeIdea(line, shades[3]!, { text: 'Held so far', state: 'approved' })
    await inReview('In its place', shades[3]!)
    const [item] = (await read(actors.owner)).items
    expect(item).toMatchObject({ family: 'Greens', held: { text: 'Held so far', locked: false } })
    expect(item!.beside.map(({ id }) => id)).toEqual(shades.slice(1, 5).map(({ id }) => id))
  })

  it('come a stretch at a time, found by any name on it, also by one that was decided since', async () => {
    const ideas = await NameIdea.bulkCreate(
      Array.from({ length: NAME_LIMITS.page + 2 }, (_, at) => ({
        brandId: line.brandId,
        lineId: line.id,
        shadeId: shades[0]!.id,
        text: `Name ${at}`,
        state: 'in-review' as const,
        stateSince: new Date(Date.UTC(2026, 1, 1, 0, at)),
        round: 1,
        authorId: null,
        wordedById: null,
      })),
    )
    const at = (place: number) => ideas[place]!.id
    expect(await read(actors.owner)).toMatchObject({
      start: 0,
      before: null,
      after: at(NAME_LIMITS.page),
    })
    const last = await read(actors.owner, at(NAME_LIMITS.page + 1))
    expect(last).toMatchObject({ start: NAME_LIMITS.page, after: null, before: at(49) })
    expect(last.items).toHaveLength(2)
    await ideas[NAME_LIMITS.page + 1]!.update({ state: 'returned' })
    expect((await read(actors.owner, at(NAME_LIMITS.page + 1))).start).toBe(NAME_LIMITS.page)
    const { queries } = await countQueries(() => read(actors.owner))
    await NameIdea.destroy({ where: { id: ideas.slice(2).map(({ id }) => id) } })
    expect((await countQueries(() => read(actors.owner))).queries).toBe(queries)
  })

  it('tell what was said: votes of this round with the reader’s own, and the newest remarks', async () => {
    const idea = await inReview('Thyme Will Tell', shades[0]!)
    const where = { lineSlug: line.slug, ideaId: idea.id }
    await vote(actors.owner, { ...where, round: 1, vote: 'unsure', comment: 'Is it thyme?' })
    for (let at = 0; at < 22; at += 1)
      await addRemark(actors.designer, {
        ...where,
        text: `Remark ${at}`,
        requestKey: crypto.randomUUID(),
      })
    const [item] = (await read(actors.owner)).items
    expect(item!.idea.votes).toMatchObject([
      { vote: 'unsure', comment: 'Is it thyme?', mine: true, person: { name: 'A owner' } },
    ])
    expect(item!.remarkCount).toBe(22)
    expect(item!.remarks.map(({ text }) => text)).toEqual(
      Array.from({ length: 20 }, (_, at) => `Remark ${at + 2}`),
    )
  })

  it('leave a designer the talk, and an appointed one the decision, but not on their own', async () => {
    await inReview('Somebody else’s', shades[0]!)
    await makeIdea(line, shades[1]!, {
      text: 'Their own',
      state: 'in-review',
      authorId: actors.designer.personId,
    })
    const before = await read(actors.designer)
    expect(before.decides).toBe(false)
    expect(before.items.map(({ idea }) => idea.moves)).toEqual([['recall'], ['recall']])
    const { brandId, personId } = actors.designer
    await NameReviewer.create({ brandId, lineId: line.id, personId })
    const after = await read(actors.designer)
    expect(after.decides).toBe(true)
    const [other, own] = after.items.map(({ idea }) => idea)
    expect(other).toMatchObject({ canVote: true, moves: expect.arrayContaining(['approve']) })
    expect(own).toMatchObject({ canVote: false, isOwn: true })
    expect(own!.moves).not.toContain('approve')
  })

  it('wait while their shade is deleted', async () => {
    await inReview('Gone with its shade', shades[0]!)
    await shades[0]!.destroy()
    expect(await read(actors.owner)).toMatchObject({ items: [], total: 0 })
  })

  it('are closed to the dye house, and unknown to another brand', async () => {
    const idea = await inReview('Ours', shades[0]!)
    await expect(read(actors.dyer)).rejects.toThrow(ForbiddenError)
    await expect(read(stranger)).rejects.toThrow(NotFoundError)
    await expect(getIdea(actors.dyer, line.slug, idea.id)).rejects.toThrow(ForbiddenError)
    await expect(getIdea(stranger, line.slug, idea.id)).rejects.toThrow(NotFoundError)
    const theirs = await makeLine({ id: stranger.brandId })
    await expect(getIdea(stranger, theirs.slug, idea.id)).rejects.toThrow(NotFoundError)
    expect((await readReview(stranger, theirs.slug, idea.id)).items).toEqual([])
  })
})

describe('the page of an idea', () => {
  const open = (ideaId: string, actor = actors.owner) => getIdea(actor, line.slug, ideaId)

  it('checks a draft as it stands, and keeps what was found once it is sent', async () => {
    const idea = await makeIdea(line, shades[0]!, {
      text: 'Olive and Let Live',
      authorId: actors.marketer.personId,
    })
    expect(await open(idea.id)).toMatchObject({ findingsKept: false, needsReason: false })
    await moveIdeas(actors.marketer, 'send', { lineSlug: line.slug, ideaIds: [idea.id] })
    await makeIdea(line, shades[1]!, { text: 'Olive and Let Live', state: 'approved' })
    const sent = await open(idea.id)
    expect(sent.findingsKept).toBe(true)
    expect(sent.findings.filter(({ check }) => check === 'same')).toEqual([])
  })

  it('says which wording needs a reason before it can be sent', async () => {
    const idea = await makeIdea(line, shades[0]!, { text: 'Moth and Candle' })
    expect((await open(idea.id)).needsReason).toBe(true)
  })

  it('tells its history with the reasons, and what its shade is called now', async () => {
    const idea = await makeIdea(line, shades[0]!, {
      text: 'Wold Enough',
      authorId: actors.marketer.personId,
    })
    const lineSlug = line.slug
    await editIdea(actors.marketer, {
      lineSlug,
      ideaId: idea.id,
      version: idea.version,
      text: 'Old Enough',
    })
    await moveIdeas(actors.marketer, 'send', { lineSlug, ideaIds: [idea.id] })
    await idea.reload()
    const decision = { lineSlug, ideaId: idea.id, version: idea.version, reason: 'Too plain.' }
    await decideIdea(actors.owner, 'return', decision)
    await makeIdea(line, shades[0]!, { text: 'Held', state: 'approved' })
    const { moves, held, shade } = await open(idea.id, actors.designer)
    expect(moves.map(({ move, text }) => [move, text])).toEqual([
      ['add', 'Wold Enough'],
      ['reword', 'Old Enough'],
      ['send', 'Old Enough'],
      ['return', 'Old Enough'],
    ])
    expect(moves.at(-1)).toMatchObject({
      reason: 'Too plain.',
      person: { name: 'A owner' },
      shadeLabel: 'No. S1',
    })
    expect(held).toEqual({ text: 'Held', locked: false })
    expect(shade!.id).toBe(shades[0]!.id)
  })

  it('lets an owner and whoever recorded a search remove it', async () => {
    const idea = await inReview('Searched for', shades[0]!)
    await recordSearch(actors.marketer, {
      lineSlug: line.slug,
      ideaId: idea.id,
      register: 'A register',
      searchedBy: 'Somebody',
      searchedOn: '2026-11-01',
      outcome: 'nothing found',
      note: '',
      requestKey: crypto.randomUUID(),
    })
    const can = async (role: Role) => (await open(idea.id, actors[role])).searches[0]!.canRemove
    expect([await can('owner'), await can('marketer'), await can('designer')]).toEqual([
      true,
      true,
      false,
    ])
  })

  it('is not there for an address that is no id', async () => {
    await expect(open('nonsense')).rejects.toThrow(NotFoundError)
  })
})
