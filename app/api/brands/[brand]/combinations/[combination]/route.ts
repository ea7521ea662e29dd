import { presentCombination } from '@/lib/combinations/present'
import { getNewerCombination } from '@/lib/combinations/queries'
import { newerCombinationSchema } from '@/lib/combinations/schema'
import { defineRoute } from '@/lib/server/define-route'

/** An open combination, when somebody changed it since the version that its editor knows. */
export const GET = defineRoute(
  'getNewerCombination',
  newerCombinationSchema,
  async (actor, { combination, version }) => {
    const newer = await getNewerCombination(actor, combination, version)
    return newer && presentCombination(actor, newer)
  },
)
