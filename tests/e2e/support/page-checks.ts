import AxeBuilder from '@axe-core/playwright'
import type { Page } from '@playwright/test'

import { scriptBytesOf as countScriptBytes } from '../../../scripts/lib/script-bytes.mjs'

export { BOARD_SCRIPT_BAR, SCRIPT_BAR } from '../../../scripts/lib/script-bytes.mjs'

const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

/** Waits for what is fading or moving into place; what never ends, such as a spinner, is not waited for. */
const comeToRest = (page: Page) =>
  page.evaluate(async () => {
    const passing = document
      .getAnimations()
      .filter(
        ({ playState, effect }) =>
          playState === 'running' && Number.isFinite(effect?.getComputedTiming().endTime),
      )
    await Promise.allSettled(passing.map(({ finished }) => finished))
  })

/** What the page in front breaks of WCAG 2.2 AA, as far as a program can tell, once it is at rest. */
export async function violationsOf(page: Page): Promise<string[]> {
  await comeToRest(page)
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze()
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)
}

/** By how many CSS pixels the page is wider than its window. */
export const overflowOf = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

const sizes = new Map<string, number>()

/** Bytes of script, gzipped, that the page at this address needs before it answers. */
export const scriptBytesOf = (page: Page, address: string): Promise<number> =>
  countScriptBytes(async (url) => (await page.request.get(url)).body(), address, sizes)
