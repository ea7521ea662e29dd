import type { Metadata } from 'next'

import { ActivityDays } from '@/components/activity/activity-days'
import { ActivityFilter } from '@/components/activity/activity-filter'
import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { buttonClass } from '@/components/ui/button-class'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { ACTIVITY_LIMITS } from '@/lib/activity/constants'
import { presentDays } from '@/lib/activity/present'
import { listActivity, listActivityPeople } from '@/lib/activity/queries'
import { activityPageSchema } from '@/lib/activity/schema'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'Activity record' }

export default async function ActivityPage({
  params,
  searchParams,
}: PageProps<'/[brand]/activity'>) {
  const { brand } = await params
  // An address that people type and share: what it does not know is left out.
  const { before, ...filter } = activityPageSchema.strip().parse(await searchParams)
  const { days, older, people, brandName } = await readForPage(brand, async (actor) => {
    const [found, members] = await Promise.all([
      listActivity(actor, { ...filter, before }),
      listActivityPeople(actor),
    ])
    return {
      brandName: actor.brandName,
      days: presentDays(found.entries),
      older: found.older,
      people: members,
    }
  })
  const here = `/${brand}/activity`
  const asked = Object.entries(filter).filter((one): one is [string, string] => one[1] !== null)
  const hrefWith = (more: Record<string, string>) => {
    const query = new URLSearchParams([...asked, ...Object.entries(more)]).toString()
    return query ? `${here}?${query}` : here
  }
  const isNarrowed = asked.length > 0
  return (
    <Sheet notes={<ActivityNotes />}>
      <SheetHeader
        title="Activity record"
        meta={`Who did what in ${brandName}, and when`}
        actions={
          <a
            href={`/api/brands/${brand}/activity.csv?${new URLSearchParams(asked).toString()}`}
            download
            className={buttonClass('secondary', 'main')}
          >
            Save as CSV
          </a>
        }
      />
      <ActivityFilter filter={filter} people={withAsked(people, filter.person)} here={here} />
      {days.length > 0 ? <ActivityDays days={days} /> : null}
      {days.length === 0 && (isNarrowed || before) ? (
        <NotFoundState
          title="No entry fits that"
          action={<LinkButton href={here}>Show all entries</LinkButton>}
        >
          <p>Nothing in the record is all of what you asked for.</p>
        </NotFoundState>
      ) : null}
      {days.length === 0 && !isNarrowed && !before ? (
        <EmptyState title="Nothing has happened yet">
          <p>
            Every sign-in, change, export and refusal in {brandName} will stand here, with who it
            was and what it was before.
          </p>
        </EmptyState>
      ) : null}
      <Pagination
        label="Pages of the record"
        summary={`${ACTIVITY_LIMITS.perPage} entries a page, newest first`}
        {...(before && { previousHref: hrefWith({}), previousLabel: 'Newest entries' })}
        {...(older && { nextHref: hrefWith({ before: older }), nextLabel: 'Older entries' })}
      />
    </Sheet>
  )
}

function ActivityNotes() {
  return (
    <>
      <Note title="For good">
        <p>Nobody can change or remove an entry, an owner neither. Days and times are UTC.</p>
      </Note>
      <Note title="The CSV file">
        <p>
          It holds the newest {ACTIVITY_LIMITS.csvRows.toLocaleString('en-GB')} entries that fit.
          Choose days to reach older ones.
        </p>
      </Note>
    </>
  )
}

/** Somebody who has left, by whom the address narrows the record, stays chosen without a name. */
function withAsked(people: { id: string; name: string }[], asked: string | null) {
  const isKnown = asked === null || asked === 'former' || people.some(({ id }) => id === asked)
  return isKnown ? people : [...people, { id: asked, name: 'Somebody who has left' }]
}
