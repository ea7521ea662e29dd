import { countRecoveryCodes } from '@/lib/auth/second-factor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { Person } from '@/models'

/** How somebody's second factor stands. */
export interface SecondFactorStanding {
  inUse: boolean
  /** One was begun and waits for a code, perhaps to take the other's place. */
  begun: boolean
  /** Recovery codes not used yet. */
  codesLeft: number
  /** The brands of theirs that ask for one, with their address. */
  requiredBy: { name: string; href: string }[]
  /** Their brands that do not ask for one. */
  otherBrands: { name: string; href: string }[]
  /** Those of their brands where they decide whether it is asked for. */
  decidesIn: { name: string; href: string }[]
}

/** The signed-in person's second factor, without its secret. */
export async function getSecondFactor(person: SignedInPerson): Promise<SecondFactorStanding> {
  const row = await Person.findByPk(person.id, {
    attributes: ['totpConfirmedAt', 'totpPending'],
    rejectOnEmpty: true,
  })
  const brands = person.memberships.map(({ brandName, brandSlug, ...rest }) => ({
    ...rest,
    name: brandName,
    href: `/${brandSlug}`,
  }))
  const places = (chosen: typeof brands, page = '') =>
    chosen.map(({ name, href }) => ({ name, href: href + page }))
  return {
    inUse: row.totpConfirmedAt !== null,
    begun: row.totpPending !== null,
    codesLeft: await countRecoveryCodes(person.id),
    requiredBy: places(brands.filter((one) => one.secondFactorRequired)),
    otherBrands: places(brands.filter((one) => !one.secondFactorRequired)),
    decidesIn: places(
      brands.filter(({ role }) => role === 'owner'),
      '/security',
    ),
  }
}
