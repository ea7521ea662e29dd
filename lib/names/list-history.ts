import { QueryTypes } from 'sequelize'

import { ACTIONS, type ActivityAction, type ActionWords } from '@/lib/activity/constants'
import type { Actor } from '@/lib/auth/actor'
import { Activity, NameMove, sequelize, Shade, type Line } from '@/models'

import { NAME_LIMITS } from './constants'
import { BY_HAND } from './freeze-names'
import { presentMove, type NameHistoryDay, type NameHistoryEntry } from './present'
import { namesOf, readNaming } from './queries'

/** What holds for all names of a line stands in the brand's record, and is told here as well. */
const RULES = [
  'name.settings-changed',
  'name.frozen',
  'name.freeze-lifted',
] as const satisfies readonly ActivityAction[]

/** A page of both, newest first; the second along activities_of_kind. */
const PAGE = /* sql */ `
SELECT id, told FROM (
  SELECT id, created_at, 'move' AS told FROM name_moves
    WHERE brand_id = $brandId AND line_id = $lineId
  UNION ALL
  SELECT id, created_at, 'rule' FROM activities
    WHERE brand_id = $brandId AND split_part(action, '.', 1) = 'name' AND object_id = $lineId
      AND action = ANY ($rules::text[])
) AS history ORDER BY created_at DESC, id OFFSET $offset LIMIT $limit`

const fullDate = new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeZone: 'UTC' })

/**
 * A page of all that happened to the names of a line, newest first, by day. Ten queries, however
 * many moves. @throws NotFoundError
 */
export async function listHistory(
  actor: Actor,
  lineSlug: string,
  page: number,
): Promise<{ line: Pick<Line, 'slug' | 'name'>; days: NameHistoryDay[]; total: number }> {
  const { line } = await readNaming(actor, lineSlug)
  const inLine = { brandId: actor.brandId, lineId: line.id }
  const ofRules = { brandId: actor.brandId, objectId: line.id, action: [...RULES] }
  const [rows, moved, ruled] = await Promise.all([
    sequelize().query<{ id: string; told: 'move' | 'rule' }>(PAGE, {
      bind: {
        ...inLine,
        rules: [...RULES],
        offset: (page - 1) * NAME_LIMITS.page,
        limit: NAME_LIMITS.page,
      },
      type: QueryTypes.SELECT,
    }),
    NameMove.count({ where: inLine }),
    Activity.count({ where: ofRules }),
  ])
  const idsOf = (kind: 'move' | 'rule') =>
    rows.filter(({ told }) => told === kind).map(({ id }) => id)
  const [moves, rules] = await Promise.all([
    NameMove.findAll({ where: { ...inLine, id: idsOf('move') } }),
    Activity.findAll({ where: { ...ofRules, id: idsOf('rule') } }),
  ])
  const people = await namesOf([...moves, ...rules].map(({ personId }) => personId))
  const shades = await Shade.findAll({
    attributes: ['id', 'number'],
    where: { ...inLine, id: [...new Set(moves.flatMap(({ shadeId }) => shadeId ?? []))] },
    paranoid: false,
    raw: true,
  })
  const numbers = new Map(shades.map(({ id, number }) => [id, number]))
  const entries = new Map<string, NameHistoryEntry>()
  for (const move of moves) {
    const view = presentMove(move, people)
    const shade = move.shadeId === null ? null : (numbers.get(move.shadeId) ?? null)
    entries.set(move.id, { ...whenOf(move), person: view.person, told: { move: view, shade } })
  }
  for (const rule of rules) {
    const name = rule.personId === null ? undefined : people.get(rule.personId)
    entries.set(rule.id, {
      ...whenOf(rule),
      person: name === undefined ? null : { id: rule.personId!, name },
      told: sayRule(rule),
    })
  }
  return {
    line: { slug: line.slug, name: line.name },
    days: byDay(rows.flatMap(({ id }) => entries.get(id) ?? [])),
    total: moved + ruled,
  }
}

function whenOf({ id, createdAt }: NameMove | Activity) {
  const at = createdAt.toISOString()
  return { id, at, time: at.slice(11, 16) }
}

/** A lock that nobody set by hand came with the print date. */
function sayRule({ action, objectLabel, before, after, personId }: Activity) {
  const label = objectLabel ?? ''
  if (action === 'name.frozen' && personId === null && after?.how !== BY_HAND)
    return {
      sentence: `The print date of ${label} came: its approved names are locked.`,
      byItself: true,
    }
  const words: ActionWords = ACTIONS[action as ActivityAction]
  const sentence = words.says({ label, before: before ?? {}, after: after ?? {} })
  return { sentence, byItself: false }
}

function byDay(entries: readonly NameHistoryEntry[]): NameHistoryDay[] {
  const days: NameHistoryDay[] = []
  for (const entry of entries) {
    const date = entry.at.slice(0, 10)
    const last = days.at(-1)
    if (last?.date === date) last.entries.push(entry)
    else days.push({ date, heading: fullDate.format(new Date(date)), entries: [entry] })
  }
  return days
}
