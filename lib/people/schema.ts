import { z } from 'zod'

import { PASSWORD_LENGTH, PEOPLE_LIMITS } from './constants'

const { min, max } = PASSWORD_LENGTH

const email = z
  .email('Write your e-mail address, like name@brand.example.')
  .trim()
  .toLowerCase()
  .max(PEOPLE_LIMITS.email)
/** A password that somebody has: bounded so that nobody can make us hash a novel. */
const password = z.string().min(1, 'Write your password.').max(1024)
/** A password to be; what else it must be is asked of the server (password-rules.ts). */
const newPassword = z
  .string()
  .max(1024)
  .refine((text) => [...text].length >= min, `Use at least ${min} characters.`)
  .refine((text) => [...text].length <= max, `Use at most ${max} characters.`)
const name = z
  .string()
  .trim()
  .min(1, 'Write your name, as the others of your brand know you.')
  .max(PEOPLE_LIMITS.name, `Keep the name to ${PEOPLE_LIMITS.name} characters.`)
/** What makeToken makes. */
const token = z.string().regex(/^[\w-]{43}$/)
/** A one-time or a recovery code. */
const code = z.string().trim().min(1, 'Write a code.').max(40, 'A code is shorter than that.')

/** Begins a second factor; the code is asked for where one is in use. */
export const beginSecondFactorSchema = z.strictObject({ password, code: code.optional() })
/** A parsed beginning. */
export type BeginSecondFactorInput = z.infer<typeof beginSecondFactorSchema>
/** Confirms that an authenticator shows the codes of the second factor begun. */
export const confirmSecondFactorSchema = z.strictObject({ code })
/** Proves by both factors that it is you: before new recovery codes, or none at all. */
export const bothFactorsSchema = z.strictObject({ password, code })
/** A parsed proof by both factors. */
export type BothFactors = z.infer<typeof bothFactorsSchema>

/** The sign-in form. */
export const signInSchema = z.object({
  email,
  password,
  /** A one-time or a recovery code. */
  code: z.string().trim().max(40).optional(),
})
/** A parsed sign-in form. */
export type SignInInput = z.infer<typeof signInSchema>

/** The form that asks for an account and a brand. */
export const signUpSchema = z.strictObject({
  name,
  email,
  password: newPassword,
  brandName: z
    .string()
    .trim()
    .min(1, 'Write the name of your brand.')
    .max(PEOPLE_LIMITS.brandName, `Keep the name to ${PEOPLE_LIMITS.brandName} characters.`),
})
/** A parsed sign-up form. */
export type SignUpInput = z.infer<typeof signUpSchema>

/** The link of a sign-up letter, and the password that was chosen. */
export const confirmSignUpSchema = z.strictObject({ token, password })
/** A parsed confirmation. */
export type ConfirmSignUpInput = z.infer<typeof confirmSignUpSchema>

/** The form of somebody who has forgotten their password. */
export const requestPasswordResetSchema = z.strictObject({ email })
/** A parsed request. */
export type RequestPasswordResetInput = z.infer<typeof requestPasswordResetSchema>

/** The link of a reset letter, and the password to be. */
export const resetPasswordSchema = z.strictObject({ token, password: newPassword })
/** A parsed reset. */
export type ResetPasswordInput = z.infer<typeof resetPasswordSchema>

/** The form that changes a name. */
export const changeNameSchema = z.strictObject({ name })
/** A parsed change. */
export type ChangeNameInput = z.infer<typeof changeNameSchema>

/** The form that asks for another e-mail address. */
export const requestEmailChangeSchema = z.strictObject({ email, password })
/** A parsed request. */
export type RequestEmailChangeInput = z.infer<typeof requestEmailChangeSchema>

/** The link of a letter to a new address. */
export const confirmEmailChangeSchema = z.strictObject({ token })
/** A parsed confirmation. */
export type ConfirmEmailChangeInput = z.infer<typeof confirmEmailChangeSchema>

/** The form that changes a password. */
export const changePasswordSchema = z.strictObject({ password, newPassword })
/** A parsed change. */
export type ChangePasswordInput = z.infer<typeof changePasswordSchema>

/** Which session to end. */
export const endSessionSchema = z.strictObject({ sessionId: z.uuid() })
/** A parsed choice. */
export type EndSessionInput = z.infer<typeof endSessionSchema>

/** Nothing to say. */
export const nothingSchema = z.strictObject({})

/** The form that closes an account; the names of the brands that go with it, typed by hand. */
export const closeAccountSchema = z.strictObject({
  password,
  brandNames: z.array(z.string().trim().max(PEOPLE_LIMITS.brandName)).max(100),
})
/** A parsed closing. */
export type CloseAccountInput = z.infer<typeof closeAccountSchema>
