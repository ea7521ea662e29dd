import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

import type pg from 'pg'

import { calledAs, type MatrixActor } from './actors'

/** What must not be read by some. */
export interface Secrets {
  /** By nobody: password hashes, keys of our own. */
  always: readonly string[]
  /** Session ids, each by nobody but its person: [e-mail, id]. */
  sessions: readonly (readonly [string, string])[]
  /** What a brand has written, by its slug. */
  texts: ReadonlyMap<string, BrandTexts>
}
interface BrandTexts {
  /** For all of the brand. */
  shared: readonly string[]
  /** Not for a dyer: photographs, combinations, and names that are not approved. */
  studio: readonly string[]
}

/** Shorter texts may stand anywhere by chance. */
const TELLING = 9

/** Gathers from the database what the product must keep to itself. */
export async function findSecrets(client: pg.Client): Promise<Secrets> {
  const read = async (sql: string) =>
    (await client.query<[string, string]>({ text: sql, rowMode: 'array' })).rows
  const hashes = await read('SELECT password_hash FROM people')
  const keys = ['NEXTAUTH_SECRET', 'S3_SECRET_ACCESS_KEY', 'DATABASE_URL']
  const shared = await read(`
    SELECT slug, name FROM brands
    UNION SELECT brands.slug, lines.name FROM lines JOIN brands ON brands.id = brand_id
    UNION SELECT slug, shades.name FROM shades JOIN brands ON brands.id = brand_id
    UNION SELECT slug, unnest(ARRAY[people.name, email]) FROM memberships
      JOIN people ON people.id = person_id JOIN brands ON brands.id = brand_id`)
  const studio = await read(`
    SELECT slug, unnest(ARRAY[title, alt_text]) FROM photographs JOIN brands ON brands.id = brand_id
    UNION SELECT slug, title FROM combinations JOIN brands ON brands.id = brand_id
    UNION SELECT slug, unnest(ARRAY[text, note]) FROM name_ideas JOIN brands ON brands.id = brand_id
      WHERE NOT EXISTS (SELECT FROM shades WHERE shades.name = text)
    UNION SELECT slug, text FROM name_remarks JOIN brands ON brands.id = brand_id`)
  const slugs = [...new Set(shared.map(([slug]) => slug))]
  const of = (rows: [string, string][], brand: string) => {
    const elsewhere = new Set(rows.filter(([slug]) => slug !== brand).map(([, text]) => text))
    return rows
      .filter(([slug, text]) => slug === brand && text?.length >= TELLING && !elsewhere.has(text))
      .map(([, text]) => text)
  }
  return {
    always: [
      ...new Set(hashes.map(([hash]) => hash)),
      '$argon2',
      ...keys.flatMap((name) => process.env[name] ?? []),
    ],
    sessions: await read(
      'SELECT email, sessions.id FROM sessions JOIN people ON people.id = person_id',
    ),
    texts: new Map(
      slugs.map((slug) => [slug, { shared: of(shared, slug), studio: of(studio, slug) }]),
    ),
  }
}

/** The secrets that a text holds although this actor reads it. */
export function secretsIn(text: string, secrets: Secrets, actor: MatrixActor): string[] {
  const hidden = [
    ...secrets.always,
    ...secrets.sessions.flatMap(([email, id]) => (email === actor.email ? [] : [id])),
    ...[...secrets.texts].flatMap(([brand, { shared, studio }]) => {
      if (brand !== actor.brand) return [...shared, ...studio]
      return actor.role === 'dyer' ? studio : []
    }),
  ]
  const read = plain(text)
  const own = [actor.email, calledAs(actor.name)]
  return hidden.filter((secret) => !own.includes(secret) && read.includes(secret))
}

/** The text with the escapes of HTML, of JSON, and of JSON within a script undone. */
function plain(text: string): string {
  const entities: Record<string, string> = { amp: '&', quot: '"', '#x27': "'", lt: '<', gt: '>' }
  const once = (escaped: string) =>
    escaped
      .replace(/&(amp|quot|#x27|lt|gt);/g, (_, name: string) => entities[name]!)
      .replace(/\\(?:u([0-9a-f]{4})|(["\\/]))/gi, (_, hex?: string, itself?: string) =>
        hex ? String.fromCharCode(parseInt(hex, 16)) : itself!,
      )
  return once(once(text))
}

/** The secrets of the product that stand in the logs of its processes, each with its file. */
export function secretsInLogs(
  folder: string,
  { always, sessions, texts }: Secrets,
): { files: string[]; found: [string, string][] } {
  const hidden = [
    ...always,
    ...sessions.map(([, id]) => id),
    ...[...texts.values()].flatMap(({ shared, studio }) => [...shared, ...studio]),
  ]
  const files = readdirSync(folder)
  const found = files.flatMap((file) => {
    const text = plain(readFileSync(join(folder, file), 'utf8'))
    return hidden.filter((one) => text.includes(one)).map((one): [string, string] => [file, one])
  })
  return { files, found }
}
