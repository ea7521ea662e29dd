import type { Metadata } from 'next'
import { cache } from 'react'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { DeleteShadeButton } from '@/components/shades/delete-shade-button'
import { ShadeForm } from '@/components/shades/shade-form'
import { ShadeNameLink } from '@/components/shades/shade-name-link'
import { ShadeNeighbours } from '@/components/shades/shade-neighbours'
import {
  BeyondScreen,
  ShadeName,
  ShadeStatusWord,
  showReading,
  showTerms,
} from '@/components/shades/shade-words'
import { shadesHref } from '@/components/shades/shades-actions'
import { Facts } from '@/components/ui/ledger'
import { TextLink } from '@/components/ui/text-link'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WoundSample } from '@/components/yarn/wound-sample'
import { canReadNames } from '@/lib/names/policy'
import { readForPage } from '@/lib/server/page'
import { canEditShades } from '@/lib/shades/policy'
import { getShade } from '@/lib/shades/queries'

import { deleteShadesAction, restoreShadesAction, updateShadeAction } from '../actions'

type Props = PageProps<'/[brand]/lines/[line]/shades/[shade]'>

const read = cache((brand: string, lineSlug: string, shadeId: string) =>
  readForPage(brand, async (actor) => ({
    ...(await getShade(actor, lineSlug, shadeId)),
    edits: canEditShades(actor),
    seesIdeas: canReadNames(actor),
  })),
)

/** The shade names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, shade } = await params
  return { title: (await read(brand, line, shade)).shade.label }
}

export default async function ShadePage({ params }: Props) {
  const { brand, line: lineSlug, shade: shadeId } = await params
  const place = { brand, lineSlug }
  const { edits, seesIdeas, shade, neighbours, uses } = await read(brand, lineSlug, shadeId)
  const [L, a, b] = shade.lab
  const more = uses ? uses.total - uses.combinations.length : 0

  return (
    <Sheet
      notes={
        <>
          <Note title="Nearest in the line">
            <ShadeNeighbours place={place} shade={shade} neighbours={neighbours} />
          </Note>
          {uses ? (
            <Note title="Where it is used">
              {uses.total === 0 ? <p>In no kept combination yet.</p> : null}
              <ul role="list" className="space-y-1">
                {uses.combinations.map(({ combinationId, title }) => (
                  <li key={combinationId}>
                    <TextLink href={`/${brand}/lines/${lineSlug}/combinations/${combinationId}`}>
                      {title}
                    </TextLink>
                  </li>
                ))}
              </ul>
              {more > 0 ? <p>and {more} more.</p> : null}
            </Note>
          ) : null}
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        title={shade.label}
        meta={<ShadeStatusWord status={shade.status} />}
        back={{ href: shadesHref(place), label: 'Shades' }}
      />
      <div className="flex flex-wrap items-start gap-x-10 gap-y-6">
        <div className="max-w-full">
          <Ground>
            <WoundSample
              hex={shade.hex}
              size="large"
              label={`${shade.label}, wound on card`}
              className="h-auto max-w-full"
            />
          </Ground>
          <GroundSwitch className="mt-3" />
        </div>
        <Facts
          className="max-w-80 min-w-56 grow"
          items={[
            { term: 'Number', reading: shade.number },
            {
              term: 'Name',
              reading: seesIdeas ? (
                <ShadeNameLink place={place} shade={shade} />
              ) : (
                <ShadeName shade={shade} />
              ),
            },
            { term: 'L*', reading: showReading(L) },
            { term: 'a*', reading: showReading(a) },
            { term: 'b*', reading: showReading(b) },
            { term: 'Read under', reading: showTerms(shade) },
            {
              term: 'On a screen',
              reading: shade.inGamut ? (
                shade.hex
              ) : (
                <>
                  about {shade.hex}
                  <BeyondScreen className="mt-0.5 justify-end" />
                </>
              ),
            },
            { term: 'Place in the line', reading: shade.position + 1 },
          ]}
        />
      </div>
      {edits ? (
        <SheetSection title="Edit shade" className="mt-10 print:hidden">
          <ShadeForm place={place} shade={shade} save={updateShadeAction} />
          <div className="mt-10 border-t border-hairline pt-6">
            <DeleteShadeButton
              place={place}
              shadeId={shade.id}
              actions={{ remove: deleteShadesAction, restore: restoreShadesAction }}
            />
          </div>
        </SheetSection>
      ) : null}
    </Sheet>
  )
}
