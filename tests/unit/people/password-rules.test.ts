import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { hashPassword, verifyPassword } from '@/lib/auth/password'
import { checkPassword } from '@/lib/people/password-rules'

const about = { email: 'maren.holt@teasel-yarns.example', name: 'Maren Holtby' }
const refused = async (password: string) => (await checkPassword(password, about)) !== null

describe('a password', () => {
  it('is taken from 12 code points to 256, whatever they are', async () => {
    expect(await checkPassword('kv8#qzt0wpl')).toMatch(/at least 12 characters: this one has 11/)
    expect(await checkPassword('kv8#qzt0wplm')).toBeNull()
    expect(await checkPassword('🧶🐑🌿🪨🌧🔥🧵🪡🌊🐚🍂')).toMatch(/has 11/)
    expect(await checkPassword('🧶🐑🌿🪨🌧🔥🧵🪡🌊🐚🍂🪵')).toBeNull()
    const long = Array.from({ length: 257 }, (_, at) =>
      String.fromCodePoint(97 + (((at * 7) ^ at) % 26)),
    )
    expect(await checkPassword(long.slice(0, 64).join(''))).toBeNull()
    expect(await checkPassword(long.slice(0, 256).join(''))).toBeNull()
    expect(await checkPassword(long.join(''))).toMatch(/at most 256/)
  })

  it.each([
    'over the hill at lambing time',
    'wet slate and bracken',
    'gorsefourteenladders',
    '839104652817',
    'тихий вереск под дождем',
    'kestrel-anvil-marmalade',
    'correct horse battery staple',
  ])('needs no capitals, digits or signs: %s', async (password) => {
    expect(await checkPassword(password, about)).toBeNull()
  })

  it.each([
    ['common', 'unbelievable'],
    ['common in capitals', 'UNBELIEVABLE'],
    ['common and lengthened', 'password1234'],
    ['common with a year and a sign', 'Sunshine2024!'],
    ['common with signs for letters', 'p@$$w0rd!!!!'],
    ['two common ones', 'dragonmonkey'],
    ['common and said again', 'qwertyqwerty'],
    ['common and said again, unfinished', 'letmeinletmeinlet'],
    ['common in full-width letters', 'ｕｎｂｅｌｉｅｖａｂｌｅ'],
    ['one character', 'aaaaaaaaaaaaaaaa'],
    ['two characters by turns', 'xzxzxzxzxzxzxzxz'],
    ['three characters, four times each', '111122223333'],
    ['the alphabet', 'abcdefghijklmno'],
    ['the alphabet backwards', 'zyxwvutsrqpon'],
    ['digits in a row', '123456789012'],
    ['a row of keys', 'asdfghjklasdfg'],
    ['ours', 'woadmapwoadmap'],
    ['ours and a little', 'Woadmap-2027!!'],
    ['their address', 'maren.holt@teasel-yarns.example'],
    ['half their address', 'marenholt2027'],
    ['their name', 'Maren Holtby'],
    ['their name and a little', 'holtby.maren#1'],
  ])('is refused when it is %s', async (_, password) => {
    expect(await refused(password)).toBe(true)
  })

  it('of random letters is taken', async () => {
    const letter = fc.constantFrom(...'abcdefghijklmnopqrstuvwxyz')
    const password = fc.uniqueArray(letter, { minLength: 16, maxLength: 16 })
    await fc.assert(
      fc.asyncProperty(password, async (letters) => !(await refused(letters.join('')))),
      { numRuns: 50 },
    )
  })
})

describe('the hash of a password', () => {
  it('fits it however its letters were composed', async () => {
    const hash = await hashPassword('un café très fort')
    expect(await verifyPassword(hash, 'un café très fort'.normalize('NFD'))).toBe(true)
    expect(await verifyPassword(hash, 'un cafe tres fort')).toBe(false)
  })

  it('made before they were composed alike still fits', async () => {
    const { hash } = await import('@node-rs/argon2')
    const typed = 'un café très fort'.normalize('NFD')
    expect(await verifyPassword(await hash(typed), typed)).toBe(true)
  })
})
