import type { SweepResult } from '@/lib/photographs/sweep'

import { until, type World } from './world'

/** What must hold after every fault, as queries that find what does not. */
const HALF_STATES: Record<string, string> = {
  'a combination without five shades in five places': `
    SELECT c.id FROM combinations c LEFT JOIN combination_places p ON p.combination_id = c.id
    GROUP BY c.id HAVING count(p.*) <> 5 OR count(DISTINCT p.place) <> 5
      OR min(p.place) <> 1 OR max(p.place) <> 5 OR abs(sum(p.share) - 1) > 1e-4`,
  'two shades in one place of a line': `
    SELECT line_id FROM shades WHERE deleted_at IS NULL
    GROUP BY line_id, position HAVING count(*) > 1`,
  'a photograph that is ready and was not read': `
    SELECT p.id FROM photographs p LEFT JOIN readings r ON r.photograph_id = p.id
    WHERE p.state = 'ready' AND r.id IS NULL`,
  'a photograph that failed and does not say why': `
    SELECT id FROM photographs WHERE state = 'failed' AND coalesce(failure, '') = ''`,
  'a photograph that is waited for in vain': `
    SELECT id FROM photographs WHERE state IN ('pending', 'waiting', 'reading')`,
  'a kit that is ready and has no file': `
    SELECT id FROM kits WHERE state = 'ready' AND object_key IS NULL AND expires_at > now()`,
  'a kit that is waited for in vain': `
    SELECT id FROM kits WHERE state IN ('waiting', 'building')`,
  'a transaction that somebody left open': `
    SELECT pid FROM pg_stat_activity
    WHERE state LIKE 'idle in transaction%' AND application_name LIKE 'woadmap%'
      AND now() - state_change > interval '5 seconds'`,
}

/** Waits until no job is under way or waiting. @param within seconds */
export function settled(world: World, within = 60): Promise<number> {
  return until(
    'every job is done',
    async () =>
      (await world.count(`pgboss.job WHERE state IN ('created', 'retry', 'active')`)) === 0,
    within,
  )
}

/**
 * What is wrong once a fault is over: acknowledged writes that are lost, half states, and what the
 * sweep leaves behind in the database or in the store. Sweeps as if everything were old.
 */
export async function findDamage(world: World): Promise<string[]> {
  const [
    { sweepUploads },
    { listObjects },
    { derivativeKey, DERIVATIVES, ORIGINALS },
    { KITS },
    { Kit, Photograph },
  ] = await Promise.all([
    import('@/lib/photographs/sweep'),
    import('@/lib/storage/objects'),
    import('@/lib/photographs/keys'),
    import('@/lib/kits/keys'),
    import('@/models'),
  ])
  await settled(world)
  const now = { pending: 0, deleted: 0, orphan: 0, reading: 0, waiting: 0 }
  // Twice: what one sweep leaves for the next is no damage.
  await sweepUploads(now)
  const again: SweepResult = await sweepUploads(now)
  const damage = await world.lost()
  for (const [what, query] of Object.entries(HALF_STATES)) {
    const found = await world.query(query)
    if (found.length > 0) damage.push(`${found.length}×: ${what}`)
  }
  if (Object.values(again).some((count) => count > 0)) {
    damage.push(`a second sweep still found ${JSON.stringify(again)}`)
  }
  const rows = await Photograph.findAll({ paranoid: false })
  const kits = await Kit.findAll({ attributes: ['objectKey'] })
  const wanted = new Set([
    ...rows.flatMap((row) => [
      row.objectKey,
      ...row.derivatives.map((copy) => derivativeKey(row, copy)),
    ]),
    ...kits.flatMap(({ objectKey }) => objectKey ?? []),
  ])
  const stored = new Set<string>()
  for (const prefix of [ORIGINALS, DERIVATIVES, KITS]) {
    for await (const { key } of listObjects(prefix)) stored.add(key)
  }
  const orphans = [...stored].filter((key) => !wanted.has(key))
  if (orphans.length > 0) damage.push(`${orphans.length} objects without a row: ${orphans[0]}`)
  for (const row of rows.filter(({ state }) => state === 'ready')) {
    const keys = [row.objectKey, ...row.derivatives.map((copy) => derivativeKey(row, copy))]
    const missing = keys.filter((key) => !stored.has(key))
    if (missing.length > 0) damage.push(`“${row.title}” lacks ${missing.length} of its objects`)
  }
  return damage
}
