import { beforeAll, describe, expect, test } from 'vitest'

import { broken, FIRST_LOOK } from './broken'

beforeAll(() => broken('worker.ts', ''), FIRST_LOOK)

const value = (source: string) => `import * as it from '${source}'; void it`
const type = (source: string) =>
  `import type * as It from '${source}'; export type Its = keyof typeof It`

const COLOR = 'lib/color/another.ts'
const NAMING = 'lib/naming/another.ts'
const MODEL = 'models/Another.ts'
const COMMAND = 'lib/shades/another-command.ts'
const SCHEMA = 'lib/lines/schema.ts'
const COMPONENT = 'components/shades/another.tsx'
const PAGE = 'app/another/page.tsx'

describe('the import table', () => {
  test.each([
    [COLOR, value('@/lib/color/types')],
    [COLOR, value('culori/fn')],
    [COLOR, value('@vibrant/quantizer-mmcq')],
    [NAMING, value('@/lib/color/types')],
    [NAMING, value('cmu-pronouncing-dictionary')],
    [COMMAND, value('@/lib/naming/play')],
    [COMPONENT, type('@/lib/naming/finding')],
    [MODEL, value('sequelize')],
    [MODEL, value('@/lib/env')],
    [MODEL, value('@/lib/errors')],
    [MODEL, type('@/lib/color/types')],
    [MODEL, type('@/lib/lines/schema')],
    [COMMAND, value('@/models')],
    [COMMAND, value('@/lib/color/types')],
    [COMMAND, value('@/lib/auth/actor')],
    [COMMAND, value('@/lib/storage/objects')],
    [COMMAND, value('@/lib/jobs/queue')],
    [COMMAND, value('@/lib/errors')],
    [COMMAND, value('@/lib/env')],
    [COMMAND, value('@/lib/logger')],
    [COMMAND, value('@/lib/lines/queries')],
    [COMMAND, value('@/lib/lines/schema')],
    [COMMAND, value('node:crypto')],
    [COMMAND, value('zod')],
    [SCHEMA, value('zod')],
    [SCHEMA, value('@/lib/color/types')],
    [SCHEMA, value('@/lib/shades/schema')],
    ['lib/auth/another.ts', value('next/headers')],
    ['lib/server/another.ts', value('next/cache')],
    ['lib/server/another.ts', value('@/lib/auth/actor')],
    ['lib/jobs/another.ts', value('@/models')],
    ['lib/storage/another.ts', value('@aws-sdk/client-s3')],
    [COMPONENT, value('@/components/ui/button')],
    [COMPONENT, value('@/lib/color/types')],
    [COMPONENT, value('@/lib/lines/schema')],
    [COMPONENT, type('@/lib/lines/present')],
    [COMPONENT, value('next/link')],
    [PAGE, value('@/lib/lines/queries')],
    [PAGE, value('@/lib/auth/get-actor')],
    [PAGE, value('@/lib/server/define-action')],
    [PAGE, value('@/components/ui/button')],
    ['scripts/another.ts', value('@/models')],
    ['worker.ts', value('@/models')],
    ['tests/integration/another.test.ts', value('@/models')],
  ])('%s may: %s', async (path, text) => {
    expect(await broken(path, text)).toEqual([])
  })

  test.each([
    [COLOR, value('node:fs')],
    [COLOR, value('fs')],
    [COLOR, value('next/headers')],
    [COLOR, value('sharp')],
    [COLOR, value('sequelize')],
    [COLOR, type('@/models')],
    [COLOR, value('@/lib/errors')],
    [COLOR, value('../errors')],
    [NAMING, value('node:fs')],
    [NAMING, value('fontkit')],
    [NAMING, value('@/models')],
    [COMPONENT, value('@/lib/naming/play')],
    [MODEL, value('@/lib/color/types')],
    [MODEL, value('@/lib/lines/schema')],
    [MODEL, value('@/lib/lines/queries')],
    [MODEL, value('@/lib/auth/actor')],
    [MODEL, value('react')],
    [COMMAND, value('@/app/fonts')],
    [COMMAND, value('@/components/ui/cn')],
    [COMMAND, value('@/lib/server/define-action')],
    [COMMAND, value('next/headers')],
    [COMMAND, value('next-auth')],
    [COMMAND, value('react')],
    [SCHEMA, value('@/models')],
    [SCHEMA, value('@/lib/lines/queries')],
    [SCHEMA, value('node:crypto')],
    ['lib/jobs/another.ts', value('next/headers')],
    ['lib/storage/another.ts', value('@/components/ui/cn')],
    ['lib/auth/another.ts', value('@/app/fonts')],
    [COMPONENT, value('@/lib/lines/present')],
    [COMPONENT, type('@/lib/lines/queries')],
    [COMPONENT, value('@/lib/lines/create-line')],
    [COMPONENT, value('@/lib/auth/actor')],
    [COMPONENT, value('@/models')],
    [COMPONENT, value('@/app/fonts')],
    [COMPONENT, value('node:path')],
    [PAGE, value('@/models')],
    [PAGE, type('@/models')],
    [PAGE, value('../../models')],
    [PAGE, value('@/lib/storage/objects')],
    [PAGE, value('sequelize')],
    ['lib/helpers.ts', value('@/models')],
    [PAGE, `export const late = () => import('@/models')`],
    [PAGE, `export * from '@/models'`],
  ])('%s may not: %s', async (path, text) => {
    expect(await broken(path, text)).toContain('boundaries/dependencies')
  })
})

describe('the environment', () => {
  const reads = [
    'export const port = process.env.PORT',
    'export const { env } = process',
    `import { env } from 'node:process'\nexport const port = env.PORT\n`,
  ]

  test.each([COMMAND, PAGE, COMPONENT, MODEL, 'worker.ts', 'seeders/another.ts'])(
    '%s may not read it',
    async (path) => {
      for (const text of reads) {
        expect(await broken(path, text)).toContainEqual(expect.stringMatching(/^no-restricted-/))
      }
    },
  )

  test.each(['lib/env.ts', 'scripts/start.mjs', 'next.config.mjs', 'playwright.config.ts'])(
    '%s may',
    async (path) => {
      expect(await broken(path, reads[0]!)).toEqual([])
    },
  )
})

describe('pure code', () => {
  test.each([
    'export const now = () => Date.now()',
    'export const today = () => new Date()',
    'export const luck = () => Math.random()',
    'export const tick = () => performance.now()',
    'export const id = () => crypto.randomUUID()',
    'export const port = () => process.env.PORT',
  ])('lib/color may not: %s', async (text) => {
    expect(await broken(COLOR, text)).toContainEqual(expect.stringMatching(/^no-restricted-/))
    expect(await broken('scripts/another.ts', text)).not.toContain('no-restricted-globals')
  })

  test('lib/color may reckon', async () => {
    expect(await broken(COLOR, 'export const root = (x: number) => Math.cbrt(x)\n')).toEqual([])
  })
})

test('a type is imported as one', async () => {
  const text = `import { Lab } from '@/lib/color/types'\nexport type Two = [Lab, Lab]\n`
  expect(await broken(COMMAND, text)).toEqual(['@typescript-eslint/consistent-type-imports'])
})
