/** The four ways a person can belong to a brand. */
export type DemoRole = 'owner' | 'marketer' | 'designer' | 'dyer'

/** One person who can sign in to the demo; addresses are under `.example`, which is never delivered. */
export interface DemoAccount {
  role: DemoRole
  /** slug of the brand */
  brand: string
  brandName: string
  name: string
  email: string
  password: string
}

/** How far a shade has come, from an idea on screen to a standard on the shelf. */
export type DemoShadeStatus = 'target' | 'dipped' | 'approved' | 'retired'

/** An instrument reading: CIELAB relative to the reading's own white. */
export interface DemoReading {
  L: number
  a: number
  b: number
  illuminant: 'D65'
  observer: '10'
}

/** One shade of a demo line; exactly one of `lab` and `hex` is set. */
export interface DemoShade {
  number: string
  /** The approved one; null while the shade has none. */
  name: string | null
  status: DemoShadeStatus
  lab: DemoReading | null
  /** sRGB, `#rrggbb`, for a shade that was only picked on screen */
  hex: string | null
  order: number
}

/** One yarn line with its shades. */
export interface DemoLine {
  slug: string
  name: string
  /** percentages, descending, together 100 */
  fibers: { fiber: string; percent: number }[]
  ply: number
  /** 0 (lace) to 7 (jumbo) */
  yarnWeight: 0 | 1 | 2 | 3 | 4 | 5 | 6 | 7
  grams: number
  meters: number
  needleMm: number
  /** stitches and rows to 10 cm */
  gauge: { stitches: number; rows: number }
  currency: string
  /** price of one skein in the currency's smallest unit */
  priceMinor: number
  /** ISO date */
  launchDate: string
  shades: DemoShade[]
}

/** One brand, the tenant of everything under it. */
export interface DemoBrand {
  slug: string
  name: string
  lines: DemoLine[]
}

/** One photograph of the demo, rendered by scripts/render-photographs.ts. */
export interface DemoPhotograph {
  slug: string
  title: string
  photographer: string
  licence: 'own-work'
  altText: string
  /** file name in seeders/demo/photographs */
  file: string
}

/** Which of the five readings of a photograph a kept combination starts from. */
export type DemoReadingKind = 'true' | 'accent' | 'contrast' | 'family' | 'quiet'

/** A combination to keep: the five shades come from the product's own match. */
export interface DemoCombination {
  title: string
  /** slug of the photograph */
  photograph: string
  reading: DemoReadingKind
  lane: 'sketched' | 'short-listed' | 'chosen'
  /** Who kept it, by role. */
  by: 'owner' | 'designer'
}

/** An idea for a name, with what was said of it; an approved one stands in the shades' own file. */
export interface DemoIdea {
  /** Number of the shade; null lies in the heap. */
  shade: string | null
  text: string
  note?: string
  /** Who brought it, by role. */
  by: 'owner' | 'marketer' | 'designer'
  state: 'draft' | 'in-review' | 'approved' | 'returned' | 'put-by'
  /** Why it was returned. */
  reason?: string
  wordingReason?: string
  votes?: { by: 'owner' | 'designer'; vote: 'yes' | 'unsure' | 'no'; comment?: string }[]
  talk?: { by: DemoIdea['by']; text: string }[]
}

/** How the names of a line are set, and the ideas that are no names yet. */
export interface DemoNaming {
  care: string
  themes: string[]
  /** Who decides besides the owner, by role. */
  reviewer: 'designer'
  ideas: DemoIdea[]
}
