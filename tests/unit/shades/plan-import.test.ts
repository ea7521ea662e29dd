import { describe, expect, it } from 'vitest'

import { guessMapping, readRows } from '@/lib/shades/csv'
import { parseSheet } from '@/lib/shades/csv-text'
import { countPlan, planImport } from '@/lib/shades/plan-import'
import type { ShadeRow } from '@/lib/shades/present'

const shade = (values: Partial<ShadeRow>): ShadeRow => ({
  id: 'one',
  number: 'Q1',
  name: 'Moss',
  labL: 54.2,
  labA: -12,
  labB: 8.1,
  illuminant: 'D65',
  observer: 10,
  hex: null,
  status: 'approved',
  position: 4,
  familyId: null,
  familyPinned: false,
  familyPosition: null,
  version: 3,
  ...values,
})

function plan(text: string, existing: ShadeRow[], texts: Record<string, string[]> = {}) {
  const sheet = parseSheet(text)
  const ideas = new Map(Object.entries(texts).map(([id, each]) => [id, new Set(each)]))
  return planImport(readRows(sheet, guessMapping(sheet.header), 'D65/10'), existing, ideas)
}

describe('an import', () => {
  it('leaves as it is what the file does not say', () => {
    const [row] = plan('number,status\nQ1,dipped\n', [shade({})])
    expect(row).toMatchObject({
      outcome: 'changed',
      fields: ['status'],
      draft: null,
      shade: { status: 'dipped', labL: 54.2, observer: 10, position: 4 },
    })
  })

  it('takes an empty name and an empty status for no word about them', () => {
    expect(plan('number,name,status\nQ1,,\n', [shade({})])).toMatchObject([
      { outcome: 'unchanged' },
    ])
  })

  it('makes a draft of a name, for a new shade and for one that is there', () => {
    const rows = plan('number,name,hex\nQ2,Bracken,#123456\n', [shade({})])
    expect(rows).toMatchObject([{ outcome: 'new', shade: { number: 'Q2' }, draft: 'Bracken' }])
    expect(plan('number,name\nQ1,Fern\n', [shade({})])).toMatchObject([
      { outcome: 'changed', fields: [], draft: 'Fern' },
    ])
  })

  it('makes none of the name that the shade has, nor of an idea that lies on it already', () => {
    const two = [shade({}), shade({ id: 'two', number: 'Q2', name: null })]
    const rows = plan('number,name\nQ1,Moss\nQ2,Fern\n', two, { two: ['Bracken', 'Fern'] })
    expect(countPlan(rows)).toEqual({ new: 0, changed: 0, unchanged: 2, bad: 0 })
    const other = plan('number,name\nQ1,Fern\n', two, { two: ['Fern'] })
    expect(other).toMatchObject([{ outcome: 'changed', draft: 'Fern' }])
  })

  it('finds a shade by its number in any case, and takes the new writing', () => {
    const [row] = plan('number,name\nq1,Moss\n', [shade({})])
    expect(row).toMatchObject({ outcome: 'changed', fields: ['number'], shade: { number: 'q1' } })
  })

  it('sees a change of observer as a change of colour', () => {
    const [row] = plan('number,L,a,b,observer\nQ1,54.2,-12,8.1,2\n', [shade({})])
    expect(row).toMatchObject({ outcome: 'changed', fields: ['color'], shade: { observer: 2 } })
  })

  it('replaces an entered hex by a reading of the same colour', () => {
    const [row] = plan('number,L,a,b,observer\nQ1,54.2,-12,8.1,2\n', [
      shade({ hex: '#5f8a73', observer: 2 }),
    ])
    expect(row).toMatchObject({ outcome: 'changed', fields: ['color'], shade: { hex: null } })
  })

  it('puts new shades last in the order of the file, as targets', () => {
    const rows = plan('number,hex,order\nQ2,#111111,\nQ3,#222222,90\nQ4,#333333,\n', [shade({})])
    expect(
      rows.map((row) => row.outcome === 'new' && [row.shade.position, row.shade.status]),
    ).toEqual([
      [5, 'target'],
      [89, 'target'],
      [90, 'target'],
    ])
  })

  it('has no new shade without a colour', () => {
    const rows = plan('number,name\nQ1,Moss\nQ2,Fern\n', [shade({})])
    expect(countPlan(rows)).toEqual({ new: 0, changed: 0, unchanged: 1, bad: 1 })
    expect(rows[1]?.row.errors[0]?.message).toMatch(/needs a colour/)
  })
})
