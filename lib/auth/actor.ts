import { ForbiddenError } from '@/lib/errors'
import { withinScope } from '@/models/scope'
import type { Role } from '@/lib/people/constants'

/** Who asks, in which brand, as what. Every query and command takes one. */
export interface Actor {
  readonly personId: string
  readonly personName: string
  readonly brandId: string
  readonly brandSlug: string
  readonly brandName: string
  readonly role: Role
}

/** A rule of a policy file: may this actor do it? */
export type Policy = (actor: Actor) => boolean

/** The policy that lets the named roles in. */
export function allow(...roles: readonly Role[]): Policy {
  return (actor) => roles.includes(actor.role)
}

/** Goes on if the policy says yes. @throws ForbiddenError */
export function authorize(actor: Actor, policy: Policy): void {
  if (!policy(actor)) throw new ForbiddenError()
}

/** Runs `work` with the database open to the actor's brand and to no other. */
export const asActor = <T>({ brandId, personId }: Actor, work: () => T): T =>
  withinScope({ brandId, personId }, work)
