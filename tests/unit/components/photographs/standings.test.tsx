import { render, screen, waitFor } from '@testing-library/react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { ReadingStatus } from '@/components/photographs/reading-status'
import { pauseAfter } from '@/components/photographs/use-standings'
import type { PhotographState } from '@/lib/photographs/constants'

const refresh = vi.fn()
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }))

const ID = '6f1d2c1e-5a3b-4c8d-9e7f-0a1b2c3d4e5f'
const answers = vi.fn<() => PhotographState | 'away'>()

beforeEach(() => {
  refresh.mockClear()
  answers.mockReset()
  vi.stubGlobal('fetch', (url: string) => {
    expect(url).toBe(`/api/brands/b/photographs/states?ids=${ID}`)
    const state = answers()
    if (state === 'away') return Promise.resolve(new Response('', { status: 503 }))
    return Promise.resolve(Response.json([{ id: ID, state, failure: 'It is cut short.' }]))
  })
})
afterEach(() => vi.unstubAllGlobals())

const show = (state: PhotographState, canReread = true) =>
  render(
    <ReadingStatus
      brand="b"
      standing={{ id: ID, state, failure: state === 'failed' ? 'It is cut short.' : null }}
      canReread={canReread}
      reread={vi.fn()}
    />,
  )

describe('following a reading', () => {
  it('asks until it is ready, then has the page rendered anew once', async () => {
    answers.mockReturnValueOnce('waiting').mockReturnValueOnce('reading').mockReturnValue('ready')
    show('waiting')
    expect(await screen.findByText('Being read', {}, { timeout: 4_000 })).toBeVisible()
    await waitFor(() => expect(refresh).toHaveBeenCalledOnce(), { timeout: 4_000 })
    expect(answers).toHaveBeenCalledTimes(3)
  })

  it('says that it is out of touch and keeps the last it knew', async () => {
    answers.mockReturnValue('away')
    show('reading')
    expect(await screen.findByText(/does not answer just now/)).toBeVisible()
    expect(screen.getByText('Being read')).toBeVisible()
  })

  it('gives the reason of a failure and a way to try again, to those who may', () => {
    const { unmount } = show('failed')
    expect(screen.getByText('It is cut short.')).toBeVisible()
    expect(screen.getByRole('button', { name: 'Read photograph again' })).toBeVisible()
    unmount()
    show('failed', false)
    expect(screen.queryByRole('button')).toBeNull()
    expect(answers).not.toHaveBeenCalled()
  })

  it('asks less and less often, and never less than every five seconds', () => {
    const pauses = Array.from({ length: 30 }, (_, looks) => pauseAfter(looks))
    expect(pauses[0]).toBe(1_000)
    expect(pauses).toEqual([...pauses].sort((a, b) => a - b))
    expect(pauses.at(-1)).toBe(5_000)
  })
})
