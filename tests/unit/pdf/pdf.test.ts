import { describe, expect, it } from 'vitest'
import { Pdf, type PdfOptions } from '#server/adapters/pdf/pdf'
import { PDF_FONTS, readFont } from '#server/adapters/pdf/pdf-fonts'
import {
  drawText,
  drawTextBlock,
  fitText,
  widthOfText,
  wrapText,
  type TextStyle,
} from '#server/adapters/pdf/pdf-text'
import { textWidth } from '#shared/drawing/text-box'
import { factsOf, fontsOf, textOfPages, wordsOf } from '../../support/paper'

const OPTIONS: PdfOptions = {
  title: 'Hoja de la tira · Ñandú',
  language: 'es',
  at: new Date('2026-03-02T15:00:00Z'),
}
const PAGE = { width: 612, height: 792 }
const words = (size: number): TextStyle => ({ font: 'words', size, color: '#000000' })

const draw = async (fill: (pdf: Pdf) => void): Promise<Uint8Array> => {
  const pdf = new Pdf(OPTIONS)
  pdf.addPage(PAGE)
  fill(pdf)
  return pdf.finish()
}

const hello = (pdf: Pdf) =>
  pdf.element('H1', () => drawText(pdf, 'Dobladillo', words(12), { x: 72, baseline: 100 }))

describe('a PDF', () => {
  it('is tagged, and says its title, its language and when it was made', async () => {
    const bytes = await draw(hello)
    expect(await factsOf(bytes)).toMatchObject({
      Title: OPTIONS.title,
      Tagged: 'yes',
      Pages: '1',
      'Page size': '612 x 792 pts (letter)',
      CreationDate: '2026-03-02T15:00:00Z',
    })
    expect(Buffer.from(bytes).toString('latin1')).toContain('/Lang (es)')
  })

  it('has the same bytes for the same drawing and the same moment', async () => {
    expect(await draw(hello)).toEqual(await draw(hello))
  })

  it('carries the fonts it uses', async () => {
    const bytes = await draw((pdf) => {
      for (const [row, font] of PDF_FONTS.entries()) {
        drawText(
          pdf,
          'Ag',
          { font, size: 12, color: '#000000' },
          { x: 72, baseline: 100 + row * 20 },
        )
      }
    })
    const fonts = await fontsOf(bytes)
    expect(fonts.map(({ name }) => name).sort()).toEqual([
      'AtkinsonHyperlegibleNext-Bold',
      'AtkinsonHyperlegibleNext-Regular',
      'JetBrainsMono-Bold',
      'JetBrainsMono-Regular',
    ])
    expect(fonts.every(({ embedded }) => embedded)).toBe(true)
  })

  it('keeps the letters of both languages readable for programs', async () => {
    const text = '¿Dónde está el tapajuntas? ñ ü · – — “½” 5 3/4" 12° × €'
    const bytes = await draw((pdf) => {
      drawText(pdf, text, words(12), { x: 36, baseline: 100 })
      drawText(pdf, text, { ...words(12), font: 'figures' }, { x: 36, baseline: 130 })
    })
    const [page = ''] = await textOfPages(bytes)
    expect(page.match(/¿Dónde está el tapajuntas\? ñ ü · – — “½” 5 3\/4" 12° × €/g)).toHaveLength(2)
  })

  it.each(PDF_FONTS)('keeps signs in a row apart in %s', async (font) => {
    const text = 'A--1 -> <= .. === || www //'
    const bytes = await draw((pdf) => {
      drawText(pdf, text, { font, size: 12, color: '#000000' }, { x: 36, baseline: 100 })
    })
    expect((await textOfPages(bytes)).join('').trim()).toBe(text)
  })

  it('has the figures of a monospaced face, all as wide as they are measured for drawings', () => {
    const pdf = new Pdf(OPTIONS)
    for (const text of ['5 3/4"', 'A--1', '90°']) {
      const width = widthOfText(pdf, text, { font: 'figures', size: 10, color: '#000000' })
      expect(width).toBeCloseTo(textWidth(text, 10), 6)
    }
  })

  it('finds every font file', () => {
    // The first bytes of a TrueType font.
    for (const font of PDF_FONTS) expect(readFont(font).readUInt32BE(0)).toBe(0x00010000)
  })
})

describe('a line of text', () => {
  const pdf = new Pdf(OPTIONS)

  it('shrinks before it is cut short', () => {
    const text = 'Tapajuntas del hastial'
    const natural = widthOfText(pdf, text, words(12))
    expect(fitText(pdf, text, words(12), natural, 6)).toEqual({ text, size: 12 })
    const smaller = fitText(pdf, text, words(12), natural * 0.7, 6)
    expect(smaller.text).toBe(text)
    expect(smaller.size).toBeLessThanOrEqual(12 * 0.7)
    expect(smaller.size).toBeGreaterThan(12 * 0.7 - 0.1)
    const cut = fitText(pdf, text, words(12), natural * 0.4, 6)
    expect(cut.size).toBe(6)
    expect(cut.text).toMatch(/^Tapajuntas.*…$/)
    expect(widthOfText(pdf, cut.text, words(6))).toBeLessThanOrEqual(natural * 0.4)
  })

  it('has no line ends in it, whatever was typed', () => {
    expect(fitText(pdf, ' north\n\trake ', words(12), 500).text).toBe('north rake')
  })

  it('stands where it is told', async () => {
    const bytes = await draw((page) => {
      drawText(page, 'left', words(10), { x: 100, baseline: 100 })
      drawText(page, 'middle', words(10), { x: 300, baseline: 100, align: 'center' })
      drawText(page, 'right', words(10), { x: 500, baseline: 100, align: 'right' })
    })
    const found = new Map((await wordsOf(bytes)).map((word) => [word.text, word]))
    expect(found.get('left')?.xMin).toBeCloseTo(100, 1)
    const middle = found.get('middle')
    expect(((middle?.xMin ?? 0) + (middle?.xMax ?? 0)) / 2).toBeCloseTo(300, 1)
    expect(found.get('right')?.xMax).toBeCloseTo(500, 1)
  })
})

describe('text over several lines', () => {
  const pdf = new Pdf(OPTIONS)

  it('breaks between words, and within one that is too long for a line', () => {
    const width = widthOfText(pdf, 'north rake', words(10))
    expect(wrapText(pdf, 'north rake of the barn', words(10), width)).toEqual([
      'north rake',
      'of the',
      'barn',
    ])
    const pieces = wrapText(pdf, 'x'.repeat(40), words(10), width)
    expect(pieces.length).toBeGreaterThan(1)
    expect(pieces.join('')).toBe('x'.repeat(40))
  })

  it.each([1, 4, 9, 12, 60])('stays inside its box with %d words', async (count) => {
    const box = { x: 100, y: 200, width: 120, height: 30 }
    const text = Array.from({ length: count }, (_, index) => `word${index + 1}`).join(' ')
    const bytes = await draw((page) => drawTextBlock(page, text, words(16), box, { smallest: 8 }))
    const found = await wordsOf(bytes)
    expect(found[0]?.text).toBe('word1')
    for (const word of found) {
      expect(word.xMin).toBeGreaterThanOrEqual(box.x - 0.1)
      expect(word.xMax).toBeLessThanOrEqual(box.x + box.width + 0.1)
      // Poppler's boxes are as high as the font's own ascent and descent, letters less so.
      expect(word.yMin).toBeGreaterThan(box.y - 4)
      expect(word.yMax).toBeLessThan(box.y + box.height + 4)
    }
    expect(found.at(-1)?.text.endsWith('…')).toBe(count > 12)
  })
})
