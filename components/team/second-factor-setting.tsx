'use client'

import { startTransition, useOptimistic, useState } from 'react'

import { reach } from '@/components/reach'
import { Switch } from '@/components/ui/checkbox'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import type { ActionResult } from '@/lib/errors'

/** Props of {@link SecondFactorSetting}. */
export interface SecondFactorSettingProps {
  brand: string
  required: boolean
  /** The owner who looks at it has a second factor. */
  ownInUse: boolean
  /** The names of those of the brand who have none. */
  without: readonly string[]
  require: (
    brand: string,
    input: { required: boolean },
  ) => Promise<ActionResult<{ required: boolean }>>
}

/** Whether the brand asks everybody for a second factor, and who has none yet. */
export function SecondFactorSetting({
  brand,
  required,
  ownInUse,
  without,
  require,
}: SecondFactorSettingProps) {
  const [shown, show] = useOptimistic(required)
  const [problem, setProblem] = useState<string>()
  const [pending, setPending] = useState(false)

  function change() {
    if (pending) return
    setPending(true)
    setProblem(undefined)
    startTransition(async () => {
      show(!required)
      const answer = await reach(require(brand, { required: !required }))
      if (!answer.ok) setProblem(answer.message)
      setPending(false)
    })
  }

  const names = new Intl.ListFormat('en-GB').format(without)
  const [have, see] = without.length === 1 ? ['has', 'sees'] : ['have', 'see']
  return (
    <div className="max-w-measure space-y-4">
      {problem ? <Notice kind="error">{problem}</Notice> : null}
      <Switch
        label="Require a second factor"
        hint="Everybody of this brand then signs in with a code after the password. Turning it on and off stands in the activity record."
        checked={shown}
        disabled={!ownInUse && !required}
        onChange={change}
      />
      {!ownInUse ? (
        <Notice title="Set up your own first">
          You have no second factor, so you would be the first to be shut out.{' '}
          <TextLink href="/account/second-factor">Set up your second factor</TextLink>, then come
          back.
        </Notice>
      ) : without.length > 0 ? (
        <Notice
          title={
            without.length === 1 ? 'One person has none' : `${without.length} people have none`
          }
        >
          {shown
            ? `${names} ${see} nothing of the brand until they have set one up; they are led to it.`
            : `${names} ${have} none. Once you require it, they are led to set one up before they see anything of the brand.`}
        </Notice>
      ) : (
        <p className="text-ink-soft">Everybody of this brand has one.</p>
      )}
    </div>
  )
}
