import type { ReactNode, SyntheticEvent } from 'react'

import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'

/** The frame of a form about a person: what is wrong, the fields, and the button that sends it. */
export function PersonForm({
  form: { problem, pending, onSubmit },
  submit,
  pendingLabel,
  quiet = false,
  danger = false,
  children,
}: {
  form: {
    problem: string | undefined
    pending: boolean
    onSubmit: (event: SyntheticEvent) => void
  }
  /** The button: a verb with its object. */
  submit: string
  pendingLabel: string
  /** One of several forms of a page, none of which is its purpose. */
  quiet?: boolean
  danger?: boolean
  children: ReactNode
}) {
  return (
    <form noValidate method="post" className="max-w-md space-y-5" onSubmit={onSubmit}>
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      {children}
      <SubmitButton
        variant={danger ? 'danger' : quiet ? 'secondary' : 'primary'}
        pending={pending}
        pendingLabel={pendingLabel}
      >
        {submit}
      </SubmitButton>
    </form>
  )
}
