'use client'

import type { ComponentProps } from 'react'
import { controlClass, useFieldWiring } from './field'

/** A line of text; takes its id and errors from the Field around it. */
export function Input({ className, ...rest }: ComponentProps<'input'>) {
  return (
    <input
      {...useFieldWiring()}
      className={controlClass(`h-10 max-md:h-11 pointer-coarse:h-11 ${className ?? ''}`)}
      {...rest}
    />
  )
}
