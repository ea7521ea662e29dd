import { act, renderHook } from '@testing-library/react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { useNameCheck } from '@/components/names/use-name-check'
import type { ActionResult } from '@/lib/errors'
import type { CheckedName } from '@/lib/names/present'

beforeEach(() => void vi.useFakeTimers())
afterEach(() => void vi.useRealTimers())

const told = (heardAs: string): CheckedName => ({
  findings: [],
  heardAs,
  isGuess: false,
  playsOn: null,
  label: { lines: [], fits: true, over: 0, missing: [] },
})

/** A server that answers when it is told to. */
function server() {
  const asked: { text: string; answer: (result?: ActionResult<CheckedName>) => Promise<void> }[] =
    []
  const ask = (text: string) =>
    new Promise<ActionResult<CheckedName>>((resolve) => {
      asked.push({
        text,
        answer: (result = { ok: true, data: told(text) }) =>
          act(async () => {
            resolve(result)
            await Promise.resolve()
          }),
      })
    })
  return { asked, ask }
}

function begin() {
  const { asked, ask } = server()
  const { result, rerender } = renderHook(({ text }) => useNameCheck(text, ask), {
    initialProps: { text: '' },
  })
  const type = (text: string, pause = 1_000) => {
    rerender({ text })
    act(() => void vi.advanceTimersByTime(pause))
  }
  return { asked, result, type }
}

describe('the checks of a name while it is typed', () => {
  it('wait for a pause', () => {
    const { asked, type } = begin()
    type('T', 20)
    type('Th', 20)
    type('Thyme', 20)
    expect(asked).toHaveLength(0)
    type('Thyme')
    expect(asked.map(({ text }) => text)).toEqual(['Thyme'])
  })

  it('ask one at a time, and end with the last words however late an answer is', async () => {
    const { asked, result, type } = begin()
    type('Thyme')
    type('Thyme will')
    type('Thyme will tell')
    expect(asked).toHaveLength(1)
    await asked[0]!.answer()
    expect(asked.map(({ text }) => text)).toEqual(['Thyme', 'Thyme will tell'])
    expect(result.current).toMatchObject({ pending: true, checked: { heardAs: 'Thyme' } })
    await asked[1]!.answer()
    expect(result.current).toMatchObject({
      pending: false,
      checked: { heardAs: 'Thyme will tell' },
    })
    act(() => void vi.advanceTimersByTime(5_000))
    expect(asked).toHaveLength(2)
  })

  it('show nothing of a name that was wiped out meanwhile, and begin again with the next', async () => {
    const { asked, result, type } = begin()
    type('Thyme')
    type('')
    await asked[0]!.answer()
    expect(result.current).toEqual({ checked: null, pending: false, problem: null })
    type('Sage')
    expect(asked.map(({ text }) => text)).toEqual(['Thyme', 'Sage'])
  })

  it('say so when there is no answer, and ask again with the next words', async () => {
    const { asked, result, type } = begin()
    type('Thyme')
    await asked[0]!.answer({ ok: false, code: 'unavailable', message: 'Out of reach.' })
    expect(result.current).toEqual({ checked: null, pending: false, problem: 'Out of reach.' })
    type('Thyme will')
    await asked[1]!.answer()
    expect(result.current).toMatchObject({ problem: null, checked: { heardAs: 'Thyme will' } })
  })
})
