import { PHOTOGRAPH_LIMITS } from './constants'

/**
 * A first title from a file's name: "heather_before-dark.JPG" → "Heather before dark". A camera's
 * number stays as it is, since it is all there is to find the picture by.
 */
export function draftTitle(fileName: string): string {
  const words = fileName
    .normalize('NFC')
    .replace(/^.*[\\/]/, '')
    .replace(/\.[^.]{1,5}$/, '')
    .replace(/[\p{Cc}\p{Cf}]/gu, '')
    .replace(/[_\s]+|(?<=\p{L})-(?=\p{L})/gu, ' ')
    .trim()
  const title = words.charAt(0).toLocaleUpperCase('en-GB') + words.slice(1)
  // Half a character may be left at the cut.
  const cut = title.slice(0, PHOTOGRAPH_LIMITS.title).replace(/[\ud800-\udbff]$/, '')
  return cut.trim() || 'Untitled photograph'
}
