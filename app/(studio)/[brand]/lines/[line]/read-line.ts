import { cache } from 'react'

import { getLineWithMargin } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'

/** The line of an address with its margin and who looks at it; read once for layout and page. */
export const readLine = cache((brand: string, slug: string) =>
  readForPage(brand, async (actor) => ({ actor, ...(await getLineWithMargin(actor, slug)) })),
)
