import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { SWRConfig } from 'swr'
import { beforeEach, describe, expect, test, vi } from 'vitest'

import { ClashNotes } from '@/components/help/clash-notes'
import { CompletePanel, type CompletePanelProps } from '@/components/help/complete-panel'
import { NeighbourPanel } from '@/components/help/neighbour-panel'
import { screenColor } from '@/lib/color/gamut'
import type { Match, NoMatch } from '@/lib/color/match'
import type { Lab } from '@/lib/color/types'
import type { ShadeView } from '@/lib/shades/present'
import { dyedLine } from '@/scripts/bench/line'

import '../resize-observer'
import { draftWith } from '../combinations/fixtures'

function shade(id: string, lab: Lab): ShadeView {
  const hex = screenColor(lab).hex
  return { id, number: id, name: id, label: id, lab, hex, inGamut: true } as unknown as ShadeView
}

const LINE = [
  shade('Chalk', [92, 0, 4]),
  shade('Fern', [50, -35, 25]),
  shade('Bracken', [51, -33, 26]),
  shade('Madder', [41, 50, 30]),
  shade('Tarn', [22, -5, -20]),
  ...dyedLine(30).map(({ lab }, at) => shade(`Dye ${at}`, lab)),
]

const onComplete = vi.fn<CompletePanelProps['onComplete']>()
const onChoose = vi.fn<(shadeId: string) => void>()

const known = new Map([...LINE, shade('Old Rose', [60, 30, 5])].map((one) => [one.id, one]))
const shadeOf = (id: string | null) => (id === null ? null : (known.get(id) ?? null))
type Draft = ReturnType<typeof draftWith>

const showClashes = ({ places }: Draft) => render(<ClashNotes places={places} shadeOf={shadeOf} />)

const showCompletion = ({ places }: Draft, more: Partial<CompletePanelProps> = {}) =>
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <CompletePanel
        places={places}
        shades={LINE}
        shadeOf={shadeOf}
        photograph={null}
        matchUrl={null}
        onComplete={onComplete}
        {...more}
      />
    </SWRConfig>,
  )

const showNeighbours = (place: number, { places }: Draft) =>
  render(
    <NeighbourPanel
      place={place}
      places={places}
      shades={LINE}
      shadeOf={shadeOf}
      onChoose={onChoose}
    />,
  )

beforeEach(() => {
  onComplete.mockReset()
  onChoose.mockReset()
})

describe('what clashes', () => {
  test('is named before it is shown, with every pair in a table', () => {
    showClashes(draftWith('Chalk', 'Fern', 'Bracken', 'Madder', 'Tarn'))
    const twins = screen.getByText('Near-twins').closest('div')!
    expect(within(twins).getByText('Fern and Bracken')).toBeTruthy()
    const muddy = screen.getByText('Muddy in value').closest('div')!
    expect(within(muddy).getByText('Fern and Madder')).toBeTruthy()
    expect(within(muddy).queryByText('Fern and Bracken')).toBeNull()
    const table = screen.getByRole('table', { name: 'The pairs of the five', hidden: true })
    expect(within(table).getAllByRole('row', { hidden: true })).toHaveLength(11)
    expect(screen.getByText(/let a swatch decide/)).toBeTruthy()
  })

  test('five that get on are said to', () => {
    showClashes(draftWith('Chalk', 'Fern', null, null, 'Tarn'))
    expect(screen.getByText('Nothing clashes')).toBeTruthy()
    expect(screen.getByText('All 3 pairs as a table')).toBeTruthy()
  })

  test('a place alone clashes with nothing yet', () => {
    showClashes(draftWith('Fern', null, null, null, null))
    expect(screen.getByText(/With two shades in place/)).toBeTruthy()
  })
})

describe('completing the five', () => {
  test('fills the empty places by the relation chosen and leaves the filled ones', async () => {
    showCompletion(draftWith('Chalk', null, 'Madder', null, null))
    await userEvent.click(screen.getByRole('radio', { name: /Opposite hues/ }))
    expect(screen.getByText(/on one side of the hue circle/)).toBeTruthy()
    expect(screen.getAllByText('in place')).toHaveLength(2)
    await userEvent.click(screen.getByRole('button', { name: 'Fill 3 empty places' }))
    const [ids, words] = onComplete.mock.lastCall!
    expect(ids).toHaveLength(5)
    expect([ids[0], ids[2]]).toEqual(['Chalk', 'Madder'])
    expect(new Set(ids).size).toBe(5)
    expect(words).toMatch(/^Opposite hues: .* fill the 3 empty places\.$/)
  })

  test('by the photograph asks the match with what is in place locked', async () => {
    const asked: string[] = []
    const place = (shadeId: string, locked = false) => ({
      shadeId,
      share: 0.2,
      presence: 1,
      deltaE: 2,
      inPhotograph: true,
      locked,
    })
    const match: Partial<Match> = {
      kind: 'true',
      places: [
        place('Chalk'),
        place('Fern', true),
        place('Madder'),
        place('Tarn', true),
        place('Dye 3'),
      ],
      certified: true,
      meanDeltaE: 4.2,
    }
    vi.stubGlobal('fetch', (url: string) => {
      asked.push(url)
      return Promise.resolve(Response.json(match))
    })
    showCompletion(draftWith('Fern', null, 'Tarn', null, null), {
      photograph: { title: 'Hillside' },
      matchUrl: '/match',
    })
    await userEvent.click(await screen.findByRole('button', { name: 'Fill 3 empty places' }))
    expect(asked).toEqual(['/match?lock=Fern,Tarn'])
    expect(onComplete.mock.lastCall![0]).toEqual(['Fern', 'Chalk', 'Tarn', 'Madder', 'Dye 3'])
    expect(screen.getByText(/together with what is in place: proved/)).toBeTruthy()
  })

  test('a photograph that gives none says why, and can be asked again', async () => {
    const none: NoMatch = {
      kind: 'true',
      unavailable: 'No five shades of this line go together here.',
    }
    const answers = [Response.json(none), Response.json({ message: 'Too many.' }, { status: 429 })]
    vi.stubGlobal('fetch', () => Promise.resolve(answers.shift()!))
    showCompletion(draftWith(null, null, null, null, null), {
      photograph: { title: 'Hillside' },
      matchUrl: '/match',
    })
    expect(await screen.findByText(none.unavailable)).toBeTruthy()
    await userEvent.click(screen.getByRole('button', { name: 'Match again' }))
    await waitFor(() => expect(screen.getByText('Too many.')).toBeTruthy())
  })

  test.each([
    [draftWith('Chalk', 'Fern', 'Bracken', 'Madder', 'Tarn'), /All five places are filled/],
    [draftWith('gone', null, null, null, null), /What stood in place 1 is gone/],
  ])('says in words why nothing can be filled', (draft, words) => {
    showCompletion(draft)
    expect(screen.getByText(words)).toBeTruthy()
    expect(screen.queryByRole('button', { name: /Fill/ })).toBeNull()
  })

  test('an empty place that is locked stays so', () => {
    const draft = draftWith('Chalk', null, null, null, null)
    draft.places[2]!.locked = true
    showCompletion(draft)
    expect(screen.getByText(/Place 3 is empty and locked/)).toBeTruthy()
  })

  test('a shade that has left the line is kept by a relation, and told of by the photograph', async () => {
    showCompletion(draftWith('Old Rose', null, null, null, null), {
      photograph: { title: 'Hillside' },
      matchUrl: '/match',
    })
    expect(screen.getByText(/Old Rose has left the line/)).toBeTruthy()
    await userEvent.click(screen.getByRole('radio', { name: /One family/ }))
    await userEvent.click(screen.getByRole('button', { name: 'Fill 4 empty places' }))
    expect(onComplete.mock.lastCall![0][0]).toBe('Old Rose')
  })
})

describe('a better neighbour', () => {
  test('says what it would end and bring, and is taken for its place', async () => {
    showNeighbours(1, draftWith('Chalk', 'Fern', 'Bracken', 'Madder', 'Tarn'))
    expect(screen.getByText('The nearest to Fern that are not among the five.')).toBeTruthy()
    expect(screen.getAllByText(/No longer near-twin of Bracken/).length).toBeGreaterThan(0)
    const [take] = screen.getAllByRole('button', { name: /^Take/ })
    await userEvent.click(take!)
    const [id] = onChoose.mock.lastCall!
    expect(['Chalk', 'Fern', 'Bracken', 'Madder', 'Tarn']).not.toContain(id)
  })

  test('a locked place offers, and does not take', () => {
    const draft = draftWith('Chalk', 'Fern', null, null, null)
    draft.places[0]!.locked = true
    showNeighbours(0, draft)
    expect(screen.getByText(/Chalk is locked; unlock it to exchange it/)).toBeTruthy()
    for (const button of screen.getAllByRole<HTMLButtonElement>('button', { name: /^Take/ })) {
      expect(button.disabled).toBe(true)
    }
  })

  test('an empty place has no neighbours', () => {
    showNeighbours(0, draftWith(null, 'Fern', null, null, null))
    expect(screen.getByText(/Place 1 is empty/)).toBeTruthy()
  })
})
