import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { addIdea } from '@/lib/names/add-ideas'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { Letter, NameMove, type Line, type Shade } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShades } from '@/tests/factories/shade'

let owner: Actor
let marketer: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  const brand = await makeBrand('Ours')
  owner = await makeActor(brand)
  marketer = await makeActor(brand, 'marketer')
  line = await makeLine({ id: brand.id })
  shades = await makeShades(line, 4)
})

const write = (text: string, shade: Shade, key = crypto.randomUUID()) =>
  addIdea(marketer, {
    lineSlug: line.slug,
    shadeId: shade.id,
    text,
    note: '',
    requestKey: key,
  })
const send = (ideaIds: string[]) => moveIdeas(marketer, 'send', { lineSlug: line.slug, ideaIds })

describe('a decision on a name', () => {
  it('gives the shade the name that is approved, and takes it away when it is opened again', async () => {
    const idea = await write('Thyme Will Tell', shades[0]!)
    const before = await Letter.count()
    expect(await send([idea.id])).toEqual({ moved: [idea.id], stayed: [] })
    expect(await Letter.count()).toBe(before + 1)
    await idea.reload()
    expect(idea).toMatchObject({ state: 'in-review', round: 1 })
    expect(Array.isArray(idea.findings)).toBe(true)
    const decision = { lineSlug: line.slug, ideaId: idea.id, reason: '' }
    const approved = await decideIdea(owner, 'approve', { ...decision, version: idea.version })
    await shades[0]!.reload()
    expect(shades[0]!.name).toBe('Thyme Will Tell')
    await decideIdea(owner, 'reopen', {
      ...decision,
      version: approved.version,
      reason: 'Too near another.',
    })
    await shades[0]!.reload()
    expect(shades[0]!.name).toBeNull()
    const moves = await NameMove.findAll({
      where: { ideaId: idea.id },
      order: [['createdAt', 'ASC']],
    })
    expect(moves.map(({ move }) => move)).toEqual(['add', 'send', 'approve', 'reopen'])
  })

  it('puts by what was approved for the shade before', async () => {
    const [first, second] = await Promise.all([
      write('Olive and Let Live', shades[1]!),
      write('Moss Have Been Love', shades[1]!),
    ])
    await send([first.id, second.id])
    for (const idea of [first, second]) {
      await idea.reload()
      const { version } = idea
      await decideIdea(owner, 'approve', {
        lineSlug: line.slug,
        ideaId: idea.id,
        version,
        reason: '',
      })
    }
    await first.reload()
    await shades[1]!.reload()
    expect(first.state).toBe('put-by')
    expect(shades[1]!.name).toBe('Moss Have Been Love')
  })

  it('makes one idea of a submit that comes twice', async () => {
    const key = crypto.randomUUID()
    const [one, other] = await Promise.all([
      write('Soaked to the Skein', shades[2]!, key),
      write('Soaked to the Skein', shades[2]!, key),
    ])
    expect(other.id).toBe(one.id)
  })
})
