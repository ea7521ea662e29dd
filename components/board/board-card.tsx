import { cn } from '@/components/ui/cn'
import { WrapCard } from '@/components/yarn/wrap-card'
import type { BoardCard, BoardView } from '@/lib/combinations/present'
import type { ComponentProps, ReactNode } from 'react'

import { bandsOf, shadesInWords } from './words'

/** The card itself, as it lies on the table and as it is carried over it. */
export function CardFace({
  board,
  card,
  title,
  wrap,
  controls,
  className,
}: {
  board: BoardView
  card: BoardCard
  /** The title, or the link that says it. */
  title: ReactNode
  /** What the wrapped card is held by. */
  wrap?: ComponentProps<'div'>
  controls?: ReactNode
  className?: string
}) {
  const photograph = card.photograph === null ? undefined : board.photographs[card.photograph]
  const author = card.author === null ? undefined : board.authors[card.author]
  return (
    <div
      className={cn('flex items-start gap-4 @max-[22rem]:gap-3 @max-[17rem]:flex-wrap', className)}
    >
      <div {...wrap} className={cn('w-28 shrink-0 @max-[22rem]:w-22', wrap?.className)}>
        <WrapCard compact bands={bandsOf(board, card)} title={card.title} className="w-full" />
      </div>
      <div className="min-w-0 grow @max-[17rem]:order-last @max-[17rem]:basis-full">
        <p className="font-title text-lg leading-tight break-words">{title}</p>
        <p className="mt-1 line-clamp-3 text-sm">{shadesInWords(board, card)}</p>
        {photograph ? (
          <p className="mt-1 truncate text-sm text-ink-faint">From {photograph.title}</p>
        ) : null}
        {author ? <p className="truncate text-sm text-ink-faint">{author.name}</p> : null}
      </div>
      {controls}
    </div>
  )
}
