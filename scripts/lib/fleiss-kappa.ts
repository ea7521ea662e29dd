/** How far several raters agree. */
export interface Agreement {
  /** 0–1: of all pairs of raters on a subject, the share that chose the same category */
  observed: number
  /** 0–1: what that would be if each chose at random as often as all did together */
  byChance: number
  /** 1 for full agreement, 0 for no more than chance; null when all marks are of one category */
  kappa: number | null
}

/**
 * Fleiss' kappa of a table with a row for each subject: how many raters put it into each category.
 * Throws RangeError for no subjects, fewer than two raters, or rows of unlike numbers of raters.
 * @source J. L. Fleiss, Measuring nominal scale agreement among many raters, Psychological Bulletin 76
 *   (1971) 378–382
 */
export function fleissKappa(table: readonly (readonly number[])[]): Agreement {
  const sum = (numbers: readonly number[]) => numbers.reduce((total, number) => total + number, 0)
  const raters = sum(table[0] ?? [])
  if (raters < 2) throw new RangeError('Agreement needs a subject and two raters.')
  if (table.some((row) => sum(row) !== raters))
    throw new RangeError('Not every subject has a mark of every rater.')
  const observed =
    sum(
      table.map((row) => (sum(row.map((count) => count ** 2)) - raters) / (raters * (raters - 1))),
    ) / table.length
  const byChance = sum(
    table[0]!.map((_, category) => {
      const share = sum(table.map((row) => row[category]!)) / (table.length * raters)
      return share ** 2
    }),
  )
  return {
    observed,
    byChance,
    kappa: byChance === 1 ? null : (observed - byChance) / (1 - byChance),
  }
}
