'use server'

import { beginSecondFactor } from '@/lib/people/begin-second-factor'
import { confirmSecondFactor } from '@/lib/people/confirm-second-factor'
import { removeSecondFactor } from '@/lib/people/remove-second-factor'
import { renewRecoveryCodes } from '@/lib/people/renew-recovery-codes'
import {
  beginSecondFactorSchema,
  bothFactorsSchema,
  confirmSecondFactorSchema,
} from '@/lib/people/schema'
import { definePersonAction } from '@/lib/server/define-action'

export const beginSecondFactorAction = definePersonAction(
  beginSecondFactorSchema,
  beginSecondFactor,
)

export const confirmSecondFactorAction = definePersonAction(
  confirmSecondFactorSchema,
  confirmSecondFactor,
)

export const renewRecoveryCodesAction = definePersonAction(bothFactorsSchema, renewRecoveryCodes)

export const removeSecondFactorAction = definePersonAction(bothFactorsSchema, removeSecondFactor)
