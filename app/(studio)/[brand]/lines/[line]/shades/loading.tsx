import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { SkeletonRows } from '@/components/ui/skeleton'

export default function Loading() {
  return (
    <Sheet>
      <SheetHeader title="Shades" />
      <SkeletonRows label="Loading shades" rows={8} />
    </Sheet>
  )
}
