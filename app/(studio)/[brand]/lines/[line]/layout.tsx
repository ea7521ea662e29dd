import { presentChapters } from '@/lib/lines/present'
import { countChapters, getLine, listLineNames } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'

import { Shell } from '../../../shell'

export default async function LineLayout({
  params,
  children,
}: LayoutProps<'/[brand]/lines/[line]'>) {
  const { brand, line: slug } = await params
  const { actor, chapters } = await readForPage(brand, async (one) => {
    const line = await getLine(one, slug)
    const [lines, counts] = await Promise.all([listLineNames(one), countChapters(one, line)])
    return { actor: one, chapters: presentChapters(brand, line, lines, counts) }
  })
  return (
    <Shell actor={actor} chapters={chapters}>
      {children}
    </Shell>
  )
}
