import PDFDocument from 'pdfkit'
import { PDF_FONTS, readFont } from '#server/adapters/pdf/pdf-fonts'

export interface PdfOptions {
  readonly title: string
  /** Of the words in it, for a screen reader. */
  readonly language: 'en' | 'es'
  /** Written as the day it was made; nothing else in the bytes depends on the clock. */
  readonly at: Date
}

/** Points. */
export interface PageSize {
  readonly width: number
  readonly height: number
}

export const POINTS_PER_INCH = 72

/** Where something is drawn: points from the upper left corner of the page. */
export interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** What a part of the page is to a screen reader, by the names of ISO 32000-1, 14.8.4. */
export type PdfElement =
  'H1' | 'H2' | 'P' | 'Sect' | 'Figure' | 'Table' | 'TR' | 'TH' | 'TD' | 'L' | 'LI'

/**
 * A tagged PDF being drawn. Same calls, same bytes. Points, origin in the upper left corner, y down.
 *
 *     const pdf = new Pdf({ title: 'Strip sheet', language: 'en', at: clock.now() })
 *     pdf.addPage({ width: 612, height: 792 })
 *     pdf.element('H1', () => drawText(pdf, 'Strip sheet', …))
 *     const bytes = await pdf.finish()
 */
export class Pdf {
  readonly document: PDFKit.PDFDocument
  private readonly chunks: Buffer[] = []
  private readonly done: Promise<void>
  /** The open elements, outermost first. */
  private readonly open: PDFKit.PDFStructureElement[] = []

  constructor({ title, language, at }: PdfOptions) {
    this.document = new PDFDocument({
      autoFirstPage: false,
      margin: 0,
      pdfVersion: '1.7',
      tagged: true,
      lang: language,
      displayTitle: true,
      info: {
        Title: title,
        Creator: 'Foldyard',
        Producer: 'Foldyard',
        CreationDate: at,
        ModDate: at,
      },
    })
    for (const font of PDF_FONTS) this.document.registerFont(font, readFont(font))
    this.document.on('data', (chunk: Buffer) => this.chunks.push(chunk))
    this.done = new Promise((resolve, reject) => {
      this.document.once('end', resolve)
      this.document.once('error', reject)
    })
    const root = this.document.struct('Document')
    this.document.addStructure(root)
    this.open.push(root)
  }

  addPage({ width, height }: PageSize): void {
    this.document.addPage({ size: [width, height], margin: 0 })
  }

  /** What `draw` draws is one element of the page; `alt` says in words what a figure shows. */
  element(type: PdfElement, draw: () => void, alt?: string): void {
    this.innermost().add(this.document.struct(type, alt === undefined ? {} : { alt }, draw))
  }

  /** The elements that `draw` makes belong together. */
  group(type: PdfElement, draw: () => void): void {
    const group = this.document.struct(type)
    this.innermost().add(group)
    this.open.push(group)
    draw()
    this.open.pop()
    group.end()
  }

  /** Rules and grounds, which mean nothing to a screen reader. */
  artifact(draw: () => void): void {
    this.document.markContent('Artifact', { type: 'Layout' })
    draw()
    this.document.endMarkedContent()
  }

  /** The whole file; nothing can be drawn afterwards. */
  async finish(): Promise<Uint8Array<ArrayBuffer>> {
    this.document.end()
    await this.done
    return Buffer.concat(this.chunks)
  }

  private innermost(): PDFKit.PDFStructureElement {
    const element = this.open.at(-1)
    if (!element) throw new Error('The document has no root.')
    return element
  }
}
