import { Facts } from '@/components/ui/ledger'
import { TextLink } from '@/components/ui/text-link'
import type { PhotographView } from '@/lib/photographs/present'
import { LICENCE_LABELS } from '@/lib/photographs/constants'

const outwards = (url: string) =>
  url ? (
    <TextLink href={url} rel="noreferrer" className="break-all">
      {url}
    </TextLink>
  ) : (
    'Not given'
  )

/** What is said about a photograph, to be read. */
export function PhotographFacts({ photograph }: { photograph: PhotographView }) {
  const { title, photographer, licence, licenceNote, licenceUrl, sourceUrl, altText } = photograph
  return (
    <Facts
      className="max-w-measure"
      items={[
        { term: 'Title', reading: title },
        { term: 'Alt text', reading: altText || 'Not written yet' },
        { term: 'Photographer', reading: photographer || 'Not named' },
        { term: 'Licence', reading: licence ? LICENCE_LABELS[licence] : 'Not said yet' },
        ...(licenceNote ? [{ term: 'Note on the licence', reading: licenceNote }] : []),
        { term: 'Link to the licence', reading: outwards(licenceUrl) },
        { term: 'Link to the source', reading: outwards(sourceUrl) },
      ]}
    />
  )
}
