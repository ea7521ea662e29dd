import { Combination, CombinationPlace, type Line, type Shade } from '@/models'

/** A kept combination of the first five of these shades, in equal shares. */
export async function makeCombination(
  { brandId, id: lineId }: Pick<Line, 'brandId' | 'id'>,
  shades: readonly Shade[],
  values: Partial<Pick<Combination, 'title' | 'photographId' | 'createdById'>> = {},
): Promise<Combination> {
  const combination = await Combination.create({
    brandId,
    lineId,
    title: 'A combination',
    createdById: null,
    ...values,
  })
  await CombinationPlace.bulkCreate(
    shades.slice(0, 5).map((shade, at) => ({
      brandId,
      combinationId: combination.id,
      place: at + 1,
      shadeId: shade.id,
      share: 0.2,
    })),
  )
  return combination
}
