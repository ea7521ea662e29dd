import { beforeEach, describe, expect, it, test } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { hexToLab } from '@/lib/color/srgb'
import { addIdeas } from '@/lib/names/add-ideas'
import { NAME_LIMITS } from '@/lib/names/constants'
import { dealIdeas } from '@/lib/names/deal-ideas'
import { listHeap, listNameable } from '@/lib/names/list-heap'
import { moveIdeas } from '@/lib/names/move-ideas'
import { placeIdeas } from '@/lib/names/place-ideas'
import { previewIdeas } from '@/lib/names/preview-ideas'
import { heapAddressSchema } from '@/lib/names/schema'
import { Family, NameIdea, Shade, type Line } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShade } from '@/tests/factories/shade'

const MOSS = '#6f7f36'
const PLUM = '#5f2f57'

let actors: Awaited<ReturnType<typeof makeActors>>
let stranger: Actor
let line: Line
let lineSlug: string

const shadeOf = (number: string, hex: string, values: Parameters<typeof makeShade>[1] = {}) => {
  const [labL, labA, labB] = hexToLab(hex)
  return makeShade(line, { number, labL, labA, labB, ...values })
}
const heap = (address: object = {}) =>
  listHeap(actors.marketer, lineSlug, heapAddressSchema.parse(address))
const textsOf = async (address: object = {}) => (await heap(address)).ideas.map(({ text }) => text)

beforeEach(async () => {
  const brand = await makeBrand('Ours')
  actors = await makeActors(brand)
  stranger = (await makeActors(await makeBrand('Theirs'))).owner
  line = await makeLine({ id: brand.id })
  lineSlug = line.slug
})

test('who may not see the line, or is of the dye house, gets nothing of its heap', async () => {
  const read = [
    (actor: Actor) => listHeap(actor, lineSlug, heapAddressSchema.parse({})),
    (actor: Actor) => listNameable(actor, { lineSlug }),
    (actor: Actor) => previewIdeas(actor, { lineSlug, text: 'Plum Job', kind: 'lines' }),
    (actor: Actor) => dealIdeas(actor, { lineSlug, without: [] }),
  ]
  for (const as of read) {
    await expect(as(stranger)).rejects.toMatchObject({ code: 'not-found' })
    await expect(as(actors.dyer)).rejects.toMatchObject({ code: 'forbidden' })
    for (const actor of [actors.owner, actors.marketer, actors.designer])
      await expect(as(actor)).resolves.toBeTruthy()
  }
})

describe('a pile of names', () => {
  const look = (text: string, kind: 'csv' | 'lines' = 'csv') =>
    previewIdeas(actors.marketer, { lineSlug, text, kind })

  it('is told by row what would become of it, and nothing is saved', async () => {
    const shade = await shadeOf('14a', MOSS)
    await makeIdea(line, shade, { text: 'Moss Likely', state: 'approved' })
    await makeIdea(line, null, { text: 'Plum Job', state: 'put-by' })
    const held = await NameIdea.count({ where: { lineId: line.id } })
    const preview = await look(
      'Idea,Why,Shade\nSage Coach,old roads,14A\nmóss  likely,,\nPlum Job!,,\nSage coach,,\n,,14a\nFar Out,,99\n',
    )
    expect(preview.counts).toEqual({ new: 1, there: 3, bad: 2 })
    expect(preview.columns).toEqual(['name from “Idea”', 'note from “Why”', 'shade from “Shade”'])
    expect(
      preview.rows.map(({ row, outcome, where, errors }) => [row, outcome, where, errors]),
    ).toEqual([
      [2, 'new', null, []],
      [3, 'there', 'No. 14a, approved', []],
      [4, 'there', 'the heap, put by', []],
      [5, 'there', 'row 2', []],
      [6, 'bad', null, ['Row 6, name: write a name']],
      [7, 'bad', null, ['Row 7, shade: no shade of this line is No. 99']],
    ])
    expect(preview.rows[0]).toMatchObject({
      text: 'Sage Coach',
      note: 'old roads',
      shade: { id: shade.id, label: 'Moss Likely' },
    })
    expect(preview.badCsv).toContain('Far Out,,99,"Row 7, shade: no shade')
    expect(await NameIdea.count({ where: { lineId: line.id } })).toBe(held)
  })

  it('knows no names of another brand’s line, nor deleted ones', async () => {
    const theirs = await makeLine({ id: stranger.brandId })
    await makeIdea(theirs, null, { text: 'Plum Job' })
    await (await makeIdea(line, null, { text: 'Sage Coach' })).destroy()
    expect((await look('Plum Job\nSage Coach', 'lines')).counts).toEqual({
      new: 2,
      there: 0,
      bad: 0,
    })
  })

  it('is added as it was looked over, in its order, once', async () => {
    const { rows } = await look('Plum Job\n- Moss Likely\n', 'lines')
    const input = {
      lineSlug,
      ideas: rows.map(({ text, note }) => ({ text, note, shadeId: null })),
      requestKey: crypto.randomUUID(),
    }
    await addIdeas(actors.marketer, input)
    await addIdeas(actors.marketer, input)
    expect(await textsOf()).toEqual(['Plum Job', 'Moss Likely'])
  })

  it('of the most rows is looked over while one waits', async () => {
    const ideas = Array.from({ length: 2_000 }, (_, at) => ({
      brandId: line.brandId,
      lineId: line.id,
      text: `Old name ${at}`,
      state: 'draft' as const,
      authorId: null,
      wordedById: null,
    }))
    await NameIdea.bulkCreate(ideas)
    const text = Array.from({ length: NAME_LIMITS.atOnce }, (_, at) => `New name ${at}`).join('\n')
    const began = performance.now()
    expect((await look(text, 'lines')).counts.new).toBe(NAME_LIMITS.atOnce)
    expect(performance.now() - began).toBeLessThan(3_000)
  })
})

describe('the heap', () => {
  it('holds what lies on no shade, newest first, with what calls a colour to mind', async () => {
    const shade = await shadeOf('1', MOSS)
    await makeIdea(line, shade, { text: 'On a shade' })
    await makeIdea(line, null, { text: 'Put by', state: 'put-by' })
    await makeIdea(line, null, {
      text: 'Nearly There',
      note: 'almost',
      authorId: actors.marketer.personId,
    })
    await makeIdea(line, null, { text: 'Plum Job', state: 'returned' })
    const page = await heap()
    expect(page.ideas.map(({ text, hints }) => [text, hints])).toEqual([
      ['Plum Job', ['plum']],
      ['Nearly There', []],
    ])
    expect(page.ideas[1]!.author?.name).toBe('A marketer')
    expect(page).toMatchObject({ total: 2, counts: { loose: 2, putBy: 1 } })
  })

  it('is searched by name and thought, and by nothing a pattern would match', async () => {
    await makeIdea(line, null, { text: 'Plum Job', note: 'the best there is' })
    await makeIdea(line, null, { text: 'Half%way' })
    expect(await textsOf({ q: 'BEST' })).toEqual(['Plum Job'])
    expect(await textsOf({ q: '%' })).toEqual(['Half%way'])
    expect(await textsOf({ q: 'nowhere' })).toEqual([])
  })

  it('shows what was put by with the shade it was for, and lets it be taken up', async () => {
    const shade = await shadeOf('7', MOSS)
    const idea = await makeIdea(line, shade, {
      text: 'Moss Likely',
      authorId: actors.marketer.personId,
    })
    await moveIdeas(actors.marketer, 'put-by', { lineSlug, ideaIds: [idea.id] })
    const { ideas } = await heap({ put: 'by' })
    expect(ideas).toMatchObject([{ text: 'Moss Likely', shade: { label: 'No. 7' } }])
    expect(ideas[0]!.moves).toContain('take-up')
    expect(await textsOf()).toEqual([])
  })

  it('comes page by page', async () => {
    const ideas = Array.from({ length: NAME_LIMITS.heapPage + 1 }, (_, at) => ({
      text: `Name ${at}`,
      note: '',
      shadeId: null,
    }))
    await addIdeas(actors.marketer, { lineSlug, ideas, requestKey: crypto.randomUUID() })
    const first = await textsOf()
    const second = await textsOf({ page: '2' })
    expect(first).toHaveLength(NAME_LIMITS.heapPage)
    expect(new Set([...first, ...second]).size).toBe(NAME_LIMITS.heapPage + 1)
  })

  test('names may be laid on every shade but the retired, those without one first', async () => {
    await shadeOf('1', MOSS, { name: 'Moss Likely', position: 0 })
    await shadeOf('2', MOSS, { position: 1 })
    await shadeOf('3', MOSS, { status: 'retired', position: 2 })
    const { waiting, named } = await listNameable(actors.designer, { lineSlug })
    expect([waiting, named].map((shades) => shades.map(({ number }) => number))).toEqual([
      ['2'],
      ['1'],
    ])
  })
})

describe('dealing the heap', () => {
  const deal = (without: string[] = []) => dealIdeas(actors.marketer, { lineSlug, without })
  const dealtOf = ({ families }: Awaited<ReturnType<typeof deal>>) =>
    families.flatMap(({ shades }) =>
      shades.flatMap(({ number, dealt }) => (dealt ? [[number, dealt.text]] : [])),
    )

  it('gives ideas to the shades they suit that wait for a name, and moves nothing', async () => {
    await shadeOf('1', MOSS)
    await shadeOf('2', PLUM)
    await shadeOf('3', PLUM, { status: 'retired' })
    await makeIdea(line, await shadeOf('4', PLUM), { text: 'Fig Leaf', state: 'in-review' })
    await makeIdea(line, await shadeOf('5', PLUM), { text: 'Damson Fly', state: 'approved' })
    for (const text of ['Plum Job', 'Moss Likely', 'Nearly There', 'Snow Way'])
      await makeIdea(line, null, { text })
    await makeIdea(line, null, { text: 'Moss Have It', state: 'put-by' })
    const view = await deal()
    expect(dealtOf(view).sort()).toEqual([
      ['1', 'Moss Likely'],
      ['2', 'Plum Job'],
    ])
    expect(view).toMatchObject({ ideas: 4, waiting: 2, beyond: { ideas: 0, shades: 0 } })
    expect(view.left.map(({ text, why }) => [text, why]).sort()).toEqual([
      ['Nearly There', 'no colour'],
      ['Snow Way', 'no shade near'],
    ])
    expect(await NameIdea.count({ where: { lineId: line.id, shadeId: null } })).toBe(5)
  })

  it('shows the families in their order, light to dark, the named shades among them', async () => {
    const inFamily = { brandId: line.brandId, lineId: line.id }
    const greens = await Family.create({ ...inFamily, name: 'Greens', position: 1 })
    const plums = await Family.create({ ...inFamily, name: 'Plums', position: 0 })
    const put = (shade: Shade, family: Family) => shade.update({ familyId: family.id })
    await put(await shadeOf('1', '#3f4a1c'), greens)
    await put(await shadeOf('2', '#8f9f56', { name: 'Pear Shaped' }), greens)
    await put(await shadeOf('3', PLUM), plums)
    for (const text of ['Plum Job', 'Moss Likely']) await makeIdea(line, null, { text })
    const { families } = await deal()
    expect(
      families.map(({ name, shades }) => [
        name,
        shades.map(({ number, waits }) => [number, waits]),
      ]),
    ).toEqual([
      ['Plums', [['3', true]]],
      [
        'Greens',
        [
          ['2', false],
          ['1', true],
        ],
      ],
    ])
  })

  it('keeps a name from standing beside one like it, approved or in review', async () => {
    const inFamily = { brandId: line.brandId, lineId: line.id }
    const { id: familyId } = await Family.create({ ...inFamily, name: 'Greens', position: 0 })
    const named = await shadeOf('1', '#7f8f46')
    await named.update({ familyId })
    await (await shadeOf('2', MOSS)).update({ familyId })
    await makeIdea(line, named, { text: 'Moss Have It', state: 'in-review' })
    for (const text of ['Moss Likely', 'Fern Again']) await makeIdea(line, null, { text })
    expect(dealtOf(await deal())).toEqual([['2', 'Fern Again']])
  })

  it('finds another for the shade of a name that was left', async () => {
    await shadeOf('2', PLUM)
    const left = await makeIdea(line, null, { text: 'Plum Job' })
    await makeIdea(line, null, { text: 'Damson Fly' })
    const first = dealtOf(await deal())
    const [, text] = first[0]!
    const { id } = (await NameIdea.findOne({ where: { lineId: line.id, text: text! } }))!
    const [second] = dealtOf(await deal([id]))
    expect(second).toEqual(['2', text === left.text ? 'Damson Fly' : 'Plum Job'])
  })

  it('is accepted by laying the ideas on their shades, and taken back', async () => {
    await shadeOf('1', MOSS)
    await makeIdea(line, null, { text: 'Moss Likely' })
    const { families } = await deal()
    const placements = families.flatMap(({ shades }) =>
      shades.flatMap(({ id, dealt }) => (dealt ? [{ ideaId: dealt.ideaId, shadeId: id }] : [])),
    )
    const { former } = await placeIdeas(actors.marketer, { lineSlug, placements })
    expect(await textsOf()).toEqual([])
    await placeIdeas(actors.marketer, { lineSlug, placements: former })
    expect(await textsOf()).toEqual(['Moss Likely'])
  })

  it('takes no more at once than it can, and says what waits', async () => {
    const { dealt, dealtShades } = NAME_LIMITS
    await Shade.bulkCreate(
      Array.from({ length: dealtShades + 3 }, (_, at) => ({
        brandId: line.brandId,
        lineId: line.id,
        number: String(at),
        name: null,
        labL: 15 + ((at * 37) % 75),
        labA: ((at * 53) % 90) - 45,
        labB: ((at * 29) % 90) - 45,
        illuminant: 'D65' as const,
        observer: 10 as const,
        hex: null,
        status: 'target' as const,
        position: at,
      })),
    )
    const things = ['Moss', 'Plum', 'Thyme', 'Snow', 'Olive', 'Rust', 'Heather', 'Slate']
    const ideas = Array.from({ length: dealt + 5 }, (_, at) => ({
      text: `${things[at % things.length]} ${'abcdefghij'[at % 10]}${at}`,
      note: '',
      shadeId: null,
    }))
    await addIdeas(actors.marketer, { lineSlug, ideas, requestKey: crypto.randomUUID() })
    const began = performance.now()
    const view = await deal()
    // A third of a second by itself: what it holds up everybody else for.
    expect(performance.now() - began).toBeLessThan(5_000)
    expect(view.beyond).toEqual({ ideas: 5, shades: 3 })
    expect(dealtOf(view).length).toBeGreaterThan(dealtShades / 2)
  })
})
