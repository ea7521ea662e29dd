import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { checkOne } from '@/lib/names/check-one'
import { getNamingBench } from '@/lib/names/get-naming-bench'
import { proposeNames } from '@/lib/names/propose-names'
import { checkNameSchema } from '@/lib/names/schema'
import { NameIdea, NamingSettings, type Line, type Shade } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

import { countQueries } from '../setup/count-queries'

let owner: Actor
let marketer: Actor
let dyer: Actor
let line: Line
let shades: Shade[]
let theirs: { actor: Actor; line: Line; shade: Shade }

beforeAll(async () => {
  const [ours, other] = [await makeBrand('Ours'), await makeBrand('Theirs')]
  owner = await makeActor(ours)
  marketer = await makeActor(ours, 'marketer')
  dyer = await makeActor(ours, 'dyer')
  line = await makeLine({ id: ours.id })
  shades = await makeShades(line, 4)
  const theirLine = await makeLine({ id: other.id })
  const [shade] = await makeShades(theirLine, 1)
  theirs = { actor: await makeActor(other), line: theirLine, shade: shade! }
})

const ask = (text: string, shade: Shade | null, ideaId: string | null = null) => ({
  lineSlug: line.slug,
  text,
  shadeId: shade?.id ?? null,
  ideaId,
})

describe('a name that is being written', () => {
  it('is checked against the names of other shades, not against those of its own', async () => {
    const idea = await makeIdea(line, shades[0]!, { text: 'Thyme Will Tell' })
    const same = (checked: Awaited<ReturnType<typeof checkOne>>) =>
      checked.findings.filter(({ check }) => check === 'same')
    expect(same(await checkOne(marketer, ask('Thyme will tell', shades[1]!)))).not.toEqual([])
    expect(same(await checkOne(marketer, ask('Thyme will tell', shades[0]!)))).toEqual([])
    expect(same(await checkOne(marketer, ask('Thyme will tell', null)))).not.toEqual([])
    expect(same(await checkOne(marketer, ask('Thyme will tell', null, idea.id)))).toEqual([])
  })

  it('comes back with how it is heard, what it plays on, and its ball band', async () => {
    const checked = await checkOne(marketer, ask('Olive and let live', shades[2]!))
    expect(checked).toMatchObject({
      isGuess: false,
      playsOn: { source: 'live and let live', from: 'live', to: 'olive' },
      label: { fits: true, missing: [] },
    })
    expect(checked.heardAs).toMatch(/^AH-luhv uhnd let /)
  })

  it('asks the database as often for 2,000 earlier names as for none', async () => {
    const alone = await countQueries(() => checkOne(owner, ask('Stem the dyed', shades[0]!)))
    await NameIdea.bulkCreate(
      Array.from({ length: 2_000 }, (_, at) => ({
        brandId: line.brandId,
        lineId: line.id,
        shadeId: null,
        text: `Earlier name ${at}`,
        state: 'draft' as const,
        authorId: null,
        wordedById: null,
      })),
    )
    const crowded = await countQueries(() => checkOne(owner, ask('Stem the dyed', shades[0]!)))
    await NameIdea.destroy({ where: { lineId: line.id, shadeId: null }, force: true })
    expect(crowded.queries).toBe(alone.queries)
    expect(crowded.queries).toBeLessThanOrEqual(6)
  })

  it('is parsed as it would be kept: one line, printable, not empty', () => {
    const parse = (text: string) => checkNameSchema.safeParse(ask(text, null))
    expect(parse('  Thyme \n will   tell ').data?.text).toBe('Thyme will tell')
    expect(parse('   ').success).toBe(false)
    expect(parse('Thyme\u0000').success).toBe(false)
  })
})

describe('names made up for a shade', () => {
  const asked = (shade: Shade, themes: string[] = []) => ({
    lineSlug: line.slug,
    shadeId: shade.id,
    themes,
  })

  it('leave out what the line has as an idea already', async () => {
    const before = await proposeNames(marketer, asked(shades[3]!))
    const [play, told] = [before.plays[0]!, before.story[0]!]
    const ideas = [
      await makeIdea(line, shades[3]!, { text: play.name }),
      await makeIdea(line, null, { text: told.name.toUpperCase() }),
    ]
    const after = await proposeNames(marketer, asked(shades[3]!))
    for (const idea of ideas) await idea.destroy({ force: true })
    expect(after.plays.map(({ name }) => name)).not.toContain(play.name)
    expect(after.story.map(({ name }) => name)).not.toContain(told.name)
  })

  it('take up the theme words that are given', async () => {
    const { story } = await proposeNames(marketer, asked(shades[3]!, ['harbour']))
    expect(story.some(({ name }) => /harbour/i.test(name))).toBe(true)
    const plain = await proposeNames(marketer, asked(shades[3]!))
    expect(plain.story.some(({ name }) => /harbour/i.test(name))).toBe(false)
  })

  it('say which the ball band has no room for', async () => {
    await NamingSettings.create({
      brandId: line.brandId,
      lineId: line.id,
      labelWidth: 30,
      labelSize: 15,
      labelLines: 1,
    })
    const { plays } = await proposeNames(marketer, asked(shades[3]!))
    await NamingSettings.destroy({ where: { lineId: line.id } })
    const long = plays.filter(({ name }) => name.length > 25)
    expect(long.length).toBeGreaterThan(0)
    expect(long.every(({ fits }) => !fits)).toBe(true)
    expect(plays.some(({ fits }) => fits)).toBe(true)
  })
})

describe('the naming bench', () => {
  it('has the ideas of its shade, what is decided first and what is put by last', async () => {
    const shade = shades[1]!
    const put = await makeIdea(line, shade, { text: 'Put by', state: 'put-by' })
    const draft = await makeIdea(line, shade, { text: 'A draft', authorId: marketer.personId })
    const reviewed = await makeIdea(line, shade, { text: 'In review', state: 'in-review' })
    const bench = await getNamingBench(marketer, line.slug, shade.id)
    expect(bench.ideas.map(({ id }) => id)).toEqual([reviewed.id, draft.id, put.id])
    expect(bench.ideas[1]).toMatchObject({ isOwn: true, canEdit: true, state: 'draft' })
  })

  it('leads to the shades beside it, and on to the next without a name', async () => {
    const approved = await makeIdea(line, shades[3]!, { text: 'Done', state: 'approved' })
    const bench = await getNamingBench(owner, line.slug, shades[2]!.id)
    expect(bench.before?.id).toBe(shades[1]!.id)
    expect(bench.after).toEqual({ id: shades[3]!.id, label: 'Done' })
    // The last one has a name, so it begins again.
    expect(bench.nextUnnamed?.id).toBe(shades[0]!.id)
    expect(bench).toMatchObject({ total: 4, named: 1 })
    await shades[3]!.update({ name: null })
    await approved.destroy({ force: true })
  })

  it('asks the database as often for many ideas as for a few', async () => {
    const open = () => getNamingBench(owner, line.slug, shades[1]!.id)
    const few = await countQueries(open)
    for (let at = 0; at < 12; at++) await makeIdea(line, shades[1]!, { text: `More ${at}` })
    expect((await countQueries(open)).queries).toBe(few.queries)
  })
})

describe('who may use the bench', () => {
  const uses: [string, (actor: Actor, lineSlug: string, shadeId: string) => Promise<unknown>][] = [
    ['opens it', getNamingBench],
    [
      'checks a name',
      (actor, lineSlug, shadeId) =>
        checkOne(actor, { lineSlug, shadeId, text: 'Thyme', ideaId: null }),
    ],
    [
      'has names made up',
      (actor, lineSlug, shadeId) => proposeNames(actor, { lineSlug, shadeId, themes: [] }),
    ],
  ]

  it.each(uses)('a dyer is forbidden: %s', async (_, use) => {
    await expect(use(dyer, line.slug, shades[0]!.id)).rejects.toThrow(ForbiddenError)
  })

  it.each(uses)('another brand finds nothing: %s', async (_, use) => {
    await expect(use(theirs.actor, line.slug, shades[0]!.id)).rejects.toThrow(NotFoundError)
    await expect(use(owner, line.slug, theirs.shade.id)).rejects.toThrow(NotFoundError)
    await expect(use(owner, theirs.line.slug, theirs.shade.id)).rejects.toThrow(NotFoundError)
  })

  it.each(uses)('a shade of another line of the brand is not found: %s', async (_, use) => {
    const sister = await makeLine({ id: line.brandId })
    const [shade] = await makeShades(sister, 1)
    await makeIdea(sister, shade!, { text: 'Sister', state: 'approved' })
    await expect(use(owner, line.slug, shade!.id)).rejects.toThrow(NotFoundError)
  })

  it('names of another brand are nobody’s business: they count for no check', async () => {
    await makeIdea(theirs.line, theirs.shade, { text: 'Quern and Bear It', state: 'approved' })
    const { findings } = await checkOne(owner, ask('Quern and bear it', shades[0]!))
    expect(findings.filter(({ check }) => check === 'same' || check === 'sound')).toEqual([])
  })
})
