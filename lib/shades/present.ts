import { screenColor } from '@/lib/color/gamut'
import type { Lab, Observer } from '@/lib/color/types'
import type { Shade } from '@/models'

import type { ShadeStatus } from './schema'

/** A shade as it leaves the server. */
export interface ShadeView {
  id: string
  number: string
  /** Null while it has none. */
  name: string | null
  /** The name, or "No. 14" while it has none. */
  label: string
  /** The record: L*, a*, b* under D65 and `observer`. Measure and match with this only. */
  lab: Lab
  illuminant: 'D65'
  observer: Observer
  /** `#rrggbb` for a screen, gamut-mapped from Lab. */
  hex: string
  /** False when a screen shows a less vivid stand-in. */
  inGamut: boolean
  /** The hex it was entered as; null when Lab was entered. */
  enteredHex: string | null
  status: ShadeStatus
  /** Place in the line's order, from 0; gaps and ties are allowed. */
  position: number
  version: number
}

/** The columns {@link presentShade} needs. */
export const SHADE_VIEW_COLUMNS = [
  'id',
  'number',
  'name',
  'labL',
  'labA',
  'labB',
  'illuminant',
  'observer',
  'hex',
  'status',
  'position',
  'version',
] as const

/** A row with at least {@link SHADE_VIEW_COLUMNS}. */
export type ShadeRow = Pick<Shade, (typeof SHADE_VIEW_COLUMNS)[number]>

/** How a shade is called: its name, or "No. 14". */
export function shadeLabel({ number, name }: { number: string; name: string | null }): string {
  return name ?? `No. ${number}`
}

/** A shade row as its view. */
export function presentShade(shade: ShadeRow): ShadeView {
  const lab: Lab = [shade.labL, shade.labA, shade.labB]
  const { hex, inGamut } = screenColor(lab)
  return {
    id: shade.id,
    number: shade.number,
    name: shade.name,
    label: shadeLabel(shade),
    lab,
    illuminant: shade.illuminant,
    observer: shade.observer,
    hex,
    inGamut,
    enteredHex: shade.hex,
    status: shade.status,
    position: shade.position,
    version: shade.version,
  }
}
