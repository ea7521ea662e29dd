import { ForbiddenError } from '@/lib/errors'
import type { Role } from '@/lib/people/schema'

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
