/** The page of a list that an address names, 1 when it names none that could be. */
export function pageNumber(value: string | string[] | undefined): number {
  const page = Number(value)
  return Number.isInteger(page) && page >= 1 && page <= 100_000 ? page : 1
}

/** The links and the words of a Pagination: "25–48 of 213 lines". */
export function pagesOf({
  page,
  perPage,
  total,
  noun,
  hrefOf,
}: {
  page: number
  perPage: number
  total: number
  /** In the plural. */
  noun: string
  hrefOf: (page: number) => string
}): { previousHref?: string; nextHref?: string; summary: string } {
  const first = (page - 1) * perPage + 1
  const last = Math.min(page * perPage, total)
  const lastPage = Math.max(1, Math.ceil(total / perPage))
  return {
    ...(page > 1 && { previousHref: hrefOf(Math.min(page - 1, lastPage)) }),
    ...(page < lastPage && { nextHref: hrefOf(page + 1) }),
    summary: first <= last ? `${first}–${last} of ${total} ${noun}` : `${total} ${noun}`,
  }
}
