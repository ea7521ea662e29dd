import { act, render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useSyncExternalStore } from 'react'
import { SWRConfig } from 'swr'
import { beforeEach, describe, expect, it, vi } from 'vitest'

import { MatchSheet } from '@/components/match/match-sheet'
import type { Match, NoMatch } from '@/lib/color/match'
import type { PhotographView } from '@/lib/photographs/present'

import '../resize-observer'
import { matchOf, SHADES } from './fixtures'

// As the router does it: the address is the state, and a push of history renders anew.
const listeners = new Set<() => void>()
vi.mock('next/navigation', () => ({
  usePathname: () => '/b/lines/l/photographs/p',
  useSearchParams: () =>
    new URLSearchParams(
      useSyncExternalStore(
        (listener) => {
          listeners.add(listener)
          return () => listeners.delete(listener)
        },
        () => window.location.search,
      ),
    ),
}))
const pushState = window.history.pushState.bind(window.history)
window.history.pushState = (...all) => {
  pushState(...all)
  listeners.forEach((listener) => listener())
}
window.addEventListener('popstate', () => act(() => listeners.forEach((listener) => listener())))

const PHOTOGRAPH = {
  id: 'p',
  title: 'Hill',
  altText: 'A hill',
  width: 3,
  height: 2,
  sources: { avif: [], webp: [] },
  fallbackSrc: '/hill.webp',
} as unknown as PhotographView

let asked: string[]
let answer: () => Response | Promise<Response>
const json = (body: unknown, status = 200) => Response.json(body, { status })

beforeEach(() => {
  window.history.replaceState(null, '', '/b/lines/l/photographs/p')
  asked = []
  answer = () => json(matchOf('BCDEF', 'B'))
  vi.stubGlobal('fetch', (url: string) => {
    // Pointing at a row asks for the cells too; there is no canvas here to draw them on.
    if (!url.includes('/match?')) return new Promise(() => {})
    asked.push(url)
    return Promise.resolve().then(answer)
  })
})

function show({
  matches = [matchOf('ABCDE')] as (Match | NoMatch)[],
  keep = vi.fn(),
}: { matches?: (Match | NoMatch)[]; keep?: ReturnType<typeof vi.fn> | undefined } = {}) {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <MatchSheet
        brand="b"
        lineSlug="l"
        photograph={PHOTOGRAPH}
        shades={SHADES}
        matches={matches}
        striking={[{ lab: [41, 0, 0], hex: '#626262' }]}
        {...(keep && { keep: keep as never })}
        head={null}
        foot={null}
      />
    </SWRConfig>,
  )
  return userEvent.setup()
}

const five = () =>
  within(screen.getByRole('list', { name: 'The five shades' }))
    .getAllByRole('listitem')
    .map((row) => row.querySelector('p')!.textContent)
    .join('')
const press = (user: ReturnType<typeof userEvent.setup>, name: string | RegExp) =>
  user.click(screen.getByRole('button', { name }))

describe('the match page', () => {
  it('shows the stored match without asking when nothing is wished', () => {
    show()
    expect(five()).toBe('ABCDE')
    expect(asked).toEqual([])
  })

  it('asks anew for a locked shade, with the wish in the address, and says the new five', async () => {
    const user = show()
    await press(user, 'Lock B')
    expect(window.location.search).toBe(`?lock=${SHADES[1]!.id}`)
    await waitFor(() => expect(five()).toBe('BCDEF'))
    expect(asked).toEqual([`/api/brands/b/photographs/p/match?lock=${SHADES[1]!.id}`])
    expect(screen.getByText('Five shades: B, C, D, E, F')).toHaveAttribute('role', 'status')
    expect(screen.getByRole('button', { name: 'Unlock B' })).toBeVisible()
  })

  it('swaps a shade for a neighbour: that one locked, this one left out, the focus where it was', async () => {
    const user = show()
    await press(user, 'Swap E')
    await press(user, 'Take F')
    expect(Object.fromEntries(new URLSearchParams(window.location.search))).toEqual({
      lock: SHADES[5]!.id,
      exclude: SHADES[4]!.id,
    })
    await waitFor(() => expect(five()).toBe('BCDEF'))
    expect(screen.getByRole('button', { name: 'Swap F' })).toHaveFocus()
    expect(screen.getByRole('button', { name: 'Allow E again' })).toBeVisible()
  })

  it('undoes the last wish, also after going back in the browser', async () => {
    const user = show()
    await press(user, 'Lock A')
    await press(user, 'Exclude D')
    window.history.back()
    await waitFor(() => expect(window.location.search).toBe(`?lock=${SHADES[0]!.id}`))
    await user.click(screen.getByRole('radio', { name: 'Quiet' }))
    await press(user, 'Undo last wish')
    expect(window.location.search).toBe('?reading=quiet')
    expect(window.location.pathname).toBe('/b/lines/l/photographs/p')
    expect(screen.queryByRole('button', { name: 'Undo last wish' })).toBeNull()
  })

  it('keeps the match of before when there is no answer, and asks again when told', async () => {
    answer = () => Promise.reject(new TypeError('Failed to fetch'))
    const user = show()
    await press(user, 'Lock B')
    expect(await screen.findByRole('alert')).toHaveTextContent('could not be reached')
    expect(five()).toBe('ABCDE')
    answer = () => json(matchOf('BCDEF', 'B'))
    await press(user, 'Match again')
    await waitFor(() => expect(five()).toBe('BCDEF'))
    expect(screen.queryByRole('alert')).toBeNull()
  })

  it('says the server’s words for wishes that contradict themselves, and clears them', async () => {
    answer = () => json({ ok: false, code: 'invalid', message: 'Not both.' }, 422)
    const user = show()
    await press(user, 'Lock B')
    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent('Not both.')
    await user.click(within(alert).getByRole('button', { name: 'Clear wishes' }))
    expect(window.location.search).toBe('')
    expect(screen.queryByRole('alert')).toBeNull()
  })

  it('does not show one reading’s five under another’s name', async () => {
    const unavailable = 'The photograph is all but grey.'
    const user = show({ matches: [matchOf('ABCDE'), { kind: 'family', unavailable }] })
    await press(user, 'Lock B')
    await waitFor(() => expect(five()).toBe('BCDEF'))
    answer = () => new Promise(() => {})
    await user.click(screen.getByRole('radio', { name: /One family/ }))
    expect(screen.queryByRole('list', { name: 'The five shades' })).toBeNull()
  })

  it('says on its tab and in words when a reading gives none', async () => {
    const unavailable = 'The photograph is all but grey.'
    const user = show({ matches: [matchOf('ABCDE'), { kind: 'family', unavailable }] })
    await user.click(screen.getByRole('radio', { name: 'One family none here' }))
    expect(screen.getAllByText(unavailable).length).toBeGreaterThan(0)
    expect(screen.queryByRole('button', { name: 'Keep combination' })).toBeNull()
  })

  it('locks the shade nearest to a striking colour', async () => {
    const user = show()
    await press(user, /^F ΔE00/)
    expect(window.location.search).toBe(`?lock=${SHADES[5]!.id}`)
  })

  it('does not show four: a stored match that lost a shade says so', () => {
    const four = matchOf('ABCDE')
    four.places[2]!.shadeId = 'gone'
    show({ matches: [four] })
    expect(screen.getByText('One of the five has left the line')).toBeVisible()
    expect(screen.queryByRole('list', { name: 'The five shades' })).toBeNull()
  })

  it('has no button to keep for those who may not', () => {
    render(
      <MatchSheet
        brand="b"
        lineSlug="l"
        photograph={PHOTOGRAPH}
        shades={SHADES}
        matches={[matchOf('ABCDE')]}
        striking={[]}
        head={null}
        foot={null}
      />,
    )
    expect(five()).toBe('ABCDE')
    expect(screen.queryByRole('button', { name: 'Keep combination' })).toBeNull()
  })

  it('keeps with one key however often it is sent, and keeps the title after a failure', async () => {
    const keep = vi.fn().mockResolvedValue({ ok: false, code: 'unavailable', message: 'Not now.' })
    const user = show({ keep })
    await press(user, 'Keep combination')
    const dialog = screen.getByRole('dialog', { name: 'Keep these five' })
    const title = within(dialog).getByRole('textbox', { name: /Title/ })
    expect(title).toHaveValue('Hill, in five')
    await user.clear(title)
    await user.type(title, 'Mine')
    const send = within(dialog).getByRole('button', { name: 'Keep combination' })
    await user.click(send)
    expect(await within(dialog).findByRole('alert')).toHaveTextContent('Not now.')
    await user.click(send)
    await waitFor(() => expect(keep).toHaveBeenCalledTimes(2))
    const [first, second] = keep.mock.calls.map(([, values]) => values)
    expect(second).toEqual(first)
    expect(first).toMatchObject({
      title: 'Mine',
      lineSlug: 'l',
      photographId: 'p',
      reading: 'true',
    })
    expect(first.places.map(({ shadeId }: { shadeId: string }) => shadeId)).toEqual(
      SHADES.slice(0, 5).map(({ id }) => id),
    )
  })
})
