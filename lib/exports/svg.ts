import type { Stroke } from '@/components/yarn/thread-strokes'

import { INKS, outlinesOf, type Composition } from './compose'

const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

/**
 * Text for an element or a quoted attribute of HTML and XML; what XML knows no way to write is left
 * out.
 */
export const escapeMarkup = (text: string): string =>
  text
    .replace(/[^\t\n\r\u0020-\uD7FF\uE000-\uFFFD\u{10000}-\u{10FFFF}]/gu, '')
    .replace(/[&<>"']/g, (character) => ENTITIES[character]!)

const attributes = (values: Record<string, string | number | undefined>) =>
  Object.entries(values)
    .flatMap(([name, value]) => (value === undefined ? [] : ` ${name}="${value}"`))
    .join('')

function pathOf({ d, fill, stroke, width, opacity, round, dash, skew }: Stroke): string {
  const rounded = round && { [`stroke-line${round}`]: 'round' }
  return `<path${attributes({
    d,
    fill,
    stroke,
    'stroke-width': width,
    'stroke-opacity': opacity,
    ...rounded,
    'stroke-dasharray': dash?.lengths.map((length) => Math.round(length * 1000) / 1000).join(' '),
    'stroke-dashoffset': dash?.offset,
    transform: skew === undefined ? undefined : `skewX(${skew})`,
  })}/>`
}

/**
 * A composition as an SVG file that needs no font. Its photograph is drawn where one is given; the
 * place for it stays empty otherwise, for a picture to be laid there.
 */
export function svgOf(
  composition: Composition,
  { title, alt, photograph }: { title: string; alt: string; photograph?: Buffer | null },
): string {
  const { width, height, card, leaders } = composition
  const texts = [...composition.title, ...composition.names.flat(), ...composition.foot]
  const { x, y } = card.area
  const tipped = composition.photograph
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}" fill="none" role="img" aria-labelledby="title desc">`,
    `<title id="title">${escapeMarkup(title)}</title>`,
    `<desc id="desc">${escapeMarkup(alt)}</desc>`,
    `<path d="M0 0H${width}V${height}H0z" fill="${INKS.ground}"/>`,
    tipped && photograph
      ? `<image x="${tipped.x}" y="${tipped.y}" width="${tipped.width}" height="${tipped.height}" href="data:image/jpeg;base64,${photograph.toString('base64')}"/>`
      : '',
    ...leaders.map(pathOf),
    `<g transform="translate(${x} ${y})">`,
    ...card.strokes.map(pathOf),
    card.edge
      ? `<path transform="translate(${card.edge.x} ${card.edge.y}) rotate(-90)" d="${outlinesOf({ ...card.edge, x: 0, y: 0 })}" fill="${card.edge.ink}"/>`
      : '',
    '</g>',
    ...texts.map((text) => `<path d="${outlinesOf(text)}" fill="${text.ink}"/>`),
    '</svg>',
    '',
  ]
    .filter((part, index, all) => part !== '' || index === all.length - 1)
    .join('\n')
}
