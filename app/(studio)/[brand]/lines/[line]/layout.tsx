import { presentChapters } from '@/lib/lines/present'

import { Shell } from '../../../shell'
import { readLine } from './read-line'

export default async function LineLayout({
  params,
  children,
}: LayoutProps<'/[brand]/lines/[line]'>) {
  const { brand, line: slug } = await params
  const { actor, line, lines, counts } = await readLine(brand, slug)
  return (
    <Shell actor={actor} chapters={presentChapters(brand, line, lines, counts)}>
      {children}
    </Shell>
  )
}
