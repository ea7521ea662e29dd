import { useState, type SyntheticEvent } from 'react'
import { useForm, type DefaultValues, type FieldValues, type Path } from 'react-hook-form'
import type { z } from 'zod'

import { schemaResolver } from '@/components/ui/schema-resolver'
import type { ActionResult } from '@/lib/errors'

/**
 * A form that sends what it holds to an action. What the action refuses stands at its field, or
 * above the form as `problem`; what was typed stays.
 * @param done what to do once the action has said yes
 */
export function usePersonForm<Values extends FieldValues, Data>({
  schema,
  values,
  send,
  done,
}: {
  schema: () => Promise<z.ZodType>
  values: DefaultValues<Values>
  send: (values: Values) => Promise<ActionResult<Data>>
  done: (data: Data, values: Values) => void | Promise<void>
}) {
  const [problem, setProblem] = useState<string>()
  const form = useForm<Values>({ resolver: schemaResolver(schema), defaultValues: values })
  const { errors, isSubmitting } = form.formState

  const onSubmit = form.handleSubmit(async (input) => {
    setProblem(undefined)
    const answer = await send(input as Values).catch(() => null)
    if (answer?.ok) return done(answer.data, input as Values)
    const held = Object.keys(input)
    const told = Object.entries(answer?.fieldErrors ?? {}).filter(([name]) => held.includes(name))
    for (const [name, messages] of told) {
      form.setError(name as Path<Values>, { message: messages[0] }, { shouldFocus: true })
    }
    if (told.length > 0) return
    setProblem(
      answer?.message ??
        'Woadmap could not be reached. What you typed is still here: check the connection and try again.',
    )
  })

  return {
    register: form.register,
    reset: form.reset,
    problem,
    pending: isSubmitting,
    errorOf: (name: Path<Values>) => errors[name]?.message as string | undefined,
    onSubmit: (event: SyntheticEvent) => void onSubmit(event),
  }
}
