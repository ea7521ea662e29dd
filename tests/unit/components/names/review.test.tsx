import { render, screen, waitFor, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { useState } from 'react'
import { beforeEach, describe, expect, it, vi } from 'vitest'

import { Review } from '@/components/names/review'
import { ReviewKeysNote } from '@/components/names/review-keys-note'
import type { ActionResult } from '@/lib/errors'
import type { ReviewItem, ReviewPage } from '@/lib/names/present'

const router = { replace: vi.fn(), refresh: vi.fn(), push: vi.fn() }
vi.mock('next/navigation', async (original) => ({ ...(await original()), useRouter: () => router }))

const PLACE = { brand: 'ours', lineSlug: 'hill-dk' }
const TEXTS = ['Thyme Will Tell', 'Olive and Let Live', 'Moss Have Been Love']

const itemOf = (
  text: string,
  at: number,
  changes: Partial<ReviewItem['idea']> = {},
): ReviewItem => {
  const shade = {
    id: `shade-${at}`,
    number: `${at + 1}`,
    name: null,
    label: `No. ${at + 1}`,
    lab: [50, 0, at] as const,
    illuminant: 'D65' as const,
    observer: 10 as const,
    hex: '#777777',
    inGamut: true,
    enteredHex: null,
    status: 'target' as const,
    position: at,
    familyId: null,
    familyPinned: false,
    familyPosition: null,
    version: 1,
  }
  return {
    idea: {
      id: `idea-${at}`,
      shadeId: shade.id,
      text,
      note: '',
      state: 'in-review',
      stateSince: '2027-03-01T10:00:00.000Z',
      round: 1,
      version: 3,
      findings: [],
      wordingReason: '',
      author: { id: 'them', name: 'Wilmot Sedge' },
      wordedBy: { id: 'them', name: 'Wilmot Sedge' },
      isOwn: false,
      locked: false,
      moves: ['approve', 'return', 'put-by'],
      canEdit: false,
      canDelete: false,
      canVote: true,
      votes: [],
      ...changes,
    },
    shade: shade as unknown as ReviewItem['shade'],
    family: null,
    beside: [],
    held: null,
    rivals: [],
    remarks: [],
    remarkCount: 0,
  }
}

const pageOf = (items: ReviewItem[], changes: Partial<ReviewPage> = {}): ReviewPage => ({
  items,
  total: items.length,
  start: 0,
  before: null,
  after: null,
  standing: { shades: 3, named: 0, drafts: 0, returned: 0 },
  decides: true,
  frozen: false,
  ...changes,
})

type Sent = Record<string, unknown>
const sent: [move: string, input: Sent][] = []
let refusal: ActionResult<never> | null = null

beforeEach(() => {
  sent.length = 0
  refusal = null
  window.localStorage.clear()
  Element.prototype.scrollIntoView = () => {}
})

/** The review as its page shows it: what is decided is on it no more. */
function Page({ first }: { first: ReviewPage }) {
  const [gone, setGone] = useState<string[]>([])
  const items = first.items.filter(({ idea }) => !gone.includes(idea.id))
  const act = (move: string, leaves: boolean) => (_brand: string, input: Sent) => {
    sent.push([move, input])
    if (refusal) return Promise.resolve(refusal)
    const ids = (input.ideaIds as string[] | undefined) ?? [input.ideaId as string]
    setGone((before) =>
      leaves ? [...before, ...ids] : before.filter((id) => !ids.includes(id) || move === 'vote'),
    )
    return Promise.resolve({ ok: true, data: { version: 4 } })
  }
  const actions = {
    approve: act('approve', true),
    return: act('return', true),
    'put-by': act('put-by', true),
    recall: act('recall', true),
    reopen: act('reopen', false),
    'take-up': () => Promise.resolve({ ok: true, data: {} }),
    send: act('send', false),
    unlock: act('unlock', false),
    vote: act('vote', false),
    addRemark: act('addRemark', false),
  }
  return (
    <>
      <Review
        place={PLACE}
        review={{ ...first, items, total: items.length }}
        firstId={null}
        actions={actions as never}
      />
      <ReviewKeysNote decides={first.decides} />
    </>
  )
}

function open(page = pageOf(TEXTS.map((text, at) => itemOf(text, at)))) {
  render(<Page first={page} />)
  return userEvent.setup()
}
const inFront = (name: string) => screen.findByRole('heading', { level: 2, name })
const spoken = () =>
  screen
    .getAllByRole('status')
    .map(({ textContent }) => textContent)
    .join(' ')

describe('the review of names by keyboard', () => {
  it('goes on after a decision, with the focus on the next name, and says what is left', async () => {
    const user = open()
    await user.keyboard('a')
    expect(await inFront(TEXTS[1]!)).toHaveFocus()
    expect(sent).toEqual([
      ['approve', { lineSlug: 'hill-dk', ideaId: 'idea-0', version: 3, reason: '' }],
    ])
    expect(spoken()).toBe(
      'Approved: “Thyme Will Tell” for No. 1. 2 names are left. Now “Olive and Let Live” for No. 2.',
    )
  })

  it('asks for the reason of a return, keeps the name when it is left, and sends it with Ctrl and Enter', async () => {
    const user = open()
    await user.keyboard('r')
    const reason = await screen.findByRole('textbox', { name: 'Why is it returned?' })
    expect(reason).toHaveFocus()
    await user.keyboard('{Escape}')
    expect(await inFront(TEXTS[0]!)).toHaveFocus()
    await user.keyboard('r')
    await user.keyboard('{Control>}{Enter}{/Control}')
    expect(await screen.findByText('Give a reason.')).toBeVisible()
    expect(sent).toEqual([])
    await user.keyboard('Too near No. 3, say anything{Control>}{Enter}{/Control}')
    expect(await inFront(TEXTS[1]!)).toHaveFocus()
    expect(sent.at(-1)).toMatchObject(['return', { reason: 'Too near No. 3, say anything' }])
  })

  it('takes back an approval with one key, and comes back to the name', async () => {
    const user = open()
    await user.keyboard('a')
    await inFront(TEXTS[1]!)
    await user.keyboard('z')
    expect(await inFront(TEXTS[0]!)).toHaveFocus()
    expect(sent.at(-1)).toMatchObject(['reopen', { ideaId: 'idea-0', version: 4 }])
  })

  it('takes a second press in one go for the name it was meant for', async () => {
    const user = open()
    await user.keyboard('a')
    await inFront(TEXTS[1]!)
    await user.keyboard('ap')
    expect(sent).toHaveLength(1)
    expect(await inFront(TEXTS[1]!)).toBeVisible()
  })

  it('does not offer to take back what is locked by its approval', async () => {
    const user = open(pageOf([itemOf(TEXTS[0]!, 0), itemOf(TEXTS[1]!, 1)], { frozen: true }))
    await user.keyboard('a')
    await inFront(TEXTS[1]!)
    await user.keyboard('z')
    expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull()
    expect(sent).toHaveLength(1)
  })

  it('says a word without going on, and takes it back by the same key', async () => {
    const own = { person: null, vote: 'yes', comment: '', mine: true, at: '2027-03-01T10:00:00Z' }
    const user = open(pageOf([itemOf(TEXTS[0]!, 0, { votes: [own as never] })]))
    await user.keyboard('s')
    await waitFor(() => expect(sent.at(-1)).toMatchObject(['vote', { vote: 'unsure', round: 1 }]))
    await waitFor(() => expect(spoken()).toBe('You said: Not sure.'))
    await user.keyboard('y')
    await waitFor(() => expect(sent.at(-1)).toMatchObject(['vote', { vote: null }]))
    expect(await inFront(TEXTS[0]!)).toBeVisible()
  })

  it('ends with a page that says so, counts the sitting, and has the focus', async () => {
    const user = open(pageOf([itemOf(TEXTS[0]!, 0), itemOf(TEXTS[1]!, 1)]))
    await user.keyboard('a')
    await inFront(TEXTS[1]!)
    await waitFor(async () => {
      await user.keyboard('p')
      expect(screen.getByRole('heading', { name: 'Every name is decided' })).toHaveFocus()
    })
    expect(screen.getByText(/In this sitting: 1 approved, 1 put by\./)).toBeVisible()
    expect(spoken()).toContain('No name is left.')
  })

  it('shows what is still open to whoever went through without deciding', async () => {
    const user = open()
    await user.keyboard('{ArrowRight}{ArrowRight}{ArrowRight}')
    expect(await inFront('You have been through them all')).toHaveFocus()
    const open3 = screen.getByRole('region', { name: '3 names are still in review' })
    await user.click(within(open3).getByRole('button', { name: /Olive and Let Live/ }))
    expect(await inFront(TEXTS[1]!)).toHaveFocus()
    await user.keyboard('{ArrowLeft}')
    expect(await inFront(TEXTS[0]!)).toHaveFocus()
  })

  it('keeps the name in front and says why when a decision is refused', async () => {
    refusal = { ok: false, code: 'conflict', message: 'It was returned now. Nothing was changed.' }
    const user = open()
    await user.keyboard('a')
    expect(await screen.findByRole('alert')).toHaveTextContent('It was returned now.')
    expect(await inFront(TEXTS[0]!)).toBeVisible()
    expect(router.refresh).toHaveBeenCalled()
  })

  it('leaves the keys alone in a field, with a modifier, held down, and when they are turned off', async () => {
    const user = open()
    await user.click(screen.getByRole('textbox', { name: 'Your remark' }))
    await user.keyboard('a pair of them')
    await user.click(document.body)
    await user.keyboard('{Control>}a{/Control}{Alt>}p{/Alt}')
    await user.click(screen.getByRole('switch', { name: 'Single keys' }))
    await user.click(document.body)
    await user.keyboard('ap{ArrowRight}')
    expect(sent).toEqual([])
    expect(await inFront(TEXTS[0]!)).toBeVisible()
    expect(window.localStorage.getItem('woadmap-review-keys')).toBe('off')
    await user.click(screen.getByRole('switch', { name: 'Single keys' }))
    await user.click(document.body)
    await user.keyboard('{a>3/}')
    await waitFor(() => expect(sent).toHaveLength(1))
  })

  it('lets whoever does not decide look and talk, and says so when they try', async () => {
    const plain = { moves: [], canVote: false }
    const user = open(
      pageOf(
        TEXTS.map((text, at) => itemOf(text, at, plain as never)),
        { decides: false },
      ),
    )
    await user.keyboard('a')
    await user.keyboard('y')
    expect(sent).toEqual([])
    expect(spoken()).toBe('That is not yours to decide.')
    expect(screen.queryByRole('group', { name: 'Decide' })).toBeNull()
    await user.keyboard('t')
    await user.keyboard('Lovely{Control>}{Enter}{/Control}')
    await waitFor(() => expect(sent.at(-1)).toMatchObject(['addRemark', { text: 'Lovely' }]))
    await waitFor(() => expect(spoken()).toBe('Your remark is added.'))
  })

  it('says that nothing waits when nothing does', () => {
    open(pageOf([]))
    expect(screen.getByRole('heading', { name: 'No name waits for review' })).toBeVisible()
  })
})
