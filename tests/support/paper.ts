import { execFile } from 'node:child_process'
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { promisify } from 'node:util'

const run = promisify(execFile)

/** Programs of Debian's poppler-utils and zbar-tools, by the paths where Debian puts them. */
const tool = async (name: string, args: readonly string[]): Promise<string> => {
  const { stdout } = await run(`/usr/bin/${name}`, args, { maxBuffer: 32 * 1024 * 1024 })
  return stdout
}

/** Lends a folder with the PDF in it. */
async function withPdf<T>(bytes: Uint8Array, use: (file: string, folder: string) => Promise<T>) {
  const folder = await mkdtemp(join(tmpdir(), 'foldyard-paper-'))
  try {
    const file = join(folder, 'paper.pdf')
    await writeFile(file, bytes)
    return await use(file, folder)
  } finally {
    await rm(folder, { recursive: true })
  }
}

/** The text of each page in the order in which it is read. */
export const textOfPages = (bytes: Uint8Array): Promise<string[]> =>
  withPdf(bytes, async (file) => {
    const text = await tool('pdftotext', ['-layout', file, '-'])
    // A form feed ends every page.
    return text.split('\f').slice(0, -1)
  })

export interface PdfFacts {
  readonly [name: string]: string
}

/** What `pdfinfo` says, by its names: `Title`, `Pages`, `Page size`, `Tagged`… */
export const factsOf = (bytes: Uint8Array): Promise<PdfFacts> =>
  withPdf(bytes, async (file) => {
    const lines = (await tool('pdfinfo', ['-isodates', file])).trim().split('\n')
    return Object.fromEntries(
      lines.map((line) => {
        const at = line.indexOf(':')
        return [line.slice(0, at), line.slice(at + 1).trim()]
      }),
    )
  })

export interface UsedFont {
  readonly name: string
  readonly embedded: boolean
}

export const fontsOf = (bytes: Uint8Array): Promise<UsedFont[]> =>
  withPdf(bytes, async (file) => {
    const rows = (await tool('pdffonts', [file])).trim().split('\n').slice(2)
    return rows.map((row) => {
      const [name = '', ...rest] = row.split(/\s+/)
      // From the right: object and generation, uni, sub, emb.
      return { name: name.replace(/^[A-Z]{6}\+/, ''), embedded: rest.at(-5) === 'yes' }
    })
  })

/** A word of a page with its box: points from the upper left corner. */
export interface PlacedWord {
  readonly page: number
  readonly text: string
  readonly xMin: number
  readonly yMin: number
  readonly xMax: number
  readonly yMax: number
}

export const wordsOf = (bytes: Uint8Array): Promise<PlacedWord[]> =>
  withPdf(bytes, async (file) => {
    const html = await tool('pdftotext', ['-bbox', file, '-'])
    const pages = html.split('<page ').slice(1)
    return pages.flatMap((page, index) =>
      Array.from(
        page.matchAll(
          /<word xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">([^<]*)</g,
        ),
        ([, xMin, yMin, xMax, yMax, text = '']) => ({
          page: index + 1,
          text: text.replaceAll('&quot;', '"').replaceAll('&apos;', "'").replaceAll('&amp;', '&'),
          xMin: Number(xMin),
          yMin: Number(yMin),
          xMax: Number(xMax),
          yMax: Number(yMax),
        }),
      ),
    )
  })

/**
 * The codes that an independent reader finds on each page, printed in pure black and white as a
 * thermal printer does, from top to bottom and left to right.
 */
export const codesOnPages = (bytes: Uint8Array, dpi: number): Promise<string[][]> =>
  withPdf(bytes, async (file, folder) => {
    await tool('pdftoppm', ['-r', String(dpi), '-mono', file, join(folder, 'page')])
    const pages = (await readdir(folder)).filter((name) => name.endsWith('.pbm')).sort()
    const found: string[][] = []
    for (const page of pages) {
      const lines = await tool('zbarimg', ['--quiet', '--nodbus', join(folder, page)])
      found.push(lines.trim().split('\n'))
    }
    return found
  })

/** The color of a point of the first page, CSS hex. Points from the upper left corner. */
export const colorAt = (
  bytes: Uint8Array,
  at: { readonly x: number; readonly y: number },
): Promise<string> =>
  withPdf(bytes, async (file, folder) => {
    const dot = (points: number) => String(Math.floor((points / 72) * DOTS))
    await tool('pdftoppm', [
      ...['-r', String(DOTS), '-aa', 'no', '-aaVector', 'no', '-singlefile'],
      ...['-x', dot(at.x), '-y', dot(at.y), '-W', '1', '-H', '1', file, join(folder, 'dot')],
    ])
    const image = await readFile(join(folder, 'dot.ppm'))
    return `#${image.subarray(-3).toString('hex').toUpperCase()}`
  })

const DOTS = 288

/** Poppler's box of a word is as high as the font's ascent and descent: letters fill the middle of it. */
const SLACK = 0.28

/** Pairs of words on a page that are printed over each other, as text for a failing test. */
export function overlapsOf(words: readonly PlacedWord[]): string[] {
  const cores = words.map((word) => {
    const upright = word.yMax - word.yMin > word.xMax - word.xMin && word.text.length > 2
    const slackX = upright ? (word.xMax - word.xMin) * SLACK : 0.5
    const slackY = upright ? 0.5 : (word.yMax - word.yMin) * SLACK
    return {
      ...word,
      xMin: word.xMin + slackX,
      xMax: word.xMax - slackX,
      yMin: word.yMin + slackY,
      yMax: word.yMax - slackY,
    }
  })
  return cores.flatMap((a, index) =>
    cores
      .slice(index + 1)
      .filter(
        (b) =>
          a.page === b.page &&
          a.xMin < b.xMax &&
          b.xMin < a.xMax &&
          a.yMin < b.yMax &&
          b.yMin < a.yMax,
      )
      .map((b) => `page ${a.page}: "${a.text}" and "${b.text}"`),
  )
}

/** Words that stand beyond the margin of their page. */
export const outsideOf = (
  words: readonly PlacedWord[],
  page: { readonly width: number; readonly height: number },
  margin: number,
): string[] =>
  words
    .filter(
      ({ xMin, yMin, xMax, yMax }) =>
        xMin < margin ||
        xMax > page.width - margin ||
        // The box is higher than the letters.
        (yMin + yMax) / 2 < margin ||
        (yMin + yMax) / 2 > page.height - margin,
    )
    .map(({ page: number, text }) => `page ${number}: "${text}"`)

/** A stretch of black dots in one row of a page; points from the upper left corner. */
export interface BlackRun {
  readonly y: number
  readonly from: number
  readonly length: number
}

/**
 * The unbroken horizontal black lines of a page that are at least so many points long, as they come
 * out of a printer of 288 dots per inch: four to a point.
 */
export const blackRuns = (bytes: Uint8Array, page: number, least: number): Promise<BlackRun[]> =>
  withPdf(bytes, async (file, folder) => {
    const only = ['-f', String(page), '-l', String(page), '-singlefile']
    await tool('pdftoppm', ['-r', String(DOTS), '-mono', ...only, file, join(folder, 'page')])
    const { width, height, isBlack } = readBitmap(await readFile(join(folder, 'page.pbm')))
    const perPoint = DOTS / 72
    const runs: BlackRun[] = []
    for (let y = 0; y < height; y += 1) {
      let from = 0
      for (let x = 0; x <= width; x += 1) {
        if (x < width && isBlack(x, y)) continue
        const length = (x - from) / perPoint
        if (length >= least) runs.push({ y: y / perPoint, from: from / perPoint, length })
        from = x + 1
      }
    }
    return runs
  })

/** A raw portable bitmap: a header in text, then eight dots to a byte, 1 for black. */
function readBitmap(file: Buffer) {
  const [header = '', width = '', height = ''] =
    /^P4\s+(?:#[^\n]*\n)?(\d+)\s+(\d+)\s/.exec(file.toString('latin1', 0, 200)) ?? []
  if (header === '') throw new Error('Not a raw portable bitmap.')
  const rowBytes = Math.ceil(Number(width) / 8)
  const isBlack = (x: number, y: number): boolean => {
    const byte = file[header.length + y * rowBytes + (x >> 3)] ?? 0
    return (byte & (0x80 >> (x & 7))) !== 0
  }
  return { width: Number(width), height: Number(height), isBlack }
}
