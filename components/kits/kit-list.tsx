'use client'

import { dayInWords } from '@/components/date-words'
import { AppLink } from '@/components/ui/app-link'
import { LedgerList } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Progress } from '@/components/ui/progress'
import { Status } from '@/components/ui/status'
import { isUnbuilt, type KitStanding } from '@/lib/kits/constants'
import type { KitView } from '@/lib/kits/present'
import { DeleteKit, type DeleteKitAction } from './delete-kit'
import { DownloadKit } from './download-kit'
import { LeftOut } from './left-out'
import { useKitStandings } from './use-kit-standings'
import { againHref, askedInWords, combinationsInWords, isThere, sizeInWords } from './words'

/** The kits of a line, newest first; those that are being built are followed. */
export function KitList({
  brand,
  here,
  kits,
  remove,
}: {
  brand: string
  /** The address of the line's kits. */
  here: string
  kits: readonly KitView[]
  remove: DeleteKitAction
}) {
  const { standings, outOfTouch } = useKitStandings(brand, kits)
  const now = kits.map((kit) => ({ ...kit, ...standings.get(kit.id) }))
  const first = now.find(({ state }) => isUnbuilt(state))
  const built = kits.find(
    ({ id, state }) => isUnbuilt(state) && !isUnbuilt(standings.get(id)!.state),
  )
  return (
    <>
      <LiveRegion>
        {first
          ? `Building a kit of ${combinationsInWords(first.count)}.`
          : built
            ? 'The kit is ready.'
            : null}
      </LiveRegion>
      {outOfTouch ? (
        <Notice kind="warning" className="mb-4">
          <p>Woadmap cannot be reached, so this list may be behind. Kits are built all the same.</p>
        </Notice>
      ) : null}
      <LedgerList>
        {now.map((kit) => (
          <li
            key={kit.id}
            className="flex flex-col gap-x-6 gap-y-3 py-4 sm:flex-row sm:items-start sm:justify-between"
          >
            <div className="min-w-0 grow space-y-1">
              <h3 className="font-title text-lg leading-tight">
                {isThere(kit) ? (
                  <AppLink href={`${here}/${kit.id}`} className="hover:underline">
                    {combinationsInWords(kit.count)}
                  </AppLink>
                ) : (
                  combinationsInWords(kit.count)
                )}
              </h3>
              <p className="text-sm text-ink-faint">{askedInWords(kit)}</p>
              <KitStandingLine kit={kit} />
              {kit.failure ? <p className="max-w-measure">{kit.failure}</p> : null}
              {kit.leftOut.length > 0 ? (
                <details>
                  <summary className="min-h-6 text-sm">
                    {kit.leftOut.length} left out, and why
                  </summary>
                  <LeftOut of={kit.leftOut} />
                </details>
              ) : null}
            </div>
            <div className="flex shrink-0 flex-wrap gap-2">
              {isThere(kit) ? (
                <DownloadKit brand={brand} kit={kit} />
              ) : isUnbuilt(kit.state) ? null : (
                <LinkButton href={againHref(here, kit)}>Build again</LinkButton>
              )}
              {kit.canDelete ? (
                <DeleteKit brand={brand} kit={kit} kits={here} remove={remove} />
              ) : null}
            </div>
          </li>
        ))}
      </LedgerList>
    </>
  )
}

function KitStandingLine({ kit }: { kit: KitView & KitStanding }) {
  if (kit.state === 'waiting') return <Status kind="waiting">Waiting to be built</Status>
  if (kit.state === 'building')
    return (
      <div className="max-w-xs">
        <Progress
          label="Building"
          value={kit.done}
          max={kit.total}
          detail={`${kit.done} of ${kit.total}`}
        />
      </div>
    )
  if (kit.state === 'failed') return <Status kind="problem">Not built</Status>
  if (kit.expired)
    return (
      <Status kind="retired">
        Expired{kit.expiresAt ? ` on ${dayInWords(kit.expiresAt)}` : ''}: its file is removed
      </Status>
    )
  return (
    <Status kind="done">
      Ready{kit.byteLength ? `, ${sizeInWords(kit.byteLength)}` : ''}
      {kit.expiresAt ? `, until ${dayInWords(kit.expiresAt)}` : ''}
    </Status>
  )
}
