import { describe, expect, it } from 'vitest'
import { z } from 'zod'

/** Every schema of every noun. */
const MODULES = import.meta.glob<Record<string, unknown>>('../../../lib/*/schema.ts', {
  eager: true,
})

/**
 * Those that let a field pass which they do not name: addresses that people type and share, where
 * nonsense gives the default, and two that meet fields of somebody else.
 */
const LENIENT = new Map([
  ['galleryFilterSchema', 'the address of a page'],
  ['kitsAddressSchema', 'the address of a page'],
  ['shadeTableSchema', 'the address of a page'],
  ['sampleBookSchema', 'the address of a page'],
  ['rangeStudySchema', 'the address of a page'],
  ['nameListSchema', 'the address of a page'],
  ['heapAddressSchema', 'the address of a page'],
  ['reviewAddressSchema', 'the address of a page'],
  ['nameHistorySchema', 'the address of a page'],
  ['signInSchema', 'next-auth sends its own fields beside; none of them is looked at'],
  ['shadeFormSchema', 'what a form holds, never what is sent'],
])

const schemas = Object.values(MODULES)
  .flatMap((module) => Object.entries(module))
  .filter((entry): entry is [string, z.ZodType] => entry[1] instanceof z.ZodType)

/** Where, below a schema, an object takes fields it does not name. */
function openingsOf(schema: unknown, path: string, seen = new Set<unknown>()): string[] {
  if (!(schema instanceof z.ZodType) || seen.has(schema)) return []
  seen.add(schema)
  const def = schema.def as unknown as Record<string, unknown>
  const isOpen =
    def.type === 'object' && !(def.catchall instanceof z.ZodType && def.catchall.type === 'never')
  const below = Object.entries(def).flatMap(([name, value]) => {
    if (value instanceof z.ZodType) return openingsOf(value, path, seen)
    if (Array.isArray(value)) return value.flatMap((one) => openingsOf(one, path, seen))
    if (name !== 'shape') return []
    return Object.entries(value as object).flatMap(([field, one]) =>
      openingsOf(one, `${path}.${field}`, seen),
    )
  })
  return [...(isOpen ? [path] : []), ...below]
}

describe('a schema', () => {
  it.each(schemas)(
    '%s refuses a field that it does not name, unless it is known to',
    (name, it) => {
      expect(openingsOf(it, name).length > 0).toBe(LENIENT.has(name))
    },
  )

  it('is looked at down to the last object in it', () => {
    const deep = z
      .strictObject({ list: z.array(z.union([z.null(), z.object({ a: z.string() }).optional()])) })
      .transform((value) => value)
    expect(openingsOf(deep, 'deep')).toEqual(['deep.list'])
    expect(schemas.length).toBeGreaterThan(20)
  })
})
