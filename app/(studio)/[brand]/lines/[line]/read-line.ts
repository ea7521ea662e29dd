import { cache } from 'react'

import { getLine } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'

/** The line of an address with who looks at it; read once for the margin and the page. */
export const readLine = cache(
  (brand: string, slug: string) =>
    readForPage(brand, async (actor) => ({ actor, line: await getLine(actor, slug) })),
)
