import { z } from 'zod'

import { exportLabels } from '@/lib/names/export-labels'
import { defineRoute } from '@/lib/server/define-route'

/** GET: the approved names of the line for the label printer, as a CSV file to keep. */
export const GET = defineRoute(
  'exportLabels',
  z.strictObject({ line: z.string() }),
  async (actor, { line }) => {
    const { fileName, text } = await exportLabels(actor, line)
    return new Response(text, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${fileName}"`,
        'Cache-Control': 'private, no-store',
      },
    })
  },
)
