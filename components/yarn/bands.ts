/** One yarn of a combination. */
export interface Band {
  hex: string
  /** Its part of the whole; the parts need not sum to 1. */
  share: number
  name: string
}

/**
 * Shares out a whole number of threads or rows among the bands in the order given, each at least
 * `least`, by largest remainder. Throws RangeError when there are more bands than fit.
 */
export function shareOut(
  bands: readonly Pick<Band, 'share'>[],
  total: number,
  least: number,
): number[] {
  const free = total - least * bands.length
  if (free < 0) throw new RangeError(`${bands.length} bands of ${least} do not fit ${total}.`)
  const weights = bands.map((band) => Math.max(0, band.share) || 0)
  const whole = weights.reduce((sum, weight) => sum + weight, 0)
  const even = whole === 0
  // What a band is owed beyond the least it gets, so that large shares stay true to each other.
  const owed = weights.map((weight) =>
    Math.max(0, (even ? 1 / bands.length : weight / whole) * total - least),
  )
  const owedSum = owed.reduce((sum, value) => sum + value, 0) || 1
  const exact = owed.map((value) => (value / owedSum) * free)
  const counts = exact.map(Math.floor)
  const left = free - counts.reduce((sum, value) => sum + value, 0)
  exact
    .map((value, index) => ({ index, rest: value - Math.floor(value) }))
    .sort((a, b) => b.rest - a.rest || a.index - b.index)
    .slice(0, left)
    .forEach(({ index }) => (counts[index] = (counts[index] ?? 0) + 1))
  return counts.map((count) => count + least)
}

/** The bands in words: "Curlew at Dusk 16 %, Fell Asleep 31 %". */
export function bandsInWords(bands: readonly Omit<Band, 'hex'>[]): string {
  const whole = bands.reduce((sum, band) => sum + Math.max(0, band.share), 0) || 1
  return bands
    .map((band) => `${band.name} ${Math.round((100 * Math.max(0, band.share)) / whole)} %`)
    .join(', ')
}
