import { randomBytes, randomUUID } from 'node:crypto'

import type pg from 'pg'

/** One line of a brand with its rows: what addresses and inputs are filled with. */
export interface Place {
  /** Slugs, as in an address. */
  brand: string
  /** Of somebody who is an owner of the brand. */
  ownerEmail: string
  /** Of no letter. */
  token: string
  line: string
  lineName: string
  shade: string
  shadeNumber: string
  shadeStatus: string
  /** Its place in the line's order, from 1. */
  shadePlace: number
  /** Five shades that a combination holds. */
  five: readonly string[]
  /** Read and ready. */
  photograph: string
  sha256: string
  /** The file name of one of the photograph's copies. */
  name: string
  /** A photograph that waits to be read. */
  waiting: string
  /** A photograph to delete. */
  spare: string
  /** An upload that was announced; its row is made when it is wanted. */
  pending: string
  combination: string
  /** The submit that kept the combination. */
  requestKey: string
  /** A combination to delete. */
  spareCombination: string
  /** Built once of the combination, and expired since. */
  kit: string
  /** The name of one of the kit's pictures. */
  picture: string
  /** A kit to delete; its row is made when it is wanted. */
  spareKit: string
  /** An idea for the shade's name, in review. */
  idea: string
  /** What it says, and no other. */
  ideaText: string
  /** An idea for the shade's name that was put by. */
  spareIdea: string
  /** A search in a register that was recorded for the idea. */
  search: string
}

/** The fields of a place that name a row by its id. */
const IDS = [
  'shade',
  'photograph',
  'waiting',
  'spare',
  'pending',
  'combination',
  'kit',
  'spareKit',
  'idea',
  'spareIdea',
  'search',
] as const

/** A place of the brand whose rows are another place's. */
export function withRowsOf(other: Place, own: Place): Place {
  const { five, spareCombination } = other
  const ids = Object.fromEntries(IDS.map((field) => [field, other[field]]))
  return { ...own, ...ids, five, spareCombination }
}

/** A place of the brand whose rows are nobody's. */
export function withUnknownRows(own: Place): Place {
  const ids = Object.fromEntries(IDS.map((field) => [field, randomUUID()]))
  const five = own.five.map(() => randomUUID())
  return { ...own, ...ids, five, spareCombination: randomUUID() }
}

/**
 * The words of an answer, to compare what is said of two places: each once, since the parts of a
 * page come as their queries end; without the names of the place's rows and the numbers of parts.
 */
export function wordsOf(
  body: string,
  { brand, line, five, spareCombination, ...place }: Place,
): readonly string[] {
  const ids = [...IDS.map((field) => place[field]), ...five, spareCombination, brand, line]
  const said = ids.reduce((rest, id) => rest.replaceAll(id, 'one'), body)
  // `$L2d` refers to a part, `2d:` begins one; a nonce is another at every request.
  const unnumbered = said
    .replace(/[A-Za-z0-9+/]{22}==/g, ' ')
    .replace(/\\n/g, ' ')
    .replace(/\$[A-Za-z@]?[0-9a-f]{1,3}\b/g, ' ')
  const words = unnumbered.match(/[\p{L}\p{N}_.:/-]+/gu) ?? []
  return [...new Set(words)].filter((word) => !/^[BPS]?:?[0-9a-f]{1,2}(:\w*)?$/.test(word)).sort()
}

/** A copy of a row with some of its columns changed. */
export async function copyRow(
  client: pg.Client,
  table: string,
  id: string,
  changes: Record<string, unknown>,
): Promise<string> {
  const copy = { id: randomUUID(), ...changes }
  await client.query(
    `INSERT INTO ${table} SELECT (jsonb_populate_record(model, $2)).* FROM ${table} AS model
     WHERE id = $1`,
    [id, JSON.stringify(copy)],
  )
  return copy.id
}

/** A photograph and a combination of the demo, which the rows of both places are made after. */
interface Models {
  photograph: string
  combination: string
}

/** The demo's first photograph that has been read, and a combination; null until there is one. */
export async function findModels(client: pg.Client): Promise<Models | null> {
  const { rows } = await client.query<Models>(
    `SELECT photographs.id AS photograph, combinations.id AS combination
     FROM photographs JOIN readings ON readings.photograph_id = photographs.id
       JOIN combinations ON combinations.photograph_id = photographs.id
     WHERE state = 'ready' AND derivatives <> '[]'
       AND photographs.deleted_at IS NULL AND combinations.deleted_at IS NULL
     ORDER BY photographs.created_at, combinations.created_at LIMIT 1`,
  )
  return rows[0] ?? null
}

/**
 * Takes the line as a place: its own shades, and rows made for the test alone beside them. A line
 * without a photograph gets a copy of the demo's.
 */
export async function makePlace(
  client: pg.Client,
  models: Models,
  brand: string,
  line: string,
): Promise<Place> {
  const { rows: shades } = await client.query(
    `SELECT shades.brand_id, line_id, lines.name AS line_name, shades.id, number, status
     FROM shades JOIN lines ON lines.id = line_id JOIN brands ON brands.id = lines.brand_id
     WHERE brands.slug = $1 AND lines.slug = $2 AND deleted_at IS NULL
     ORDER BY position, shades.created_at, shades.id`,
    [brand, line],
  )
  const { brand_id, line_id, line_name, id, number, status } = shades[0]
  const inLine = { brand_id, line_id, deleted_at: null, uploaded_by_id: null }
  const addPhotograph = (title: string, changes: object = {}) => {
    const changed = { ...inLine, id: randomUUID(), title, sha256: randomBytes(32).toString('hex') }
    const object_key = `originals/${brand_id}/${changed.id}`
    return copyRow(client, 'photographs', models.photograph, { ...changed, object_key, ...changes })
  }

  const read = await client.query(
    `SELECT photographs.id FROM photographs JOIN readings ON photograph_id = photographs.id
     WHERE line_id = $1 AND photographs.id = $2`,
    [line_id, models.photograph],
  )
  let photograph: string | undefined = read.rows[0]?.id
  if (!photograph) {
    photograph = await addPhotograph(`Seen from ${line_name} alone`)
    const reading = await client.query('SELECT id FROM readings WHERE photograph_id = $1', [
      models.photograph,
    ])
    await copyRow(client, 'readings', reading.rows[0].id, { brand_id, photograph_id: photograph })
  }
  const file = await client.query('SELECT sha256, derivatives FROM photographs WHERE id = $1', [
    photograph,
  ])
  const { sha256, derivatives } = file.rows[0]
  const copy = derivatives.find(({ format }: { format: string }) => format === 'webp')

  const requestKey = randomUUID()
  const five: string[] = shades.slice(0, 5).map((shade) => shade.id)
  const addCombination = (title: string, request_key: string) =>
    copyRow(client, 'combinations', models.combination, {
      brand_id,
      line_id,
      photograph_id: photograph,
      created_by_id: null,
      deleted_at: null,
      title,
      request_key,
    })
  const combination = await addCombination(`Kept for ${line_name} alone`, requestKey)
  await client.query(
    `INSERT INTO combination_places (brand_id, combination_id, place, role, shade_id, share)
     SELECT $1, $2, place, (ARRAY['MC', 'CC1', 'CC2', 'CC3', 'CC4'])[place], shade_id, 0.2
     FROM unnest($3::uuid[]) WITH ORDINALITY AS five (shade_id, place)`,
    [brand_id, combination, five],
  )
  const kit = randomUUID()
  await client.query(
    `INSERT INTO kits (id, brand_id, line_id, state, selection, request_key, expires_at)
     VALUES ($1, $2, $3, 'ready', $4, $5, now() - interval '1 day')`,
    [kit, brand_id, line_id, JSON.stringify([combination]), requestKey],
  )
  const ideaText = `Said of ${line_name} ${requestKey.slice(0, 8)}`
  const addIdea = async (state: string) => {
    const made = await client.query(
      `INSERT INTO name_ideas (brand_id, line_id, shade_id, text, state, round)
       VALUES ($1, $2, $3, $4, $5, 1) RETURNING id`,
      [brand_id, line_id, id, ideaText, state],
    )
    return made.rows[0].id as string
  }
  const idea = await addIdea('in-review')
  const search = await client.query(
    `INSERT INTO name_searches (brand_id, idea_id, register, searched_by, searched_on, outcome)
     VALUES ($1, $2, 'A register', 'Somebody', '2026-11-01', 'nothing found') RETURNING id`,
    [brand_id, idea],
  )
  const owner = await client.query(
    `SELECT email FROM people JOIN memberships ON person_id = people.id
     WHERE brand_id = $1 AND role = 'owner' ORDER BY people.created_at, people.id LIMIT 1`,
    [brand_id],
  )
  return {
    brand,
    ownerEmail: owner.rows[0].email,
    token: 'A'.repeat(43),
    line,
    lineName: line_name,
    shade: id,
    shadeNumber: number,
    shadeStatus: status,
    shadePlace: 1,
    five,
    photograph,
    sha256,
    name: `${sha256.slice(0, 12)}-${copy.width}.${copy.format}`,
    waiting: await addPhotograph(`Waiting with ${line_name}`, { state: 'waiting' }),
    spare: await addPhotograph(`Spared by ${line_name}`),
    pending: randomUUID(),
    combination,
    requestKey,
    spareCombination: await addCombination(`Spared with ${line_name}`, randomUUID()),
    kit,
    picture: `${combination}-1080x1080.png`,
    spareKit: randomUUID(),
    idea,
    ideaText,
    spareIdea: await addIdea('put-by'),
    search: search.rows[0].id,
  }
}

/** Removes the rows that makePlace added. */
export async function clearPlace(client: pg.Client, models: Models, place: Place): Promise<void> {
  const { photograph, waiting, spare, pending, combination, spareCombination, kit, spareKit } =
    place
  // And what was written down for it.
  await client.query('DELETE FROM name_ideas WHERE text = $1', [place.ideaText])
  await client.query('DELETE FROM kits WHERE id = ANY ($1)', [[kit, spareKit]])
  await client.query('DELETE FROM combinations WHERE id = ANY ($1)', [
    [combination, spareCombination],
  ])
  await client.query('DELETE FROM photographs WHERE id = ANY ($1) AND id <> $2', [
    [photograph, waiting, spare, pending],
    models.photograph,
  ])
}
