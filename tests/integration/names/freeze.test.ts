import { beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { freezeDueNames } from '@/lib/names/freeze-due-names'
import { decideIdea } from '@/lib/names/move-ideas'
import { Activity, NamingSettings, type Line, type Shade } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

const EVE = new Date('2031-02-28T23:59:00Z')
const DAY = new Date('2031-03-01T00:00:00Z')

let owner: Actor
let line: Line
let shades: Shade[]
let settings: NamingSettings

const set = async (values: Partial<NamingSettings>) => {
  const label = { labelWidth: 60, labelSize: 14, labelLines: 2 as const }
  settings = await NamingSettings.create({
    brandId: line.brandId,
    lineId: line.id,
    ...label,
    ...values,
  })
}
const told = () => Activity.findAll({ where: { brandId: line.brandId, action: 'name.frozen' } })

beforeEach(async () => {
  const brand = await makeBrand()
  owner = await makeActor(brand)
  line = await makeLine(brand)
  shades = await makeShades(line, 2)
})

describe('the job that locks names', () => {
  it('locks them once on the label printer’s day, by nobody’s hand', async () => {
    await set({ printOn: '2031-03-01' })
    await freezeDueNames(EVE)
    expect((await settings.reload()).frozenAt).toBeNull()
    const runs = await Promise.all([freezeDueNames(DAY), freezeDueNames(DAY)])
    expect(runs.reduce((sum, { frozen }) => sum + frozen, 0)).toBe(1)
    await freezeDueNames(DAY)
    expect(await settings.reload()).toMatchObject({ frozenAt: DAY, version: 2 })
    expect((await told()).map(({ personId, objectId }) => [personId, objectId])).toEqual([
      [null, line.id],
    ])
  })

  it('leaves lines without a day, with a later one, and those that an owner has locked', async () => {
    await set({ printOn: null })
    await freezeDueNames(DAY)
    await settings.update({ printOn: '2031-03-02' })
    await freezeDueNames(DAY)
    expect((await settings.reload()).frozenAt).toBeNull()
    await settings.update({ printOn: '2031-03-01', frozenAt: EVE })
    await freezeDueNames(DAY)
    expect(await settings.reload()).toMatchObject({ frozenAt: EVE, version: 1 })
    expect(await told()).toEqual([])
  })
})

describe('a name on a line whose names are locked', () => {
  const decide = (move: 'approve' | 'reopen' | 'unlock', { id, version }: Named, reason = 'Why') =>
    decideIdea(owner, move, { lineSlug: line.slug, ideaId: id, version, reason })
  type Named = { id: string; version: number }

  it('gives way to no other until an owner has unlocked it, which is kept with the reason', async () => {
    // The day has come; the job has not been by.
    await set({ printOn: '2026-01-01' })
    const held = await makeIdea(line, shades[0]!, { state: 'approved', text: 'Stem the Dyed' })
    const rival = await makeIdea(line, shades[0]!, { state: 'in-review', text: 'Dyed and Gone' })
    await expect(decide('approve', rival)).rejects.toThrow(/Stem the Dyed.*unlock/)
    expect((await shades[0]!.reload()).name).toBe('Stem the Dyed')
    await decide('unlock', held, 'The mill spun it thinner.')
    await decide('approve', rival)
    expect((await shades[0]!.reload()).name).toBe('Dyed and Gone')
    // What came in its stead is locked as the others are.
    await expect(decide('reopen', await rival.reload())).rejects.toThrow(ConflictError)
    const [entry] = await Activity.findAll({
      where: { brandId: line.brandId, action: 'name.unlocked' },
    })
    expect(entry).toMatchObject({
      personId: owner.personId,
      after: { reason: 'The mill spun it thinner.' },
    })
  })

  it('is unlocked once: what is opened again and approved is locked anew', async () => {
    await set({ frozenAt: new Date() })
    const held = await makeIdea(line, shades[0]!, { state: 'approved' })
    await decide('unlock', held)
    await expect(decide('unlock', await held.reload())).rejects.toThrow(ConflictError)
    await decide('reopen', await held.reload())
    await decide('approve', await held.reload())
    await expect(decide('reopen', await held.reload())).rejects.toThrow(/locked/)
  })

  it('can still be given to a shade without one', async () => {
    await set({ frozenAt: new Date() })
    const idea = await makeIdea(line, shades[1]!, { state: 'in-review' })
    await decide('approve', idea)
    expect((await shades[1]!.reload()).name).toBe(idea.text)
  })
})
