import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { PLACE_ROLES } from '@/lib/combinations/constants'
import { deleteCombination } from '@/lib/combinations/delete-combination'
import { keepCombination } from '@/lib/combinations/keep-combination'
import { presentCombination } from '@/lib/combinations/present'
import { openCombination } from '@/lib/combinations/open-combination'
import { getCombination, getNewerCombination } from '@/lib/combinations/queries'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { saveCombination } from '@/lib/combinations/save-combination'
import { keepCombinationSchema, saveCombinationSchema } from '@/lib/combinations/schema'
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
const placesOf = (ids: readonly (string | null)[]) =>
  PLACE_ROLES.map((role, place) => ({
    shadeId: ids[place] ?? null,
    share: 0.2,
    role,
    locked: false,
  }))
const five = () => shades.slice(0, 5).map(({ id }) => id)
const whole = (ids: readonly (string | null)[] = five(), changes: object = {}) => ({
  title: 'A combination',
  story: '',
  photographId: null,
  places: placesOf(ids),
  ...changes,
})
const read = async ({ id }: Combination) =>
  presentCombination(ours.owner, await getCombination(ours.owner, line.slug, id))

interface Doing {
  name: string
  roles: readonly Role[]
  do: (actor: Actor, combination: Combination) => Promise<unknown>
  ofOne?: boolean
}
const DOINGS: Doing[] = [
  {
    name: 'open one',
    roles: READERS,
    ofOne: true,
    do: (a, one) => getCombination(a, line.slug, one.id),
  },
  { name: 'keep five', roles: KEEPERS, do: (a) => keepCombination(a, keeping()) },
  {
    name: 'open one to edit',
    roles: READERS,
    ofOne: true,
    do: (a, one) => openCombination(a, line.slug, one.id),
  },
  {
    name: 'ask whether one is newer',
    roles: READERS,
    ofOne: true,
    do: (a, one) => getNewerCombination(a, one.id, one.version),
  },
  {
    name: 'rename one',
    roles: READERS,
    ofOne: true,
    do: (a, one) => saveCombination(a, { ...at(one), title: 'New' }),
  },
  {
    name: 'save one whole',
    roles: KEEPERS,
    ofOne: true,
    do: (a, one) => saveCombination(a, { ...at(one), ...whole() }),
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

describe('opening a combination', () => {
  it('brings what may be put into it: shades not retired, families, photographs, of the line alone', async () => {
    const own = await makeLine({ id: ours.owner.brandId })
    const few = await makeShades(own, 7)
    await few[6]!.update({ status: 'retired' })
    const picture = await makePhotograph(own)
    const { id } = await makeCombination(own, few)
    const opened = await countQueries(() => openCombination(ours.designer, own.slug, id))
    expect(opened.answer.shades.map((one) => one.id)).toEqual(few.slice(0, 6).map((one) => one.id))
    expect(opened.answer.photographs.map((one) => one.id)).toEqual([picture.id])
    expect(opened.queries).toBe(8)
  })
})

describe('saving an open combination', () => {
  it('keeps every field and every place, also empty ones, in their order', async () => {
    const combination = await makeCombination(line, shades)
    const places = placesOf([shades[7]!.id, null, shades[0]!.id, null, shades[1]!.id]).map(
      (place, index) => ({
        ...place,
        role: PLACE_ROLES[4 - index]!,
        share: [0.52, 0.2, 0.02, 0.13, 0.13][index]!,
        locked: index === 2,
      }),
    )
    const values = { title: 'Fell', story: 'After rain.', photographId: photograph.id, places }
    await saveCombination(ours.designer, { ...at(combination), ...values })
    const view = await read(combination)
    expect(view).toMatchObject({ title: 'Fell', story: 'After rain.', version: 2 })
    expect(view.photograph?.id).toBe(photograph.id)
    expect(
      view.places.map(({ shade, role, share, locked }) => ({
        shadeId: shade?.id ?? null,
        share,
        role,
        locked,
      })),
    ).toEqual(places)
  })

  it('lets shades and roles change places in one save', async () => {
    const combination = await makeCombination(line, shades)
    const backwards = five().reverse()
    await saveCombination(ours.owner, { ...at(combination), ...whole(backwards) })
    expect((await read(combination)).places.map(({ shade }) => shade!.id)).toEqual(backwards)
  })

  it('refuses the second of two who save, whatever they changed, and leaves the first', async () => {
    const combination = await makeCombination(line, shades)
    const version = at(combination)
    await saveCombination(ours.marketer, { ...version, title: 'Theirs' })
    for (const values of [{ title: 'Mine' }, whole([...five()].reverse())]) {
      await expect(saveCombination(ours.designer, { ...version, ...values })).rejects.toThrow(
        ConflictError,
      )
    }
    const view = await read(combination)
    expect(view).toMatchObject({ title: 'Theirs', version: 2 })
    expect(view.places.map(({ shade }) => shade!.id)).toEqual(five())
  })

  it('of ten who save at once takes one', async () => {
    const combination = await makeCombination(line, shades)
    const answers = await Promise.allSettled(
      Array.from({ length: 10 }, (_, n) =>
        saveCombination(ours.designer, { ...at(combination), ...whole(), title: `Title ${n}` }),
      ),
    )
    expect(answers.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    expect((await combination.reload()).version).toBe(2)
  })

  it('lets a marketer change the title and nothing else', async () => {
    const combination = await makeCombination(line, shades)
    for (const more of [{ story: 'Mine.' }, { photographId: null }, { places: placesOf(five()) }]) {
      await expect(
        saveCombination(ours.marketer, { ...at(combination), title: 'Mine', ...more }),
      ).rejects.toThrow(ForbiddenError)
    }
    await saveCombination(ours.marketer, { ...at(combination), title: 'Fell' })
    expect(await read(combination)).toMatchObject({ title: 'Fell', story: '' })
  })

  it('refuses shades and photographs of another line and of another brand, and saves nothing', async () => {
    const combination = await makeCombination(line, shades)
    const other = await makeLine({ id: ours.owner.brandId })
    const foreign = await makeLine({ id: theirs.owner.brandId })
    for (const elsewhere of [other, foreign]) {
      const [stranger] = await makeShades(elsewhere, 1)
      const { id: photographId } = await makePhotograph(elsewhere)
      for (const values of [
        whole([...five().slice(1), stranger!.id]),
        whole(five(), { photographId }),
      ]) {
        await expect(
          saveCombination(ours.owner, { ...at(combination), ...values }),
        ).rejects.toThrow(NotFoundError)
      }
    }
    expect((await read(combination)).version).toBe(1)
  })

  it('puts a shade back that was deleted from the line since', async () => {
    const own = await makeLine({ id: ours.owner.brandId })
    const few = await makeShades(own, 6)
    const combination = await makeCombination(own, few)
    await deleteShades(ours.owner, { lineSlug: own.slug, shadeIds: [few[2]!.id], confirmed: true })
    const ids = few.slice(0, 5).map(({ id }) => id)
    const without = ids.map((id, place) => (place === 2 ? null : id))
    await saveCombination(ours.owner, { ...at(combination), ...whole(without) })
    await saveCombination(ours.owner, { ...at(await combination.reload()), ...whole(ids) })
    const view = presentCombination(
      ours.owner,
      await getCombination(ours.owner, own.slug, combination.id),
    )
    expect(view.places.map(({ gone }) => gone)).toEqual([false, false, true, false, false])
  })

  it.each([
    ['four places', (places: object[]) => places.slice(1)],
    [
      'one shade twice',
      (places: object[]) => places.map((one) => ({ ...one, shadeId: five()[0] })),
    ],
    ['one role twice', (places: object[]) => places.map((one) => ({ ...one, role: 'MC' }))],
    [
      'shares beyond the whole',
      (places: object[]) => places.map((one) => ({ ...one, share: 0.3 })),
    ],
    [
      'a share below the least',
      (places: object[]) =>
        places.map((one, place) => ({ ...one, share: [0.4, 0.2, 0.2, 0.19, 0.01][place] })),
    ],
  ])('refuses %s', (_, spoil) => {
    const values = {
      ...whole(),
      combinationId: randomUUID(),
      version: 1,
      places: spoil(placesOf(five())),
    }
    expect(saveCombinationSchema.safeParse(values).success).toBe(false)
  })

  it('raises the board’s revision, and asks once while there is nothing newer', async () => {
    const combination = await makeCombination(line, shades)
    const before = (await line.reload()).boardRevision
    const same = await countQueries(() => getNewerCombination(ours.owner, combination.id, 1))
    expect(same).toMatchObject({ answer: null, queries: 1 })
    await saveCombination(ours.owner, { ...at(combination), title: 'Fell' })
    expect((await line.reload()).boardRevision).toBe(before + 1)
    const newer = await getNewerCombination(ours.owner, combination.id, 1)
    expect(newer?.combination.title).toBe('Fell')
  })
})
