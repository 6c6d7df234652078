import type { Box, Pdf } from '#server/adapters/pdf/pdf'
import { CAP_HEIGHT, type PdfFont } from '#server/adapters/pdf/pdf-fonts'

export interface TextStyle {
  readonly font: PdfFont
  /** Points. */
  readonly size: number
  /** CSS hex. */
  readonly color: string
}

export interface TextPlace {
  /** The left border, the middle or the right border of the line, as `align` says. */
  readonly x: number
  /** The foot of the capitals. */
  readonly baseline: number
  readonly align?: 'left' | 'center' | 'right'
  /** What there is room for; without it the text is as wide as it is. */
  readonly width?: number
  /** The smallest type that it may shrink to before it is cut short; its own size unless given. */
  readonly smallest?: number
  /** Room between characters, points. */
  readonly spacing?: number
}

const ELLIPSIS = '…'

/** One line: what people type may hold line ends and tabs. Spaces that do not break stay. */
const oneLine = (text: string): string => text.replace(/[^\S\u00a0]+/g, ' ').trim()

export function widthOfText(
  pdf: Pdf,
  text: string,
  { font, size }: TextStyle,
  spacing = 0,
): number {
  return pdf.document.font(font).fontSize(size).widthOfString(text, { characterSpacing: spacing })
}

export interface FittedText {
  readonly text: string
  readonly size: number
}

/** Makes a line fit a width: first by smaller type, at the smallest by cutting it short. */
export function fitText(
  pdf: Pdf,
  text: string,
  style: TextStyle,
  width: number,
  smallest: number = style.size,
): FittedText {
  const line = oneLine(text)
  const natural = widthOfText(pdf, line, style)
  if (natural <= width) return { text: line, size: style.size }
  // Widths grow with the size: what fits is known without trying.
  const size = Math.floor((style.size * width * 20) / natural) / 20
  if (size >= smallest) return { text: line, size }
  return { text: cutShort(pdf, line, { ...style, size: smallest }, width), size: smallest }
}

/** The longest beginning that fits with an ellipsis behind it. */
function cutShort(pdf: Pdf, line: string, style: TextStyle, width: number): string {
  const characters = Array.from(line)
  const cut = (count: number) => characters.slice(0, count).join('').trimEnd() + ELLIPSIS
  let fits = 0
  let fails = characters.length + 1
  while (fails - fits > 1) {
    const middle = Math.floor((fits + fails) / 2)
    if (widthOfText(pdf, cut(middle), style) <= width) fits = middle
    else fails = middle
  }
  return cut(fits)
}

/** Draws one line of text, which says how wide it came out. */
export function drawText(pdf: Pdf, text: string, style: TextStyle, place: TextPlace): number {
  const { spacing = 0, align = 'left' } = place
  const fitted =
    place.width === undefined
      ? { text: oneLine(text), size: style.size }
      : fitText(pdf, text, style, place.width, place.smallest)
  const width = widthOfText(pdf, fitted.text, { ...style, size: fitted.size }, spacing)
  const left = { left: place.x, center: place.x - width / 2, right: place.x - width }[align]
  pdf.document.fillColor(style.color).text(fitted.text, left, place.baseline, {
    baseline: 'alphabetic',
    lineBreak: false,
    characterSpacing: spacing,
  })
  return width
}

/** Breaks text into lines of a width, between words where it can. */
export function wrapText(pdf: Pdf, text: string, style: TextStyle, width: number): string[] {
  const fits = (line: string) => widthOfText(pdf, line, style) <= width
  const lines: string[] = []
  let line = ''
  for (const word of oneLine(text).split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`
    if (fits(longer)) {
      line = longer
      continue
    }
    if (line !== '') lines.push(line)
    line = word
    while (!fits(line) && line.length > 1) {
      const head = longestHead(line, fits)
      lines.push(head)
      line = line.slice(head.length)
    }
  }
  return line === '' ? lines : [...lines, line]
}

/** At least one character, however narrow the room. */
function longestHead(word: string, fits: (line: string) => boolean): string {
  const characters = Array.from(word)
  let count = 1
  while (count < characters.length && fits(characters.slice(0, count + 1).join(''))) count += 1
  return characters.slice(0, count).join('')
}

/** Draws text over several lines from the first line's baseline on; gives the baseline after the last. */
export function drawParagraph(
  pdf: Pdf,
  text: string,
  style: TextStyle,
  place: { readonly x: number; readonly baseline: number; readonly width: number },
): number {
  let { baseline } = place
  for (const line of wrapText(pdf, text, style, place.width)) {
    drawText(pdf, line, style, { x: place.x, baseline })
    baseline += style.size * LEADING
  }
  return baseline
}

/** From line to line, in parts of the type size. */
const LEADING = 1.3

/** The same where text has to fit into little room. */
const TIGHT_LEADING = 1.12

const SIZE_STEP = 0.5

/**
 * Draws text as large as it fits into a box, over as many lines as its size leaves room for, in the
 * middle of the height. What does not fit even at the smallest size is cut short with an ellipsis.
 */
export function drawTextBlock(
  pdf: Pdf,
  text: string,
  style: TextStyle,
  box: Box,
  { smallest, align = 'left' }: { readonly smallest: number; readonly align?: 'left' | 'right' },
): void {
  const { lines, size } = fitBlock(pdf, text, style, box, smallest)
  const leading = size * TIGHT_LEADING
  const cap = CAP_HEIGHT[style.font] * size
  let baseline = box.y + (box.height - (lines.length - 1) * leading + cap) / 2
  for (const line of lines) {
    const x = align === 'left' ? box.x : box.x + box.width
    drawText(pdf, line, { ...style, size }, { x, baseline, align })
    baseline += leading
  }
}

function fitBlock(
  pdf: Pdf,
  text: string,
  style: TextStyle,
  { width, height }: Pick<Box, 'width' | 'height'>,
  smallest: number,
): { readonly lines: readonly string[]; readonly size: number } {
  const roomAt = (size: number) => Math.max(1, Math.floor(height / (size * TIGHT_LEADING)))
  let size = style.size
  let lines = wrapText(pdf, text, style, width)
  while (lines.length > roomAt(size) && size > smallest) {
    size = Math.max(smallest, size - SIZE_STEP)
    lines = wrapText(pdf, text, { ...style, size }, width)
  }
  const room = roomAt(size)
  if (lines.length <= room) return { lines, size }
  const rest = lines.slice(room - 1).join(' ')
  const last = cutShort(pdf, rest, { ...style, size }, width)
  return { lines: [...lines.slice(0, room - 1), last], size }
}
