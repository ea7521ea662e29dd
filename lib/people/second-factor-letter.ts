import type { Transaction } from 'sequelize'

import type { LetterContent } from '@/lib/mail/letter'
import { postLetter } from '@/lib/mail/post-letter'

/** What changed about how somebody proves who they are. */
export type SecondFactorChange =
  | {
      kind:
        | 'second-factor-set'
        | 'second-factor-replaced'
        | 'second-factor-removed'
        | 'recovery-codes-renewed'
    }
  | { kind: 'recovery-code-used'; left: number }

const ACTION = { label: 'Look at your second factor', path: '/account/second-factor' }
const NOT_YOU =
  'If this was not you, somebody knows your password: change it now, and end the sessions you do not know.'

/** "No recovery code is left", "1 recovery code is left", "9 recovery codes are left". */
const leftInWords = (left: number) =>
  left === 0
    ? 'No recovery code is left'
    : left === 1
      ? '1 recovery code is left'
      : `${left} recovery codes are left`

function contentOf(change: SecondFactorChange): Pick<LetterContent, 'subject' | 'paragraphs'> {
  switch (change.kind) {
    case 'second-factor-set':
      return {
        subject: 'Your second factor is in use',
        paragraphs: [
          'From now on, signing in to Woadmap asks for a code of your authenticator after your password.',
          'Keep your recovery codes where you will find them without your telephone.',
        ],
      }
    case 'second-factor-replaced':
      return {
        subject: 'Your authenticator was changed',
        paragraphs: [
          'From now on, signing in to Woadmap asks for a code of your new authenticator. The codes of the earlier one, and the earlier recovery codes, are no good any more.',
        ],
      }
    case 'second-factor-removed':
      return {
        subject: 'Your second factor was removed',
        paragraphs: [
          'Signing in to Woadmap asks for your password alone again. Your recovery codes are no good any more.',
        ],
      }
    case 'recovery-codes-renewed':
      return {
        subject: 'You have new recovery codes',
        paragraphs: ['New recovery codes were made. The earlier ones are no good any more.'],
      }
    case 'recovery-code-used':
      return {
        subject: 'A recovery code was used',
        paragraphs: [
          `Somebody signed in as you with a recovery code in place of your authenticator. ${leftInWords(change.left)}.`,
        ],
      }
  }
}

/** Tells somebody by letter, in the change's transaction, what changed about how they sign in. */
export async function postSecondFactorLetter(
  { name, email }: { name: string; email: string },
  change: SecondFactorChange,
  transaction: Transaction,
): Promise<void> {
  const { kind } = change
  const content = { kind, name, ...contentOf(change), action: ACTION, closing: NOT_YOU }
  await postLetter(email, content, transaction)
}
