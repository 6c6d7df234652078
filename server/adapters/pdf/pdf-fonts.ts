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
  const bytes = readFileSync(resolve(FILES[font]))
  kept.set(font, bytes)
  return bytes
}
