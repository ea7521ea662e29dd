import { AppLink, type AppLinkProps } from './app-link'
import { cn } from './cn'

/** A link in running text. */
export function TextLink({ className, ...rest }: AppLinkProps) {
  return (
    <AppLink
      className={cn(
        'text-woad underline decoration-rule decoration-1 underline-offset-[3px] hover:decoration-woad hover:decoration-2',
        className,
      )}
      {...rest}
    />
  )
}
