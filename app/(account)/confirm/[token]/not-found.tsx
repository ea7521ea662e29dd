import { DeadLink } from '@/components/people/dead-link'

export default function LinkNotFound() {
  return <DeadLink href="/sign-up" label="Sign up again" />
}
