import { SubmitButton } from '@/components/ui/submit-button'

/** Ends the session here and on the server. */
export function SignOutButton({ signOut }: { signOut: () => Promise<void> }) {
  return (
    <form action={signOut}>
      <SubmitButton variant="quiet" size="small">
        Sign out
      </SubmitButton>
    </form>
  )
}
