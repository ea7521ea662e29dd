import { UnrecognizedActionError } from 'next/dist/client/components/unrecognized-action-error'
import { describe, expect, it } from 'vitest'

import { reach } from '@/components/reach'

describe('waiting for an action', () => {
  it('passes on what it answers', async () => {
    const answer = { ok: true, data: 7 } as const
    expect(await reach(Promise.resolve(answer))).toBe(answer)
  })

  it('says that no answer came', async () => {
    const answer = await reach(Promise.reject(new TypeError('Failed to fetch')))
    expect(answer).toMatchObject({ ok: false, message: /could not be reached/ })
  })

  it('says that the product was updated when the server does not know the action any more', async () => {
    const answer = await reach(Promise.reject(new UnrecognizedActionError('gone')))
    expect(answer).toMatchObject({ ok: false, message: /was updated.+copy it, reload/ })
  })
})
