'use client'

import { WoundSample } from '@/components/yarn/wound-sample'
import { screenColor, type ScreenColor } from '@/lib/color/gamut'
import { hexToLab } from '@/lib/color/srgb'
import { LAB_RANGES, parseHex, parseReading } from '@/lib/shades/constants'

import { BeyondScreen } from './shade-words'
import type { ShadeFormValues } from './shade-form'

/** What a screen shows of a colour as typed; the terms do not change how it is shown. */
function showable(color: ShadeFormValues['color']): ScreenColor | null {
  if (color.kind === 'hex') {
    const hex = parseHex(color.hex)
    return hex === null ? null : screenColor(hexToLab(hex))
  }
  const coordinate = (axis: 'L' | 'a' | 'b') => {
    const value = parseReading(color[axis]) ?? NaN
    const [least, most] = LAB_RANGES[axis]
    return value >= least && value <= most ? value : NaN
  }
  const lab = [coordinate('L'), coordinate('a'), coordinate('b')] as const
  return lab.some(Number.isNaN) ? null : screenColor(lab)
}

/** The sample of a colour while it is being typed. */
export function LiveSample({ color }: { color: ShadeFormValues['color'] }) {
  const screen = showable(color)
  return (
    <figure className="w-37">
      {screen ? (
        <WoundSample hex={screen.hex} size="card" />
      ) : (
        <div className="h-26 w-37 rounded border border-dashed border-rule" />
      )}
      <figcaption className="mt-1 text-sm text-ink-faint">
        {screen ? (
          screen.inGamut ? (
            'As this screen shows it'
          ) : (
            <BeyondScreen />
          )
        ) : (
          'The sample appears when the colour is whole'
        )}
      </figcaption>
    </figure>
  )
}
