import { Strokes } from './strokes'
import { threadStrokes, type ThreadBlock } from './thread-strokes'

/** A block of threads in one shade. */
export function Threads({ hex, block }: { hex: string; block: ThreadBlock }) {
  return <Strokes of={threadStrokes(hex, block, 'var(--yarn-card-edge, #c4c2be)')} />
}
