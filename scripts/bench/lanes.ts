import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

import type { Figure } from '../lib/figures.mjs'

/** The figures of the board's page, measured in a world of its own. */
export async function benchLanes(): Promise<Figure[]> {
  const folder = mkdtempSync(join(tmpdir(), 'board-'))
  try {
    const file = join(folder, 'figures.json')
    const world = fileURLToPath(new URL('board-world.mjs', import.meta.url))
    const { status } = spawnSync(process.execPath, [world, file], { stdio: 'inherit' })
    if (status !== 0) throw new Error('The board could not be measured; why is written above.')
    return JSON.parse(readFileSync(file, 'utf8')) as Figure[]
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
