import { describe, expect, it } from 'vitest'
import { PAGE_SIZES } from '#server/adapters/pdf/page-frame'
import { sheetPiece, type SheetLine } from '#server/features/sheets/sheet-line'
import { sheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import { drawStripSheet } from '#server/features/sheets/strip-sheet/strip-sheet'
import type { End } from '#shared/ends/end.schema'
import type { Language, Units } from '#shared/people/people.contract'
import type { Paper } from '#shared/sheets/sheets.contract'
import { sheetWords } from '#shared/sheets/words/sheet-words'
import { factsOf, fontsOf, outsideOf, overlapsOf, textOfPages, wordsOf } from '../../support/paper'
import { LONG_WORDS, MITER_AND_LAP, sheetLine, TWELVE_BENDS } from '../../support/paper-lines'
import { NAMED_PROFILES } from '../drawing/named-profiles'

interface Manner {
  readonly language: Language
  readonly units: Units
  readonly paper: Paper
}
const US: Manner = { language: 'en', units: 'fraction', paper: 'letter' }
const ES: Manner = { language: 'es', units: 'mm', paper: 'a4' }

const draw = (line: SheetLine, { language, units, paper }: Manner = US) =>
  drawStripSheet(sheetPiece(line, undefined), sheetSpeech(sheetWords(language), units), {
    paper,
    language,
    at: new Date('2026-03-02T15:00:00Z'),
    day: 'Mar 2, 2026',
  })

const plain = async (bytes: Uint8Array) =>
  (await textOfPages(bytes)).map((page) => page.replace(/\s+/g, ' '))

const hands = { drawn: 'left', left: 4, right: 2 } as const

const LINES: [string, SheetLine][] = [
  ['a plain gable', sheetLine()],
  ['a pair with a miter and a lap', sheetLine({ ends: MITER_AND_LAP, hands, statedGirth: 9.5 })],
  [
    'the longest words and twelve bends',
    sheetLine({ ...LONG_WORDS, profile: TWELVE_BENDS, ends: MITER_AND_LAP, hands, quantity: 6 }),
  ],
  ...['coping', 'W valley', 'square spiral', 'many ribs', 'flat strip', 'open hems'].map(
    (name): [string, SheetLine] => {
      const profile = NAMED_PROFILES[name]
      if (!profile) throw new Error(`There is no profile ${name}.`)
      const under: End = { kind: 'lap', side: 'under', length: 4, tabs: [] }
      return [name, sheetLine({ profile, ends: { left: under, right: under, lowEnd: null } })]
    },
  ),
]

describe.each(LINES)('the strip sheet of %s', (_name, line) => {
  it.each([US, ES])('has room for everything: %o', async (manner) => {
    const words = await wordsOf(await draw(line, manner))
    expect(overlapsOf(words)).toEqual([])
    expect(outsideOf(words, PAGE_SIZES[manner.paper], 20)).toEqual([])
  })
})

describe('the strip sheet', () => {
  it('of a piece with square ends is one page and says all that is cut and bent', async () => {
    const bytes = await draw(sheetLine())
    const [page = '', ...others] = await plain(bytes)
    expect(others).toEqual([])
    for (const text of [
      'Strip sheet',
      'Gable, north rake',
      'Larkspur barn · Tamsin & Reed',
      'F-2047',
      'P.O. 1187',
      'Pieces 6',
      `Piece, tip to tip 10' 6"`,
      `Cut the blank 10' 6"`,
      'Girth (stretch-out) 10 1/4"',
      'A piece weighs',
      '24 ga · Kiln 4',
      'up as it lies here',
      'Long brake',
      'bend 1',
      'hem at B',
      'Cut edges and burrs are sharp: gloves on.',
      'Pinch points at the brake',
      `Two people lift it: over 35 lb or 8'.`,
      'Peel the film back from a hem before it is closed',
      'printed Mar 2, 2026',
      'page 1 of 1',
    ]) {
      expect(page).toContain(text)
    }
  })

  it('shows each dressed end with its marks, which end is low, and whose hand it is', async () => {
    const [first = '', second = '', ...others] = await plain(
      await draw(sheetLine({ ends: MITER_AND_LAP, hands })),
    )
    expect(others).toEqual([])
    expect(first).toMatch(/^C L Strip sheet/)
    expect(first).toContain('left hand')
    expect(first).toMatch(/Pieces 6 .*of them left 4 .*of them right 2 /)
    expect(second).toMatch(/Left end LOW END/)
    expect(second).toMatch(/Right end HIGH END/)
    expect(second).toContain('Leg 2: leave a tab of 1" beyond the cut')
    expect(second).toContain('Lap that takes its neighbor in.')
    expect(second).toContain('Open the hem at edge B to 1/16" over 4" from the end.')
    expect(second).toMatch(/At From edge A In from the end/)
  })

  it('says of the other hand what is mirrored', async () => {
    const speech = sheetSpeech(sheetWords('en'), 'fraction')
    const paper = { paper: 'letter', language: 'en', at: new Date(0), day: '' } as const
    const line = sheetLine({ ends: MITER_AND_LAP, hands })
    const [first = '', second = ''] = await plain(
      await drawStripSheet(sheetPiece(line, 'right'), speech, paper),
    )
    expect(first).toContain('right hand')
    expect(second).toMatch(/Left end HIGH END Lap that takes its neighbor in/)
    expect(second).toMatch(/Right end LOW END Mitered/)
  })

  it('prints the marks of a cut to the sixteenth, or in millimeters', async () => {
    const line = sheetLine({ ends: MITER_AND_LAP })
    const { marks } = sheetPiece(line, undefined).layout.left
    const deepest = Math.max(...marks.map(({ along }) => along))
    const [, inches = ''] = await plain(await draw(line))
    const [, metric = ''] = await plain(await draw(line, ES))
    const sixteenths = Math.round(deepest * 16)
    const whole = Math.floor(sixteenths / 16)
    expect(inches).toContain(whole === 0 ? `${sixteenths}/16"` : `${whole} `)
    expect(metric).toContain(`${Math.round(deepest * 254) / 10} mm`)
  })

  it('says one strip width everywhere, to the 1/32 that is sheared', async () => {
    const line = sheetLine({ ends: MITER_AND_LAP })
    expect(line.strip.stripWidth).toBeCloseTo(10.17, 2)
    const pages = await plain(await draw(line))
    expect(pages.join(' ').match(/10 5\/32"/g)?.length).toBeGreaterThan(3)
    expect(pages.join(' ')).not.toContain('10 3/16"')
  })

  it('flags a girth that the crew did not expect', async () => {
    const [page = ''] = await plain(await draw(sheetLine({ statedGirth: 9.5 })))
    expect(page).toContain('Girth the crew expects 9 1/2"')
  })

  it('says before release that no brake is chosen yet', async () => {
    const [page = ''] = await plain(await draw(sheetLine({ brakeName: null })))
    expect(page).toContain('Brake not released yet')
  })

  it('is on A4 in Spanish and millimeters where that is wanted', async () => {
    const bytes = await draw(sheetLine({ ends: MITER_AND_LAP, hands }), ES)
    const [first = '', second = ''] = await plain(bytes)
    expect(first).toContain('Hoja de la tira')
    expect(first).toContain('3200.4 mm')
    expect(first).toContain('mano izquierda')
    expect(first).toContain('Precauciones')
    expect(second).toMatch(/Extremo izquierdo EXTREMO BAJO/)
    expect(first).not.toMatch(/\d"/)
    expect(await factsOf(bytes)).toMatchObject({ 'Page size': '595.28 x 841.89 pts (A4)' })
  })

  it('carries its fonts and has the same bytes again', async () => {
    const line = sheetLine({ ends: MITER_AND_LAP, hands })
    const bytes = await draw(line)
    expect((await fontsOf(bytes)).every(({ embedded }) => embedded)).toBe(true)
    expect(await draw(line)).toEqual(bytes)
    expect(await factsOf(bytes)).toMatchObject({ Title: 'Strip sheet F-2047 C', Tagged: 'yes' })
  })
})

describe('the hand of a sheet', () => {
  it('is refused where the line has none', () => {
    expect(() => sheetPiece(sheetLine(), 'left')).toThrow('invalid-input')
    const leftOnly = sheetLine({ hands: { drawn: 'left', left: 6, right: 0 } })
    expect(() => sheetPiece(leftOnly, 'right')).toThrow('invalid-input')
    expect(sheetPiece(leftOnly, 'left').hand).toBe('left')
  })

  it('is the drawn one unless another is asked for', () => {
    expect(sheetPiece(sheetLine({ hands }), undefined).hand).toBe('left')
  })
})
