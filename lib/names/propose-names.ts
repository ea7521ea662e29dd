import { authorize, type Actor } from '@/lib/auth/actor'
import type { Lab } from '@/lib/color/types'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { setOnLabel } from '@/lib/naming/label'
import { playOnWords } from '@/lib/naming/play'
import { tellColorStory } from '@/lib/naming/story'
import { NameIdea, Shade } from '@/models'

import { findSettings } from './change-names'
import { labelOf } from './check-name'
import { labelFont } from './label-font'
import { canReadNames } from './policy'
import type { ProposedNames } from './present'
import type { ProposeNamesInput } from './schema'

/**
 * Names made up for a shade: sayings with a word of its colour, and things that have it. What the
 * line has as an idea already is not made up again; nothing is stored. Four queries.
 * @throws NotFoundError when the shade is not of the line
 */
export async function proposeNames(
  actor: Actor,
  { lineSlug, shadeId, themes }: ProposeNamesInput,
): Promise<ProposedNames> {
  authorize(actor, canReadNames)
  const line = await getLine(actor, lineSlug)
  const where = { brandId: actor.brandId, lineId: line.id }
  const [shade, settings, ideas] = await Promise.all([
    Shade.findOne({ where: { ...where, id: shadeId } }),
    findSettings(line),
    NameIdea.findAll({ attributes: ['text'], where, raw: true }),
  ])
  if (!shade) throw new NotFoundError()
  const lab: Lab = [shade.labL, shade.labA, shade.labB]
  const fibers = line.fibres.map(({ fibre }) => fibre.toLowerCase())
  const taken = ideas.map(({ text }) => text)
  const known = new Set(taken.map((text) => text.toLowerCase()))
  const setting = labelOf(settings)
  const withFit = <T extends { name: string }>(proposal: T) => ({
    ...proposal,
    fits: setOnLabel(proposal.name, labelFont(), setting).fits,
  })
  return {
    plays: playOnWords(lab, { fibers, taken }).map(withFit),
    story: tellColorStory(lab, { themes: themes.filter(Boolean), fibers })
      .filter(({ name }) => !known.has(name.toLowerCase()))
      .map(withFit),
  }
}
