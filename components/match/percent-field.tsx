'use client'

import { useState } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'

/** A fraction asked for in per cent; what is half typed stays until it is one. */
export function PercentField({
  label,
  value,
  onChange,
}: {
  label: string
  /** 0 to 1. */
  value: number
  onChange: (fraction: number) => void
}) {
  const [typed, setTyped] = useState<string>()
  return (
    <Field label={label} className="w-20">
      <Input
        type="number"
        min={0}
        max={100}
        step={0.5}
        value={typed ?? String(Math.round(value * 1000) / 10)}
        onChange={({ target }) => {
          setTyped(target.value)
          const fraction = target.valueAsNumber / 100
          if (fraction >= 0 && fraction <= 1) onChange(fraction)
        }}
        onBlur={() => setTyped(undefined)}
      />
    </Field>
  )
}
