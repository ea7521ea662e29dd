import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { NAME_LIMITS } from '@/lib/names/constants'
import { listNames } from '@/lib/names/list-names'
import { readTogether } from '@/lib/names/read-together'
import { nameListSchema } from '@/lib/names/schema'
import { Family, NameIdea, NameVote, Shade, type Line } from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShade, makeShades } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

const read = (actor: Actor, { slug }: Line, address: Record<string, string> = {}) =>
  listNames(actor, slug, nameListSchema.parse(address))

let brand: Awaited<ReturnType<typeof makeBrand>>
let owner: Actor
let line: Line
let greens: Family

/** Found when it was sent. */
const found = (warnings: number, notes: number): NameIdea['findings'] =>
  [...Array<'warning'>(warnings).fill('warning'), ...Array<'note'>(notes).fill('note')].map(
    (grade, at) => ({
      check: 'label',
      grade,
      what: `The ${at}. thing.`,
      why: 'So it is.',
      sure: 'certain',
    }),
  )

beforeAll(async () => {
  brand = await makeBrand()
  owner = await makeActor(brand)
  line = await makeLine(brand)
  const inLine = { brandId: brand.id, lineId: line.id }
  const blues = await Family.create({ ...inLine, name: 'Blues', position: 0 })
  greens = await Family.create({ ...inLine, name: 'Greens', position: 1 })
  const shades = await Promise.all(
    ['10', '9', '8', '7', '6', '5'].map((number, position) =>
      makeShade(line, { number, position, labL: 90 - 10 * position, labA: 0, labB: 0 }),
    ),
  )
  const [ten, nine, eight, seven, six] = shades as [Shade, Shade, Shade, Shade, Shade]
  await Promise.all([
    ten.update({ familyId: greens.id }),
    nine.update({ familyId: blues.id }),
    eight.update({ familyId: greens.id }),
    seven.update({ familyId: blues.id }),
  ])
  await makeIdea(line, ten, { text: 'Kettle Black', state: 'approved', findings: found(0, 1) })
  await makeIdea(line, ten, { text: 'Coal Scuttle', state: 'in-review' })
  await makeIdea(line, ten, { text: 'Hearth Stone', state: 'put-by' })
  await makeIdea(line, nine, { text: 'Dusk 100 %', state: 'in-review', findings: found(5, 0) })
  await makeIdea(line, eight, { text: 'Returned Long Ago', state: 'returned' })
  // Implies a fibre that the line lacks.
  await makeIdea(line, eight, { text: 'Cashmere Lane' })
  await makeIdea(line, seven, { text: 'Ash on the Wind', state: 'returned' })
  await makeIdea(line, six, { text: 'For Another Year', state: 'put-by' })
  const gone = await makeIdea(line, six, { text: 'Gone Again' })
  await gone.destroy()
  await makeIdea(line, null, { text: 'Thyme Will Tell' })
  await makeIdea(line, null, { text: 'Soaked to the Skein', state: 'put-by' })
})

const numbers = async (address: Record<string, string>) => {
  const { rows, total } = await read(owner, line, address)
  expect(total).toBe(rows.length)
  return rows.map(({ number }) => number)
}

describe('the list', () => {
  it('has each shade with the idea that stands for it, and counts its others', async () => {
    const { rows } = await read(owner, line)
    expect(rows.map(({ idea }) => idea && [idea.text, idea.state])).toEqual([
      ['Kettle Black', 'approved'],
      ['Dusk 100 %', 'in-review'],
      ['Cashmere Lane', 'draft'],
      ['Ash on the Wind', 'returned'],
      null,
      null,
    ])
    expect(rows.map(({ others }) => others)).toEqual([
      { 'in-review': 1, 'put-by': 1 },
      {},
      { returned: 1 },
      {},
      { 'put-by': 1 },
      {},
    ])
    expect(rows.map(({ family }) => family)).toEqual([
      'Greens',
      'Blues',
      'Greens',
      'Blues',
      null,
      null,
    ])
    expect(rows[0]).toMatchObject({ label: 'Kettle Black', retired: false })
    expect(rows[1]).toMatchObject({ label: 'No. 9' })
  })

  it.each([
    [{}, ['10', '9', '8', '7', '6', '5']],
    [{ dir: 'desc' }, ['5', '6', '7', '8', '9', '10']],
    [{ sort: 'number' }, ['5', '6', '7', '8', '9', '10']],
    [{ sort: 'name' }, ['7', '8', '9', '10', '6', '5']],
    [{ sort: 'name', dir: 'desc' }, ['10', '9', '8', '7', '6', '5']],
    [{ sort: 'state' }, ['6', '5', '8', '7', '9', '10']],
    [{ sort: 'family' }, ['9', '7', '10', '8', '6', '5']],
    [{ sort: 'family', dir: 'desc' }, ['10', '8', '9', '7', '6', '5']],
    [{ state: 'none' }, ['6', '5']],
    [{ state: 'draft,returned' }, ['8', '7']],
    [{ state: 'approved,in-review', sort: 'name' }, ['9', '10']],
    [{ state: 'nonsense' }, ['10', '9', '8', '7', '6', '5']],
    [{ q: 'kettle' }, ['10']],
    [{ q: '1' }, ['10', '9']],
    [{ q: '%' }, ['9']],
    [{ q: '_' }, []],
    // What does not stand for a shade is not looked through.
    [{ q: 'scuttle' }, []],
    [{ q: 'again' }, []],
    [{ family: 'none' }, ['6', '5']],
    [{ warned: '1' }, ['9', '8']],
    [{ warned: '1', state: 'draft' }, ['8']],
    [{ warned: '1', sort: 'number' }, ['8', '9']],
    [{ q: 'a', warned: '1', family: 'none' }, []],
  ] as [Record<string, string>, string[]][])('at %j shows %j', async (address, expected) => {
    expect(await numbers(address)).toEqual(expected)
  })

  it('shows one family', async () => {
    expect(await numbers({ family: greens.id })).toEqual(['10', '8'])
  })

  it('sorts by what is found, warnings before notes, and what has no name last either way', async () => {
    const down = await numbers({ sort: 'checks', dir: 'desc' })
    expect(down.slice(0, 2)).toEqual(['9', '8'])
    expect(down.slice(-2)).toEqual(['6', '5'])
    const up = await numbers({ sort: 'checks' })
    expect(up.slice(-4)).toEqual(['8', '9', '6', '5'])
  })

  it('checks a draft as it stands, and leaves what was found when a name was sent', async () => {
    const { rows } = await read(owner, line)
    const checks = (at: number) => rows[at]!.idea!.findings!.map(({ check }) => check)
    expect(checks(0)).toEqual(['label'])
    expect(checks(1)).toHaveLength(5)
    expect(checks(2)).toContain('fiber')
    expect(rows[3]!.idea!.findings).not.toBeNull()
  })

  it('counts how far the names of the line have come', async () => {
    const { numbers } = await read(owner, line, { q: 'nothing like it' })
    expect(numbers).toEqual({
      shades: 6,
      named: 1,
      onShades: { draft: 1, 'in-review': 2, approved: 1, returned: 2, 'put-by': 2 },
      heap: 1,
    })
  })

  it('counts and shows no shade that was deleted', async () => {
    const other = await makeLine(brand)
    const [gone] = await makeShades(other, 2)
    await makeIdea(other, gone!, { text: 'Kelp Me', state: 'approved' })
    await gone!.destroy()
    const { rows, numbers } = await read(owner, other)
    expect(rows.map(({ number }) => number)).toEqual(['S2'])
    expect(numbers).toMatchObject({ shades: 1, named: 0 })
  })

  it('says of each idea what this reader may do', async () => {
    const marketer = await makeActor(brand, 'marketer')
    const { rows } = await read(marketer, line)
    expect(rows.map(({ idea }) => idea?.moves)).toEqual([
      [],
      ['recall'],
      ['send', 'put-by'],
      ['send', 'put-by'],
      undefined,
      undefined,
    ])
    expect(rows.map(({ idea }) => idea?.canEdit)).toEqual([
      false,
      false,
      true,
      true,
      undefined,
      undefined,
    ])
  })

  it('is turned page by page, each shade once, also when it is sorted by what ties', async () => {
    const long = await makeLine(brand)
    const shades = await makeShades(long, 60)
    for (const sort of ['order', 'state', 'checks']) {
      const pages = await Promise.all(
        ['1', '2', '3'].map((page) => read(owner, long, { sort, page })),
      )
      expect(pages.map(({ rows }) => rows.length)).toEqual([50, 10, 0])
      expect(pages.flatMap(({ rows }) => rows.map(({ id }) => id))).toEqual(
        shades.map(({ id }) => id),
      )
      expect(pages[2]!.total).toBe(60)
    }
  })

  it('checks only so many drafts to narrow by, and says how many it left', async () => {
    const full = await makeLine(brand)
    const shades = await makeShades(full, NAME_LIMITS.sifted + 2)
    await NameIdea.bulkCreate(
      shades.map(({ id: shadeId }) => ({
        brandId: brand.id,
        lineId: full.id,
        shadeId,
        text: 'Cashmere Lane',
        state: 'draft' as const,
        authorId: null,
        wordedById: null,
      })),
    )
    expect(await read(owner, full, { warned: '1' })).toMatchObject({
      total: NAME_LIMITS.sifted,
      unsifted: 2,
    })
    expect((await read(owner, full)).unsifted).toBe(0)
  })

  it.each([{}, { sort: 'checks' }, { state: 'draft,in-review' }] as Record<string, string>[])(
    'takes as many queries for 40 shades as for 4, at %j',
    async (address) => {
      const queries = await Promise.all([4, 40].map(makeNamed)).then(async ([few, many]) => [
        await countQueries(() => read(owner, few!, address)),
        await countQueries(() => read(owner, many!, address)),
      ])
      expect(queries[0]!.queries).toBeGreaterThan(0)
      expect(queries[0]!.queries).toBeLessThanOrEqual(18)
      expect(queries[1]!.queries).toBe(queries[0]!.queries)
    },
  )

  it('opens to who drafts, not to the dye house, and to nobody of another brand', async () => {
    const [ours, theirs] = [await makeActors(brand), await makeActors(await makeBrand('Theirs'))]
    for (const role of ['owner', 'marketer', 'designer'] as const) {
      expect((await read(ours[role], line)).rows).toHaveLength(6)
      await expect(read(theirs[role], line)).rejects.toBeInstanceOf(NotFoundError)
      await expect(readTogether(theirs[role], line.slug)).rejects.toBeInstanceOf(NotFoundError)
    }
    await expect(read(ours.dyer, line)).rejects.toBeInstanceOf(ForbiddenError)
    await expect(readTogether(ours.dyer, line.slug)).rejects.toBeInstanceOf(ForbiddenError)
  })

  it('never mixes in what another brand has', async () => {
    const theirs = await makeActor(await makeBrand('Theirs'))
    const other = await makeLine({ id: theirs.brandId })
    const [shade] = await makeShades(other, 1)
    await makeIdea(other, shade!, { text: 'Not Ours' })
    await makeIdea(other, null, { text: 'Nor This' })
    const { rows, numbers } = await read(theirs, other)
    expect(rows.map(({ idea }) => idea?.text)).toEqual(['Not Ours'])
    expect(numbers).toMatchObject({ shades: 1, heap: 1 })
    expect((await read(owner, line)).numbers.shades).toBe(6)
  })
})

/** A line with a name in each state, however many shades. */
async function makeNamed(count: number): Promise<Line> {
  const named = await makeLine(brand)
  const shades = await makeShades(named, count)
  const states = ['draft', 'in-review', 'approved', 'returned'] as const
  const author = owner.personId
  for (const [at, shade] of shades.entries()) {
    const state = states[at % states.length]!
    const idea = await makeIdea(named, shade, { text: `Moss ${at}`, state, authorId: author })
    if (state !== 'in-review') continue
    await NameVote.create({
      brandId: brand.id,
      ideaId: idea.id,
      round: idea.round,
      personId: author,
      vote: 'yes',
    })
  }
  return named
}

describe('the names all together', () => {
  it('are those approved or in review of shades still made, in the order of the sample book', async () => {
    const { rows, report } = await readTogether(owner, line.slug)
    expect(rows.map(({ number, name, state, family }) => [number, name, state, family])).toEqual([
      ['9', 'Dusk 100 %', 'in-review', 'Blues'],
      ['10', 'Kettle Black', 'approved', 'Greens'],
    ])
    expect(report.lengths).toEqual({ least: 10, middle: 12, most: 12 })
  })

  it('tell what stands side by side and sounds alike, and give codes that do not collide', async () => {
    const close = await makeLine(brand)
    const family = await Family.create({
      brandId: brand.id,
      lineId: close.id,
      name: 'Blues',
      position: 0,
    })
    const names = ['Stem the Dyed', 'Deep Water', 'Still Water', 'Old Iron']
    const shades = await makeShades(close, 5)
    await Shade.update({ familyId: family.id }, { where: { lineId: close.id } })
    for (const [at, text] of names.entries())
      await makeIdea(close, shades[at]!, { text, state: at % 2 ? 'approved' : 'in-review' })
    // Nobody looks for the shade any more.
    await makeIdea(close, shades[4]!, { text: 'Dark Water', state: 'approved' })
    await shades[4]!.update({ status: 'retired' })

    const { rows, report } = await readTogether(owner, close.slug)
    expect(rows.map(({ name }) => name)).toEqual(names)
    expect(new Set(rows.map(({ code }) => code)).size).toBe(4)
    expect(rows[0]!.source).toBe('stem the tide')
    expect(report.wordplay.share).toBe(0.25)
    expect(report.findings.some(({ what }) => /side by side and share “water”/.test(what))).toBe(
      true,
    )
    expect(JSON.stringify(report)).not.toContain('Dark Water')
  })

  it('take as many queries for 40 names as for 4', async () => {
    const [few, many] = [await makeNamed(4), await makeNamed(40)]
    const [forFew, forMany] = [
      await countQueries(() => readTogether(owner, few.slug)),
      await countQueries(() => readTogether(owner, many.slug)),
    ]
    expect(forFew.queries).toBeGreaterThan(0)
    expect(forMany.queries).toBe(forFew.queries)
  })
})
