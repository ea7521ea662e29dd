import { readForPage } from '@/lib/server/page'

import { Shell } from '../../shell'

export default async function BrandHomeLayout({ params, children }: LayoutProps<'/[brand]'>) {
  const actor = await readForPage((await params).brand, (one) => Promise.resolve(one))
  return <Shell actor={actor}>{children}</Shell>
}
