'use client'

import { Smartphone } from 'lucide-react'

import { Button } from '@/components/ui/button'
import { buttonClass } from '@/components/ui/button-class'

import { ProofForm } from './proof-form'
import type { AuthenticatorSetup as Setup, SecondFactorActions } from './second-factor-types'

const CODE_HINT = 'The six digits that your authenticator shows for Woadmap now.'

/** The two steps after the beginning: show the secret to an authenticator, type its first code. */
export function AuthenticatorSetup({
  setup: { secret, uri, picture },
  confirm,
  onConfirmed,
  onLeave,
}: {
  setup: Setup
  confirm: SecondFactorActions['confirm']
  onConfirmed: (recoveryCodes: string[]) => void
  onLeave: () => void
}) {
  return (
    <div className="space-y-8">
      <section>
        <h2 className="text-xl">1. Show this to your authenticator</h2>
        {/* eslint-disable-next-line @next/next/no-img-element -- drawn for this page alone */}
        <img
          src={picture}
          alt="A picture of the secret, for a telephone’s camera. The secret itself stands below it."
          className="mt-4 size-52 border border-hairline bg-sheet"
        />
        <p className="mt-4 text-ink-soft">
          Or type this secret, for a code that changes with time:
        </p>
        <p className="mt-1 max-w-60 text-lg font-medium tracking-wide select-all [word-spacing:0.35em]">
          {secret}
        </p>
        <p className="mt-4 mb-2 text-ink-soft">On the telephone itself:</p>
        <a href={uri} className={buttonClass()}>
          <Smartphone aria-hidden="true" />
          Open authenticator
        </a>
      </section>
      <section>
        <h2 className="mb-3 text-xl">2. Type the code it shows</h2>
        <ProofForm
          asks={['code']}
          codeHint={CODE_HINT}
          send={confirm}
          onDone={({ recoveryCodes }) => onConfirmed(recoveryCodes)}
          label="Confirm code"
          pendingLabel="Confirming code…"
        />
      </section>
      <Button variant="quiet" onClick={onLeave}>
        Leave it for now
      </Button>
    </div>
  )
}
