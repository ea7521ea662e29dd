'use server'

import { createLine } from '@/lib/lines/create-line'
import { createLineSchema, updateLineSchema } from '@/lib/lines/schema'
import { updateLine } from '@/lib/lines/update-line'
import { defineAction } from '@/lib/server/define-action'

export const createLineAction = defineAction(
  createLineSchema,
  async function createLineCommand(actor, input) {
    const { slug } = await createLine(actor, input)
    return { slug }
  },
)

export const updateLineAction = defineAction(
  updateLineSchema,
  async function updateLineCommand(actor, input) {
    const { slug, version } = await updateLine(actor, input)
    return { slug, version }
  },
)
