import { DeadLink } from '@/components/people/dead-link'

export default function LinkNotFound() {
  return <DeadLink href="/forgotten-password" label="Send a new letter" />
}
