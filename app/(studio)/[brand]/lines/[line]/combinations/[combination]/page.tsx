import type { Metadata } from 'next'
import { cache } from 'react'

import { CombinationTitle } from '@/components/combinations/combination-title'
import { DeleteCombination } from '@/components/combinations/delete-combination'
import { FivePlaces } from '@/components/combinations/five-places'
import { bandsOf, keptInWords } from '@/components/combinations/words'
import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { READING_LABELS } from '@/components/match/types'
import { PhotographPicture } from '@/components/photographs/photograph-picture'
import { TextLink } from '@/components/ui/text-link'
import { Fabric } from '@/components/yarn/fabric'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WrapCard } from '@/components/yarn/wrap-card'
import { presentCombination } from '@/lib/combinations/present'
import { getCombination } from '@/lib/combinations/queries'
import { getLine } from '@/lib/lines/queries'
import { presentPhotograph } from '@/lib/photographs/present'
import { readForPage } from '@/lib/server/page'

import {
  deleteCombinationAction,
  renameCombinationAction,
  reorderCombinationAction,
  restoreCombinationAction,
} from '../actions'

type Props = PageProps<'/[brand]/lines/[line]/combinations/[combination]'>

const read = cache((brand: string, lineSlug: string, id: string) =>
  readForPage(brand, async (actor) => {
    const kept = await getCombination(actor, lineSlug, id)
    const row = kept.combination.photograph
    return {
      combination: presentCombination(actor, kept),
      photograph: row && presentPhotograph(actor, await getLine(actor, lineSlug), row),
    }
  }),
)

/** The combination names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, combination } = await params
  return { title: (await read(brand, line, combination)).combination.title }
}

const CLOTHS = [
  { kind: 'stripes', words: 'as stripes' },
  { kind: 'stranded', words: 'stranded, two at a time' },
  { kind: 'rounds', words: 'as crochet rounds' },
] as const

export default async function CombinationPage({ params }: Props) {
  const { brand, line: lineSlug, combination: id } = await params
  const { combination, photograph } = await read(brand, lineSlug, id)
  const list = `/${brand}/lines/${lineSlug}/combinations`
  const bands = bandsOf(combination)
  return (
    <Sheet
      notes={
        <>
          {photograph ? (
            <Note title="From the photograph">
              <PhotographPicture photograph={photograph} sizes="18rem" />
              <p>
                <TextLink href={`/${brand}/lines/${lineSlug}/photographs/${photograph.id}`}>
                  {photograph.title}
                </TextLink>
                {photograph.photographer ? `, by ${photograph.photographer}` : ''}
                {combination.reading
                  ? ` (${READING_LABELS[combination.reading].toLowerCase()})`
                  : ''}
              </p>
            </Note>
          ) : (
            <Note title="Its photograph is gone">
              <p>It was deleted since; the five stay as they were kept.</p>
            </Note>
          )}
          <Note title="On screen only">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        back={{ href: list, label: 'Combinations' }}
        title={
          combination.canRename ? (
            <CombinationTitle
              brand={brand}
              combination={combination}
              rename={renameCombinationAction}
            />
          ) : (
            combination.title
          )
        }
        meta={keptInWords(combination)}
        actions={
          combination.canDelete && (
            <DeleteCombination
              brand={brand}
              combination={combination}
              list={list}
              remove={deleteCombinationAction}
              restore={restoreCombinationAction}
            />
          )
        }
      />
      <div className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,auto)_minmax(0,1fr)] print:grid-cols-[75mm_minmax(0,1fr)]">
        <div className="space-y-2">
          <Ground className="flex justify-center border border-hairline p-6 print:border-0 print:p-0">
            <WrapCard
              key={combination.version}
              bands={bands}
              title={combination.title}
              className="w-full max-w-[19rem] print:w-[75mm] print:max-w-none"
            />
          </Ground>
          <GroundSwitch />
        </div>
        <FivePlaces brand={brand} combination={combination} reorder={reorderCombinationAction} />
      </div>
      <SheetSection title="As cloth">
        <Ground className="grid grid-cols-2 gap-6 border border-hairline p-4 sm:grid-cols-3 print:grid-cols-3 print:border-0 print:p-0">
          {CLOTHS.map(({ kind, words }) => (
            <figure key={kind} className="min-w-0">
              <Fabric bands={bands} kind={kind} className="w-full" />
              <figcaption className="mt-1 text-sm">{words}</figcaption>
            </figure>
          ))}
        </Ground>
      </SheetSection>
    </Sheet>
  )
}
