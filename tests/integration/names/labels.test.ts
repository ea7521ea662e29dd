import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { exportLabels } from '@/lib/names/export-labels'
import { dayOf } from '@/lib/names/freeze'
import { freezeNames } from '@/lib/names/freeze-names'
import { liftFreeze } from '@/lib/names/lift-freeze'
import { listHistory } from '@/lib/names/list-history'
import { listLabels, previewLabels, readLabels } from '@/lib/names/list-labels'
import { decideIdea } from '@/lib/names/move-ideas'
import { saveNamingSettings } from '@/lib/names/save-naming-settings'
import { namingSettingsSchema } from '@/lib/names/schema'
import type { Role } from '@/lib/people/constants'
import type { NameIdea } from '@/models'
import {
  Activity,
  Membership,
  NameReviewer,
  NamingSettings,
  Person,
  type Brand,
  type Line,
  type Shade,
} from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

const DAY = 24 * 60 * 60 * 1000
const dayFromNow = (days: number) => dayOf(new Date(Date.now() + days * DAY))
const TODAY = dayFromNow(0)
const TOMORROW = dayFromNow(1)
const YESTERDAY = dayFromNow(-1)

const SETTINGS = {
  labelWidth: 40,
  labelSize: 12,
  labelLines: 2 as const,
  care: 'Wash by hand.',
  themes: ['harbour'],
  printOn: null as string | null,
  reviewerIds: [] as string[],
}

let brand: Brand
let actors: Record<Role, Actor>
let owner: Actor
let stranger: Actor

beforeAll(async () => {
  brand = await makeBrand('Ours')
  actors = await makeActors(brand)
  owner = actors.owner
  stranger = await makeActor(await makeBrand('Theirs'))
})

/** A line with so many shades, the first of them named as given. */
async function makeNamed(
  names: readonly string[],
  shadeCount = names.length,
): Promise<{ line: Line; shades: Shade[]; ideas: NameIdea[] }> {
  const line = await makeLine(brand)
  const shades = await makeShades(line, shadeCount)
  const ideas = await Promise.all(
    names.map((text, at) => makeIdea(line, shades[at]!, { text, state: 'approved' })),
  )
  return { line, shades, ideas }
}

const save = (line: Line, version: number, values: Partial<typeof SETTINGS> = {}, actor = owner) =>
  saveNamingSettings(actor, { lineSlug: line.slug, version, ...SETTINGS, ...values })

/** The settings as if their print date had been set before it came. */
const letPrintDateCome = (line: Line) =>
  NamingSettings.update({ printOn: YESTERDAY }, { where: { lineId: line.id } })

const reopen = (line: Line, { id, version }: NameIdea) =>
  decideIdea(owner, 'reopen', { lineSlug: line.slug, ideaId: id, version, reason: 'Another.' })

describe('the settings of names', () => {
  it('are made by the first save and raised by the next', async () => {
    const { line } = await makeNamed([])
    const first = await save(line, 0)
    expect(first).toMatchObject({ version: 1, labelWidth: 40, themes: ['harbour'] })
    const second = await save(line, 1, { labelWidth: 44 })
    expect(second).toMatchObject({ version: 2, labelWidth: 44 })
    expect((await readLabels(owner, line.slug)).settings).toMatchObject({
      label: { width: 44, size: 12, lines: 2 },
      care: 'Wash by hand.',
      version: 2,
    })
  })

  it('refuse the second of two first saves at the same moment, and a stale one', async () => {
    const { line } = await makeNamed([])
    const both = await Promise.allSettled([
      save(line, 0, { labelWidth: 41 }),
      save(line, 0, { labelWidth: 42 }),
    ])
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(both.find(({ status }) => status === 'rejected')).toMatchObject({
      reason: { code: 'conflict' },
    })
    expect(await NamingSettings.count({ where: { lineId: line.id } })).toBe(1)
    await expect(save(line, 0)).rejects.toMatchObject({ code: 'conflict' })
    await expect(save(line, 7)).rejects.toMatchObject({ code: 'conflict' })
  })

  it.each(['marketer', 'designer', 'dyer'] as const)('are not for a %s to change', async (role) => {
    const { line } = await makeNamed([])
    const actor = actors[role]
    const lineSlug = line.slug
    await expect(save(line, 0, {}, actor)).rejects.toMatchObject({ code: 'forbidden' })
    await expect(freezeNames(actor, { lineSlug, version: 0 })).rejects.toMatchObject({
      code: 'forbidden',
    })
    await expect(
      liftFreeze(actor, { lineSlug, version: 0, reason: 'Mine.' }),
    ).rejects.toMatchObject({ code: 'forbidden' })
    expect(await NamingSettings.count({ where: { lineId: line.id } })).toBe(0)
  })

  it('take theme words as a form writes them', () => {
    const parsed = namingSettingsSchema.parse({
      ...SETTINGS,
      lineSlug: 'a-line',
      version: 0,
      themes: ' harbour, low  tide ;harbour,, ',
      printOn: '',
    })
    expect(parsed).toMatchObject({ themes: ['harbour', 'low tide'], printOn: null })
  })

  it('appoint marketers and designers of the brand and nobody else', async () => {
    const { line } = await makeNamed([])
    const { marketer, designer } = actors
    const appointed = () =>
      NameReviewer.findAll({ where: { lineId: line.id } }).then((rows) =>
        rows.map(({ personId }) => personId).sort(),
      )
    await save(line, 0, { reviewerIds: [marketer.personId, designer.personId] })
    expect(await appointed()).toEqual([marketer.personId, designer.personId].sort())
    await save(line, 1, { reviewerIds: [designer.personId] })
    expect(await appointed()).toEqual([designer.personId])

    const theirs = await makeActor(await makeBrand(), 'marketer')
    const refused = [actors.dyer, owner, theirs].map(({ personId }) => personId)
    for (const id of [...refused, crypto.randomUUID()]) {
      await expect(save(line, 2, { reviewerIds: [id] }), id).rejects.toMatchObject({
        code: 'invalid',
      })
    }
    expect(await appointed()).toEqual([designer.personId])
    expect((await readLabels(owner, line.slug)).reviewers).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ personId: designer.personId, isReviewer: true }),
        expect.objectContaining({ personId: marketer.personId, isReviewer: false }),
      ]),
    )
  })

  it('leave a record that names the roles of reviewers and no person', async () => {
    const { line } = await makeNamed([])
    await save(line, 0, { reviewerIds: [actors.marketer.personId] })
    await save(line, 1, { reviewerIds: [actors.marketer.personId] })
    const recorded = await Activity.findAll({
      where: { objectId: line.id, action: 'name.settings-changed' },
    })
    expect(recorded).toHaveLength(1)
    expect(recorded[0]!.after).toMatchObject({ appointed: ['marketer'], labelWidth: 40 })
    expect(JSON.stringify(recorded[0])).not.toContain('reviewerIds')
  })

  it('refuse a print date that is past, and take today', async () => {
    const { line } = await makeNamed(['Thyme Will Tell'])
    await expect(save(line, 0, { printOn: YESTERDAY })).rejects.toMatchObject({
      code: 'invalid',
      fieldErrors: { printOn: [expect.any(String)] },
    })
    await save(line, 0, { printOn: TODAY })
    expect((await listLabels(owner, line.slug)).labels[0]!.locked).toBe(true)
  })

  it('keep the print date once it has come, since another would lift the lock', async () => {
    const { line } = await makeNamed([])
    await save(line, 0, { printOn: TOMORROW })
    await letPrintDateCome(line)
    for (const printOn of [null, TOMORROW]) {
      await expect(save(line, 1, { printOn })).rejects.toMatchObject({
        code: 'conflict',
        message: expect.stringContaining('lift the lock first') as string,
        fieldErrors: { printOn: ['Lift the lock first.'] },
      })
    }
    // What does not touch it can still be saved.
    await save(line, 1, { printOn: YESTERDAY, care: 'Dry flat.' })
    const settings = await NamingSettings.findOne({ where: { lineId: line.id } })
    expect(settings).toMatchObject({ printOn: YESTERDAY, care: 'Dry flat.' })
  })

  it('let a print date that has not come be put off, also while names are locked by hand', async () => {
    const { line } = await makeNamed([])
    await save(line, 0, { printOn: TOMORROW })
    await freezeNames(owner, { lineSlug: line.slug, version: 1 })
    await save(line, 2, { printOn: dayFromNow(9) })
    expect((await readLabels(owner, line.slug)).settings).toMatchObject({
      frozen: true,
      printOn: dayFromNow(9),
    })
  })
})

describe('the lock on names', () => {
  it('holds what is approved until it is lifted with a reason', async () => {
    const { line, ideas } = await makeNamed(['Thyme Will Tell'])
    const lineSlug = line.slug
    await freezeNames(owner, { lineSlug, version: 0 })
    await expect(freezeNames(owner, { lineSlug, version: 1 })).rejects.toMatchObject({
      code: 'conflict',
    })
    await expect(reopen(line, ideas[0]!)).rejects.toMatchObject({ code: 'conflict' })
    expect(await readLabels(owner, lineSlug)).toMatchObject({
      lockedSince: TODAY,
      labels: [{ locked: true, canUnlock: true }],
    })
    expect((await listLabels(actors.marketer, lineSlug)).labels[0]!.canUnlock).toBe(false)

    await liftFreeze(owner, { lineSlug, version: 1, reason: 'The printer is late.' })
    await reopen(line, ideas[0]!)
    await expect(
      liftFreeze(owner, { lineSlug, version: 2, reason: 'Again.' }),
    ).rejects.toMatchObject({ code: 'conflict' })
  })

  it('that came with the print date goes with it when it is lifted', async () => {
    const { line, ideas } = await makeNamed(['Olive and Let Live'])
    await save(line, 0, { printOn: TOMORROW })
    await letPrintDateCome(line)
    const { version, frozenAt, printOn } = await liftFreeze(owner, {
      lineSlug: line.slug,
      version: 1,
      reason: 'Another printer.',
    })
    expect({ version, frozenAt, printOn }).toEqual({ version: 2, frozenAt: null, printOn: null })
    await reopen(line, ideas[0]!)
    const record = await Activity.findOne({
      where: { objectId: line.id, action: 'name.freeze-lifted' },
    })
    expect(record).toMatchObject({
      before: { printOn: YESTERDAY },
      after: { reason: 'Another printer.' },
    })
  })

  it('is lifted from one name alone, and holds that one again when all are locked anew', async () => {
    const { line, ideas } = await makeNamed(['Thyme Will Tell', 'Olive and Let Live'])
    const lineSlug = line.slug
    await freezeNames(owner, { lineSlug, version: 0 })
    const [first] = ideas as [NameIdea]
    await decideIdea(owner, 'unlock', {
      lineSlug,
      ideaId: first.id,
      version: first.version,
      reason: 'A slip of the pen.',
    })
    expect((await listLabels(owner, lineSlug)).labels).toMatchObject([
      { locked: false, unlocked: true, canUnlock: false },
      { locked: true, unlocked: false, canUnlock: true },
    ])
    await liftFreeze(owner, { lineSlug, version: 1, reason: 'All of them after all.' })
    await freezeNames(owner, { lineSlug, version: 2 })
    expect((await listLabels(owner, lineSlug)).labels.map(({ locked }) => locked)).toEqual([
      true,
      true,
    ])
  })

  it('is set by nobody who has not seen the settings as they are', async () => {
    const { line } = await makeNamed([])
    await save(line, 0)
    const seen = { lineSlug: line.slug, version: 0 }
    await expect(freezeNames(owner, seen)).rejects.toMatchObject({ code: 'conflict' })
    await freezeNames(owner, { ...seen, version: 1 })
    await expect(
      liftFreeze(owner, { ...seen, version: 1, reason: 'Seen before it was locked.' }),
    ).rejects.toMatchObject({ code: 'conflict' })
  })
})

describe('the labels of a line', () => {
  it('are those of approved names in the order of the shades; others are named as missing', async () => {
    const { line, shades } = await makeNamed(['Thyme Will Tell', 'Stem the Dyed'], 5)
    await makeIdea(line, shades[2]!, { text: 'Moss Have Been Love', state: 'draft' })
    await makeIdea(line, shades[2]!, { text: 'Fern for the Better', state: 'in-review' })
    await makeIdea(line, shades[3]!, { text: 'Put Away', state: 'put-by' })
    await shades[4]!.update({ status: 'retired' })
    const { labels, unnamed } = await listLabels(actors.designer, line.slug)
    expect(labels.map(({ number, name }) => [number, name])).toEqual([
      ['S1', 'Thyme Will Tell'],
      ['S2', 'Stem the Dyed'],
    ])
    expect(unnamed.map(({ number, state }) => [number, state])).toEqual([
      ['S3', 'in-review'],
      ['S4', null],
    ])
  })

  it('are shown as a setting would have them, the widest name first', async () => {
    const { line, shades } = await makeNamed(['Moss', 'Olive and Let Live'], 3)
    await makeIdea(line, shades[2]!, {
      text: 'All That Glitters Is Not Marigold',
      state: 'in-review',
    })
    const ask = { lineSlug: line.slug, labelSize: 12, labelLines: 1 as const }
    const narrow = await previewLabels(actors.marketer, { ...ask, labelWidth: 20 })
    expect(narrow.total).toBe(3)
    expect(narrow.misfits.map(({ name }) => name)).toEqual([
      'All That Glitters Is Not Marigold',
      'Olive and Let Live',
    ])
    expect(narrow.sample.name).toBe('All That Glitters Is Not Marigold')
    const wide = await previewLabels(actors.marketer, { ...ask, labelWidth: 150 })
    expect(wide).toMatchObject({ misfitCount: 0, misfits: [] })
  })

  it('go out as a file for the printer that no spreadsheet can be tricked by', async () => {
    const { line } = await makeNamed(['=Thyme "Will" Tell', 'Olive and Let Live'], 3)
    await save(line, 0, { labelWidth: 25, care: '+40 °C, dry flat' })
    const { fileName, text } = await exportLabels(actors.marketer, line.slug)
    expect(fileName).toBe(`${line.slug}-labels.csv`)
    const fibre = line.fibres.map(({ fibre, percent }) => `${percent} % ${fibre}`).join(', ')
    const cell = fibre.includes(',') ? `"${fibre}"` : fibre
    const [header, first, second, end] = text.split('\r\n')
    expect(header).toBe('\uFEFFnumber,name,line 1,line 2,fibre,care,dye lot')
    expect(first).toMatch(/^S1,"'=Thyme ""Will"" Tell",/)
    expect(second).toBe(`S2,Olive and Let Live,Olive and,Let Live,${cell},"'+40 °C, dry flat",`)
    expect(end).toBe('')
    const record = await Activity.findOne({
      where: { objectId: line.id, action: 'name.labels-exported' },
    })
    expect(record).toMatchObject({ personId: actors.marketer.personId, after: { count: 2 } })
  })

  it('and their history are not for the dye house, and not there for another brand', async () => {
    const { line } = await makeNamed(['Thyme Will Tell'])
    const lineSlug = line.slug
    const setting = { lineSlug, labelWidth: 40, labelSize: 12, labelLines: 2 as const }
    for (const [actor, code] of [
      [actors.dyer, 'forbidden'],
      [stranger, 'not-found'],
    ] as const) {
      await expect(readLabels(actor, lineSlug)).rejects.toMatchObject({ code })
      await expect(listLabels(actor, lineSlug)).rejects.toMatchObject({ code })
      await expect(previewLabels(actor, setting)).rejects.toMatchObject({ code })
      await expect(exportLabels(actor, lineSlug)).rejects.toMatchObject({ code })
      await expect(listHistory(actor, lineSlug, 1)).rejects.toMatchObject({ code })
    }
    await expect(save(line, 0, {}, stranger)).rejects.toMatchObject({ code: 'not-found' })
    await expect(freezeNames(stranger, { lineSlug, version: 0 })).rejects.toMatchObject({
      code: 'not-found',
    })
    await expect(
      liftFreeze(stranger, { lineSlug, version: 0, reason: 'Mine.' }),
    ).rejects.toMatchObject({ code: 'not-found' })
    expect(await Activity.count({ where: { objectId: line.id } })).toBe(0)
  })
})

describe('the history of names', () => {
  const told = async (actor: Actor, line: Line, page = 1) => {
    const { days, total } = await listHistory(actor, line.slug, page)
    return { total, entries: days.flatMap(({ entries }) => entries) }
  }

  it('tells what became of each name and of the lock, newest first, with who and why', async () => {
    const { line, ideas } = await makeNamed(['Thyme Will Tell'])
    const lineSlug = line.slug
    const [idea] = ideas as [NameIdea]
    await freezeNames(owner, { lineSlug, version: 0 })
    await decideIdea(owner, 'unlock', {
      lineSlug,
      ideaId: idea.id,
      version: idea.version,
      reason: 'A slip of the pen.',
    })
    await liftFreeze(owner, { lineSlug, version: 1, reason: 'The printer is late.' })
    await exportLabels(owner, lineSlug)
    const { entries, total } = await told(actors.marketer, line)
    expect(total).toBe(4)
    expect(entries).toMatchObject([
      {
        person: { name: owner.personName },
        told: { sentence: expect.stringMatching(/^lifted the lock .*: The printer is late\.$/) },
      },
      { told: { move: { move: 'unlock', reason: 'A slip of the pen.' }, shade: 'S1' } },
      { told: { sentence: expect.stringMatching(/^locked the approved names/), byItself: false } },
      { person: null, told: { move: { move: 'add', text: 'Thyme Will Tell' }, shade: 'S1' } },
    ])
  })

  it('says of a lock that came with the print date that nobody set it', async () => {
    const { line } = await makeNamed([])
    const { id: objectId, name: objectLabel } = line
    const entry = { action: 'name.frozen', brandId: brand.id, objectId, objectLabel }
    await Activity.create({ ...entry, objectKind: 'line', personId: null })
    const { entries } = await told(owner, line)
    expect(entries).toMatchObject([
      { told: { byItself: true, sentence: expect.stringContaining('print date') as string } },
    ])
  })

  it('comes in pages that leave nothing out and tell nothing of another line', async () => {
    const { line } = await makeNamed(Array.from({ length: 53 }, (_, at) => `Name ${at}`))
    await makeNamed(['Elsewhere'])
    const [first, second] = await Promise.all([told(owner, line), told(owner, line, 2)])
    expect([first.entries.length, second.entries.length, first.total]).toEqual([50, 3, 53])
    const ids = [...first.entries, ...second.entries].map(({ id }) => id)
    expect(new Set(ids).size).toBe(53)
    expect((await told(owner, line, 3)).entries).toEqual([])
  })

  it('names nobody whose account is gone', async () => {
    const line = await makeLine(brand)
    const [shade] = await makeShades(line, 1)
    const leaver = await makeActor(brand, 'designer')
    await makeIdea(line, shade!, { authorId: leaver.personId })
    await Membership.destroy({ where: { personId: leaver.personId } })
    expect((await told(owner, line)).entries[0]!.person).toMatchObject({ id: leaver.personId })
    await Person.destroy({ where: { id: leaver.personId } })
    expect((await told(owner, line)).entries[0]!.person).toBeNull()
  })
})
