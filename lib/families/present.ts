import type { ShadeView } from '@/lib/shades/present'
import type { Family } from '@/models'

/** A tonal family as it leaves the server. */
export interface FamilyView {
  id: string
  name: string
  /** A person gave the name. */
  nameGiven: boolean
  neutral: boolean
}

/** A family with its shades in the order of the sample book. */
export interface FamilyWithShades extends FamilyView {
  /** Its shades stand in an order of people's own. */
  ordered: boolean
  shades: ShadeView[]
}

/** What sorting anew would do. */
export interface SortPreview {
  version: number
  /** Shades that would stand in another family. */
  moved: number
  /** Shades that stay because they are pinned. */
  pinned: number
  families: {
    id: string
    name: string
    /** What the family is called now; null for a new one. */
    formerName: string | null
    shades: number
    /** How many of them come from elsewhere. */
    arriving: number
  }[]
  /** Families that would go, by name. */
  gone: string[]
}

/** The columns {@link presentFamily} needs. */
export const FAMILY_VIEW_COLUMNS = ['id', 'name', 'nameGiven', 'neutral'] as const

/** A family row as its view. */
export const presentFamily = ({
  id,
  name,
  nameGiven,
  neutral,
}: Pick<Family, (typeof FAMILY_VIEW_COLUMNS)[number]>): FamilyView => ({
  id,
  name,
  nameGiven,
  neutral,
})
