import { describe, expect, it, vi } from 'vitest'

import { setLetter } from '@/lib/mail/letter'

vi.mock('@/lib/env', () => ({ env: () => ({ APP_ORIGIN: 'https://woadmap.example' }) }))

const content = {
  kind: 'invitation',
  subject: 'A place at Quern & Co',
  name: 'Marged <Orrelby>',
  paragraphs: ['One.', 'Two & "three".'],
  action: { label: 'Open invitation', path: '/invitations/abc_-1' },
  closing: 'If you do not know them, do nothing.',
}

describe('a letter', () => {
  it('as text says everything, with the address on a line of its own', () => {
    expect(setLetter(content).text).toBe(
      'Hello Marged <Orrelby>,\n\nOne.\n\nTwo & "three".\n\nOpen invitation:\nhttps://woadmap.example/invitations/abc_-1\n\nIf you do not know them, do nothing.\n\nWoadmap\n',
    )
  })

  it('as HTML says the same, and nothing in it is taken for markup', () => {
    const { html } = setLetter(content)
    for (const part of ['Marged &#60;Orrelby&#62;', 'Two &#38; &#34;three&#34;.', 'If you do not'])
      expect(html).toContain(part)
    expect(html).toContain('href="https://woadmap.example/invitations/abc_-1"')
    expect(html).not.toMatch(/<script|onerror|<Orrelby/)
  })

  it.each(['//evil.example', '/\\evil.example', 'https://evil.example/', 'javascript:alert(1)'])(
    'does not lead to %s',
    (path) => {
      const action = { label: 'x', path }
      expect(() => setLetter({ ...content, action })).toThrow(RangeError)
    },
  )
})
