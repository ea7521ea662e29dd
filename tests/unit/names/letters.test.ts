import { describe, expect, it } from 'vitest'

import { decisionLetter, reviewLetter, spellOut, type Decision } from '@/lib/names/letters'

const BRAND = { personName: 'Ada Fell', brandName: 'A brand', brandSlug: 'a-brand' }
const LINE = { name: 'Heronsway DK', slug: 'heronsway-dk' }

const decided = (text: string, values: Partial<Decision> = {}): Decision => ({
  ideaId: `id-of-${text}`,
  text,
  move: 'approve',
  reason: '',
  by: 'Ada Fell',
  ...values,
})
const tell = (...decisions: Decision[]) =>
  decisionLetter(BRAND, { name: 'Wren', line: LINE, decisions })

describe('names in a letter', () => {
  it('are spelt out as far as twelve, and counted beyond', () => {
    expect(spellOut(['Stem the Dyed'])).toBe('“Stem the Dyed”')
    expect(spellOut(['A', 'B', 'C'])).toBe('“A”, “B” and “C”')
    expect(spellOut(Array.from({ length: 40 }, (_, at) => `N${at + 1}`))).toBe(
      `${Array.from({ length: 12 }, (_, at) => `“N${at + 1}”`).join(', ')} and 28 more`,
    )
  })
})

describe('the letter to a reviewer', () => {
  it('says who sent how many, and leads to the review', () => {
    const many = reviewLetter(BRAND, { name: 'Wren', line: LINE, names: ['A', 'B'] })
    expect(many).toMatchObject({
      subject: '2 names to review for Heronsway DK',
      paragraphs: ['Ada Fell has sent 2 names of Heronsway DK (A brand) for review: “A” and “B”.'],
      action: { path: '/a-brand/lines/heronsway-dk/names/review' },
    })
    const one = reviewLetter(BRAND, { name: 'Wren', line: LINE, names: ['A'] })
    expect(one.subject).toBe('One name to review for Heronsway DK')
  })
})

describe('the letter to an author', () => {
  it('names a single decision in its subject, and leads to the name', () => {
    expect(tell(decided('Thyme Will Tell'))).toMatchObject({
      subject: '“Thyme Will Tell” is approved',
      paragraphs: [
        'Your name for Heronsway DK (A brand) was decided on.',
        'Ada Fell approved “Thyme Will Tell”.',
      ],
      action: { path: '/a-brand/lines/heronsway-dk/names/ideas/id-of-Thyme Will Tell' },
    })
  })

  it('says together what one person decided alike, and each reason by itself', () => {
    const { subject, paragraphs, action } = tell(
      decided('A'),
      decided('B', { move: 'return', reason: 'Too near another.' }),
      decided('C'),
      decided('D', { move: 'put-by', by: null }),
      decided('E', { move: 'displace' }),
      decided('F', { move: 'reopen', reason: 'Heard as rude?' }),
    )
    expect(subject).toBe('6 of your names for Heronsway DK were decided on')
    expect(paragraphs.slice(1)).toEqual([
      'Ada Fell approved “A” and “C”.',
      'Somebody who has left put by “D”.',
      'Ada Fell approved another name in the stead of “E”, which is put by now.',
      'Ada Fell returned “B”: Too near another.',
      'Ada Fell opened “F” again, which had been approved: Heard as rude?',
    ])
    expect(action!.path).toBe('/a-brand/lines/heronsway-dk/names/history')
  })

  it('leaves reasons beyond twelve to the history', () => {
    const returned = Array.from({ length: 30 }, (_, at) =>
      decided(`N${at}`, { move: 'return', reason: 'No.' }),
    )
    const { paragraphs } = tell(...returned)
    expect(paragraphs).toHaveLength(1 + 12 + 1)
    expect(paragraphs.at(-1)).toBe('Of 18 more the history tells why.')
  })
})
