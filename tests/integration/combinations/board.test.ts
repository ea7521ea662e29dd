import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { orderNow } from '@/components/board/board-state'
import type { Actor } from '@/lib/auth/actor'
import { LANES, type Lane } from '@/lib/combinations/constants'
import { deleteCombination } from '@/lib/combinations/delete-combination'
import { getBoard } from '@/lib/combinations/get-board'
import { moveCombination } from '@/lib/combinations/move-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { sketchCombination } from '@/lib/combinations/sketch-combination'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { Activity, Combination, CombinationPlace, Family, type Line, type Shade } from '@/models'
import { seededRandom } from '@/scripts/bench/line'
import { lanesOf, makeBoard, moveAtOnce, openBoard } from '@/tests/factories/board'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

const READERS: readonly Role[] = ['owner', 'marketer', 'designer']
const MOVERS: readonly Role[] = ['owner', 'designer']

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>
let line: Line
let shades: Shade[]

beforeAll(async () => {
  ours = await makeActors(await makeBrand())
  theirs = await makeActors(await makeBrand())
})
beforeEach(async () => {
  line = await makeLine({ id: ours.owner.brandId })
  shades = await makeShades(line, 8)
})

/** Combinations of these titles in a lane, top to bottom. */
async function lay(lane: Lane, ...titles: string[]): Promise<Record<string, Combination>> {
  const made: [string, Combination][] = []
  for (const title of titles.toReversed()) {
    made.push([title, await makeCombination(line, shades, { title, lane })])
  }
  return Object.fromEntries(made)
}

interface To {
  lane?: Lane
  from?: Lane
  after?: Combination | null
  before?: Combination | null
}
const move = (
  one: Combination,
  { lane = 'sketched', from = one.lane, after, before }: To,
  actor: Actor = ours.designer,
) =>
  moveCombination(actor, {
    combinationId: one.id,
    from,
    lane,
    after: after?.id ?? null,
    before: before?.id ?? null,
  })

describe('who may do what with the board', () => {
  for (const role of ROLES) {
    it(`${role} ${READERS.includes(role) ? 'sees' : 'does not see'} it`, async () => {
      const work = getBoard(ours[role], line.slug)
      if (READERS.includes(role)) expect(await work).toMatchObject({ cards: [] })
      else await expect(work).rejects.toThrow(ForbiddenError)
    })

    it(`${role} ${MOVERS.includes(role) ? 'moves and begins' : 'neither moves nor begins'} a combination`, async () => {
      const { A } = await lay('sketched', 'A')
      const works = [
        () => move(A!, { lane: 'chosen' }, ours[role]),
        () => sketchCombination(ours[role], { lineSlug: line.slug, requestKey: randomUUID() }),
      ]
      for (const work of works) {
        if (MOVERS.includes(role)) await work()
        else await expect(work()).rejects.toThrow(ForbiddenError)
      }
    })
  }

  it("another brand's owner finds neither the board nor its combinations", async () => {
    const { A } = await lay('sketched', 'A')
    const revision = (await getBoard(ours.owner, line.slug))!.revision
    await expect(getBoard(theirs.owner, line.slug)).rejects.toThrow(NotFoundError)
    const refused = await move(A!, { lane: 'chosen' }, theirs.owner).catch((error) => error)
    const unknown = Combination.build({ ...A!.get(), id: randomUUID() })
    const nobodys = await move(unknown, { lane: 'chosen' }, theirs.owner).catch((error) => error)
    expect(refused).toBeInstanceOf(NotFoundError)
    expect(refused.message).toBe(nobodys.message)
    await expect(
      sketchCombination(theirs.owner, { lineSlug: line.slug, requestKey: randomUUID() }),
    ).rejects.toThrow(NotFoundError)
    expect((await getBoard(ours.owner, line.slug))!.revision).toBe(revision)
  })

  it("a combination of another line's board is no neighbour", async () => {
    const { A } = await lay('sketched', 'A')
    const elsewhere = await makeLine({ id: ours.owner.brandId })
    const stranger = await makeCombination(elsewhere, await makeShades(elsewhere, 5))
    await expect(move(A!, { after: stranger })).rejects.toThrow(ConflictError)
  })
})

describe('the board', () => {
  it('holds every combination in its lane and place, and each shade once', async () => {
    const photograph = await makePhotograph(line, { title: 'The beck' })
    const family = await Family.create({
      brandId: line.brandId,
      lineId: line.id,
      name: 'Greens',
      position: 0,
    })
    await shades[0]!.update({ familyId: family.id })
    const { personId } = ours.designer
    await makeCombination(line, shades, { title: 'Low', lane: 'chosen', createdById: personId })
    await makeCombination(line, shades.slice(0, 2), {
      title: 'High',
      lane: 'chosen',
      photographId: photograph.id,
    })
    await makeCombination(line, shades, { title: 'First idea' })
    const board = (await getBoard(ours.marketer, line.slug))!
    expect(board.cards.map(({ lane, title }) => [lane, title])).toEqual([
      ['sketched', 'First idea'],
      ['chosen', 'High'],
      ['chosen', 'Low'],
    ])
    const [, high, low] = board.cards
    expect(board.shades).toHaveLength(5)
    expect(high!.places.map(([shade]) => shade !== null)).toEqual([true, true, false, false, false])
    expect(low!.places.reduce((sum, [, share]) => sum + share, 0)).toBeCloseTo(1)
    expect(board.shades[low!.places[0]![0]!]).toMatchObject({
      id: shades[0]!.id,
      familyId: family.id,
    })
    expect(board.families).toEqual([{ id: family.id, name: 'Greens' }])
    expect(board.photographs[high!.photograph!]).toEqual({ id: photograph.id, title: 'The beck' })
    expect(board.authors[low!.author!]).toEqual({ id: personId, name: ours.designer.personName })
    expect([high!.author, low!.photograph]).toEqual([null, null])
  })

  it('answers nothing while nothing has changed, and all of it once something has', async () => {
    const { A } = await lay('sketched', 'A')
    const { revision } = (await getBoard(ours.owner, line.slug))!
    expect(await getBoard(ours.owner, line.slug, revision)).toBeNull()
    const moved = await move(A!, { lane: 'chosen' })
    expect(moved.revision).toBeGreaterThan(revision)
    const board = await getBoard(ours.owner, line.slug, revision)
    expect(board).toMatchObject({ revision: moved.revision, cards: [{ lane: 'chosen' }] })
  })

  it('asks the database as often for 300 combinations of five as for 30, and once for nothing new', async () => {
    const { personId: createdById } = ours.designer
    const boardOf = async (count: number) => {
      const one = await makeLine({ id: ours.owner.brandId })
      const { id: photographId } = await makePhotograph(one)
      await makeBoard(one, await makeShades(one, 12), count, { createdById, photographId })
      return countQueries(() => getBoard(ours.owner, one.slug))
    }
    const [few, many] = [await boardOf(30), await boardOf(300)]
    expect(few.answer!.cards).toHaveLength(30)
    expect(many.answer!.cards).toHaveLength(300)
    expect(many.queries).toBe(few.queries)
    const again = await countQueries(() => getBoard(ours.owner, line.slug, line.boardRevision))
    expect(again).toEqual({ answer: null, queries: 1 })
  }, 60_000)
})

describe('moving a combination', () => {
  it('goes between the two, to the top, to the end, and into an empty lane', async () => {
    const { A, B, C, D } = await lay('sketched', 'A', 'B', 'C', 'D')
    await move(D!, { after: A!, before: B! })
    expect((await lanesOf(line)).sketched).toEqual(['A', 'D', 'B', 'C'])
    await move(C!, { before: A! })
    expect((await lanesOf(line)).sketched).toEqual(['C', 'A', 'D', 'B'])
    await move(C!, { after: B! })
    expect((await lanesOf(line)).sketched).toEqual(['A', 'D', 'B', 'C'])
    await move(D!, { lane: 'chosen' })
    expect(await lanesOf(line)).toEqual({
      sketched: ['A', 'B', 'C'],
      'short-listed': [],
      chosen: ['D'],
    })
  })

  it('leaves the version of the combination alone, so that who edits it is not overtaken', async () => {
    const { A } = await lay('sketched', 'A')
    await move(A!, { lane: 'chosen' })
    expect((await A!.reload()).version).toBe(1)
  })

  it('is told in the activity record, once, however often it is sent', async () => {
    const { A, B } = await lay('sketched', 'A', 'B')
    await move(B!, { before: A! })
    const first = await lanesOf(line)
    await move(B!, { before: A! })
    expect(await lanesOf(line)).toEqual(first)
    const told = await Activity.findAll({
      where: { objectId: B!.id, action: 'combination.moved' },
    })
    expect(told).toHaveLength(1)
    expect(told[0]).toMatchObject({ before: { lane: 'sketched' }, after: { lane: 'sketched' } })
  })

  it('sent again after its answer was lost, it is done once', async () => {
    const { A } = await lay('sketched', 'A')
    const once = await move(A!, { from: 'sketched', lane: 'chosen' })
    const again = await move(A!, { from: 'sketched', lane: 'chosen' })
    expect(again.revision).toBeGreaterThanOrEqual(once.revision)
    expect((await lanesOf(line)).chosen).toEqual(['A'])
  })

  it('is refused in words when a neighbour has moved away, and changes nothing', async () => {
    const { A, B, C } = await lay('sketched', 'A', 'B', 'C')
    await move(B!, { lane: 'chosen' })
    const { revision } = (await getBoard(ours.owner, line.slug))!
    await expect(move(C!, { after: A!, before: B! })).rejects.toThrow(
      /“C” was not moved: .* have been moved or deleted meanwhile.*Sketched as it is now/,
    )
    expect((await lanesOf(line)).sketched).toEqual(['A', 'C'])
    expect((await getBoard(ours.owner, line.slug))!.revision).toBe(revision)
  })

  it('is refused when the two neighbours have changed sides', async () => {
    const { A, B, C } = await lay('sketched', 'A', 'B', 'C')
    await move(B!, { before: A! })
    await expect(move(C!, { after: A!, before: B! })).rejects.toThrow(ConflictError)
  })

  it('is refused when a neighbour was deleted', async () => {
    const { A, B } = await lay('sketched', 'A', 'B')
    await deleteCombination(ours.owner, { combinationId: A!.id })
    await expect(move(B!, { before: A! })).rejects.toThrow(ConflictError)
  })

  it('is refused when somebody else has moved the combination to another lane', async () => {
    const { A } = await lay('sketched', 'A')
    await move(A!, { lane: 'chosen' })
    await expect(move(A!, { from: 'sketched', lane: 'short-listed' })).rejects.toThrow(
      'somebody else has moved it to Chosen meanwhile',
    )
    expect((await lanesOf(line)).chosen).toEqual(['A'])
  })

  it('goes right under its upper neighbour when others have come between', async () => {
    const { A, B, C, D } = await lay('sketched', 'A', 'B', 'C', 'D')
    await move(D!, { after: A!, before: B! })
    await move(C!, { after: A!, before: B! })
    expect((await lanesOf(line)).sketched).toEqual(['A', 'C', 'D', 'B'])
  })

  it('a deleted combination comes back to its place, whatever was put there meanwhile', async () => {
    const { A, B, C, D } = await lay('sketched', 'A', 'B', 'C', 'D')
    await deleteCombination(ours.owner, { combinationId: B!.id })
    await move(D!, { after: A!, before: C! })
    await restoreCombination(ours.owner, { combinationId: B!.id })
    const { sketched } = await lanesOf(line)
    expect(sketched).toHaveLength(4)
    expect(sketched.filter((title) => title !== 'D')).toEqual(['A', 'B', 'C'])
    const ranks = await Combination.findAll({ where: { lineId: line.id }, attributes: ['rank'] })
    expect(new Set(ranks.map(({ rank }) => rank)).size).toBe(4)
  })
})

describe('sketching a combination', () => {
  it('begins one with five empty places on top of the first lane, once a press', async () => {
    await lay('sketched', 'A')
    const input = { lineSlug: line.slug, requestKey: randomUUID() }
    const made = await Promise.all(
      Array.from({ length: 5 }, () => sketchCombination(ours.designer, input)),
    )
    expect(new Set(made.map(({ id }) => id)).size).toBe(1)
    const [{ id }] = made as [Combination]
    const places = await CombinationPlace.findAll({
      where: { combinationId: id },
      order: [['place', 'ASC']],
    })
    expect(places.map(({ role, shadeId, share }) => [role, shadeId, share])).toEqual(
      ['MC', 'CC1', 'CC2', 'CC3', 'CC4'].map((role) => [role, null, 0.2]),
    )
    const { sketched } = await lanesOf(line)
    expect(sketched).toEqual(['A new sketch', 'A'])
  })
})

describe('two editors at one board', () => {
  it('100 random moves of each end in one order, and every refused move is told', async () => {
    await makeBoard(line, shades, 30)
    const editors = [
      await openBoard(ours.owner, line.slug),
      await openBoard(ours.designer, line.slug),
    ]
    await moveAtOnce(editors, 100, [seededRandom(1), seededRandom(2)])

    const kept = await lanesOf(line)
    expect(LANES.flatMap((lane) => kept[lane]).sort()).toEqual(
      Array.from({ length: 30 }, (_, n) => `Combination ${n + 1}`).sort(),
    )
    for (const { store, refusals } of editors) {
      const state = store.read()
      const titles = new Map(state.board.cards.map(({ id, title }) => [id, title]))
      const order = orderNow(state)
      const seen = Object.fromEntries(
        LANES.map((lane) => [lane, order[lane].map((id) => titles.get(id))]),
      )
      expect(seen).toEqual(kept)
      expect(state.refused).toHaveLength(refusals)
      expect(new Set(state.refused.map(({ words }) => words.slice(0, 1)))).toEqual(
        new Set(refusals > 0 ? ['“'] : []),
      )
    }
    // A run in which nobody ever got in the other's way would show nothing.
    expect(editors[0]!.refusals + editors[1]!.refusals).toBeGreaterThan(0)
    const ranks = await Combination.findAll({ where: { lineId: line.id } })
    expect(new Set(ranks.map(({ lane, rank }) => `${lane} ${rank}`)).size).toBe(30)
  }, 120_000)
})
