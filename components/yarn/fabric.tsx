import { useId } from 'react'
import { bandsInWords, type Band } from './bands'
import { squareRounds, strandedRows, stripeRows } from './cloth-plan'
import { FABRIC_LABELS, type FabricKind } from './cloth-words'
import { CrochetSquare } from './crochet-square'
import { FRAME, KnitCloth } from './knit-cloth'
import { MarledCloth } from './marled-cloth'

function Cloth({ bands, kind, id }: { bands: readonly Band[]; kind: FabricKind; id: string }) {
  switch (kind) {
    case 'stripes':
      return <KnitCloth rows={stripeRows(bands)} bands={bands} id={id} />
    case 'stranded':
      return <KnitCloth rows={strandedRows(bands)} bands={bands} id={id} />
    case 'square':
      return <CrochetSquare rounds={squareRounds(bands)} bands={bands} id={id} />
    case 'marled':
      return <MarledCloth bands={bands} id={id} />
  }
}

/**
 * Yarns as cloth, drawn stitch by stitch, so that a knitter sees what they make together: at most 250
 * elements, whatever it is worked in (tests/unit/components/yarn/cloth.test.tsx).
 */
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
  return (
    <svg
      viewBox={`0 0 ${FRAME.width} ${FRAME.height}`}
      width={FRAME.width}
      height={FRAME.height}
      fill="none"
      role="img"
      aria-label={`${FABRIC_LABELS[kind]}: ${bandsInWords(bands)}`}
      className={className ? `h-auto ${className}` : 'h-auto max-w-full'}
    >
      <Cloth bands={bands} kind={kind} id={id} />
    </svg>
  )
}
