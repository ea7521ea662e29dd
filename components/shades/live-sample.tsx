'use client'

import { WoundSample } from '@/components/yarn/wound-sample'
import { screenColor, type ScreenColor } from '@/lib/color/gamut'
import { hexToLab } from '@/lib/color/srgb'
import { shadeColor } from '@/lib/shades/schema'

import { BeyondScreen } from './shade-words'
import type { ShadeFormValues } from './shade-form'

/** What a screen shows of a colour as typed; the terms do not change how it is shown. */
function showable(color: ShadeFormValues['color']): ScreenColor | null {
  const parsed = shadeColor.safeParse({ ...color, terms: 'D65/10' })
  if (!parsed.success) return null
  return parsed.data.kind === 'hex'
    ? screenColor(hexToLab(parsed.data.hex))
    : screenColor([parsed.data.L, parsed.data.a, parsed.data.b])
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
