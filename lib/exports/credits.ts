import type { ExportDescription, ExportPhotograph } from './description'

/** Whose the photographs are, and what the pictures are set in. */
export function creditsText({ brand, line, combinations }: ExportDescription): string {
  const parts = combinations.flatMap(({ title, photograph }) =>
    photograph ? [[oneLine(title), ...creditLines(photograph)].join('\r\n')] : [],
  )
  return [
    `${oneLine(line)} by ${oneLine(brand)}`,
    ...(parts.length > 0 ? ['PHOTOGRAPHS', ...parts] : ['No photographs are shown in this kit.']),
    'TYPE\r\nThe pictures and the sheet are set in Besley and Hanken Grotesk, both under the SIL Open Font License 1.1.',
    'COLOUR\r\nA screen or a print is no shade approval. The record of a shade is its measured Lab, in shades.csv and shades.tokens.json.',
    '',
  ]
    .join('\r\n\r\n')
    .replace(/\r\n\r\n$/, '\r\n')
}

function creditLines(photograph: ExportPhotograph): string[] {
  const { title, credit, licence, licenceUrl, sourceUrl, bytes } = photograph
  return [
    `  Photograph: ${oneLine(title)}`,
    `  By: ${oneLine(credit)}`,
    `  Licence: ${oneLine(licence)}`,
    ...(licenceUrl ? [`  Licence text: ${oneLine(licenceUrl)}`] : []),
    ...(sourceUrl ? [`  Source: ${oneLine(sourceUrl)}`] : []),
    ...(bytes ? [] : ['  Not shown in the pictures: its licence may not allow it.']),
  ]
}

const oneLine = (text: string) => text.replace(/\s+/g, ' ').trim()
