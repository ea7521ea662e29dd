import { randomUUID } from 'node:crypto'

import type { Actor } from '@/lib/auth/actor'
import { ROLES, type Role } from '@/lib/people/constants'
import { Brand, Membership, Person } from '@/models'

/** A brand nobody else's test knows. */
export function makeBrand(name = 'A brand'): Promise<Brand> {
  return Brand.create({ name, slug: `brand-${randomUUID()}` })
}

/** A person of the brand, as the actor that queries and commands take. */
export async function makeActor(brand: Brand, role: Role = 'owner'): Promise<Actor> {
  const person = await Person.create({
    name: `A ${role}`,
    email: `${randomUUID()}@people.example`,
    // No password has this hash.
    passwordHash: '-',
  })
  await Membership.create({ brandId: brand.id, personId: person.id, role })
  return {
    personId: person.id,
    personName: person.name,
    brandId: brand.id,
    brandSlug: brand.slug,
    brandName: brand.name,
    role,
  }
}

/** One actor a role, all of the same brand. */
export async function makeActors(brand: Brand): Promise<Record<Role, Actor>> {
  const actors = await Promise.all(ROLES.map((role) => makeActor(brand, role)))
  return Object.fromEntries(actors.map((actor) => [actor.role, actor])) as Record<Role, Actor>
}
