import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { createShade } from '@/lib/shades/create-shade'
import { guessMapping } from '@/lib/shades/csv'
import { deleteShades } from '@/lib/shades/delete-shades'
import { exportShades } from '@/lib/shades/export-shades'
import { importShades } from '@/lib/shades/import-shades'
import { previewImport } from '@/lib/shades/preview-import'
import {
  getShade,
  listAllShades,
  listMatchShades,
  listShadeTable,
  readSampleBook,
} from '@/lib/shades/queries'
import { readRangeStudy } from '@/lib/shades/range-study'
import { reorderShades } from '@/lib/shades/reorder-shades'
import { restoreShades } from '@/lib/shades/restore-shades'
import { createShadeSchema, shadeTableSchema } from '@/lib/shades/schema'
import { setShadeStatus } from '@/lib/shades/set-shade-status'
import { updateShade } from '@/lib/shades/update-shade'
import { Line, Shade } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShade } from '@/tests/factories/shade'

const EDITORS: readonly Role[] = ['owner', 'designer']
const CSV = 'number,hex\nNew,#123456\n'

interface Doing {
  name: string
  roles: readonly Role[]
  do: (actor: Actor, line: Line, shade: Shade) => Promise<unknown>
  /** Whether it takes a shade, so that one of another line must not be found. */
  ofShade?: boolean
}

const on = (line: Line, shade: Shade) => ({ lineSlug: line.slug, shadeIds: [shade.id] })
const importing = (line: Line) => ({
  lineSlug: line.slug,
  text: CSV,
  terms: null,
  mapping: guessMapping(['number', 'hex']),
})
const newShade = (line: Line) =>
  createShadeSchema.parse({
    lineSlug: line.slug,
    requestKey: randomUUID(),
    number: randomUUID().slice(0, 8),
    name: '',
    status: 'target',
    color: { kind: 'hex', hex: '#123456' },
  })

const DOINGS: Doing[] = [
  {
    name: 'see the table',
    roles: ROLES,
    do: (actor, line) => listShadeTable(actor, line.slug, shadeTableSchema.parse({})),
  },
  {
    name: 'see the sample book',
    roles: ROLES,
    do: (actor, line) => readSampleBook(actor, line.slug, { order: 'family', page: 1 }),
  },
  {
    name: 'see one shade',
    roles: ROLES,
    do: (actor, line, shade) => getShade(actor, line.slug, shade.id),
    ofShade: true,
  },
  {
    name: 'study the range',
    roles: ROLES,
    do: (actor, line) => readRangeStudy(actor, line.slug, { twins: 4 }),
  },
  { name: 'list all', roles: ROLES, do: (actor, line) => listAllShades(actor, line.slug) },
  { name: 'export', roles: ROLES, do: (actor, line) => exportShades(actor, line.slug) },
  { name: 'add', roles: EDITORS, do: (actor, line) => createShade(actor, newShade(line)) },
  {
    name: 'change',
    roles: EDITORS,
    do: (actor, line, { id, version }) =>
      updateShade(actor, { lineSlug: line.slug, shadeId: id, version, status: 'dipped' }),
    ofShade: true,
  },
  {
    name: 'set the status',
    roles: EDITORS,
    do: (actor, line, shade) => setShadeStatus(actor, { ...on(line, shade), status: 'dipped' }),
    ofShade: true,
  },
  {
    name: 'order',
    roles: EDITORS,
    do: (actor, line, shade) => reorderShades(actor, { ...on(line, shade), place: 1 }),
    ofShade: true,
  },
  {
    name: 'delete',
    roles: EDITORS,
    do: (actor, line, shade) => deleteShades(actor, { ...on(line, shade), confirmed: false }),
    ofShade: true,
  },
  {
    name: 'take a deletion back',
    roles: EDITORS,
    do: (actor, line, shade) => restoreShades(actor, on(line, shade)),
    ofShade: true,
  },
  {
    name: 'preview an import',
    roles: EDITORS,
    do: (actor, line) => previewImport(actor, importing(line)),
  },
  {
    name: 'import',
    roles: EDITORS,
    do: (actor, line) =>
      importShades(actor, { ...importing(line), shadesRevision: line.shadesRevision }),
  },
]

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>

beforeAll(async () => {
  ours = await makeActors(await makeBrand('Ours'))
  theirs = await makeActors(await makeBrand('Theirs'))
})

async function makeOurs() {
  const line = await makeLine({ id: ours.owner.brandId })
  return { line, shade: await makeShade(line) }
}

/** Everything that a refused attempt must leave as it was. */
async function stateOf(line: Line) {
  const shades = await Shade.findAll({ where: { lineId: line.id }, paranoid: false, raw: true })
  const { shadesRevision } = await line.reload()
  return { shades, shadesRevision }
}

describe.each(DOINGS)('to $name', ({ roles, do: attempt }) => {
  it.each(ROLES)('as a %s of the brand', async (role) => {
    const { line, shade } = await makeOurs()
    const before = await stateOf(line)
    if (roles.includes(role)) {
      await expect(attempt(ours[role], line, shade)).resolves.toBeDefined()
    } else {
      await expect(attempt(ours[role], line, shade)).rejects.toThrow(ForbiddenError)
      expect(await stateOf(line)).toEqual(before)
    }
  })

  it('of another brand is as of one that does not exist', async () => {
    const { line, shade } = await makeOurs()
    const before = await stateOf(line)
    const unknown = Line.build({ ...line.get(), id: randomUUID(), slug: 'no-such-line' })
    const missing = await attempt(theirs.owner, unknown, shade).catch((error: unknown) => error)
    const foreign = await attempt(theirs.owner, line, shade).catch((error: unknown) => error)
    expect(missing).toBeInstanceOf(NotFoundError)
    expect(foreign).toEqual(missing)
    expect(await stateOf(line)).toEqual(before)
  })
})

describe.each(DOINGS.filter(({ ofShade }) => ofShade))('to $name', ({ do: attempt }) => {
  it('does not reach a shade of another line or brand', async () => {
    const { line } = await makeOurs()
    const sister = await makeShade(await makeLine({ id: ours.owner.brandId }))
    const foreign = await makeShade(await makeLine({ id: theirs.owner.brandId }))
    const unknown = Shade.build({ ...foreign.get(), id: randomUUID() })
    for (const shade of [sister, foreign, unknown]) {
      await expect(attempt(ours.owner, line, shade)).rejects.toThrow(NotFoundError)
    }
    await expect(sister.reload()).resolves.toMatchObject({ name: null, version: 1 })
    await expect(foreign.reload()).resolves.toMatchObject({ name: null, version: 1 })
  })
})

describe('the shades for a match', () => {
  it('are those of the line that are neither deleted nor retired, in its order', async () => {
    const line = await makeLine({ id: ours.owner.brandId })
    await makeShade(line, { position: 2 })
    await makeShade(line, { position: 1 })
    await makeShade(line, { position: 0, status: 'retired' })
    await (await makeShade(line, { position: 3 })).destroy()
    const shades = await listMatchShades(ours.dyer, line.id)
    expect(shades.map(({ number }) => number)).toEqual(['S2', 'S3'])
  })

  it('are none for another brand', async () => {
    const { line } = await makeOurs()
    await expect(listMatchShades(theirs.owner, line.id)).resolves.toEqual([])
  })
})

describe('a shade leaves the server', () => {
  it('without the columns that are ours alone', async () => {
    const { line, shade } = await makeOurs()
    const detail = await getShade(ours.dyer, line.slug, shade.id)
    expect(Object.keys(detail.shade).sort()).toEqual(
      [
        'enteredHex',
        'familyId',
        'familyPinned',
        'familyPosition',
        'hex',
        'id',
        'illuminant',
        'inGamut',
        'lab',
        'label',
        'name',
        'number',
        'observer',
        'position',
        'status',
        'version',
      ].sort(),
    )
  })

  it('without its combinations for a dyer, who sees shades only', async () => {
    const { line, shade } = await makeOurs()
    expect((await getShade(ours.dyer, line.slug, shade.id)).uses).toBeNull()
    expect((await getShade(ours.marketer, line.slug, shade.id)).uses).toEqual({
      combinations: [],
      total: 0,
      shadeIds: [],
    })
  })

  it('is not found by an address that is no id', async () => {
    const { line } = await makeOurs()
    await expect(getShade(ours.owner, line.slug, '14')).rejects.toThrow(NotFoundError)
  })
})
