'use server'

import { freezeNames } from '@/lib/names/freeze-names'
import { isFrozen } from '@/lib/names/freeze'
import { liftFreeze } from '@/lib/names/lift-freeze'
import { previewLabels } from '@/lib/names/list-labels'
import { presentSettings } from '@/lib/names/present'
import { saveNamingSettings } from '@/lib/names/save-naming-settings'
import {
  freezeNamesSchema,
  liftFreezeSchema,
  namingSettingsSchema,
  previewLabelsSchema,
} from '@/lib/names/schema'
import { defineAction } from '@/lib/server/define-action'

export const saveNamingSettingsAction = defineAction(
  'saveNamingSettings',
  namingSettingsSchema,
  async (actor, input) => {
    const settings = await saveNamingSettings(actor, input)
    return presentSettings(settings, isFrozen(settings))
  },
)

// It changes nothing, and what is typed meanwhile must not wait for a page.
export const previewLabelsAction = defineAction(
  'previewLabels',
  previewLabelsSchema,
  previewLabels,
  { refreshes: false },
)

export const freezeNamesAction = defineAction(
  'freezeNames',
  freezeNamesSchema,
  async (actor, input) => {
    const { version } = await freezeNames(actor, input)
    return { version }
  },
)

export const liftFreezeAction = defineAction(
  'liftFreeze',
  liftFreezeSchema,
  async (actor, input) => {
    const { version } = await liftFreeze(actor, input)
    return { version }
  },
)
