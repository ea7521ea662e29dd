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
  'beginSecondFactor',
  beginSecondFactorSchema,
  beginSecondFactor,
)

export const confirmSecondFactorAction = definePersonAction(
  'confirmSecondFactor',
  confirmSecondFactorSchema,
  confirmSecondFactor,
)

export const renewRecoveryCodesAction = definePersonAction(
  'renewRecoveryCodes',
  bothFactorsSchema,
  renewRecoveryCodes,
)

export const removeSecondFactorAction = definePersonAction(
  'removeSecondFactor',
  bothFactorsSchema,
  removeSecondFactor,
)
