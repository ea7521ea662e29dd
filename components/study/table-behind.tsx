import type { ReactNode } from 'react'

import { Ledger } from '@/components/ui/ledger'

/** What a figure shows, to be read: a table that opens under it. */
export function TableBehind({
  summary,
  caption,
  columns,
  rows,
}: {
  /** "All 12 pairs as a table". */
  summary: string
  caption: string
  columns: readonly { label: ReactNode; number?: boolean }[]
  /** The first cell heads its row. */
  rows: readonly { key: string; cells: readonly ReactNode[] }[]
}) {
  return (
    <details className="mt-4 print:hidden">
      <summary className="inline-flex min-h-8 items-center text-woad underline decoration-rule underline-offset-[3px] hover:decoration-woad pointer-coarse:min-h-11">
        {summary}
      </summary>
      <div className="mt-2">
        <Ledger caption={caption}>
          <thead>
            <tr>
              {columns.map(({ label, number }, at) => (
                <th key={at} scope="col" className={number ? 'number' : undefined}>
                  {label}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(({ key, cells: [head, ...rest] }) => (
              <tr key={key}>
                <th scope="row">{head}</th>
                {rest.map((cell, at) => (
                  <td key={at} className={columns[at + 1]?.number ? 'number' : undefined}>
                    {cell}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </Ledger>
      </div>
    </details>
  )
}
