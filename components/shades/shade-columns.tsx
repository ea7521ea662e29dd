'use client'

import { createColumnHelper } from '@tanstack/react-table'

import { chooseColumn, type features } from '@/components/ui/use-paged-table'
import type { ShadeView } from '@/lib/shades/present'

import {
  NameCell,
  NumberCell,
  PlaceCell,
  ReadingCell,
  SampleCell,
  StatusCell,
  TermsCell,
} from './shade-cells'

const helper = createColumnHelper<typeof features, ShadeView>()

/** Columns whose cells stand at the right. */
export const NUMBER_COLUMNS: readonly string[] = ['L', 'a', 'b', 'order']

/** The choice of rows, for those who edit. */
const selectColumn = chooseColumn<ShadeView>({
  all: 'Choose all shades of this page',
  one: ({ label }) => `Choose ${label}`,
})

/** The columns of the shades; their ids are what the address sorts by. */
function shadeColumns(edits: boolean) {
  const sorted = { sortDescFirst: false } as const
  const reading = (of: 'L' | 'a' | 'b', at: 0 | 1 | 2) =>
    helper.accessor((shade) => shade.lab[at], {
      ...sorted,
      id: of,
      header: `${of}*`,
      cell: ({ row }) => <ReadingCell shade={row.original} edits={edits} of={of} />,
    })
  return helper.columns([
    helper.display({
      id: 'sample',
      header: 'Sample',
      cell: ({ row }) => <SampleCell shade={row.original} />,
    }),
    helper.accessor('number', {
      ...sorted,
      header: 'No.',
      cell: ({ row }) => <NumberCell shade={row.original} edits={edits} />,
    }),
    helper.accessor('name', {
      ...sorted,
      header: 'Name',
      cell: ({ row }) => <NameCell shade={row.original} />,
    }),
    helper.accessor('status', {
      ...sorted,
      header: 'Status',
      cell: ({ row }) => <StatusCell shade={row.original} edits={edits} />,
    }),
    reading('L', 0),
    reading('a', 1),
    reading('b', 2),
    helper.display({
      id: 'terms',
      header: 'Read under',
      cell: ({ row }) => <TermsCell shade={row.original} />,
    }),
    helper.accessor('position', {
      ...sorted,
      id: 'order',
      header: 'Place',
      cell: ({ row }) => <PlaceCell shade={row.original} edits={edits} />,
    }),
  ])
}

/** The columns for those who read. */
export const READ_COLUMNS = shadeColumns(false)

/** The columns for those who edit. */
export const EDIT_COLUMNS = helper.columns([selectColumn, ...shadeColumns(true)])
