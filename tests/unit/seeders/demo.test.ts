import { readFile } from 'node:fs/promises'

import sharp, { type Sharp } from 'sharp'
import { describe, expect, it } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { screenColor } from '@/lib/color/gamut'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { READING_KINDS } from '@/lib/color/readings'
import { ROLES } from '@/lib/people/constants'
import { demoAccounts } from '@/seeders/demo/accounts'
import { demoBrands } from '@/seeders/demo/brands'
import { demoCombinations } from '@/seeders/demo/combinations'
import { demoNaming } from '@/seeders/demo/names'
import { demoPhotographs } from '@/seeders/demo/photographs'

const [first, second] = demoBrands
const lines = demoBrands.flatMap((brand) => brand.lines)

describe('the demo', () => {
  it('has one account a role in the first brand, and an owner in the second', () => {
    const rolesOf = (brand: string) =>
      demoAccounts.filter((account) => account.brand === brand).map(({ role }) => role)
    expect(rolesOf(first!.slug).sort()).toEqual([...ROLES].sort())
    expect(rolesOf(second!.slug)).toEqual(['owner'])
    expect(new Set(demoAccounts.map(({ password }) => password)).size).toBe(demoAccounts.length)
    for (const { password, email } of demoAccounts) {
      expect(password.length).toBeGreaterThanOrEqual(12)
      expect(email).toMatch(/\.example$/)
    }
  })

  it('has fibres that come to 100 per cent, the largest first', () => {
    for (const { fibers } of lines) {
      const percents = fibers.map(({ percent }) => percent)
      expect(percents.reduce((a, b) => a + b, 0)).toBe(100)
      expect(percents).toEqual([...percents].sort((a, b) => b - a))
    }
  })

  it('has forty shades in its first line, numbered and named once each, without near-twins', () => {
    const { shades } = first!.lines[0]!
    expect(shades).toHaveLength(40)
    const names = shades.flatMap(({ name }) => name ?? [])
    expect(new Set(shades.map(({ number }) => number)).size).toBe(40)
    expect(new Set(names.map((name) => name.toLowerCase())).size).toBe(names.length)
    const labs = shades.map(({ lab, hex }): Lab => (lab ? [lab.L, lab.a, lab.b] : hexToLab(hex!)))
    for (const [at, lab] of labs.entries()) {
      for (const other of labs.slice(at + 1)) expect(deltaE00(lab, other)).toBeGreaterThan(4)
    }
  })

  it('has shades a dyer could reach on wool, a third of them still unnamed', () => {
    const { shades } = first!.lines[0]!
    expect(shades.filter(({ name }) => name === null)).toHaveLength(14)
    for (const { lab } of shades) {
      expect(lab!.L).toBeGreaterThan(13)
      expect(lab!.L).toBeLessThan(93)
      expect(Math.hypot(lab!.a, lab!.b)).toBeLessThan(90)
    }
    const hues = shades
      .filter(({ lab }) => Math.hypot(lab!.a, lab!.b) > 12)
      .map(({ lab }) => (Math.atan2(lab!.b, lab!.a) * 180) / Math.PI + 180)
      .sort((a, b) => a - b)
    const gaps = hues.map((hue, at) => (hues[at + 1] ?? hues[0]! + 360) - hue)
    expect(Math.max(...gaps)).toBeLessThan(50)
  })

  it('has a teal or a yellow or two that no screen shows, and hardly more', () => {
    const outside = first!.lines[0]!.shades.filter(
      ({ lab }) => !screenColor([lab!.L, lab!.a, lab!.b]).inGamut,
    )
    expect(outside.length).toBeGreaterThanOrEqual(1)
    expect(outside.length).toBeLessThanOrEqual(3)
  })

  it('has ideas for names in every state, each for a shade that is there, and a heap', () => {
    const { slug, shades } = first!.lines[0]!
    const { ideas } = demoNaming[slug]!
    const names = shades.flatMap(({ name }) => name ?? [])
    const texts = [...names, ...ideas.map(({ text }) => text)].map((text) => text.toLowerCase())
    expect(new Set(texts).size).toBe(texts.length)
    const states = new Set(ideas.map(({ state }) => state))
    expect([...states].sort()).toEqual(['draft', 'in-review', 'put-by', 'returned'])
    const numbers = shades.map(({ number }) => number)
    for (const { shade, state, reason, votes, talk } of ideas) {
      if (shade === null) expect(['draft', 'put-by']).toContain(state)
      else expect(numbers).toContain(shade)
      expect(Boolean(reason)).toBe(state === 'returned')
      if (votes || talk) expect(['in-review', 'returned']).toContain(state)
    }
    const heap = ideas.filter(({ shade, state }) => shade === null && state === 'draft')
    expect(heap.length).toBeGreaterThanOrEqual(25)
  })

  it('has nobody say yes or no to what they brought', () => {
    for (const { by, votes = [] } of Object.values(demoNaming).flatMap(({ ideas }) => ideas))
      for (const vote of votes) expect(vote.by).not.toBe(by)
  })

  it('keeps combinations of photographs that are there, each in one of the readings', () => {
    const slugs = demoPhotographs.map(({ slug }) => slug)
    for (const { photograph, reading } of demoCombinations) {
      expect(slugs).toContain(photograph)
      expect(READING_KINDS).toContain(reading)
    }
  })
})

describe.each(demoPhotographs)('the photograph "$title"', ({ file, altText, licence }) => {
  const load = () => readFile(new URL(`../../../seeders/demo/photographs/${file}`, import.meta.url))

  it('is large enough, says what can be seen, and is our own work without metadata', async () => {
    const bytes = await load()
    const { width, height, exif, format } = await sharp(bytes).metadata()
    expect(format).toBe('jpeg')
    expect(width).toBeGreaterThanOrEqual(2000)
    expect(height).toBeGreaterThanOrEqual(1300)
    expect(exif).toBeUndefined()
    expect(altText.length).toBeGreaterThan(40)
    expect(licence).toBe('own-work')
  })

  it('has the detail of a picture, which a gradient has not', async () => {
    const small = sharp(await load()).resize(700)
    const detailOf = async (picture: Sharp) => {
      const edges = picture
        .clone()
        .greyscale()
        .convolve({
          width: 3,
          height: 3,
          kernel: [-1, -1, -1, -1, 8, -1, -1, -1, -1],
          offset: 128,
        })
      return (await sharp(await edges.png().toBuffer()).stats()).channels[0]!.stdev
    }
    const smooth = sharp(await small.clone().blur(20).png().toBuffer())
    expect(await detailOf(small)).toBeGreaterThan(6 * (await detailOf(smooth)))
  })
})
