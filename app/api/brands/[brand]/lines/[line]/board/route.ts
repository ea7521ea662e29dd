import { getBoard } from '@/lib/combinations/get-board'
import { boardSchema } from '@/lib/combinations/schema'
import { defineRoute } from '@/lib/server/define-route'

/** GET: the line's board; null when nothing has changed since `revision`. */
export const GET = defineRoute('getBoard', boardSchema, (actor, { line, revision }) =>
  getBoard(actor, line, revision),
)
