// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import {
  createEditorStore,
  SAVE_DELAY,
  type EditorWorld,
  type SavedDraft,
} from '@/components/combinations/editor-store'
import type { ActionResult } from '@/lib/errors'

import { draftWith, shadeIdsOf } from './fixtures'

type Answer = ActionResult<{ version: number }>

const initial: SavedDraft = { version: 1, draft: draftWith('fern', 'moss', 'slate', null, null) }
const failure = (code: 'unavailable' | 'forbidden' | 'conflict'): Answer => ({
  ok: false,
  code,
  message: `It is ${code}.`,
})

/** A server that has one combination, and can be cut off. */
function makeServer() {
  const server = { saved: initial, cut: false, saves: 0 }
  return {
    server,
    save: async ({ version, draft }: SavedDraft): Promise<Answer> => {
      server.saves += 1
      if (server.cut) return failure('unavailable')
      if (version !== server.saved.version) return failure('conflict')
      server.saved = { version: version + 1, draft }
      return { ok: true, data: { version: version + 1 } }
    },
    load: async () => (server.cut ? null : server.saved),
  }
}

let ends: (() => void)[] = []
function open(world: Pick<EditorWorld, 'save' | 'load'>, more: Partial<EditorWorld> = {}) {
  const store = createEditorStore({
    initial,
    key: 'combination',
    storage: () => window.sessionStorage,
    ...world,
    ...more,
  })
  ends.push(store.start())
  return store
}

const passes = (milliseconds = SAVE_DELAY) => vi.advanceTimersByTimeAsync(milliseconds)

beforeEach(() => {
  vi.useFakeTimers()
  window.sessionStorage.clear()
})
afterEach(() => {
  for (const end of ends) end()
  ends = []
  vi.useRealTimers()
})

describe('an open combination', () => {
  it('is saved by itself once for several edits, and says so', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    store.edit({ kind: 'title', title: 'Fell' })
    store.edit({ kind: 'place', place: 3, shadeId: 'rust' })
    expect(store.getState().saving).toEqual({ kind: 'waiting' })
    await passes()
    expect(store.getState().saving).toEqual({ kind: 'saved' })
    expect(server.saves).toBe(1)
    expect(server.saved.draft.title).toBe('Fell')
    expect(shadeIdsOf(server.saved.draft)).toContain('rust')
  })

  it('saves what is edited while a save is under way after it, on its version', async () => {
    const { server, ...world } = makeServer()
    let answer = (): void => undefined
    const slow = new Promise<void>((done) => (answer = done))
    const store = open({ ...world, save: async (sent) => slow.then(() => world.save(sent)) })
    store.edit({ kind: 'title', title: 'Fell' })
    await passes()
    expect(store.getState().saving).toEqual({ kind: 'saving' })
    store.edit({ kind: 'title', title: 'Fell asleep' })
    answer()
    await passes()
    expect(server.saved).toMatchObject({ version: 3, draft: { title: 'Fell asleep' } })
  })

  it('keeps edits while nothing answers, tries again by itself, and survives a reload meanwhile', async () => {
    const { server, ...world } = makeServer()
    server.cut = true
    const store = open(world)
    store.edit({ kind: 'title', title: 'Fell' })
    await passes()
    expect(store.getState().saving).toEqual({ kind: 'unreached' })

    const reloaded = open(world)
    expect(reloaded.getState().history.present.title).toBe('Fell')
    await passes()
    expect(reloaded.getState().saving).toEqual({ kind: 'unreached' })
    server.cut = false
    await passes(15_000)
    expect(reloaded.getState().saving).toEqual({ kind: 'saved' })
    expect(server.saved.draft.title).toBe('Fell')
  })

  it('undoes after a reload what was done and saved before it', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    for (let step = 1; step <= 20; step += 1) store.edit({ kind: 'title', title: `Fell ${step}` })
    await passes()
    const reloaded = open(world, { initial: server.saved })
    for (let step = 1; step <= 20; step += 1) reloaded.undo()
    expect(reloaded.getState().history.present.title).toBe('Hillside')
    await passes()
    expect(server.saved.draft.title).toBe('Hillside')
  })

  it('joins what somebody else saved when both touched different things', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    server.saved = { version: 2, draft: { ...initial.draft, story: 'After rain.' } }
    store.edit({ kind: 'title', title: 'Fell' })
    await passes()
    await passes()
    expect(server.saved).toMatchObject({
      version: 3,
      draft: { title: 'Fell', story: 'After rain.' },
    })
    expect(store.getState().news).toEqual(['story'])
    expect(store.getState().saving).toEqual({ kind: 'saved' })
  })

  it('saves over nobody: where both changed the same it waits until one is chosen', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    server.saved = { version: 2, draft: { ...initial.draft, title: 'Tarn' } }
    store.edit({ kind: 'title', title: 'Fell' })
    await passes(60_000)
    expect(store.getState().saving).toEqual({ kind: 'conflict' })
    expect(server.saved.draft.title).toBe('Tarn')
    expect(store.getState().history.present.title).toBe('Fell')

    store.choose('mine')
    await passes()
    expect(server.saved).toMatchObject({ version: 3, draft: { title: 'Fell' } })
  })

  it('can take theirs, and take that back', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    server.saved = { version: 2, draft: { ...initial.draft, title: 'Tarn' } }
    store.edit({ kind: 'title', title: 'Fell' })
    await passes()
    store.choose('theirs')
    expect(store.getState().history.present.title).toBe('Tarn')
    expect(store.getState().saving).toEqual({ kind: 'saved' })
    store.undo()
    await passes()
    expect(server.saved).toMatchObject({ version: 3, draft: { title: 'Fell' } })
  })

  it('shows what somebody else saved when nothing is unsaved', () => {
    const store = open(makeServer())
    store.hear({ version: 2, draft: { ...initial.draft, title: 'Tarn' } })
    expect(store.getState().history.present.title).toBe('Tarn')
    expect(store.getState().news).toEqual(['title'])
    store.hear(initial)
    expect(store.getState().history.present.title).toBe('Tarn')
  })

  it('takes its own save for saved when only the answer was lost', async () => {
    const { server, ...world } = makeServer()
    let lost = true
    const store = open({
      ...world,
      save: async (sent) => {
        const answer = await world.save(sent)
        const late = lost
        lost = false
        return late ? failure('unavailable') : answer
      },
    })
    store.edit({ kind: 'title', title: 'Fell' })
    await passes(15_000)
    expect(store.getState().saving).toEqual({ kind: 'saved' })
    expect(server.saved).toMatchObject({ version: 2, draft: { title: 'Fell' } })
  })

  it('says why when the server will not have it, and tries at the next edit', async () => {
    const { server, ...world } = makeServer()
    let refuses = true
    const store = open({
      ...world,
      save: async (sent) => (refuses ? failure('forbidden') : world.save(sent)),
    })
    store.edit({ kind: 'title', title: 'Fell' })
    await passes(60_000)
    expect(store.getState().saving).toEqual({ kind: 'refused', words: 'It is forbidden.' })
    refuses = false
    store.edit({ kind: 'story', story: 'After rain.' })
    await passes()
    expect(server.saved.draft).toMatchObject({ title: 'Fell', story: 'After rain.' })
  })

  it('does not send a combination without a title', async () => {
    const { server, ...world } = makeServer()
    const store = open(world)
    store.edit({ kind: 'title', title: ' ' })
    await passes(60_000)
    expect(store.getState().saving.kind).toBe('refused')
    expect(server.saves).toBe(0)
  })
})
