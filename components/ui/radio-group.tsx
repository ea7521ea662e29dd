'use client'

import { useId, type ReactNode } from 'react'
import { cn } from './cn'
import { FieldError } from './field'

/** One choice of a group. */
export interface RadioOption<Value extends string = string> {
  value: Value
  label: ReactNode
  hint?: ReactNode
  disabled?: boolean
}

/** Props of {@link RadioGroup} and {@link SegmentedControl}; controlled by `value`, or by the form. */
export interface RadioGroupProps<Value extends string = string> {
  legend: ReactNode
  hideLegend?: boolean
  name?: string
  options: readonly RadioOption<Value>[]
  value?: Value
  defaultValue?: Value
  onValueChange?: (value: Value) => void
  error?: string
  className?: string
}

function useRadios<Value extends string>({
  name,
  value,
  defaultValue,
  onValueChange,
  error,
}: RadioGroupProps<Value>) {
  const id = useId()
  const errorId = error ? `${id}-error` : undefined
  const radio = (option: RadioOption<Value>) => ({
    type: 'radio' as const,
    name: name ?? id,
    value: option.value,
    disabled: option.disabled,
    checked: value === undefined ? undefined : value === option.value,
    defaultChecked: value === undefined ? defaultValue === option.value : undefined,
    onChange: () => onValueChange?.(option.value),
  })
  return { errorId, radio }
}

/** One of a few, each on its line with room for a hint. */
export function RadioGroup<Value extends string>(props: RadioGroupProps<Value>) {
  const { legend, hideLegend, options, error, className } = props
  const { errorId, radio } = useRadios(props)
  return (
    <fieldset aria-describedby={errorId} className={className}>
      <legend className={hideLegend ? 'sr-only' : 'mb-1 font-medium'}>{legend}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className="group flex min-h-8 cursor-pointer items-start gap-2.5 py-1 pointer-coarse:min-h-11"
        >
          <input
            {...radio(option)}
            className="mt-0.5 size-[1.125rem] shrink-0 cursor-[inherit] appearance-none rounded-full border border-rule bg-sheet group-hover:border-ink checked:border-[5px] checked:border-woad disabled:opacity-50"
          />
          <span>
            {option.label}
            {option.hint ? (
              <span className="block text-sm text-ink-faint">{option.hint}</span>
            ) : null}
          </span>
        </label>
      ))}
      {error && errorId ? <FieldError id={errorId}>{error}</FieldError> : null}
    </fieldset>
  )
}

/** One of two to five short words side by side. */
export function SegmentedControl<Value extends string>(props: RadioGroupProps<Value>) {
  const { legend, hideLegend, options, error, className } = props
  const { errorId, radio } = useRadios(props)
  return (
    <fieldset aria-describedby={errorId} className={className}>
      <legend className={hideLegend ? 'sr-only' : 'mb-1 font-medium'}>{legend}</legend>
      <div className="inline-flex max-w-full flex-wrap rounded border border-rule bg-sheet">
        {options.map((option) => (
          <label
            key={option.value}
            className={cn(
              'relative inline-flex min-h-9 items-center px-3 text-sm font-medium pointer-coarse:min-h-11',
              'has-focus-visible:outline-focus has-checked:bg-woad has-checked:text-on-woad has-focus-visible:outline-2 has-focus-visible:outline-offset-2',
              'has-disabled:text-ink-faint',
            )}
          >
            <input
              {...radio(option)}
              className="absolute inset-0 cursor-pointer appearance-none opacity-0 disabled:cursor-not-allowed"
            />
            {option.label}
          </label>
        ))}
      </div>
      {error && errorId ? <FieldError id={errorId}>{error}</FieldError> : null}
    </fieldset>
  )
}
