import type { Transaction } from 'sequelize'

import { checkName, readCheckGround } from '@/lib/names/check-name'
import type { NameState, StateMove } from '@/lib/names/constants'
import { dayOf } from '@/lib/names/freeze'
import { MOVES } from '@/lib/names/moves'
import { DEFAULT_LABEL } from '@/lib/naming/label'
import type { Role } from '@/lib/people/constants'
import {
  Membership,
  NameIdea,
  NameMove,
  NameRemark,
  NameReviewer,
  NameVote,
  NamingSettings,
  Shade,
  type Line,
} from '@/models'

import { demoNaming, demoThoughts } from './demo/names'
import type { DemoIdea, DemoNaming } from './demo/types'

const HOUR = 3_600_000
const DAY = 24 * HOUR
/** From seeding to the label printer's day. */
const DAYS_TO_PRINT = 60

/** How an idea came to its state: the moves, who made them, and how many days before seeding. */
const WAYS: Record<
  NameState,
  [move: 'add' | StateMove, by: 'author' | 'owner', daysAgo: number][]
> = {
  approved: [
    ['add', 'author', 40],
    ['send', 'author', 33],
    ['approve', 'owner', 26],
  ],
  'in-review': [
    ['add', 'author', 9],
    ['send', 'author', 4],
  ],
  returned: [
    ['add', 'author', 15],
    ['send', 'author', 11],
    ['return', 'owner', 6],
  ],
  'put-by': [
    ['add', 'author', 21],
    ['put-by', 'author', 12],
  ],
  draft: [['add', 'author', 3]],
}

/**
 * Writes down the ideas that a line's approved names come from and, where the demo has more of them,
 * those in every other state, with their history and what was said. Nobody is written to about it.
 */
export async function seedNames(line: Line, transaction: Transaction): Promise<void> {
  const { brandId, id: lineId, slug } = line
  const inLine = { brandId, lineId }
  const members = await Membership.findAll({ where: { brandId }, transaction })
  const personOf = (by: Role) =>
    (members.find(({ role }) => role === by) ?? members.find(({ role }) => role === 'owner'))!
      .personId
  const shades = await Shade.findAll({
    where: inLine,
    order: [['position', 'ASC']],
    transaction,
  })
  const shadeIds = new Map(shades.map(({ number, id }) => [number, id]))
  const naming = demoNaming[slug]
  const approved = shades.flatMap(({ number: shade, name: text }): DemoIdea[] =>
    text === null
      ? []
      : [{ by: 'marketer', ...demoThoughts[shade], shade, text, state: 'approved' }],
  )
  const demo = [...approved, ...(naming?.ideas ?? [])]
  if (naming) await seedSettings(inLine, naming, personOf, transaction)
  // A minute apart, so that what is listed by age has an order.
  const began = Date.now() - demo.length * 60_000
  const made: { one: DemoIdea; idea: NameIdea; moves: Made[] }[] = []
  for (const [at, one] of demo.entries()) {
    const moves = WAYS[one.state].map(([move, by, daysAgo]) => ({
      move,
      personId: personOf(by === 'author' ? one.by : by),
      createdAt: new Date(began + at * 60_000 - daysAgo * DAY),
    }))
    const values = {
      ...inLine,
      shadeId: one.shade === null ? null : shadeIds.get(one.shade)!,
      text: one.text,
      note: one.note,
      state: one.state,
      stateSince: moves.at(-1)!.createdAt,
      round: moves.filter(({ move }) => move === 'send').length,
      authorId: personOf(one.by),
      wordedById: personOf(one.by),
      wordingReason: one.wordingReason,
      createdAt: moves[0]!.createdAt,
    }
    made.push({ one, moves, idea: await NameIdea.create(values, { transaction }) })
  }
  const ground = await readCheckGround(line, transaction)
  for (const { one, idea, moves } of made) {
    await NameMove.bulkCreate(movesOf(one, idea, moves), { transaction })
    const sentAt = moves.find(({ move }) => move === 'send')?.createdAt
    if (!sentAt) continue
    const { findings } = checkName(ground, { ...idea.get(), ideaId: idea.id })
    await idea.update({ findings, checkedAt: sentAt }, { transaction })
    const said = (at: number) => new Date(sentAt.getTime() + (at + 1) * HOUR)
    await NameVote.bulkCreate(
      (one.votes ?? []).map(({ by, ...vote }, at) => ({
        ...vote,
        brandId,
        ideaId: idea.id,
        round: idea.round,
        personId: personOf(by),
        createdAt: said(at),
        updatedAt: said(at),
      })),
      { transaction },
    )
    await NameRemark.bulkCreate(
      (one.talk ?? []).map(({ by, text }, at) => ({
        brandId,
        ideaId: idea.id,
        text,
        personId: personOf(by),
        createdAt: said(at),
      })),
      { transaction },
    )
  }
}

interface Made {
  move: 'add' | StateMove
  personId: string
  createdAt: Date
}

/** The history of an idea, of which nobody is to be written to any more. */
function movesOf(
  { reason = '' }: DemoIdea,
  { brandId, lineId, id, text, shadeId, round }: NameIdea,
  moves: readonly Made[],
) {
  const states = moves.map(({ move }) => (move === 'add' ? 'draft' : MOVES[move].to))
  return moves.map((one, at) => ({
    ...one,
    brandId,
    lineId,
    ideaId: id,
    fromState: states[at - 1] ?? null,
    toState: states[at]!,
    text,
    shadeId,
    reason: one.move === 'return' ? reason : '',
    round: one.move === 'add' ? 0 : round,
    toldAt: one.createdAt,
  }))
}

async function seedSettings(
  inLine: { brandId: string; lineId: string },
  { care, themes, reviewer }: DemoNaming,
  personOf: (by: Role) => string,
  transaction: Transaction,
): Promise<void> {
  const { width, size, lines } = DEFAULT_LABEL
  await NamingSettings.create(
    {
      ...inLine,
      labelWidth: width,
      labelSize: size,
      labelLines: lines,
      care,
      themes,
      printOn: dayOf(new Date(Date.now() + DAYS_TO_PRINT * DAY)),
    },
    { transaction },
  )
  await NameReviewer.create({ ...inLine, personId: personOf(reviewer) }, { transaction })
}
