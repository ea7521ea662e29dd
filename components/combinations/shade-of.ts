import type { ShadeView } from '@/lib/shades/present'

/** What is known of a shade by its id: null for an empty place and for one never heard of. */
export type ShadeOf = (id: string | null) => ShadeView | null
