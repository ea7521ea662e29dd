import { listKitStandings } from '@/lib/kits/queries'
import { kitStatesSchema } from '@/lib/kits/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Where the kits of a page stand. */
export const GET = defineRoute('listKitStandings', kitStatesSchema, (actor, { ids }) =>
  listKitStandings(actor, ids),
)
