import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { addIdea, addIdeas } from '@/lib/names/add-ideas'
import { addRemark } from '@/lib/names/add-remark'
import { deleteIdeas, restoreIdeas } from '@/lib/names/delete-ideas'
import { editIdea } from '@/lib/names/edit-idea'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { placeIdeas } from '@/lib/names/place-ideas'
import { readNaming } from '@/lib/names/queries'
import { recordSearch } from '@/lib/names/record-search'
import { removeSearch } from '@/lib/names/remove-search'
import { vote } from '@/lib/names/vote'
import {
  Activity,
  NameIdea,
  NameSearch,
  sequelize,
  type Line,
  type NameIdea as Idea,
} from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'

/** The rows that a command is asked about. */
interface Rows {
  shadeId: string
  draft: Idea
  loose: Idea
  open: Idea
  approved: Idea
  putBy: Idea
  deleted: Idea
  search: NameSearch
}

let ours: Awaited<ReturnType<typeof makeActors>>
let theirs: Awaited<ReturnType<typeof makeActors>>
let ourLine: Line
let theirLine: Line
let rows: Rows

beforeAll(async () => {
  ours = await makeActors(await makeBrand('Ours'))
  theirs = await makeActors(await makeBrand('Theirs'))
  theirLine = await makeLine({ id: theirs.owner.brandId })
})

beforeEach(async () => {
  ourLine = await makeLine({ id: ours.owner.brandId })
  const [shade, other] = await makeShades(ourLine, 2)
  const deleted = await makeIdea(ourLine, shade!)
  await deleted.destroy()
  const open = await makeIdea(ourLine, shade!, { state: 'in-review' })
  rows = {
    shadeId: shade!.id,
    draft: await makeIdea(ourLine, shade!),
    loose: await makeIdea(ourLine, null),
    open,
    approved: await makeIdea(ourLine, other!, { state: 'approved' }),
    putBy: await makeIdea(ourLine, shade!, { state: 'put-by' }),
    deleted,
    search: await NameSearch.create({
      brandId: ourLine.brandId,
      ideaId: open.id,
      register: 'A register',
      searchedBy: 'Wren',
      searchedOn: '2026-11-30',
      outcome: 'nothing found',
      recordedById: null,
    }),
  }
})

const of = ({ id, version }: Idea, reason = '') => ({ ideaId: id, version, reason })

/** Every command, each asked so that an owner of the rows' brand may do it. */
const COMMANDS: Record<string, (actor: Actor, lineSlug: string) => Promise<unknown>> = {
  addIdea: (actor, lineSlug) =>
    addIdea(actor, {
      lineSlug,
      shadeId: rows.shadeId,
      text: 'Low Sun',
      note: '',
      requestKey: randomUUID(),
    }),
  addIdeas: (actor, lineSlug) =>
    addIdeas(actor, {
      lineSlug,
      ideas: [
        { text: 'Low Sun', note: '', shadeId: null },
        { text: 'High Fell', note: '', shadeId: rows.shadeId },
      ],
      requestKey: randomUUID(),
    }),
  editIdea: (actor, lineSlug) =>
    editIdea(actor, { lineSlug, ideaId: rows.draft.id, version: 1, text: 'Mine now' }),
  placeIdeas: (actor, lineSlug) =>
    placeIdeas(actor, {
      lineSlug,
      placements: [{ ideaId: rows.loose.id, shadeId: rows.shadeId }],
    }),
  deleteIdeas: (actor, lineSlug) => deleteIdeas(actor, { lineSlug, ideaIds: [rows.draft.id] }),
  restoreIdeas: (actor, lineSlug) => restoreIdeas(actor, { lineSlug, ideaIds: [rows.deleted.id] }),
  send: (actor, lineSlug) => moveIdeas(actor, 'send', { lineSlug, ideaIds: [rows.draft.id] }),
  recall: (actor, lineSlug) => moveIdeas(actor, 'recall', { lineSlug, ideaIds: [rows.open.id] }),
  'put by': (actor, lineSlug) => moveIdeas(actor, 'put-by', { lineSlug, ideaIds: [rows.open.id] }),
  'take up': (actor, lineSlug) =>
    moveIdeas(actor, 'take-up', { lineSlug, ideaIds: [rows.putBy.id] }),
  approve: (actor, lineSlug) => decideIdea(actor, 'approve', { lineSlug, ...of(rows.open) }),
  return: (actor, lineSlug) => decideIdea(actor, 'return', { lineSlug, ...of(rows.open, 'Why') }),
  reopen: (actor, lineSlug) =>
    decideIdea(actor, 'reopen', { lineSlug, ...of(rows.approved, 'Why') }),
  vote: (actor, lineSlug) =>
    vote(actor, { lineSlug, ideaId: rows.open.id, round: 1, vote: 'yes', comment: '' }),
  addRemark: (actor, lineSlug) =>
    addRemark(actor, {
      lineSlug,
      ideaId: rows.open.id,
      text: 'Say it aloud.',
      requestKey: randomUUID(),
    }),
  recordSearch: (actor, lineSlug) =>
    recordSearch(actor, {
      lineSlug,
      ideaId: rows.open.id,
      register: 'A register',
      searchedBy: 'Wren',
      searchedOn: '2026-11-30',
      outcome: 'nothing found',
      note: '',
      requestKey: randomUUID(),
    }),
  removeSearch: (actor, lineSlug) => removeSearch(actor, { lineSlug, searchId: rows.search.id }),
}

/** All that a brand has of names, and what is told of it. */
async function standing(brandId: string): Promise<unknown> {
  const [ideas] = await sequelize().query(
    `SELECT to_jsonb(i) AS idea FROM name_ideas i WHERE brand_id = $1
     UNION ALL SELECT to_jsonb(v) FROM name_votes v WHERE brand_id = $1
     UNION ALL SELECT to_jsonb(r) FROM name_remarks r WHERE brand_id = $1
     UNION ALL SELECT to_jsonb(s) FROM name_searches s WHERE brand_id = $1
     UNION ALL SELECT to_jsonb(m) FROM name_moves m WHERE brand_id = $1
     UNION ALL SELECT to_jsonb(h) FROM shades h WHERE brand_id = $1
     ORDER BY 1`,
    { bind: [brandId] },
  )
  return { ideas, told: await Activity.count({ where: { brandId } }) }
}

describe.each(Object.entries(COMMANDS))('%s', (_, ask) => {
  it('is done for an owner of the brand and recorded', async () => {
    const before = await Activity.count({ where: { brandId: ourLine.brandId } })
    await ask(ours.owner, ourLine.slug)
    expect(await Activity.count({ where: { brandId: ourLine.brandId } })).toBe(before + 1)
  })

  it('finds nothing for another brand, whichever line it names, and changes nothing', async () => {
    const before = [await standing(ourLine.brandId), await standing(theirLine.brandId)]
    for (const actor of [theirs.owner, theirs.marketer])
      for (const slug of [ourLine.slug, theirLine.slug])
        await expect(ask(actor, slug)).rejects.toThrow(NotFoundError)
    expect([await standing(ourLine.brandId), await standing(theirLine.brandId)]).toEqual(before)
  })

  it('finds nothing by way of another line of the brand', async () => {
    const elsewhere = await makeLine({ id: ourLine.brandId })
    const before = await standing(ourLine.brandId)
    await expect(ask(ours.owner, elsewhere.slug)).rejects.toThrow(NotFoundError)
    expect(await standing(ourLine.brandId)).toEqual(before)
  })

  it('is refused to a dyer', async () => {
    const before = await standing(ourLine.brandId)
    await expect(ask(ours.dyer, ourLine.slug)).rejects.toThrow(ForbiddenError)
    expect(await standing(ourLine.brandId)).toEqual(before)
  })
})

describe('the names of a line', () => {
  it('are read by those who draft them, in their brand alone', async () => {
    for (const { role } of [ours.owner, ours.marketer, ours.designer])
      expect((await readNaming(ours[role], ourLine.slug)).line.id).toBe(ourLine.id)
    await expect(readNaming(ours.dyer, ourLine.slug)).rejects.toThrow(ForbiddenError)
    await expect(readNaming(theirs.owner, ourLine.slug)).rejects.toThrow(NotFoundError)
  })
})

describe('an idea', () => {
  it('is deleted by whoever brought or worded it and by an owner, not by others', async () => {
    const { marketer, designer, owner } = ours
    const remove = (actor: Actor, idea: Idea) =>
      deleteIdeas(actor, { lineSlug: ourLine.slug, ideaIds: [idea.id] })
    const brought = await makeIdea(ourLine, null, { authorId: marketer.personId })
    await expect(remove(designer, brought)).rejects.toThrow(ForbiddenError)
    await editIdea(designer, {
      lineSlug: ourLine.slug,
      ideaId: brought.id,
      version: 1,
      text: 'Mine now',
    })
    await remove(designer, brought)
    const another = await makeIdea(ourLine, null, { authorId: marketer.personId })
    await remove(owner, another)
    expect(await NameIdea.count({ where: { id: [brought.id, another.id] } })).toBe(0)
  })
})
