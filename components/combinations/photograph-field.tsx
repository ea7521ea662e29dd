import { PhotographPicture } from '@/components/photographs/photograph-picture'
import { Field } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { TextLink } from '@/components/ui/text-link'
import type { PhotographChoice } from '@/lib/photographs/present'

const NO_SOURCES = { avif: [], webp: [] }

/** The photograph of a combination, and the list it is chosen from. */
export function PhotographField({
  photographId,
  choices,
  canEdit,
  hrefOf,
  onChange,
}: {
  photographId: string | null
  choices: readonly PhotographChoice[]
  canEdit: boolean
  hrefOf: (photographId: string) => string
  onChange: (photographId: string | null) => void
}) {
  const chosen = choices.find(({ id }) => id === photographId)
  const gone = photographId !== null && !chosen
  return (
    <>
      {canEdit ? (
        <Field hideLabel label="Photograph">
          <Select
            value={photographId ?? ''}
            onChange={({ target }) => onChange(target.value || null)}
          >
            <option value="">None</option>
            {gone ? <option value={photographId}>One that is gone</option> : null}
            {choices.map(({ id, title }) => (
              <option key={id} value={id}>
                {title}
              </option>
            ))}
          </Select>
        </Field>
      ) : null}
      {chosen ? (
        <>
          <PhotographPicture photograph={{ ...chosen, sources: NO_SOURCES }} sizes="18rem" />
          <p>
            <TextLink href={hrefOf(chosen.id)}>{chosen.title}</TextLink>
            {chosen.photographer ? `, by ${chosen.photographer}` : ''}
          </p>
        </>
      ) : gone ? (
        <p>Its photograph was deleted since; the five stay as they are.</p>
      ) : canEdit ? null : (
        <p>None.</p>
      )}
    </>
  )
}
