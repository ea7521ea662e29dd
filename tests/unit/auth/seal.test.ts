import fc from 'fast-check'
import { beforeAll, describe, expect, it, vi } from 'vitest'

vi.mock('@/lib/env', () => ({
  env: () => ({ NEXTAUTH_SECRET: 'thirty-two characters or even more' }),
}))

let sealing: typeof import('@/lib/auth/seal')
beforeAll(async () => {
  sealing = await import('@/lib/auth/seal')
})

describe('a seal', () => {
  it('gives back what was sealed, and looks different every time', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        const [one, other] = [sealing.seal(text, 'letter'), sealing.seal(text, 'letter')]
        expect(sealing.unseal(one, 'letter')).toBe(text)
        expect(one).not.toBe(other)
      }),
    )
  })

  it('is not opened for another purpose', () => {
    expect(() => sealing.unseal(sealing.seal('a secret', 'totp'), 'letter')).toThrow()
  })

  it('is not opened when a bit of it has changed', () => {
    const bytes = Buffer.from(sealing.seal('a secret', 'totp'), 'base64')
    for (let at = 0; at < bytes.length; at++) {
      const changed = Buffer.from(bytes)
      changed[at]! ^= 1
      expect(() => sealing.unseal(changed.toString('base64'), 'totp')).toThrow()
    }
  })
})

describe('a token', () => {
  it('is 256 bits that go into an address, kept as their SHA-256', () => {
    const { token, tokenHash } = sealing.makeToken()
    expect(token).toMatch(/^[\w-]{43}$/)
    expect(tokenHash).toBe(sealing.digest(token))
    expect(sealing.makeToken().token).not.toBe(token)
  })

  // FIPS 180-4, SHA-256 of "abc" (NIST's example values).
  it('is hashed by SHA-256', () => {
    expect(sealing.digest('abc')).toBe(
      'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
    )
  })
})
