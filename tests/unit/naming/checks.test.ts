import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { hexToLab } from '@/lib/color/srgb'
import { checkColor, isCalled } from '@/lib/naming/check-color'
import { checkFiber } from '@/lib/naming/check-fiber'
import { checkLabel } from '@/lib/naming/check-label'
import { checkLine, type NamedShade } from '@/lib/naming/check-line'
import { checkSame, lettersApart } from '@/lib/naming/check-same'
import { checkSound } from '@/lib/naming/check-sound'
import { checkWording } from '@/lib/naming/check-wording'
import { DEFAULT_LABEL, lineWidth, setOnLabel, type FontMetrics } from '@/lib/naming/label'
import { sourceOf } from '@/lib/naming/source-of'
import { proposeCodes } from '@/lib/naming/stock-codes'

const other = (name: string) => [{ name, where: 'shade 14' }]

describe('same or near', () => {
  test.each([
    ['Woad Works Ahead', 'woad works, ahead!'],
    ['Thé Vert', 'The Vert'],
    ['Egg and Spoon', 'Egg & Spoon'],
    ['Lamb’s Ear', 'Lambs Ear'],
  ])('“%s” is the same as “%s”', (one, two) => {
    expect(checkSame(one, other(two))[0]?.sure).toBe('certain')
  })

  test('a slip of letters is likely a mistake, a shared half only a note', () => {
    expect(checkSame('Fern Intentions', other('Firm Intentions'))[0]?.sure).toBe('likely')
    expect(checkSame('Dark Peat', other('Peat by Day'))[0]).toMatchObject({
      grade: 'note',
      sure: 'perhaps',
    })
    expect(checkSame('Peat After Dark', other('Gorse, Naturally'))).toEqual([])
  })

  test('two letters swapped are one slip', () => {
    expect(lettersApart('form', 'from')).toBe(1)
    expect(lettersApart('kitten', 'sitting')).toBe(3)
    expect(lettersApart('abc', 'xyzuvw', 2)).toBe(3)
  })

  test('counting up to a limit agrees with counting all', () => {
    const word = fc.stringMatching(/^[ab]{0,7}$/)
    fc.assert(
      fc.property(word, word, fc.integer({ min: 0, max: 4 }), (one, two, most) => {
        const all = lettersApart(one, two)
        expect(all).toBe(lettersApart(two, one))
        expect(lettersApart(one, two, most) > most).toBe(all > most)
      }),
    )
  })

  test('a name without letters finds nothing', () => {
    expect(checkSame('…', other('…'))).toEqual([])
    expect(checkSound('…', other('Plain Ewe'))).toEqual([])
  })
})

describe('sounds like', () => {
  test('says what both are heard as', () => {
    const [finding] = checkSound('After Yew', other('After You'))
    expect(finding).toMatchObject({ sure: 'certain', grade: 'warning' })
    expect(finding!.why).toContain('AF-tur yoo')
  })

  test('a guessed word is never certain', () => {
    expect(checkSound('Zblorf', other('Zblorff'))[0]?.sure).toBe('perhaps')
  })

  test('names that are the same in letters are left to the other check', () => {
    expect(checkSound('Plain Ewe', other('plain ewe'))).toEqual([])
  })
})

describe('suggests another colour', () => {
  const MOSS = hexToLab('#6f7f36')
  test('warns of a far colour, never of a near one or of a name without colours', () => {
    expect(checkColor('Cherry Ripe', MOSS)[0]).toMatchObject({ check: 'color', grade: 'warning' })
    expect(checkColor('Moss Likely', MOSS)).toEqual([])
    expect(checkColor('Hip Hip Hooray Then', hexToLab('#c23b25'))).toEqual([])
    expect(checkColor('Nearly There', MOSS)).toEqual([])
  })

  test('a plain term that is near is not far for being outside its region', () => {
    expect(checkColor('White Night', hexToLab('#e6e0cf'))).toEqual([])
  })

  test('one colour word that suits is enough', () => {
    expect(checkColor('Moss and Cherry', MOSS)).toEqual([])
  })

  test('a plain term holds in its whole region', () => {
    expect(isCalled('blue', hexToLab('#bcd8f0'))).toBe(true)
    expect(isCalled('blue', hexToLab('#10204a'))).toBe(true)
    expect(isCalled('blue', hexToLab('#c8242c'))).toBe(false)
    expect(isCalled('woad', hexToLab('#43648f'))).toBeNull()
    expect(checkColor('Pale Blue Morning', hexToLab('#bcd8f0'))).toEqual([])
  })
})

describe('implies a fibre that is absent', () => {
  test.each([
    ['Silk Purse', 'silk', 'certain'],
    ['Kashmir Blue', 'cashmere', 'certain'],
    ['Cashmear Cloud', 'cashmere', 'perhaps'],
    ['Cash Mere', 'cashmere', 'perhaps'],
    ['Mink Tuesday', 'mink', 'perhaps'],
    ['Linen Basket', 'fibre', 'certain'],
    ['Alpacka Lunch', 'alpaca', 'perhaps'],
  ])('“%s” is a caution', (name, what, sure) => {
    const [finding] = checkFiber(name, ['wool'])
    expect(finding!.what).toContain(what)
    expect(finding!.sure).toBe(sure)
    expect(finding!.why).toMatch(/16 CFR (303\.18|300\.24|303\.9).*counsel/)
  })

  test.each(['Woolly Thoughts', 'Milk and Honey', 'Sheep Thrills', 'Poppies Got In', 'Well Met'])(
    '“%s” is none in wool',
    (name) => expect(checkFiber(name, ['wool'])).toEqual([]),
  )

  test('a fibre the yarn holds may be named', () => {
    expect(checkFiber('Silk Purse', ['wool', 'silk'])).toEqual([])
    expect(checkFiber('Woolly Thoughts', ['merino'])).toEqual([])
    expect(checkFiber('Woolly Thoughts', ['cotton'])).not.toEqual([])
  })
})

describe('wording', () => {
  test.each(['Moth Wing', 'Gypsy Red', 'Nude Awakening', 'Sh1t Happens', 'Faded Glory'])(
    '“%s” is warned of, with a reason',
    (name) => {
      const [finding] = checkWording(name)
      expect(finding!.grade).toBe('warning')
      expect(finding!.why.length).toBeGreaterThan(10)
    },
  )

  test.each(['Black Sheep', 'Prickly Aunt', 'Crack of Dawn', 'Stem the Dyed'])(
    '“%s” is let be',
    (name) => expect(checkWording(name)).toEqual([]),
  )
})

describe('across the line', () => {
  const shades = (...names: string[]): NamedShade[] =>
    names.map((name, at) => ({ id: `s${at}`, number: `${at + 1}`, name, family: 'blues' }))

  test('finds words that come back, initials that collide, and neighbours that are alike', () => {
    const { findings, codes } = checkLine(
      shades('Woad Rage', 'Woad Works', 'Woad of Mouth', 'Plum Job', 'Pale Jade', 'Fern Gully'),
    )
    const whats = findings.map(({ what }) => what).join('\n')
    expect(whats).toContain('“woad” stands in 3 names')
    expect(whats).toContain('initials PJ')
    expect(whats).toContain('share “woad”')
    expect(new Set(Object.values(codes)).size).toBe(6)
  })

  test('knows a pun by its saying, and says when two share one', () => {
    expect(sourceOf('Middle of the Woad')?.source).toBe('middle of the road')
    expect(sourceOf('Plain Ewe')).toBeNull()
    expect(sourceOf('Middle of the Road')).toBeNull()
    const { wordplay, findings } = checkLine(shades('Stem the Dyed', 'Stem the Tied', 'Plain Ewe'))
    expect(wordplay.share).toBeCloseTo(2 / 3)
    expect(findings.some(({ what }) => what.includes('the same saying'))).toBe(true)
  })

  test('a line without names has nothing to find', () => {
    expect(checkLine([])).toMatchObject({ findings: [], lengths: null, codes: {} })
  })

  test('codes are never alike, and start from the initials', () => {
    expect(proposeCodes(['Plum Job', 'Pale Jade', 'Peat Jug'])[0]).toBe('PJ')
    fc.assert(
      fc.property(fc.array(fc.stringMatching(/^[A-Za-z ]{0,9}$/), { maxLength: 60 }), (names) => {
        const codes = proposeCodes(names, ['PJ'])
        expect(new Set([...codes, 'PJ']).size).toBe(names.length + 1)
      }),
    )
  })
})

describe('the label', () => {
  /** A font in which every letter is half an em wide. */
  const FONT: FontMetrics = {
    unitsPerEm: 1000,
    advance: (letter) => (letter === '☃' ? null : 500),
    kerning: (left, right) => (left + right === 'AV' ? -100 : 0),
  }

  test('width is advances and kerning times the size, in mm', () => {
    expect(lineWidth('AB', FONT, 72)).toBeCloseTo(25.4)
    expect(lineWidth('AV', FONT, 72)).toBeCloseTo(0.9 * 25.4)
  })

  test('a short name takes one line, a long one two, broken between words', () => {
    const setting = { width: 30, size: 12, lines: 2 as const }
    expect(setOnLabel('Plum', FONT, setting).lines).toHaveLength(1)
    const { lines, fits } = setOnLabel('Soaked to the Skein', FONT, setting)
    expect(lines.map(({ text }) => text)).toEqual(['Soaked to', 'the Skein'])
    expect(fits).toBe(true)
  })

  test('words are never broken: what is too long is said in mm', () => {
    const { lines, over } = setOnLabel('Antidisestablishmentarianism', FONT, {
      ...DEFAULT_LABEL,
      width: 20,
    })
    expect(lines).toHaveLength(1)
    expect(over).toBeCloseTo(lines[0]!.width - 20)
  })

  test('the words of a name are all set, in order, whatever the setting', () => {
    fc.assert(
      fc.property(
        fc.array(fc.stringMatching(/^[a-z]{1,9}$/), { minLength: 1, maxLength: 7 }),
        fc.integer({ min: 5, max: 90 }),
        (words, width) => {
          const { lines } = setOnLabel(words.join(' '), FONT, { width, size: 12, lines: 2 })
          expect(lines.map(({ text }) => text).join(' ')).toBe(words.join(' '))
          expect(lines.length).toBeLessThanOrEqual(2)
        },
      ),
    )
  })

  test('a letter that the font lacks is named', () => {
    expect(checkLabel('Snow ☃', FONT, DEFAULT_LABEL)[0]?.what).toContain('☃')
  })

  test('a band of no width is refused', () => {
    expect(() => setOnLabel('Plum', FONT, { ...DEFAULT_LABEL, width: 0 })).toThrow(RangeError)
  })
})
