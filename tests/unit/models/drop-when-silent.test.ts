import { describe, expect, it, vi } from 'vitest'

import { dropWhenSilent } from '@/models/drop-when-silent'

/** A client of pg as far as it matters: every statement ends as told. */
function clientThat(ends: Error | null) {
  const destroy = vi.fn()
  const client = {
    connection: { stream: { destroy } },
    query: vi.fn((...args: unknown[]) =>
      (args.at(-1) as (error: Error | null, result: unknown) => void)(ends, 'result'),
    ),
  }
  const send = client.query
  dropWhenSilent(client)
  return { client, send, destroy }
}

describe('a connection', () => {
  it('is ended once a statement was not answered in time', () => {
    const silence = new Error('Query read timeout')
    const { client, destroy } = clientThat(silence)
    const done = vi.fn()
    client.query('SELECT 1', done)
    expect(done).toHaveBeenCalledExactlyOnceWith(silence, 'result')
    expect(destroy).toHaveBeenCalledOnce()
  })

  it('is kept after an answer and after a refusal', () => {
    for (const ends of [null, new Error('duplicate key')]) {
      const { client, send, destroy } = clientThat(ends)
      const done = vi.fn()
      client.query('SELECT $1', [1], done)
      expect(send).toHaveBeenCalledWith('SELECT $1', [1], expect.any(Function))
      expect(done).toHaveBeenCalledExactlyOnceWith(ends, 'result')
      expect(destroy).not.toHaveBeenCalled()
    }
  })
})
