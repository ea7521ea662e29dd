import { Op, type Transaction } from 'sequelize'

import { digest, makeToken } from '@/lib/auth/seal'
import { InvalidError } from '@/lib/errors'
import { AccountToken } from '@/models'

import { LINK_MINUTES } from './constants'

/** What a link of a letter to a person is for. */
export type LinkKind = AccountToken['kind']

/** When a link that is made now is no longer good. */
export const linkEnd = (): Date => new Date(Date.now() + LINK_MINUTES * 60_000)

/** Says that a link is used up, too old, or none of ours. */
export const deadLink = (): InvalidError =>
  new InvalidError(
    'This link is no longer good: it was used, it is too old, or a newer one was sent.',
  )

/** The token of a link that is still good, with its person, or null. */
export function findLink(kind: LinkKind, token: string): Promise<AccountToken | null> {
  return AccountToken.findOne({
    where: { kind, tokenHash: digest(token), usedAt: null, expiresAt: { [Op.gt]: new Date() } },
    include: ['person'],
  })
}

/** Makes the token of a link, and voids those made for the same before. @returns the token */
export async function makeLink(
  personId: string,
  kind: LinkKind,
  newEmail: string | null,
  transaction: Transaction,
): Promise<string> {
  const { token, tokenHash } = makeToken()
  await AccountToken.update(
    { usedAt: new Date() },
    { where: { personId, kind, usedAt: null }, transaction },
  )
  await AccountToken.create(
    { personId, kind, tokenHash, newEmail, expiresAt: linkEnd() },
    { transaction },
  )
  return token
}

/**
 * Uses a link up, and voids every other of its person: what they asked for before is no longer
 * theirs to be asked. Of two who use it at the same moment one is refused.
 * @throws InvalidError
 */
export async function useLink(
  { id, personId }: AccountToken,
  transaction: Transaction,
): Promise<void> {
  const [used] = await AccountToken.update(
    { usedAt: new Date() },
    { where: { id, usedAt: null }, transaction },
  )
  if (used !== 1) throw deadLink()
  await voidLinks(personId, transaction)
}

/** Voids every link of a person. */
export async function voidLinks(personId: string, transaction: Transaction): Promise<void> {
  await AccountToken.update(
    { usedAt: new Date() },
    { where: { personId, usedAt: null }, transaction },
  )
}
