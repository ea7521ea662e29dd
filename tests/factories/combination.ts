import { PLACE_ROLES } from '@/lib/combinations/constants'
import { topRank } from '@/lib/combinations/lane-rank'
import { Combination, CombinationPlace, type Line, type Shade } from '@/models'

/** A combination of the first five of these shades, in equal shares; of fewer, the rest is empty. */
export async function makeCombination(
  { brandId, id: lineId }: Pick<Line, 'brandId' | 'id'>,
  shades: readonly Shade[],
  values: Partial<Pick<Combination, 'title' | 'photographId' | 'createdById' | 'lane'>> = {},
): Promise<Combination> {
  const lane = values.lane ?? 'sketched'
  const combination = await Combination.create({
    brandId,
    lineId,
    rank: await topRank({ brandId, lineId, lane }),
    title: 'A combination',
    createdById: null,
    ...values,
  })
  await CombinationPlace.bulkCreate(
    PLACE_ROLES.map((role, at) => ({
      brandId,
      combinationId: combination.id,
      place: at + 1,
      role,
      shadeId: shades[at]?.id ?? null,
      share: 0.2,
    })),
  )
  return combination
}
