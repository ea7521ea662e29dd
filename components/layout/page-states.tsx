'use client'

import dynamic from 'next/dynamic'

// Next.js sends these along with every page, to be shown without asking again: as components of
// the browser they are a name there, and not all that they draw. Their script comes when they do.

/** A whole page: nothing stands at its address, for this person. */
export const NotFoundPage = dynamic(() =>
  import('./page-state-sheets').then((it) => it.NotFoundPage),
)

/** A whole page: the person's role does not open it. */
export const ForbiddenPage = dynamic(() =>
  import('./page-state-sheets').then((it) => it.ForbiddenPage),
)
