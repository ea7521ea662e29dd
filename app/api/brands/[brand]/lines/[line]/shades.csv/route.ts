import { z } from 'zod'

import { defineRoute } from '@/lib/server/define-route'
import { exportShades } from '@/lib/shades/export-shades'

/** GET: all shades of the line as a CSV file to keep. */
export const GET = defineRoute(
  'exportShades',
  z.strictObject({ line: z.string() }),
  async (actor, { line }) => {
    const { fileName, text } = await exportShades(actor, line)
    return new Response(text, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${fileName}"`,
        'Cache-Control': 'private, no-store',
      },
    })
  },
)
