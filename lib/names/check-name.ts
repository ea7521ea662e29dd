import { Op, type Transaction } from 'sequelize'

import type { Lab } from '@/lib/color/types'
import { checkColor } from '@/lib/naming/check-color'
import { checkFiber } from '@/lib/naming/check-fiber'
import { checkLabel } from '@/lib/naming/check-label'
import { checkSame } from '@/lib/naming/check-same'
import { checkSound } from '@/lib/naming/check-sound'
import { checkWording } from '@/lib/naming/check-wording'
import type { Finding, OtherName } from '@/lib/naming/finding'
import { DEFAULT_LABEL, setOnLabel, type LabelSetting, type SetName } from '@/lib/naming/label'
import { pronounceName, respellName } from '@/lib/naming/pronounce'
import { sourceOf } from '@/lib/naming/source-of'
import { Line, NameIdea, NamingSettings, Shade } from '@/models'

import { STATE_WORDS } from './constants'
import { labelFont } from './label-font'

/** A name that others must be told apart from, and what it belongs to. */
interface HeldName extends OtherName {
  ideaId: string
  shadeId: string | null
}

/** What a line's names are checked against: read once, good for many names. */
export interface CheckGround {
  /** Names and ideas of this line and the brand's others, but those that are put by. */
  held: readonly HeldName[]
  /** The fibres of the yarn, lower case. */
  fibers: readonly string[]
  label: LabelSetting
  labs: ReadonlyMap<string, Lab>
}

/** What the checks say of a name. */
export interface CheckedName {
  /** By check, warnings and notes as they come. */
  findings: Finding[]
  /** As it is heard: "STEM dhuh DYED". */
  heardAs: string
  /** A word of it is in no dictionary. */
  isGuess: boolean
  /** The saying it plays on, if we know one. */
  playsOn: { source: string; from: string; to: string } | null
  label: SetName
}

/** How the line's labels are set. */
export const labelOf = (
  settings: Pick<NamingSettings, 'labelWidth' | 'labelSize' | 'labelLines'> | null,
): LabelSetting =>
  settings
    ? { width: settings.labelWidth, size: settings.labelSize, lines: settings.labelLines }
    : DEFAULT_LABEL

/** Reads what names of a line are checked against: four queries, however many names there are. */
export async function readCheckGround(
  line: Pick<Line, 'id' | 'brandId' | 'fibres'>,
  transaction: Transaction | null = null,
): Promise<CheckGround> {
  const { brandId } = line
  const settings = await NamingSettings.findOne({
    where: { brandId, lineId: line.id },
    transaction,
  })
  const lines = await Line.findAll({ attributes: ['id', 'name'], where: { brandId }, transaction })
  const ideas = await NameIdea.findAll({
    attributes: ['id', 'text', 'state', 'shadeId', 'lineId'],
    where: {
      brandId,
      [Op.or]: [{ state: 'approved' }, { lineId: line.id, state: { [Op.ne]: 'put-by' } }],
    },
    order: [
      ['createdAt', 'ASC'],
      ['id', 'ASC'],
    ],
    raw: true,
    transaction,
  })
  const named = [...new Set(ideas.flatMap(({ shadeId }) => shadeId ?? []))]
  const shades = await Shade.findAll({
    attributes: ['id', 'lineId', 'number', 'status', 'labL', 'labA', 'labB'],
    where: { brandId, [Op.or]: [{ lineId: line.id }, { id: named }] },
    raw: true,
    transaction,
  })
  const shadeById = new Map(shades.map((shade) => [shade.id, shade]))
  const lineNames = new Map(lines.map(({ id, name }) => [id, name]))
  const held = ideas.flatMap((idea): HeldName[] => {
    const shade = idea.shadeId === null ? null : shadeById.get(idea.shadeId)
    // Its shade was deleted: so was the name.
    if (shade === undefined) return []
    const place = shade ? `No. ${shade.number}` : 'the heap'
    const where = [
      idea.lineId === line.id ? place : `${lineNames.get(idea.lineId) ?? 'another line'} ${place}`,
      idea.state === 'approved' ? '' : STATE_WORDS[idea.state].toLowerCase(),
      shade?.status === 'retired' ? 'retired' : '',
    ]
    const name = idea.text
    const said = where.filter(Boolean).join(', ')
    return [{ ideaId: idea.id, shadeId: idea.shadeId, name, where: said }]
  })
  return {
    held,
    fibers: line.fibres.map(({ fibre }) => fibre.toLowerCase()),
    label: labelOf(settings),
    labs: new Map(shades.map(({ id, labL, labA, labB }) => [id, [labL, labA, labB]])),
  }
}

/**
 * All checks of one name. Ideas for the same shade do not count against each other, since one of
 * them at most comes to stand; nor does the idea itself.
 */
export function checkName(
  ground: CheckGround,
  { text, shadeId, ideaId }: { text: string; shadeId: string | null; ideaId: string | null },
): CheckedName {
  const others = ground.held.filter(
    (other) => other.ideaId !== ideaId && (shadeId === null || other.shadeId !== shadeId),
  )
  const lab = shadeId === null ? undefined : ground.labs.get(shadeId)
  const spoken = pronounceName(text)
  return {
    findings: [
      ...checkSame(text, others),
      ...checkSound(text, others),
      ...(lab ? checkColor(text, lab) : []),
      ...checkFiber(text, ground.fibers),
      ...checkWording(text),
      ...checkLabel(text, labelFont(), ground.label),
    ],
    heardAs: respellName(spoken),
    isGuess: !spoken.sure,
    playsOn: sourceOf(text),
    label: setOnLabel(text, labelFont(), ground.label),
  }
}

/** Whether a name must not go on without a reason: its wording is warned of. */
export const needsWordingReason = (findings: readonly Finding[]): boolean =>
  findings.some(({ check, grade }) => check === 'wording' && grade === 'warning')
