import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'

/**
 * The product's faces as full font files: words in Atkinson Hyperlegible Next, figures and codes in
 * JetBrains Mono. They are packages, so the sources and the built server find them alike.
 */
const FILES = {
  words:
    '@expo-google-fonts/atkinson-hyperlegible-next/400Regular/AtkinsonHyperlegibleNext_400Regular.ttf',
  wordsBold:
    '@expo-google-fonts/atkinson-hyperlegible-next/700Bold/AtkinsonHyperlegibleNext_700Bold.ttf',
  figures: '@expo-google-fonts/jetbrains-mono/400Regular/JetBrainsMono_400Regular.ttf',
  figuresBold: '@expo-google-fonts/jetbrains-mono/700Bold/JetBrainsMono_700Bold.ttf',
} as const

export type PdfFont = keyof typeof FILES

export const PDF_FONTS: readonly PdfFont[] = ['words', 'wordsBold', 'figures', 'figuresBold']

/** Height of capitals and digits in parts of the type size, from the font files. */
export const CAP_HEIGHT: Readonly<Record<PdfFont, number>> = {
  words: 0.668,
  wordsBold: 0.668,
  figures: 0.73,
  figuresBold: 0.73,
}

const resolve = createRequire(import.meta.url).resolve
const kept = new Map<PdfFont, Buffer>()

/** The font file, read once. */
export function readFont(font: PdfFont): Buffer {
  const known = kept.get(font)
  if (known) return known
  const file = readFileSync(resolve(FILES[font]))
  const bytes = font === 'figures' || font === 'figuresBold' ? withoutLigatures(file) : file
  kept.set(font, bytes)
  return bytes
}

const HEADER_BYTES = 12
const ENTRY_BYTES = 16

/**
 * The same font without its table of substitutions: its entry in the table directory gets a name that
 * nobody looks for. JetBrains Mono draws `--`, `->` or `..` as one sign, but a mark or a P.O. number
 * stays letter for letter; and fontkit 2.0.4 fails on the blank glyphs that such signs are made of.
 */
function withoutLigatures(font: Buffer): Buffer {
  const bytes = Buffer.from(font)
  const tables = bytes.readUInt16BE(4)
  for (let table = 0; table < tables; table += 1) {
    const at = HEADER_BYTES + table * ENTRY_BYTES
    if (bytes.toString('latin1', at, at + 4) === 'GSUB') bytes.write('none', at, 'latin1')
  }
  return bytes
}
