'use client'

import { useState } from 'react'

import type { DraftPlace } from '@/components/combinations/draft'
import type { ShadeOf } from '@/components/combinations/shade-of'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { Tabs } from '@/components/ui/tabs'
import type { ShadeView } from '@/lib/shades/present'

import { ClashNotes } from './clash-notes'
import { CompletePanel } from './complete-panel'
import { NeighbourPanel } from './neighbour-panel'

/** Props of {@link HelpTabs}. */
export interface HelpTabsProps {
  places: readonly DraftPlace[]
  /** Of the line, neither deleted nor retired. */
  shades: readonly ShadeView[]
  shadeOf: ShadeOf
  /** The combination's, if it has one. */
  photograph: { title: string } | null
  /** Where the photograph's match answers; null without one. */
  matchUrl: string | null
  onComplete: (shadeIds: string[], words: string) => void
  onExchange: (place: number, shadeId: string) => void
}

/** Help that computes: what clashes, how the five could be completed, better neighbours. */
export function HelpTabs({ onExchange, ...props }: HelpTabsProps) {
  const { places, shadeOf } = props
  const [place, setPlace] = useState(0)
  return (
    <Tabs
      label="Help"
      items={[
        { value: 'clashes', label: 'What clashes', content: <ClashNotes {...props} /> },
        { value: 'complete', label: 'Complete', content: <CompletePanel {...props} /> },
        {
          value: 'neighbours',
          label: 'Better neighbour',
          content: (
            <div className="space-y-4">
              <Field label="For" className="max-w-xs">
                <Select value={place} onChange={({ target }) => setPlace(Number(target.value))}>
                  {places.map(({ shadeId }, at) => (
                    <option key={at} value={at}>
                      Place {at + 1}: {shadeOf(shadeId)?.label ?? 'empty'}
                    </option>
                  ))}
                </Select>
              </Field>
              <NeighbourPanel
                {...props}
                place={place}
                onChoose={(shadeId) => onExchange(place, shadeId)}
              />
            </div>
          ),
        },
      ]}
    />
  )
}
