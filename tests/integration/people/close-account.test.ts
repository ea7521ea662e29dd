import { randomUUID } from 'node:crypto'

import { QueryTypes } from 'sequelize'
import { beforeEach, describe, expect, it } from 'vitest'

import { recordActivity } from '@/lib/activity/record'
import { digest } from '@/lib/auth/seal'
import { findSignedInPerson, type SignedInPerson } from '@/lib/auth/sessions'
import { closeAccount } from '@/lib/people/close-account'
import { listFarewells } from '@/lib/people/queries'
import {
  Activity,
  Brand,
  Combination,
  inTransaction,
  Invitation,
  Letter,
  Line,
  Membership,
  Person,
  sequelize,
} from '@/models'
import { makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makePerson, PASSWORD, signedIn } from '@/tests/factories/person'
import { makeShades } from '@/tests/factories/shade'

let shared: Brand
let own: Brand
let person: Person
let colleague: Person
let me: SignedInPerson

beforeEach(async () => {
  shared = await makeBrand('A shared brand')
  own = await makeBrand('A brand of one')
  person = await makePerson({ brand: shared, role: 'owner' }, { brand: own, role: 'owner' })
  colleague = await makePerson({ brand: shared, role: 'owner' })
  me = await signedIn(person)
})

const close = (brandNames = [own.name], password = PASSWORD) =>
  closeAccount(me, { password, brandNames })

/** Every text of the database that holds a word. */
async function placesOf(word: string): Promise<string[]> {
  const tables = await sequelize().query<{ name: string }>(
    "SELECT tablename AS name FROM pg_tables WHERE schemaname = 'public'",
    { type: QueryTypes.SELECT },
  )
  const found = await Promise.all(
    tables.map(async ({ name }) => {
      const rows = await sequelize().query(
        `SELECT 1 FROM ${name} WHERE position($1 in ${name}::text) > 0`,
        { type: QueryTypes.SELECT, bind: [word] },
      )
      return rows.length > 0 ? [name] : []
    }),
  )
  return found.flat()
}

describe('closing an account', () => {
  it('ends the sessions and removes every trace of the person’s address', async () => {
    const elsewhere = await makeBrand()
    await Invitation.create({
      brandId: elsewhere.id,
      email: person.email,
      role: 'dyer',
      tokenHash: digest(randomUUID()),
      expiresAt: new Date(),
    })
    await inTransaction((transaction) =>
      recordActivity(
        { brandId: elsewhere.id, personId: null },
        {
          action: 'membership.invited',
          object: { kind: 'invitation', id: randomUUID(), label: person.email },
          after: { email: person.email },
        },
        transaction,
      ),
    )
    await close()
    expect(await findSignedInPerson(me.sessionId)).toBeNull()
    expect(await Person.count({ where: { id: person.id } })).toBe(0)
    expect(await placesOf(person.id)).toEqual([])
    // The letter that says goodbye is sent yet.
    expect(await placesOf(person.email)).toEqual(['letters'])
    expect(await Letter.findAll({ where: { recipient: person.email } })).toMatchObject([
      { kind: 'account-closed' },
    ])
    expect(await Activity.count({ where: { brandId: elsewhere.id } })).toBe(1)
  })

  it('keeps what they made, and the record of it, under nobody’s name', async () => {
    const line = await makeLine(shared)
    const made = await makeCombination(line, await makeShades(line, 5), { createdById: person.id })
    const object = { kind: 'person', id: person.id, label: 'Owner' }
    await inTransaction((transaction) =>
      recordActivity(
        { brandId: shared.id, personId: colleague.id },
        { action: 'membership.role-changed', object, after: { role: 'owner' } },
        transaction,
      ),
    )
    await close()
    expect((await Combination.findByPk(made.id))!.createdById).toBeNull()
    const rows = await Activity.findAll({
      where: { brandId: shared.id },
      order: [['createdAt', 'ASC']],
    })
    expect(rows.map(({ action, personId }) => [action, personId])).toEqual([
      ['session.opened', null],
      ['membership.role-changed', colleague.id],
      ['person.account-closed', null],
    ])
    expect(rows[1]).toMatchObject({ objectLabel: 'Owner', after: { role: 'owner' } })
  })

  it('removes a brand that nobody else is of with all that is in it, and no other', async () => {
    const [line, theirs] = [await makeLine(own), await makeLine(shared)]
    await makeCombination(line, await makeShades(line, 5))
    await close()
    expect(await Brand.count({ where: { id: own.id } })).toBe(0)
    expect(await Line.count({ where: { id: [line.id, theirs.id] } })).toBe(1)
    expect(await Membership.count({ where: { brandId: shared.id } })).toBe(1)
  })

  it('does so only when the name of that brand was typed', async () => {
    for (const typed of [[], ['A brand of'], [shared.name]]) {
      await expect(close(typed)).rejects.toMatchObject({
        fieldErrors: { brandNames: [expect.stringContaining(own.name)] },
      })
    }
    expect(await findSignedInPerson(me.sessionId)).not.toBeNull()
    expect(await Brand.count({ where: { id: own.id } })).toBe(1)
  })

  it('asks for the password', async () => {
    await expect(close([own.name], 'no')).rejects.toMatchObject({ code: 'invalid' })
    expect(await Person.count({ where: { id: person.id } })).toBe(1)
  })

  it('is refused while others would be left without an owner, and says in which brand', async () => {
    await Membership.update({ role: 'designer' }, { where: { personId: colleague.id } })
    expect((await listFarewells(me)).map(({ brandName, fate }) => [brandName, fate])).toEqual([
      [own.name, 'removed'],
      [shared.name, 'ownerless'],
    ])
    await expect(close()).rejects.toThrow(/last owner of A shared brand.*Make one of them an owner/)
    expect(await Brand.count({ where: { id: own.id } })).toBe(1)
  })

  it('by the last two owners at the same moment leaves one of them', async () => {
    await makePerson({ brand: shared, role: 'dyer' })
    const them = await signedIn(colleague)
    const outcomes = await Promise.allSettled([
      close(),
      closeAccount(them, { password: PASSWORD, brandNames: [] }),
    ])
    expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    const owners = { brandId: shared.id, role: 'owner' as const }
    expect(await Membership.count({ where: owners })).toBe(1)
  })
})
