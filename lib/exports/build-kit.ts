import { compose, type Composition } from './compose'
import { PICTURE_SIZES } from './constants'
import { creditsText } from './credits'
import type { ExportCombination, ExportDescription } from './description'
import { fileNames, pictureName } from './file-names'
import { combinationHtml, postHtml } from './post-html'
import type { Pictures, Rasteriser } from './rasterise'
import { Sheet } from './sheet-pdf'
import { svgOf } from './svg'
import { shadeTable } from './table'
import { designTokens, styleSheet } from './tokens'
import { altText, captionOf } from './words'
import { zipFiles, type KitFile, type ZippedFile } from './zip'

/** A combination's texts, as they stand in the kit. */
export interface CombinationTexts {
  id: string
  /** The folder of its files. */
  name: string
  alt: string
  caption: string
  html: string
}

/** A kit that is built. */
export interface BuiltKit {
  zip: Buffer
  files: ZippedFile[]
  texts: CombinationTexts[]
}

/** How many steps a kit of so many combinations takes: each one's pictures, then all the rest. */
export const stepsOf = (combinations: number): number => combinations + 1

/** One of a combination's drawings. */
export interface CombinationDrawing {
  composition: Composition
  svg: string
  area: Composition['photograph']
  width: number
  height: number
}

/** A combination's drawings, one for each of PICTURE_SIZES. */
export const drawingsOf = (
  description: ExportDescription,
  combination: ExportCombination,
): CombinationDrawing[] =>
  PICTURE_SIZES.map((size) => {
    const composition = compose(description, combination, size)
    const words = { title: combination.title, alt: altText(combination) }
    return { ...size, composition, svg: svgOf(composition, words), area: composition.photograph }
  })

/**
 * Builds a kit. The same description gives the same bytes.
 * @param onStep told after each step how many of {@link stepsOf} are done
 */
export async function buildKit(
  description: ExportDescription,
  rasteriser: Rasteriser,
  onStep: (done: number) => Promise<void> = async () => {},
): Promise<BuiltKit> {
  const { combinations } = description
  const names = fileNames(combinations)
  const files: KitFile[] = []
  const texts: CombinationTexts[] = []
  const sheet = new Sheet(description)
  const put = (path: string, content: string | Buffer) =>
    files.push({ path, bytes: typeof content === 'string' ? Buffer.from(content) : content })
  const finish = async (
    combination: ExportCombination,
    drawings: readonly CombinationDrawing[],
    made: Promise<Pictures>,
  ) => {
    const { pictures, photograph } = await made
    const name = names.get(combination.id) ?? combination.id
    const alt = altText(combination)
    const caption = captionOf(description, combination)
    drawings.forEach((drawing, index) => put(pictureName(name, drawing), pictures[index]!))
    sheet.add(combination, photograph)
    const words = { title: combination.title, alt, photograph }
    put(`${name}/${name}.svg`, svgOf(drawings[0]!.composition, words))
    put(`${name}/alt.txt`, `${alt}\n`)
    put(`${name}/caption.txt`, `${caption}\n`)
    const html = combinationHtml(description, combination, name)
    texts.push({ id: combination.id, name, alt, caption, html })
    await onStep(texts.length)
  }
  let before: Promise<void> = Promise.resolve()
  for (const combination of combinations) {
    // Composed while the pictures of the one before are drawn.
    const drawings = drawingsOf(description, combination)
    await before
    const photograph = combination.photograph?.bytes ?? null
    before = finish(combination, drawings, rasteriser.pictures({ drawings, photograph }))
  }
  await before
  put('post.html', postHtml(description))
  put('shades.css', styleSheet(description))
  put('shades.tokens.json', designTokens(description))
  put('shades.csv', shadeTable(description))
  put('CREDITS.txt', creditsText(description))
  put('sheet.pdf', await sheet.end())
  const { zip, files: zipped } = zipFiles(files)
  await onStep(stepsOf(combinations.length))
  return { zip, files: zipped, texts }
}
