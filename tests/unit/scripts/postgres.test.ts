import { chmodSync, mkdirSync, statSync, symlinkSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { describe, expect, test } from 'vitest'

import { sudoSentence } from '../../../scripts/lib/debian.mjs'
import { choosePostgres, CLIENT, findPostgres } from '../../../scripts/lib/postgres-binaries.mjs'
import { blockedAncestor, placePostgres } from '../../../scripts/lib/postgres-owner.mjs'
import { keepSecret } from '../../../scripts/lib/secrets.mjs'
import { temporaryFolder } from './temporary-folder'

function installed(folder: string, programs = ['postgres', 'initdb']): string {
  mkdirSync(folder, { recursive: true })
  for (const program of programs) writeFileSync(join(folder, program), '')
  return folder
}

describe('finding PostgreSQL', () => {
  test('looks where Debian keeps it, newest first', () => {
    const debian = temporaryFolder()
    installed(join(debian, '15/bin'))
    installed(join(debian, '17/bin'))
    expect(findPostgres('', debian).map(({ major }) => major)).toEqual([17, 15])
  })

  test('looks in the PATH, and names one that is there by two ways once', () => {
    const debian = temporaryFolder()
    const real = installed(join(debian, '15/bin'))
    const path = temporaryFolder()
    for (const name of ['postgres', 'initdb']) symlinkSync(join(real, name), join(path, name))
    expect(findPostgres(path, debian)).toEqual([{ folder: real, major: 15 }])
  })

  test('a folder with half of the programs does not count', () => {
    const path = installed(temporaryFolder(), ['postgres'])
    expect(findPostgres(`/nowhere:${path}`, '/nowhere')).toEqual([])
  })

  test('the programs that copy a database may be there without those that run one', () => {
    const debian = temporaryFolder()
    installed(join(debian, '16/bin'), CLIENT)
    expect(findPostgres('', debian)).toEqual([])
    expect(findPostgres('', debian, CLIENT).map(({ major }) => major)).toEqual([16])
  })

  test('a data folder is run by the version that made it, or refused by name', () => {
    const found = [
      { folder: '/17', major: 17 },
      { folder: '/15', major: 15 },
    ]
    expect(choosePostgres(found, undefined, '/data').folder).toBe('/17')
    expect(choosePostgres(found, 15, '/data').folder).toBe('/15')
    expect(() => choosePostgres(found, 14, '/data')).toThrow(/postgresql-14/)
  })
})

describe('who runs PostgreSQL', () => {
  test('the topmost folder on the way that somebody may not pass is named', () => {
    const top = temporaryFolder()
    const shut = join(top, 'shut')
    mkdirSync(join(shut, 'inner'), { recursive: true })
    chmodSync(top, 0o755)
    chmodSync(shut, 0o700)
    chmodSync(join(shut, 'inner'), 0o700)
    const owner = statSync(shut)
    const somebody = { uid: owner.uid + 1, gid: owner.gid + 1 }
    expect(blockedAncestor(join(shut, 'inner'), somebody)).toBe(shut)
    expect(blockedAncestor(join(shut, 'inner'), owner)).toBeUndefined()
    chmodSync(shut, 0o710)
    chmodSync(join(shut, 'inner'), 0o755)
    expect(blockedAncestor(join(shut, 'inner'), { ...somebody, gid: owner.gid })).toBeUndefined()
  })

  test('an ordinary user runs a new cluster as himself, beside the checkout', () => {
    const local = temporaryFolder()
    expect(placePostgres(local, 12345)).toEqual({
      home: join(local, 'postgres'),
      data: join(local, 'postgres/data'),
    })
  })

  test("another user's cluster is refused with what to do", () => {
    const local = temporaryFolder()
    mkdirSync(join(local, 'postgres/data'), { recursive: true })
    const stranger = statSync(local).uid + 1
    expect(() => placePostgres(local, stranger)).toThrow(/belongs to another user.*WOADMAP_LOCAL/)
  })
})

test('an ordinary user is told one command that installs what is missing', () => {
  const sentence = sudoSentence(['postgresql', 'chromium'])
  expect(sentence).toMatch(/sudo sh -c '.*apt-get install .* postgresql chromium'/)
  expect(sentence).toContain('create_main_cluster = false')
  expect(sudoSentence(['chromium'])).not.toContain('create_main_cluster')
})

test('a secret is made once and readable by its owner only', () => {
  const path = join(temporaryFolder(), 'deep/secret')
  const secret = keepSecret(path)
  expect(secret).toMatch(/^[\w-]{43}$/)
  expect(keepSecret(path)).toBe(secret)
  expect(statSync(path).mode & 0o777).toBe(0o600)
})
