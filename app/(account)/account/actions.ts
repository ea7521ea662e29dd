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

export const changeNameAction = definePersonAction('changeName', changeNameSchema, changeName)

export const requestEmailChangeAction = definePersonAction(
  'requestEmailChange',
  requestEmailChangeSchema,
  requestEmailChange,
)

export const changePasswordAction = definePersonAction(
  'changePassword',
  changePasswordSchema,
  changePassword,
)

export const endSessionAction = definePersonAction('endSession', endSessionSchema, endOwnSession)

export const endOtherSessionsAction = definePersonAction(
  'endOtherSessions',
  nothingSchema,
  endOtherSessions,
)

export const closeAccountAction = definePersonAction(
  'closeAccount',
  closeAccountSchema,
  closeAccount,
  {
    refreshes: false,
  },
)
