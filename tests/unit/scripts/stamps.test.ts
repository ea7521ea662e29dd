import { cpSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { beforeEach, describe, expect, test } from 'vitest'

import { packagesAreCurrent, requireNode } from '../../../scripts/lib/packages.mjs'
import { fingerprint } from '../../../scripts/lib/stamps.mjs'
import { temporaryFolder } from './temporary-folder'

describe('the fingerprint of sources', () => {
  let root: string
  const of = (folder = root, more: string[] = []) =>
    fingerprint(folder, ['app', 'config.mjs'], more)

  beforeEach(() => {
    root = temporaryFolder()
    mkdirSync(join(root, 'app/lines'), { recursive: true })
    writeFileSync(join(root, 'app/lines/page.tsx'), 'one')
    writeFileSync(join(root, 'config.mjs'), 'two')
  })

  test('stays when nothing changes, and when the whole checkout moves', () => {
    const before = of()
    const elsewhere = join(temporaryFolder(), 'checkout')
    cpSync(root, elsewhere, { recursive: true })
    expect(of()).toBe(before)
    expect(of(elsewhere)).toBe(before)
  })

  test.each<[string, () => void]>([
    ['a file changes', () => writeFileSync(join(root, 'app/lines/page.tsx'), 'on3')],
    ['a file is added', () => writeFileSync(join(root, 'app/new.tsx'), '')],
    ['a file goes', () => rmSync(join(root, 'config.mjs'))],
    ['a file gets another name', () => renameSync(join(root, 'app/lines'), join(root, 'app/line'))],
  ])('changes when %s', (_, change) => {
    const before = of()
    change()
    expect(of()).not.toBe(before)
  })

  test('changes with the further values it is given, and with where they are divided', () => {
    const each = [of(root), of(root, ['ab']), of(root, ['a', 'b'])]
    expect(new Set(each).size).toBe(3)
  })

  test('ignores what was not named', () => {
    const before = of()
    writeFileSync(join(root, 'README.md'), 'words')
    expect(of()).toBe(before)
  })
})

describe('installed packages', () => {
  type Packages = Record<string, { version?: string; integrity?: string; optional?: boolean }>
  const wanted: Packages = {
    '': {},
    'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
    'node_modules/for-another-platform': {
      version: '1.0.0',
      integrity: 'sha512-p',
      optional: true,
    },
  }

  function current(present: Packages | undefined): boolean {
    const root = temporaryFolder()
    writeFileSync(join(root, 'package-lock.json'), JSON.stringify({ packages: wanted }))
    mkdirSync(join(root, 'node_modules'))
    if (present) {
      const record = JSON.stringify({ packages: present })
      writeFileSync(join(root, 'node_modules/.package-lock.json'), record)
    }
    return packagesAreCurrent(root)
  }

  test('are current when npm recorded all that the lock asks for', () => {
    expect(current({ 'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' } })).toBe(true)
  })

  test.each<[string, Packages | undefined]>([
    ['there is no record of a finished install', undefined],
    ['one is missing', {}],
    ['one has another version', { 'node_modules/a': { version: '1.0.1', integrity: 'sha512-b' } }],
    ['one has other content', { 'node_modules/a': { version: '1.0.0', integrity: 'sha512-x' } }],
    [
      'one is there that the lock no longer has',
      {
        'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
        'node_modules/old': { version: '1.0.0' },
      },
    ],
  ])('are not current when %s', (_, present) => {
    expect(current(present)).toBe(false)
  })
})

describe('Node.js', () => {
  test.each(['18.20.0', '20.19.9'])('%s is too old', (version) => {
    expect(() => requireNode('.', version)).toThrow(`this is ${version}`)
  })

  test.each(['20.20.0', '20.21.3', '22.0.0', '24.1.0'])('%s will do', (version) => {
    expect(() => requireNode('.', version)).not.toThrow()
  })
})
