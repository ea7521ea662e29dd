import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { confirmUpload, withdrawUpload } from '@/lib/photographs/confirm-upload'
import { deletePhotographs, restorePhotographs } from '@/lib/photographs/delete-photographs'
import {
  countPhotographs,
  getDerivative,
  getPhotograph,
  listPhotographs,
  listStandings,
} from '@/lib/photographs/queries'
import { requestUpload } from '@/lib/photographs/request-upload'
import { rereadPhotograph } from '@/lib/photographs/reread-photograph'
import { galleryFilterSchema, updatePhotographSchema } from '@/lib/photographs/schema'
import { updatePhotograph } from '@/lib/photographs/update-photograph'
import { Photograph, type Line } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { announce, makePhotograph } from '@/tests/factories/photograph'
import { countQueries } from '@/tests/integration/setup/count-queries'

const READERS: readonly Role[] = ['owner', 'marketer', 'designer']
const UPLOADERS: readonly Role[] = ['owner', 'designer']
const ALL = galleryFilterSchema.parse({})

const words = (photograph: Photograph, title = 'New words') =>
  updatePhotographSchema.parse({
    photographId: photograph.id,
    version: photograph.version,
    title,
    photographer: 'Somebody of ours',
    licence: 'own-work',
    licenceNote: '',
    licenceUrl: '',
    sourceUrl: '',
    altText: 'A hill.',
  })

interface Doing {
  name: string
  roles: readonly Role[]
  do: (actor: Actor, line: Line, photograph: Photograph) => Promise<unknown>
  /** What it answers when the photograph is there, other than success. */
  answers?: typeof NotFoundError
  /** It is about one photograph, so that another brand's must not be found. */
  ofOne?: boolean
}

const DOINGS: Doing[] = [
  { name: 'see the gallery', roles: READERS, do: (a, line) => listPhotographs(a, line, ALL) },
  { name: 'count the photographs', roles: READERS, do: (a, line) => countPhotographs(a, line) },
  {
    name: 'open a photograph',
    roles: READERS,
    ofOne: true,
    do: (a, line, one) => getPhotograph(a, line.slug, one.id),
  },
  { name: 'follow a reading', roles: READERS, do: (a, _, one) => listStandings(a, [one.id]) },
  // The row has no copies: whoever may ask is told that there is none.
  {
    name: 'fetch a copy',
    roles: READERS,
    answers: NotFoundError,
    do: (a, _, one) => getDerivative(a, one.id, 'x.webp'),
  },
  {
    name: 'add a photograph',
    roles: UPLOADERS,
    do: (a, line) => requestUpload(a, announce(line, Buffer.from(randomUUID()))),
  },
  {
    name: 'confirm an upload',
    roles: UPLOADERS,
    ofOne: true,
    do: (a, _, one) => confirmUpload(a, { photographId: one.id }),
  },
  {
    name: 'cancel an upload',
    roles: UPLOADERS,
    answers: NotFoundError,
    ofOne: true,
    do: (a, _, one) => withdrawUpload(a, { photographId: one.id }),
  },
  {
    name: 'write its words',
    roles: READERS,
    ofOne: true,
    do: (a, _, one) => updatePhotograph(a, words(one)),
  },
  {
    name: 'have it read again',
    roles: UPLOADERS,
    ofOne: true,
    do: (a, _, one) => rereadPhotograph(a, { photographId: one.id }),
  },
  {
    name: 'delete it',
    roles: UPLOADERS,
    ofOne: true,
    do: (a, _, one) => deletePhotographs(a, { photographIds: [one.id] }),
  },
  {
    name: 'bring it back',
    roles: UPLOADERS,
    ofOne: true,
    do: (a, _, one) => restorePhotographs(a, { photographIds: [one.id] }),
  },
]

let ours: Record<Role, Actor>
let theirs: Record<Role, Actor>
let line: Line

beforeAll(async () => {
  ours = await makeActors(await makeBrand())
  theirs = await makeActors(await makeBrand())
  line = await makeLine({ id: ours.owner.brandId })
})

describe('who may do what with photographs', () => {
  for (const doing of DOINGS) {
    for (const role of ROLES) {
      const may = doing.roles.includes(role)
      it(`${role} ${may ? 'may' : 'may not'} ${doing.name}`, async () => {
        const work = doing.do(ours[role], line, await makePhotograph(line))
        if (!may) await expect(work).rejects.toThrow(ForbiddenError)
        else if (doing.answers) await expect(work).rejects.toThrow(doing.answers)
        else await work
      })
    }
    if (!doing.ofOne) continue
    it(`another brand's owner finds nothing to ${doing.name.replace(/^(\w+) .*/, '$1')}, as with an unknown one`, async () => {
      const photograph = await makePhotograph(line)
      const unknown = Photograph.build({ ...photograph.get(), id: randomUUID() })
      const answers = await Promise.all(
        [photograph, unknown].map((one) =>
          doing.do(theirs.owner, line, one).catch((error: unknown) => error),
        ),
      )
      for (const answer of answers) expect(answer).toBeInstanceOf(NotFoundError)
      expect((answers[0] as Error).message).toBe((answers[1] as Error).message)
      expect((await photograph.reload()).title).toBe('A photograph')
    })
  }

  it("another brand's photographs are in no gallery, no count and no following", async () => {
    const { id } = await makePhotograph(line)
    expect((await listPhotographs(theirs.owner, line, ALL)).total).toBe(0)
    expect((await countPhotographs(theirs.owner, line)).all).toBe(0)
    expect(await listStandings(theirs.owner, [id])).toEqual([])
  })

  it('deleting ours together with theirs deletes neither', async () => {
    const mine = await makePhotograph(line)
    const other = await makePhotograph(await makeLine({ id: theirs.owner.brandId }))
    const both = { photographIds: [mine.id, other.id] }
    await expect(deletePhotographs(ours.owner, both)).rejects.toThrow(NotFoundError)
    expect(await Photograph.count({ where: { id: [mine.id, other.id] } })).toBe(2)
  })
})

describe('the words of a photograph', () => {
  it('are refused when somebody saved in between, and theirs stand', async () => {
    const photograph = await makePhotograph(line)
    await updatePhotograph(ours.marketer, words(photograph, 'Theirs'))
    await expect(updatePhotograph(ours.designer, words(photograph, 'Mine'))).rejects.toThrow(
      ConflictError,
    )
    expect((await photograph.reload()).title).toBe('Theirs')
  })

  it.each([
    ['permission without saying whose', { licence: 'permission' }, 'licenceNote'],
    ['another licence without saying which', { licence: 'other' }, 'licenceNote'],
    ['CC BY without its link', { licence: 'cc-by', photographer: 'A. Body' }, 'licenceUrl'],
    [
      'CC BY without a name',
      { licence: 'cc-by', licenceUrl: 'https://licence.example/by' },
      'photographer',
    ],
    ['a link that is a script', { sourceUrl: 'javascript:alert(1)' }, 'sourceUrl'],
    ['no title', { title: ' ' }, 'title'],
  ])('are refused with %s', (_, changes, field) => {
    const given = {
      ...{ photographId: randomUUID(), version: 1, title: 'A title', photographer: '' },
      ...{ licence: '', licenceNote: '', licenceUrl: '', sourceUrl: '', altText: '' },
    }
    expect(updatePhotographSchema.safeParse(given).success).toBe(true)
    const refused = updatePhotographSchema.safeParse({ ...given, ...changes })
    expect(refused.error?.issues.map(({ path }) => path[0])).toContain(field)
  })
})

describe('the gallery', () => {
  it('asks the database as often for 50 photographs as for 5', async () => {
    const few = await makeLine({ id: ours.owner.brandId })
    const many = await makeLine({ id: ours.owner.brandId })
    await Promise.all(Array.from({ length: 5 }, () => makePhotograph(few)))
    await Promise.all(Array.from({ length: 50 }, () => makePhotograph(many)))
    const show = (one: Line) => countQueries(() => listPhotographs(ours.owner, one, ALL))
    const [five, fifty] = [await show(few), await show(many)]
    expect(five.answer.photographs).toHaveLength(5)
    expect(fifty.answer.photographs).toHaveLength(24)
    expect(fifty.answer.total).toBe(50)
    expect(fifty.queries).toBe(five.queries)
  })

  it('narrows to what is missing and searches words as they are written', async () => {
    const shelf = await makeLine({ id: ours.owner.brandId })
    await makePhotograph(shelf, { title: '100% moss', altText: 'Moss.', licence: 'own-work' })
    await makePhotograph(shelf, { title: 'Bare' })
    const titles = async (filter: object) =>
      (await listPhotographs(ours.owner, shelf, galleryFilterSchema.parse(filter))).photographs.map(
        ({ title }) => title,
      )
    expect(await titles({ missing: 'alt' })).toEqual(['Bare'])
    expect(await titles({ missing: 'licence' })).toEqual(['Bare'])
    expect(await titles({ q: '0% MO' })).toEqual(['100% moss'])
    expect(await titles({ q: '_' })).toEqual([])
    expect(await titles({ state: 'failed' })).toEqual([])
  })
})
