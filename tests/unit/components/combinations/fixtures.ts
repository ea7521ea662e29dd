import { draftOf, type CombinationDraft } from '@/components/combinations/draft'
import { PLACE_ROLES } from '@/lib/combinations/constants'

/** A draft called "Hillside" with five even shares and these shades, top to bottom. */
export const draftWith = (...shadeIds: (string | null)[]): CombinationDraft =>
  draftOf({
    title: 'Hillside',
    story: '',
    photographId: null,
    places: PLACE_ROLES.map((role, at) => ({
      role,
      share: 0.2,
      locked: false,
      shade: shadeIds[at] ? { id: shadeIds[at] } : null,
    })),
  })

/** Its shades, top to bottom. */
export const shadeIdsOf = ({ places }: CombinationDraft) => places.map(({ shadeId }) => shadeId)
