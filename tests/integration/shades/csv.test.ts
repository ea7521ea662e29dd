import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, InvalidError } from '@/lib/errors'
import { guessMapping } from '@/lib/shades/csv'
import { parseSheet } from '@/lib/shades/csv-text'
import { exportShades } from '@/lib/shades/export-shades'
import { importShades } from '@/lib/shades/import-shades'
import { previewImport } from '@/lib/shades/preview-import'
import type { ReadingTerms } from '@/lib/shades/constants'
import { NAME_LIMITS } from '@/lib/names/constants'
import { NameIdea, sequelize, Shade, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShade } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let owner: Actor
let line: Line
beforeAll(async () => {
  owner = await makeActor(await makeBrand())
})
beforeEach(async () => {
  line = await makeLine({ id: owner.brandId })
})

const file = (text: string, terms: ReadingTerms | null = null) => ({
  lineSlug: line.slug,
  text,
  terms,
  mapping: guessMapping(parseSheet(text).header),
})
const save = async (text: string, terms: ReadingTerms | null = null) =>
  importShades(owner, {
    ...file(text, terms),
    shadesRevision: (await line.reload()).shadesRevision,
  })
/** What an import makes of a line's shades: all but the ids, the line and the times. */
const rowsOf = async (of: Line) => {
  const attributes = { exclude: ['id', 'lineId', 'familyId', 'createdAt', 'updatedAt'] }
  const order = ['position', 'number']
  return Shade.findAll({ attributes, where: { lineId: of.id }, order, raw: true })
}

/** The drafts of a line with the numbers of their shades, in their order. */
const draftsOf = async (of: Line) => {
  const [ideas, shades] = await Promise.all([
    NameIdea.findAll({ where: { lineId: of.id, state: 'draft' } }),
    Shade.findAll({ where: { lineId: of.id } }),
  ])
  const numbers = new Map(shades.map(({ id, number }) => [id, number]))
  return ideas.map(({ shadeId, text }) => [numbers.get(shadeId!), text]).sort()
}

const HEAD = 'number,name,status,L,a,b,illuminant,observer,hex,order\r\n'

describe('a preview', () => {
  it('says what each row would do, and saves nothing', async () => {
    await makeShade(line, { number: '1', name: 'Moss', status: 'approved' })
    await makeShade(line, { number: '2', name: 'Fern', position: 1 })
    const text = `${HEAD}1,Moss,approved,54.2,-12,8.1,D65,10,,1\r\n2,Bracken,,60,-12,8.1,D65,10,,2\r\n3,,,,,,,,#123456,\r\n4,,,x,0,0,D65,10,,\r\n`
    const preview = await previewImport(owner, { ...file(text), mapping: null })
    expect(preview.counts).toEqual({ new: 1, changed: 1, unchanged: 1, bad: 1 })
    expect(preview.rows.map(({ outcome }) => outcome)).toEqual([
      'unchanged',
      'changed',
      'new',
      'bad',
    ])
    expect(preview.rows[1]?.name).toBe('Fern')
    expect(preview.rows[1]?.changes).toEqual([
      'colour: L 54.20, a −12.00, b 8.10 (D65, 10°) → L 60.00, a −12.00, b 8.10 (D65, 10°)',
      '“Bracken” as a draft of its name',
    ])
    expect(preview.rows[3]?.errors).toEqual(['Row 5, L: “x” is not a number: give L'])
    expect(parseSheet(preview.badCsv!).rows).toHaveLength(1)
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(2)
  })

  it('asks for light and observer when the file does not say them', async () => {
    const text = 'number;L;a;b\n1;54,2;-12;8,1\n'
    const asked = await previewImport(owner, { ...file(text), mapping: null })
    expect(asked.problems).toEqual([
      'The file does not say under which light and observer L, a and b were read: choose.',
    ])
    expect(asked.rows).toEqual([])
    const chosen = await previewImport(owner, file(text, 'D65/2'))
    expect(chosen.problems).toEqual([])
    expect(chosen.rows[0]?.color?.words).toBe('L 54.20, a −12.00, b 8.10 (D65, 2°)')
  })
})

describe('an import', () => {
  it('saves the good rows and leaves the bad', async () => {
    const text = `${HEAD}1,"Dry Stone,\r\nWet Day",,54.2,-12,8.1,D65,10,,\r\n2,,,x,0,0,D65,10,,\r\n`
    await expect(save(text)).resolves.toEqual({ new: 1, changed: 0, unchanged: 0, bad: 1 })
    expect(await rowsOf(line)).toMatchObject([
      { number: '1', name: null, status: 'target', position: 0, version: 1 },
    ])
    expect(await draftsOf(line)).toEqual([['1', 'Dry Stone, Wet Day']])
  })

  it('confirmed twice is the same as once', async () => {
    const text = 'number,hex\n1,#111111\n2,#222222\n'
    const { shadesRevision } = line
    const request = { ...file(text), shadesRevision }
    await expect(importShades(owner, request)).resolves.toMatchObject({ new: 2 })
    const rows = await rowsOf(line)
    await expect(importShades(owner, request)).resolves.toMatchObject({ new: 0, unchanged: 2 })
    expect(await rowsOf(line)).toEqual(rows)
    expect((await line.reload()).shadesRevision).toBe(shadesRevision + 1)
  })

  it('confirmed ten times at once is the same as once', async () => {
    const request = { ...file('number,hex\n1,#111111\n2,#222222\n'), shadesRevision: 1 }
    await Promise.all(Array.from({ length: 10 }, () => importShades(owner, request)))
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(2)
  })

  it('raises the version of what it changes', async () => {
    const shade = await makeShade(line, { number: 'q1', name: 'Moss' })
    await save('number,status\nQ1,dipped\n')
    await expect(shade.reload()).resolves.toMatchObject({
      number: 'Q1',
      name: 'Moss',
      status: 'dipped',
      version: 2,
    })
  })

  it('makes drafts of names and leaves the shades to be called what they are', async () => {
    const named = await makeShade(line, { number: '1' })
    await makeIdea(line, named, { text: 'Moss', state: 'approved' })
    const bare = await makeShade(line, { number: '2', position: 1 })
    await makeIdea(line, bare, { text: 'Heather', state: 'put-by' })
    const before = [await named.reload(), await bare.reload()].map(({ version }) => version)
    const text = 'number,name\n1,Fern\n2,Bracken\n'
    await expect(save(text)).resolves.toMatchObject({ changed: 2 })
    expect(await draftsOf(line)).toEqual([
      ['1', 'Fern'],
      ['2', 'Bracken'],
    ])
    expect((await named.reload()).name).toBe('Moss')
    expect((await bare.reload()).name).toBeNull()
    // Who has the form of one of them open is not disturbed.
    expect([named, bare].map(({ version }) => version)).toEqual(before)
    await expect(save(text)).resolves.toMatchObject({ changed: 0, unchanged: 2 })
    await expect(save('number,name\n1,\n2,Heather\n')).resolves.toMatchObject({ unchanged: 2 })
    expect(await draftsOf(line)).toHaveLength(2)
    expect((await named.reload()).name).toBe('Moss')
  })

  it('brings no draft once the line holds as many ideas as it may, and then nothing at all', async () => {
    const shade = await makeShade(line, { number: '1' })
    await NameIdea.bulkCreate(
      Array.from({ length: NAME_LIMITS.perLine }, (_, at) => ({
        brandId: line.brandId,
        lineId: line.id,
        text: `Idea ${at}`,
        state: 'draft' as const,
        authorId: null,
        wordedById: null,
      })),
    )
    await expect(save('number,name,status\n1,Fern,dipped\n')).rejects.toThrow(ConflictError)
    expect((await shade.reload()).status).toBe('target')
  })

  it('is refused whole when the line changed since the preview', async () => {
    const { shadesRevision } = await previewImport(owner, file('number,hex\n1,#111111\n'))
    await save('number,hex\n2,#222222\n')
    await expect(
      importShades(owner, { ...file('number,hex\n1,#111111\n'), shadesRevision }),
    ).rejects.toThrow(ConflictError)
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(1)
  })

  it('is refused without its terms, whatever the page did', async () => {
    await expect(save('number,L,a,b\n1,54.2,-12,8.1\n')).rejects.toThrow(InvalidError)
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(0)
  })

  it('gives a number back to a new shade after its first was deleted', async () => {
    await (await makeShade(line, { number: '1' })).destroy()
    await expect(save('number,hex\n1,#111111\n')).resolves.toMatchObject({ new: 1 })
  })

  it('of 5,000 rows takes a few queries, and so does its preview', async () => {
    const rows = Array.from(
      { length: 5_000 },
      (_, at) =>
        `N${at},Name ${at},dipped,${(at % 1000) / 10},${(at % 201) - 100},${(at % 173) - 86},D65,10,,${at + 1}`,
    )
    const text = HEAD + rows.join('\r\n')
    const started = performance.now()
    const previewed = await countQueries(() => previewImport(owner, file(text)))
    const seen = performance.now()
    const saved = await countQueries(() => save(text))
    const stored = performance.now()
    const again = await countQueries(() => save(text))
    console.log(
      `5,000 rows: preview ${Math.round(seen - started)} ms, import ${Math.round(stored - seen)} ms, again ${Math.round(performance.now() - stored)} ms`,
    )
    expect(previewed.answer.counts).toEqual({ new: 5_000, changed: 0, unchanged: 0, bad: 0 })
    expect(previewed.queries).toBe(3)
    expect(saved.answer.new).toBe(5_000)
    expect(saved.queries).toBeLessThanOrEqual(32)
    expect(again.answer.unchanged).toBe(5_000)
    await expect(save('number,hex\nX,#111111\n')).rejects.toThrow(/at most 5,000/)
  })
})

describe('an export', () => {
  const SHADES = [
    { number: '1', name: 'Moss', labL: 1 / 3, labA: -1e-7, labB: 149.99999999999997 },
    { number: "'=2", name: '=SUM(A1)' },
    { number: '+3', name: '"Dry Stone", wet; day' },
    { number: '-4', name: null, observer: 2 as const },
    { number: '@5', name: "'", status: 'retired' as const },
    {
      number: 'é6',
      name: '中 ß',
      hex: '#7a8b4f',
      labL: 55,
      labA: -15,
      labB: 30,
      observer: 2 as const,
    },
  ]

  beforeEach(async () => {
    for (const [at, values] of SHADES.entries()) {
      await makeShade(line, { ...values, position: at * 3 })
    }
  })

  it('imports again unchanged', async () => {
    const { text } = await exportShades(owner, line.slug)
    await expect(save(text)).resolves.toEqual({ new: 0, changed: 0, unchanged: 6, bad: 0 })
  })

  it('makes the same shades in another line, with drafts of their names', async () => {
    const { text } = await exportShades(owner, line.slug)
    const first = line
    // A shade entered by hex is its hex: the factory's Lab beside it is not what a hex gives.
    await Shade.destroy({ where: { lineId: first.id, number: 'é6' }, force: true })
    const kept = await rowsOf(first)
    line = await makeLine({ id: owner.brandId })
    await save(text)
    const copied = await rowsOf(line)
    expect(copied.filter(({ number }) => number !== 'é6')).toEqual(
      kept.map((row) => ({ ...row, name: null })),
    )
    expect(copied.find(({ number }) => number === 'é6')).toMatchObject({ hex: '#7a8b4f' })
    expect(await draftsOf(line)).toEqual(
      SHADES.flatMap(({ number, name }) => (name ? [[number, name]] : [])).sort(),
    )
    // Once they are approved, it exports the same again.
    for (const { number, name } of SHADES)
      await Shade.update({ name }, { where: { lineId: line.id, number } })
    await expect(exportShades(owner, line.slug)).resolves.toMatchObject({ text })
  })

  it('is UTF-8 with a mark that spreadsheets know, and no cell of it is a formula', async () => {
    const { text, fileName } = await exportShades(owner, line.slug)
    expect(fileName).toBe(`${line.slug}-shades.csv`)
    expect(
      text.startsWith('\uFEFFnumber,name,status,L,a,b,illuminant,observer,hex,order\r\n'),
    ).toBe(true)
    // Only the readings, columns 4 to 6, may begin with a sign.
    for (const record of text.trim().split('\r\n')) {
      expect(record).not.toMatch(/^"?[=+\-@]|^[^,]*,"?[=+\-@]/)
    }
  })
})

describe('the database', () => {
  it('counts queries where they are made', async () => {
    const { queries } = await countQueries(() => sequelize().query('SELECT 1'))
    expect(queries).toBe(1)
  })
})
