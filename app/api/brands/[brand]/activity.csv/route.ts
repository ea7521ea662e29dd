import { exportActivity } from '@/lib/activity/export-activity'
import { activityFilterSchema } from '@/lib/activity/schema'
import { defineRoute } from '@/lib/server/define-route'

/** GET: the entries of the activity record that fit the address's filter, as a CSV file. */
export const GET = defineRoute('exportActivity', activityFilterSchema, async (actor, filter) => {
  const { fileName, text } = await exportActivity(actor, filter)
  return new Response(text, {
    headers: {
      'Content-Type': 'text/csv; charset=utf-8',
      'Content-Disposition': `attachment; filename="${fileName}"`,
      'Cache-Control': 'private, no-store',
    },
  })
})
