import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LinkButton } from '@/components/ui/link-button'
import { Select } from '@/components/ui/select'
import { PHOTOGRAPH_LIMITS } from '@/lib/photographs/constants'
import type { GalleryFilter as Filter } from '@/lib/photographs/schema'

/** Narrows the gallery; its state is the address, so it also works before the script does. */
export function GalleryFilter({ filter, here }: { filter: Filter; here: string }) {
  const narrowed = filter.q !== '' || filter.state !== null || filter.missing !== null
  return (
    <form action={here} role="search" className="mb-6 flex flex-wrap items-end gap-3 print:hidden">
      <Field label="Title, photographer or alt text" className="min-w-52 grow basis-52">
        <Input
          type="search"
          name="q"
          defaultValue={filter.q}
          maxLength={PHOTOGRAPH_LIMITS.search}
        />
      </Field>
      <Field label="State" className="min-w-32 grow basis-32 sm:grow-0 sm:basis-40">
        <Select name="state" defaultValue={filter.state ?? ''}>
          <option value="">All</option>
          <option value="ready">Read</option>
          <option value="reading">Being read</option>
          <option value="failed">Could not be read</option>
        </Select>
      </Field>
      <Field label="Missing" className="min-w-32 grow basis-32 sm:grow-0 sm:basis-44">
        <Select name="missing" defaultValue={filter.missing ?? ''}>
          <option value="">No matter</option>
          <option value="licence">Licence</option>
          <option value="alt">Alt text</option>
        </Select>
      </Field>
      <Button type="submit">Show photographs</Button>
      {narrowed ? (
        <LinkButton variant="quiet" href={here}>
          Show all
        </LinkButton>
      ) : null}
    </form>
  )
}
