import { matchWithWishes } from '@/lib/photographs/match'
import { matchParamsSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** The five for a photograph under the wishes of the address. */
export const GET = defineRoute('matchWithWishes', matchParamsSchema, matchWithWishes)
