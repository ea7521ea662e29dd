import { changesOf } from '@/lib/activity/changes-of'
import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError, InvalidError } from '@/lib/errors'
import { Membership, NameReviewer, type NamingSettings } from '@/models'

import { changeNames, type NamesAtWork } from './change-names'
import { requireSeen, writeSettings } from './change-settings'
import { APPOINTABLE } from './constants'
import { dayOf } from './freeze'
import { canRuleNames } from './policy'
import { presentSettings } from './present'
import type { NamingSettingsInput } from './schema'

/**
 * Sets how a line's names are printed, when, and who decides on them besides the owners.
 * @throws NotFoundError; ConflictError when somebody saved in between, or when another print date
 * would lift the lock; InvalidError for a day that is past, and for a reviewer who can be none
 */
export async function saveNamingSettings(
  actor: Actor,
  { lineSlug, version, reviewerIds, ...values }: NamingSettingsInput,
): Promise<NamingSettings> {
  return changeNames(actor, canRuleNames, lineSlug, async (at) => {
    const { line, settings, transaction } = at
    requireSeen(at, version)
    requirePrintDate(at, values.printOn)
    const { label, care, themes, printOn } = presentSettings(settings, at.frozen)
    const set = { labelWidth: label.width, labelSize: label.size, labelLines: label.lines }
    const changes = changesOf({ ...set, care, themes, printOn }, values)
    const reviewers = await appoint(at, reviewerIds)
    if (settings && !changes && !reviewers) return settings
    const saved = await writeSettings(at, values)
    if (changes || reviewers)
      await recordActivity(
        actor,
        {
          action: 'name.settings-changed',
          object: lineObject(line),
          before: { ...changes?.before },
          after: { ...changes?.after, ...reviewers },
        },
        transaction,
      )
    return saved
  })
}

/** A print date that locks at once by mistake, or would lift a lock unsaid, is refused. */
function requirePrintDate({ settings }: NamesAtWork, printOn: string | null): void {
  const today = dayOf(new Date())
  const was = settings?.printOn ?? null
  if (printOn === was) return
  const hasCome = was !== null && was <= today
  if (hasCome && (printOn === null || printOn > today))
    throw new ConflictError(
      'Names are locked because their print date has come. To change it, lift the lock first and say why. Nothing was saved.',
      { printOn: ['Lift the lock first.'] },
    )
  if (printOn !== null && printOn < today)
    throw new InvalidError('The print date is past. Nothing was saved.', {
      printOn: ['That day is past. Choose today or a later one.'],
    })
}

/**
 * Makes these people the reviewers of the line, and nobody else.
 * @returns the roles of whoever came and went, for the record, which names nobody; null without a
 * change
 */
async function appoint(
  { line, transaction }: NamesAtWork,
  personIds: readonly string[],
): Promise<{ appointed?: string[]; dismissed?: string[] } | null> {
  const inLine = { brandId: line.brandId, lineId: line.id }
  const members = await Membership.findAll({ where: { brandId: line.brandId }, transaction })
  const roles = new Map(members.map(({ personId, role }) => [personId, role]))
  const wanted = new Set(personIds)
  for (const id of wanted) {
    const role = roles.get(id)
    if (!role || !APPOINTABLE.includes(role))
      throw new InvalidError(
        'A reviewer is a marketer or designer of the brand, and somebody you chose is none any more. Nothing was saved.',
        { reviewerIds: ['Somebody you chose can be no reviewer any more.'] },
      )
  }
  const held = (await NameReviewer.findAll({ where: inLine, transaction })).map(
    ({ personId }) => personId,
  )
  const coming = [...wanted].filter((id) => !held.includes(id))
  const going = held.filter((id) => !wanted.has(id))
  if (coming.length + going.length === 0) return null
  await NameReviewer.destroy({ where: { ...inLine, personId: going }, transaction })
  await NameReviewer.bulkCreate(
    coming.map((personId) => ({ ...inLine, personId })),
    { transaction },
  )
  const rolesOf = (ids: readonly string[]) => ids.flatMap((id) => roles.get(id) ?? []).sort()
  return {
    ...(coming.length > 0 && { appointed: rolesOf(coming) }),
    ...(going.length > 0 && { dismissed: rolesOf(going) }),
  }
}
