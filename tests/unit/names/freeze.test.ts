import { describe, expect, it } from 'vitest'

import { isFrozen } from '@/lib/names/freeze'

const at = (moment: string) => new Date(moment)
const EVE = at('2027-02-28T23:59:59.999Z')
const DAY = at('2027-03-01T00:00:00Z')

describe('the names of a line', () => {
  it('are open while nobody has set a day', () => {
    expect(isFrozen(null)).toBe(false)
    expect(isFrozen({ frozenAt: null, printOn: null }, DAY)).toBe(false)
  })

  it('are locked from the first moment of the label printer’s day, by UTC, and ever after', () => {
    const settings = { frozenAt: null, printOn: '2027-03-01' }
    expect(isFrozen(settings, EVE)).toBe(false)
    expect(isFrozen(settings, DAY)).toBe(true)
    expect(isFrozen(settings, at('2031-01-01T00:00:00Z'))).toBe(true)
  })

  it('are locked once an owner has locked them, whatever the day', () => {
    expect(isFrozen({ frozenAt: EVE, printOn: '2027-03-01' }, EVE)).toBe(true)
    expect(isFrozen({ frozenAt: EVE, printOn: null }, EVE)).toBe(true)
  })
})
