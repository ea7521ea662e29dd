import { literal } from 'sequelize'

import { recordedShades } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { Shade } from '@/models'

import { changeShades, findShades } from './change-shades'
import type { SetShadeStatusInput } from './schema'

/**
 * Gives many shades one status; answers how many were different before.
 * @throws NotFoundError when one of them is not there
 */
export async function setShadeStatus(
  actor: Actor,
  { lineSlug, shadeIds, status }: SetShadeStatusInput,
): Promise<{ changed: number }> {
  return changeShades(actor, lineSlug, async (line, transaction) => {
    const shades = await findShades(line, shadeIds, transaction)
    const others = shades.filter((shade) => !shade.deletedAt && shade.status !== status)
    const [changed] = await Shade.update(
      { status, version: literal('version + 1') as unknown as number },
      { where: { brandId: actor.brandId, id: others.map(({ id }) => id) }, transaction },
    )
    if (changed > 0) {
      const { object, after } = recordedShades(others, line)
      const statuses = [...new Set(others.map((shade) => shade.status))]
      await recordActivity(
        actor,
        {
          action: 'shade.status-set',
          object,
          before: { status: statuses },
          after: { status, ...after },
        },
        transaction,
      )
    }
    return { answer: { changed }, changed: changed > 0 }
  })
}
