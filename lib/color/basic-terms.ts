/** A colour term of everyday language, as far as it reaches in OKLCH. */
export interface BasicTerm {
  /** Hue in degrees: 5 % quantile, mean, 95 % quantile, counted on past 360. */
  hue: readonly [number, number, number]
  /** Lightness 0–1: 5 % quantile, median, 95 % quantile. */
  lightness: readonly [number, number, number]
  /** Chroma: 5 % quantile, median, 95 % quantile. */
  chroma: readonly [number, number, number]
}

/**
 * The chromatic terms and what people call by them. Quantiles are the wider of two sources, means
 * and medians lie half-way between them. A name counts for a term when its last word is that term.
 * @source the xkcd colour survey (949 names, CC0) and the ISCC–NBS centroids (267 names, National
 * Bureau of Standards Circular 553), both taken to OKLCH
 */
export const BASIC_TERMS = {
  pink: {
    hue: [333.7, 367.95, 381.1],
    lightness: [0.586, 0.74, 0.895],
    chroma: [0.022, 0.117, 0.268],
  },
  red: {
    hue: [2.2, 21.3, 33.8],
    lightness: [0.263, 0.475, 0.644],
    chroma: [0.03, 0.135, 0.256],
  },
  brown: {
    hue: [36.8, 69.15, 95.4],
    lightness: [0.244, 0.4925, 0.74],
    chroma: [0.025, 0.076, 0.131],
  },
  orange: {
    hue: [39.4, 53, 64.3],
    lightness: [0.566, 0.702, 0.81],
    chroma: [0.108, 0.1555, 0.215],
  },
  yellow: {
    hue: [90, 99.4, 118.9],
    lightness: [0.656, 0.843, 0.973],
    chroma: [0.068, 0.1415, 0.215],
  },
  green: {
    hue: [117.5, 145.7, 170.6],
    lightness: [0.282, 0.577, 0.922],
    chroma: [0.02, 0.1115, 0.282],
  },
  blue: {
    hue: [193.2, 250.1, 274.9],
    lightness: [0.215, 0.529, 0.964],
    chroma: [0.023, 0.0895, 0.284],
  },
  purple: {
    hue: [303.5, 318.8, 339],
    lightness: [0.234, 0.5385, 0.832],
    chroma: [0.028, 0.1055, 0.298],
  },
} as const satisfies Record<string, BasicTerm>
/** One of BASIC_TERMS. */
export type BasicTermName = keyof typeof BASIC_TERMS
