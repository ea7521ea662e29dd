import { Download } from 'lucide-react'

import { buttonClass } from '@/components/ui/button-class'
import type { KitView } from '@/lib/kits/present'
import { kitInWords } from './words'

/** Leads to a kit's file; a plain link, so that nothing fetches it before it is wanted. */
export function DownloadKit({
  brand,
  kit,
}: {
  brand: string
  kit: Pick<KitView, 'id' | 'count' | 'askedAt'>
}) {
  return (
    <a
      href={`/api/brands/${brand}/kits/${kit.id}/download`}
      className={buttonClass('primary')}
      aria-label={`Download ${kitInWords(kit)}`}
    >
      <Download aria-hidden="true" />
      Download kit
    </a>
  )
}
