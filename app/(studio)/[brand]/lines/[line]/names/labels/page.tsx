import type { Metadata } from 'next'

import { dayInWords } from '@/components/date-words'
import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { LabelLock } from '@/components/names/label-lock'
import { LabelNames } from '@/components/names/label-names'
import { LabelPreview } from '@/components/names/label-preview'
import { LabelSettingsForm } from '@/components/names/label-settings-form'
import { LabelUnnamed } from '@/components/names/label-unnamed'
import { FIBRE_CAUTION, settingInWords } from '@/components/names/label-words'
import { namesHref } from '@/components/names/names-place'
import { NamesTabs } from '@/components/names/names-tabs'
import { shadesHref } from '@/components/shades/shades-actions'
import { buttonClass } from '@/components/ui/button-class'
import { Facts } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState } from '@/components/ui/states'
import { TextLink } from '@/components/ui/text-link'
import { MARKS_CAUTION, NAME_LIMITS } from '@/lib/names/constants'
import { readLabels } from '@/lib/names/list-labels'
import { pageNumber, pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

import { unlockNameAction } from '../actions'
import {
  freezeNamesAction,
  liftFreezeAction,
  previewLabelsAction,
  saveNamingSettingsAction,
} from './actions'

export const metadata: Metadata = { title: 'Labels' }

export default async function LabelsPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/names/labels'>) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const page = pageNumber((await searchParams).page)
  const { line, settings, fibre, labels, unnamed, lockedSince, preview, reviewers, canRule } =
    await readForPage(brand, (actor) => readLabels(actor, lineSlug))
  const perPage = NAME_LIMITS.page
  const pages = pagesOf({
    page,
    perPage,
    total: labels.length,
    noun: 'names',
    hrefOf: (other) => namesHref(place, `/labels?page=${other}`),
  })
  const shades = labels.length + unnamed.length
  const decide = reviewers.filter(({ role, isReviewer }) => role === 'owner' || isReviewer)
  return (
    <Sheet notes={<LabelNotes />}>
      <SheetHeader
        title="Labels"
        meta={`${labels.length} of ${shades} ${shades === 1 ? 'shade' : 'shades'} of ${line.name} named`}
        actions={
          labels.length > 0 ? (
            <>
              <a
                href={`/api/brands/${brand}/lines/${lineSlug}/labels.csv`}
                download
                className={buttonClass('secondary', 'main')}
              >
                Save as CSV
              </a>
              <LinkButton href={namesHref(place, '/labels/proof')}>Open proof sheet</LinkButton>
            </>
          ) : null
        }
      />
      <NamesTabs place={place} current="label" />
      <SheetSection title="The lock" className="mt-6">
        <LabelLock
          place={place}
          settings={settings}
          lockedSince={lockedSince}
          approved={labels.length}
          unlocked={labels.filter(({ unlocked }) => unlocked).length}
          actions={canRule ? { freeze: freezeNamesAction, lift: liftFreezeAction } : null}
        />
      </SheetSection>
      <SheetSection title="How names are set, dated and decided on">
        {canRule ? (
          <LabelSettingsForm
            place={place}
            settings={settings}
            reviewers={reviewers}
            first={preview}
            fibre={fibre}
            actions={{ save: saveNamingSettingsAction, preview: previewLabelsAction }}
          />
        ) : (
          <>
            <LabelPreview preview={preview} fibre={fibre} care={settings.care} />
            <Facts
              className="mt-6 max-w-measure"
              items={[
                { term: 'Label', reading: settingInWords(settings.label) },
                { term: 'Care', reading: settings.care || 'None yet' },
                {
                  term: 'Print date',
                  reading: settings.printOn ? dayInWords(settings.printOn) : 'None yet',
                },
                { term: 'Theme words', reading: settings.themes.join(', ') || 'None yet' },
                { term: 'Who decides', reading: decide.map(({ name }) => name).join(', ') },
              ]}
            />
            <p className="mt-2 text-sm text-ink-faint">An owner can change these.</p>
          </>
        )}
      </SheetSection>
      <SheetSection title="Names on the labels" aside={String(labels.length)}>
        {labels.length > 0 ? (
          <>
            <LabelNames
              place={place}
              labels={labels.slice((page - 1) * perPage, page * perPage)}
              frozen={settings.frozen}
              unlock={unlockNameAction}
            />
            <Pagination label="Pages of names" {...pages} />
          </>
        ) : (
          <EmptyState
            heading="h3"
            title="No name is approved yet"
            action={
              shades === 0 ? (
                <LinkButton href={shadesHref(place)}>Open the shades</LinkButton>
              ) : (
                <LinkButton href={namesHref(place, '/review')}>Open the review</LinkButton>
              )
            }
          >
            <p>Each approved name will stand here as it is set on its label.</p>
          </EmptyState>
        )}
      </SheetSection>
      {unnamed.length > 0 ? (
        <SheetSection title="Without a name" aside={String(unnamed.length)}>
          <p className="mb-3 max-w-measure text-ink-soft">
            These shades are missing from the proof sheet and the CSV file until a name of theirs is
            approved. <TextLink href={namesHref(place)}>Open the list of names</TextLink>
          </p>
          <LabelUnnamed place={place} unnamed={unnamed} />
        </SheetSection>
      ) : null}
    </Sheet>
  )
}

function LabelNotes() {
  return (
    <>
      <Note title="For the label printer">
        <p>
          The proof sheet prints every label at its true size. The CSV file has the same names,
          letter for letter and as they break, with number, fibre and care; the dye lot is blank.
          Retired shades are left out of both.
        </p>
        <p>
          A name that begins with =, +, - or @ goes into the file after an apostrophe, so that no
          spreadsheet takes it for a sum.
        </p>
      </Note>
      <Note title="Fibre and care">
        <p>{FIBRE_CAUTION}</p>
      </Note>
      <Note title="Before names are printed">
        <p>{MARKS_CAUTION}</p>
      </Note>
    </>
  )
}
