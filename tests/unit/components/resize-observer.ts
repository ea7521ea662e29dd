import { vi } from 'vitest'

/** jsdom lays nothing out; popovers and tooltips ask how large their arrow is. */
vi.stubGlobal(
  'ResizeObserver',
  class {
    observe() {}
    unobserve() {}
    disconnect() {}
  },
)
