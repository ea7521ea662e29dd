import type { ComponentProps, ReactNode } from 'react'
import { buttonClass, type ButtonSize, type ButtonVariant } from './button-class'
import { Spinner } from './spinner'

/** Props of {@link Button}. */
export interface ButtonProps extends ComponentProps<'button'> {
  variant?: ButtonVariant
  size?: ButtonSize
  /** The work is under way: the button keeps its place and focus and ignores further presses. */
  pending?: boolean
  /** What the button says meanwhile ("Reading photograph…"). */
  pendingLabel?: ReactNode
  icon?: ReactNode
}

/** A button; its words are a verb with an object. `type` is "button" unless told. */
export function Button({
  variant,
  size,
  pending = false,
  pendingLabel,
  icon,
  className,
  children,
  type = 'button',
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      aria-disabled={pending || undefined}
      aria-busy={pending || undefined}
      className={buttonClass(variant, size, className)}
      // Disabling it would drop the keyboard's focus to the page while the work runs.
      onClick={pending ? (event) => event.preventDefault() : onClick}
      {...rest}
    >
      {pending ? <Spinner /> : icon}
      {pending && pendingLabel ? pendingLabel : children}
    </button>
  )
}
