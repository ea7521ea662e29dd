import { Op } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { presentLine } from '@/lib/lines/present'
import { setOnLabel, type LabelSetting } from '@/lib/naming/label'
import { BY_POSITION, MATCHABLE } from '@/lib/shades/queries'
import { Membership, NameIdea, NameReviewer, Shade, type Line } from '@/models'

import { movable } from './change-names'
import { labelOf } from './check-name'
import { APPOINTABLE, type NameState } from './constants'
import { labelFont } from './label-font'
import { movesOpen } from './moves'
import { canReadNames, canRuleNames } from './policy'
import {
  presentSettings,
  type LabelsPreview,
  type LabelView,
  type NamingSettingsView,
  type ReviewerView,
  type UnnamedView,
} from './present'
import { readNaming } from './queries'
import type { PreviewLabelsInput } from './schema'

/** The furthest an idea has come, first. */
const FURTHEST: readonly NameState[] = ['approved', 'in-review', 'draft', 'returned']
/** How many names that do not fit a preview tells of. */
const MISFITS = 10

/** What goes on the ball bands of a line, in the order of its shades. */
export interface Labels {
  line: Pick<Line, 'id' | 'slug' | 'name'>
  settings: NamingSettingsView
  /** "70 % wool, 30 % silk". */
  fibre: string
  labels: LabelView[]
  /** Shades that have no approved name. */
  unnamed: UnnamedView[]
}

/** What a page of a line's labels shows besides. */
export interface LabelsAtHand extends Labels {
  /** yyyy-mm-dd since when names are locked; null while they are not. */
  lockedSince: string | null
  preview: LabelsPreview
  /** Owners, and whoever can be appointed; by name. */
  reviewers: ReviewerView[]
  canRule: boolean
}

/** Ideas that a shade could go by, its approved one first. */
async function findShadesWithIdeas(
  line: Line,
): Promise<{ shade: Pick<Shade, 'id' | 'number'>; ideas: NameIdea[] }[]> {
  const inLine = { brandId: line.brandId, lineId: line.id }
  const [shades, ideas] = await Promise.all([
    Shade.findAll({
      attributes: ['id', 'number'],
      where: { ...inLine, ...MATCHABLE },
      order: BY_POSITION,
      raw: true,
    }),
    NameIdea.findAll({
      attributes: { exclude: ['findings', 'note'] },
      where: { ...inLine, shadeId: { [Op.ne]: null }, state: [...FURTHEST] },
    }),
  ])
  const byShade = new Map<string, NameIdea[]>()
  for (const idea of ideas)
    byShade.set(idea.shadeId!, [...(byShade.get(idea.shadeId!) ?? []), idea])
  return shades.map((shade) => ({
    shade,
    ideas: (byShade.get(shade.id) ?? []).sort(
      (one, other) => FURTHEST.indexOf(one.state) - FURTHEST.indexOf(other.state),
    ),
  }))
}

/**
 * The approved names of a line's shades as they are set on its label, and the shades without one.
 * Retired shades are dyed no more, so that nothing is printed for them. Six queries.
 * @throws NotFoundError
 */
export async function listLabels(actor: Actor, lineSlug: string): Promise<Labels> {
  const naming = await readNaming(actor, lineSlug)
  return labelsOf(naming, await findShadesWithIdeas(naming.line))
}

type Naming = Awaited<ReturnType<typeof readNaming>>
type ShadesWithIdeas = Awaited<ReturnType<typeof findShadesWithIdeas>>

function labelsOf({ line, settings, frozen, asker }: Naming, shades: ShadesWithIdeas): Labels {
  const setting = labelOf(settings)
  const labels: LabelView[] = []
  const unnamed: UnnamedView[] = []
  for (const { shade, ideas } of shades) {
    const { id: shadeId, number } = shade
    const [idea] = ideas
    if (idea?.state !== 'approved') {
      unnamed.push({ shadeId, number, state: idea?.state ?? null })
      continue
    }
    const open = movable(idea, frozen)
    labels.push({
      shadeId,
      number,
      ideaId: idea.id,
      version: idea.version,
      name: idea.text,
      set: setOnLabel(idea.text, labelFont(), setting),
      locked: open.locked,
      unlocked: frozen && !open.locked,
      canUnlock: movesOpen(open, asker).includes('unlock'),
    })
  }
  return {
    line: { id: line.id, slug: line.slug, name: line.name },
    settings: presentSettings(settings, frozen),
    fibre: presentLine(line).fibreContent,
    labels,
    unnamed,
  }
}

/** The labels of a line with how they are set, locked and decided on. Eight queries. */
export async function readLabels(actor: Actor, lineSlug: string): Promise<LabelsAtHand> {
  const naming = await readNaming(actor, lineSlug)
  const { line, settings, frozen } = naming
  const [shades, reviewers] = await Promise.all([
    findShadesWithIdeas(line),
    listReviewers(actor, line.id),
  ])
  const since = settings?.frozenAt?.toISOString().slice(0, 10) ?? settings?.printOn ?? null
  return {
    ...labelsOf(naming, shades),
    lockedSince: frozen ? since : null,
    preview: previewOf(line, shades, labelOf(settings)),
    reviewers,
    canRule: canRuleNames(actor),
  }
}

/**
 * The label as it would be set, and which names of the line would not fit on it. Three queries.
 * @throws NotFoundError
 */
export async function previewLabels(
  actor: Actor,
  { lineSlug, labelWidth, labelSize, labelLines }: PreviewLabelsInput,
): Promise<LabelsPreview> {
  authorize(actor, canReadNames)
  const line = await getLine(actor, lineSlug)
  const setting = { width: labelWidth, size: labelSize, lines: labelLines }
  return previewOf(line, await findShadesWithIdeas(line), setting)
}

function previewOf(line: Line, shades: ShadesWithIdeas, setting: LabelSetting): LabelsPreview {
  const set = (number: string, name: string) => {
    const onLabel = setOnLabel(name, labelFont(), setting)
    return { number, name, set: onLabel, widest: Math.max(...onLabel.lines.map((it) => it.width)) }
  }
  const names = shades
    .flatMap(({ shade, ideas }) =>
      ideas
        .filter(({ state }) => state === 'approved' || state === 'in-review')
        .map(({ text }) => set(shade.number, text)),
    )
    .sort((one, other) => other.widest - one.widest)
  const misfits = names.filter((one) => !one.set.fits)
  const sample = misfits[0] ?? names[0] ?? set(shades[0]?.shade.number ?? '1', line.name)
  const view = ({ number, name, set: onLabel }: typeof sample) => ({ number, name, set: onLabel })
  return {
    setting,
    sample: view(sample),
    total: names.length,
    misfits: misfits.slice(0, MISFITS).map(view),
    misfitCount: misfits.length,
  }
}

/** Owners of the brand and whoever can be appointed beside them, by name. Two queries. */
async function listReviewers({ brandId }: Actor, lineId: string): Promise<ReviewerView[]> {
  const [members, appointed] = await Promise.all([
    Membership.findAll({
      where: { brandId, role: ['owner', ...APPOINTABLE] },
      include: [{ association: 'person', attributes: ['name'], required: true }],
      order: [
        ['person', 'name', 'ASC'],
        ['id', 'ASC'],
      ],
    }),
    NameReviewer.findAll({ attributes: ['personId'], where: { brandId, lineId }, raw: true }),
  ])
  const reviewers = new Set(appointed.map(({ personId }) => personId))
  return members.map(({ personId, role, person }) => ({
    personId,
    role,
    name: person!.name,
    isReviewer: reviewers.has(personId),
  }))
}
