import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LinkButton } from '@/components/ui/link-button'
import { Select } from '@/components/ui/select'
import { ACTIONS, ACTIVITY_KINDS } from '@/lib/activity/constants'
import type { ActivityFilter as Filter } from '@/lib/activity/schema'

/** Narrows the record; its state is the address, so it also works before the script does. */
export function ActivityFilter({
  filter,
  people,
  here,
}: {
  filter: Filter
  people: readonly { id: string; name: string }[]
  here: string
}) {
  const isNarrowed = Object.values(filter).some((value) => value !== null)
  return (
    <form action={here} role="search" className="mb-6 flex flex-wrap items-end gap-3 print:hidden">
      <Field label="Who" className="min-w-40 grow basis-40">
        <Select name="person" defaultValue={filter.person ?? ''}>
          <option value="">Everybody</option>
          {people.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
          <option value="former">Former members</option>
        </Select>
      </Field>
      <Field label="What" className="min-w-40 grow basis-40">
        <Select name="what" defaultValue={filter.what ?? ''}>
          <option value="">Everything</option>
          {Object.entries(ACTIVITY_KINDS).map(([kind, heading]) => (
            <optgroup key={kind} label={heading}>
              <option value={kind}>{heading}: everything</option>
              {Object.entries(ACTIONS)
                .filter(([action]) => action.startsWith(`${kind}.`))
                .map(([action, { label }]) => (
                  <option key={action} value={action}>
                    {label}
                  </option>
                ))}
            </optgroup>
          ))}
        </Select>
      </Field>
      <Field label="From" className="min-w-36 grow basis-36 sm:grow-0">
        <Input type="date" name="from" defaultValue={filter.from ?? ''} />
      </Field>
      <Field label="To" className="min-w-36 grow basis-36 sm:grow-0">
        <Input type="date" name="to" defaultValue={filter.to ?? ''} />
      </Field>
      <Button type="submit">Show entries</Button>
      {isNarrowed ? (
        <LinkButton variant="quiet" href={here}>
          Show all
        </LinkButton>
      ) : null}
    </form>
  )
}
