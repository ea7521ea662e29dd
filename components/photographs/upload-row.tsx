import { RotateCcw, X } from 'lucide-react'
import type { ReactNode } from 'react'

import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Progress } from '@/components/ui/progress'
import { Status } from '@/components/ui/status'
import { TextLink } from '@/components/ui/text-link'

import type { Upload } from './use-uploads'

const STEPS = {
  queued: 'Waits its turn',
  preparing: 'Being prepared',
  sending: 'Being sent',
  checking: 'Being checked',
} as const

/** One file on its way: how far it is, how it ended, and what can be done. */
export function UploadRow({
  upload: { file, step, sent, outcome },
  hrefOf,
  onCancel,
  onRetry,
  onDismiss,
}: {
  upload: Upload
  hrefOf: (photographId: string) => string
  onCancel: () => void
  onRetry: () => void
  onDismiss: () => void
}) {
  const size =
    file.size < 1e5 ? `${Math.ceil(file.size / 1e3)} kB` : `${(file.size / 1e6).toFixed(1)} MB`
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2 py-3">
      <div className="min-w-0 grow basis-60">
        {step === 'ended' ? (
          <p className="break-words">
            {file.name} <span className="text-sm text-ink-faint">{size}</span>
          </p>
        ) : (
          <Progress
            label={file.name}
            detail={`${STEPS[step]} · ${size}`}
            {...(step === 'sending' && { value: Math.round(sent * 100) })}
          />
        )}
        <LiveRegion visible>
          {outcome ? <Ended outcome={outcome} hrefOf={hrefOf} /> : null}
        </LiveRegion>
      </div>
      <div className="flex gap-2">
        {outcome?.kind === 'failed' || outcome?.kind === 'cancelled' ? (
          <Button size="small" icon={<RotateCcw aria-hidden="true" />} onClick={onRetry}>
            Retry <span className="sr-only">{file.name}</span>
          </Button>
        ) : null}
        {step === 'ended' ? (
          <Button size="small" variant="quiet" icon={<X aria-hidden="true" />} onClick={onDismiss}>
            Clear <span className="sr-only">{file.name} from this list</span>
          </Button>
        ) : step === 'checking' ? null : (
          <Button size="small" icon={<X aria-hidden="true" />} onClick={onCancel}>
            Cancel <span className="sr-only">{file.name}</span>
          </Button>
        )}
      </div>
    </li>
  )
}

function Ended({
  outcome,
  hrefOf,
}: {
  outcome: NonNullable<Upload['outcome']>
  hrefOf: (photographId: string) => string
}): ReactNode {
  switch (outcome.kind) {
    case 'added':
      return (
        <Status kind="done">
          Added. <TextLink href={hrefOf(outcome.photographId)}>Open photograph</TextLink>
        </Status>
      )
    case 'same':
      return (
        <Status kind="attention">
          The line has this file already:{' '}
          <TextLink href={hrefOf(outcome.photographId)}>{outcome.title}</TextLink>
        </Status>
      )
    case 'cancelled':
      return <Status kind="none">Cancelled</Status>
    default:
      return <Status kind="problem">{outcome.message}</Status>
  }
}
