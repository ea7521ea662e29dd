import { beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { AppError } from '@/lib/errors'
import type { StateMove } from '@/lib/names/constants'
import { decideIdea, moveIdeas, type BulkMove, type SingleMove } from '@/lib/names/move-ideas'
import {
  Activity,
  NameIdea,
  NameMove,
  NameReviewer,
  NamingSettings,
  type Line,
  type Shade,
} from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makeShades } from '@/tests/factories/shade'
import {
  LEADS_TO,
  MOVE_CASES,
  REASONED,
  standingWords,
  STANDINGS,
  WHO,
  type Standing,
  type WhoName,
} from '@/tests/fixtures/name-moves'

const BULK: readonly StateMove[] = ['send', 'recall', 'put-by', 'take-up']

/** A line of locked names, and who asks in it. */
interface Ground {
  actor: Actor
  /** Whoever brought the ideas. */
  authorId: string
  line: Line
  shades: Shade[]
}

async function makeGround(who: WhoName): Promise<Ground> {
  const brand = await makeBrand()
  const { role, ...rest } = { isReviewer: false, isOwn: false, isOnlyOwner: false, ...WHO[who] }
  const actor = await makeActor(brand, role)
  const other = await makeActor(brand, rest.isOnlyOwner ? 'designer' : 'owner')
  const line = await makeLine(brand)
  const inLine = { brandId: brand.id, lineId: line.id }
  if (rest.isReviewer) await NameReviewer.create({ ...inLine, personId: actor.personId })
  const label = { labelWidth: 60, labelSize: 14, labelLines: 2 as const }
  await NamingSettings.create({ ...inLine, ...label, frozenAt: new Date() })
  const shades = await makeShades(line, STANDINGS.length)
  return { actor, authorId: rest.isOwn ? actor.personId : other.personId, line, shades }
}

async function makeStanding({ line, shades, authorId }: Ground, standing: Standing) {
  const { state, inHeap, locked } = standing
  const shade = inHeap ? null : shades[STANDINGS.indexOf(standing)]!
  const idea = await makeIdea(line, shade, { state, authorId, text: 'Thyme Will Tell' })
  if (state === 'approved' && !locked) await idea.update({ unlockedAt: new Date() })
  return idea
}

/** @returns 'ok', or the code of the refusal */
async function make(
  actor: Actor,
  move: StateMove,
  line: Line,
  { id, version }: NameIdea,
  reason: string,
): Promise<string> {
  const asked = BULK.includes(move)
    ? moveIdeas(actor, move as BulkMove, { lineSlug: line.slug, ideaIds: [id] })
    : decideIdea(actor, move as SingleMove, { lineSlug: line.slug, ideaId: id, version, reason })
  return asked.then(
    () => 'ok',
    (error: unknown) => {
      if (error instanceof AppError) return error.code
      throw error
    },
  )
}

const historyOf = (ideaId: string) =>
  NameMove.findAll({ where: { ideaId }, order: [['createdAt', 'ASC']], raw: true })
const told = (brandId: string) => Activity.count({ where: { brandId } })

describe.each(Object.keys(WHO) as WhoName[])('%s, on the database:', (who) => {
  let ground: Ground

  beforeAll(async () => {
    ground = await makeGround(who)
  })

  it.each(Object.keys(LEADS_TO) as StateMove[])(
    '%s is made or refused as the table says, and leaves behind what it should',
    async (move) => {
      const { actor, line, shades } = ground
      for (const { standing, answer } of MOVE_CASES.filter(
        (one) => one.who === who && one.move === move,
      )) {
        const idea = await makeStanding(ground, standing)
        const where = standingWords(standing)
        const shade = shades[STANDINGS.indexOf(standing)]!
        const name = (await shade.reload()).name
        const before = await told(line.brandId)
        const reason = REASONED.includes(move) ? 'It is too long.' : ''
        if (answer === 'ok' && reason)
          expect(await make(actor, move, line, idea, ' \n'), where).toBe('invalid')
        expect(await make(actor, move, line, idea, reason), where).toBe(answer)
        const now = await NameIdea.findByPk(idea.id, { rejectOnEmpty: true })
        const history = await historyOf(idea.id)
        const isMade = answer === 'ok'
        expect(now.state, where).toBe(isMade ? LEADS_TO[move] : standing.state)
        expect(now.version, where).toBe(idea.version + (isMade ? 1 : 0))
        expect(history.length, where).toBe(isMade ? 2 : 1)
        expect(await told(line.brandId), where).toBe(before + (isMade ? 1 : 0))
        if (isMade)
          expect(history[1], where).toMatchObject({
            move,
            fromState: standing.state,
            toState: LEADS_TO[move],
            personId: actor.personId,
            reason,
            text: 'Thyme Will Tell',
          })
        const named = { approve: idea.text, reopen: null }[move as string]
        const expected = isMade && named !== undefined ? named : name
        expect((await shade.reload()).name, where).toBe(expected)
        await idea.destroy({ force: true })
        await shade.update({ name: null })
      }
    },
  )
})
