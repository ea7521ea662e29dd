import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { deltaE00 } from '@/lib/color/ciede2000'
import { STUDY_LIMITS } from '@/lib/shades/constants'
import { createShade } from '@/lib/shades/create-shade'
import { deleteShades } from '@/lib/shades/delete-shades'
import { readRangeStudy } from '@/lib/shades/range-study'
import { createShadeSchema } from '@/lib/shades/schema'
import { Family, Shade, type Line } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShade } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let owner: Actor
let stranger: Actor

beforeAll(async () => {
  owner = (await makeActors(await makeBrand('Ours'))).owner
  stranger = (await makeActors(await makeBrand('Theirs'))).owner
})

const study = (line: Line, twins = 4) => readRangeStudy(owner, line.slug, { twins })

/** Light, dark, red, green and blue: a range with room in it. */
async function makeRange(): Promise<Line> {
  const line = await makeLine({ id: owner.brandId })
  const labs = [
    [92, 0, 4],
    [20, 0, 0],
    [45, 50, 28],
    [48, -36, 24],
    [36, 6, -42],
  ]
  for (const [position, [labL, labA, labB]] of labs.entries()) {
    await makeShade(line, { position, labL, labA, labB, number: `0${position + 1}` })
  }
  return line
}

describe('a range study', () => {
  it('of a line without shades, or with one, finds nothing and breaks nothing', async () => {
    const line = await makeLine({ id: owner.brandId })
    const none = (await study(line)).study!
    expect(none).toMatchObject({ shadeCount: 0, families: [], gaps: [], twins: { total: 0 } })
    await makeShade(line)
    const one = (await study(line)).study!
    expect(one).toMatchObject({
      shadeCount: 1,
      gaps: [],
      nearest: null,
      twins: { pairs: [], total: 0 },
    })
    expect(one.families).toMatchObject([{ id: null, name: 'The whole line' }])
  })

  it('leaves out what is retired or deleted, and says how many are retired', async () => {
    const line = await makeRange()
    await makeShade(line, { number: '06', labL: 92, labA: 0, labB: 4, status: 'retired' })
    const gone = await makeShade(line, { number: '07', labL: 92, labA: 0, labB: 4 })
    await deleteShades(owner, { lineSlug: line.slug, shadeIds: [gone.id], confirmed: true })
    const found = (await study(line)).study!
    expect(found).toMatchObject({ shadeCount: 5, retiredCount: 1, twins: { total: 0 } })
  })

  it('tells near-twins under the limit asked for, with both shades', async () => {
    const line = await makeRange()
    const twin = await makeShade(line, { number: '06', labL: 46.5, labA: 50, labB: 28 })
    const { pairs, total } = (await study(line)).study!.twins
    expect(total).toBe(1)
    expect([pairs[0]!.first.number, pairs[0]!.second.number].sort()).toEqual(['03', '06'])
    const deltaE = deltaE00([45, 50, 28], [46.5, 50, 28])
    expect(pairs[0]!.deltaE).toBeCloseTo(deltaE, 9)
    const closer = (await study(line, deltaE - 0.01)).study!
    expect(closer.twins.total).toBe(0)
    expect(closer.nearest!.deltaE).toBeCloseTo(deltaE, 9)
    await twin.update({ status: 'retired' })
    expect((await study(line)).study!.twins.total).toBe(0)
  })

  it('tells only the first of very many pairs, and how many there are', async () => {
    const line = await makeLine({ id: owner.brandId })
    await Promise.all(
      Array.from({ length: 16 }, (_, position) =>
        makeShade(line, { position, labL: 50 + position / 100 }),
      ),
    )
    const { pairs, total } = (await study(line)).study!.twins
    expect(total).toBe((16 * 15) / 2)
    expect(pairs).toHaveLength(STUDY_LIMITS.pairs)
  })

  it('puts shades under their families in the book’s order, those in none last', async () => {
    const line = await makeRange()
    const where = { brandId: owner.brandId, lineId: line.id }
    const blues = await Family.create({ ...where, name: 'Blues', position: 1 })
    const neutrals = await Family.create({ ...where, name: 'Neutrals', neutral: true, position: 0 })
    await Family.create({ ...where, name: 'Nobody here', position: 2 })
    const into = (family: Family, number: string[]) =>
      Shade.update({ familyId: family.id }, { where: { ...where, number } })
    await into(blues, ['05'])
    await into(neutrals, ['02', '01'])
    const { families } = (await study(line)).study!
    expect(families.map(({ name, shades }) => [name, shades.map(({ number }) => number)])).toEqual([
      ['Neutrals', ['01', '02']],
      ['Blues', ['05']],
      ['In no family', ['04', '03']],
    ])
    expect(families[0]!.ladder).toEqual({
      span: 72,
      widest: { above: 0, step: 72 },
      evenness: null,
    })
  })

  it('proposes for each gap a colour and a number that can be added as they are', async () => {
    const line = await makeRange()
    const before = (await study(line)).study!
    expect(before.gaps.length).toBeGreaterThan(1)
    expect(before.gaps.map(({ number }) => number)).toEqual(
      before.gaps.map((_, at) => `${String(6 + at).padStart(2, '0')}`),
    )
    const [gap] = before.gaps
    const [L, a, b] = gap!.lab
    const added = await createShade(
      owner,
      createShadeSchema.parse({
        lineSlug: line.slug,
        number: gap!.number,
        name: null,
        status: 'target',
        color: { kind: 'lab', L, a, b, terms: before.terms },
        requestKey: randomUUID(),
      }),
    )
    expect(added).toMatchObject({ status: 'target', observer: 10, number: '06' })
    const after = (await study(line)).study!
    expect(after.shadeCount).toBe(6)
    for (const { lab } of after.gaps) expect(deltaE00(lab, gap!.lab)).toBeGreaterThan(4)
  })

  it('gives targets the terms of most readings, and says when they are mixed', async () => {
    const line = await makeRange()
    expect((await study(line)).study!).toMatchObject({ terms: 'D65/10', isMixed: false })
    const where = { brandId: owner.brandId, lineId: line.id }
    await Shade.update({ observer: 2 }, { where: { ...where, number: ['01', '02', '03'] } })
    expect((await study(line)).study!).toMatchObject({ terms: 'D65/2', isMixed: true })
  })

  it('is not made of a line too large to compare', async () => {
    const line = await makeLine({ id: owner.brandId })
    await Shade.bulkCreate(
      Array.from({ length: STUDY_LIMITS.shades + 1 }, (_, position) => ({
        brandId: owner.brandId,
        lineId: line.id,
        number: String(position),
        name: null,
        labL: 50,
        labA: 0,
        labB: 0,
        illuminant: 'D65' as const,
        observer: 10 as const,
        hex: null,
        status: 'target' as const,
        position,
      })),
    )
    expect((await study(line)).study).toBeNull()
  })

  it('asks the database as often for a large line as for a small one', async () => {
    const small = await makeRange()
    const large = await makeRange()
    for (let position = 10; position < 40; position++) {
      await makeShade(large, { position, labL: 2 * position, number: String(position) })
    }
    const few = await countQueries(() => study(small))
    const many = await countQueries(() => study(large))
    expect(many.queries).toBe(few.queries)
  })

  it('knows nothing of another brand', async () => {
    const line = await makeRange()
    const foreign = await readRangeStudy(stranger, line.slug, { twins: 4 }).catch((e: unknown) => e)
    const missing = await readRangeStudy(stranger, 'nowhere', { twins: 4 }).catch((e: unknown) => e)
    expect(foreign).toEqual(missing)
  })
})
