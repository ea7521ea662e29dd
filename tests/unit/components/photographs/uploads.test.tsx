import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'

import {
  uploadFile,
  type UploadJob,
  type UploadOutcome,
} from '@/components/photographs/upload-file'
import { UploadPhotographs } from '@/components/photographs/upload-photographs'

const refresh = vi.fn()
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }))
vi.mock('@/components/photographs/upload-file')

/** The uploads under way: each is ended by the test. */
let underWay: { job: UploadJob; end: (outcome: UploadOutcome) => void }[]

beforeEach(() => {
  refresh.mockClear()
  underWay = []
  vi.mocked(uploadFile).mockImplementation(
    (job) =>
      new Promise((resolve) => {
        underWay.push({ job, end: resolve })
        job.onStep('sending')
        job.signal.addEventListener('abort', () => resolve({ kind: 'cancelled' }))
      }),
  )
})

const picture = (name: string) => new File(['x'], name, { type: 'image/jpeg' })
const rowOf = (name: string) =>
  within(screen.getAllByText(name, { exact: false })[0]!.closest('li')!)
const names = () => underWay.map(({ job }) => job.file.name)

async function addFiles(...files: string[]) {
  const user = userEvent.setup()
  render(
    <UploadPhotographs brand="b" lineSlug="l">
      The sheet
    </UploadPhotographs>,
  )
  await user.upload(screen.getByLabelText('Photographs from files'), files.map(picture))
  return user
}

describe('adding photographs', () => {
  it('sends three at once, and the next when one has ended', async () => {
    await addFiles('1.jpg', '2.jpg', '3.jpg', '4.jpg', '5.jpg')
    expect(names()).toEqual(['1.jpg', '2.jpg', '3.jpg'])
    expect(rowOf('4.jpg').getByText(/Waits its turn/)).toBeVisible()
    underWay[1]!.end({ kind: 'added', photographId: 'p2' })
    await waitFor(() => expect(names()).toEqual(['1.jpg', '2.jpg', '3.jpg', '4.jpg']))
    expect(refresh).toHaveBeenCalledOnce()
  })

  it('shows how much of a file was sent', async () => {
    await addFiles('1.jpg')
    underWay[0]!.job.onProgress(0.42)
    await waitFor(() =>
      expect(screen.getByRole('progressbar')).toHaveAttribute('aria-valuenow', '42'),
    )
  })

  it('cancels one and leaves the others alone', async () => {
    const user = await addFiles('1.jpg', '2.jpg')
    await user.click(screen.getByRole('button', { name: 'Cancel 1.jpg' }))
    expect(await rowOf('1.jpg').findByText('Cancelled')).toBeVisible()
    expect(underWay[1]!.job.signal.aborted).toBe(false)
  })

  it('keeps a file that failed in the list and tries it again on request', async () => {
    const user = await addFiles('1.jpg')
    underWay[0]!.end({ kind: 'failed', message: 'The picture store did not answer.' })
    expect(await screen.findByText('The picture store did not answer.')).toBeVisible()
    await user.click(screen.getByRole('button', { name: 'Retry 1.jpg' }))
    await waitFor(() => expect(names()).toEqual(['1.jpg', '1.jpg']))
  })

  it('offers no retry for a file that was refused', async () => {
    const user = await addFiles('1.jpg')
    underWay[0]!.end({ kind: 'refused', message: 'This file is not a picture.' })
    expect(await screen.findByText('This file is not a picture.')).toBeVisible()
    expect(screen.queryByRole('button', { name: /Retry/ })).toBeNull()
    await user.click(screen.getByRole('button', { name: 'Clear 1.jpg from this list' }))
    expect(screen.queryByText('This file is not a picture.')).toBeNull()
  })

  it('links to the photograph that is the same file, and shows the line as it is now', async () => {
    await addFiles('1.jpg')
    underWay[0]!.end({ kind: 'same', photographId: 'p7', title: 'The tarn' })
    expect(await screen.findByRole('link', { name: 'The tarn' })).toHaveAttribute(
      'href',
      '/b/lines/l/photographs/p7',
    )
    expect(refresh).toHaveBeenCalledOnce()
  })
})
