import { dayInWords } from '@/components/date-words'
import { Note } from '@/components/layout/note'
import { Facts } from '@/components/ui/ledger'
import { TextLink } from '@/components/ui/text-link'
import type { NamesInNumbers } from '@/lib/names/present'

import { namesHref, type NamesPlace } from './names-place'

/** How far the names of a line have come. */
export function NamesInNumbersNote({
  place,
  numbers: { shades, named, onShades, heap },
}: {
  place: NamesPlace
  numbers: NamesInNumbers
}) {
  return (
    <Note title="How far they are">
      <Facts
        items={[
          { term: 'Shades with a name', reading: `${named} of ${shades}` },
          { term: 'Ideas in review', reading: onShades['in-review'] },
          { term: 'Drafts on shades', reading: onShades.draft },
          { term: 'Returned', reading: onShades.returned },
          {
            term: <TextLink href={namesHref(place, '/heap')}>In the heap</TextLink>,
            reading: heap,
          },
        ]}
      />
    </Note>
  )
}

/** When the label printer begins, or that names are locked for it. */
export function PrintDateNote({
  place,
  frozen,
  printOn,
}: {
  place: NamesPlace
  frozen: boolean
  printOn: string | null
}) {
  return (
    <Note title="The label printer">
      <p>
        {frozen
          ? 'Approved names are locked for the label printer. An owner can unlock one, with a reason.'
          : printOn
            ? `Labels are printed on ${dayInWords(printOn)}. From that day on approved names are locked.`
            : 'No date is set yet.'}{' '}
        <TextLink href={namesHref(place, '/labels')}>See labels</TextLink>
      </p>
    </Note>
  )
}
