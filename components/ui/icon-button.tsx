'use client'

import type { ComponentProps, ReactNode } from 'react'
import { cn } from './cn'
import { Tooltip, type TooltipProps } from './tooltip'

/** Props of {@link IconButton}. */
export interface IconButtonProps extends Omit<ComponentProps<'button'>, 'aria-label' | 'title'> {
  /** What the button does; its accessible name and its tooltip. */
  label: string
  icon: ReactNode
  variant?: 'quiet' | 'secondary'
  side?: TooltipProps['side']
}

/** A button with an icon for a face: 36 px, 44 under a finger. */
export function IconButton({
  label,
  icon,
  variant = 'quiet',
  side,
  className,
  type = 'button',
  ...rest
}: IconButtonProps) {
  return (
    <Tooltip content={label} side={side}>
      <button
        type={type}
        aria-label={label}
        className={cn(
          'inline-flex size-9 shrink-0 items-center justify-center rounded border transition-colors pointer-coarse:size-11',
          'hover:bg-wash disabled:cursor-not-allowed disabled:text-ink-faint aria-pressed:border-woad aria-pressed:bg-wash [&>svg]:size-[1.125rem]',
          variant === 'secondary' ? 'border-rule bg-sheet' : 'border-transparent',
          className,
        )}
        {...rest}
      >
        {icon}
      </button>
    </Tooltip>
  )
}
