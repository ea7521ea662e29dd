import { gzipSync } from 'node:zlib'

/** Bytes of script, gzipped, that a page may need before it answers. */
export const SCRIPT_BAR = 200_000
/** The same of the board, which drags from the start. */
export const BOARD_SCRIPT_BAR = 260_000

/**
 * Bytes of script, gzipped, that the page at an address needs before it answers.
 * @param {(address: string) => Promise<Buffer>} get fetches as whoever opens the page
 * @param {string} address
 * @param {Map<string, number>} [sizes] of the scripts that are known already
 * @returns {Promise<number>}
 * @throws {Error} when what came is no page of the product
 */
export async function scriptBytesOf(get, address, sizes = new Map()) {
  const html = (await get(address)).toString()
  // What is loaded after the page stands in no script tag; what is for old browsers is not loaded.
  const tags = [...html.matchAll(/<script[^>]+src="([^"]+)"[^>]*>/g)]
  const sources = tags.filter(([tag]) => !/nomodule/i.test(tag)).map(([, source]) => source)
  if (sources.length <= 3) throw new Error(`${address} has ${sources.length} scripts: no page.`)
  let sum = 0
  for (const source of sources) {
    const size = sizes.get(source) ?? gzipSync(await get(source)).length
    sizes.set(source, size)
    sum += size
  }
  return sum
}
