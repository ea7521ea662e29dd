import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { inTransaction } from '@/models'

import { sortAnew, withoutEmpty } from './arrangement'
import { canEditFamilies } from './policy'
import type { SortPreview } from './present'
import { readArrangement } from './save-arrangement'
import type { PreviewSortInput } from './schema'

/** What `sortIntoFamilies` would do now; saves nothing. @throws NotFoundError */
export async function previewSort(
  actor: Actor,
  { lineSlug, count }: PreviewSortInput,
): Promise<SortPreview> {
  authorize(actor, canEditFamilies)
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    const before = await readArrangement(line, transaction)
    let made = 0
    const after = withoutEmpty(sortAnew(before, count, () => `new-${++made}`))
    const stood = new Map(before.shades.map(({ id, familyId }) => [id, familyId]))
    const former = new Map(before.families.map((family) => [family.id, family]))
    const kept = new Set(after.families.map(({ id }) => id))
    return {
      version: line.familiesVersion,
      moved: after.shades.filter(({ id, familyId }) => stood.get(id) !== familyId).length,
      pinned: after.shades.filter(({ pinned }) => pinned).length,
      families: after.families.map(({ id, name }) => ({
        id,
        name,
        formerName: former.get(id)?.name ?? null,
        shades: after.shades.filter(({ familyId }) => familyId === id).length,
        arriving: after.shades.filter((one) => one.familyId === id && stood.get(one.id) !== id)
          .length,
      })),
      gone: before.families.filter(({ id }) => !kept.has(id)).map(({ name }) => name),
    }
  })
}
