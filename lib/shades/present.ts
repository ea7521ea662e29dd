import { screenColor } from '@/lib/color/gamut'
import type { LightnessLadder } from '@/lib/color/range-study'
import type { Lab, Observer } from '@/lib/color/types'
import type { Vision } from '@/lib/color/vision'
import type { Shade } from '@/models'

import { describeColor } from './color'
import { describeError } from './csv-text'
import type { ImportCounts, PlannedField, PlannedRow, PlannedShade } from './plan-import'
import type { CsvMapping, ReadingTerms, ShadeStatus } from './constants'

/** A shade as it leaves the server. */
export interface ShadeView {
  id: string
  number: string
  /** The approved one; null while it has none. */
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
  /** Its tonal family; null while it is in none. */
  familyId: string | null
  /** Somebody put it there. */
  familyPinned: boolean
  /** Place in its family where somebody ordered it; null stands by lightness. */
  familyPosition: number | null
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
  'familyId',
  'familyPinned',
  'familyPosition',
  'version',
] as const

/** A row with at least {@link SHADE_VIEW_COLUMNS}. */
export type ShadeRow = Pick<Shade, (typeof SHADE_VIEW_COLUMNS)[number]>

/** How a shade is called, here and in all that goes out: its approved name, or "No. 14". */
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
    familyId: shade.familyId,
    familyPinned: shade.familyPinned,
    familyPosition: shade.familyPosition,
    version: shade.version,
  }
}

/** A kept combination that shades stand in. */
export interface ShadeUse {
  combinationId: string
  title: string
}

/** Where shades are used: the first few by title, and how many there are in all. */
export interface ShadeUses {
  combinations: ShadeUse[]
  total: number
  /** Which of the shades asked about are used. */
  shadeIds: string[]
}

/** The answer to a deletion: done, or first where the shades are used. */
export type DeleteShadesAnswer =
  { deleted: true; shadeIds: string[] } | { deleted: false; uses: ShadeUses }

/** One row of an import's preview. */
export interface ImportPreviewRow {
  /** As a spreadsheet counts, the header being row 1. */
  row: number
  outcome: PlannedRow['outcome']
  number: string
  /** What the shade is called; of a bad row, what stands in it. */
  name: string | null
  /** Null for a bad row. */
  status: ShadeStatus | null
  /** Null for a bad row. */
  color: { hex: string; inGamut: boolean; words: string } | null
  /** What would be different: "status: target → dipped". */
  changes: string[]
  /** What is wrong, by row and column. */
  errors: string[]
  note: string | null
}

/** What importing a file would do. */
export interface ImportPreview {
  header: string[]
  /** The first rows as they stand in the file. */
  examples: string[][]
  rowCount: number
  mapping: CsvMapping
  /** What must be settled before anything can be saved, in words. */
  problems: string[]
  counts: ImportCounts
  rows: ImportPreviewRow[]
  /** The bad rows with their reasons, to take away. */
  badCsv: string | null
  shadesRevision: number
}

/** A planned row as the preview shows it. */
export function presentPlannedRow(planned: PlannedRow): ImportPreviewRow {
  const { row } = planned
  const base = { row: row.row, outcome: planned.outcome, errors: [], note: row.note ?? null }
  if (planned.outcome === 'bad') {
    return {
      ...base,
      number: row.number,
      name: row.name,
      status: null,
      color: null,
      changes: [],
      errors: row.errors.map((error) => describeError(row.row, error)),
    }
  }
  const shade = planned.outcome === 'unchanged' ? planned.before : planned.shade
  return {
    ...base,
    number: shade.number,
    name: planned.outcome === 'new' ? null : planned.before.name,
    status: shade.status,
    color: {
      ...screenColor([shade.labL, shade.labA, shade.labB]),
      words: describeColor(shade),
    },
    changes: [
      ...(planned.outcome === 'changed'
        ? planned.fields.map((field) => describeChange(field, planned.before, planned.shade))
        : []),
      ...(planned.outcome !== 'unchanged' && planned.draft !== null
        ? [`“${planned.draft}” as a draft of its name`]
        : []),
    ],
  }
}

function describeChange(field: PlannedField, before: ShadeRow, after: PlannedShade): string {
  const say = (shade: ShadeRow | PlannedShade) =>
    ({
      number: shade.number,
      status: shade.status,
      color: describeColor(shade),
      order: String(shade.position + 1),
    })[field]
  return `${field === 'color' ? 'colour' : field}: ${say(before)} → ${say(after)}`
}

/** Two shades near each other, and how near. */
export interface ShadePair {
  first: ShadeView
  second: ShadeView
  /** ΔE00. */
  deltaE: number
}

/** Two shades that fall together under one vision. */
export interface LostShadePair extends ShadePair {
  /** ΔE00 of the two as seen. */
  seenDeltaE: number
  /** How each is seen, `#rrggbb`. */
  seen: [first: string, second: string]
}

/** The first so many of some pairs, and how many there are. */
export interface Told<Pair> {
  pairs: Pair[]
  total: number
}

/** A family of a line under study. */
export interface StudiedFamily {
  /** Null for the shades in no family. */
  id: string | null
  name: string
  /** Light first. */
  shades: ShadeView[]
  ladder: Pick<LightnessLadder, 'span' | 'widest' | 'evenness'>
}

/** An empty region of the range, and the shade to aim for. */
export interface StudiedGap {
  lab: Lab
  /** `#rrggbb` for a screen. */
  hex: string
  /** A number that no shade has, another for each gap. */
  number: string
  /** Nearest first. */
  nearest: { shade: ShadeView; deltaE: number }[]
}

/** What a study finds in the range of a line. */
export interface RangeStudy {
  /** Shades studied: those not retired. */
  shadeCount: number
  retiredCount: number
  /** Some of them were read with the other observer. */
  isMixed: boolean
  /** The terms of most readings, which a target takes on. */
  terms: ReadingTerms
  twins: Told<ShadePair>
  /** The two that are nearest each other, near-twins or not; null of fewer than two. */
  nearest: ShadePair | null
  lost: Record<Vision, Told<LostShadePair>>
  families: StudiedFamily[]
  gaps: StudiedGap[]
}
