import { describe, expect, it, vi } from 'vitest'

import { ForbiddenError } from '@/lib/errors'
import { requireSameOrigin } from '@/lib/server/same-origin'

vi.mock('@/lib/env', () => ({ env: () => ({ APP_ORIGIN: 'https://studio.example' }) }))

const ask = (headers: Record<string, string>) => () => requireSameOrigin(new Headers(headers))

describe('a write', () => {
  it.each<[string, Record<string, string>]>([
    ['our own pages', { origin: 'https://studio.example' }],
    [
      'our own pages, with both headers',
      { origin: 'https://studio.example', 'sec-fetch-site': 'same-origin' },
    ],
    ['our own pages, by a browser that leaves Origin out', { 'sec-fetch-site': 'same-origin' }],
  ])('from %s is let in', (_, headers) => {
    expect(ask(headers)).not.toThrow()
  })

  it.each<[string, Record<string, string>]>([
    ['another site', { origin: 'https://elsewhere.example' }],
    [
      'another site that claims to be none',
      { origin: 'https://elsewhere.example', 'sec-fetch-site': 'same-origin' },
    ],
    ['our host on another port', { origin: 'https://studio.example:8443' }],
    ['our host without TLS', { origin: 'http://studio.example' }],
    ['a host that begins like ours', { origin: 'https://studio.example.elsewhere.example' }],
    ['a hidden origin', { origin: 'null' }],
    ['a hidden origin that claims to be ours', { origin: 'null', 'sec-fetch-site': 'same-origin' }],
    ['an empty origin', { origin: '', 'sec-fetch-site': 'same-origin' }],
    ['a neighbouring host', { 'sec-fetch-site': 'same-site' }],
    ['another site, by Sec-Fetch-Site', { 'sec-fetch-site': 'cross-site' }],
    ['a bookmark or the address bar', { 'sec-fetch-site': 'none' }],
    ['nobody in particular', {}],
    ['a referrer alone', { referer: 'https://studio.example/' }],
    ['a forged host', { host: 'studio.example', 'x-forwarded-host': 'studio.example' }],
  ])('from %s is refused', (_, headers) => {
    expect(ask(headers)).toThrow(ForbiddenError)
  })
})
