import { screenColor } from '@/lib/color/gamut'
import type {
  ExportCombination,
  ExportDescription,
  ExportPhotograph,
} from '@/lib/exports/description'
import type { Licence } from '@/lib/photographs/constants'
import { derivativeKey } from '@/lib/photographs/keys'
import { shadeLabel } from '@/lib/shades/present'
import { getObject } from '@/lib/storage/objects'
import type { Combination, Line, Photograph } from '@/models'

import { isShown } from './fitness'

/** The line, the brand's name, and combinations that {@link reasonsAgainst} has nothing against. */
export async function describeKit(
  brandName: string,
  line: Line,
  combinations: readonly Combination[],
): Promise<ExportDescription> {
  const changed = combinations.flatMap(({ updatedAt, photograph, places = [] }) => [
    updatedAt,
    ...(photograph ? [photograph.updatedAt] : []),
    ...places.flatMap(({ shade }) => (shade ? [shade.updatedAt] : [])),
  ])
  const described: ExportCombination[] = []
  for (const combination of combinations) described.push(await describe(combination))
  return {
    brand: brandName,
    line: line.name,
    combinations: described,
    asOf: new Date(Math.max(line.createdAt.getTime(), ...changed.map((at) => at.getTime()))),
  }
}

async function describe(combination: Combination): Promise<ExportCombination> {
  const { id, title, story, places = [], photograph } = combination
  return {
    id,
    title,
    story,
    shades: places.flatMap(({ shade, share, role }) => {
      if (!shade) return []
      const lab = [shade.labL, shade.labA, shade.labB] as const
      return {
        label: shadeLabel(shade),
        number: shade.number,
        lab,
        illuminant: shade.illuminant,
        observer: shade.observer,
        hex: screenColor(lab).hex,
        share,
        role,
      }
    }),
    photograph: photograph ? await describePhotograph(photograph) : null,
  }
}

async function describePhotograph(photograph: Photograph): Promise<ExportPhotograph> {
  const { title, photographer, licence, licenceUrl, sourceUrl, altText } = photograph
  return {
    title,
    credit: photographer,
    licence: licence ? LICENCE_WORDS[licence as Licence] : '',
    licenceUrl,
    sourceUrl,
    alt: altText,
    bytes: isShown(photograph) ? await getWidest(photograph) : null,
  }
}

/** Our own widest copy: upright, in sRGB, without the notes of a camera. */
async function getWidest(photograph: Photograph): Promise<Buffer> {
  const copies = photograph.derivatives.filter(({ format }) => format === 'webp')
  const widest = copies.reduce((best, copy) => (copy.width > best.width ? copy : best))
  const bytes = await getObject(derivativeKey(photograph, widest))
  if (!bytes) throw new MissingPhotographError(photograph.title)
  return bytes
}

/** A photograph's copy is gone from the store: reading it again makes it anew. */
export class MissingPhotographError extends Error {
  constructor(readonly photographTitle: string) {
    super('The copy of a photograph is gone from the store.')
  }
}

/** The licences as they are printed beside a name. */
const LICENCE_WORDS: Record<Licence, string> = {
  'own-work': 'the brand’s own work',
  permission: 'with permission',
  cc0: 'CC0',
  'cc-by': 'CC BY',
  other: 'another licence',
}
