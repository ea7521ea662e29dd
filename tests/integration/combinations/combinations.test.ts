import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { deleteCombination } from '@/lib/combinations/delete-combination'
import { keepCombination } from '@/lib/combinations/keep-combination'
import { presentCombination } from '@/lib/combinations/present'
import { getCombination, listCombinations } from '@/lib/combinations/queries'
import { renameCombination } from '@/lib/combinations/rename-combination'
import { reorderCombination } from '@/lib/combinations/reorder-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { combinationFilterSchema, keepCombinationSchema } from '@/lib/combinations/schema'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { deleteShades } from '@/lib/shades/delete-shades'
import { Combination, CombinationPlace, type Line, type Photograph, type Shade } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

const READERS: readonly Role[] = ['owner', 'marketer', 'designer']
const KEEPERS: readonly Role[] = ['owner', 'designer']
const ALL = combinationFilterSchema.parse({})

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>
let line: Line
let shades: Shade[]
let photograph: Photograph

beforeAll(async () => {
  ours = await makeActors(await makeBrand())
  theirs = await makeActors(await makeBrand())
  line = await makeLine({ id: ours.owner.brandId })
  shades = await makeShades(line, 8)
  photograph = await makePhotograph(line)
})

const keeping = (changes: object = {}) =>
  keepCombinationSchema.parse({
    lineSlug: line.slug,
    photographId: photograph.id,
    reading: 'true',
    title: 'Five of them',
    places: shades.slice(0, 5).map(({ id }) => ({ shadeId: id, share: 0.2 })),
    requestKey: randomUUID(),
    ...changes,
  })
const at = ({ id, version }: Combination) => ({ combinationId: id, version })
const backwards = () =>
  shades
    .slice(0, 5)
    .map(({ id }) => id)
    .reverse()

interface Doing {
  name: string
  roles: readonly Role[]
  do: (actor: Actor, combination: Combination) => Promise<unknown>
  ofOne?: boolean
}
const DOINGS: Doing[] = [
  { name: 'see the list', roles: READERS, do: (a) => listCombinations(a, line.slug, ALL) },
  {
    name: 'open one',
    roles: READERS,
    ofOne: true,
    do: (a, one) => getCombination(a, line.slug, one.id),
  },
  { name: 'keep five', roles: KEEPERS, do: (a) => keepCombination(a, keeping()) },
  {
    name: 'rename one',
    roles: READERS,
    ofOne: true,
    do: (a, one) => renameCombination(a, { ...at(one), title: 'New' }),
  },
  {
    name: 'reorder one',
    roles: KEEPERS,
    ofOne: true,
    do: (a, one) => reorderCombination(a, { ...at(one), shadeIds: backwards() }),
  },
  {
    name: 'delete one',
    roles: KEEPERS,
    ofOne: true,
    do: async (a, one) => deleteCombination(a, { combinationId: one.id }),
  },
  {
    name: 'bring one back',
    roles: KEEPERS,
    ofOne: true,
    do: async (a, one) => restoreCombination(a, { combinationId: one.id }),
  },
]

describe('who may do what with combinations', () => {
  for (const doing of DOINGS) {
    for (const role of ROLES) {
      const may = doing.roles.includes(role)
      it(`${role} ${may ? 'may' : 'may not'} ${doing.name}`, async () => {
        const work = doing.do(ours[role], await makeCombination(line, shades))
        if (may) await work
        else await expect(work).rejects.toThrow(ForbiddenError)
      })
    }
    if (!doing.ofOne) continue
    it(`another brand's owner cannot ${doing.name}: it answers as an unknown one`, async () => {
      const combination = await makeCombination(line, shades)
      const unknown = Combination.build({ ...combination.get(), id: randomUUID() })
      const answers = await Promise.all(
        [combination, unknown].map((one) =>
          doing.do(theirs.owner, one).catch((error: unknown) => error),
        ),
      )
      for (const answer of answers) expect(answer).toBeInstanceOf(NotFoundError)
      expect((answers[0] as Error).message).toBe((answers[1] as Error).message)
      expect((await combination.reload()).title).toBe('A combination')
    })
  }
})

describe('keeping five shades', () => {
  it('ten identical submits make one combination with five places, and all get the same answer', async () => {
    const input = keeping()
    const kept = await Promise.all(
      Array.from({ length: 10 }, () => keepCombination(ours.designer, input)),
    )
    expect(new Set(kept.map(({ id }) => id)).size).toBe(1)
    expect(await Combination.count({ where: { requestKey: input.requestKey } })).toBe(1)
    expect(await CombinationPlace.count({ where: { combinationId: kept[0]!.id } })).toBe(5)
  })

  it('keeps their order and shares', async () => {
    const places = [0.4, 0.3, 0.15, 0.1, 0.05].map((share, place) => ({
      shadeId: shades[7 - place]!.id,
      share,
    }))
    const { id } = await keepCombination(ours.owner, keeping({ places }))
    const view = presentCombination(ours.owner, await getCombination(ours.owner, line.slug, id))
    expect(view.places.map(({ shade, share }) => ({ shadeId: shade?.id, share }))).toEqual(places)
    expect(view.places.map(({ role }) => role)).toEqual(['MC', 'CC1', 'CC2', 'CC3', 'CC4'])
  })

  it('refuses a shade of another line and of another brand, and a photograph of another line', async () => {
    const other = await makeLine({ id: ours.owner.brandId })
    const [stranger] = await makeShades(other, 1)
    const [foreign] = await makeShades(await makeLine({ id: theirs.owner.brandId }), 1)
    const four = shades.slice(0, 4).map(({ id }) => ({ shadeId: id, share: 0.2 }))
    for (const { id } of [stranger!, foreign!]) {
      const input = keeping({ places: [...four, { shadeId: id, share: 0.2 }] })
      await expect(keepCombination(ours.owner, input)).rejects.toThrow(NotFoundError)
    }
    const elsewhere = await makePhotograph(other)
    await expect(
      keepCombination(ours.owner, keeping({ photographId: elsewhere.id })),
    ).rejects.toThrow(NotFoundError)
  })

  it.each([
    ['four shades', (five: object[]) => five.slice(1)],
    ['one shade twice', (five: object[]) => [...five.slice(1), five[1]]],
    [
      'shares that do not come to the whole',
      (five: object[]) => five.map((one) => ({ ...one, share: 0.3 })),
    ],
  ])('refuses %s', (_, spoil) => {
    const five = shades.slice(0, 5).map(({ id }) => ({ shadeId: id, share: 0.2 }))
    const { requestKey, ...rest } = keeping()
    const parsed = keepCombinationSchema.safeParse({ ...rest, requestKey, places: spoil(five) })
    expect(parsed.success).toBe(false)
  })
})

describe('a kept combination', () => {
  it('does not change with the line: a deleted shade stays in it, marked', async () => {
    const own = await makeLine({ id: ours.owner.brandId })
    const few = await makeShades(own, 6)
    const { id } = await makeCombination(own, few)
    await deleteShades(ours.owner, { lineSlug: own.slug, shadeIds: [few[2]!.id], confirmed: true })
    const view = presentCombination(ours.owner, await getCombination(ours.owner, own.slug, id))
    expect(view.places.map(({ gone }) => gone)).toEqual([false, false, true, false, false])
  })

  it('refuses a title or an order when somebody saved in between', async () => {
    const combination = await makeCombination(line, shades)
    await renameCombination(ours.marketer, { ...at(combination), title: 'Theirs' })
    await expect(
      renameCombination(ours.designer, { ...at(combination), title: 'Mine' }),
    ).rejects.toThrow(ConflictError)
    await expect(
      reorderCombination(ours.designer, { ...at(combination), shadeIds: backwards() }),
    ).rejects.toThrow(ConflictError)
    expect((await combination.reload()).title).toBe('Theirs')
  })

  it('takes a new order of its own five only', async () => {
    const combination = await makeCombination(line, shades)
    await reorderCombination(ours.owner, { ...at(combination), shadeIds: backwards() })
    const { combination: now } = await getCombination(ours.owner, line.slug, combination.id)
    expect(now.places!.map(({ shadeId }) => shadeId)).toEqual(backwards())
    const others = [...backwards().slice(1), shades[7]!.id]
    await expect(reorderCombination(ours.owner, { ...at(now), shadeIds: others })).rejects.toThrow(
      NotFoundError,
    )
  })

  it('is gone when deleted and back when restored', async () => {
    const combination = await makeCombination(line, shades)
    const id = { combinationId: combination.id }
    await deleteCombination(ours.owner, id)
    await expect(getCombination(ours.owner, line.slug, combination.id)).rejects.toThrow(
      NotFoundError,
    )
    await restoreCombination(ours.owner, id)
    await expect(getCombination(ours.owner, line.slug, combination.id)).resolves.toBeDefined()
  })
})

describe('the list', () => {
  it('asks the database as often for 50 combinations as for 5', async () => {
    const lineOf = async (count: number) => {
      const one = await makeLine({ id: ours.owner.brandId })
      const six = await makeShades(one, 6)
      const { personId: createdById } = ours.designer
      for (let made = 0; made < count; made++) await makeCombination(one, six, { createdById })
      return one
    }
    const [few, many] = [await lineOf(5), await lineOf(50)]
    const show = (one: Line) => countQueries(() => listCombinations(ours.owner, one.slug, ALL))
    const [five, fifty] = [await show(few), await show(many)]
    expect(five.answer.combinations).toHaveLength(5)
    expect(fifty.answer).toMatchObject({ total: 50, combinations: { length: 24 } })
    expect(fifty.queries).toBe(five.queries)
  })

  it('finds by title and by the name of a shade, as written', async () => {
    const one = await makeLine({ id: ours.owner.brandId })
    const six = await makeShades(one, 6)
    await six[3]!.update({ name: 'Fern 50%' })
    await makeCombination(one, six, { title: 'By the beck' })
    await makeCombination(one, [...six.slice(4), six[0]!, six[1]!, six[2]!], {
      title: 'Under_score',
    })
    const find = async (q: string) =>
      (
        await listCombinations(ours.owner, one.slug, combinationFilterSchema.parse({ q }))
      ).combinations.map(({ combination }) => combination.title)
    expect(await find('beck')).toEqual(['By the beck'])
    expect(await find('fern 50%')).toEqual(['By the beck'])
    expect(await find('_')).toEqual(['Under_score'])
    expect(await find("' OR 1=1 --")).toEqual([])
  })
})
