import type { Actor } from '@/lib/auth/actor'

import { shadesToCsv } from './csv'
import { listAllShades } from './queries'

/**
 * All shades of a line as a CSV file that imports again unchanged.
 * @throws NotFoundError
 */
export async function exportShades(
  actor: Actor,
  lineSlug: string,
): Promise<{ fileName: string; text: string }> {
  const { line, shades } = await listAllShades(actor, lineSlug)
  return { fileName: `${line.slug}-shades.csv`, text: shadesToCsv(shades) }
}
