import type { Derivative } from './constants'

/** Where originals are kept; nothing under it is ever served. */
export const ORIGINALS = 'originals/'
/** Where the copies for the screen are kept. */
export const DERIVATIVES = 'derivatives/'

interface Owned {
  id: string
  brandId: string
}

/** The key of a photograph's original. */
export const originalKey = ({ id, brandId }: Owned): string => `${ORIGINALS}${brandId}/${id}`

/** The file name of a copy; it names the content, so that browsers may keep it for good. */
export const derivativeName = (
  { sha256 }: { sha256: string },
  { width, format }: Pick<Derivative, 'width' | 'format'>,
): string => `${sha256.slice(0, 12)}-${width}.${format}`

/** The key of a photograph's copy. */
export const derivativeKey = (
  photograph: Owned & { sha256: string },
  derivative: Pick<Derivative, 'width' | 'format'>,
): string =>
  `${DERIVATIVES}${photograph.brandId}/${photograph.id}/${derivativeName(photograph, derivative)}`

/** The keys of everything the object store holds of a confirmed photograph. */
export const objectKeysOf = (
  photograph: Owned & {
    sha256: string
    objectKey: string
    derivatives: readonly Pick<Derivative, 'width' | 'format'>[]
  },
): string[] => [
  photograph.objectKey,
  ...photograph.derivatives.map((copy) => derivativeKey(photograph, copy)),
]

/** The photograph a key belongs to, or null for a key that is none of ours. */
export const photographOfKey = (key: string): string | null =>
  /^(?:originals|derivatives)\/[0-9a-f-]{36}\/([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})(?:\/|$)/.exec(
    key,
  )?.[1] ?? null
