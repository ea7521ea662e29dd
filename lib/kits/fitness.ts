import type { Licence } from '@/lib/photographs/constants'
import { shadeLabel } from '@/lib/shades/present'
import type { Combination, Photograph } from '@/models'

/**
 * The licences under which a photograph may be shown in what is published. What another licence
 * allows, nobody can tell from its name.
 */
const SHOWN: ReadonlySet<Licence> = new Set<Licence>(['own-work', 'permission', 'cc0', 'cc-by'])

/** Whether a photograph is shown in the pictures of a kit. */
export const isShown = ({ licence }: Pick<Photograph, 'licence'>): boolean =>
  licence !== null && SHOWN.has(licence)

/**
 * Why a combination cannot go into a kit, each a sentence that says what to do; empty when it can.
 * @param combination with its places, their shades (deleted ones too), and its photograph
 */
export function reasonsAgainst({ places = [], photograph }: Combination): string[] {
  const reasons: string[] = []
  const empty = places.filter(({ shadeId }) => shadeId === null).length
  if (empty === places.length) reasons.push('No shade is wound on it yet.')
  else if (empty > 0)
    reasons.push(empty === 1 ? 'One place is still empty.' : `${empty} places are still empty.`)
  const gone = places.flatMap(({ shade }) => (shade?.deletedAt ? [shadeLabel(shade)] : []))
  if (gone.length > 0)
    reasons.push(
      gone.length === 1
        ? `${gone[0]} is not a shade of the line any more.`
        : `${gone.join(' and ')} are not shades of the line any more.`,
    )
  return [...reasons, ...(photograph ? reasonsOfPhotograph(photograph) : [])]
}

function reasonsOfPhotograph(photograph: Photograph): string[] {
  const { title, licence, photographer, altText, derivatives } = photograph
  const missing = [
    licence === null && 'licence',
    photographer.trim() === '' && 'credit',
    altText.trim() === '' && 'alt text',
  ].filter((word) => word !== false)
  const listed = missing.join(', ').replace(/, ([^,]*)$/, ' and $1')
  return [
    ...(missing.length > 0 ? [`Its photograph, ${title}, has no ${listed}.`] : []),
    ...(isShown(photograph) && !derivatives.some(({ format }) => format === 'webp')
      ? [`Its photograph, ${title}, has not been read yet.`]
      : []),
  ]
}
