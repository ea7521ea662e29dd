import type { Lab, Observer } from '@/lib/color/types'

/** One of a combination's yarns, as it goes out. */
export interface ExportShade {
  /** What it is called in print. */
  label: string
  number: string
  lab: Lab
  illuminant: 'D65'
  observer: Observer
  /** `#rrggbb`, what a screen shows of it. */
  hex: string
  /** Its part of the whole, 0–1. */
  share: number
  /** In trade notation: MC, CC1 … */
  role: string
}

/** The photograph that a combination was read from. */
export interface ExportPhotograph {
  title: string
  /** Who took it. */
  credit: string
  /** Its licence in words. */
  licence: string
  /** Empty where there is none. */
  licenceUrl: string
  sourceUrl: string
  alt: string
  /** A WebP, JPEG or PNG to be shown in the pictures; null where its licence does not allow that. */
  bytes: Buffer | null
}

/** A combination as it goes out. */
export interface ExportCombination {
  id: string
  title: string
  /** Short text of paragraphs; may be empty. */
  story: string
  /** From top to bottom. */
  shades: readonly ExportShade[]
  photograph: ExportPhotograph | null
}

/** Everything a kit is made of. The same description gives the same files. */
export interface ExportDescription {
  brand: string
  line: string
  combinations: readonly ExportCombination[]
  /** When the last of it was changed. */
  asOf: Date
}
