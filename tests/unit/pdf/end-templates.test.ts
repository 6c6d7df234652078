import { describe, expect, it } from 'vitest'
import { PAGE_SIZES } from '#server/adapters/pdf/page-frame'
import { drawEndTemplates } from '#server/features/sheets/end-templates'
import { sheetPiece, type SheetLine } from '#server/features/sheets/sheet-line'
import { sheetSpeech } from '#server/features/sheets/strip-sheet/sheet-speech'
import type { PieceEnds } from '#shared/ends/end.schema'
import type { Language } from '#shared/people/people.contract'
import { profileOf } from '../../support/arbitrary-profile'
import type { Paper } from '#shared/sheets/sheets.contract'
import { sheetWords } from '#shared/sheets/words/sheet-words'
import {
  blackRuns,
  factsOf,
  outsideOf,
  overlapsOf,
  textOfPages,
  wordsOf,
} from '../../support/paper'
import { LONG_WORDS, MITER_AND_LAP, sheetLine, TWELVE_BENDS } from '../../support/paper-lines'

const draw = (line: SheetLine, paper: Paper = 'letter', language: Language = 'en') =>
  drawEndTemplates(
    sheetPiece(line, undefined),
    sheetSpeech(sheetWords(language), language === 'es' ? 'mm' : 'fraction'),
    { paper, language, at: new Date(0), day: 'Mar 2, 2026' },
  )

/** Narrow enough for one page. */
const ANGLE = profileOf([1.5, 2], [90])
const MITER: PieceEnds = {
  left: { kind: 'miter', plane: { plumb: 26.565 }, lay: 90, legs: [], tabs: [] },
  right: { kind: 'square', tabs: [] },
  lowEnd: null,
}

const pagesOf = async (bytes: Uint8Array) => Number((await factsOf(bytes)).Pages)

describe('the check lines', () => {
  it.each(['letter', 'a4'] as const)(
    'are 432 points (6 in.) and 150 mm long on every page of %s paper',
    async (paper) => {
      const bytes = await draw(sheetLine({ ends: MITER_AND_LAP }), paper)
      const pages = await pagesOf(bytes)
      expect(pages).toBeGreaterThan(1)
      for (let page = 1; page <= pages; page += 1) {
        const lengths = (await blackRuns(bytes, page, 400)).map(({ length }) => length)
        const near = (wanted: number) => lengths.filter((each) => Math.abs(each - wanted) <= 1)
        expect(near(432).length, `page ${page}`).toBeGreaterThan(0)
        expect(near((150 / 25.4) * 72).length, `page ${page}`).toBeGreaterThan(0)
      }
    },
  )

  it('are told with what to do about them', async () => {
    const [page = ''] = await textOfPages(await draw(sheetLine({ ends: MITER_AND_LAP })))
    expect(page).toContain('Measure this line: it must be 6 in. long.')
    expect(page).toContain('Measure this line: it must be 150 mm long.')
    expect(page).toContain('Print at 100 %')
  })
})

describe('the template of an end', () => {
  it('has its edges as far apart as the strip is wide', async () => {
    const line = sheetLine({ profile: ANGLE, ends: MITER })
    const bytes = await draw(line)
    expect(await pagesOf(bytes)).toBe(1)
    const B_TO_A = line.strip.stripWidth * 72
    const edges = (await blackRuns(bytes, 1, 60)).filter(
      // The frame is wider than the strip's edges, the check lines longer.
      ({ length }) => length < 400,
    )
    const heights = edges.map(({ y }) => y)
    expect(Math.max(...heights) - Math.min(...heights)).toBeGreaterThan(B_TO_A - 1.5)
    expect(Math.max(...heights) - Math.min(...heights)).toBeLessThan(B_TO_A + 1.5)
  })

  it('stands on as many pages as it needs, the dressed ends only', async () => {
    const both = await textOfPages(await draw(sheetLine({ ends: MITER_AND_LAP })))
    expect(both.filter((page) => page.includes('Left end')).length).toBeGreaterThan(0)
    expect(both.filter((page) => page.includes('Right end')).length).toBeGreaterThan(0)
    expect(both.every((page, index) => page.includes(`page ${index + 1} of ${both.length}`))).toBe(
      true,
    )
    const one = await textOfPages(await draw(sheetLine({ profile: ANGLE, ends: MITER })))
    expect(one).toHaveLength(1)
    expect(one[0]).toContain('Left end')
    expect(one[0]).not.toContain('join the pages')
  })

  it('of a square end is not drawn, and the paper says so', async () => {
    const [page = '', ...others] = await textOfPages(await draw(sheetLine()))
    expect(others).toEqual([])
    expect(page).toContain('Both ends are cut square')
  })

  it.each(['en', 'es'] as const)('has room for the longest words (%s)', async (language) => {
    const line = sheetLine({
      ...LONG_WORDS,
      profile: TWELVE_BENDS,
      ends: MITER_AND_LAP,
      hands: { drawn: 'right', left: 2, right: 4 },
    })
    const bytes = await draw(line, 'a4', language)
    const words = await wordsOf(bytes)
    expect(overlapsOf(words)).toEqual([])
    expect(outsideOf(words, PAGE_SIZES.a4, 20)).toEqual([])
  })
})
