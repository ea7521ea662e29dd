import { LiveRegion } from '@/components/ui/live-region'
import { Status } from '@/components/ui/status'

import { savingInWords } from './draft-words'
import type { Saving } from './editor-store'

/** Where the saving stands, in words. Only trouble is read out: it saves after every edit. */
export function SaveStatus({ saving }: { saving: Saving }) {
  const words = savingInWords(saving)
  const fine = saving.kind === 'saved' || saving.kind === 'waiting' || saving.kind === 'saving'
  return (
    <div className="flex min-h-9 items-center print:hidden" data-saving={saving.kind}>
      <Status kind={saving.kind === 'saved' ? 'done' : fine ? 'waiting' : 'attention'}>
        {words}
      </Status>
      <LiveRegion>{fine ? '' : words}</LiveRegion>
    </div>
  )
}
