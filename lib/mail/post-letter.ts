import { randomUUID } from 'node:crypto'

import type { Transaction } from 'sequelize'

import { seal } from '@/lib/auth/seal'
import { enqueue } from '@/lib/jobs/queue'
import { Letter } from '@/models'

import { setLetter, type LetterContent } from './letter'

/**
 * Puts a letter into the outbox in the transaction of what it tells of, with the job that sends
 * it: all are there after commit, or none. A mail server that is away delays it.
 */
export async function postLetter(
  recipient: string,
  content: LetterContent,
  transaction: Transaction,
): Promise<void> {
  const id = randomUUID()
  const { kind, subject } = content
  const sealedBody = seal(JSON.stringify(setLetter(content)), 'letter')
  // The web may post letters, not read them: nothing is asked back.
  await Letter.create(
    { id, kind, recipient, subject, sealedBody },
    { transaction, returning: false },
  )
  await enqueue('send-letter', { letterId: id }, transaction)
}
