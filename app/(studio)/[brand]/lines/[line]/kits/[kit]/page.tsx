import type { Metadata } from 'next'

import { dayInWords } from '@/components/date-words'
import { CopyText } from '@/components/kits/copy-text'
import { DeleteKit } from '@/components/kits/delete-kit'
import { DownloadKit } from '@/components/kits/download-kit'
import { LeftOut } from '@/components/kits/left-out'
import {
  againHref,
  askedInWords,
  combinationsInWords,
  isThere,
  sizeInWords,
} from '@/components/kits/words'
import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { LinkButton } from '@/components/ui/link-button'
import { Facts } from '@/components/ui/ledger'
import { Notice } from '@/components/ui/notice'
import { isUnbuilt } from '@/lib/kits/constants'
import { presentKit, presentKitEntries, type KitEntryView } from '@/lib/kits/present'
import { getKit } from '@/lib/kits/queries'
import { readForPage } from '@/lib/server/page'

import { deleteKitAction } from '../actions'

export const metadata: Metadata = { title: 'Kit' }

/** How tall the pictures are shown. */
const PICTURE_REM = 13

export default async function KitPage({ params }: PageProps<'/[brand]/lines/[line]/kits/[kit]'>) {
  const { brand, line: lineSlug, kit: kitId } = await params
  const { kit, entries } = await readForPage(brand, async (actor) => {
    const built = await getKit(actor, lineSlug, kitId)
    return { kit: presentKit(actor, built), entries: presentKitEntries(actor, built) }
  })
  const here = `/${brand}/lines/${lineSlug}/kits`
  const there = isThere(kit)
  return (
    <Sheet
      notes={
        <>
          {there ? (
            <Note title="The file">
              <Facts
                items={[
                  { term: 'Size', reading: sizeInWords(kit.byteLength ?? 0) },
                  { term: 'Kept until', reading: kit.expiresAt ? dayInWords(kit.expiresAt) : '' },
                ]}
              />
            </Note>
          ) : null}
          {kit.leftOut.length > 0 ? (
            <Note title="Left out">
              <LeftOut of={kit.leftOut} />
            </Note>
          ) : null}
        </>
      }
    >
      <SheetHeader
        title={`Kit of ${combinationsInWords(kit.count)}`}
        meta={askedInWords(kit)}
        actions={
          <>
            {there ? (
              <DownloadKit brand={brand} kit={kit} />
            ) : isUnbuilt(kit.state) ? (
              <LinkButton href={here}>Follow it in the list</LinkButton>
            ) : (
              <LinkButton variant="primary" href={againHref(here, kit)}>
                Build again
              </LinkButton>
            )}
            {kit.canDelete ? (
              <DeleteKit brand={brand} kit={kit} kits={here} remove={deleteKitAction} />
            ) : null}
          </>
        }
      />
      {there ? null : (
        <Notice kind={kit.state === 'failed' ? 'error' : 'info'} className="mb-6">
          <p>
            {kit.failure ??
              (kit.expired
                ? 'This kit has expired and its file is removed. Its texts are still here; build it again for the pictures.'
                : 'This kit is still being built. Its pictures and texts stand here once it is ready.')}
          </p>
        </Notice>
      )}
      {entries.map((entry) => (
        <Entry key={entry.id} entry={entry} there={there} />
      ))}
    </Sheet>
  )
}

function Entry({
  entry: { title, alt, caption, html, pictures },
  there,
}: {
  entry: KitEntryView
  there: boolean
}) {
  return (
    <section className="mb-12">
      <h2 className="mb-3 text-xl break-words">{title}</h2>
      {there ? (
        <ul role="list" className="mb-4 flex flex-wrap items-start gap-4">
          {pictures.map(({ src, width, height }) => (
            <li key={src} style={{ width: `min(100%, ${(PICTURE_REM * width) / height}rem)` }}>
              {/* eslint-disable-next-line @next/next/no-img-element -- a private picture, as it is */}
              <img
                src={src}
                width={width}
                height={height}
                alt={`The picture of ${width} × ${height} pixels`}
                loading="lazy"
                className="h-auto w-full border border-hairline"
              />
              <p className="mt-1 text-sm text-ink-faint">
                {width} × {height}
              </p>
            </li>
          ))}
        </ul>
      ) : null}
      <CopyText what="Alt text" of={title} text={alt} />
      <CopyText what="Caption" of={title} text={caption} />
      <CopyText what="HTML" of={title} text={html} code />
    </section>
  )
}
