import { DeadLink } from '@/components/people/dead-link'

export default function LinkNotFound() {
  return <DeadLink href="/account" label="Go to your account" />
}
