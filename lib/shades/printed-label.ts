import type { Shade } from '@/models'

/**
 * What a shade is called in what goes out of the house. Names are not reviewed yet, so it is the
 * number; a name that nobody approved is not printed.
 */
export const printedLabel = ({ number }: Pick<Shade, 'number' | 'name'>): string => `No. ${number}`
