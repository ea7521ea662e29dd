import { isIPv6 } from 'node:net'

import { env } from '@/lib/env'

/** Set by watchRequests on every request; what a client sends under these names is written over. */
export const REQUEST_ID_HEADER = 'x-request-id'
/** The address the connection came from. */
export const PEER_HEADER = 'x-woadmap-peer'

/** The path that was asked for, which Next.js does not tell a page. */
export const PATH_HEADER = 'x-woadmap-path'

type HeaderSource = Pick<Headers, 'get'>

/** The id of the request, for the log, the activity record and the jobs it leads to. */
export const requestIdOf = (headers: HeaderSource): string | undefined =>
  headers.get(REQUEST_ID_HEADER) ?? undefined

/** Someone with an IPv6 connection has a whole /64 of addresses. */
function network(address: string): string {
  const plain = address.replace(/^::ffff:(?=\d+\.)/, '')
  if (!isIPv6(plain)) return plain
  const [head = '', tail] = plain.split('::')
  const groups = head.split(':').filter(Boolean)
  const after = tail?.split(':').filter(Boolean) ?? []
  const zeros = Array.from(
    { length: tail === undefined ? 0 : 8 - groups.length - after.length },
    () => '0',
  )
  return `${[...groups, ...zeros, ...after].slice(0, 4).join(':')}::/64`
}

/**
 * The network address a request came from. X-Forwarded-For is believed only as far as our own
 * proxies wrote it (TRUSTED_PROXIES of them, each adding one at its end); the rest anyone can forge.
 */
export function addressOf(headers: HeaderSource, trusted = env().TRUSTED_PROXIES): string {
  const peer = headers.get(PEER_HEADER) ?? ''
  const hops = [...(headers.get('x-forwarded-for')?.split(',') ?? []), peer].map((one) =>
    one.trim(),
  )
  // Next.js writes the peer into X-Forwarded-For where there is none.
  const own = hops.at(-1) === hops.at(-2) ? hops.slice(0, -1) : hops
  return network((trusted === 0 ? peer : own.at(-1 - trusted)) || peer)
}
