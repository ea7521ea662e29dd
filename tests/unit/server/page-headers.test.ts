import { beforeEach, describe, expect, it, vi } from 'vitest'

import { makePageHeaders } from '@/lib/server/page-headers'

const settings = vi.hoisted(() => ({ current: {} as Record<string, string> }))
vi.mock('@/lib/env', () => ({ env: () => settings.current }))

beforeEach(() => {
  settings.current = {
    NODE_ENV: 'production',
    APP_ORIGIN: 'https://studio.example',
    S3_ENDPOINT: 'http://store.internal:9000',
  }
})

const policy = () => makePageHeaders()['Content-Security-Policy']!.split('; ')

describe('the headers of a page', () => {
  it('let in scripts by a nonce that is new at every request, and none by eval or inline', () => {
    const scripts = () => policy().find((part) => part.startsWith('script-src'))!
    expect(scripts()).toMatch(/^script-src 'self' 'nonce-[\w+/]{22}==' 'strict-dynamic'$/)
    expect(scripts()).not.toBe(scripts())
  })

  it('hold browsers to TLS where the product is served over it, and nowhere else', () => {
    expect(policy()).toContain('upgrade-insecure-requests')
    expect(makePageHeaders()['Strict-Transport-Security']).toBe('max-age=31536000')
    settings.current.APP_ORIGIN = 'http://localhost:3000'
    expect(policy()).not.toContain('upgrade-insecure-requests')
    expect(makePageHeaders()).not.toHaveProperty('Strict-Transport-Security')
  })

  it('let a page reach the object store where the browser finds it, by its origin alone', () => {
    expect(policy()).toContain("connect-src 'self' http://store.internal:9000")
    settings.current.S3_PUBLIC_ENDPOINT = 'https://objects.example/woadmap?x=1'
    expect(policy()).toContain("connect-src 'self' https://objects.example")
  })

  it('allow eval only while developing', () => {
    expect(policy().join()).not.toContain('unsafe-eval')
    settings.current.NODE_ENV = 'development'
    expect(policy().join()).toContain("'unsafe-eval'")
  })
})
