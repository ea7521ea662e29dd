'use client'

import type { ComponentProps } from 'react'
import { controlClass, useFieldWiring } from './field'

/** Several lines of text, growing with what is written. */
export function Textarea({ className, rows = 3, ...rest }: ComponentProps<'textarea'>) {
  return (
    <textarea
      {...useFieldWiring()}
      rows={rows}
      className={controlClass(`block field-sizing-content ${className ?? ''}`)}
      {...rest}
    />
  )
}
