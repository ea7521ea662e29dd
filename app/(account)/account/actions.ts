'use server'

import { changeName } from '@/lib/people/change-name'
import { changePassword } from '@/lib/people/change-password'
import { closeAccount } from '@/lib/people/close-account'
import { endOtherSessions } from '@/lib/people/end-other-sessions'
import { endOwnSession } from '@/lib/people/end-session'
import { requestEmailChange } from '@/lib/people/request-email-change'
import {
  changeNameSchema,
  changePasswordSchema,
  closeAccountSchema,
  endSessionSchema,
  nothingSchema,
  requestEmailChangeSchema,
} from '@/lib/people/schema'
import { definePersonAction } from '@/lib/server/define-action'

export const changeNameAction = definePersonAction(changeNameSchema, changeName)

export const requestEmailChangeAction = definePersonAction(
  requestEmailChangeSchema,
  requestEmailChange,
)

export const changePasswordAction = definePersonAction(changePasswordSchema, changePassword)

export const endSessionAction = definePersonAction(endSessionSchema, endOwnSession)

export const endOtherSessionsAction = definePersonAction(nothingSchema, endOtherSessions)

export const closeAccountAction = definePersonAction(closeAccountSchema, closeAccount, {
  refreshes: false,
})
