import PDFDocument from 'pdfkit'

import type { Stroke } from '@/components/yarn/thread-strokes'

import {
  compose,
  INKS,
  labelIn,
  percent,
  SHEET_SIZE,
  type Composition,
  type SetText,
} from './compose'
import type { ExportCombination, ExportDescription } from './description'
import { paragraphs } from './post-html'
import { FACES, fitText, fontFiles, runsOf, settable, widthOf, type Face } from './typeset'
import { altText, creditOf } from './words'

type Pdf = InstanceType<typeof PDFDocument>
// The package's types know neither its PDF/UA nor where a structure element keeps its entries.
const PDF_UA = 'PDF/UA' as 'PDF/A-1'
type Element = ReturnType<Pdf['struct']>

interface Keeper {
  dictionary: { data: object }
}

/** In points, of A4. */
const PAGE = { width: 595.28, height: 841.89, margin: 40 }
const TEXT = { size: 10, leading: 14.5 }
const BOTTOM = PAGE.height - PAGE.margin - 18
const SCALE = (PAGE.width - 2 * PAGE.margin) / SHEET_SIZE.width

/**
 * All combinations as a printed sheet, a page or more each, tagged for those who listen to it: its
 * language, its title, headings, lists, tables, and words for each picture.
 * @source ISO 14289-1 (PDF/UA-1), ISO 32000-1 § 14.8
 */
export class Sheet {
  private readonly doc: Pdf
  private readonly root: Element
  private readonly whole: Promise<Buffer>

  constructor(private readonly description: ExportDescription) {
    const { brand, line, asOf } = description
    const doc = new PDFDocument({
      size: 'A4',
      margin: 0,
      autoFirstPage: false,
      pdfVersion: '1.7',
      subset: PDF_UA,
      tagged: true,
      lang: 'en-GB',
      displayTitle: true,
      info: {
        Title: `${line}: combinations`,
        Author: brand,
        // Of the content, so that the same content gives the same file.
        CreationDate: asOf,
        ModDate: asOf,
      },
    })
    this.whole = new Promise((resolve, reject) => {
      const parts: Buffer[] = []
      doc.on('data', (part: Buffer) => parts.push(part))
      doc.on('end', () => resolve(Buffer.concat(parts)))
      doc.on('error', reject)
    })
    for (const face of Object.keys(FACES) as Face[])
      for (const { name, bytes } of fontFiles(face)) doc.registerFont(name, bytes)
    this.root = doc.struct('Document')
    doc.addStructure(this.root)
    this.doc = doc
  }

  /** Adds a combination's pages. @param photograph as a JPEG of the shape of its place */
  add(combination: ExportCombination, photograph: Buffer | null): void {
    new CombinationPages(this.doc, this.root, this.description, combination).draw(photograph)
  }

  /** The sheet as a PDF; nothing can be added any more. */
  end(): Promise<Buffer> {
    this.root.end()
    this.doc.end()
    return this.whole
  }
}

/** The pages of one combination. */
class CombinationPages {
  private readonly section: Element
  /** Where the next line of running text begins. */
  private y = PAGE.margin

  constructor(
    private readonly doc: Pdf,
    root: Element,
    private readonly description: ExportDescription,
    private readonly combination: ExportCombination,
  ) {
    this.section = doc.struct('Sect')
    root.add(this.section)
  }

  draw(photograph: Buffer | null): void {
    const { combination, description } = this
    const composition = compose(description, combination, SHEET_SIZE)
    this.newPage()
    const page = { x: PAGE.margin, y: PAGE.margin, scale: SCALE }
    this.mark('H1', () => this.lines(composition.title, page), {
      actual: combination.title,
    })
    if (photograph) this.tipIn(composition, photograph)
    this.figure(composition, page)
    this.list(composition, page)
    this.y = PAGE.margin + SHEET_SIZE.height * SCALE + 22
    for (const words of paragraphs(combination.story)) this.paragraph(words, 'text')
    this.measured()
    const shown = combination.photograph
    if (photograph && shown) this.paragraph(`Photograph: ${creditOf(shown)}.`, 'text')
    this.section.end()
  }

  private newPage(): void {
    const { brand, line } = this.description
    this.doc.addPage({ size: 'A4', margin: 0 })
    this.doc.markContent('Artifact', { type: 'Pagination' })
    const names = [brand, line].flatMap((name) => settable(name, 'text') ?? []).join(' · ')
    const y = PAGE.height - PAGE.margin
    const at = { face: 'text' as const, size: 8.5, y, ink: INKS.soft }
    const note = 'A print is no shade approval: judge the yarn itself, in daylight.'
    this.write({ ...at, text: names, x: PAGE.margin })
    this.write({
      ...at,
      text: note,
      x: PAGE.width - PAGE.margin - widthOf(note, 'text', at.size),
    })
    this.doc.endMarkedContent()
    this.y = PAGE.margin + TEXT.size
  }

  /** Draws something as one element of the structure. */
  private mark(
    tag: string,
    draw: () => void,
    options: { alt?: string; actual?: string; scope?: string } = {},
    parent: Element = this.section,
  ): void {
    const { scope, ...words } = options
    const element = this.doc.struct(tag as 'P', words)
    if (scope)
      Object.assign((element as unknown as Keeper).dictionary.data, {
        A: { O: 'Table', Scope: scope },
      })
    parent.add(element)
    element.add(this.doc.markStructureContent(tag as 'P'))
    draw()
    this.doc.endMarkedContent()
    element.end()
  }

  private artifact(draw: () => void): void {
    this.doc.markContent('Artifact', { type: 'Layout' })
    draw()
    this.doc.endMarkedContent()
  }

  private tipIn({ photograph: area }: Composition, bytes: Buffer): void {
    if (!area) return
    const box = { width: area.width * SCALE, height: area.height * SCALE }
    const [x, y] = [PAGE.margin + area.x * SCALE, PAGE.margin + area.y * SCALE]
    this.mark('Figure', () => this.doc.image(bytes, x, y, box), {
      alt: this.combination.photograph?.alt ?? '',
    })
  }

  private figure({ card, leaders }: Composition, page: Placing): void {
    const { doc } = this
    const alt = altText({ ...this.combination, photograph: null })
    const inFrame = (draw: () => void) => {
      doc.save()
      doc.translate(page.x, page.y).scale(page.scale)
      draw()
      doc.restore()
    }
    this.mark(
      'Figure',
      () =>
        inFrame(() => {
          doc.translate(card.area.x, card.area.y)
          card.strokes.forEach((stroke) => drawStroke(doc, stroke))
          if (!card.edge) return
          doc.translate(card.edge.x, card.edge.y).rotate(-90)
          this.write({ ...card.edge, x: 0, y: 0 })
        }),
      { alt },
    )
    this.artifact(() => inFrame(() => leaders.forEach((stroke) => drawStroke(doc, stroke))))
  }

  private list({ names }: Composition, page: Placing): void {
    const list = this.doc.struct('L')
    this.section.add(list)
    names.forEach((lines, index) => {
      const { label, role, share } = this.combination.shades[index]!
      const item = this.doc.struct('LI')
      list.add(item)
      this.mark(
        'LBody',
        () => this.lines(lines, page),
        { actual: `${label}, ${role}, ${percent(share)}` },
        item,
      )
      item.end()
    })
    list.end()
  }

  private paragraph(words: string, face: Face): void {
    const set = settable(words, face) ?? 'This text is in a script that the sheet cannot print.'
    const width = Math.min(PAGE.width - 2 * PAGE.margin, 430)
    const { lines } = fitText(set, face, { width, sizes: [TEXT.size], most: Infinity })
    const element = this.doc.struct('P', { actual: words })
    this.section.add(element)
    for (const text of lines) {
      if (this.y > BOTTOM) this.newPage()
      element.add(this.doc.markStructureContent('P'))
      this.write({ text, face, size: TEXT.size, x: PAGE.margin, y: this.y, ink: INKS.ink })
      this.doc.endMarkedContent()
      this.y += TEXT.leading
    }
    element.end()
    this.y += TEXT.leading / 2
  }

  /** The record of each shade, and what a screen shows of it. */
  private measured(): void {
    const { doc, combination } = this
    const columns = [0, 150, 210, 270, 330, 410]
    const rows = [
      ['Shade', 'L*', 'a*', 'b*', 'Read under', 'On screen'],
      ...combination.shades.map((shade) => [
        labelIn(shade, 'text'),
        ...shade.lab.map(reading),
        `${shade.illuminant}/${shade.observer}°`,
        shade.hex,
      ]),
    ]
    if (this.y + rows.length * TEXT.leading > BOTTOM) this.newPage()
    const table = doc.struct('Table')
    this.section.add(table)
    rows.forEach((cells, row) => {
      const element = doc.struct('TR')
      table.add(element)
      cells.forEach((cell, column) => {
        const head = row === 0 || column === 0
        const face = row === 0 ? 'strong' : 'text'
        const width = (columns[column + 1] ?? 515) - columns[column]! - 6
        const { lines, size } = fitText(cell, face, { width, sizes: [9, 8], most: 1 })
        const x = PAGE.margin + columns[column]!
        this.mark(
          head ? 'TH' : 'TD',
          () => this.write({ text: lines[0] ?? '', face, size, x, y: this.y, ink: INKS.ink }),
          head ? { scope: row === 0 ? 'Column' : 'Row' } : {},
          element,
        )
      })
      element.end()
      const y = this.y + 4
      this.artifact(() =>
        doc
          .moveTo(PAGE.margin, y)
          .lineTo(PAGE.width - PAGE.margin, y)
          .lineWidth(0.4)
          .stroke(INKS.edge),
      )
      this.y += TEXT.leading
    })
    table.end()
    this.y += TEXT.leading / 2
  }

  private lines(texts: readonly SetText[], { x, y, scale }: Placing): void {
    for (const text of texts)
      this.write({
        ...text,
        x: x + text.x * scale,
        y: y + text.y * scale,
        size: text.size * scale,
      })
  }

  private write({ text, face, size, x, y, ink }: SetText): void {
    let at = x
    for (const run of runsOf(text, face)) {
      this.doc
        .font(run.file.name)
        .fontSize(size)
        .fillColor(ink)
        .text(run.text, at, y, { lineBreak: false, baseline: 'alphabetic' })
      at += widthOf(run.text, face, size)
    }
  }
}

interface Placing {
  x: number
  y: number
  scale: number
}

const reading = (value: number) => value.toFixed(1).replace('-', '−')

function drawStroke(doc: Pdf, stroke: Stroke): void {
  doc.save()
  if (stroke.skew !== undefined)
    doc.transform(1, 0, Math.tan((stroke.skew * Math.PI) / 180), 1, 0, 0)
  doc.path(stroke.d)
  doc.lineCap(stroke.round === 'cap' ? 'round' : 'butt')
  doc.lineJoin(stroke.round === 'join' ? 'round' : 'miter')
  if (stroke.width !== undefined) doc.lineWidth(stroke.width)
  if (stroke.dash)
    doc.dash(stroke.dash.lengths[0], {
      space: stroke.dash.lengths[1],
      phase: stroke.dash.offset,
    })
  if (stroke.opacity !== undefined) doc.strokeOpacity(stroke.opacity)
  if (stroke.fill && stroke.stroke) doc.fillAndStroke(stroke.fill, stroke.stroke)
  else if (stroke.fill) doc.fill(stroke.fill)
  else doc.stroke(stroke.stroke)
  doc.restore()
}
