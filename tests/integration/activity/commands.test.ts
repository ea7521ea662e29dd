import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import { exportActivity } from '@/lib/activity/export-activity'
import { activityFilterSchema } from '@/lib/activity/schema'
import type { Actor } from '@/lib/auth/actor'
import { PLACE_ROLES } from '@/lib/combinations/constants'
import { deleteCombination } from '@/lib/combinations/delete-combination'
import { keepCombination } from '@/lib/combinations/keep-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { saveCombination } from '@/lib/combinations/save-combination'
import { ConflictError } from '@/lib/errors'
import { createLine } from '@/lib/lines/create-line'
import { presentLine } from '@/lib/lines/present'
import { createLineSchema, updateLineSchema } from '@/lib/lines/schema'
import { updateLine } from '@/lib/lines/update-line'
import { confirmUpload } from '@/lib/photographs/confirm-upload'
import { deletePhotographs, restorePhotographs } from '@/lib/photographs/delete-photographs'
import { rereadPhotograph } from '@/lib/photographs/reread-photograph'
import { updatePhotographSchema } from '@/lib/photographs/schema'
import { updatePhotograph } from '@/lib/photographs/update-photograph'
import { createShade } from '@/lib/shades/create-shade'
import { guessMapping } from '@/lib/shades/csv'
import { deleteShades } from '@/lib/shades/delete-shades'
import { exportShades } from '@/lib/shades/export-shades'
import { importShades } from '@/lib/shades/import-shades'
import { reorderShades } from '@/lib/shades/reorder-shades'
import { restoreShades } from '@/lib/shades/restore-shades'
import { createShadeSchema } from '@/lib/shades/schema'
import { setShadeStatus } from '@/lib/shades/set-shade-status'
import { updateShade } from '@/lib/shades/update-shade'
import { Activity, type Line, type Photograph, type Shade } from '@/models'
import { withinScope } from '@/models/scope'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph, makePicture, uploadTo } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'

let owner: Actor
let neighbour: Actor
beforeAll(async () => {
  owner = await makeActor(await makeBrand('Ours'))
  neighbour = await makeActor(await makeBrand('Theirs'))
})

interface World {
  line: Line
  shades: Shade[]
  photograph: Photograph
}

interface Doing {
  action: string
  /** Makes what must be there before, and gives what is then done. */
  do: (world: World) => Promise<() => Promise<unknown>>
  row: (world: World) => object
}

const of = (line: Line, ...shades: Shade[]) => ({
  lineSlug: line.slug,
  shadeIds: shades.map(({ id }) => id),
})

const DOINGS: Doing[] = [
  {
    action: 'line.created',
    do: ({ line }) =>
      Promise.resolve(() =>
        createLine(
          owner,
          createLineSchema.parse({
            ...presentLine(line).values,
            name: `Sock ${randomUUID().slice(0, 8)}`,
            requestKey: randomUUID(),
          }),
        ),
      ),
    row: () => ({ objectKind: 'line', after: { ply: 3, priceMinor: 2150 } }),
  },
  {
    action: 'line.updated',
    do: ({ line }) =>
      Promise.resolve(() =>
        updateLine(
          owner,
          updateLineSchema.parse({
            ...presentLine(line).values,
            price: 22,
            fibres: [
              { fibre: 'wool', percent: 70 },
              { fibre: 'silk', percent: 30 },
            ],
            lineSlug: line.slug,
            version: line.version,
          }),
        ),
      ),
    row: ({ line }) => ({
      objectId: line.id,
      before: { priceMinor: 2150, fibres: [{ fibre: 'wool', percent: 100 }] },
      after: {
        priceMinor: 2200,
        fibres: [
          { fibre: 'wool', percent: 70 },
          { fibre: 'silk', percent: 30 },
        ],
      },
    }),
  },
  {
    action: 'shade.created',
    do: ({ line }) =>
      Promise.resolve(() =>
        createShade(
          owner,
          createShadeSchema.parse({
            lineSlug: line.slug,
            requestKey: randomUUID(),
            number: '77',
            name: null,
            status: 'target',
            color: { kind: 'hex', hex: '#123456' },
          }),
        ),
      ),
    row: ({ line }) => ({
      objectKind: 'shade',
      objectLabel: `No. 77 of ${line.name}`,
      after: { number: '77', status: 'target', hex: '#123456' },
    }),
  },
  {
    action: 'shade.updated',
    do: ({ line, shades: [shade] }) =>
      Promise.resolve(() =>
        updateShade(owner, {
          lineSlug: line.slug,
          shadeId: shade!.id,
          version: shade!.version,
          number: shade!.number,
          status: 'dipped',
          color: { kind: 'lab', L: shade!.labL, a: -13, b: shade!.labB, terms: 'D65/10' },
        }),
      ),
    row: ({ shades: [shade] }) => ({
      objectId: shade!.id,
      before: { status: 'target', labA: -12 },
      after: { status: 'dipped', labA: -13 },
    }),
  },
  {
    action: 'shade.status-set',
    do: ({ line, shades }) =>
      Promise.resolve(() =>
        setShadeStatus(owner, { ...of(line, ...shades.slice(0, 3)), status: 'approved' }),
      ),
    row: ({ line }) => ({
      objectKind: 'line',
      objectId: line.id,
      before: { status: ['target'] },
      after: { status: 'approved', count: 3, named: expect.arrayContaining(['No. S1']) },
    }),
  },
  {
    action: 'shade.reordered',
    do: ({ line, shades: [first] }) =>
      Promise.resolve(() => reorderShades(owner, { ...of(line, first!), place: 4 })),
    row: ({ shades: [first] }) => ({
      objectId: first!.id,
      before: { place: 1 },
      after: { place: 4 },
    }),
  },
  {
    action: 'shade.deleted',
    do: ({ line, shades: [, second] }) =>
      Promise.resolve(() => deleteShades(owner, { ...of(line, second!), confirmed: true })),
    row: ({ line, shades: [, second] }) => ({
      objectKind: 'shade',
      objectId: second!.id,
      objectLabel: `No. S2 of ${line.name}`,
    }),
  },
  {
    action: 'shade.restored',
    do: async ({ line, shades }) => {
      const some = of(line, ...shades.slice(0, 2))
      await deleteShades(owner, { ...some, confirmed: true })
      return () => restoreShades(owner, some)
    },
    row: ({ line }) => ({ objectId: line.id, after: { count: 2 } }),
  },
  {
    action: 'shade.imported',
    do: ({ line }) =>
      Promise.resolve(() =>
        importShades(owner, {
          lineSlug: line.slug,
          text: 'number,hex\nN1,#123456\nS1,#aabbcc\nN2,nonsense\n',
          terms: null,
          mapping: guessMapping(['number', 'hex']),
          shadesRevision: line.shadesRevision,
        }),
      ),
    row: ({ line }) => ({
      objectId: line.id,
      after: { new: 1, changed: 1, unchanged: 0, bad: 1, named: ['No. N1', 'No. S1'] },
    }),
  },
  {
    action: 'shade.exported',
    do: ({ line }) => Promise.resolve(() => exportShades(owner, line.slug)),
    row: ({ line }) => ({ objectId: line.id, after: { count: 6 } }),
  },
  {
    action: 'photograph.added',
    do: async ({ line }) => {
      const photographId = await uploadTo(owner, line, await makePicture())
      return () => confirmUpload(owner, { photographId })
    },
    row: () => ({ objectKind: 'photograph', after: { fileName: 'hillside.jpg' } }),
  },
  {
    action: 'photograph.updated',
    do: ({ photograph }) =>
      Promise.resolve(() =>
        updatePhotograph(
          owner,
          updatePhotographSchema.parse({
            title: photograph.title,
            photographer: 'A. Person',
            licence: 'own-work',
            licenceNote: '',
            licenceUrl: '',
            sourceUrl: '',
            altText: '',
            photographId: photograph.id,
            version: photograph.version,
          }),
        ),
      ),
    row: ({ photograph }) => ({
      objectId: photograph.id,
      before: { photographer: '', licence: null },
      after: { photographer: 'A. Person', licence: 'own-work' },
    }),
  },
  {
    action: 'photograph.reread',
    do: ({ photograph }) =>
      Promise.resolve(() => rereadPhotograph(owner, { photographId: photograph.id })),
    row: ({ photograph }) => ({ objectId: photograph.id }),
  },
  {
    action: 'photograph.deleted',
    do: async ({ line, photograph }) => {
      const other = await makePhotograph(line, { title: 'Another' })
      return () => deletePhotographs(owner, { photographIds: [photograph.id, other.id] })
    },
    row: () => ({
      objectId: null,
      after: { count: 2, named: expect.arrayContaining(['A photograph', 'Another']) },
    }),
  },
  {
    action: 'photograph.restored',
    do: async ({ photograph }) => {
      await deletePhotographs(owner, { photographIds: [photograph.id] })
      return () => restorePhotographs(owner, { photographIds: [photograph.id] })
    },
    row: ({ photograph }) => ({ objectId: photograph.id, objectLabel: 'A photograph' }),
  },
  {
    action: 'combination.kept',
    do: ({ line, shades, photograph }) =>
      Promise.resolve(() =>
        keepCombination(owner, {
          lineSlug: line.slug,
          photographId: photograph.id,
          reading: 'true',
          title: 'Low Sun',
          places: shades.slice(1, 6).map(({ id }) => ({ shadeId: id, share: 0.2 })),
          requestKey: randomUUID(),
        }),
      ),
    row: () => ({
      objectKind: 'combination',
      objectLabel: 'Low Sun',
      after: { order: ['No. S2', 'No. S3', 'No. S4', 'No. S5', 'No. S6'] },
    }),
  },
  {
    action: 'combination.renamed',
    do: async ({ line, shades }) => {
      const { id, version } = await makeCombination(line, shades, { title: 'Low Sun' })
      return () => saveCombination(owner, { combinationId: id, version, title: 'Late Sun' })
    },
    row: () => ({
      objectLabel: 'Low Sun',
      before: { title: 'Low Sun' },
      after: { title: 'Late Sun' },
    }),
  },
  {
    action: 'combination.edited',
    do: async ({ line, shades }) => {
      const { id, version, title } = await makeCombination(line, shades)
      const places = [1, 0, 2, 3, 4].map((at, place) => ({
        shadeId: shades[at]!.id,
        share: 0.2,
        role: PLACE_ROLES[place]!,
        locked: false,
      }))
      return () => saveCombination(owner, { combinationId: id, version, title, places })
    },
    row: () => ({
      before: { order: ['No. S1', 'No. S2', 'No. S3', 'No. S4', 'No. S5'] },
      after: { order: ['No. S2', 'No. S1', 'No. S3', 'No. S4', 'No. S5'] },
    }),
  },
  {
    action: 'combination.deleted',
    do: async ({ line, shades }) => {
      const { id } = await makeCombination(line, shades)
      return () => deleteCombination(owner, { combinationId: id })
    },
    row: () => ({ objectKind: 'combination', objectLabel: 'A combination' }),
  },
  {
    action: 'combination.restored',
    do: async ({ line, shades }) => {
      const { id } = await makeCombination(line, shades)
      await deleteCombination(owner, { combinationId: id })
      return () => restoreCombination(owner, { combinationId: id })
    },
    row: () => ({ objectKind: 'combination', objectLabel: 'A combination' }),
  },
  {
    action: 'activity.exported',
    do: () =>
      Promise.resolve(() => exportActivity(owner, activityFilterSchema.parse({ what: 'line' }))),
    row: () => ({ objectId: null, after: { what: 'line' } }),
  },
]

async function makeWorld(): Promise<World> {
  const line = await makeLine({ id: owner.brandId }, { name: 'Heronsway DK' })
  return { line, shades: await makeShades(line, 6), photograph: await makePhotograph(line) }
}

const rowsOf = (requestId: string) => Activity.findAll({ where: { requestId } })

describe.each(DOINGS)('$action', ({ action, do: prepare, row }) => {
  it('is recorded once, with who, what, before and after, and the request', async () => {
    const world = await makeWorld()
    const attempt = await prepare(world)
    const requestId = randomUUID()
    await withinScope({ requestId }, () => attempt())
    const rows = await rowsOf(requestId)
    expect(rows).toHaveLength(1)
    expect(rows[0]!.get()).toMatchObject({
      action,
      brandId: owner.brandId,
      personId: owner.personId,
      ...row(world),
    })
  })
})

describe('the record', () => {
  it('of a change that changed nothing has no line', async () => {
    const { line, shades } = await makeWorld()
    const { id, version } = await makeCombination(line, shades, { title: 'Low Sun' })
    const requestId = randomUUID()
    await withinScope({ requestId }, async () => {
      await saveCombination(owner, { combinationId: id, version, title: 'Low Sun' })
      await restoreCombination(owner, { combinationId: id })
      await restoreShades(owner, of(line, shades[0]!))
      await setShadeStatus(owner, { ...of(line, shades[0]!), status: 'target' })
    })
    expect(await rowsOf(requestId)).toEqual([])
  })

  it('of ten identical submits has one line', async () => {
    const { line } = await makeWorld()
    const input = createShadeSchema.parse({
      lineSlug: line.slug,
      requestKey: randomUUID(),
      number: '88',
      name: null,
      status: 'target',
      color: { kind: 'hex', hex: '#123456' },
    })
    const requestId = randomUUID()
    await withinScope({ requestId }, () =>
      Promise.all(Array.from({ length: 10 }, () => createShade(owner, input))),
    )
    expect(await rowsOf(requestId)).toHaveLength(1)
  })

  it('says nothing of what was rolled back', async () => {
    const { line, shades } = await makeWorld()
    const requestId = randomUUID()
    const clash = withinScope({ requestId }, () =>
      updateShade(owner, {
        lineSlug: line.slug,
        shadeId: shades[0]!.id,
        version: 99,
        status: 'dipped',
      }),
    )
    await expect(clash).rejects.toThrow(ConflictError)
    expect(await rowsOf(requestId)).toEqual([])
  })

  it('names at most twenty of many, and counts them all', async () => {
    const line = await makeLine({ id: owner.brandId })
    const shades = await makeShades(line, 30)
    const requestId = randomUUID()
    await withinScope({ requestId }, () =>
      deleteShades(owner, { ...of(line, ...shades), confirmed: true }),
    )
    const [row] = await rowsOf(requestId)
    expect(row!.after).toMatchObject({ count: 30 })
    expect(row!.after!.named).toHaveLength(20)
  })

  it('of all of this stands in our brand alone, and holds no secret', async () => {
    const rows = await Activity.findAll({ raw: true })
    expect(rows.filter(({ brandId }) => brandId === neighbour.brandId)).toEqual([])
    const actions = new Set(rows.map(({ action }) => action))
    for (const { action } of DOINGS) expect(actions).toContain(action)
    const told = rows.map(({ objectLabel, before, after }) => [objectLabel, before, after])
    expect(JSON.stringify(told)).not.toMatch(
      /argon2|password|token|secret|[0-9a-f]{64}|requestKey|objectKey/i,
    )
  })
})
