import type { Metadata } from 'next'

import { Board } from '@/components/board/board'
import { Sheet } from '@/components/layout/sheet'
import { getBoard } from '@/lib/combinations/get-board'
import {
  canDeleteCombination,
  canEditCombination,
  canMoveCombination,
} from '@/lib/combinations/policy'
import { readForPage } from '@/lib/server/page'

import {
  deleteCombinationAction,
  moveCombinationAction,
  restoreCombinationAction,
  sketchCombinationAction,
} from './actions'

export const metadata: Metadata = { title: 'Combinations' }

export default async function CombinationsPage({
  params,
}: PageProps<'/[brand]/lines/[line]/combinations'>) {
  const { brand, line } = await params
  const { board, canMove, canEdit, canDelete } = await readForPage(brand, async (actor) => ({
    board: (await getBoard(actor, line))!,
    canMove: canMoveCombination(actor),
    canEdit: canEditCombination(actor),
    canDelete: canDeleteCombination(actor),
  }))
  return (
    <Sheet>
      <Board
        brand={brand}
        line={line}
        board={board}
        canMove={canMove}
        move={moveCombinationAction}
        sketch={canEdit ? sketchCombinationAction : null}
        remove={canDelete ? deleteCombinationAction : null}
        restore={restoreCombinationAction}
      />
    </Sheet>
  )
}
