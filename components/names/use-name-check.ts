'use client'

import { useEffect, useRef, useState } from 'react'

import { reach } from '@/components/reach'
import type { ActionResult } from '@/lib/errors'
import type { CheckedName } from '@/lib/names/present'

/** How long somebody pauses before what they typed is checked, ms. */
const PAUSE = 150

/** What is known of the name in the field. */
export interface NameCheck {
  /** Of the words checked last; null while the field is empty or nothing has come back. */
  checked: CheckedName | null
  /** What the checks are waited for: the words have changed since. */
  pending: boolean
  /** Why there are none. */
  problem: string | null
}

interface Answered {
  /** The words it is about. */
  of: string
  checked: CheckedName | null
  problem: string | null
}

const NOTHING: Answered = { of: '', checked: null, problem: null }

/**
 * Checks a name as it is typed. One check at a time: whatever was typed meanwhile is asked about
 * when the answer is there, so that the last words are always the last answer.
 */
export function useNameCheck(
  text: string,
  ask: (text: string) => Promise<ActionResult<CheckedName>>,
): NameCheck {
  const wanted = text.trim()
  const [answered, setAnswered] = useState(NOTHING)
  const latest = useRef({ wanted, ask })
  const asking = useRef(false)
  useEffect(() => {
    latest.current = { wanted, ask }
  })

  useEffect(() => {
    if (wanted === '' || wanted === answered.of) return
    async function run() {
      if (asking.current) return
      asking.current = true
      let of: string
      do {
        of = latest.current.wanted
        const answer = await reach(latest.current.ask(of))
        const checked = answer.ok ? answer.data : null
        setAnswered({ of, checked, problem: answer.ok ? null : answer.message })
      } while (latest.current.wanted !== '' && latest.current.wanted !== of)
      asking.current = false
    }
    const timer = setTimeout(() => void run(), PAUSE)
    return () => clearTimeout(timer)
  }, [wanted, answered.of])

  if (wanted === '') return { checked: null, pending: false, problem: null }
  const pending = answered.of !== wanted
  return { checked: answered.checked, pending, problem: pending ? null : answered.problem }
}
