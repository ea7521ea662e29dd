import { describe, expect, it } from 'vitest'

import { hashPassword, verifyPassword } from '@/lib/auth/password'

describe('password hashes', () => {
  it('are argon2id with 19456 KiB, 2 passes, 1 lane, and a salt of their own', async () => {
    const [first, second] = await Promise.all([hashPassword('the same'), hashPassword('the same')])
    expect(first).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
    expect(second).not.toBe(first)
  })

  it('fit their password only', async () => {
    const hash = await hashPassword('over the hill')
    expect(await verifyPassword(hash, 'over the hill')).toBe(true)
    expect(await verifyPassword(hash, 'over the hills')).toBe(false)
  })

  it('fit nothing when nobody has them', async () => {
    expect(await verifyPassword(undefined, 'nobody has this password')).toBe(false)
  })
})
