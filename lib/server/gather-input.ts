import { InvalidError } from '@/lib/errors'

/**
 * The fields of a request to a route from its address, its query string and its body, as one
 * object: none may come twice, so that what is checked is what is meant.
 * @throws InvalidError naming the field that does
 */
export function gatherInput(
  params: Readonly<Record<string, string>>,
  query: URLSearchParams,
  body: object,
): Record<string, unknown> {
  const fields = [...Object.entries(params), ...query, ...Object.entries(body)]
  const input = new Map<string, unknown>()
  for (const [name, value] of fields) {
    if (input.has(name)) throw new InvalidError(`The request has “${name}” twice. Send it once.`)
    input.set(name, value)
  }
  return Object.fromEntries(input)
}
