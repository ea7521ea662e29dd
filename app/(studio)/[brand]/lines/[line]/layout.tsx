import { presentChapters } from '@/lib/lines/present'
import { countChapters, listLineNames } from '@/lib/lines/queries'

import { Shell } from '../../../shell'
import { readLine } from './read-line'

export default async function LineLayout({
  params,
  children,
}: LayoutProps<'/[brand]/lines/[line]'>) {
  const { brand, line: slug } = await params
  const { actor, line } = await readLine(brand, slug)
  const [lines, counts] = await Promise.all([listLineNames(actor), countChapters(actor, line)])
  return (
    <Shell actor={actor} chapters={presentChapters(brand, line, lines, counts)}>
      {children}
    </Shell>
  )
}
