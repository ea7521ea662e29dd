/** Joins class names, leaving out what is not set. Later classes do not undo earlier ones. */
export function cn(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ')
}
