/** The formats a photograph may come in, by the MIME type of what the file is. */
export const PHOTOGRAPH_FORMATS = {
  'image/jpeg': 'JPEG',
  'image/png': 'PNG',
  'image/webp': 'WebP',
  'image/avif': 'AVIF',
  'image/tiff': 'TIFF',
  'image/gif': 'GIF',
} as const
/** A MIME type of {@link PHOTOGRAPH_FORMATS}. */
export type PhotographMime = keyof typeof PHOTOGRAPH_FORMATS
/** The name of a format, for people. */
export type PhotographFormat = (typeof PHOTOGRAPH_FORMATS)[PhotographMime]

/** What is taken on upload. A GIF can be read (its first frame) but is no photograph to keep. */
export const UPLOAD_MIMES = [
  'image/jpeg',
  'image/png',
  'image/webp',
  'image/avif',
  'image/tiff',
] as const satisfies readonly PhotographMime[]
/** The formats taken, as said to people. */
export const FORMATS_TAKEN = 'JPEG, PNG, WebP, AVIF or TIFF'

/**
 * An ending, anywhere in a file's name, of what a browser or a computer opens as something that
 * runs: no photograph needs one.
 */
export const ACTIVE_ENDING =
  /\.(?:x?html?|xht|mht(?:ml)?|svgz?|xml|xsl|[mc]?js|php\d?|phtml|phar|aspx?|jspx?|cgi|sh|exe|dll|msi|bat|cmd|scr|ps1|vbs|jar|hta|swf|pdf)(?=[.\s]|$)/i

/** Largest file: 40 MB. */
export const MAX_BYTES = 40 * 1000 * 1000
/** Largest picture: 120 megapixels. */
export const MAX_PIXELS = 120e6
/** Longest side, in pixels, that a photograph is read at. */
export const READING_SIDE = 320
