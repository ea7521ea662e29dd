import { readForPage } from '@/lib/server/page'

/** Nothing of a brand is rendered, not even its margin, for somebody who is not one of it. */
export default async function BrandLayout({ params, children }: LayoutProps<'/[brand]'>) {
  await readForPage((await params).brand, (actor) => Promise.resolve(actor))
  return children
}
