import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { numberKey } from '@/lib/shades/csv'
import { badRowsCsv, describeError } from '@/lib/shades/csv-text'
import { NameIdea, Shade } from '@/models'

import { STATE_WORDS } from './constants'
import { canDraftNames } from './policy'
import { NAMEABLE_COLUMNS, presentNameable, type IdeaRowView, type IdeasPreview } from './present'
import { readLines, readSheetOfIdeas, sameName } from './read-idea-rows'
import type { PreviewIdeasInput } from './schema'

/**
 * Says what a pile of names would become, and saves nothing: which are new, which the line or an
 * earlier row has already, which are bad and why. Three queries.
 * @throws NotFoundError, ForbiddenError
 * @throws InvalidError when there is no name in the text, or too many
 */
export async function previewIdeas(
  actor: Actor,
  { lineSlug, text, kind }: PreviewIdeasInput,
): Promise<IdeasPreview> {
  authorize(actor, canDraftNames)
  const line = await getLine(actor, lineSlug)
  const { header, columns, unread, rows } =
    kind === 'csv' ? readSheetOfIdeas(text) : readLines(text)
  const where = { brandId: actor.brandId, lineId: line.id }
  const [ideas, shades] = await Promise.all([
    NameIdea.findAll({ attributes: ['text', 'state', 'shadeId'], where, raw: true }),
    Shade.findAll({
      attributes: [...NAMEABLE_COLUMNS],
      where,
      raw: true,
    }),
  ])
  const byNumber = new Map(shades.map((shade) => [numberKey(shade.number), shade]))
  const byId = new Map(shades.map((shade) => [shade.id, shade]))
  const known = new Map<string, string>()
  for (const idea of ideas) {
    const shade = idea.shadeId === null ? null : byId.get(idea.shadeId)
    // Its shade was deleted: so was the name.
    if (shade === undefined) continue
    const place = shade ? `No. ${shade.number}` : 'the heap'
    known.set(sameName(idea.text), `${place}, ${STATE_WORDS[idea.state].toLowerCase()}`)
  }
  const looked = rows.map((row): IdeaRowView => {
    const shade = row.number === '' ? null : byNumber.get(numberKey(row.number))
    if (shade === undefined)
      row.errors.push({ field: 'shade', message: `no shade of this line is No. ${row.number}` })
    const view = {
      row: row.row,
      text: row.text,
      note: row.note,
      shade: shade ? presentNameable(shade) : null,
      where: null,
      errors: row.errors.map((error) => describeError(row.row, error)),
    }
    if (row.errors.length > 0) return { ...view, outcome: 'bad' }
    const same = sameName(row.text)
    const there = known.get(same) ?? null
    if (there === null) known.set(same, `row ${row.row}`)
    return { ...view, outcome: there === null ? 'new' : 'there', where: there }
  })
  const bad = rows.filter(({ errors }) => errors.length > 0)
  return {
    columns: Object.entries(columns).map(([field, from]) => `${field} from “${from}”`),
    unread,
    counts: {
      new: looked.filter(({ outcome }) => outcome === 'new').length,
      there: looked.filter(({ outcome }) => outcome === 'there').length,
      bad: bad.length,
    },
    rows: looked,
    badCsv: bad.length > 0 ? badRowsCsv(header, bad) : null,
  }
}
