import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { changeShades } from '@/lib/shades/change-shades'
import { createShade } from '@/lib/shades/create-shade'
import { deleteShades } from '@/lib/shades/delete-shades'
import { getShade } from '@/lib/shades/queries'
import { reorderShades } from '@/lib/shades/reorder-shades'
import { restoreShades } from '@/lib/shades/restore-shades'
import { createShadeSchema } from '@/lib/shades/schema'
import { setShadeStatus } from '@/lib/shades/set-shade-status'
import { updateShade } from '@/lib/shades/update-shade'
import { CombinationPlace, NameIdea, NameMove, Shade, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makeShade, makeShades } from '@/tests/factories/shade'

let owner: Actor
let line: Line
beforeAll(async () => {
  owner = await makeActor(await makeBrand())
})
beforeEach(async () => {
  line = await makeLine({ id: owner.brandId })
})

const input = (values: object = {}) =>
  createShadeSchema.parse({
    lineSlug: line.slug,
    requestKey: randomUUID(),
    number: '14',
    name: 'Moss',
    status: 'target',
    color: { kind: 'lab', L: '54,2', a: '-12', b: '8.1', terms: 'D65/10' },
    ...values,
  })
const revision = async () => (await line.reload()).shadesRevision
const conflict = async (attempt: Promise<unknown>) => {
  const error = await attempt.catch((reason: unknown) => reason)
  expect(error).toBeInstanceOf(ConflictError)
  return error as ConflictError
}
const order = async () => {
  const shades = await Shade.findAll({ where: { lineId: line.id }, order: ['position'] })
  return shades.map(({ number, position }) => `${position}:${number}`)
}

/** A kept combination of these shades. */
const keep = (title: string, shades: readonly Shade[]) => makeCombination(line, shades, { title })

describe('adding a shade', () => {
  it('keeps a reading to the last digit, with its terms, and goes to the end', async () => {
    await makeShade(line, { position: 7 })
    const shade = await createShade(owner, input())
    await expect(shade.reload()).resolves.toMatchObject({
      labL: 54.2,
      labA: -12,
      labB: 8.1,
      illuminant: 'D65',
      observer: 10,
      hex: null,
      position: 8,
      version: 1,
    })
  })

  it('makes one row of ten identical submits, which all get it', async () => {
    const same = input()
    const before = await revision()
    const made = await Promise.all(Array.from({ length: 10 }, () => createShade(owner, same)))
    expect(new Set(made.map(({ id }) => id)).size).toBe(1)
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(1)
    expect(await NameIdea.count({ where: { lineId: line.id } })).toBe(1)
    expect(await revision()).toBe(before + 1)
  })

  it('makes a draft of a name that was typed, with its history; the shade has no name yet', async () => {
    const shade = await createShade(owner, input({ name: 'Moss Likely' }))
    expect(shade.name).toBeNull()
    const idea = await NameIdea.findOne({ where: { shadeId: shade.id }, rejectOnEmpty: true })
    expect(idea).toMatchObject({
      text: 'Moss Likely',
      state: 'draft',
      authorId: owner.personId,
      wordedById: owner.personId,
    })
    const moves = await NameMove.findAll({ where: { ideaId: idea.id } })
    expect(moves).toMatchObject([{ move: 'add', toState: 'draft', personId: owner.personId }])
    await createShade(owner, input({ number: '15', name: '' }))
    expect(await NameIdea.count({ where: { lineId: line.id } })).toBe(1)
  })

  it('makes one of ten different shades of one number, and the others say who has it', async () => {
    const all = Array.from({ length: 10 }, () => createShade(owner, input()))
    const results = await Promise.allSettled(all)
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    for (const result of results) {
      if (result.status === 'fulfilled') continue
      expect(result.reason).toBeInstanceOf(ConflictError)
      expect(result.reason).toMatchObject({
        fieldErrors: { number: ['No. 14 is taken. Choose another number.'] },
      })
    }
  })

  it('minds no case of the number, and no other line', async () => {
    await makeShade(line, { number: 'q1' })
    await makeShade(await makeLine({ id: owner.brandId }), { number: 'q2' })
    await conflict(createShade(owner, input({ number: 'Q1' })))
    await expect(createShade(owner, input({ number: 'Q2' }))).resolves.toBeDefined()
  })

  it('stops at 5,000 shades', async () => {
    const rows = Array.from({ length: 5_000 }, (_, position) => ({
      brandId: line.brandId,
      lineId: line.id,
      number: `N${position}`,
      labL: 50,
      labA: 0,
      labB: 0,
      illuminant: 'D65' as const,
      observer: 10 as const,
      status: 'target' as const,
      position,
    }))
    await Shade.bulkCreate(rows)
    expect((await conflict(createShade(owner, input()))).message).toMatch(/at most 5,000 shades/)
  })
})

describe('changing a shade', () => {
  it('changes what is given and leaves the rest', async () => {
    const shade = await makeShade(line, { name: 'Moss', status: 'approved' })
    const before = await revision()
    const saved = await updateShade(owner, {
      lineSlug: line.slug,
      shadeId: shade.id,
      version: 1,
      color: { kind: 'hex', hex: '#7a8b4f' },
    })
    expect(saved).toMatchObject({
      name: 'Moss',
      status: 'approved',
      hex: '#7a8b4f',
      observer: 2,
      version: 2,
    })
    expect(await revision()).toBe(before + 1)
  })

  it('loses to whoever saved first, and says what stands there now', async () => {
    const shade = await makeShade(line, { name: 'Moss' })
    const edit = { lineSlug: line.slug, shadeId: shade.id, version: 1 }
    await updateShade(owner, { ...edit, number: '15', status: 'approved' })
    const before = await revision()
    const error = await conflict(updateShade(owner, { ...edit, number: '16', status: 'approved' }))
    expect(error.fieldErrors).toEqual({ number: ['Now 15.'] })
    expect(error.message).toContain('Now 15.')
    await expect(shade.reload()).resolves.toMatchObject({ number: '15', version: 2 })
    expect(await revision()).toBe(before)
  })

  it('lets one of two simultaneous saves win', async () => {
    const shade = await makeShade(line)
    const save = (number: string) =>
      updateShade(owner, { lineSlug: line.slug, shadeId: shade.id, version: 1, number })
    const results = await Promise.allSettled([save('15'), save('16')])
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  })

  it('may write its own number in another case, and not take that of another', async () => {
    const shade = await makeShade(line, { number: 'q1' })
    await makeShade(line, { number: 'q2', name: 'Fern' })
    const edit = { lineSlug: line.slug, shadeId: shade.id }
    await expect(updateShade(owner, { ...edit, version: 1, number: 'Q1' })).resolves.toMatchObject({
      number: 'Q1',
    })
    const error = await conflict(updateShade(owner, { ...edit, version: 2, number: 'Q2' }))
    expect(error.fieldErrors?.number).toEqual(['No. q2 is taken by Fern. Choose another number.'])
  })

  it('sets one status for many, and counts those that were different', async () => {
    const shades = await makeShades(line, 3)
    await shades[0]!.update({ status: 'approved' })
    const shadeIds = shades.map(({ id }) => id)
    const set = () => setShadeStatus(owner, { lineSlug: line.slug, shadeIds, status: 'approved' })
    const before = await revision()
    await expect(set()).resolves.toEqual({ changed: 2 })
    expect(await revision()).toBe(before + 1)
    await expect(shades[1]!.reload()).resolves.toMatchObject({ status: 'approved', version: 2 })
    await expect(set()).resolves.toEqual({ changed: 0 })
    expect(await revision()).toBe(before + 1)
  })
})

describe('deleting shades', () => {
  it('asks first when they are in use, and says where; then the combination keeps them', async () => {
    const shades = await makeShades(line, 5)
    const kept = await keep('Hillside', shades)
    const request = { lineSlug: line.slug, shadeIds: [shades[0]!.id, shades[1]!.id] }
    const before = await revision()
    await expect(deleteShades(owner, { ...request, confirmed: false })).resolves.toEqual({
      deleted: false,
      uses: {
        combinations: [{ combinationId: kept.id, title: 'Hillside' }],
        total: 1,
        shadeIds: expect.arrayContaining(request.shadeIds) as string[],
      },
    })
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(5)
    expect(await revision()).toBe(before)

    await expect(deleteShades(owner, { ...request, confirmed: true })).resolves.toMatchObject({
      deleted: true,
    })
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(3)
    expect(await revision()).toBe(before + 1)
    const places = await CombinationPlace.findAll({
      where: { combinationId: kept.id },
      include: { model: Shade, as: 'shade', paranoid: false },
      order: ['place'],
    })
    expect(places.map(({ shade }) => shade?.deletedAt !== null)).toEqual([
      true,
      true,
      false,
      false,
      false,
    ])
  })

  it('names the first ten combinations and how many there are', async () => {
    const shade = await makeShade(line)
    for (let at = 0; at < 12; at += 1) await keep(`Title ${String(at).padStart(2, '0')}`, [shade])
    const { uses } = await getShade(owner, line.slug, shade.id)
    expect(uses?.total).toBe(12)
    expect(uses?.combinations.map(({ title }) => title)).toEqual(
      Array.from({ length: 10 }, (_, at) => `Title ${String(at).padStart(2, '0')}`),
    )
  })

  it('does not ask for a combination that is deleted itself', async () => {
    const shade = await makeShade(line)
    await (await keep('Hillside', [shade])).destroy()
    const request = { lineSlug: line.slug, shadeIds: [shade.id], confirmed: false }
    await expect(deleteShades(owner, request)).resolves.toMatchObject({ deleted: true })
  })

  it('can be taken back', async () => {
    const shades = await makeShades(line, 3)
    const shadeIds = shades.map(({ id }) => id)
    const before = await order()
    const request = { lineSlug: line.slug, shadeIds }
    await deleteShades(owner, { ...request, confirmed: false })
    const revised = await revision()
    await expect(restoreShades(owner, request)).resolves.toEqual({ restored: 3 })
    expect(await order()).toEqual(before)
    expect(await revision()).toBe(revised + 1)
    await expect(restoreShades(owner, request)).resolves.toEqual({ restored: 0 })
    expect(await revision()).toBe(revised + 1)
  })

  it('cannot be taken back, not even in part, once a number is given away', async () => {
    const shades = await makeShades(line, 2)
    const request = { lineSlug: line.slug, shadeIds: shades.map(({ id }) => id) }
    await deleteShades(owner, { ...request, confirmed: false })
    await createShade(owner, input({ number: 's2' }))
    expect((await conflict(restoreShades(owner, request))).message).toBe(
      'No. s2 was given to another shade meanwhile. Give that one another number, then take the deletion back.',
    )
    expect(await Shade.count({ where: { lineId: line.id } })).toBe(1)
  })
})

describe('ordering', () => {
  it('moves shades together to a place and numbers the line without gaps', async () => {
    const shades = await makeShades(line, 5)
    await shades[4]!.update({ position: 40 })
    const shadeIds = [shades[4]!.id, shades[1]!.id]
    const before = await revision()
    await reorderShades(owner, { lineSlug: line.slug, shadeIds, place: 1 })
    expect(await order()).toEqual(['0:S2', '1:S5', '2:S1', '3:S3', '4:S4'])
    expect(await revision()).toBe(before + 1)
  })

  it('goes to the end at most, and says where it came to', async () => {
    const shades = await makeShades(line, 3)
    const shadeIds = [shades[0]!.id]
    const move = () => reorderShades(owner, { lineSlug: line.slug, shadeIds, place: 900 })
    await expect(move()).resolves.toEqual({ place: 3 })
    const before = await revision()
    await expect(move()).resolves.toEqual({ place: 3 })
    expect(await revision()).toBe(before)
  })

  it('leaves the versions, so that no open form is refused', async () => {
    const shades = await makeShades(line, 3)
    await reorderShades(owner, { lineSlug: line.slug, shadeIds: [shades[2]!.id], place: 1 })
    await expect(shades[0]!.reload()).resolves.toMatchObject({ position: 1, version: 1 })
  })
})

describe('a number that the database alone finds taken', () => {
  it('is a conflict in words, and nothing is saved', async () => {
    const [one, other] = await makeShades(line, 2)
    const error = await conflict(
      changeShades(owner, line.slug, async (_line, transaction) => {
        await one!.update({ name: 'Fern' }, { transaction })
        await other!.update({ number: one!.number.toLowerCase() }, { transaction })
        return { answer: null, changed: true }
      }),
    )
    expect(error.message).toMatch(/in use by another shade/)
    await expect(one!.reload()).resolves.toMatchObject({ name: null })
  })
})
