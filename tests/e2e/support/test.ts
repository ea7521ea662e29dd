import { expect, test as base, type BrowserContext } from '@playwright/test'

export { expect, type Locator, type Page } from '@playwright/test'

/** The address answered otherwise than 200, or not at all: for the test itself to judge. */
const OF_AN_ANSWER = /^Failed to load resource: /

/** What the browser holds against the pages of a context, as it comes. */
async function listenTo(context: BrowserContext): Promise<string[]> {
  const complaints: string[] = []
  context.on('console', (message) => {
    if (message.type() !== 'error' || OF_AN_ANSWER.test(message.text())) return
    complaints.push(`${message.page()?.url()}: ${message.text()}`)
  })
  context.on('weberror', (error) => complaints.push(String(error.error())))
  await context.exposeBinding('reportViolation', ({ page }, what: string) =>
    complaints.push(`${page.url()}: refused by the policy: ${what}`),
  )
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      const { effectiveDirective, blockedURI, sourceFile, lineNumber, sample } = event
      const report = Reflect.get(window, 'reportViolation') as (what: string) => Promise<void>
      void report(`${effectiveDirective} ${blockedURI} ${sourceFile}:${lineNumber} ${sample}`)
    })
  })
  return complaints
}

/**
 * Playwright's test, which also fails when the browser refuses something by the pages' Content
 * Security Policy or writes an error to its console. `complaints` is what it has said so far; a
 * test that provokes one empties it.
 */
export const test = base.extend<{ complaints: string[] }>({
  complaints: [
    async ({ context }, use) => {
      const complaints = await listenTo(context)
      await use(complaints)
      expect(complaints, 'what the browser complained of').toEqual([])
    },
    { auto: true },
  ],
})
