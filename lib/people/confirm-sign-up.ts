import { randomUUID } from 'node:crypto'

import { Op, UniqueConstraintError, type Transaction } from 'sequelize'

import { recordActivity } from '@/lib/activity/record'
import { verifyPassword } from '@/lib/auth/password'
import { refund, spend } from '@/lib/auth/rate-limits'
import { digest } from '@/lib/auth/seal'
import { ConflictError, InvalidError } from '@/lib/errors'
import { slugify } from '@/lib/lines/create-line'
import { Brand, inTransaction, Membership, Person, SignUp } from '@/models'
import { withinScope } from '@/models/scope'

import { RESERVED_SLUGS } from './constants'
import { deadLink } from './links'
import type { ConfirmSignUpInput } from './schema'

/** Brands of one name are told apart in their addresses by a number; so many are tried. */
const NAMESAKES = 50

/** The sign-up of a link that is still good, or null. */
export function findSignUp(token: string): Promise<SignUp | null> {
  return SignUp.findOne({
    where: { tokenHash: digest(token), expiresAt: { [Op.gt]: new Date() } },
  })
}

/**
 * Makes the person and the brand of a sign-up. Its password is asked for again: somebody else may
 * have signed up with this address, and the link alone would make an account that they can open.
 * @returns what to sign in with, and where to go then
 * @throws InvalidError when the link is no longer good or the password is not the one chosen,
 *   ConflictError when the address has an account meanwhile, TooManyError
 */
export async function confirmSignUp({
  token,
  password,
}: ConfirmSignUpInput): Promise<{ email: string; brandSlug: string }> {
  const signUp = await findSignUp(token)
  if (!signUp) throw deadLink()
  const { email, name, brandName, passwordHash } = signUp
  await spend('sign-in-account', email, 'Your password')
  if (!(await verifyPassword(passwordHash, password))) {
    const message = 'That is not the password you chose when you signed up.'
    throw new InvalidError(message, { password: [message] })
  }
  await refund('sign-in-account', email)
  const brandId = randomUUID()
  try {
    return await withinScope({ brandId }, () =>
      inTransaction(async (transaction) => {
        // Of two who confirm at the same moment one finds it gone; others for the address go too.
        if ((await SignUp.destroy({ where: { id: signUp.id }, transaction })) !== 1)
          throw deadLink()
        await SignUp.destroy({ where: { email }, transaction })
        const brandSlug = await makeBrand(brandId, brandName, transaction)
        const person = await Person.create({ email, name, passwordHash }, { transaction })
        await Membership.create({ brandId, personId: person.id, role: 'owner' }, { transaction })
        await recordActivity(
          { brandId, personId: person.id },
          {
            action: 'brand.created',
            object: { kind: 'brand', id: brandId, label: brandName },
          },
          transaction,
        )
        return { email, brandSlug }
      }),
    )
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new ConflictError('There is an account with this address meanwhile: sign in with it.')
  }
}

/** Makes the brand under the first address of its name that is free. @returns its slug */
async function makeBrand(id: string, name: string, transaction: Transaction): Promise<string> {
  const base = slugify(name, 'brand')
  for (let at = 1; at <= NAMESAKES; at++) {
    const slug = at === 1 ? base : `${base}-${at}`
    if (RESERVED_SLUGS.includes(slug)) continue
    // Brands of others are not seen from here; that one has the address, only its index knows.
    await Brand.bulkCreate([{ id, name, slug }], {
      ignoreDuplicates: true,
      returning: false,
      transaction,
    })
    if ((await Brand.count({ where: { id }, transaction })) === 1) return slug
  }
  throw new ConflictError('Too many brands have that name. Sign up again with a longer one.')
}
