import { describe, expect, it, vi } from 'vitest'

import { ForbiddenError } from '@/lib/errors'
import { requireSameOrigin } from '@/lib/server/same-origin'

vi.mock('@/lib/env', () => ({ env: () => ({ APP_ORIGIN: 'https://studio.example' }) }))

describe('a write', () => {
  it('from our own pages is let in', () => {
    expect(() => requireSameOrigin(new Headers({ origin: 'https://studio.example' }))).not.toThrow()
  })

  it.each([
    ['another site', { origin: 'https://elsewhere.example' }],
    ['our host on another port', { origin: 'https://studio.example:8443' }],
    ['our host without TLS', { origin: 'http://studio.example' }],
    ['a hidden origin', { origin: 'null' }],
    ['nobody in particular', {}],
    ['a forged host', { host: 'studio.example', 'x-forwarded-host': 'studio.example' }],
  ])('from %s is refused', (_, headers) => {
    expect(() => requireSameOrigin(new Headers(headers as Record<string, string>))).toThrow(
      ForbiddenError,
    )
  })
})
