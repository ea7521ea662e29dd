import { setTimeout as sleep } from 'node:timers/promises'

import { QueryTypes } from 'sequelize'

import { sequelize } from '@/models'

/** How many rows of each kind a line is to have. */
export interface LineSize {
  shades: number
  photographs: number
  combinations: number
}

const run = (sql: string, bind: Record<string, unknown>) =>
  sequelize().query(sql, { bind, type: QueryTypes.RAW })

/** Makes a brand of nobody. @returns its id */
export async function fillBrand(slug: string): Promise<string> {
  const [row] = await sequelize().query<{ id: string }>(
    'INSERT INTO brands (name, slug) VALUES ($slug::text, $slug::text) RETURNING id',
    { bind: { slug }, type: QueryTypes.SELECT },
  )
  return row!.id
}

/**
 * Makes a line with so many rows, every one as large as real ones are: photographs with their copies
 * and reading, combinations of five shades.
 */
export async function fillLine(brandId: string, slug: string, size: LineSize): Promise<void> {
  const [line] = await sequelize().query<{ id: string }>(
    `INSERT INTO lines (brand_id, slug, name, fibres, ply, weight_number, net_grams, length,
       length_unit, needle_mm, gauge_stitches, gauge_rows, currency, price_minor)
     VALUES ($brandId, $slug::text, $slug::text, '[{"fibre": "wool", "percent": 100}]', 3, 3, 100, 225,
       'm', 4, 22, 30, 'EUR', 2150)
     RETURNING id`,
    { bind: { brandId, slug }, type: QueryTypes.SELECT },
  )
  const lineId = line!.id
  await run(
    `INSERT INTO shades (brand_id, line_id, number, name, lab_l, lab_a, lab_b, illuminant, observer,
       status, position)
     SELECT $brandId::uuid, $lineId::uuid, n::text, 'Shade of the ' || n || 'th morning', 15 + (n * 37) % 80,
       (n * 53) % 90 - 45, (n * 71) % 90 - 45, 'D65', 10, 'approved', n
     FROM generate_series(1, $count::int) n`,
    { brandId, lineId, count: size.shades },
  )
  await run(
    `INSERT INTO name_ideas (brand_id, line_id, shade_id, text, state, round)
     SELECT brand_id, line_id, id, name, 'approved', 1 FROM shades WHERE line_id = $lineId::uuid`,
    { lineId },
  )
  await run(
    `INSERT INTO families (brand_id, line_id, name, position)
     SELECT $brandId::uuid, $lineId::uuid, 'Family ' || n, n FROM generate_series(0, 7) n`,
    { brandId, lineId },
  )
  await run(
    `UPDATE shades SET family_id = families.id FROM families
     WHERE shades.line_id = $lineId::uuid AND families.line_id = $lineId::uuid
       AND families.position = shades.position % 8`,
    { lineId },
  )
  await run(
    `INSERT INTO photographs (brand_id, line_id, title, photographer, licence, alt_text, file_name,
       object_key, content_type, byte_length, sha256, width, height, state, derivatives, created_at)
     SELECT $brandId::uuid, $lineId::uuid, 'Hillside ' || n, 'Somebody of ours', CASE WHEN n % 5 > 0 THEN 'own-work' END,
       CASE WHEN n % 7 > 0 THEN repeat('A hillside under rain. ', 5) ELSE '' END, 'hillside.jpg',
       'originals/' || $brandId::uuid || '/' || gen_random_uuid(), 'image/jpeg', 500000,
       encode(sha256(($lineId::uuid || n::text)::bytea), 'hex'), 2400, 1600, 'ready',
       '[{"format": "webp", "width": 400, "height": 267}, {"format": "webp", "width": 800, "height": 533},
         {"format": "webp", "width": 1600, "height": 1067}, {"format": "avif", "width": 400, "height": 267},
         {"format": "avif", "width": 800, "height": 533}, {"format": "avif", "width": 1600, "height": 1067}]',
       now() - n * interval '1 minute'
     FROM generate_series(1, $count::int) n`,
    { brandId, lineId, count: size.photographs },
  )
  await run(
    `INSERT INTO readings (brand_id, photograph_id, cells, cell_map, map_width, map_height, striking,
       matches, shades_revision)
     SELECT brand_id, id, '[]', decode(repeat('0a', 3000), 'hex'), 60, 50, '[]', '[]', 1
     FROM photographs WHERE line_id = $lineId::uuid`,
    { lineId },
  )
  // The checks of references are planned by what PostgreSQL believes to be there.
  await sequelize().query('ANALYZE shades, photographs')
  await run(
    `INSERT INTO combinations (brand_id, line_id, title, photograph_id, reading, rank, created_at)
     SELECT $brandId::uuid, $lineId::uuid, 'Five of hillside ' || n, p.ids[1 + n % $photographs::int],
       'true', 'e' || lpad(n::text, 5, '0'), now() - n * interval '1 minute'
     FROM generate_series(1, $count::int) n
     CROSS JOIN (SELECT array_agg(id) AS ids FROM photographs WHERE line_id = $lineId::uuid) p`,
    { brandId, lineId, count: size.combinations, photographs: size.photographs },
  )
  await sequelize().query('ANALYZE combinations')
  await run(
    `INSERT INTO combination_places (brand_id, combination_id, place, role, shade_id, share)
     SELECT $brandId::uuid, c.id, place, (ARRAY['MC', 'CC1', 'CC2', 'CC3', 'CC4'])[place], s.ids[1 + (c.n * 5 + place) % $shades::int], 0.2
     FROM (SELECT id, row_number() OVER () AS n FROM combinations WHERE line_id = $lineId::uuid) c
     CROSS JOIN generate_series(1, 5) place
     CROSS JOIN (SELECT array_agg(id) AS ids FROM shades WHERE line_id = $lineId::uuid) s`,
    { brandId, lineId, shades: size.shades },
  )
}

const TABLES = [
  'lines',
  'shades',
  'name_ideas',
  'photographs',
  'readings',
  'combinations',
  'combination_places',
]
/** An autovacuum that began while rows came lasts seconds, on a busy machine more. */
const SETTLED_WITHIN = 120_000

/**
 * What autovacuum does in time after so many rows have come, done now: the planner knows them, and
 * every page is known to hold nothing but what everybody may see. A VACUUM beside which anything
 * looks at the database as of before, autovacuum itself for one, leaves pages out; lists then read
 * the table besides its index, and it is done again.
 * @throws Error when something looks at the database as of before all the while
 */
export async function settle(): Promise<void> {
  const deadline = performance.now() + SETTLED_WITHIN
  do {
    await sequelize().query(
      'VACUUM (ANALYZE) lines, shades, name_ideas, photographs, readings, combinations, combination_places',
    )
    const [row] = await sequelize().query<{ pages: number }>(
      `SELECT sum(relpages - relallvisible)::int AS pages FROM pg_class
       WHERE oid = ANY ($tables::regclass[])`,
      { bind: { tables: TABLES }, type: QueryTypes.SELECT },
    )
    if (row!.pages === 0) return
    await sleep(1000)
  } while (performance.now() < deadline)
  throw new Error('Something looks at the database as of before it was filled; VACUUM has no end.')
}
