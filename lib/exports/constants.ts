/** The pictures made of a combination, in pixels: a post, a square, and the preview of a link. */
export const PICTURE_SIZES = [
  { width: 1200, height: 1500 },
  { width: 1080, height: 1080 },
  { width: 1200, height: 630 },
] as const
/** One of PICTURE_SIZES. */
export type PictureSize = (typeof PICTURE_SIZES)[number]
