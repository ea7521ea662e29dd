import { percent } from './compose'
import { PICTURE_SIZES } from './constants'
import type { ExportCombination, ExportDescription, ExportPhotograph } from './description'
import { fileNames, pictureName } from './file-names'
import { escapeMarkup } from './svg'
import { altText, captionOf } from './words'

const [POST] = PICTURE_SIZES

/**
 * A fragment for a blog post: headings, pictures and lists, no script and no style. What people
 * wrote says its own direction.
 */
export function postHtml(description: ExportDescription): string {
  const names = fileNames(description.combinations)
  return [
    `<h2 dir="auto">${text(description.line)}</h2>`,
    ...description.combinations.map((combination) =>
      combinationHtml(description, combination, names.get(combination.id) ?? ''),
    ),
    '',
  ].join('\n')
}

/** One combination of {@link postHtml}. */
export function combinationHtml(
  description: Pick<ExportDescription, 'brand' | 'line'>,
  combination: ExportCombination,
  name: string,
): string {
  const { title, story, shades, photograph } = combination
  const { width, height } = POST
  return [
    `<h3 dir="auto">${text(title)}</h3>`,
    ...paragraphs(story).map((words) => `<p dir="auto">${text(words)}</p>`),
    '<figure>',
    `  <img src="${pictureName(name, POST)}" width="${width}" height="${height}" loading="lazy" alt="${text(altText(combination))}">`,
    `  <figcaption dir="auto">${text(captionOf(description, combination))}</figcaption>`,
    '</figure>',
    '<ul>',
    ...shades.map(
      ({ label, role, share }) =>
        `  <li><bdi>${text(label)}</bdi>, ${text(role)}, ${percent(share)}</li>`,
    ),
    '</ul>',
    ...(photograph?.bytes ? [`<p>${creditHtml(photograph)}</p>`] : []),
  ].join('\n')
}

function creditHtml({ credit, licence, licenceUrl, sourceUrl }: ExportPhotograph): string {
  const whose = link(sourceUrl, `Photograph by <bdi>${text(credit)}</bdi>`)
  return `${whose}. Licence: ${link(licenceUrl, text(licence))}.`
}

const link = (url: string, html: string) =>
  /^https?:\/\//i.test(url) ? `<a href="${text(url)}">${html}</a>` : html

/** Paragraphs of a text, by its empty lines. */
export const paragraphs = (story: string): string[] =>
  story
    .split(/\n\s*\n/)
    .map((part) => part.replace(/\s+/g, ' ').trim())
    .filter(Boolean)

const text = (words: string) => escapeMarkup(words.replace(/\s+/g, ' ').trim())
