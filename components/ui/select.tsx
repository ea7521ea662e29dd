'use client'

import { ChevronDown } from 'lucide-react'
import type { ComponentProps } from 'react'
import { cn } from './cn'
import { controlClass, useFieldWiring } from './field'

/** One of a list: the browser's own control, which is the best one on a phone. */
export function Select({ className, children, ...rest }: ComponentProps<'select'>) {
  return (
    <span className={cn('relative block', className)}>
      <select
        {...useFieldWiring()}
        className={controlClass('h-10 appearance-none pr-9 max-md:h-11 pointer-coarse:h-11')}
        {...rest}
      >
        {children}
      </select>
      <ChevronDown
        aria-hidden="true"
        className="pointer-events-none absolute top-1/2 right-3 size-4 -translate-y-1/2"
      />
    </span>
  )
}
