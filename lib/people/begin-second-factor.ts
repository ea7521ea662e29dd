import { toString as drawQr } from 'qrcode'

import { makeTotpSecret } from '@/lib/auth/second-factor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { inTransaction } from '@/models'

import { lockPerson } from './lock-person'
import { countingCode, takeCode } from './prove-code'
import { requirePassword } from './require-password'
import type { BeginSecondFactorInput } from './schema'

/** What sets an authenticator up; shown once. */
export interface BegunSecondFactor {
  /** The secret in base32, in groups of four letters, to be typed. */
  secret: string
  /** The `otpauth:` address, which opens an authenticator on the telephone itself. */
  uri: string
  /** The same address for another device's camera: the `data:` address of an SVG picture. */
  picture: string
}

/**
 * Makes a new secret for an authenticator in place of any that was begun before. One in use stays
 * in use until a code has confirmed the new one.
 * @throws InvalidError when the password, or the code of the one in use, is wrong; TooManyError
 */
export async function beginSecondFactor(
  person: SignedInPerson,
  { password, code = '' }: BeginSecondFactorInput,
): Promise<BegunSecondFactor> {
  const { sealed, secret, uri } = makeTotpSecret(person.email)
  await requirePassword(person, password)
  await countingCode(person, () =>
    inTransaction(async (transaction) => {
      const row = await lockPerson(person.id, transaction)
      if (row.totpConfirmedAt) await takeCode(row, code, transaction)
      await row.update({ totpPending: sealed }, { transaction })
    }),
  )
  const svg = await drawQr(uri, {
    type: 'svg',
    errorCorrectionLevel: 'M',
    color: { dark: '#000000', light: '#ffffff' },
  })
  return {
    secret: secret.replace(/(.{4})(?=.)/g, '$1 '),
    uri,
    picture: `data:image/svg+xml;base64,${Buffer.from(svg).toString('base64')}`,
  }
}
