'use client'

import { useId, type ComponentProps, type ReactNode } from 'react'

/** Props of {@link Slider}. */
export interface SliderProps extends Omit<ComponentProps<'input'>, 'type'> {
  label: ReactNode
  /** The reading in words with its unit, shown beside the label and spoken ("ΔE 10"). */
  reading?: string
  hint?: ReactNode
}

/** A number along a scale; the arrow keys move it by `step`. */
export function Slider({ label, reading, hint, className, ...rest }: SliderProps) {
  const id = useId()
  return (
    <div className={className}>
      <div className="flex justify-between gap-4">
        <label htmlFor={id} className="font-medium">
          {label}
        </label>
        {reading ? (
          <output htmlFor={id} className="text-ink-soft">
            {reading}
          </output>
        ) : null}
      </div>
      <input
        id={id}
        type="range"
        aria-valuetext={reading}
        aria-describedby={hint ? `${id}-hint` : undefined}
        className="h-8 w-full cursor-pointer pointer-coarse:h-11"
        {...rest}
      />
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-ink-faint">
          {hint}
        </p>
      ) : null}
    </div>
  )
}
