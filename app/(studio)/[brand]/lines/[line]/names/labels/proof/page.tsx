import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { LabelPrintButton } from '@/components/names/label-print-button'
import { LabelProof } from '@/components/names/label-proof'
import {
  FIBRE_CAUTION,
  lockInWords,
  namesInWords,
  settingInWords,
} from '@/components/names/label-words'
import { namesHref } from '@/components/names/names-place'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { EmptyState } from '@/components/ui/states'
import { MARKS_CAUTION } from '@/lib/names/constants'
import { readLabels } from '@/lib/names/list-labels'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'Proof sheet' }

export default async function ProofPage({
  params,
}: PageProps<'/[brand]/lines/[line]/names/labels/proof'>) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const { line, settings, fibre, labels, unnamed, lockedSince } = await readForPage(
    brand,
    (actor) => readLabels(actor, lineSlug),
  )
  const back = { href: namesHref(place, '/labels'), label: 'Labels' }
  if (labels.length === 0)
    return (
      <Sheet>
        <SheetHeader title="Proof sheet" back={back} />
        <EmptyState
          title="Nothing to proof yet"
          action={<LinkButton href={namesHref(place, '/review')}>Open the review</LinkButton>}
        >
          <p>Once a name is approved, its label will stand here at its true size, to print.</p>
        </EmptyState>
      </Sheet>
    )
  const misfits = labels.filter(({ set }) => !set.fits).length
  return (
    <Sheet>
      <SheetHeader
        title={`Proof sheet of ${line.name}`}
        meta={`${namesInWords(labels.length)} · ${settingInWords(settings.label)} · ${lockInWords(settings, lockedSince)}`}
        actions={<LabelPrintButton />}
        back={back}
      />
      <div className="mb-6 space-y-3">
        {misfits > 0 ? (
          <Notice kind="warning">
            <p>
              {namesInWords(misfits)} {misfits === 1 ? 'does' : 'do'} not fit, and{' '}
              {misfits === 1 ? 'is' : 'are'} marked so.
            </p>
          </Notice>
        ) : null}
        {unnamed.length > 0 ? (
          <Notice>
            <p>
              Without an approved name and so not on this sheet:{' '}
              {unnamed.map(({ number }) => `No. ${number}`).join(', ')}.
            </p>
          </Notice>
        ) : null}
      </div>
      <LabelProof labels={labels} setting={settings.label} fibre={fibre} care={settings.care} />
      <div className="mt-8 max-w-measure space-y-2 text-sm text-ink-soft">
        <p>{FIBRE_CAUTION}</p>
        <p>Of marks: {MARKS_CAUTION}</p>
      </div>
    </Sheet>
  )
}
