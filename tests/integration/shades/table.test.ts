import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { BOOK_ORDERS, type BookOrder } from '@/lib/shades/constants'
import type { ShadeView } from '@/lib/shades/present'
import { getShade, listShadeTable, readSampleBook } from '@/lib/shades/queries'
import { shadeTableSchema } from '@/lib/shades/schema'
import { Family, Shade, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShade, makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let owner: Actor
let line: Line

beforeAll(async () => {
  owner = await makeActor(await makeBrand())
  line = await makeLine({ id: owner.brandId })
  const shades = [
    { number: 'Q10', name: 'Moss', status: 'approved', labL: 40, labA: -20, labB: 20 },
    { number: 'Q2', name: 'moss after rain', status: 'target', labL: 60, labA: 0, labB: 0 },
    { number: '14', name: null, status: 'dipped', labL: 50, labA: 30, labB: 10 },
    // Far more vivid than a screen shows.
    { number: 'q1', name: '100 % blue_ish', status: 'retired', labL: 50, labA: 40, labB: -120 },
    { number: '9', name: 'Aspen', status: 'target', labL: 80, labA: -90, labB: 80 },
  ] as const
  for (const [position, values] of shades.entries()) await makeShade(line, { ...values, position })
})

const numbers = async (address: Record<string, string>) => {
  const filter = shadeTableSchema.parse(address)
  const { shades, total } = await listShadeTable(owner, line.slug, filter)
  expect(total).toBe(shades.length)
  return shades.map(({ number }) => number)
}

describe('the table', () => {
  it.each([
    [{}, ['Q10', 'Q2', '14', 'q1', '9']],
    [{ dir: 'desc' }, ['9', 'q1', '14', 'Q2', 'Q10']],
    [{ sort: 'number' }, ['9', '14', 'q1', 'Q2', 'Q10']],
    [{ sort: 'name' }, ['q1', '9', 'Q10', 'Q2', '14']],
    [{ sort: 'status' }, ['Q2', '9', '14', 'Q10', 'q1']],
    [{ sort: 'L', dir: 'desc' }, ['9', 'Q2', '14', 'q1', 'Q10']],
    [{ sort: 'a' }, ['9', 'Q10', 'Q2', '14', 'q1']],
    [{ sort: 'b' }, ['q1', 'Q2', '14', 'Q10', '9']],
    [{ q: 'MOSS' }, ['Q10', 'Q2']],
    [{ q: 'q1' }, ['Q10', 'q1']],
    [{ q: '%' }, ['q1']],
    [{ q: '_' }, ['q1']],
    [{ q: '\\' }, []],
    [{ status: 'target,retired' }, ['Q2', 'q1', '9']],
    [{ outside: '1' }, ['q1', '9']],
    [{ outside: '1', sort: 'L', dir: 'desc', status: 'target' }, ['9']],
  ] as [Record<string, string>, string[]][])('at %j shows %j', async (address, expected) => {
    expect(await numbers(address)).toEqual(expected)
  })

  it('has an order that is the same each time when the sort leaves ties', async () => {
    const ties = await makeLine({ id: owner.brandId })
    const shades = await makeShades(ties, 60)
    await Shade.update({ labA: 1 }, { where: { lineId: ties.id } })
    const page = async (at: number) => {
      const filter = shadeTableSchema.parse({ sort: 'a', page: String(at) })
      return (await listShadeTable(owner, ties.slug, filter)).shades.map(({ number }) => number)
    }
    const pages = [...(await page(1)), ...(await page(2))]
    expect(pages).toEqual(shades.map(({ number }) => number))
  })

  it('has nothing on a page beyond the last', async () => {
    const filter = shadeTableSchema.parse({ page: '9' })
    const { shades, total } = await listShadeTable(owner, line.slug, filter)
    expect(shades).toEqual([])
    expect(total).toBe(5)
  })
})

describe('a page takes as many queries for 50 shades as for 5', () => {
  const reads: Record<string, (slug: string) => Promise<unknown>> = {
    'the table': (slug: string) => listShadeTable(owner, slug, shadeTableSchema.parse({})),
    'what no screen shows': (slug: string) =>
      listShadeTable(owner, slug, shadeTableSchema.parse({ outside: '1' })),
    'the sample book': (slug: string) => readSampleBook(owner, slug, { order: 'family', page: 1 }),
    'the sample book by lightness': (slug: string) =>
      readSampleBook(owner, slug, { order: 'lightness', page: 1 }),
    'a shade': async (slug: string) => {
      const { shades } = await listShadeTable(owner, slug, shadeTableSchema.parse({}))
      return getShade(owner, slug, shades[0]!.id)
    },
  }
  let few: Line
  let many: Line
  beforeAll(async () => {
    few = await makeLine({ id: owner.brandId })
    many = await makeLine({ id: owner.brandId })
    await makeShades(few, 5)
    await makeShades(many, 50)
  })

  it.each(Object.entries(reads))('%s', async (_name, read) => {
    const forFew = await countQueries(() => read(few.slug))
    const forMany = await countQueries(() => read(many.slug))
    expect(forFew.queries).toBeGreaterThan(0)
    expect(forMany.queries).toBe(forFew.queries)
  })
})

describe('the sample book', () => {
  const read = async ({ slug }: Line, order: BookOrder, page = 1) =>
    (await readSampleBook(owner, slug, { order, page })).groups
  const shadesIn = (groups: { shades: ShadeView[] }[]) => groups.flatMap(({ shades }) => shades)

  it('is read page by page, each shade once', async () => {
    const long = await makeLine({ id: owner.brandId })
    await makeShades(long, 230)
    for (const order of BOOK_ORDERS) {
      const first = shadesIn(await read(long, order))
      const second = shadesIn(await read(long, order, 2))
      expect(first).toHaveLength(200)
      expect([...first, ...second].map(({ number }) => number)).toEqual(
        Array.from({ length: 230 }, (_, at) => `S${at + 1}`),
      )
    }
  })

  it('goes through the families in their order, over its pages, those in none last', async () => {
    const wide = await makeLine({ id: owner.brandId })
    const [blues, greens] = await Promise.all(
      ['Blues', 'Greens'].map((name, position) =>
        Family.create({ brandId: owner.brandId, lineId: wide.id, name, position }),
      ),
    )
    const shades = await makeShades(wide, 240)
    const put = (at: number, familyId: string | null, familyPosition: number | null = null) =>
      shades[at]!.update({ familyId, familyPosition })
    await Promise.all(shades.map((_, at) => put(at, at % 2 ? blues!.id : greens!.id)))
    await put(0, null)
    // Two that people put in front of the others, the darker one first.
    await put(101, blues!.id, 1)
    await put(201, blues!.id, 0)

    const first = await read(wide, 'family')
    expect(first.map(({ heading, total }) => [heading, total])).toEqual([
      ['Blues', 120],
      ['Greens', 119],
    ])
    expect(first[0]!.shades.slice(0, 3).map(({ number }) => number)).toEqual(['S202', 'S102', 'S2'])
    const second = await read(wide, 'family', 2)
    expect(second.map(({ heading }) => heading)).toEqual(['Greens', 'Not in a family yet'])
    expect(shadesIn([...first, ...second])).toHaveLength(240)
  })

  it('has steps of lightness, and counts numbers as people do', async () => {
    const line = await makeLine({ id: owner.brandId })
    const [nine, ten, odd] = await makeShades(line, 3)
    await ten!.update({ number: '10', labL: 95 })
    await nine!.update({ number: '9', labL: 41 })
    await odd!.update({ number: 'A1', labL: 40 })
    expect((await read(line, 'lightness')).map(({ heading }) => heading)).toEqual([
      'L* 90 to 100',
      'L* 40 to 50',
    ])
    expect(shadesIn(await read(line, 'number')).map(({ number }) => number)).toEqual([
      '9',
      '10',
      'A1',
    ])
  })
})

describe('the neighbours of a shade', () => {
  it('are the nearest of its line, nearest first, without itself', async () => {
    const near = await makeLine({ id: owner.brandId })
    const [first] = await makeShades(near, 20)
    const { neighbours } = await getShade(owner, near.slug, first!.id)
    expect(neighbours.map(({ shade }) => shade.number)).toEqual(['S2', 'S3', 'S4', 'S5', 'S6'])
    const differences = neighbours.map(({ difference }) => difference)
    expect(differences).toEqual([...differences].sort((a, b) => a - b))
    expect(differences[0]).toBeGreaterThan(0)
  })
})
