/** Where kits are kept; they leave the house by a short-lived link only. */
export const KITS = 'kits/'

/** The key of a kit's zip; building it again replaces it. */
export const kitKey = ({ id, brandId }: { id: string; brandId: string }): string =>
  `${KITS}${brandId}/${id}.zip`

/** The kit a key belongs to, or null for a key that is none of ours. */
export const kitOfKey = (key: string): string | null =>
  /^kits\/[0-9a-f-]{36}\/([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})\.zip$/.exec(key)?.[1] ?? null
