import { AppLink } from '@/components/ui/app-link'

/** The product's name in its ink; a link home where there is one. */
export function Wordmark({ href }: { href?: string }) {
  const look = 'font-title text-woad text-xl'
  return href ? (
    <AppLink href={href} className={`${look} inline-flex min-h-8 items-center`}>
      Woadmap
    </AppLink>
  ) : (
    <span className={look}>Woadmap</span>
  )
}
