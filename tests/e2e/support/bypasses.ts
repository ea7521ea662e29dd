import { fill } from './ask'
import type { Place } from './places'

/** A segment of an address as the router knows it: [parameter, value, kind, siblings] or its name. */
type Part = string | [string, string, 'd', null]

/** The parts of a page of the build in a place, route groups among them. */
export function partsOf(path: string, place: Place): Part[] {
  return path
    .split('/')
    .slice(1, -1)
    .map((segment): Part => {
      const name = /^\[(\w+)\]$/.exec(segment)?.[1]
      return name ? [name, fill(segment, place), 'd', null] : segment
    })
}

/** What a browser sends that has all layouts of a page already: only the page itself is wanted. */
function stateTree(parts: readonly Part[]): string {
  const leaf: unknown = ['__PAGE__', {}, null, 'refetch']
  const tree = [...parts].reverse().reduce((child, part) => [part, { children: child }], leaf)
  return encodeURIComponent(JSON.stringify(['', { children: tree }]))
}

const repeated = (name: string) => Array(5).fill(name).join(':')

/**
 * Headers that got past a proxy, or round it, in this framework or another: each is sent with a
 * request for `address`. `parts` where that is a page.
 */
export function bypassHeaders(
  address: string,
  parts: readonly Part[] | null,
): readonly Record<string, string>[] {
  const rsc = { RSC: '1' }
  return [
    ...[
      'pages/_middleware',
      'middleware',
      repeated('middleware'),
      repeated('src/middleware'),
      repeated('proxy'),
    ].map((name) => ({ 'x-middleware-subrequest': name })),
    { 'x-middleware-next': '1' },
    { 'x-middleware-invoke': '1' },
    { 'x-middleware-prefetch': '1' },
    { 'x-middleware-rewrite': address },
    { 'x-middleware-override-headers': 'cookie' },
    { 'x-nextjs-data': '1' },
    { 'x-invoke-path': address },
    { 'x-invoke-status': '200' },
    { 'x-matched-path': address },
    { 'x-now-route-matches': '1=anything' },
    { 'x-original-url': '/sign-in' },
    { 'x-rewrite-url': '/sign-in' },
    { 'x-forwarded-host': 'elsewhere.example' },
    { 'x-forwarded-for': '127.0.0.1', 'x-real-ip': '127.0.0.1' },
    { 'x-http-method-override': 'HEAD' },
    { 'next-url': address },
    { 'next-resume': '1' },
    { purpose: 'prefetch' },
    { 'sec-purpose': 'prefetch;prerender' },
    { 'x-purpose': 'preview' },
    rsc,
    { ...rsc, 'next-router-prefetch': '1' },
    { ...rsc, 'next-router-prefetch': '2' },
    { ...rsc, 'next-router-prefetch': '1', 'next-router-segment-prefetch': '/_tree' },
    { ...rsc, 'next-router-prefetch': '1', 'next-router-segment-prefetch': '/__PAGE__' },
    { ...rsc, 'next-hmr-refresh': '1' },
    ...(parts ? [{ ...rsc, 'next-router-state-tree': stateTree(parts) }] : []),
  ]
}

/** Other spellings of an address, which a proxy and a router may not read alike. */
export function bypassAddresses(address: string): readonly string[] {
  const [path, query = ''] = address.split(/(?=\?)/) as [string, string?]
  return [
    `${path}.rsc${query}`,
    `${path}.json${query}`,
    `${path}.txt${query}`,
    `${path}.segments/_tree.segment.rsc`,
    `${path}.segments/__PAGE__.segment.rsc`,
    `/_next/data/build${path}.json`,
    `${path}?_rsc=1`,
    `${path}/${query}`,
    `${path}//${query}`,
    `/${path}${query}`,
    `${path.replaceAll('/', '//')}${query}`,
    `/.${path}${query}`,
    `/%2e${path}${query}`,
    `/sign-in/%2e%2e${path}${query}`,
    `/api/..%2f${path.slice(1)}${query}`,
    `/%2f${path.slice(1)}${query}`,
    `${path.replace(/(?<=.)\/(?=[^/]*$)/, '%2f')}${query}`,
    `${path.replaceAll('/', '%2F').replace('%2F', '/')}${query}`,
    `${path.replaceAll('/', '%5c').replace('%5c', '/')}${query}`,
    `${path}%00${query}`,
    `${path}%20${query}`,
    `${path};/sign-in${query}`,
    `${path}%3f.png`,
    `${path.toUpperCase()}${query}`,
    `${path.replace(/[a-z]/, (letter) => `%${letter.charCodeAt(0).toString(16)}`)}${query}`,
  ]
}
