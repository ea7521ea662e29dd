'use server'

import { defineAction } from '@/lib/server/define-action'
import { requireSecondFactor, requireSecondFactorSchema } from '@/lib/team/require-second-factor'

export const requireSecondFactorAction = defineAction(
  'requireSecondFactor',
  requireSecondFactorSchema,
  requireSecondFactor,
)
