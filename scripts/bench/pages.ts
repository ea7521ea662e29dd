import { gzipSync } from 'node:zlib'

import { chromium } from '@playwright/test'

import { chromium as launch } from '../../tests/e2e/support/chromium'
import { signIn } from '../../tests/e2e/support/accounts'
import { PAGES } from '../../tests/e2e/support/pages'
import type { Figure } from './index'

const ORIGIN = 'http://localhost:3000'
/** Bytes of script, gzipped, that a page's first load may need. */
const BAR = 200_000

/**
 * What each page of a running product (with the demo in it) needs in script before it answers,
 * gzipped, beside its bar. A script for browsers without modules is not counted: none loads it.
 */
export async function benchPages(): Promise<Figure[]> {
  const browser = await chromium.launch(launch)
  try {
    const page = await browser.newPage({ baseURL: ORIGIN })
    await signIn(page, 'owner')
    const sizes = new Map<string, number>()
    const figures: Figure[] = []
    for (const { name, find } of PAGES) {
      const address = await find(page)
      const html = await (await page.request.get(address)).text()
      let total = 0
      for (const [tag, source] of html.matchAll(/<script[^>]+src="([^"]+)"[^>]*>/g)) {
        if (/nomodule/i.test(tag)) continue
        const known = sizes.get(source!)
        const size = known ?? gzipSync(await (await page.request.get(source!)).body()).length
        sizes.set(source!, size)
        total += size
      }
      figures.push({
        what: `script before ${name} answers`,
        value: `${Math.round(total / 1000)} kB`,
        bar: `${BAR / 1000} kB`,
        met: total <= BAR,
      })
    }
    return figures
  } finally {
    await browser.close()
  }
}
