'use client'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { toastDone } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { ChangeNameInput } from '@/lib/people/schema'

import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Changes what the others of a brand know a person by. */
export function NameForm({
  name,
  save,
}: {
  name: string
  save: (input: ChangeNameInput) => Promise<ActionResult<void>>
}) {
  const form = usePersonForm<ChangeNameInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.changeNameSchema),
    values: { name },
    send: save,
    done: (_, saved) => {
      form.reset(saved)
      toastDone('Your name is saved.')
    },
  })
  return (
    <PersonForm form={form} quiet submit="Save name" pendingLabel="Saving name…">
      <Field
        label="Your name"
        required
        hint="As the others of your brand see it."
        error={form.errorOf('name')}
      >
        <Input autoComplete="name" {...form.register('name')} />
      </Field>
    </PersonForm>
  )
}
