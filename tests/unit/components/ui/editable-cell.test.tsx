import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'

import { EditableCell } from '@/components/ui/editable-cell'
import type { ActionResult } from '@/lib/errors'

type Save = (typed: string) => Promise<ActionResult<unknown>>

function cell(onSave: Save, options?: { value: string; label: string }[]) {
  render(
    <>
      <EditableCell label="Name of Moss" value="Moss" options={options} onSave={onSave}>
        Moss
      </EditableCell>
      <button type="button">Elsewhere</button>
    </>,
  )
  return userEvent.setup()
}
const button = () => screen.getByRole('button', { name: 'Name of Moss: edit' })
const field = () => screen.getByRole('textbox', { name: 'Name of Moss' })
const saved = () => vi.fn<Save>(() => Promise.resolve({ ok: true, data: null }))
const refused = () =>
  vi.fn<Save>(() =>
    Promise.resolve({
      ok: false,
      code: 'conflict',
      message: 'Somebody else saved first.',
      fieldErrors: { name: ['Now “Fern”.'] },
    }),
  )

describe('a cell that is edited in place', () => {
  it('saves with Enter and gives the focus back', async () => {
    const onSave = saved()
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('Bracken{Enter}')
    expect(onSave.mock.calls).toEqual([['Bracken']])
    await waitFor(() => expect(document.activeElement).toBe(button()))
  })

  it('saves when it is left, and the focus goes where it was taken', async () => {
    const onSave = saved()
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('Bracken')
    await user.click(screen.getByRole('button', { name: 'Elsewhere' }))
    await waitFor(() => expect(button()).toBeDefined())
    expect(onSave).toHaveBeenCalledTimes(1)
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Elsewhere' }))
  })

  it('restores with Escape and saves nothing', async () => {
    const onSave = saved()
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('Bracken{Escape}')
    expect(document.activeElement).toBe(button())
    await user.keyboard('{Enter}')
    expect((field() as HTMLInputElement).value).toBe('Moss')
    expect(onSave).not.toHaveBeenCalled()
  })

  it('saves nothing that is as it was', async () => {
    const onSave = saved()
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('{Enter}')
    expect(button()).toBeDefined()
    expect(onSave).not.toHaveBeenCalled()
  })

  it('keeps what was refused with the reason, does not send it by being left, and sends it again', async () => {
    const onSave = refused()
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('Bracken{Enter}')
    await screen.findByText('Now “Fern”.')
    expect((field() as HTMLInputElement).value).toBe('Bracken')
    expect(field().getAttribute('aria-invalid')).toBe('true')
    await user.click(screen.getByRole('button', { name: 'Elsewhere' }))
    expect(onSave).toHaveBeenCalledTimes(1)
    onSave.mockResolvedValueOnce({ ok: true, data: null })
    await user.click(field())
    await user.keyboard('{Enter}')
    await waitFor(() => expect(button()).toBeDefined())
    expect(onSave).toHaveBeenCalledTimes(2)
  })

  it('is sent once when Enter is pressed twice', async () => {
    let answer: (result: ActionResult<unknown>) => void = () => {}
    const onSave = vi.fn<Save>(() => new Promise((resolve) => (answer = resolve)))
    const user = cell(onSave)
    await user.click(button())
    await user.keyboard('Bracken{Enter}{Enter}')
    answer({ ok: true, data: null })
    await waitFor(() => expect(button()).toBeDefined())
    expect(onSave).toHaveBeenCalledTimes(1)
  })

  it('chooses among options by keyboard', async () => {
    const onSave = saved()
    const user = cell(onSave, [
      { value: 'Moss', label: 'Moss' },
      { value: 'Fern', label: 'Fern' },
    ])
    await user.click(button())
    await user.selectOptions(screen.getByRole('combobox', { name: 'Name of Moss' }), 'Fern')
    expect(onSave).not.toHaveBeenCalled()
    await user.keyboard('{Enter}')
    await waitFor(() => expect(onSave.mock.calls).toEqual([['Fern']]))
  })
})
