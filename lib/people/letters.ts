import type { LetterContent } from '@/lib/mail/letter'

import { LINK_MINUTES } from './constants'

const GOOD_FOR = `The link is good for ${LINK_MINUTES} minutes, once.`

/** To somebody who asked for an account. */
export const confirmSignUpLetter = (
  { name, brandName }: { name: string; brandName: string },
  token: string,
): LetterContent => ({
  kind: 'sign-up',
  subject: 'Confirm your address',
  name,
  paragraphs: [
    `You asked for a place on Woadmap for ${brandName}. Confirm that this is your address and it is there.`,
    `${GOOD_FOR} You will be asked for the password that you chose.`,
  ],
  action: { label: 'Confirm this address', path: `/confirm/${token}` },
  closing: 'If it was not you, do nothing: without the link there will be no account.',
})

/** To somebody who asked for an account and has one. */
export const accountExistsLetter = (name: string): LetterContent => ({
  kind: 'account-exists',
  subject: 'You have an account already',
  name,
  paragraphs: [
    'Somebody, probably you, asked for a new account on Woadmap with this address. It has one already, and nothing was changed.',
    'Sign in with it. If you no longer know the password, the sign-in page helps.',
  ],
  action: { label: 'Sign in', path: '/sign-in' },
  closing: 'If it was not you, you need do nothing.',
})

/** To somebody who has forgotten their password. */
export const resetPasswordLetter = (name: string, token: string): LetterContent => ({
  kind: 'reset-password',
  subject: 'Choose a new password',
  name,
  paragraphs: [
    `You asked for a new password for Woadmap. ${GOOD_FOR}`,
    'Until you have chosen one, the old one stays as it is.',
  ],
  action: { label: 'Choose a new password', path: `/reset-password/${token}` },
  closing: 'If it was not you, do nothing: nobody can sign in with this letter alone.',
})

/** To an address for which a password was to be reset, and which has no account. */
export const noAccountLetter = (): LetterContent => ({
  kind: 'no-account',
  subject: 'There is no account with this address',
  paragraphs: [
    'Somebody, probably you, asked for a new password for Woadmap with this address. It has no account; perhaps you signed up with another address of yours.',
  ],
  action: { label: 'Try another address', path: '/forgotten-password' },
  closing: 'If it was not you, you need do nothing.',
})

/** To somebody whose password is another now. */
export const passwordChangedLetter = (name: string): LetterContent => ({
  kind: 'password-changed',
  subject: 'Your password was changed',
  name,
  paragraphs: [
    'The password of your account on Woadmap was changed just now. Everywhere else you were signed in, you are signed out.',
    'If it was not you, choose a new password at once, and look at what was done in your brand meanwhile.',
  ],
  action: { label: 'Choose a new password', path: '/forgotten-password' },
})

/** To the address that somebody wants to have instead of their old one. */
export const confirmEmailLetter = (name: string, token: string): LetterContent => ({
  kind: 'change-email',
  subject: 'Confirm your new address',
  name,
  paragraphs: [
    `You want to use this address for your account on Woadmap. ${GOOD_FOR}`,
    'Until you confirm it, the old address stays.',
  ],
  action: { label: 'Confirm this address', path: `/confirm-email/${token}` },
  closing: 'If it was not you, do nothing: nothing will change.',
})

/** To an address that somebody else wants to have, and that has an account. */
export const emailTakenLetter = (name: string): LetterContent => ({
  kind: 'email-taken',
  subject: 'This address has an account already',
  name,
  paragraphs: [
    'Somebody, perhaps you, wants to use this address for another account on Woadmap. Your account has it already, and nothing was changed.',
    'To use it for the other account, close this one or give it another address first.',
  ],
  closing: 'If it was not you, you need do nothing.',
})

/** To the old address, before it is given up. */
export const emailChangeNoticeLetter = (name: string, email: string): LetterContent => ({
  kind: 'email-change-notice',
  subject: 'Your address is about to change',
  name,
  paragraphs: [
    `Somebody who knows your password, probably you, wants to use ${email} for your account on Woadmap. As soon as it is confirmed there, this address no longer signs you in.`,
    'If it was not you, choose a new password now; the change is then void.',
  ],
  action: { label: 'Choose a new password', path: '/forgotten-password' },
})

/** To the address that somebody had, once it is given up. */
export const emailChangedLetter = (name: string): LetterContent => ({
  kind: 'email-changed',
  subject: 'Your address was changed',
  name,
  paragraphs: [
    'Your account on Woadmap has the new address from now on; this one no longer signs you in.',
    'If it was not you, tell an owner of your brand at once.',
  ],
})

/** To somebody who has closed their account. */
export const accountClosedLetter = (brandNames: readonly string[]): LetterContent => ({
  kind: 'account-closed',
  subject: 'Your account is closed',
  paragraphs: [
    'Your account on Woadmap is closed, and your name and address are removed from it. What you made in your brands stays there, under “a former member”.',
    ...(brandNames.length > 0
      ? [`Removed with it, since nobody else was of it: ${brandNames.join(', ')}.`]
      : []),
  ],
})
