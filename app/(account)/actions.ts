'use server'

import { confirmEmailChange } from '@/lib/people/confirm-email-change'
import { confirmSignUp } from '@/lib/people/confirm-sign-up'
import { requestPasswordReset } from '@/lib/people/request-password-reset'
import { resetPassword } from '@/lib/people/reset-password'
import {
  confirmEmailChangeSchema,
  confirmSignUpSchema,
  requestPasswordResetSchema,
  resetPasswordSchema,
  signUpSchema,
} from '@/lib/people/schema'
import { signUp } from '@/lib/people/sign-up'
import { definePublicAction } from '@/lib/server/define-action'

// Each leaves the page it was sent from to say what happened: the link it stands on is used up.
const STAYS = { refreshes: false }

export const signUpAction = definePublicAction('signUp', signUpSchema, signUp, STAYS)

export const confirmSignUpAction = definePublicAction(
  'confirmSignUp',
  confirmSignUpSchema,
  confirmSignUp,
  STAYS,
)

export const requestPasswordResetAction = definePublicAction(
  'requestPasswordReset',
  requestPasswordResetSchema,
  requestPasswordReset,
  STAYS,
)

export const resetPasswordAction = definePublicAction(
  'resetPassword',
  resetPasswordSchema,
  resetPassword,
  STAYS,
)

export const confirmEmailChangeAction = definePublicAction(
  'confirmEmailChange',
  confirmEmailChangeSchema,
  confirmEmailChange,
  STAYS,
)
