import { describe, expect, it } from 'vitest'

import { addressOf, PEER_HEADER } from '@/lib/server/request'

const headers = (peer: string, forwarded?: string) =>
  new Headers({
    [PEER_HEADER]: peer,
    ...(forwarded !== undefined && { 'x-forwarded-for': forwarded }),
  })

describe('the address of a request', () => {
  it.each([
    ['the peer', '203.0.113.7', undefined, '203.0.113.7'],
    ['the peer, as Next.js repeats it', '203.0.113.7', '203.0.113.7', '203.0.113.7'],
    ['the peer, whatever is forged', '203.0.113.7', '198.51.100.1', '203.0.113.7'],
    ['an IPv4 address in IPv6 dress', '::ffff:203.0.113.7', undefined, '203.0.113.7'],
    ['the network of an IPv6 address', '2001:db8:1:2:3:4:5:6', undefined, '2001:db8:1:2::/64'],
    ['the network of a short one', '2001:db8::1', undefined, '2001:db8:0:0::/64'],
  ])('without a proxy is %s', (_, peer, forwarded, address) => {
    expect(addressOf(headers(peer, forwarded), 0)).toBe(address)
  })

  it.each([
    ['what the proxy wrote', 1, '198.51.100.1', '198.51.100.1'],
    ['not what stands left of it', 1, '192.0.2.66, 198.51.100.1', '198.51.100.1'],
    [
      'what the outer of two proxies wrote',
      2,
      '192.0.2.66, 198.51.100.1, 10.0.0.2',
      '198.51.100.1',
    ],
    ['the proxy, when it wrote nothing', 1, '10.0.0.1', '10.0.0.1'],
    ['the proxy, when fewer stand there than we trust', 3, '198.51.100.1', '10.0.0.1'],
  ])('behind proxies is %s', (_, trusted, forwarded, address) => {
    expect(addressOf(headers('10.0.0.1', forwarded), trusted)).toBe(address)
  })
})
