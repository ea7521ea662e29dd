import { unseal } from '@/lib/auth/seal'
import { Letter } from '@/models'

/** A letter in the outbox, opened. */
export interface OpenedLetter {
  kind: string
  subject: string
  text: string
  html: string
}

/** The letters to an address, oldest first. */
export async function lettersTo(recipient: string): Promise<OpenedLetter[]> {
  const letters = await Letter.findAll({ where: { recipient }, order: [['createdAt', 'ASC']] })
  return letters.map(({ kind, subject, sealedBody }) => ({
    kind,
    subject,
    ...(JSON.parse(unseal(sealedBody, 'letter')) as { text: string; html: string }),
  }))
}

/** The token of the newest letter of a kind to an address. */
export async function tokenSentTo(recipient: string, kind: string): Promise<string> {
  const letter = (await lettersTo(recipient)).findLast((one) => one.kind === kind)
  const token = /\/([\w-]{43})\s/.exec(letter?.text ?? '')?.[1]
  if (!token) throw new Error(`No link in a letter ${kind} to ${recipient}.`)
  return token
}
