import { randomUUID } from 'node:crypto'
import { deflateSync } from 'node:zlib'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { isMatch, type Match } from '@/lib/color/match'
import { readPhotographColors } from '@/lib/color/photograph-colors'
import { ForbiddenError, InvalidError, NotFoundError } from '@/lib/errors'
import type { Role } from '@/lib/people/constants'
import { computeMatches } from '@/lib/photographs/compute-matches'
import { decodePhotograph } from '@/lib/photographs/decode'
import { getCellMap, matchWithWishes } from '@/lib/photographs/match'
import { matchParamsSchema } from '@/lib/photographs/schema'
import { Reading, type Photograph, type Shade } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph, makePicture } from '@/tests/factories/photograph'
import { makeShade } from '@/tests/factories/shade'
import { countQueries } from '@/tests/integration/setup/count-queries'

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>
let photograph: Photograph
let shades: Shade[]

beforeAll(async () => {
  ours = await makeActors(await makeBrand())
  theirs = await makeActors(await makeBrand())
  const line = await makeLine({ id: ours.owner.brandId })
  shades = await Promise.all(
    Array.from({ length: 24 }, (_, position) =>
      makeShade(line, {
        position,
        labL: 20 + 3 * position,
        labA: 30 * Math.cos(position),
        labB: 30 * Math.sin(position),
      }),
    ),
  )
  photograph = await makePhotograph(line)
  const { image } = await decodePhotograph(await makePicture())
  const colors = readPhotographColors(image)
  await Reading.create({
    brandId: ours.owner.brandId,
    photographId: photograph.id,
    cells: colors.cells,
    cellMap: deflateSync(colors.cellMap),
    mapWidth: colors.width,
    mapHeight: colors.height,
    striking: [],
    matches: computeMatches(colors.cells, []),
    shadesRevision: 1,
  })
})

const asking = (query: Record<string, string> = {}, id = photograph.id) =>
  matchParamsSchema.parse({ photograph: id, ...query })

async function match(query: Record<string, string> = {}): Promise<Match> {
  const found = await matchWithWishes(ours.owner, asking(query))
  if (!isMatch(found)) throw new Error(found.unavailable)
  return found
}

const idsOf = ({ places }: Match) => places.map(({ shadeId }) => shadeId)

describe('matching under wishes', () => {
  it('holds what is locked, leaves out what is excluded, and proves what it finds', async () => {
    const free = await match()
    const outsider = shades.find(({ id }) => !idsOf(free).includes(id))!
    const [unwanted] = idsOf(free)
    const bent = await match({ lock: outsider.id, exclude: unwanted! })
    expect(idsOf(bent)).toContain(outsider.id)
    expect(idsOf(bent)).not.toContain(unwanted)
    expect(bent.places.find(({ shadeId }) => shadeId === outsider.id)!.locked).toBe(true)
    expect([free.certified, bent.certified]).toEqual([true, true])
    // A wish can only cost something.
    expect(bent.objective).toBeGreaterThanOrEqual(free.objective - 1e-9)
  })

  it('says in words when the wishes contradict themselves', async () => {
    const [one] = shades
    const asked = matchWithWishes(ours.owner, asking({ lock: one!.id, exclude: one!.id }))
    await expect(asked).rejects.toThrow(InvalidError)
    await expect(matchWithWishes(ours.owner, asking({ lock: randomUUID() }))).rejects.toThrow(
      /not in this line/,
    )
  })

  it('says in words when too few shades are left', async () => {
    const exclude = shades
      .slice(4)
      .map(({ id }) => id)
      .join(',')
    expect(await matchWithWishes(ours.owner, asking({ exclude }))).toMatchObject({
      unavailable: expect.stringMatching(/fewer than five/i),
    })
  })

  it('asks the database twice', async () => {
    expect((await countQueries(() => match())).queries).toBe(2)
  })

  it.each([
    ['a reading there is none of', { reading: 'loud' }],
    ['locks that are no ids', { lock: 'x,y' }],
    ['more apart than can be asked', { apart: '26' }],
    ['apart in words', { apart: 'far' }],
  ])('refuses %s', (_, query) => {
    expect(matchParamsSchema.safeParse({ photograph: 'x', ...query }).success).toBe(false)
  })
})

describe('who may match', () => {
  it.each([
    ['match', (actor: Actor, id: string) => matchWithWishes(actor, asking({}, id))],
    ['see the cells', (actor: Actor, id: string) => getCellMap(actor, { photographId: id })],
  ])('everybody but the dye house may %s, and another brand finds nothing', async (_, work) => {
    for (const role of ['owner', 'designer', 'marketer'] as const) {
      await expect(work(ours[role], photograph.id)).resolves.toBeDefined()
    }
    await expect(work(ours.dyer, photograph.id)).rejects.toThrow(ForbiddenError)
    for (const [actor, id] of [
      [theirs.owner, photograph.id],
      [ours.owner, randomUUID()],
      [ours.owner, 'no-id'],
    ] as const) {
      await expect(work(actor, id)).rejects.toThrow(NotFoundError)
    }
  })

  it('the cells are one byte a pixel', async () => {
    const { width, height, cells } = await getCellMap(ours.owner, { photographId: photograph.id })
    expect(cells).toHaveLength(width * height)
  })
})
