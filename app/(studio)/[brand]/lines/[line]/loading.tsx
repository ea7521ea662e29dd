import { Sheet } from '@/components/layout/sheet'
import { Skeleton } from '@/components/ui/skeleton'

export default function Loading() {
  return (
    <Sheet>
      <Skeleton className="mb-6 h-9 w-64" />
      <Skeleton className="h-64" />
    </Sheet>
  )
}
