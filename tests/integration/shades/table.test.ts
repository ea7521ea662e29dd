import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import type { Lab } from '@/lib/color/types'
import { getShade, listShadeTable, readSampleBook } from '@/lib/shades/queries'
import { BOOK_FAMILIES, bookFamily } from '@/lib/shades/sample-book'
import { shadeTableSchema } from '@/lib/shades/schema'
import { Shade, type Line } from '@/models'
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
    'the sample book': (slug: string) => readSampleBook(owner, slug, 1),
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
  it('is read page by page, each shade once', async () => {
    const long = await makeLine({ id: owner.brandId })
    await makeShades(long, 230)
    const pages = [
      await readSampleBook(owner, long.slug, 1),
      await readSampleBook(owner, long.slug, 2),
    ]
    const shades = pages.flatMap(({ groups }) => groups.flatMap((group) => group.shades))
    expect(pages[0]!.groups.flatMap((group) => group.shades)).toHaveLength(200)
    expect(shades.map(({ number }) => number)).toEqual(
      Array.from({ length: 230 }, (_, at) => `S${at + 1}`),
    )
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

describe('the sample book', () => {
  it('goes through the families in order, light to dark, over its pages', async () => {
    const wide = await makeLine({ id: owner.brandId })
    // Round the hue circle in steps of 1.7°, some of it near grey; with the axes themselves.
    const angles = [0, 90, 180, 270, ...Array.from({ length: 220 }, (_, n) => (n * 1.7) % 360)]
    const labs = angles.map((degrees, n): Lab => {
      const chroma = n % 9 === 8 ? 5 : 40
      const radians = (degrees * Math.PI) / 180
      return [(n * 37) % 100, chroma * Math.cos(radians), chroma * Math.sin(radians)]
    })
    await Promise.all(
      labs.map(([labL, labA, labB], position) => makeShade(wide, { position, labL, labA, labB })),
    )
    const read = async (page: number) =>
      (await readSampleBook(owner, wide.slug, page)).groups.flatMap(({ shades }) => shades)
    const shown = [...(await read(1)), ...(await read(2))].map(({ lab }) => lab)
    const place = (lab: Lab) => BOOK_FAMILIES.indexOf(bookFamily(lab))
    const expected = [...labs].sort((one, other) => place(one) - place(other) || other[0] - one[0])
    expect(shown).toEqual(expected)
  })
})
