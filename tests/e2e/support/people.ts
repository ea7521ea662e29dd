import { randomUUID } from 'node:crypto'

import { hashPassword } from '../../../lib/auth/password'

import { database } from './database'

/** Somebody made for one test, whose account no other test signs in with. */
export interface TestPerson {
  name: string
  email: string
  password: string
}

const PASSWORD = 'a-long-walk-uphill'

/** A brand with one person a role, made for one test. @returns its slug and its people by role */
export async function makeBrandWithPeople<Role extends string>(
  name: string,
  roles: readonly Role[],
): Promise<{ slug: string; people: Record<Role, TestPerson> }> {
  const client = await database()
  try {
    const slug = `brand-${randomUUID()}`
    const made = await client.query<{ id: string }>(
      'INSERT INTO brands (name, slug) VALUES ($1, $2) RETURNING id',
      [name, slug],
    )
    const passwordHash = await hashPassword(PASSWORD)
    const people = await Promise.all(
      roles.map(async (role) => {
        const person = {
          name: `The ${role}`,
          email: `${role}-${randomUUID()}@people.example`,
          password: PASSWORD,
        }
        await client.query(
          `WITH person AS (
             INSERT INTO people (email, name, password_hash) VALUES ($2, $3, $4) RETURNING id
           ) INSERT INTO memberships (brand_id, person_id, role) SELECT $1, id, $5 FROM person`,
          [made.rows[0]!.id, person.email, person.name, passwordHash, role],
        )
        return [role, person] as const
      }),
    )
    return { slug, people: Object.fromEntries(people) as Record<Role, TestPerson> }
  } finally {
    await client.end()
  }
}
