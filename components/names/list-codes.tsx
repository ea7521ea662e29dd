import { AppLink } from '@/components/ui/app-link'
import { Ledger } from '@/components/ui/ledger'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { TogetherRow } from '@/lib/names/present'

import { IdeaState } from './idea-state'
import { namesHref, type NamesPlace } from './names-place'

/** The names of a line in the order of its sample book, each with a code that no other has. */
export function StockCodes({ place, rows }: { place: NamesPlace; rows: readonly TogetherRow[] }) {
  return (
    <>
      <p className="mb-3 max-w-measure text-ink-soft">
        Short codes for the warehouse, made of the names: no two alike. They are proposals and are
        kept nowhere.
      </p>
      <Ledger caption="Stock codes">
        <thead>
          <tr>
            <th scope="col">Shade</th>
            <th scope="col">No.</th>
            <th scope="col">Name</th>
            <th scope="col">Code</th>
            <th scope="col">State</th>
            <th scope="col">Family</th>
            <th scope="col">Plays on</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ id, number, hex, family, ideaId, name, state, code, source }) => (
            <tr key={id}>
              <td>
                <WoundSample hex={hex} className="h-7 w-auto" />
              </td>
              <td>{number}</td>
              <th scope="row">
                <AppLink
                  href={namesHref(place, `/ideas/${ideaId}`)}
                  className="inline-flex min-h-8 min-w-32 items-center font-title hover:underline pointer-coarse:min-h-11"
                >
                  {name}
                </AppLink>
              </th>
              <td className="font-semibold tabular-nums">{code}</td>
              <td className="whitespace-nowrap">
                <span className="flex">
                  <IdeaState state={state} />
                </span>
              </td>
              <td className="text-ink-soft">{family}</td>
              <td className="min-w-40 text-ink-soft">{source ? `“${source}”` : null}</td>
            </tr>
          ))}
        </tbody>
      </Ledger>
    </>
  )
}
