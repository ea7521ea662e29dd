import axe from 'axe-core'
import { HtmlValidate } from 'html-validate'
import { describe, expect, test } from 'vitest'

import { postHtml } from '@/lib/exports/post-html'
import {
  exportCombination,
  exportDescription,
  exportPhotograph,
  hostileDescription,
} from '../../factories/kit-description'

const validator = new HtmlValidate({ extends: ['html-validate:recommended'] })

describe('the fragment for a post', () => {
  test('passes html-validate, with people’s words and with hostile ones', async () => {
    const plain = exportDescription(exportCombination({ photograph: await exportPhotograph() }))
    for (const description of [plain, await hostileDescription()]) {
      const { valid, results } = await validator.validateString(postHtml(description))
      expect(results.flatMap(({ messages }) => messages.map(({ message }) => message))).toEqual([])
      expect(valid).toBe(true)
    }
  })

  test('holds no script, style, handler or address that runs, whatever people wrote', async () => {
    const html = postHtml(await hostileDescription())
    document.body.innerHTML = html
    const elements = [...document.body.querySelectorAll('*')]
    expect(new Set(elements.map(({ localName }) => localName))).toEqual(
      new Set(['h2', 'h3', 'p', 'figure', 'img', 'figcaption', 'ul', 'li', 'bdi', 'a']),
    )
    const attributes = elements.flatMap(({ attributes }) => [...attributes])
    expect(attributes.filter(({ name }) => /^on|style/.test(name))).toEqual([])
    for (const { href } of document.querySelectorAll('a')) expect(href).toMatch(/^https:/)
    expect(document.querySelector('h3')!.textContent).toBe('<script>alert(1)</script>')
  })

  test('has nothing for axe to say in a post', async () => {
    const description = exportDescription(
      exportCombination({ photograph: await exportPhotograph(), story: 'Late September.' }),
    )
    document.documentElement.lang = 'en'
    document.title = 'A post'
    document.body.innerHTML = `<main><h1>A post</h1>${postHtml(description)}</main>`
    const results = await axe.run(document, { rules: { 'color-contrast': { enabled: false } } })
    expect(results.violations.map(({ id }) => id)).toEqual([])
    expect(results.passes.length).toBeGreaterThan(5)
  })
})
