import { describe, expect, it } from 'vitest'

import { makeToken } from '@/lib/auth/seal'
import { loggedPath } from '@/lib/server/http-log'

describe('the path that is logged', () => {
  it('holds neither the query nor the token of a link in a letter', () => {
    const { token } = makeToken()
    expect(loggedPath(`/reset-password/${token}?next=${token}`)).toBe('/reset-password/*')
  })

  it('holds the ids of rows', () => {
    const path =
      '/teasel-and-tarn/lines/heronsway-dk/photographs/5b0fd0a4-7e8f-4c39-9a44-0b9f6d1c7a11'
    expect(loggedPath(path)).toBe(path)
  })
})
