import { z } from 'zod'

import { PEOPLE_LIMITS, ROLES } from '../people/constants'
import { TEAM_LIMITS } from './constants'

const address = z.email().max(254)

/**
 * The addresses of a pasted list, in lower case and each once: between commas, semicolons or white
 * space, also as "Name <address>".
 */
export function readAddresses(pasted: string): string[] {
  const addresses = pasted
    .split(/[,;\n]/)
    .map((part) => /<([^<>]*)>/.exec(part)?.[1] ?? part)
    .flatMap((part) => part.split(/\s+/))
    .filter((part) => part !== '')
    .map((part) => part.toLowerCase())
  return [...new Set(addresses)]
}

/** The form that invites: one role for all addresses of it. */
export const inviteMembersSchema = z.strictObject({
  emails: z
    .string()
    .max(TEAM_LIMITS.pasted, 'That is more text than a list of addresses.')
    .transform(readAddresses)
    .superRefine((emails, context) => {
      const say = (message: string) => context.addIssue({ code: 'custom', message })
      if (emails.length === 0) say('Write at least one e-mail address.')
      if (emails.length > TEAM_LIMITS.addresses) {
        say(`At most ${TEAM_LIMITS.addresses} at once; these are ${emails.length}.`)
      }
      const wrong = emails.filter((email) => !address.safeParse(email).success)
      if (wrong.length > 0) {
        const named = wrong.slice(0, 3).map((one) => `“${one.slice(0, 60)}”`)
        say(
          wrong.length === 1
            ? `${named[0]} is no e-mail address. Nobody has been invited yet.`
            : `${named.join(', ')}${wrong.length > 3 ? ' and others' : ''} are no e-mail addresses. Nobody has been invited yet.`,
        )
      }
    }),
  role: z.enum(ROLES),
  requestKey: z.uuid(),
})

/** Names an invitation of the brand. */
export const invitationIdSchema = z.strictObject({ invitationId: z.uuid() })

/** Names a member of the brand. */
export const membershipIdSchema = z.strictObject({ membershipId: z.uuid() })

/** A member's new role, and the one they had when the form was opened. */
export const changeRoleSchema = z.strictObject({
  membershipId: z.uuid(),
  role: z.enum(ROLES),
  was: z.enum(ROLES),
})

/** The question to leave; the brand is the actor's. */
export const leaveBrandSchema = z.strictObject({})

const token = z.string().max(100)

/** What somebody with an account accepts an invitation with. */
export const acceptInvitationSchema = z.strictObject({ token })

/** What somebody without an account joins with. The command judges the password. */
export const joinAsNewPersonSchema = z.strictObject({
  token,
  name: z
    .string()
    .trim()
    .min(1, 'Write your name.')
    .max(PEOPLE_LIMITS.name, `Keep your name to ${PEOPLE_LIMITS.name} characters.`)
    .regex(/^[^\p{Cc}]*$/u, 'Write your name on one line.'),
  password: z.string().min(1, 'Choose a password.').max(1024),
})

/** What the form holds before parsing. */
export type InviteMembersValues = z.input<typeof inviteMembersSchema>
/** Parsed invitations. */
export type InviteMembersInput = z.output<typeof inviteMembersSchema>
/** A parsed name of an invitation. */
export type InvitationIdInput = z.output<typeof invitationIdSchema>
/** A parsed name of a member. */
export type MembershipIdInput = z.output<typeof membershipIdSchema>
/** A parsed change of role. */
export type ChangeRoleInput = z.output<typeof changeRoleSchema>
/** A parsed acceptance. */
export type AcceptInvitationInput = z.output<typeof acceptInvitationSchema>
/** What the form holds before parsing. */
export type JoinAsNewPersonValues = z.input<typeof joinAsNewPersonSchema>
/** A parsed new person. */
export type JoinAsNewPersonInput = z.output<typeof joinAsNewPersonSchema>
