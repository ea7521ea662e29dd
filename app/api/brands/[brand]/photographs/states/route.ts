import { listStandings } from '@/lib/photographs/queries'
import { photographStatesSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Where the photographs of a page stand. */
export const GET = defineRoute('listStandings', photographStatesSchema, (actor, { ids }) =>
  listStandings(actor, ids),
)
