import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'

import { CombinationTitle } from '@/components/combinations/combination-title'
import { FivePlaces } from '@/components/combinations/five-places'
import type { CombinationView, PlaceView } from '@/lib/combinations/present'

import '../resize-observer'

const refresh = vi.fn()
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }))
beforeEach(() => refresh.mockClear())

const CONFLICT = {
  ok: false,
  code: 'conflict',
  message: 'Somebody else saved this first.',
} as const

const place = (name: string, at: number): PlaceView =>
  ({
    place: at + 1,
    share: 0.2,
    gone: name === 'Fern',
    shade: { id: name, number: String(at), name, label: name, hex: '#456' },
  }) as PlaceView

const combination = {
  id: 'c',
  title: 'Low sun',
  version: 3,
  canReorder: true,
  places: ['Ash', 'Bark', 'Clay', 'Dusk', 'Fern'].map(place),
} as CombinationView

describe('the title of a combination', () => {
  it('is saved with the version it was opened at, and gives the keyboard back', async () => {
    const rename = vi.fn().mockResolvedValue({ ok: true, data: {} })
    const user = userEvent.setup()
    render(<CombinationTitle brand="b" combination={combination} rename={rename} />)
    await user.click(screen.getByRole('button', { name: 'Rename combination' }))
    await user.clear(screen.getByRole('textbox', { name: 'Title' }))
    await user.keyboard('High bracken{Enter}')
    expect(rename).toHaveBeenCalledExactlyOnceWith('b', {
      combinationId: 'c',
      version: 3,
      title: 'High bracken',
    })
    expect(await screen.findByRole('button', { name: 'Rename combination' })).toHaveFocus()
  })

  it('stays as it was on Escape', async () => {
    const rename = vi.fn()
    const user = userEvent.setup()
    render(<CombinationTitle brand="b" combination={combination} rename={rename} />)
    await user.click(screen.getByRole('button', { name: 'Rename combination' }))
    await user.keyboard('x{Escape}')
    expect(screen.queryByRole('textbox')).toBeNull()
    expect(rename).not.toHaveBeenCalled()
  })

  it('keeps what was typed beside theirs after a conflict, and can be saved over it', async () => {
    const rename = vi.fn().mockResolvedValueOnce(CONFLICT).mockResolvedValue({ ok: true, data: {} })
    const user = userEvent.setup()
    const show = (now: Partial<CombinationView>) => (
      <CombinationTitle brand="b" combination={{ ...combination, ...now }} rename={rename} />
    )
    const { rerender } = render(show({}))
    await user.click(screen.getByRole('button', { name: 'Rename combination' }))
    await user.keyboard(' again{Enter}')
    expect(await screen.findByText(CONFLICT.message)).toBeVisible()
    expect(refresh).toHaveBeenCalledOnce()
    rerender(show({ title: 'Theirs', version: 4 }))
    expect(screen.getByText('It is now called “Theirs”.')).toBeVisible()
    expect(screen.getByRole('textbox')).toHaveValue('Low sun again')
    await user.click(screen.getByRole('button', { name: 'Save title' }))
    expect(rename).toHaveBeenLastCalledWith('b', {
      combinationId: 'c',
      version: 4,
      title: 'Low sun again',
    })
  })
})

describe('the five of a combination', () => {
  const rows = () => screen.getAllByRole('listitem').map((row) => row.textContent)

  it('stand with their part in a pattern; one that left the line says so', () => {
    render(<FivePlaces brand="b" combination={combination} reorder={vi.fn()} />)
    expect(rows()[0]).toContain('MC')
    expect(rows()[4]).toContain('CC4')
    expect(rows()[4]).toContain('no longer in the line')
    expect(rows()[0]).not.toContain('no longer')
  })

  it('cannot be put in another order by those who may not', () => {
    render(
      <FivePlaces
        brand="b"
        combination={{ ...combination, canReorder: false }}
        reorder={vi.fn()}
      />,
    )
    expect(screen.queryByRole('button')).toBeNull()
  })

  async function moveBarkUp(reorder: ReturnType<typeof vi.fn>) {
    const user = userEvent.setup()
    const show = (now: Partial<CombinationView>) => (
      <FivePlaces brand="b" combination={{ ...combination, ...now }} reorder={reorder as never} />
    )
    const { rerender } = render(show({}))
    await user.click(screen.getByRole('button', { name: 'Change order' }))
    expect(await screen.findByRole('button', { name: 'Save order' })).toBeDisabled()
    await user.click(await screen.findByRole('button', { name: 'Move Bark up' }))
    expect(rows()[0]).toContain('Bark')
    await user.click(screen.getByRole('button', { name: 'Save order' }))
    return { user, renew: (now: Partial<CombinationView>) => rerender(show(now)) }
  }

  it('are saved in the new order', async () => {
    const reorder = vi.fn().mockResolvedValue({ ok: true, data: { version: 4 } })
    await moveBarkUp(reorder)
    expect(reorder).toHaveBeenCalledExactlyOnceWith('b', {
      combinationId: 'c',
      version: 3,
      shadeIds: ['Bark', 'Ash', 'Clay', 'Dusk', 'Fern'],
    })
    // Until the page is there anew the order saved stays, and the keyboard is where it began.
    expect(await screen.findByRole('button', { name: 'Change order' })).toHaveFocus()
    expect(rows()[0]).toContain('Bark')
  })

  it('say what to do when somebody saved first', async () => {
    const { user, renew } = await moveBarkUp(vi.fn().mockResolvedValue(CONFLICT))
    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent('Your order is not saved')
    await user.click(within(alert).getByRole('button', { name: 'Show theirs' }))
    expect(refresh).toHaveBeenCalledOnce()
    renew({ version: 4, places: ['Fern', 'Ash', 'Bark', 'Clay', 'Dusk'].map(place) })
    expect(rows()[0]).toContain('Fern')
    expect(screen.queryByRole('alert')).toBeNull()
  })
})
