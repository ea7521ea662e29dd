import { PhotographError } from './decode'

/**
 * The beginnings of a page, a drawing or a script, as no camera writes them. Each is long enough
 * that compressed pixels do not come to it by chance.
 */
const MARKUP = /<(?:script|html|iframe)[\s>/]|<!doctype\s|<svg\s[^>]{0,400}xmlns|<\?php\s/i

/** Bytes looked at in one go, and how far the next look reaches back. */
const STEP = 1024 * 1024
const OVERLAP = 512

/**
 * Refuses a picture that is a page or a script besides, in its notes or behind its end: whoever
 * opened the original as what it also is would run it.
 * @throws PhotographError
 */
export function refuseHiddenMarkup(bytes: Buffer): void {
  for (let at = 0; at < bytes.length; at += STEP) {
    if (MARKUP.test(bytes.toString('latin1', Math.max(0, at - OVERLAP), at + STEP))) {
      throw new PhotographError(
        'hidden',
        'There is a page or a script hidden in this file. Export the picture anew and add that.',
      )
    }
  }
}
