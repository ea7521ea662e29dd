import { render, screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'

import { LabelPicture } from '@/components/names/label-picture'
import { labelFont } from '@/lib/names/label-font'
import { DEFAULT_LABEL, setOnLabel, type LabelSetting } from '@/lib/naming/label'

function draw(text: string, setting: LabelSetting = DEFAULT_LABEL, care = '') {
  const set = setOnLabel(text, labelFont(), setting)
  render(<LabelPicture set={set} setting={setting} number="14" fibre="100 % wool" care={care} />)
  return { set, picture: screen.getByRole('img') }
}

describe('the picture of a ball band', () => {
  it('sets each line of the name as wide as it was measured', () => {
    const { set, picture } = draw('Olive and Let Live on the Fellside')
    expect(set.lines).toHaveLength(2)
    for (const { text, width } of set.lines) {
      const line = [...picture.querySelectorAll('text')].find((it) => it.textContent === text)
      expect(Number(line?.getAttribute('textLength'))).toBeCloseTo(width, 6)
      expect(parseFloat(line!.style.fontSize)).toBeCloseTo((15 * 25.4) / 72, 6)
    }
  })

  it('is as many millimetres large as its drawing is units', () => {
    const { picture } = draw('Thyme Will Tell')
    const [, , wide, high] = picture.getAttribute('viewBox')!.split(' ').map(Number)
    expect(picture).toHaveAttribute('width', `${wide}mm`)
    expect(picture).toHaveAttribute('height', `${high}mm`)
  })

  it('leaves room for all of a name that is too wide, and says by how much', () => {
    const { set, picture } = draw('Extraordinarily Incomprehensible Heather', {
      ...DEFAULT_LABEL,
      lines: 1,
    })
    expect(set.over).toBeGreaterThan(8)
    const [left, , wide] = picture.getAttribute('viewBox')!.split(' ').map(Number)
    const middle = DEFAULT_LABEL.width / 2
    expect(left).toBeLessThanOrEqual(middle - set.lines[0]!.width / 2)
    expect(left! + wide!).toBeGreaterThanOrEqual(middle + set.lines[0]!.width / 2)
    expect(picture).toHaveAccessibleName(expect.stringMatching(/ \d+(\.\d)? mm too wide/))
  })

  it('breaks a long care label into lines of the band', () => {
    const care =
      'Hand wash cool, no softener. Press out in a towel and dry flat, away from the sun.'
    const { picture } = draw('Thyme Will Tell', DEFAULT_LABEL, care)
    const told = [...picture.querySelectorAll('text')].map((it) => it.textContent)
    expect(told).not.toContain(care)
    expect(told.join(' ')).toContain(care)
  })
})
