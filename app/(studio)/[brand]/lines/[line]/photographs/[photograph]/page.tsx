import type { Metadata } from 'next'
import { cache } from 'react'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { MatchSheet } from '@/components/match/match-sheet'
import { PhotographDetails } from '@/components/photographs/photograph-details'
import { PhotographFacts } from '@/components/photographs/photograph-facts'
import { PhotographPicture } from '@/components/photographs/photograph-picture'
import { ReadAgainButton } from '@/components/photographs/read-again-button'
import { ReadingStatus } from '@/components/photographs/reading-status'
import { buttonClass } from '@/components/ui/button-class'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { canKeepCombination } from '@/lib/combinations/policy'
import { presentPhotograph, presentReading } from '@/lib/photographs/present'
import { getPhotograph } from '@/lib/photographs/queries'
import { LICENCE_LABELS } from '@/lib/photographs/constants'
import { readForPage } from '@/lib/server/page'
import { listMatchShades } from '@/lib/shades/queries'

import { keepCombinationAction, rereadPhotographAction, updatePhotographAction } from './actions'

type Props = PageProps<'/[brand]/lines/[line]/photographs/[photograph]'>

const read = cache((brand: string, lineSlug: string, id: string) =>
  readForPage(brand, async (actor) => {
    const found = await getPhotograph(actor, lineSlug, id, { withReading: true })
    return {
      photograph: presentPhotograph(actor, found.line, found.photograph),
      shades: await listMatchShades(actor, found.line.id),
      reading: found.photograph.reading ? presentReading(found.photograph.reading) : null,
      keeps: canKeepCombination(actor),
    }
  }),
)

/** The photograph names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, photograph } = await params
  return { title: (await read(brand, line, photograph)).photograph.title }
}

const FEWEST = 5

export default async function PhotographPage({ params }: Props) {
  const { brand, line: lineSlug, photograph: id } = await params
  const { photograph, shades, reading, keeps } = await read(brand, lineSlug, id)
  const { title, state, licence, photographer, altText, stale, canReread } = photograph
  const head = (
    <>
      <SheetHeader
        title={title}
        back={{ href: `/${brand}/lines/${lineSlug}/photographs`, label: 'Photographs' }}
        meta={[
          licence ? LICENCE_LABELS[licence] : 'No licence said yet',
          photographer,
          altText ? 'alt text written' : 'no alt text yet',
        ]
          .filter(Boolean)
          .join(' · ')}
      />
      {stale && state === 'ready' ? (
        <Notice
          className="mb-6"
          title="The line’s shades have changed"
          actions={
            canReread && (
              <ReadAgainButton
                size="small"
                brand={brand}
                photographId={id}
                reread={rereadPhotographAction}
              />
            )
          }
        >
          This match was made before that. Read the photograph again to match it to the shades of
          now; kept combinations stay as they are.
        </Notice>
      ) : null}
    </>
  )
  const form = (
    <PhotographDetails brand={brand} photograph={photograph} save={updatePhotographAction} />
  )
  const foot = (
    <SheetSection title="About the photograph" className="mt-12 print:hidden">
      {photograph.canEdit && licence && altText ? (
        // Said once, seldom changed: what matters on this page is the match.
        <>
          <PhotographFacts photograph={photograph} />
          <details className="mt-4">
            <summary className={buttonClass('secondary', 'main', 'cursor-pointer')}>
              Change details
            </summary>
            <div className="mt-5">{form}</div>
          </details>
        </>
      ) : (
        form
      )}
    </SheetSection>
  )
  if (state !== 'ready' || !reading) {
    return (
      <Sheet>
        {head}
        <div className="max-w-3xl space-y-6">
          <ReadingStatus
            brand={brand}
            standing={photograph}
            canReread={canReread}
            reread={rereadPhotographAction}
          />
          <PhotographPicture photograph={photograph} sizes="(min-width: 900px) 48rem, 100vw" />
        </div>
        {foot}
      </Sheet>
    )
  }
  if (shades.length < FEWEST) {
    return (
      <Sheet>
        {head}
        <div className="max-w-3xl space-y-6">
          <PhotographPicture
            priority
            photograph={photograph}
            sizes="(min-width: 900px) 48rem, 100vw"
          />
          <Notice
            title={`A match takes five shades; the line has ${shades.length}`}
            actions={
              <LinkButton href={`/${brand}/lines/${lineSlug}/shades`}>Go to the shades</LinkButton>
            }
          >
            Add or import shades, then read the photograph again.
          </Notice>
        </div>
        {foot}
      </Sheet>
    )
  }
  return (
    <MatchSheet
      brand={brand}
      lineSlug={lineSlug}
      photograph={photograph}
      shades={shades.map(({ id: shadeId, number, name, label, lab, hex, inGamut }) => ({
        id: shadeId,
        number,
        name,
        label,
        lab,
        hex,
        inGamut,
      }))}
      matches={reading.matches}
      striking={reading.striking}
      {...(keeps && { keep: keepCombinationAction })}
      head={head}
      foot={foot}
    />
  )
}
