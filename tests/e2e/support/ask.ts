import { Agent, request, type IncomingHttpHeaders } from 'node:http'

import type { ActionRule, Answer, Kind, PageRule, RouteRule } from './access-matrix'
import type { Place } from './places'
import type { Surface } from './product-surface'

/** One request, ready to be sent. */
export interface Question {
  kind: Kind
  method: string
  address: string
  /** JSON. */
  body?: string
  /** The id of a server action in the build. */
  action?: string
}

/** What came back. */
export interface Reply {
  answer: Answer
  status: number
  body: string
}

/** The address of a pattern in a place: `/[brand]/lines` → `/teasel-and-tarn/lines`. */
export function fill(pattern: string, place: Place): string {
  return pattern.replace(/\[(?:\.\.\.)?(\w+)\]/g, (_, name: string) => {
    const value = (place as unknown as Record<string, unknown>)[name]
    if (typeof value !== 'string') throw new Error(`A Place has no ${name}, which ${pattern} asks.`)
    return value
  })
}

/** Asks for a page. */
export function pageQuestion(pattern: string, rule: PageRule, place: Place): Question {
  return { kind: 'page', method: 'GET', address: fill(pattern, place) + (rule.query ?? '') }
}

/** Asks a route by its key in the matrix. */
export function routeQuestion(key: string, rule: RouteRule, place: Place): Question {
  const [method, pattern] = key.split(' ') as [string, string]
  const address = fill(rule.at ?? pattern, place) + (rule.query?.(place) ?? '')
  const body = rule.body && JSON.stringify(rule.body(place))
  return { kind: 'route', method, address, ...(body && { body }) }
}

/** Sends an action as the browser does; plain values travel as JSON. */
export function actionQuestion(
  name: string,
  rule: ActionRule,
  place: Place,
  { actions, pages }: Surface,
): Question {
  const { id, pages: senders } = actions.get(name)!
  if (!id) throw new Error(`${name} is in no page of the build.`)
  const pattern = [...pages].find(([, path]) => senders.includes(path))?.[0]
  if (!pattern) throw new Error(`${name} is sent by no page: ${senders.join(', ')}.`)
  const args = rule.args?.(place) ?? [place.brand, rule.input!(place)]
  return {
    kind: 'action',
    method: 'POST',
    address: fill(pattern, place),
    body: JSON.stringify(args),
    action: id,
  }
}

/** Sends it, with these cookies and further headers, and reads what came back. */
export async function ask(
  origin: string,
  question: Question,
  cookie: string,
  more: Record<string, string> = {},
): Promise<Reply> {
  const { kind, method, address, body, action } = question
  const writes = method !== 'GET' && method !== 'HEAD'
  const headers = {
    ...(cookie && { cookie }),
    ...(writes && { origin }),
    ...(body && { 'content-type': action ? 'text/plain;charset=UTF-8' : 'application/json' }),
    ...(action && { 'next-action': action, accept: 'text/x-component' }),
    ...more,
  }
  const answer = await send(origin, question, headers)
  // A browser's request for a page's data says in its address what is in its headers.
  const { location } = answer.headers
  if (location && /[?&]_rsc\b/.test(location) && !address.includes('_rsc')) {
    const { pathname, search } = new URL(location, origin)
    return ask(origin, { kind, method, address: pathname + search }, cookie, more)
  }
  return {
    answer: kind === 'action' ? actionAnswer(answer) : plainAnswer(answer, origin),
    status: answer.status,
    body: answer.bytes.toString(),
  }
}

interface Raw {
  status: number
  headers: IncomingHttpHeaders
  bytes: Buffer
}

const agent = new Agent({ keepAlive: true })

/** As it stands: fetch would put an odd address right before it is sent. */
function send(
  origin: string,
  { method, address, body }: Question,
  headers: Record<string, string>,
): Promise<Raw> {
  const { hostname, port } = new URL(origin)
  const length = body === undefined ? {} : { 'content-length': String(Buffer.byteLength(body)) }
  return new Promise((done, fail) => {
    const sent = request(
      { hostname, port, method, path: address, headers: { ...headers, ...length }, agent },
      (response) => {
        const chunks: Buffer[] = []
        response.on('data', (chunk: Buffer) => chunks.push(chunk))
        response.once('error', fail)
        response.once('end', () =>
          done({
            status: response.statusCode!,
            headers: response.headers,
            bytes: Buffer.concat(chunks),
          }),
        )
      },
    )
    sent.once('error', fail)
    sent.end(body)
  })
}

function plainAnswer({ status, headers: { location } }: Raw, origin: string): Answer {
  if (status < 300 || status > 399 || !location) return status
  const to = new URL(location, origin)
  return `→ ${to.origin === origin ? '' : to.origin}${to.pathname}`
}

function actionAnswer({ status, headers, bytes }: Raw): Answer {
  const redirect = headers['x-action-redirect']
  if (redirect) return `→ ${String(redirect).split(';')[0]!}`
  const rows = flightRows(bytes)
  // The first row is the framework's frame; `a` points to the row of what the action gave back.
  const frame = JSON.parse(rows.get(0) ?? '{}') as { a?: string }
  const row = rows.get(parseInt(/^\$@([0-9a-f]+)$/.exec(frame.a ?? '')?.[1] ?? '', 16))
  if (!row?.startsWith('{')) return status
  const result = JSON.parse(row) as { ok?: boolean; code?: Answer }
  return result.ok === true ? 'ok' : (result.code ?? status)
}

/**
 * The rows of React's wire format that hold JSON, by number. A row is `number:json\n`, or
 * `number:tag length,bytes` for text and binary ones, which hold no answer but may hold anything.
 */
export function flightRows(bytes: Buffer): Map<number, string> {
  const rows = new Map<number, string>()
  let at = 0
  while (at < bytes.length) {
    const colon = bytes.indexOf(':', at)
    if (colon < 0) break
    const id = parseInt(bytes.toString('latin1', at, colon), 16)
    const measured = /^[A-Za-z]([0-9a-f]+),/.exec(bytes.toString('latin1', colon + 1, colon + 14))
    if (measured) {
      at = colon + 1 + measured[0].length + parseInt(measured[1]!, 16)
      continue
    }
    const end = bytes.indexOf('\n', colon)
    const last = end < 0 ? bytes.length : end
    rows.set(id, bytes.toString('utf8', colon + 1, last))
    at = last + 1
  }
  return rows
}
