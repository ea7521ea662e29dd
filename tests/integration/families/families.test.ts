import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError, InvalidError, NotFoundError } from '@/lib/errors'
import { mergeFamilies } from '@/lib/families/merge-families'
import { moveShadesToFamily } from '@/lib/families/move-shades-to-family'
import { orderFamilies } from '@/lib/families/order-families'
import { orderFamilyShades } from '@/lib/families/order-family-shades'
import { pinShades } from '@/lib/families/pin-shades'
import { previewSort } from '@/lib/families/preview-sort'
import { listFamilies, readFamilies } from '@/lib/families/queries'
import { renameFamily } from '@/lib/families/rename-family'
import { restoreFamilies } from '@/lib/families/restore-families'
import { sortIntoFamilies } from '@/lib/families/sort-into-families'
import { splitFamily } from '@/lib/families/split-family'
import type { Role } from '@/lib/people/constants'
import { createShade } from '@/lib/shades/create-shade'
import { deleteShades } from '@/lib/shades/delete-shades'
import { importShades } from '@/lib/shades/import-shades'
import { importShadesSchema, createShadeSchema } from '@/lib/shades/schema'
import { restoreShades } from '@/lib/shades/restore-shades'
import { Activity, Shade, type Line } from '@/models'
import { dyedLine } from '@/scripts/bench/line'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShade } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let actors: Record<Role, Actor>
let owner: Actor
let stranger: Actor
let line: Line

beforeAll(async () => {
  actors = await makeActors(await makeBrand())
  owner = actors.owner
  stranger = await makeActor(await makeBrand())
})
beforeEach(async () => {
  line = await makeLine({ id: owner.brandId })
})

/** Forty dyed shades, sorted. */
async function sorted(count: number | null = 7): Promise<void> {
  await fill()
  await sortIntoFamilies(owner, { lineSlug: line.slug, version: 1, count })
}
async function fill(size = 40): Promise<void> {
  await Promise.all(
    dyedLine(size, 3).map(({ lab: [labL, labA, labB] }, position) =>
      makeShade(line, { position, labL, labA, labB }),
    ),
  )
}
const families = async () => (await readFamilies(owner, line.slug)).families
const version = async () => (await line.reload()).familiesVersion
const edit = async () => ({ lineSlug: line.slug, version: await version() })
/** Family by shade. */
const standing = async () =>
  new Map((await families()).flatMap(({ id, shades }) => shades.map((one) => [one.id, id])))
const names = async () => (await families()).map(({ name }) => name)
const createInput = (values: object) =>
  createShadeSchema.parse({
    lineSlug: line.slug,
    requestKey: randomUUID(),
    name: null,
    status: 'target',
    ...values,
  })
const lab = (L: number, a: number, b: number) => ({ kind: 'lab', L, a, b, terms: 'D65/10' })

describe('sorting into families', () => {
  it('puts every shade into one, the neutrals first, each light to dark, all named apart', async () => {
    await sorted(null)
    const all = await families()
    expect(all[0]).toMatchObject({ name: 'Neutrals', neutral: true })
    expect(all.length).toBeGreaterThanOrEqual(6)
    expect(all.flatMap(({ shades }) => shades)).toHaveLength(40)
    expect(new Set(await names()).size).toBe(all.length)
    for (const { shades } of all) {
      const lightness = shades.map((shade) => shade.lab[0])
      expect(lightness).toEqual([...lightness].sort((a, b) => b - a))
    }
  })

  it('makes as many hue families as are asked for and keeps the number', async () => {
    await sorted(6)
    expect((await families()).filter(({ neutral }) => !neutral)).toHaveLength(6)
    expect((await line.reload()).familyCount).toBe(6)
  })

  it('never moves a pinned shade, and keeps its family', async () => {
    await sorted(9)
    const all = await families()
    const [first, last] = [all[1]!, all.at(-1)!]
    const shade = last.shades[0]!
    await moveShadesToFamily(owner, {
      ...(await edit()),
      shadeIds: [shade.id],
      familyId: first.id,
    })
    for (const count of [2, 5, 12, null]) {
      await sortIntoFamilies(owner, { ...(await edit()), count })
      expect((await standing()).get(shade.id)).toBe(first.id)
    }
  })

  it('keeps ids where the shades stay, and the names people gave', async () => {
    await sorted(7)
    const before = await families()
    await renameFamily(owner, { ...(await edit()), familyId: before[2]!.id, name: 'Bracken' })
    await sortIntoFamilies(owner, { ...(await edit()), count: 8 })
    const after = await families()
    const kept = after.filter(({ id }) => before.some((family) => family.id === id))
    expect(kept).toHaveLength(before.length)
    expect(after.find(({ id }) => id === before[2]!.id)?.name).toBe('Bracken')
    expect(new Set(after.map(({ name }) => name)).size).toBe(after.length)
  })

  it('says before what it would do, and does just that', async () => {
    await sorted(7)
    const preview = await previewSort(owner, { lineSlug: line.slug, count: 5 })
    const before = await standing()
    expect(preview.version).toBe(await version())
    expect(preview.gone.length).toBe((await families()).length - preview.families.length)
    await sortIntoFamilies(owner, { lineSlug: line.slug, version: preview.version, count: 5 })
    const after = await families()
    expect(preview.families.map(({ name, shades }) => [name, shades])).toEqual(
      after.map(({ name, shades }) => [name, shades.length]),
    )
    const moved = [...(await standing())].filter(([id, family]) => before.get(id) !== family)
    expect(preview.moved).toBe(moved.length)
  })

  it('anew with nothing to change raises no version and leaves no record', async () => {
    await sorted(7)
    const records = () => Activity.count({ where: { action: 'family.sorted', objectId: line.id } })
    const count = await records()
    const answer = await sortIntoFamilies(owner, { ...(await edit()), count: 7 })
    expect(answer).toEqual({ version: await version(), former: null })
    expect(await records()).toBe(count)
  })
})

describe('an edit of families', () => {
  it('moves shades, pins them, and drops the family that is empty then', async () => {
    await sorted()
    const [one, other] = await families()
    const ids = one!.shades.map(({ id }) => id)
    await moveShadesToFamily(owner, { ...(await edit()), shadeIds: ids, familyId: other!.id })
    const all = await families()
    expect(all.map(({ id }) => id)).not.toContain(one!.id)
    const moved = all
      .find(({ id }) => id === other!.id)!
      .shades.filter(({ id }) => ids.includes(id))
    expect(moved).toHaveLength(ids.length)
    expect(moved.every(({ familyPinned }) => familyPinned)).toBe(true)
  })

  it('moves shades into a new family behind the one they come from', async () => {
    await sorted()
    const before = await families()
    const shadeIds = before[2]!.shades.slice(0, 2).map(({ id }) => id)
    await moveShadesToFamily(owner, { ...(await edit()), shadeIds, familyId: null })
    const after = await families()
    expect(after).toHaveLength(before.length + 1)
    expect(after[3]!.shades.map(({ id }) => id).sort()).toEqual([...shadeIds].sort())
    expect(new Set(after.map(({ name }) => name)).size).toBe(after.length)
  })

  it('merges one family into another and splits it in two', async () => {
    await sorted()
    const [, one, other] = await families()
    await mergeFamilies(owner, { ...(await edit()), familyId: other!.id, intoId: one!.id })
    const merged = (await families())[1]!
    expect(merged).toMatchObject({ id: one!.id, name: one!.name })
    expect(merged.shades).toHaveLength(one!.shades.length + other!.shades.length)
    await expect(
      mergeFamilies(owner, { ...(await edit()), familyId: one!.id, intoId: one!.id }),
    ).rejects.toThrow(InvalidError)

    // What was merged is pinned, so the others part from it.
    await splitFamily(owner, { ...(await edit()), familyId: one!.id })
    const [, kept, made] = await families()
    expect(kept!.shades.length + made!.shades.length).toBe(merged.shades.length)
    expect(made!.shades.every(({ familyPinned }) => familyPinned)).toBe(true)
  })

  it('refuses to split what is one shade', async () => {
    await makeShade(line, {})
    await sortIntoFamilies(owner, { ...(await edit()), count: null })
    const [only] = await families()
    const split = splitFamily(owner, { ...(await edit()), familyId: only!.id })
    await expect(split).rejects.toThrow(/cannot be split/)
  })

  it('refuses the name of another family, in any case', async () => {
    await sorted()
    const [one, other] = await families()
    const rename = renameFamily(owner, {
      ...(await edit()),
      familyId: one!.id,
      name: other!.name.toUpperCase(),
    })
    const error = await rename.catch((reason: unknown) => reason)
    expect(error).toBeInstanceOf(ConflictError)
    expect((error as ConflictError).fieldErrors?.name?.[0]).toContain(other!.name)
  })

  it('orders the shades of a family by hand, and from light to dark again', async () => {
    await sorted()
    const family = (await families())[1]!
    const turned = family.shades.map(({ id }) => id).reverse()
    await orderFamilyShades(owner, {
      ...(await edit()),
      familyId: family.id,
      shadeIds: turned,
    })
    const ordered = (await families())[1]!
    expect(ordered.ordered).toBe(true)
    expect(ordered.shades.map(({ id }) => id)).toEqual(turned)
    await expect(
      orderFamilyShades(owner, {
        ...(await edit()),
        familyId: family.id,
        shadeIds: turned.slice(1),
      }),
    ).rejects.toThrow(InvalidError)
    await orderFamilyShades(owner, { ...(await edit()), familyId: family.id, shadeIds: null })
    expect((await families())[1]!.shades).toEqual(family.shades)
  })

  it('orders the families', async () => {
    await sorted()
    const ids = (await families()).map(({ id }) => id)
    await orderFamilies(owner, { ...(await edit()), familyIds: [ids.at(-1)!] })
    expect((await families()).map(({ id }) => id)).toEqual([ids.at(-1), ...ids.slice(0, -1)])
  })

  it('pins and lets go', async () => {
    await sorted()
    const shade = (await families())[1]!.shades[0]!
    await pinShades(owner, { ...(await edit()), shadeIds: [shade.id], pinned: true })
    await expect(Shade.findByPk(shade.id)).resolves.toMatchObject({ familyPinned: true })
    await pinShades(owner, { ...(await edit()), shadeIds: [shade.id], pinned: false })
    await expect(Shade.findByPk(shade.id)).resolves.toMatchObject({ familyPinned: false })
  })

  it('is recorded with the names of what it moved', async () => {
    await sorted()
    const [one, other] = await families()
    const shade = one!.shades[0]!
    await moveShadesToFamily(owner, {
      ...(await edit()),
      shadeIds: [shade.id],
      familyId: other!.id,
    })
    const record = await Activity.findOne({
      where: { action: 'family.shades-moved', objectId: other!.id },
    })
    expect(record).toMatchObject({
      objectLabel: `${other!.name} of A line`,
      after: { count: 1, named: [shade.label] },
    })
  })

  it('is refused when somebody edited first, and then changes nothing', async () => {
    await sorted()
    const seen = await edit()
    const [one, other] = await families()
    await renameFamily(owner, { ...seen, familyId: one!.id, name: 'First come' })
    const before = await families()
    const late = mergeFamilies(actors.designer, {
      ...seen,
      familyId: one!.id,
      intoId: other!.id,
    })
    await expect(late).rejects.toThrow(/Somebody else changed the families/)
    expect(await families()).toEqual(before)
  })

  it('of two at once only one is done', async () => {
    await sorted()
    const seen = await edit()
    const all = await families()
    const done = await Promise.allSettled(
      all.slice(1, 5).map(({ id }) => splitFamily(owner, { ...seen, familyId: id })),
    )
    expect(done.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    expect(await version()).toBe(seen.version + 1)
  })
})

describe('taking an edit back', () => {
  const everything = async () => ({
    families: await families(),
    count: (await line.reload()).familyCount,
  })

  it('puts all as it was: families, names, pins, orders and the number asked for', async () => {
    await sorted()
    const [one, two, three] = await families()
    await pinShades(owner, { ...(await edit()), shadeIds: [two!.shades[0]!.id], pinned: true })
    const turned = three!.shades.map(({ id }) => id).reverse()
    await orderFamilyShades(owner, { ...(await edit()), familyId: three!.id, shadeIds: turned })
    const before = await everything()
    const edits = [
      async () => sortIntoFamilies(owner, { ...(await edit()), count: 3 }),
      async () => mergeFamilies(owner, { ...(await edit()), familyId: three!.id, intoId: one!.id }),
      async () => splitFamily(owner, { ...(await edit()), familyId: two!.id }),
      async () => renameFamily(owner, { ...(await edit()), familyId: two!.id, name: 'Rowan' }),
      async () => orderFamilies(owner, { ...(await edit()), familyIds: [three!.id] }),
      async () =>
        moveShadesToFamily(owner, {
          ...(await edit()),
          shadeIds: [three!.shades[0]!.id, two!.shades[0]!.id],
          familyId: null,
        }),
    ]
    for (const change of edits) {
      const { former } = await change()
      expect(await everything()).not.toEqual(before)
      await restoreFamilies(owner, { ...(await edit()), former: former! })
      expect(await everything()).toEqual(before)
    }
  })

  it('is refused once somebody has edited since', async () => {
    await sorted()
    const [one, two, three] = await families()
    const { former, version: after } = await mergeFamilies(owner, {
      ...(await edit()),
      familyId: three!.id,
      intoId: two!.id,
    })
    await renameFamily(actors.marketer, { ...(await edit()), familyId: one!.id, name: 'Undyed' })
    const back = restoreFamilies(owner, { lineSlug: line.slug, version: after, former: former! })
    await expect(back).rejects.toThrow(ConflictError)
  })

  it('never takes the family of another line, nor leaves a shade in none', async () => {
    await sorted()
    const mine = await families()
    const asFormer = mine.map(({ id, name, nameGiven, neutral }) => ({
      id,
      name,
      nameGiven,
      neutral,
    }))
    for (const actor of [owner, stranger]) {
      const other = await makeLine({ id: actor.brandId })
      await makeShade(other, {})
      await sortIntoFamilies(actor, { lineSlug: other.slug, version: 1, count: null })
      const before = (await readFamilies(actor, other.slug)).families
      const taken = { ...asFormer[0]!, id: before[0]!.id, name: 'Taken' }
      const place = { familyId: taken.id, pinned: false, position: null }
      const former = {
        count: null,
        families: [...asFormer, taken],
        shades: [{ id: mine[1]!.shades[0]!.id, ...place }],
      }
      await expect(restoreFamilies(owner, { ...(await edit()), former })).rejects.toThrow(
        ConflictError,
      )
      expect((await readFamilies(actor, other.slug)).families).toEqual(before)
    }
    await expect(
      restoreFamilies(owner, {
        ...(await edit()),
        former: { count: null, families: asFormer.slice(1), shades: [] },
      }),
    ).rejects.toThrow(InvalidError)
    expect(await families()).toEqual(mine)
  })
})

describe('new shades', () => {
  it('are sorted whole while they are a few that nobody touched', async () => {
    await createShade(owner, createInput({ number: '1', color: lab(45, 50, 25) }))
    expect(await names()).toEqual(['Reds'])
    await createShade(owner, createInput({ number: '2', color: lab(45, -30, 20) }))
    await createShade(owner, createInput({ number: '3', color: lab(46, -32, 21) }))
    await createShade(owner, createInput({ number: '4', color: lab(47, 48, 26) }))
    expect(await names()).toEqual(['Reds', 'Greens'])
  })

  it('fall into the family of their nearest shade, and disturb nobody who edits', async () => {
    await sorted()
    const [before, seen] = [await families(), await version()]
    const family = before[3]!
    const [L, a, b] = family.shades[0]!.lab
    const shade = await createShade(owner, createInput({ number: 'N1', color: lab(L + 0.3, a, b) }))
    expect((await standing()).get(shade.id)).toBe(family.id)
    expect(await version()).toBe(seen)
    expect((await Shade.findByPk(shade.id))!.familyPinned).toBe(false)
  })

  it('of a file are all placed, in as many queries whatever their number', async () => {
    const rows = (size: number, from: number) =>
      dyedLine(size, 5).map(
        ({ lab: [L, a, b] }, at) => `F${from + at},${L.toFixed(2)},${a.toFixed(2)},${b.toFixed(2)}`,
      )
    const send = async (lines: string[]) => {
      const { shadesRevision } = await line.reload()
      const mapping = Object.fromEntries(
        ['name', 'status', 'illuminant', 'observer', 'hex', 'order'].map((field) => [field, null]),
      )
      return importShades(
        owner,
        importShadesSchema.parse({
          lineSlug: line.slug,
          text: ['number,L,a,b', ...lines].join('\n'),
          mapping: { ...mapping, number: 0, L: 1, a: 2, b: 3 },
          terms: 'D65/10',
          shadesRevision,
        }),
      )
    }
    await send(rows(40, 0))
    expect((await families()).length).toBeGreaterThanOrEqual(5)
    const few = await countQueries(() => send(rows(12, 100)))
    const many = await countQueries(() => send(rows(90, 200)))
    expect(many.queries).toBe(few.queries)
    expect(await Shade.count({ where: { lineId: line.id, familyId: null } })).toBe(0)
  })

  it('that come back stand where they stood, or by their nearest when that family is gone', async () => {
    await sorted()
    const [, one, two] = await families()
    const shade = one!.shades[0]!
    const remove = () =>
      deleteShades(owner, { lineSlug: line.slug, shadeIds: [shade.id], confirmed: true })
    const bringBack = () => restoreShades(owner, { lineSlug: line.slug, shadeIds: [shade.id] })
    await remove()
    expect((await standing()).has(shade.id)).toBe(false)
    await bringBack()
    expect((await standing()).get(shade.id)).toBe(one!.id)

    await remove()
    await mergeFamilies(owner, { ...(await edit()), familyId: one!.id, intoId: two!.id })
    await bringBack()
    expect((await standing()).get(shade.id)).toBeDefined()
  })
})

describe('who may do what with families', () => {
  let ids: { family: string; other: string; shade: string }
  beforeEach(async () => {
    await sorted()
    const [one, two] = await families()
    ids = { family: one!.id, other: two!.id, shade: one!.shades[0]!.id }
  })

  type Edit = { lineSlug: string; version: number }
  const COMMANDS: Record<string, (actor: Actor, edit: Edit) => Promise<unknown>> = {
    sort: (actor, seen) => sortIntoFamilies(actor, { ...seen, count: 5 }),
    'preview a sort': (actor, { lineSlug }) => previewSort(actor, { lineSlug, count: 5 }),
    merge: (actor, seen) =>
      mergeFamilies(actor, { ...seen, familyId: ids.family, intoId: ids.other }),
    split: (actor, seen) => splitFamily(actor, { ...seen, familyId: ids.family }),
    move: (actor, seen) =>
      moveShadesToFamily(actor, { ...seen, shadeIds: [ids.shade], familyId: ids.other }),
    pin: (actor, seen) => pinShades(actor, { ...seen, shadeIds: [ids.shade], pinned: true }),
    'order shades': (actor, seen) =>
      orderFamilyShades(actor, { ...seen, familyId: ids.family, shadeIds: null }),
    'order families': (actor, seen) => orderFamilies(actor, { ...seen, familyIds: [ids.other] }),
    'put back': (actor, seen) =>
      restoreFamilies(actor, { ...seen, former: { count: null, families: [], shades: [] } }),
  }

  it.each(Object.entries(COMMANDS))('only owner and designer: %s', async (_name, command) => {
    for (const role of ['marketer', 'dyer'] as const) {
      await expect(command(actors[role], await edit())).rejects.toThrow(ForbiddenError)
    }
    const done = await command(actors.designer, await edit()).catch((error: unknown) => error)
    expect(done).not.toBeInstanceOf(ForbiddenError)
  })

  it('the marketer too names families; the dyer reads', async () => {
    const rename = async (actor: Actor) =>
      renameFamily(actor, { ...(await edit()), familyId: ids.family, name: 'Fleece' })
    await expect(rename(actors.dyer)).rejects.toThrow(ForbiddenError)
    await rename(actors.marketer)
    for (const actor of Object.values(actors)) {
      expect((await readFamilies(actor, line.slug)).families[0]!.name).toBe('Fleece')
    }
  })

  it.each(Object.entries(COMMANDS))('another brand finds no such line: %s', async (_n, command) => {
    await expect(command(stranger, await edit())).rejects.toThrow(NotFoundError)
  })

  it('another brand reads nothing, and its rows are found in no line of ours', async () => {
    await expect(readFamilies(stranger, line.slug)).rejects.toThrow(NotFoundError)
    expect(await listFamilies(stranger, line.id)).toEqual([])
    const theirs = await makeLine({ id: stranger.brandId })
    await makeShade(theirs, {})
    const seen = { lineSlug: theirs.slug, version: 1 }
    await sortIntoFamilies(stranger, { ...seen, count: null })
    const now = { ...seen, version: 2 }
    await expect(splitFamily(stranger, { ...now, familyId: ids.family })).rejects.toThrow(
      NotFoundError,
    )
    await expect(
      moveShadesToFamily(stranger, { ...now, shadeIds: [ids.shade], familyId: null }),
    ).rejects.toThrow(NotFoundError)
    await expect(
      pinShades(stranger, { ...now, shadeIds: [ids.shade], pinned: true }),
    ).rejects.toThrow(NotFoundError)
  })
})
