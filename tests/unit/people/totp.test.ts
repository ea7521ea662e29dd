import { describe, expect, it } from 'vitest'

import { authenticatorAddress, newSecret, stepOfTotp } from '@/lib/auth/totp'

/** @source RFC 4226 Appendix D, RFC 6238 Appendix B: the ASCII text "12345678901234567890" */
const SECRET = 'GEZDGNBVGY3TQOJQGEZDGNBVGY3TQOJQ'

/** @source RFC 4226 Appendix D, counters 0 to 9 */
const HOTP = [
  '755224',
  '287082',
  '359152',
  '969429',
  '338314',
  '254676',
  '287922',
  '162583',
  '399871',
  '520489',
]

/** Seconds, and the last six of the eight digits. @source RFC 6238 Appendix B, SHA-1 */
const TOTP = [
  [59, '287082'],
  [1_111_111_109, '081804'],
  [1_111_111_111, '050471'],
  [1_234_567_890, '005924'],
  [2_000_000_000, '279037'],
  [20_000_000_000, '353130'],
] as const

describe('a one-time code', () => {
  it('is that of RFC 4226 for its counter', () => {
    const steps = HOTP.map((code, at) => stepOfTotp(SECRET, code, at * 30_000))
    expect(steps).toEqual(HOTP.map((_, at) => at))
  })

  it('is that of RFC 6238 for its time', () => {
    for (const [seconds, code] of TOTP) {
      expect(stepOfTotp(SECRET, code, seconds * 1000), code).toBe(Math.floor(seconds / 30))
    }
  })

  it('is good from one step before its own to one after, and named by its own', () => {
    const at = (seconds: number) => stepOfTotp(SECRET, HOTP[5]!, seconds * 1000)
    expect([119.999, 120, 150, 179.999, 209.999, 210].map(at)).toEqual([null, 5, 5, 5, 5, null])
  })

  it('may be written with spaces or a hyphen', () => {
    expect([' 287 082 ', '287-082'].map((code) => stepOfTotp(SECRET, code, 59_000))).toEqual([1, 1])
  })

  it('is nothing but six of the digits 0 to 9, and anything else is no code rather than a fault', () => {
    const others = [
      '',
      '28708',
      '2870820',
      'ééé082',
      '２８７０８２',
      'abcdef',
      '28708\n2x',
      '-287082x',
    ]
    for (const other of others) expect(stepOfTotp(SECRET, other, 59_000), other).toBeNull()
  })
})

describe('the address of an authenticator', () => {
  it('names Woadmap, the account and a secret of 160 bits, and is another each time', () => {
    const secret = newSecret()
    const uri = authenticatorAddress(secret, 'fern+dye@people.example')
    expect(uri).toContain('otpauth://totp/Woadmap:fern%2Bdye%40people.example?')
    expect(Object.fromEntries(new URL(uri).searchParams)).toEqual({
      issuer: 'Woadmap',
      secret,
      algorithm: 'SHA1',
      digits: '6',
      period: '30',
    })
    expect(secret).toMatch(/^[A-Z2-7]{32}$/)
    expect(newSecret()).not.toBe(secret)
  })
})
