import { writeFile } from 'node:fs/promises'
import { demoPhotographs } from '../seeders/demo/photographs'
import { develop, type Development } from './render/develop'
import type { Picture } from './render/picture'

/**
 * Renders the demo's photographs: `tsx scripts/render-photographs.ts [--width 2400] [--out folder]
 * [slug…]`. Pictures are 3:2. The same code gives the same pictures, so it is run only after a change to them.
 */

interface SceneModule {
  render(width: number, height: number): Picture
  development: Development
}

const folder = new URL('../seeders/demo/photographs/', import.meta.url)
const args = process.argv.slice(2)
const take = (flag: string) => {
  const at = args.indexOf(flag)
  return at < 0 ? undefined : args.splice(at, 2)[1]
}
const width = Number(take('--width') ?? 2400)
const out = take('--out')
const height = Math.round((width * 2) / 3)

for (const { slug, file } of demoPhotographs) {
  if (args.length > 0 && !args.includes(slug)) continue
  const started = performance.now()
  const scene = (await import(`./render/scenes/${slug}`)) as SceneModule
  const jpeg = await develop(scene.render(width, height), scene.development)
  await writeFile(out ? `${out}/${file}` : new URL(file, folder), jpeg)
  const seconds = ((performance.now() - started) / 1000).toFixed(0)
  console.log(`${file}: ${Math.round(jpeg.length / 1024)} kB, ${seconds} s`)
}
