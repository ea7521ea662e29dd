import { beforeAll, describe, expect, it } from 'vitest'

import { NAME_STATES } from '@/lib/names/constants'
import { isDecider, MOVES } from '@/lib/names/moves'
import {
  inTransaction,
  Letter,
  Membership,
  NameIdea,
  NameMove,
  NameReviewer,
  NamingSettings,
  Shade,
  type Line,
} from '@/models'
import { demoBrands } from '@/seeders/demo/brands'
import { seedNames } from '@/seeders/seed-names'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeShade } from '@/tests/factories/shade'

const demo = demoBrands[0]!.lines[0]!
let line: Line
let ideas: NameIdea[]
let moves: NameMove[]
let letters: number

beforeAll(async () => {
  const brand = await makeBrand('Demo')
  await makeActors(brand)
  line = await makeLine(brand, { slug: demo.slug })
  for (const { number, name, order } of demo.shades)
    await makeShade(line, { number, name, position: order - 1 })
  letters = await Letter.count()
  await inTransaction((transaction) => seedNames(line, transaction))
  const where = { lineId: line.id }
  ideas = await NameIdea.findAll({ where })
  moves = await NameMove.findAll({ where, order: [['createdAt', 'ASC']] })
})

describe('the demo’s names', () => {
  it('are each the words of the one idea approved for the shade', async () => {
    const shades = await Shade.findAll({ where: { lineId: line.id } })
    const approved = ideas.filter(({ state }) => state === 'approved')
    const named = shades.filter(({ name }) => name !== null)
    expect(named.length / shades.length).toBeCloseTo(2 / 3, 1)
    expect(approved.map(({ shadeId, text }) => [shadeId, text]).sort()).toEqual(
      named.map(({ id, name }) => [id, name]).sort(),
    )
  })

  it('stand in every state, as their history leads there, and were checked when sent', () => {
    expect(new Set(ideas.map(({ state }) => state))).toEqual(new Set(NAME_STATES))
    for (const idea of ideas) {
      const way = moves.filter(({ ideaId }) => ideaId === idea.id)
      expect(way[0]).toMatchObject({ move: 'add', fromState: null, toState: 'draft' })
      for (const [at, { move, fromState, toState, reason }] of way.entries()) {
        if (at === 0) continue
        const rule = MOVES[move as keyof typeof MOVES]
        expect(fromState).toBe(way[at - 1]!.toState)
        expect(rule.from).toContain(fromState)
        expect(toState).toBe(rule.to)
        if (rule.needsReason) expect(reason).not.toBe('')
      }
      expect(way.at(-1)!.toState).toBe(idea.state)
      expect(way.at(-1)!.createdAt).toEqual(idea.stateSince)
      expect(idea.findings !== null).toBe(idea.round > 0)
    }
  })

  it('are decided by who may, with a reviewer and a label printer’s day to come', async () => {
    const members = await Membership.findAll({ where: { brandId: line.brandId } })
    const reviewers = await NameReviewer.findAll({ where: { lineId: line.id } })
    const roleOf = (id: string | null) => members.find(({ personId }) => personId === id)!.role
    expect(reviewers).toHaveLength(1)
    for (const { personId, move } of moves)
      if (move === 'approve' || move === 'return')
        expect(isDecider({ role: roleOf(personId), isReviewer: false })).toBe(true)
    const settings = await NamingSettings.findOne({ where: { lineId: line.id } })
    expect(settings!.frozenAt).toBeNull()
    expect(new Date(settings!.printOn!).getTime()).toBeGreaterThan(Date.now())
  })

  it('write to nobody, now or later', async () => {
    expect(await Letter.count()).toBe(letters)
    expect(moves.filter(({ toldAt }) => toldAt === null)).toEqual([])
  })
})
