import { beforeAll, describe, expect, it } from 'vitest'

import { ACTIVITY_LIMITS } from '@/lib/activity/constants'
import { exportActivity } from '@/lib/activity/export-activity'
import { presentDays } from '@/lib/activity/present'
import { listActivity, listActivityPeople } from '@/lib/activity/queries'
import { recordActivity } from '@/lib/activity/record'
import { activityFilterSchema, activityPageSchema, type ActivityPage } from '@/lib/activity/schema'
import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { Activity, inTransaction, Membership, Person } from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { countQueries } from '@/tests/integration/setup/count-queries'

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>

beforeAll(async () => {
  ours = await makeActors(await makeBrand('Ours'))
  theirs = await makeActors(await makeBrand('Theirs'))
  await record(ours.designer, { action: 'combination.kept', label: 'Ours alone' })
  await record(theirs.designer, { action: 'combination.kept', label: 'Theirs alone' })
})

interface Entry {
  action?: string
  label?: string
  at?: string
  before?: object
  after?: object
}

/** An entry as `recordActivity` leaves it, of any time. */
function record(
  { brandId, personId }: { brandId: string; personId: string | null },
  { action = 'line.updated', label = 'A line', at, before, after }: Entry,
): Promise<Activity> {
  return Activity.create({
    brandId,
    personId,
    action,
    objectKind: action.split('.')[0]!,
    objectLabel: label,
    before: (before as Record<string, unknown>) ?? null,
    after: (after as Record<string, unknown>) ?? null,
    ...(at && { createdAt: new Date(at) }),
  })
}

const asking = (address: object = {}): ActivityPage => activityPageSchema.strip().parse(address)
const filtering = (address: object = {}) => activityFilterSchema.parse(address)
const labelsOf = async (actor: Actor, address: object = {}) =>
  (await listActivity(actor, asking(address))).entries.map(({ entry }) => entry.objectLabel)

const DOINGS: { name: string; do: (actor: Actor) => Promise<unknown> }[] = [
  { name: 'read the record', do: (actor) => listActivity(actor, asking()) },
  { name: 'see who may be in it', do: (actor) => listActivityPeople(actor) },
  { name: 'take it away', do: (actor) => exportActivity(actor, filtering()) },
]

describe.each(DOINGS)('to $name', ({ do: attempt }) => {
  it.each(ROLES)('as a %s of the brand', async (role) => {
    if (role === 'owner') await expect(attempt(ours.owner)).resolves.toBeDefined()
    else await expect(attempt(ours[role])).rejects.toThrow(ForbiddenError)
  })

  it('gives an owner nothing of another brand', async () => {
    const seen = JSON.stringify(await attempt(theirs.owner))
    expect(seen).not.toContain(ours.owner.brandId)
    expect(seen).not.toContain(ours.designer.personId)
    expect(seen).not.toContain('Ours alone')
  })
})

describe('the record', () => {
  let owner: Actor
  let dyer: Actor
  beforeAll(async () => {
    const brand = await makeBrand('Filters')
    owner = await makeActor(brand)
    dyer = await makeActor(brand, 'dyer')
    const [first, second, third] = ['2026-03-01T23:59:59.999Z', '2026-03-02T00:00:00Z']
      .concat('2026-03-03T12:00:00Z')
      .map((at) => ({ at }))
    await record(owner, { ...first, label: 'one' })
    await record(dyer, { ...second, action: 'shade.updated', label: 'two' })
    await record(dyer, { ...third, action: 'shade.deleted', label: 'three' })
  })

  it.each([
    ['of one person', () => ({ person: dyer.personId }), ['three', 'two']],
    ['of a kind of thing', () => ({ what: 'shade' }), ['three', 'two']],
    ['of one action', () => ({ what: 'shade.updated' }), ['two']],
    ['from a day on', () => ({ from: '2026-03-02' }), ['three', 'two']],
    ['up to a day, that day too', () => ({ to: '2026-03-02' }), ['two', 'one']],
    ['of one day', () => ({ from: '2026-03-02', to: '2026-03-02' }), ['two']],
    ['of days the wrong way round', () => ({ from: '2026-03-03', to: '2026-03-01' }), []],
    ['of all of it together', () => ({ person: dyer.personId, what: 'shade.deleted' }), ['three']],
    ['of somebody of another brand', () => ({ person: theirs.owner.personId }), []],
  ])('is narrowed to the entries %s', async (_, address, labels) => {
    expect(await labelsOf(owner, address())).toEqual(labels)
  })

  it.each([
    { person: 'x' },
    { person: ["' OR 1=1", 'b'] },
    { what: 'shade%' },
    { what: "shade'; DROP TABLE activities" },
    { from: '0000-01-01' },
    { from: '2026-02-31', to: '9999-12-31' },
    { before: 'x' },
    { sort: 'id' },
  ])('shows all of it for an address that makes no sense: %j', async (address) => {
    expect(await labelsOf(owner, address)).toEqual(['three', 'two', 'one'])
  })

  it('begins at the newest when the entry to go on from is another brand’s', async () => {
    const foreign = await record(theirs.owner, { label: 'foreign', at: '2026-03-02T06:00:00Z' })
    expect(await labelsOf(owner, { before: foreign.id })).toEqual(['three', 'two', 'one'])
  })

  it('calls somebody whose account is closed a former member, and finds their entries', async () => {
    const brand = await makeBrand('Leavers')
    const left = await makeActor(brand)
    const stays = await makeActor(brand)
    await inTransaction((transaction) =>
      recordActivity(
        stays,
        {
          action: 'membership.removed',
          object: { kind: 'person', id: left.personId, label: 'Owner' },
          before: { role: 'owner' },
        },
        transaction,
      ),
    )
    await record(left, { label: 'their line' })
    const sentences = async () =>
      presentDays((await listActivity(stays, asking())).entries).flatMap(({ entries }) =>
        entries.map(({ person, sentence }) => `${person} ${sentence}`),
      )
    expect(await sentences()).toEqual([
      'A owner changed the line their line',
      'A owner removed A owner, who was Owner',
    ])
    await Membership.destroy({ where: { personId: left.personId } })
    await Person.destroy({ where: { id: left.personId } })
    expect(await sentences()).toEqual([
      'A former member changed the line their line',
      'A owner removed a former member, who was Owner',
    ])
    expect(await labelsOf(stays, { person: 'former' })).toEqual(['their line'])
  })

  it('says of a refusal what was refused, and has nothing to add', async () => {
    const brand = await makeBrand('Refusals')
    const one = await makeActor(brand)
    await record(one, { action: 'access.refused', after: { asked: 'restoreCombination' } })
    const { entries } = await listActivity(one, asking())
    expect(presentDays(entries)[0]!.entries[0]).toMatchObject({
      sentence: 'was refused: restore combination',
      changes: [],
    })
  })

  it('says what was different, field by field, in words', async () => {
    const brand = await makeBrand('Details')
    const one = await makeActor(brand)
    await record(one, {
      before: { labL: 54.2, name: null, fibres: [{ fibre: 'wool', percent: 100 }] },
      after: { labL: 55, name: 'Moss', fibres: [] },
    })
    const { entries } = await listActivity(one, asking())
    expect(presentDays(entries)[0]!.entries[0]!.changes).toEqual([
      { field: 'L', before: '54.2', after: '55' },
      { field: 'name', before: 'none', after: 'Moss' },
      { field: 'fibres', before: 'wool 100', after: 'none' },
    ])
  })
})

describe('a record of many pages', () => {
  let owner: Actor
  const COUNT = ACTIVITY_LIMITS.perPage * 2 + 7
  beforeAll(async () => {
    owner = await makeActor(await makeBrand('Long'))
    // Many of one moment, so that pages break within it.
    for (let at = 0; at < COUNT; at++) {
      const day = String(1 + Math.floor(at / 40)).padStart(2, '0')
      await record(owner, { label: `entry ${at}`, at: `2026-04-${day}T09:00:00.123Z` })
    }
  })

  it('shows every entry once, newest first, whatever is added meanwhile', async () => {
    const seen: string[] = []
    let before: string | null = null
    do {
      const page = await listActivity(owner, asking({ before }))
      seen.push(...page.entries.map(({ entry }) => entry.objectLabel!))
      before = page.older
      await record(owner, { label: 'meanwhile' })
    } while (before)
    expect(seen).toHaveLength(COUNT)
    expect(new Set(seen).size).toBe(COUNT)
    const days = seen.map((label) => Math.floor(Number(label.slice(6)) / 40))
    expect(days).toEqual([...days].sort((one, other) => other - one))
  })

  it('costs three queries a page, however far back', async () => {
    const first = await countQueries(() => listActivity(owner, asking()))
    const second = await countQueries(() =>
      listActivity(owner, asking({ before: first.answer.older })),
    )
    expect(first.queries).toBeLessThanOrEqual(3)
    expect(second.queries).toBeLessThanOrEqual(3)
  })
})

describe('the CSV file', () => {
  it('holds what fits, disarmed, and is itself recorded with what was asked for', async () => {
    const brand = await makeBrand('CSV')
    const owner = await makeActor(brand)
    await Person.update({ name: '=HYPERLINK("x")' }, { where: { id: owner.personId } })
    await record(owner, { before: { name: 'a, "b"' }, after: { name: '\t+1' } })
    await record(owner, { action: 'shade.deleted', label: 'Not asked for' })
    const { fileName, text } = await exportActivity(owner, filtering({ what: 'line' }))
    expect(fileName).toBe(`${owner.brandSlug}-activity.csv`)
    const [header, line, ...rest] = text.replace('\uFEFF', '').trimEnd().split('\r\n')
    expect(header).toBe('time (UTC),person,action,what,before,after,request')
    expect(line).toContain(`,"'=HYPERLINK(""x"")",Line changed,changed the line A line,`)
    expect(line).toContain('"name: a, ""b"""')
    expect(rest).toEqual([])
    const [newest] = (await listActivity(owner, asking())).entries
    expect(newest!.entry).toMatchObject({
      action: 'activity.exported',
      personId: owner.personId,
      after: { count: 1, what: 'line' },
    })
  })
})
