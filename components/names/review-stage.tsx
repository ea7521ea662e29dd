import { BeyondScreen } from '@/components/shades/shade-words'
import { cn } from '@/components/ui/cn'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ReviewItem } from '@/lib/names/present'

/** The shade wound large, and its family beside it with the names they have. */
export function ReviewStage({ item }: { item: ReviewItem }) {
  const { shade, beside, family, idea } = item
  return (
    <div className="min-w-0">
      <Ground className="border border-hairline p-3 sm:p-4">
        <WoundSample
          hex={shade.hex}
          size="large"
          label={`No. ${shade.number}, wound on card`}
          className="mx-auto h-auto max-w-full"
        />
        {beside.length > 1 ? (
          <ul
            role="list"
            aria-label={`Beside it in ${family ?? 'its family'}`}
            className="mt-3 space-y-1.5 border-t border-hairline pt-3"
          >
            {beside.map((one) => {
              const isThis = one.id === shade.id
              return (
                <li
                  key={one.id}
                  aria-current={isThis ? 'true' : undefined}
                  className="flex min-w-0 items-center gap-3"
                >
                  <WoundSample hex={one.hex} className="h-7 w-auto" />
                  <span
                    className={cn(
                      'min-w-0 grow font-title leading-tight break-words',
                      isThis && 'underline decoration-2 underline-offset-4',
                    )}
                  >
                    {isThis ? idea.text : (one.name ?? 'No name yet')}
                  </span>
                  <span className="text-sm whitespace-nowrap text-ink-soft">No. {one.number}</span>
                </li>
              )
            })}
          </ul>
        ) : null}
      </Ground>
      <div className="mt-2 flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
        <p className="text-sm text-ink-faint">
          {family ? `${family}, as they stand in the book` : 'In no family yet'}
        </p>
        <GroundSwitch />
      </div>
      {shade.inGamut ? null : <BeyondScreen className="mt-1" />}
    </div>
  )
}
