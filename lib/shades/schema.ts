import { z } from 'zod'

/** How far a shade has come: wished for, dyed as a lab dip, approved, no longer made. */
export const SHADE_STATUSES = ['target', 'dipped', 'approved', 'retired'] as const
/** One of SHADE_STATUSES. */
export type ShadeStatus = (typeof SHADE_STATUSES)[number]

/** The bounds of what a shade may hold. */
export const SHADE_LIMITS = {
  number: 16,
  name: 60,
  /** CIELAB; b and a beyond ±150 are no surface colour. */
  ab: 150,
  perLine: 5_000,
} as const

export const shadeNumber = z
  .string()
  .trim()
  .min(1, 'Give the shade a number.')
  .max(SHADE_LIMITS.number, `Keep the number to ${SHADE_LIMITS.number} characters.`)
