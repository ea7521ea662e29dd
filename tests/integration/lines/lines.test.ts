import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { createLine } from '@/lib/lines/create-line'
import { presentLine } from '@/lib/lines/present'
import { getLine, getLineWithMargin, listLines } from '@/lib/lines/queries'
import { createLineSchema, type CreateLineInput } from '@/lib/lines/schema'
import { updateLine } from '@/lib/lines/update-line'
import { ROLES, type Role } from '@/lib/people/constants'
import { Line } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShades } from '@/tests/factories/shade'

const input = (name: string): CreateLineInput =>
  createLineSchema.parse({
    name,
    fibres: [
      { fibre: 'wool', percent: '70' },
      { fibre: 'silk', percent: '30' },
    ],
    ply: '3',
    weightNumber: '3',
    netGrams: '100',
    length: '225',
    lengthUnit: 'm',
    needleMm: '4',
    gaugeStitches: '22',
    gaugeRows: '30',
    currency: 'GBP',
    price: '21.50',
    launchDate: '2027-03-20',
    requestKey: randomUUID(),
  })

const changes = ({ requestKey: _requestKey, ...fields }: CreateLineInput, line: Line) => ({
  ...fields,
  lineSlug: line.slug,
  version: line.version,
})

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>

beforeAll(async () => {
  ours = await makeActors(await makeBrand())
  theirs = await makeActors(await makeBrand())
})

type Doing = (actor: Actor, line: Line) => Promise<unknown>
const DOINGS: { name: string; do: Doing; roles: readonly Role[]; ofTheLine: boolean }[] = [
  {
    name: 'list the lines',
    do: (a) => listLines(a, { page: 1, perPage: 5 }),
    roles: ROLES,
    ofTheLine: false,
  },
  {
    name: 'read a line with its margin',
    do: (a, line) => getLineWithMargin(a, line.slug),
    roles: ROLES,
    ofTheLine: true,
  },
  { name: 'read a line', do: (a, line) => getLine(a, line.slug), roles: ROLES, ofTheLine: true },
  {
    name: 'make a line',
    do: (a) => createLine(a, input(`Line ${randomUUID()}`)),
    roles: ['owner'],
    ofTheLine: false,
  },
  {
    name: 'change a line',
    do: (a, line) => updateLine(a, changes(input('Other'), line)),
    roles: ['owner'],
    ofTheLine: true,
  },
]

describe('who may do what with lines', () => {
  for (const doing of DOINGS) {
    for (const role of ROLES) {
      const may = doing.roles.includes(role)
      it(`${role} ${may ? 'may' : 'may not'} ${doing.name}`, async () => {
        const actor = ours[role]
        const work = doing.do(actor, await makeLine({ id: actor.brandId }))
        if (may) await expect(work).resolves.toBeDefined()
        else await expect(work).rejects.toThrow(ForbiddenError)
      })
    }
    if (!doing.ofTheLine) continue
    it(`another brand's owner gets "not found" on trying to ${doing.name}, as for no line at all`, async () => {
      const line = await makeLine({ id: ours.owner.brandId })
      const refused = await doing.do(theirs.owner, line).catch((error: unknown) => error)
      const unknown = await doing
        .do(theirs.owner, Line.build({ ...line.get(), slug: 'no-such-line' }))
        .catch((error: unknown) => error)
      expect(refused).toBeInstanceOf(NotFoundError)
      expect((refused as Error).message).toBe((unknown as Error).message)
    })
  }

  it("another brand's lines are in no list and no count", async () => {
    const line = await makeLine({ id: ours.owner.brandId })
    const { lines } = await listLines(theirs.owner, { page: 1, perPage: 200 })
    expect(lines.map((one) => one.line.id)).not.toContain(line.id)
    // Even under the same address, theirs is theirs and counts what is theirs.
    const same = await makeLine({ id: theirs.owner.brandId }, { slug: line.slug })
    await makeShades(line, 2)
    await makeShades(same, 1)
    const margin = await getLineWithMargin(theirs.owner, line.slug)
    expect(margin.line.id).toBe(same.id)
    expect(margin.counts).toEqual({ shades: 1, photographs: 0, combinations: 0, names: 0, kits: 0 })
    const names = margin.lines
    const own = await Line.findAll({ where: { brandId: theirs.owner.brandId } })
    expect(names.map(({ name }) => name)).toEqual(own.map(({ name }) => name).sort())
  })

  it('the dye house is told of no chapter but the shades', async () => {
    const line = await makeLine({ id: ours.owner.brandId })
    expect((await getLineWithMargin(ours.dyer, line.slug)).counts).toEqual({ shades: 0 })
  })
})

describe('making a line', () => {
  it('ten identical submits make one line and get the same answer', async () => {
    const once = input(`Line ${randomUUID()}`)
    const made = await Promise.all(Array.from({ length: 10 }, () => createLine(ours.owner, once)))
    expect(new Set(made.map(({ id }) => id)).size).toBe(1)
    expect(await Line.count({ where: { brandId: ours.owner.brandId, name: once.name } })).toBe(1)
  })

  it('a name that is taken is refused beside its field, whatever its case and accents', async () => {
    await createLine(ours.owner, input('Fellside Ivóry'))
    const again = createLine(ours.owner, input('FELLSIDE IVORY'))
    await expect(again).rejects.toThrow(ConflictError)
    await expect(again).rejects.toMatchObject({ fieldErrors: { name: [expect.any(String)] } })
  })

  it('two brands may use the same name', async () => {
    await createLine(ours.owner, input('Shared Name'))
    await expect(createLine(theirs.owner, input('Shared Name'))).resolves.toMatchObject({
      slug: 'shared-name',
    })
  })

  it('keeps price, length and weight as entered', async () => {
    const line = await createLine(ours.owner, input(`Line ${randomUUID()}`))
    expect(presentLine(line)).toMatchObject({
      price: '£21.50',
      length: '225 m (246 yd)',
      weight: '100 g (3.5 oz)',
      fibreContent: '70 % wool, 30 % silk',
      launchDate: '20 March 2027',
    })
  })
})

describe('changing a line', () => {
  it('raises its version and keeps its address', async () => {
    const line = await createLine(ours.owner, input(`Line ${randomUUID()}`))
    const changed = await updateLine(ours.owner, changes(input(`New ${randomUUID()}`), line))
    expect(changed.version).toBe(line.version + 1)
    expect(changed.slug).toBe(line.slug)
  })

  it('is refused when somebody saved in between, and theirs stands', async () => {
    const line = await createLine(ours.owner, input(`Line ${randomUUID()}`))
    await updateLine(ours.owner, changes(input('Theirs'), line))
    await expect(updateLine(ours.owner, changes(input('Mine'), line))).rejects.toThrow(
      ConflictError,
    )
    expect((await getLine(ours.owner, line.slug)).name).toBe('Theirs')
  })
})
