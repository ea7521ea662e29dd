import { refresh } from 'next/cache'
import { headers } from 'next/headers'
import { unstable_rethrow } from 'next/navigation'
import type { z } from 'zod'

import { asActor, type Actor } from '@/lib/auth/actor'
import { getActor, getPerson } from '@/lib/auth/get-actor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { UnauthenticatedError, type ActionResult } from '@/lib/errors'
import { withinScope } from '@/models/scope'

import { failureOf } from './map-error'
import { recordRefusals } from './record-refusals'
import { addressOf, requestIdOf } from './request'
import { requireSameOrigin } from './same-origin'

/** What a page hands to a form: the action of one brand. */
export type Action<Input, Data> = (brandSlug: string, input: Input) => Promise<ActionResult<Data>>

/** What a page hands to a form: an action that is about a person, or about nobody yet. */
export type PlainAction<Input, Data> = (input: Input) => Promise<ActionResult<Data>>

interface Terms {
  /** After a success the page it was called from is rendered anew. */
  refreshes?: boolean
}

/** The way of every action: same origin → work → answer. */
async function act<Data>(
  where: string,
  { refreshes = true }: Terms,
  work: (head: Headers) => Promise<Data>,
): Promise<ActionResult<Data>> {
  const head = await headers()
  return withinScope({ requestId: requestIdOf(head) }, async () => {
    try {
      requireSameOrigin(head)
      const data = await work(head)
      if (refreshes) refresh()
      return { ok: true, data }
    } catch (error) {
      unstable_rethrow(error)
      return failureOf(error, where)
    }
  })
}

/**
 * Makes a server action of a command: same origin → session → parse → command → answer.
 * @param name the command's, for the log and the activity record: a build shortens the function's
 * @param schema parses the input; unknown fields are refused when it is strict
 * @param command authorises within itself
 */
export function defineAction<Schema extends z.ZodType, Data>(
  name: string,
  schema: Schema,
  command: (actor: Actor, input: z.output<Schema>) => Promise<Data>,
  terms: Terms = {},
): Action<z.input<Schema>, Data> {
  return (brandSlug, input) =>
    act(name, terms, async () => {
      const actor = await getActor(String(brandSlug))
      return asActor(actor, () =>
        recordRefusals(actor, { asked: name }, () => command(actor, schema.parse(input))),
      )
    })
}

/** Makes a server action of a command about the signed-in person, in no brand. */
export function definePersonAction<Schema extends z.ZodType, Data>(
  name: string,
  schema: Schema,
  command: (person: SignedInPerson, input: z.output<Schema>) => Promise<Data>,
  terms: Terms = {},
): PlainAction<z.input<Schema>, Data> {
  return (input) =>
    act(name, terms, async () => {
      const person = await getPerson()
      if (!person) throw new UnauthenticatedError()
      return withinScope({ personId: person.id }, () => command(person, schema.parse(input)))
    })
}

/** Where a request comes from: its network address and what the browser calls itself. */
export interface Caller {
  address: string
  userAgent: string
}

/** Makes a server action for whoever asks, signed in or not. */
export function definePublicAction<Schema extends z.ZodType, Data>(
  name: string,
  schema: Schema,
  command: (input: z.output<Schema>, caller: Caller) => Promise<Data>,
  terms: Terms = {},
): PlainAction<z.input<Schema>, Data> {
  return (input) =>
    act(name, terms, (head) =>
      command(schema.parse(input), {
        address: addressOf(head),
        userAgent: head.get('user-agent') ?? '',
      }),
    )
}
