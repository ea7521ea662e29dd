import { z } from 'zod'

import type { Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { presentShade, SHADE_VIEW_COLUMNS, shadeLabel } from '@/lib/shades/present'
import { NameIdea, NameMove, NameRemark, NameSearch, Shade } from '@/models'

import { movable } from './change-names'
import { checkName, needsWordingReason, readCheckGround } from './check-name'
import { isDecider } from './moves'
import { presentMove, presentRemark, presentSearch, type IdeaDetail } from './present'
import { namesOf, presentIdeas, readNaming } from './queries'

const OLDEST_FIRST: [string, string][] = [
  ['createdAt', 'ASC'],
  ['id', 'ASC'],
]

/**
 * One idea of a line: its words, what the checks say, what was said, searched and done. Eighteen
 * queries at most. @throws NotFoundError
 */
export async function getIdea(actor: Actor, lineSlug: string, ideaId: string): Promise<IdeaDetail> {
  const { line, asker, frozen } = await readNaming(actor, lineSlug)
  if (!z.uuid().safeParse(ideaId).success) throw new NotFoundError()
  const { brandId } = line
  const idea = await NameIdea.findOne({ where: { brandId, lineId: line.id, id: ideaId } })
  if (!idea) throw new NotFoundError()
  const ofIdea = { where: { brandId, ideaId } }
  const [shade, approved, remarks, searches, moves] = await Promise.all([
    idea.shadeId === null
      ? null
      : Shade.findOne({
          attributes: [...SHADE_VIEW_COLUMNS],
          where: { brandId, lineId: line.id, id: idea.shadeId },
        }),
    idea.shadeId === null
      ? null
      : NameIdea.findOne({ where: { brandId, shadeId: idea.shadeId, state: 'approved' } }),
    NameRemark.findAll({ ...ofIdea, order: OLDEST_FIRST }),
    NameSearch.findAll({ ...ofIdea, order: [['searchedOn', 'ASC'], ...OLDEST_FIRST] }),
    NameMove.findAll({ ...ofIdea, order: OLDEST_FIRST }),
  ])
  const [[view], people, places] = await Promise.all([
    presentIdeas([idea], { asker, frozen }),
    namesOf([...remarks, ...moves].map(({ personId }) => personId)),
    labelsOf(
      brandId,
      moves.flatMap(({ shadeId }) => shadeId ?? []),
    ),
  ])
  const kept = idea.state === 'in-review' || idea.state === 'approved' ? idea.findings : null
  const findings =
    kept ?? checkName(await readCheckGround(line), { ...idea.get(), ideaId }).findings
  const held = approved && approved.id !== idea.id ? approved : null
  return {
    idea: view!,
    shade: shade && presentShade(shade),
    held: held && { text: held.text, locked: movable(held, frozen).locked },
    findings,
    findingsKept: kept !== null,
    needsReason: needsWordingReason(findings),
    remarks: remarks.map((remark) => presentRemark(remark, people)),
    searches: searches.map((search) => ({
      ...presentSearch(search),
      canRemove: asker.role === 'owner' || search.recordedById === asker.personId,
    })),
    moves: moves.map((move) => ({
      ...presentMove(move, people),
      shadeLabel:
        move.shadeId === null ? null : (places.get(move.shadeId) ?? 'a shade now deleted'),
    })),
    decides: isDecider(asker),
    frozen,
  }
}

/** How shades are called by their number, deleted ones too: their name may be this idea's. */
async function labelsOf(brandId: string, ids: readonly string[]): Promise<Map<string, string>> {
  const shades = await Shade.findAll({
    attributes: ['id', 'number'],
    where: { brandId, id: [...new Set(ids)] },
    paranoid: false,
    raw: true,
  })
  return new Map(shades.map(({ id, number }) => [id, shadeLabel({ number, name: null })]))
}
