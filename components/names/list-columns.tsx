'use client'

import { createColumnHelper } from '@tanstack/react-table'

import { chooseColumn, type features } from '@/components/ui/use-paged-table'
import type { NameRow } from '@/lib/names/present'

import { ChecksCell, NameCell, ShadeCell, StateCell } from './list-cells'

const helper = createColumnHelper<typeof features, NameRow>()
const sorted = { sortDescFirst: false } as const

/** The columns of the list; their ids are what the address sorts by. */
export const LIST_COLUMNS = helper.columns([
  chooseColumn<NameRow>({
    all: 'Choose all names of this page',
    one: ({ idea, number }) => (idea ? `Choose ${idea.text}` : `No. ${number} has no name yet`),
  }),
  helper.accessor('id', {
    ...sorted,
    id: 'order',
    header: 'Shade',
    cell: ({ row }) => <ShadeCell row={row.original} />,
  }),
  helper.accessor('number', { ...sorted, header: 'No.', cell: ({ row }) => row.original.number }),
  helper.accessor((row) => row.idea?.text, {
    ...sorted,
    id: 'name',
    header: 'Name',
    cell: ({ row }) => <NameCell row={row.original} />,
  }),
  helper.accessor((row) => row.idea?.state, {
    ...sorted,
    id: 'state',
    header: 'State',
    cell: ({ row }) => <StateCell row={row.original} />,
  }),
  helper.accessor((row) => row.idea?.findings, {
    id: 'checks',
    // What needs looking at comes first.
    sortDescFirst: true,
    header: 'Checks',
    cell: ({ row }) => <ChecksCell row={row.original} />,
  }),
  helper.accessor('family', {
    ...sorted,
    header: 'Family',
    cell: ({ row }) => <span className="text-ink-soft">{row.original.family}</span>,
  }),
])
