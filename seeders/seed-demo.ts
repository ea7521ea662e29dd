import type { Transaction } from 'sequelize'

import { hashPassword } from '@/lib/auth/password'
import { hexToLab } from '@/lib/color/srgb'
import { placeNewShades } from '@/lib/families/place-new-shades'
import { Brand, inTransaction, Line, Membership, Person, Shade } from '@/models'

import { demoAccounts } from './demo/accounts'
import { demoBrands } from './demo/brands'
import type { DemoBrand, DemoLine, DemoShade } from './demo/types'
import { seedNames } from './seed-names'
import { seedPhotographs } from './seed-photographs'

/**
 * Puts the demo's brands, people, lines, names, photographs and combinations in place, once: a database
 * that has a brand of the demo is left as it is.
 * @returns what was done, in words
 */
export async function seedDemo(): Promise<string> {
  const slugs = demoBrands.map(({ slug }) => slug)
  if (await Brand.findOne({ where: { slug: slugs } })) return 'The demo is there already.'
  const people = await Promise.all(
    demoAccounts.map(async (account) => ({
      account,
      passwordHash: await hashPassword(account.password),
    })),
  )
  await inTransaction(async (transaction) => {
    for (const demo of demoBrands) {
      const brand = await Brand.create({ name: demo.name, slug: demo.slug }, { transaction })
      for (const { account, passwordHash } of people) {
        if (account.brand !== demo.slug) continue
        const { name, email, role } = account
        const person = await Person.create({ name, email, passwordHash }, { transaction })
        await Membership.create({ brandId: brand.id, personId: person.id, role }, { transaction })
      }
      await seedLines(brand, demo, transaction)
    }
    await seedPhotographs(transaction)
  })
  return 'The demo is in place.'
}

async function seedLines(brand: Brand, demo: DemoBrand, transaction: Transaction): Promise<void> {
  for (const { shades, ...line } of demo.lines) {
    const made = await Line.create({ ...lineColumns(line), brandId: brand.id }, { transaction })
    await Shade.bulkCreate(
      shades.map((shade) => ({ ...shadeColumns(shade), brandId: brand.id, lineId: made.id })),
      { transaction },
    )
    await placeNewShades(made, transaction)
    await seedNames(made, transaction)
  }
}

function lineColumns({
  fibers,
  yarnWeight,
  grams,
  meters,
  gauge,
  ...rest
}: Omit<DemoLine, 'shades'>) {
  return {
    ...rest,
    fibres: fibers.map(({ fiber, percent }) => ({ fibre: fiber, percent })),
    weightNumber: yarnWeight,
    netGrams: grams,
    length: meters,
    lengthUnit: 'm' as const,
    gaugeStitches: gauge.stitches,
    gaugeRows: gauge.rows,
  }
}

function shadeColumns({ lab, hex, order, ...rest }: DemoShade) {
  const [labL, labA, labB] = lab ? [lab.L, lab.a, lab.b] : hexToLab(hex!)
  return {
    ...rest,
    labL,
    labA,
    labB,
    hex,
    illuminant: 'D65' as const,
    observer: lab ? (10 as const) : (2 as const),
    position: order - 1,
  }
}
