'use server'

import { createLine } from '@/lib/lines/create-line'
import { createLineSchema, updateLineSchema } from '@/lib/lines/schema'
import { updateLine } from '@/lib/lines/update-line'
import { defineAction } from '@/lib/server/define-action'

export const createLineAction = defineAction(
  'createLine',
  createLineSchema,
  async (actor, input) => {
    const { slug } = await createLine(actor, input)
    return { slug }
  },
)

export const updateLineAction = defineAction(
  'updateLine',
  updateLineSchema,
  async (actor, input) => {
    const { slug, version } = await updateLine(actor, input)
    return { slug, version }
  },
)
