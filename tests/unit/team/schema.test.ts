import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { PEOPLE_LIMITS } from '@/lib/people/constants'
import { TEAM_LIMITS } from '@/lib/team/constants'
import { inviteMembersSchema, joinAsNewPersonSchema, readAddresses } from '@/lib/team/schema'

const form = (emails: string) =>
  inviteMembersSchema.safeParse({
    emails,
    role: 'dyer',
    requestKey: '00000000-0000-4000-8000-000000000000',
  })
const messageOf = (emails: string) => form(emails).error?.issues[0]?.message

describe('a pasted list of addresses', () => {
  it('is read however it is separated, in lower case, each once', () => {
    expect(
      readAddresses(' A@mill.example,b@mill.example;\r\n\tc@mill.example a@MILL.example\n'),
    ).toEqual(['a@mill.example', 'b@mill.example', 'c@mill.example'])
  })

  it('is read as mail programs write it', () => {
    expect(readAddresses('Ada Mill <ada@mill.example>, "Wilf" <wilf@mill.example>')).toEqual([
      'ada@mill.example',
      'wilf@mill.example',
    ])
  })

  it('gives the addresses that were put in, whatever stands between them', () => {
    const address = fc.stringMatching(/^[a-z]{1,8}@[a-z]{1,8}\.example$/)
    const between = fc.constantFrom(',', ';', '\n', ' ', ', ', ' ;\n')
    fc.assert(
      fc.property(fc.uniqueArray(address, { maxLength: 20 }), between, (addresses, separator) => {
        expect(readAddresses(addresses.join(separator))).toEqual(addresses)
      }),
    )
  })

  it('that is empty, too long, or holds something else is refused in words', () => {
    expect(messageOf(' ,\n')).toBe('Write at least one e-mail address.')
    const many = Array.from({ length: TEAM_LIMITS.addresses + 1 }, (_, at) => `p${at}@mill.example`)
    expect(messageOf(many.join('\n'))).toContain(`these are ${many.length}`)
    expect(messageOf('ada@mill.example, wilf')).toContain('“wilf” is no e-mail address')
    expect(messageOf('a b c d')).toContain('“a”, “b”, “c” and others are no e-mail addresses')
    expect(form(many.slice(1).join('\n')).success).toBe(true)
  })
})

describe('a new person’s name', () => {
  it('is one line of visible text', () => {
    const named = (name: string) =>
      joinAsNewPersonSchema.safeParse({ token: 't', name, password: 'p' }).success
    expect(named('Wilf Tansy')).toBe(true)
    expect(named('Ødegård, 村上')).toBe(true)
    for (const name of ['', '  ', 'Wilf\r\nBcc: all', 'x'.repeat(PEOPLE_LIMITS.name + 1)]) {
      expect(named(name), JSON.stringify(name)).toBe(false)
    }
  })
})
