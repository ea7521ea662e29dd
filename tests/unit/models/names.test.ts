import { readdirSync, readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

const folder = new URL('../../../models/', import.meta.url)
const files = readdirSync(folder).filter((file) => /^[A-Z]/.test(file))

describe.each(files)('the model of %s', (file) => {
  it('says its name: a production build shortens class names, which would make models one', () => {
    const name = file.replace(/\.ts$/, '')
    expect(readFileSync(new URL(file, folder), 'utf8')).toContain(`modelName: '${name}'`)
  })
})
