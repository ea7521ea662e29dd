import type { Metadata } from 'next'
import { cache } from 'react'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { NamingBench } from '@/components/names/bench'
import { namesHref } from '@/components/names/names-place'
import { ShadeNeighbours } from '@/components/shades/shade-neighbours'
import { ShadeStatusWord, showReading } from '@/components/shades/shade-words'
import { Facts } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { Status } from '@/components/ui/status'
import { TextLink } from '@/components/ui/text-link'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WoundSample } from '@/components/yarn/wound-sample'
import { presentLine } from '@/lib/lines/present'
import { MARKS_CAUTION } from '@/lib/names/constants'
import { getNamingBench } from '@/lib/names/get-naming-bench'
import { readForPage } from '@/lib/server/page'

import {
  addIdeaAction,
  deleteIdeasAction,
  editIdeaAction,
  putByIdeasAction,
  recallIdeasAction,
  restoreIdeasAction,
  sendForReviewAction,
  takeUpIdeasAction,
} from '../../actions'
import { checkNameAction, proposeNamesAction } from './actions'

type Props = PageProps<'/[brand]/lines/[line]/names/shades/[shade]'>

const read = cache((brand: string, lineSlug: string, shadeId: string) =>
  readForPage(brand, (actor) => getNamingBench(actor, lineSlug, shadeId)),
)

/** The shade names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, shade } = await params
  const { shade: named } = await read(brand, line, shade)
  return { title: `Name for No. ${named.number}` }
}

export default async function NamingBenchPage({ params }: Props) {
  const { brand, line: lineSlug, shade: shadeId } = await params
  const place = { brand, lineSlug }
  const bench = await read(brand, lineSlug, shadeId)
  const { shade, settings, before, after, nextUnnamed } = bench
  const { width, size, lines } = settings.label
  const [L, a, b] = shade.lab
  const benchHref = (id: string) => namesHref(place, `/shades/${id}`)

  return (
    <Sheet
      notes={
        <>
          <Note title="How far the line is">
            <p>
              {bench.named} of {bench.total} shades have an approved name.
            </p>
            {nextUnnamed ? (
              <p>
                <TextLink href={benchHref(nextUnnamed.id)}>
                  Name the next: {nextUnnamed.label}
                </TextLink>
              </p>
            ) : null}
          </Note>
          <Note title="The ball band">
            <Facts
              items={[
                { term: 'Room for the name', reading: `${width} mm` },
                { term: 'Letters', reading: `${size} pt` },
                { term: 'Lines', reading: lines === 1 ? 'one' : 'one or two' },
              ]}
            />
            {settings.frozen ? <Status kind="locked">Approved names are locked</Status> : null}
            <p>
              <TextLink href={namesHref(place, '/labels')}>Labels and print date</TextLink>
            </p>
          </Note>
          <Note title="Marks">
            <p className="text-sm">{MARKS_CAUTION}</p>
          </Note>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        title={shade.label}
        // Whether its lab dip is approved would be taken for its name here.
        meta={
          <span className="flex flex-wrap items-center gap-x-3">
            {shade.name === null ? 'No approved name yet' : `No. ${shade.number}, name approved`}
            {shade.status === 'retired' ? <ShadeStatusWord status="retired" /> : null}
          </span>
        }
        back={{ href: namesHref(place), label: 'Names' }}
        actions={
          <>
            {before ? (
              <LinkButton size="small" href={benchHref(before.id)}>
                Previous: {before.label}
              </LinkButton>
            ) : null}
            {after ? (
              <LinkButton size="small" href={benchHref(after.id)}>
                Next: {after.label}
              </LinkButton>
            ) : null}
          </>
        }
      />
      <Ground className="border border-hairline p-4 sm:p-6">
        <div className="flex flex-wrap items-start gap-x-10 gap-y-6">
          <figure className="max-w-full">
            <WoundSample
              hex={shade.hex}
              size="large"
              label={`${shade.label}, wound on card`}
              className="h-auto max-w-full"
            />
            <figcaption className="mt-1 text-sm text-ink-faint">
              L* {showReading(L)}, a* {showReading(a)}, b* {showReading(b)}
            </figcaption>
          </figure>
          <section className="min-w-56 grow basis-64" aria-label="Nearest in the line">
            <h2 className="text-lg">Nearest in the line</h2>
            <ShadeNeighbours
              place={place}
              shade={shade}
              neighbours={bench.neighbours}
              hrefOf={benchHref}
            />
          </section>
        </div>
      </Ground>
      <GroundSwitch className="mt-3" />
      <NamingBench
        // Another shade is another bench: nothing typed goes along.
        key={shade.id}
        place={place}
        shadeId={shade.id}
        ideas={bench.ideas}
        themes={settings.themes}
        label={{
          setting: settings.label,
          number: shade.number,
          fibre: presentLine(bench.line).fibreContent,
          care: settings.care,
        }}
        actions={{
          check: checkNameAction,
          propose: proposeNamesAction,
          add: addIdeaAction,
          edit: editIdeaAction,
          send: sendForReviewAction,
          recall: recallIdeasAction,
          putBy: putByIdeasAction,
          takeUp: takeUpIdeasAction,
          remove: deleteIdeasAction,
          restore: restoreIdeasAction,
        }}
      />
    </Sheet>
  )
}
