import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'

import { Op, type Transaction } from 'sequelize'

import { isMatch, matchPhotograph } from '@/lib/color/match'
import { readPhotographColors, type PhotographCell } from '@/lib/color/photograph-colors'
import { enqueue } from '@/lib/jobs/queue'
import { decodePhotograph } from '@/lib/photographs/decode'
import type { Role } from '@/lib/people/constants'
import { originalKey } from '@/lib/photographs/keys'
import { putObject } from '@/lib/storage/objects'
import { PLACE_ROLES } from '@/lib/combinations/constants'
import { topRank } from '@/lib/combinations/lane-rank'
import { Brand, Combination, CombinationPlace, Line, Membership, Photograph, Shade } from '@/models'

import { demoCombinations } from './demo/combinations'
import { demoPhotographs } from './demo/photographs'
import type { DemoPhotograph } from './demo/types'

const BRAND = 'teasel-and-tarn'
const LINE = 'heronsway-dk'

/** Adds the demo's photographs as if they had been uploaded, and keeps its combinations. */
export async function seedPhotographs(transaction: Transaction): Promise<void> {
  const brand = await Brand.findOne({ where: { slug: BRAND }, rejectOnEmpty: true, transaction })
  const brandId = brand.id
  const line = await Line.findOne({
    where: { brandId, slug: LINE },
    rejectOnEmpty: true,
    transaction,
  })
  const members = await Membership.findAll({ where: { brandId }, transaction })
  const personOf = (by: Role) => members.find(({ role }) => role === by)!.personId
  const shades = await Shade.findAll({
    where: { brandId, lineId: line.id, status: { [Op.ne]: 'retired' } },
    order: [['position', 'ASC']],
    transaction,
  })
  const shadesToMatch = shades.map(({ id, labL, labA, labB }) => ({
    id,
    lab: [labL, labA, labB] as const,
  }))

  for (const demo of demoPhotographs) {
    const { photograph, cells } = await seedPhotograph(
      demo,
      line,
      personOf('designer'),
      transaction,
    )
    for (const { title, reading, lane, by } of demoCombinations.filter(
      (one) => one.photograph === demo.slug,
    )) {
      const match = matchPhotograph({ cells }, shadesToMatch, reading)
      if (!isMatch(match)) throw new Error(`${title}: ${match.unavailable}`)
      const { id } = await Combination.create(
        {
          brandId,
          lineId: line.id,
          title,
          reading,
          photographId: photograph.id,
          createdById: personOf(by),
          lane,
          rank: await topRank({ brandId, lineId: line.id, lane }, transaction),
        },
        { transaction },
      )
      await CombinationPlace.bulkCreate(
        match.places.map(({ shadeId, share }, at) => ({
          brandId,
          combinationId: id,
          place: at + 1,
          shadeId,
          share,
          role: PLACE_ROLES[at]!,
        })),
        { transaction },
      )
    }
  }
}

async function seedPhotograph(
  { file, slug: _slug, ...words }: DemoPhotograph,
  { id: lineId, brandId }: Line,
  uploadedById: string,
  transaction: Transaction,
): Promise<{ photograph: Photograph; cells: PhotographCell[] }> {
  const bytes = await readFile(new URL(`demo/photographs/${file}`, import.meta.url))
  const photograph = Photograph.build({
    ...words,
    brandId,
    lineId,
    uploadedById,
    fileName: file,
    objectKey: '',
    contentType: 'image/jpeg',
    byteLength: bytes.length,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    state: 'waiting',
  })
  photograph.objectKey = originalKey(photograph)
  await putObject(photograph.objectKey, bytes, photograph.contentType)
  await photograph.save({ transaction })
  await enqueue('read-photograph', { photographId: photograph.id }, transaction)
  const { image } = await decodePhotograph(bytes)
  return { photograph, cells: readPhotographColors(image).cells }
}
