import { z } from 'zod'

/** The sign-in form. The password is bounded so that nobody can make us hash a novel. */
export const signInSchema = z.object({
  email: z
    .email('Write your e-mail address, like name@brand.example.')
    .trim()
    .toLowerCase()
    .max(254),
  password: z.string().min(1, 'Write your password.').max(1024),
  /** A one-time or a recovery code. */
  code: z.string().trim().max(40).optional(),
})
/** A parsed sign-in form. */
export type SignInInput = z.infer<typeof signInSchema>
