import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

import { expect } from '@playwright/test'

/** A letter as the local mail server filed it. */
export interface FiledLetter {
  to: string[]
  subject: string
  text: string
  html: string
}

/** The newest letter to an address with this subject, as soon as it has come. */
export async function letterTo(address: string, subject: string): Promise<FiledLetter> {
  const folder = join(process.env.WOADMAP_LOCAL!, 'mail')
  let found: FiledLetter | undefined
  await expect
    .poll(
      () => {
        found = readdirSync(folder)
          .filter((name) => name.endsWith('.json') && !name.startsWith('.'))
          .sort()
          .map((name) => JSON.parse(readFileSync(join(folder, name), 'utf8')) as FiledLetter)
          .findLast((letter) => letter.to.includes(address) && letter.subject === subject)
        return found
      },
      { message: `a letter “${subject}” to ${address}`, timeout: 30_000 },
    )
    .toBeTruthy()
  return found!
}

/** The one link of a letter that holds a token. */
export function linkIn({ text }: FiledLetter): string {
  const link = /https?:\/\/\S+\/[\w-]{43}(?=\s)/.exec(text)?.[0]
  if (!link) throw new Error(`No link in: ${text}`)
  return link
}
