import { randomUUID } from 'node:crypto'

import { hashPassword } from '@/lib/auth/password'
import { findSignedInPerson, type SignedInPerson } from '@/lib/auth/sessions'
import { openSession } from '@/lib/auth/sign-in'
import type { Role } from '@/lib/people/constants'
import { Membership, Person, type Brand } from '@/models'

/** The password of everybody that {@link makePerson} makes. */
export const PASSWORD = 'slow rain over the fell'
let passwordHash: Promise<string> | undefined

/** Somebody with {@link PASSWORD} and a place in each of the brands. */
export async function makePerson(...places: { brand: Brand; role: Role }[]): Promise<Person> {
  passwordHash ??= hashPassword(PASSWORD)
  const person = await Person.create({
    name: 'Isla Farrow',
    email: `${randomUUID()}@people.example`,
    passwordHash: await passwordHash,
  })
  for (const { brand, role } of places) {
    await Membership.create({ brandId: brand.id, personId: person.id, role })
  }
  return person
}

/** Opens a session for the person, as signing in does. */
export async function signedIn(person: Person, userAgent = 'a test'): Promise<SignedInPerson> {
  const sessionId = await openSession(person.id, { address: '192.0.2.7', userAgent })
  return (await findSignedInPerson(sessionId))!
}
