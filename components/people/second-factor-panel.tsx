'use client'

import { useState, type ReactNode } from 'react'

import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Status } from '@/components/ui/status'
import { toastDone } from '@/components/ui/toast'

import { AuthenticatorSetup } from './authenticator-setup'
import { ProofForm } from './proof-form'
import { RecoveryCodes } from './recovery-codes'
import type { AuthenticatorSetup as Setup, SecondFactorActions } from './second-factor-types'

/** Fewer than these are too few to rely on. */
const FEW = 4

/** Props of {@link SecondFactorPanel}. */
export interface SecondFactorPanelProps {
  email: string
  inUse: boolean
  /** Begun, perhaps in another window, and not confirmed. */
  begun: boolean
  codesLeft: number
  /** No brand of theirs asks for it. */
  removable: boolean
  actions: SecondFactorActions
  /** Where to go on to, once it is in use. */
  onwards?: ReactNode
}

/** One person's second factor: none, being set up, just set up, or in use. */
export function SecondFactorPanel(props: SecondFactorPanelProps) {
  const { email, inUse, actions, onwards } = props
  const [setup, setSetup] = useState<Setup>()
  const [codes, setCodes] = useState<string[]>()
  if (codes) {
    return <RecoveryCodes codes={codes} email={email} onKept={() => setCodes(undefined)} />
  }
  if (setup) {
    return (
      <AuthenticatorSetup
        setup={setup}
        confirm={actions.confirm}
        onConfirmed={(made) => {
          setSetup(undefined)
          setCodes(made)
        }}
        onLeave={() => setSetup(undefined)}
      />
    )
  }
  return inUse ? (
    <>
      <InUse {...props} onSetup={setSetup} onCodes={setCodes} />
      {onwards}
    </>
  ) : (
    <NotInUse {...props} onSetup={setSetup} onCodes={setCodes} />
  )
}

type PartProps = SecondFactorPanelProps & {
  onSetup: (setup: Setup) => void
  onCodes: (codes: string[]) => void
}

function NotInUse({ begun, actions, onSetup, onCodes }: PartProps) {
  return (
    <div className="space-y-8">
      <Status kind={begun ? 'draft' : 'none'}>{begun ? 'Being set up' : 'Not in use'}</Status>
      {begun ? (
        <section>
          <h2 className="mb-3 text-xl">Type the code your authenticator shows</h2>
          <ProofForm
            asks={['code']}
            codeHint="The six digits beside Woadmap."
            send={actions.confirm}
            onDone={({ recoveryCodes }) => onCodes(recoveryCodes)}
            label="Confirm code"
            pendingLabel="Confirming code…"
          />
        </section>
      ) : null}
      <section>
        <h2 className="text-xl">{begun ? 'Or begin again' : 'Set one up'}</h2>
        <p className="mt-1 mb-3 text-ink-soft">
          {begun
            ? 'With a new secret; remove the earlier entry from your authenticator.'
            : 'You need an authenticator: an application, mostly on a telephone, that shows a new code every half minute.'}
        </p>
        <ProofForm
          asks={['password']}
          send={actions.begin}
          onDone={onSetup}
          label={begun ? 'Begin again' : 'Set up second factor'}
          pendingLabel="Making a secret…"
          variant={begun ? 'secondary' : 'primary'}
        />
      </section>
    </div>
  )
}

const leftInWords = (left: number) =>
  left === 0
    ? 'No recovery code is left'
    : left === 1
      ? '1 recovery code is left'
      : `${left} recovery codes are left`

type Change = 'renew' | 'replace' | 'remove'

function InUse({ codesLeft, removable, actions, onSetup, onCodes }: PartProps) {
  const [change, setChange] = useState<Change>()
  const openFor = (which: Change) => ({
    open: change === which,
    onOpenChange: (open: boolean) => setChange(open ? which : undefined),
  })
  const few = codesLeft < FEW
  return (
    <>
      <div className="flex flex-col gap-1">
        <Status kind="done">In use</Status>
        <Status kind={few ? 'attention' : 'done'}>
          {leftInWords(codesLeft)}
          {few ? '. Make new ones before you need them.' : ''}
        </Status>
      </div>
      <div className="mt-6 flex flex-wrap gap-3">
        <Button onClick={() => setChange('renew')}>Make new recovery codes</Button>
        <Button onClick={() => setChange('replace')}>Change authenticator</Button>
        {removable ? (
          <Button onClick={() => setChange('remove')}>Remove second factor</Button>
        ) : null}
      </div>
      <Dialog
        {...openFor('renew')}
        title="Make new recovery codes"
        description="The earlier ones are no good any more."
      >
        <ProofForm
          asks={['password', 'code']}
          send={actions.renew}
          onDone={({ recoveryCodes }) => onCodes(recoveryCodes)}
          label="Make new codes"
          pendingLabel="Making codes…"
        />
      </Dialog>
      <Dialog
        {...openFor('replace')}
        title="Change authenticator"
        description="The one in use stays in use until the new one has shown its first code."
      >
        <ProofForm
          asks={['password', 'code']}
          send={actions.begin}
          onDone={onSetup}
          label="Begin the change"
          pendingLabel="Making a secret…"
        />
      </Dialog>
      <Dialog
        {...openFor('remove')}
        title="Remove second factor"
        description="Your password alone will sign you in, and your recovery codes go with it."
      >
        <ProofForm
          asks={['password', 'code']}
          send={actions.remove}
          onDone={() => toastDone('Your second factor is removed.')}
          label="Remove second factor"
          pendingLabel="Removing…"
          variant="danger"
        />
      </Dialog>
    </>
  )
}
