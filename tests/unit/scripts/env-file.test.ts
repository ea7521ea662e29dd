import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { describe, expect, test } from 'vitest'

import { readEnvironment } from '../../../scripts/lib/env-file.mjs'
import { localServices } from '../../../scripts/lib/services.mjs'
import { readSettings } from '../../../scripts/lib/settings.mjs'
import { temporaryFolder } from './temporary-folder'

function environmentOf(file: string, given: Record<string, string> = {}) {
  const path = join(temporaryFolder(), '.env')
  writeFileSync(path, file)
  return readEnvironment(path, given) as Record<string, string>
}

describe('the environment', () => {
  test('a missing .env leaves what the shell gave', () => {
    const path = join(temporaryFolder(), '.env')
    expect(readEnvironment(path, { PORT: '4000' })).toEqual({
      PORT: '4000',
    })
  })

  test('the shell wins over .env', () => {
    expect(environmentOf('PORT=4001\nHOST=0.0.0.0', { PORT: '4000' })).toEqual({
      PORT: '4000',
      HOST: '0.0.0.0',
    })
  })

  test('an empty value means not set, wherever it stands', () => {
    expect(environmentOf('PORT=4001\nDATABASE_URL=', { PORT: '' })).toEqual({ PORT: '4001' })
  })

  test('comments, quotes and values with spaces are read', () => {
    const file = '# a comment\nMAIL_FROM=Woadmap <woadmap@localhost>\nNEXTAUTH_SECRET="a # b"'
    expect(environmentOf(file)).toEqual({
      MAIL_FROM: 'Woadmap <woadmap@localhost>',
      NEXTAUTH_SECRET: 'a # b',
    })
  })

  test('.env.example as it is starts every local service on the standard ports', () => {
    const env = environmentOf(readFileSync('.env.example', 'utf8'))
    expect(localServices(env)).toEqual({ database: true, objectStore: true, mail: true })
    expect(readSettings(env, '/srv/woadmap')).toEqual({
      host: '127.0.0.1',
      port: 3000,
      appOrigin: 'http://localhost:3000',
      local: '/srv/woadmap/.local',
      uploads: '/srv/woadmap/uploads',
      databasePort: 5499,
      objectStorePort: 4568,
      mailPort: 2525,
      seedDemo: true,
    })
  })
})

describe('settings', () => {
  test('the address follows the port, and an address of its own loses its last slash', () => {
    expect(readSettings({ PORT: '4100' }, '/').appOrigin).toBe('http://localhost:4100')
    expect(readSettings({ APP_ORIGIN: 'https://yarn.example/' }, '/').appOrigin).toBe(
      'https://yarn.example',
    )
  })

  test.each(['0', '65536', '3000a', '-1', '80.5', '0x50'])('%s is refused as a port', (port) => {
    expect(() => readSettings({ LOCAL_MAIL_PORT: port }, '/')).toThrow(/LOCAL_MAIL_PORT/)
  })

  test('SEED_DEMO is true or false and nothing else', () => {
    expect(readSettings({ SEED_DEMO: 'false' }, '/').seedDemo).toBe(false)
    expect(() => readSettings({ SEED_DEMO: 'no' }, '/')).toThrow(/SEED_DEMO/)
  })

  test.each([
    ['DATABASE_URL', 'database'],
    ['S3_ENDPOINT', 'objectStore'],
    ['SMTP_URL', 'mail'],
  ])('with %s set, the local %s is not started', (name, service) => {
    const all = { database: true, objectStore: true, mail: true }
    expect(localServices({ [name]: 'elsewhere' })).toEqual({ ...all, [service]: false })
  })
})
