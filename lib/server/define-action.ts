import { refresh } from 'next/cache'
import { headers } from 'next/headers'
import { unstable_rethrow } from 'next/navigation'
import type { z } from 'zod'

import type { Actor } from '@/lib/auth/actor'
import { getActor } from '@/lib/auth/get-actor'
import type { ActionResult } from '@/lib/errors'

import { failureOf } from './map-error'
import { requireSameOrigin } from './same-origin'

/** What a page hands to a form: the action of one brand. */
export type Action<Input, Data> = (brandSlug: string, input: Input) => Promise<ActionResult<Data>>

/**
 * Makes a server action of a command: same origin → session → parse → command → answer. After a
 * success the page it was called from is rendered anew.
 * @param schema parses the input; unknown fields are refused when it is strict
 * @param command authorises within itself
 */
export function defineAction<Schema extends z.ZodType, Data>(
  schema: Schema,
  command: (actor: Actor, input: z.output<Schema>) => Promise<Data>,
  { refreshes = true }: { refreshes?: boolean } = {},
): Action<z.input<Schema>, Data> {
  return async (brandSlug, input) => {
    try {
      requireSameOrigin(await headers())
      const actor = await getActor(String(brandSlug))
      const data = await command(actor, schema.parse(input))
      if (refreshes) refresh()
      return { ok: true, data }
    } catch (error) {
      unstable_rethrow(error)
      return failureOf(error, command.name)
    }
  }
}
