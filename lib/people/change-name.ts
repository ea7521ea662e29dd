import type { SignedInPerson } from '@/lib/auth/sessions'
import { inTransaction, Person } from '@/models'

import { recordInBrands } from './record-in-brands'
import type { ChangeNameInput } from './schema'

/** Changes what the others of their brands know a person by. */
export async function changeName({ id }: SignedInPerson, { name }: ChangeNameInput): Promise<void> {
  await inTransaction(async (transaction) => {
    await Person.update({ name }, { where: { id }, transaction })
    // Neither name: the record outlives the account.
    await recordInBrands(id, { action: 'person.name-changed' }, transaction)
  })
}
