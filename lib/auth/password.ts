import { hash, verify, type Algorithm } from '@node-rs/argon2'

/** OWASP's first choice for argon2id. @source OWASP Password Storage Cheat Sheet (2024) */
const PARAMETERS = {
  algorithm: 2 satisfies Algorithm.Argon2id,
  memoryCost: 19_456,
  timeCost: 2,
  parallelism: 1,
} as const

/**
 * A password as it is judged and hashed: however a keyboard composes "é" or "ﬁ", it is the same.
 * @source NIST SP 800-63B-4 § 3.1.1.2; Unicode Standard Annex 15, NFKC
 */
export const plainPassword = (password: string): string => password.normalize('NFKC')

/** The argon2id hash of a password, in PHC string format. */
export function hashPassword(password: string): Promise<string> {
  return hash(plainPassword(password), PARAMETERS)
}

/** Whether a hash was made with other parameters than today's, and so is to be made again. */
export const isOutdated = (passwordHash: string): boolean =>
  !passwordHash.startsWith(
    `$argon2id$v=19$m=${PARAMETERS.memoryCost},t=${PARAMETERS.timeCost},p=${PARAMETERS.parallelism}$`,
  )

let decoy: Promise<string> | undefined

/**
 * Whether the password fits the hash. Without a hash (nobody has that address) it does the same
 * work and says no, so that the time taken does not tell who has an account.
 */
export async function verifyPassword(
  passwordHash: string | undefined,
  password: string,
): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password')
  const against = passwordHash ?? (await decoy)
  const plain = plainPassword(password)
  // Hashes made before passwords were composed alike hold what was typed.
  const fits =
    (await verify(against, plain)) || (plain !== password && (await verify(against, password)))
  return fits && passwordHash !== undefined
}
