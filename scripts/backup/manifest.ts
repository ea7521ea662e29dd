import { createHash } from 'node:crypto'
import { join } from 'node:path'

import { z } from 'zod'

const sha256 = z.string().regex(/^[0-9a-f]{64}$/)
const size = z.int().min(0)

const schema = z.strictObject({
  format: z.literal(1),
  /** When the database stood as it is in the dump. */
  takenAt: z.iso.datetime(),
  /** The name of the last migration. */
  migration: z.string(),
  /** Every role besides the owner that the dump gives rights to. */
  roles: z.array(z.string()),
  /** Rows by table. */
  tables: z.record(z.string(), size),
  dump: z.strictObject({ sha256, byteLength: size }),
  objects: z.array(
    z.strictObject({ key: z.string(), contentType: z.string(), byteLength: size, sha256 }),
  ),
  /** The keys that rows name and the store had lost before. */
  missing: z.array(z.string()),
})

/** What a backup holds and how to tell that it is whole. Written last: without it, it is none. */
export type Manifest = z.infer<typeof schema>
/** One object of the bucket in a backup. */
export type BackedUpObject = Manifest['objects'][number]

/** Reads a manifest. @throws z.ZodError or SyntaxError when it is none */
export function parseManifest(text: string): Manifest {
  return schema.parse(JSON.parse(text))
}

/** The files of a backup. Objects are kept by their content: no key becomes a path. */
export const filesOf = (folder: string) => ({
  manifest: join(folder, 'manifest.json'),
  dump: join(folder, 'database.dump'),
  objects: join(folder, 'objects'),
  object: (hash: string) => join(folder, 'objects', hash),
})

/** The SHA-256 of bytes in hexadecimal. */
export const hashOf = (bytes: Uint8Array): string =>
  createHash('sha256').update(bytes).digest('hex')
