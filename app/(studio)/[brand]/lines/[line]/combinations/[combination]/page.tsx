import type { Metadata } from 'next'
import { cache } from 'react'

import { CombinationEditor } from '@/components/combinations/combination-editor'
import { DeleteCombination } from '@/components/combinations/delete-combination'
import { keptInWords } from '@/components/combinations/words'
import { READING_LABELS } from '@/components/match/types'
import { openCombination } from '@/lib/combinations/open-combination'
import { presentCombination } from '@/lib/combinations/present'
import { presentPhotographChoice } from '@/lib/photographs/present'
import { readForPage } from '@/lib/server/page'

import {
  deleteCombinationAction,
  restoreCombinationAction,
  saveCombinationAction,
} from '../actions'

type Props = PageProps<'/[brand]/lines/[line]/combinations/[combination]'>

const read = cache((brand: string, lineSlug: string, id: string) =>
  readForPage(brand, async (actor) => {
    const { shades, families, photographs, ...kept } = await openCombination(actor, lineSlug, id)
    return {
      personId: actor.personId,
      combination: presentCombination(actor, kept),
      shades,
      families,
      photographs: photographs.map((one) => presentPhotographChoice(actor, one)),
    }
  }),
)

/** The combination names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, combination } = await params
  return { title: (await read(brand, line, combination)).combination.title }
}

export default async function CombinationPage({ params }: Props) {
  const { brand, line: lineSlug, combination: id } = await params
  const { combination, ...choices } = await read(brand, lineSlug, id)
  const { reading } = combination
  return (
    <CombinationEditor
      brand={brand}
      lineSlug={lineSlug}
      combination={combination}
      {...choices}
      save={saveCombinationAction}
      meta={
        <>
          {keptInWords(combination)}
          {reading ? ` · read as “${READING_LABELS[reading].toLowerCase()}”` : ''}
        </>
      }
      actions={
        combination.canDelete && (
          <DeleteCombination
            brand={brand}
            combination={combination}
            list={`/${brand}/lines/${lineSlug}/combinations`}
            remove={deleteCombinationAction}
            restore={restoreCombinationAction}
          />
        )
      }
    />
  )
}
