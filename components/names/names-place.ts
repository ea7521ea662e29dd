/** Where a line's names stand. */
export interface NamesPlace {
  brand: string
  lineSlug: string
}

/** An address under a line's names. */
export const namesHref = ({ brand, lineSlug }: NamesPlace, under = ''): string =>
  `/${brand}/lines/${lineSlug}/names${under}`
