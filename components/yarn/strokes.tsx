import type { Stroke } from './thread-strokes'

/** Paths as React draws them, from the bottom up. */
export function Strokes({ of: strokes }: { of: readonly Stroke[] }) {
  return strokes.map(({ d, fill, stroke, width, opacity, round, dash, skew }, index) => (
    <path
      key={index}
      d={d}
      fill={fill}
      stroke={stroke}
      strokeWidth={width}
      strokeOpacity={opacity}
      strokeLinecap={round === 'cap' ? 'round' : undefined}
      strokeLinejoin={round === 'join' ? 'round' : undefined}
      strokeDasharray={dash?.lengths.join(' ')}
      strokeDashoffset={dash?.offset}
      transform={skew === undefined ? undefined : `skewX(${skew})`}
    />
  ))
}
