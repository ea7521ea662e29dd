import type { ExportCombination } from './description'

const LONGEST = 48

/** A text as a part of a file name: small letters of ASCII, digits, hyphens; may be empty. */
export const slugOf = (text: string): string =>
  text
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, LONGEST)
    .replace(/^-+|-+$/g, '')

/** A name for each combination's files, by its id; no two alike, none beginning with a digit. */
export function fileNames(
  combinations: readonly Pick<ExportCombination, 'id' | 'title'>[],
): Map<string, string> {
  const names = new Map<string, string>()
  const taken = new Set<string>()
  for (const { id, title } of combinations) {
    const slug = slugOf(title)
    const base = /^[a-z]/.test(slug) ? slug : slug ? `combination-${slug}` : 'combination'
    let name = base
    for (let copy = 2; taken.has(name); copy++) name = `${base}-${copy}`
    taken.add(name)
    names.set(id, name)
  }
  return names
}

/** Where a combination's picture lies in the kit. */
export const pictureName = (name: string, { width, height }: { width: number; height: number }) =>
  `${name}/${name}-${width}x${height}.png`
