import type { Route } from 'next'
import NextLink from 'next/link'
import type { ComponentProps } from 'react'

/** Props of {@link AppLink}: those of an anchor, with an address made at run time. */
export type AppLinkProps = Omit<ComponentProps<typeof NextLink>, 'href'> & { href: string }

/**
 * A link inside the application. Components are handed finished addresses as strings, so the cast
 * to a typed route is made here, once.
 */
export function AppLink({ href, ...rest }: AppLinkProps) {
  return <NextLink href={href as Route} {...rest} />
}
