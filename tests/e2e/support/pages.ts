import { expect, type Page } from '@playwright/test'

import { BRAND, LINE, type Who } from './accounts'

const STUDIO: readonly Who[] = ['owner', 'marketer', 'designer']
const EDITORS: readonly Who[] = ['owner', 'designer']
const EVERYBODY: readonly Who[] = [...STUDIO, 'dyer']

/** A page of the studio and the roles it opens for. */
export interface StudioPage {
  name: string
  roles: readonly Who[]
  /** Its address, found by following the lists where it names a row. */
  find: (page: Page) => Promise<string> | string
}

const firstLink = (list: string, address: RegExp) => async (page: Page) => {
  await page.goto(`${LINE}/${list}`)
  const links = page.locator('main a')
  await expect(links.first()).toBeVisible()
  const addresses = await links.evaluateAll((all) => all.map((a) => a.getAttribute('href') ?? ''))
  const found = addresses.find((href) => address.test(href))
  if (!found) throw new Error(`No link like ${address} on ${list}.`)
  return found
}
const ID = '[0-9a-f-]{36}'

/** Every page of the studio. */
export const PAGES: readonly StudioPage[] = [
  { name: 'lines', roles: EVERYBODY, find: () => `/${BRAND}` },
  { name: 'the team', roles: EVERYBODY, find: () => `/${BRAND}/team` },
  { name: 'a new line', roles: ['owner'], find: () => `/${BRAND}/lines/new` },
  { name: 'how the brand signs in', roles: ['owner'], find: () => `/${BRAND}/security` },
  { name: 'the activity record', roles: ['owner'], find: () => `/${BRAND}/activity` },
  { name: 'a line', roles: EVERYBODY, find: () => LINE },
  { name: 'changing a line', roles: ['owner'], find: () => `${LINE}/edit` },
  { name: 'the sample book', roles: EVERYBODY, find: () => `${LINE}/shades` },
  { name: 'the shade table', roles: EVERYBODY, find: () => `${LINE}/shades?view=table` },
  { name: 'shades by lightness', roles: EVERYBODY, find: () => `${LINE}/shades?order=lightness` },
  { name: 'families', roles: EVERYBODY, find: () => `${LINE}/shades/families` },
  { name: 'a shade', roles: EVERYBODY, find: firstLink('shades', new RegExp(`/shades/${ID}`)) },
  { name: 'a new shade', roles: EDITORS, find: () => `${LINE}/shades/new` },
  { name: 'importing shades', roles: EDITORS, find: () => `${LINE}/shades/import` },
  { name: 'the range study', roles: EVERYBODY, find: () => `${LINE}/shades/study` },
  { name: 'photographs', roles: STUDIO, find: () => `${LINE}/photographs` },
  {
    name: 'a photograph',
    roles: STUDIO,
    find: firstLink('photographs', new RegExp(`/photographs/${ID}`)),
  },
  { name: 'combinations', roles: STUDIO, find: () => `${LINE}/combinations` },
  {
    name: 'a combination',
    roles: STUDIO,
    find: firstLink('combinations', new RegExp(`/combinations/${ID}`)),
  },
  { name: 'names', roles: STUDIO, find: () => `${LINE}/names` },
  {
    name: 'names by what is found',
    roles: STUDIO,
    find: () => `${LINE}/names?sort=checks&dir=desc`,
  },
  { name: 'names all together', roles: STUDIO, find: () => `${LINE}/names/together` },
  {
    name: 'the naming bench of a shade',
    roles: STUDIO,
    find: async (page) =>
      (await firstLink('shades', new RegExp(`/shades/${ID}`))(page)).replace(
        '/shades/',
        '/names/shades/',
      ),
  },
  { name: 'names in review', roles: STUDIO, find: () => `${LINE}/names/review` },
  {
    name: 'an idea for a name',
    roles: STUDIO,
    find: firstLink('names/review', new RegExp(`/names/ideas/${ID}`)),
  },
  { name: 'the heap', roles: STUDIO, find: () => `${LINE}/names/heap` },
  { name: 'adding many names', roles: STUDIO, find: () => `${LINE}/names/heap/add` },
  { name: 'dealing the heap', roles: STUDIO, find: () => `${LINE}/names/heap/deal` },
  { name: 'labels', roles: STUDIO, find: () => `${LINE}/names/labels` },
  { name: 'the proof sheet', roles: STUDIO, find: () => `${LINE}/names/labels/proof` },
  { name: 'the history of names', roles: STUDIO, find: () => `${LINE}/names/history` },
  { name: 'kits', roles: STUDIO, find: () => `${LINE}/kits` },
]

/** The pages of whoever is signed in, in no brand. */
export const ACCOUNT_PAGES: readonly StudioPage[] = [
  { name: 'the account', roles: EVERYBODY, find: () => '/account' },
  { name: 'closing the account', roles: EVERYBODY, find: () => '/account/close' },
]

/** The pages of whoever is not signed in. */
export const SIGNED_OUT = ['/', '/sign-in', '/sign-up', '/forgotten-password'] as const
