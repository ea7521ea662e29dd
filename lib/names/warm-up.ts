import { DEFAULT_LABEL } from '@/lib/naming/label'
import { playOnWords } from '@/lib/naming/play'

import { checkName } from './check-name'

/**
 * Checks a made-up name and makes some up for a mid grey, so that the first in a cold process is not
 * the slow one: dictionary, fonts and sayings are read then (about a second). Call it once when
 * a process starts that answers people.
 */
export function warmUpNames(): void {
  const ground = { held: [], fibers: ['wool'], label: DEFAULT_LABEL, labs: new Map() }
  checkName(ground, { text: 'Thyme will tell', shadeId: null, ideaId: null })
  playOnWords([50, 0, 0], { limit: 1 })
}
