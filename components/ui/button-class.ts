import { cn } from './cn'

/** How loud a button is: one primary a sheet; danger for what cannot be taken back. */
export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger'

/** `main` is 40 px high (44 under a finger); `small` 32 px, for ledger rows. */
export type ButtonSize = 'main' | 'small'

const VARIANTS: Record<ButtonVariant, string> = {
  primary:
    'border-woad bg-woad text-on-woad hover:border-woad-deep hover:bg-woad-deep active:translate-y-px',
  secondary: 'border-rule bg-sheet text-ink hover:border-ink hover:bg-wash active:translate-y-px',
  quiet: 'border-transparent text-woad hover:bg-wash',
  danger: 'border-ink bg-sheet text-ink border-2 hover:bg-ink hover:text-paper',
}

const SIZES: Record<ButtonSize, string> = {
  main: 'min-h-10 px-4 py-2 text-base max-md:min-h-11 pointer-coarse:min-h-11',
  small: 'min-h-8 px-2.5 py-1 text-sm pointer-coarse:min-h-10',
}

/** The classes of a button, for whatever must look like one. */
export function buttonClass(
  variant: ButtonVariant = 'secondary',
  size: ButtonSize = 'main',
  className?: string,
): string {
  return cn(
    'inline-flex items-center justify-center gap-2 rounded border text-center font-medium transition-colors select-none',
    'disabled:border-hairline disabled:bg-wash disabled:text-ink-faint disabled:cursor-not-allowed disabled:active:translate-y-0',
    '[&>svg]:size-4 [&>svg]:shrink-0',
    VARIANTS[variant],
    SIZES[size],
    className,
  )
}
