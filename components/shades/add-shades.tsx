import { Plus, Upload } from 'lucide-react'

import { LinkButton } from '@/components/ui/link-button'

import { shadesHref, type LinePlace } from './shades-actions'

/** The two ways for shades to come into a line; `first` is the one that fits here. */
export function AddShades({ place, first }: { place: LinePlace; first: 'import' | 'new' }) {
  return (
    <>
      <LinkButton
        variant={first === 'import' ? 'primary' : undefined}
        href={shadesHref(place, '/import')}
        icon={<Upload aria-hidden="true" />}
      >
        Import shades
      </LinkButton>
      <LinkButton
        variant={first === 'new' ? 'primary' : undefined}
        href={shadesHref(place, '/new')}
        icon={<Plus aria-hidden="true" />}
      >
        Add shade
      </LinkButton>
    </>
  )
}
