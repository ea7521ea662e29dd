import type { ReactNode } from 'react'
import { AppLink, type AppLinkProps } from './app-link'
import { buttonClass, type ButtonSize, type ButtonVariant } from './button-class'

/** Props of {@link LinkButton}. */
export interface LinkButtonProps extends AppLinkProps {
  variant?: ButtonVariant
  size?: ButtonSize
  icon?: ReactNode
}

/** A link that leads to an action's page and looks like its button. */
export function LinkButton({ variant, size, icon, className, children, ...rest }: LinkButtonProps) {
  return (
    <AppLink className={buttonClass(variant, size, className)} {...rest}>
      {icon}
      {children}
    </AppLink>
  )
}
