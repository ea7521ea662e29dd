import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { pageNumber, pagesOf } from '@/lib/server/paging'

const hrefOf = (page: number) => `?page=${page}`

describe('paging', () => {
  it('reads a page from an address and falls back to the first', () => {
    expect(pageNumber('3')).toBe(3)
    for (const nonsense of [undefined, '', '0', '-1', '1.5', 'x', '1e9', ['2', '3']]) {
      expect(pageNumber(nonsense)).toBe(1)
    }
  })

  it('says which rows stand on the page', () => {
    const pages = pagesOf({ page: 2, perPage: 24, total: 213, noun: 'lines', hrefOf })
    expect(pages).toEqual({
      previousHref: '?page=1',
      nextHref: '?page=3',
      summary: '25–48 of 213 lines',
    })
  })

  it('has no neighbours that do not exist, and leads back from beyond the end', () => {
    fc.assert(
      fc.property(
        fc.nat(500),
        fc.integer({ min: 1, max: 60 }),
        fc.integer({ min: 1, max: 40 }),
        (total, perPage, page) => {
          const last = Math.max(1, Math.ceil(total / perPage))
          const { previousHref, nextHref } = pagesOf({
            page,
            perPage,
            total,
            noun: 'lines',
            hrefOf,
          })
          expect(Boolean(nextHref)).toBe(page < last)
          expect(previousHref).toBe(page > 1 ? hrefOf(Math.min(page - 1, last)) : undefined)
        },
      ),
    )
  })
})
