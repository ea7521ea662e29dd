import { render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'

import { PhotographDetailsForm } from '@/components/photographs/photograph-details-form'
import type { PhotographView } from '@/lib/photographs/present'

const refresh = vi.fn()
vi.mock('next/navigation', async (original) => ({
  ...(await original<typeof import('next/navigation')>()),
  useRouter: () => ({ refresh }),
}))
beforeEach(() => refresh.mockClear())

const photograph = {
  id: '6f1d2c1e-5a3b-4c8d-9e7f-0a1b2c3d4e5f',
  version: 3,
  title: 'The tarn',
  photographer: 'A. Fell',
  licence: 'own-work',
  licenceNote: '',
  licenceUrl: '',
  sourceUrl: '',
  altText: '',
  canEdit: true,
} as PhotographView

const titleField = () => screen.getByRole('textbox', { name: 'Title' })
const saveButton = () => screen.getByRole('button', { name: 'Save details' })

describe('the details of a photograph', () => {
  it('are saved with the version they were opened at', async () => {
    const save = vi.fn().mockResolvedValue({ ok: true, data: { version: 4 } })
    const user = userEvent.setup()
    render(<PhotographDetailsForm brand="b" photograph={photograph} save={save} />)
    await user.type(titleField(), ' at noon')
    await user.click(saveButton())
    await waitFor(() => expect(save).toHaveBeenCalled())
    expect(save).toHaveBeenCalledExactlyOnceWith(
      'b',
      expect.objectContaining({ version: 3, title: 'The tarn at noon', licence: 'own-work' }),
    )
  })

  it('say beside the field what a licence asks for, and send nothing', async () => {
    const save = vi.fn()
    const user = userEvent.setup()
    render(<PhotographDetailsForm brand="b" photograph={photograph} save={save} />)
    await user.selectOptions(screen.getByRole('combobox', { name: 'Licence' }), 'permission')
    await user.click(saveButton())
    const note = screen.getByRole('textbox', { name: /Note on the licence/ })
    await waitFor(() => expect(note).toBeInvalid())
    expect(note).toHaveAccessibleDescription(/Say who gave permission/)
    expect(save).not.toHaveBeenCalled()
  })

  it('keep what was typed when the server cannot be reached', async () => {
    const save = vi.fn().mockRejectedValue(new TypeError('fetch failed'))
    const user = userEvent.setup()
    render(<PhotographDetailsForm brand="b" photograph={photograph} save={save} />)
    await user.type(titleField(), '!')
    await user.click(saveButton())
    expect(await screen.findByRole('alert')).toHaveTextContent('could not be reached')
    expect(titleField()).toHaveValue('The tarn!')
  })

  it('show what somebody else saved beside what was typed; mine goes over theirs only where I changed', async () => {
    const conflict = { ok: false, code: 'conflict', message: 'Somebody else saved this first.' }
    const save = vi
      .fn()
      .mockResolvedValueOnce(conflict)
      .mockResolvedValueOnce({ ok: true, data: { version: 5 } })
    const user = userEvent.setup()
    const form = (now: PhotographView) => (
      <PhotographDetailsForm brand="b" photograph={now} save={save} />
    )
    const { rerender } = render(form(photograph))
    await user.type(titleField(), ' at noon')
    await user.click(saveButton())
    await waitFor(() => expect(refresh).toHaveBeenCalled())
    rerender(
      form({ ...photograph, version: 4, title: 'The tarn at dusk', altText: 'Still water.' }),
    )

    const alert = await screen.findByRole('alert')
    expect(alert).toHaveTextContent('Theirs: The tarn at dusk')
    expect(alert).toHaveTextContent('Yours: The tarn at noon')
    expect(alert).toHaveTextContent('Theirs: Still water.')
    expect(titleField()).toHaveValue('The tarn at noon')

    await user.click(screen.getByRole('button', { name: 'Keep mine' }))
    expect(save).toHaveBeenLastCalledWith(
      'b',
      expect.objectContaining({ version: 4, title: 'The tarn at noon', altText: 'Still water.' }),
    )
  })

  it('are taken from the other person on one press', async () => {
    const save = vi.fn().mockResolvedValue({ ok: false, code: 'conflict', message: 'First.' })
    const user = userEvent.setup()
    const { rerender } = render(
      <PhotographDetailsForm brand="b" photograph={photograph} save={save} />,
    )
    await user.type(titleField(), ' at noon')
    const theirs = { ...photograph, version: 4, title: 'The tarn at dusk' }
    rerender(<PhotographDetailsForm brand="b" photograph={theirs} save={save} />)
    await user.click(await screen.findByRole('button', { name: 'Take theirs' }))
    expect(titleField()).toHaveValue('The tarn at dusk')
    expect(screen.queryByRole('alert')).toBeNull()
  })
})
