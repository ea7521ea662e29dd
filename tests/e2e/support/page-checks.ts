import { gzipSync } from 'node:zlib'

import AxeBuilder from '@axe-core/playwright'
import { expect, type Page } from '@playwright/test'

const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']

/** What the page in front breaks of WCAG 2.2 AA, as far as a program can tell. */
export async function violationsOf(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze()
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`)
}

/** By how many CSS pixels the page is wider than its window. */
export const overflowOf = (page: Page): Promise<number> =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

/** Bytes of script, gzipped, that a page may need before it answers. */
export const SCRIPT_BAR = 200_000
/** The same of the board, which drags from the start. */
export const BOARD_SCRIPT_BAR = 260_000

const sizes = new Map<string, number>()

/** Bytes of script, gzipped, that the page at this address needs before it answers. */
export async function scriptBytesOf(page: Page, address: string): Promise<number> {
  const sizeOf = async (source: string) => {
    const known = sizes.get(source)
    if (known !== undefined) return known
    const size = gzipSync(await (await page.request.get(source)).body()).length
    sizes.set(source, size)
    return size
  }
  const html = await (await page.request.get(address)).text()
  // What is loaded after the page stands in no script tag; what is for old browsers is not loaded.
  const tags = [...html.matchAll(/<script[^>]+src="([^"]+)"[^>]*>/g)]
  const sources = tags.filter(([tag]) => !/nomodule/i.test(tag)).map(([, source]) => source!)
  expect(sources.length, address).toBeGreaterThan(3)
  const parts = await Promise.all(sources.map(sizeOf))
  return parts.reduce((sum, part) => sum + part, 0)
}
