import { setImmediate } from 'node:timers/promises'

import { literal, Op } from 'sequelize'

import type { ActivityAction } from '@/lib/activity/constants'
import { ideaObject, recordedIdeas } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError, type AppError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { NameIdea, Shade } from '@/models'

import {
  changeNames,
  findIdeas,
  findNameable,
  movable,
  nameShades,
  recordMoves,
  type Moved,
  type NamesAtWork,
} from './change-names'
import { checkName, needsWordingReason, readCheckGround, type CheckedName } from './check-name'
import type { StateMove } from './constants'
import { MOVES, reasonAgainst, reasonUnseen } from './moves'
import { canReadNames } from './policy'
import type { DecideIdeaInput, MoveIdeasInput } from './schema'
import { tellReviewers } from './tell-reviewers'

/** Moves that many ideas make at once. */
export type BulkMove = 'send' | 'recall' | 'put-by' | 'take-up'
/** Moves of one idea, made by somebody who has seen it as it is. */
export type SingleMove = 'approve' | 'return' | 'reopen' | 'unlock'

/** What became of ideas that were to move together. */
export interface BulkMoved {
  moved: string[]
  /** Those that stayed as they were, and why. */
  stayed: { ideaId: string; text: string; why: string }[]
}

const TOLD: Record<StateMove, ActivityAction> = {
  send: 'name.sent',
  recall: 'name.recalled',
  approve: 'name.approved',
  return: 'name.returned',
  'put-by': 'name.put-by',
  'take-up': 'name.taken-up',
  reopen: 'name.reopened',
  unlock: 'name.unlocked',
}

/**
 * Moves ideas that can move and says of the others why not. What is sent for review is checked, and
 * keeps what was found; all that one call sends is one letter to each reviewer.
 * @throws NotFoundError when one is not there, ForbiddenError or ConflictError when none can move
 */
export async function moveIdeas(
  actor: Actor,
  move: BulkMove,
  { lineSlug, from: seen, ideaIds }: MoveIdeasInput,
): Promise<BulkMoved> {
  authorize(actor, canReadNames)
  const checked = move === 'send' ? await checkIdeas(actor, lineSlug, ideaIds) : null
  return changeNames(actor, canReadNames, lineSlug, async (at) => {
    const ideas = await findIdeas(at, ideaIds)
    const shades = checked && (await findShadesOf(at, ideas))
    const stayed: BulkMoved['stayed'] = []
    const moves: Moved[] = []
    let first: Error | null = null
    for (const idea of ideas) {
      const stop =
        reasonAgainst(move, movable(idea, at.frozen), at.asker) ??
        (seen ? reasonUnseen(idea, seen) : null) ??
        (checked && reasonNotToSend(idea, shades!, checked.get(idea.id)))
      if (stop) {
        first ??= stop
        stayed.push({ ideaId: idea.id, text: idea.text, why: stop.message })
        continue
      }
      const from = idea.state
      await idea.update(
        {
          state: MOVES[move].to,
          stateSince: new Date(),
          version: idea.version + 1,
          ...(checked && {
            findings: checked.get(idea.id)!.findings,
            checkedAt: new Date(),
            round: idea.round + 1,
          }),
        },
        { transaction: at.transaction },
      )
      moves.push({ idea, move, from })
    }
    if (moves.length === 0) throw first!
    const moved = moves.map(({ idea }) => idea)
    await recordMoves(at, moves)
    await recordActivity(
      actor,
      { action: TOLD[move], ...recordedIdeas(moved, at.line) },
      at.transaction,
    )
    if (move === 'send') await tellReviewers(actor, at, moved)
    return { moved: moved.map(({ id }) => id), stayed }
  })
}

/** What the checks said of an idea, and of which version of it. */
type Checked = Pick<CheckedName, 'findings'> & { version: number }

/**
 * Checks ideas before the line is held for them: that takes a good part of a second for forty, and
 * nobody waits for it, neither for the line nor for the process. Those that are gone are left out.
 */
async function checkIdeas(
  actor: Actor,
  lineSlug: string,
  ideaIds: readonly string[],
): Promise<Map<string, Checked>> {
  const line = await getLine(actor, lineSlug)
  const ground = await readCheckGround(line)
  const where = { brandId: actor.brandId, lineId: line.id, id: [...new Set(ideaIds)] }
  const checked = new Map<string, Checked>()
  for (const { id, text, shadeId, version } of await NameIdea.findAll({ where })) {
    const { findings } = checkName(ground, { text, shadeId, ideaId: id })
    checked.set(id, { findings, version })
    await setImmediate()
  }
  return checked
}

/** The ids of the shades, not deleted, that ideas lie on. */
async function findShadesOf(at: NamesAtWork, ideas: readonly NameIdea[]): Promise<Set<string>> {
  const shades = await Shade.findAll({
    attributes: ['id'],
    where: {
      brandId: at.line.brandId,
      lineId: at.line.id,
      id: ideas.flatMap(({ shadeId }) => shadeId ?? []),
    },
    transaction: at.transaction,
  })
  return new Set(shades.map(({ id }) => id))
}

/** Why an idea is not sent although the table of moves lets it. */
function reasonNotToSend(
  { text, shadeId, version, wordingReason }: NameIdea,
  shades: ReadonlySet<string>,
  checked: Checked | undefined,
): AppError | null {
  if (shadeId === null || !shades.has(shadeId))
    return new ConflictError(`The shade of “${text}” has been deleted: give it to another first.`)
  if (checked?.version !== version)
    return new ConflictError(`“${text}” has changed just now. Look at it, then send it again.`)
  if (needsWordingReason(checked.findings) && !wordingReason)
    return new ConflictError(
      `The wording of “${text}” is warned of. Say on the name why it should stand, or change it.`,
    )
  return null
}

/**
 * Decides on one idea. To approve it gives the shade its name, and puts by what was approved there
 * before; to open it again takes the name away.
 * @throws NotFoundError; ForbiddenError for who may not; ConflictError when it has changed since, is
 * in another state, or is locked; InvalidError without a reason where one is needed
 */
export async function decideIdea(
  actor: Actor,
  move: SingleMove,
  { lineSlug, ideaId, version, reason }: DecideIdeaInput,
): Promise<NameIdea> {
  return changeNames(actor, canReadNames, lineSlug, async (at) => {
    const { transaction } = at
    const [idea] = (await findIdeas(at, [ideaId])) as [NameIdea]
    const against = reasonAgainst(move, movable(idea, at.frozen), at.asker, reason)
    if (against) throw against
    if (idea.version !== version)
      throw new ConflictError(
        'This name, or what its shade is called, has changed since you looked. Nothing was decided: look at it again.',
      )
    if (move !== 'unlock') await findNameable(at, [idea.shadeId!])
    const from = idea.state
    const moves: Moved[] = []
    if (move === 'approve') moves.push(...(await displace(at, idea)))
    await idea.update(
      {
        state: MOVES[move].to,
        version: idea.version + 1,
        unlockedAt: move === 'unlock' ? new Date() : null,
        ...(move !== 'unlock' && { stateSince: new Date() }),
        ...(move === 'reopen' && { round: idea.round + 1 }),
      },
      { transaction },
    )
    moves.push({ idea, move, from, reason })
    if (move === 'approve') await nameShade(at, idea, idea.text)
    if (move === 'reopen') await nameShade(at, idea, null)
    await recordMoves(at, moves)
    await recordActivity(
      actor,
      {
        action: TOLD[move],
        object: ideaObject(idea, at.line),
        ...(reason && { after: { reason } }),
      },
      transaction,
    )
    return idea
  })
}

/**
 * Gives the idea's shade its name, or takes it away. Whoever looks at another idea for the shade has
 * not seen that: what they decide next is refused once.
 */
async function nameShade(at: NamesAtWork, idea: NameIdea, name: string | null): Promise<void> {
  await nameShades(at, new Map([[idea.shadeId!, name]]))
  await NameIdea.update(
    { version: literal('version + 1') },
    {
      where: {
        brandId: at.line.brandId,
        shadeId: idea.shadeId,
        state: 'in-review',
        id: { [Op.ne]: idea.id },
      },
      transaction: at.transaction,
    },
  )
}

/** Puts by the name that the idea's shade has now. @throws ConflictError when it is locked */
async function displace(at: NamesAtWork, idea: NameIdea): Promise<Moved[]> {
  const held = await NameIdea.findOne({
    where: { brandId: at.line.brandId, shadeId: idea.shadeId, state: 'approved' },
    transaction: at.transaction,
  })
  if (!held) return []
  if (movable(held, at.frozen).locked)
    throw new ConflictError(
      `The shade is called “${held.text}”, and names are locked for the label printer. An owner must unlock that name first.`,
    )
  await held.update(
    { state: 'put-by', stateSince: new Date(), version: held.version + 1, unlockedAt: null },
    { transaction: at.transaction },
  )
  return [{ idea: held, move: 'displace', from: 'approved', reason: `“${idea.text}”` }]
}
