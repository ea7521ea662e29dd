import type { ComponentProps } from 'react'
import { cn } from '@/components/ui/cn'

/**
 * The sheet under shades that are being compared. It takes the chosen ground, and every token
 * inside it is set for that ground, so text and controls on it stay readable.
 */
export function Ground({ className, ...rest }: ComponentProps<'div'>) {
  return (
    <div
      className={cn('ground-sheet', className ?? 'border border-hairline p-4 sm:p-6')}
      {...rest}
    />
  )
}
