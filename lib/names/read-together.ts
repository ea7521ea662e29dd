import { Op, where } from 'sequelize'

import type { Actor } from '@/lib/auth/actor'
import { screenColor } from '@/lib/color/gamut'
import { IN_FAMILY, listFamilies } from '@/lib/families/queries'
import { checkLine, type LineReport } from '@/lib/naming/check-line'
import { NameIdea, Shade, type Line } from '@/models'

import { LEADING_ID, LISTED_STATE } from './leading-idea'
import type { TogetherRow } from './present'
import { readNaming } from './queries'

/** What stands out when the names of a line are looked at together. */
export interface NamesTogether {
  line: Line
  /** In the order of the sample book. */
  rows: TogetherRow[]
  report: Pick<LineReport, 'findings' | 'lengths' | 'wordplay'>
}

type RowOfShade = Pick<Shade, 'id' | 'number' | 'labL' | 'labA' | 'labB' | 'familyId'> & {
  leadingId: string
}

/**
 * Looks at all names of a line that are approved or in review, one a shade that is still made, as
 * they stand in the sample book: neighbours there are neighbours on the shelf. Seven queries.
 * @throws ForbiddenError, NotFoundError
 */
export async function readTogether(actor: Actor, lineSlug: string): Promise<NamesTogether> {
  const { line } = await readNaming(actor, lineSlug)
  const inLine = { brandId: line.brandId, lineId: line.id }
  const [families, found] = await Promise.all([
    listFamilies(actor, line.id),
    Shade.findAll({
      attributes: ['id', 'number', 'labL', 'labA', 'labB', 'familyId', [LEADING_ID, 'leadingId']],
      where: {
        ...inLine,
        status: { [Op.ne]: 'retired' },
        [Op.and]: where(LISTED_STATE, { [Op.in]: ['approved', 'in-review'] }),
      },
      order: IN_FAMILY,
      raw: true,
    }),
  ])
  const shades = found as unknown as RowOfShade[]
  const ideas = await NameIdea.findAll({
    attributes: ['id', 'text', 'state'],
    where: { ...inLine, id: shades.map(({ leadingId }) => leadingId) },
    raw: true,
  })
  const ideaById = new Map(ideas.map((idea) => [idea.id, idea]))
  const named = [...families, { id: null, name: null }].flatMap(({ id, name: family }) =>
    shades
      .filter(({ familyId }) => familyId === id)
      .flatMap((shade) => {
        const idea = ideaById.get(shade.leadingId)
        return idea ? [{ shade, idea, family }] : []
      }),
  )
  const { codes, ...report } = checkLine(
    named.map(({ shade: { id, number }, idea, family }) => ({
      id,
      number,
      name: idea.text,
      family,
    })),
  )
  return {
    line,
    report,
    rows: named.map(({ shade, idea, family }) => ({
      id: shade.id,
      number: shade.number,
      hex: screenColor([shade.labL, shade.labA, shade.labB]).hex,
      family,
      ideaId: idea.id,
      name: idea.text,
      state: idea.state as TogetherRow['state'],
      code: codes[shade.id]!,
      source: report.wordplay.sources[shade.id] ?? null,
    })),
  }
}
