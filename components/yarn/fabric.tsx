import { useId } from 'react'
import { bandsInWords, type Band } from './bands'
import { CrochetRounds } from './crochet-rounds'
import { KnitCloth, strandedRows, stripeRows } from './knit-cloth'

/** What the yarns are worked into. */
export type FabricKind = 'stripes' | 'stranded' | 'rounds'

const WORDS: Record<FabricKind, string> = {
  stripes: 'Knitted stripes',
  stranded: 'Stranded knitting in two colours with stripes',
  rounds: 'Crochet in rounds',
}

/** Five yarns as cloth, drawn stitch by stitch, so that a knitter sees what they make together. */
export function Fabric({
  bands,
  kind,
  className,
}: {
  bands: readonly Band[]
  kind: FabricKind
  className?: string
}) {
  const id = useId()
  const frame = {
    id,
    label: `${WORDS[kind]}: ${bandsInWords(bands)}`,
    className: className ? `h-auto ${className}` : 'h-auto max-w-full',
  }
  if (kind === 'rounds') return <CrochetRounds bands={bands} {...frame} />
  return (
    <KnitCloth rows={kind === 'stripes' ? stripeRows(bands) : strandedRows(bands)} {...frame} />
  )
}
