import { describe, expect, it } from 'vitest'
import { drawLabel, LABEL_SIZE } from '#server/features/labels/draw-label'
import { labelContent, labelSection, type LabelFacts } from '#server/features/labels/label-content'
import { Pdf } from '#server/adapters/pdf/pdf'
import { labelWords } from '#shared/labels/words/label-words'
import type { Language, Units } from '#shared/people/people.contract'
import { getStarter } from '#shared/profile/starters'
import { codesOnPages, outsideOf, overlapsOf, textOfPages, wordsOf } from '../../support/paper'
import { labelFacts, LONG_WORDS, TWELVE_BENDS } from '../../support/paper-lines'

const draw = async (facts: LabelFacts, language: Language = 'en', units: Units = 'fraction') => {
  const pdf = new Pdf({ title: 'Labels', language, at: new Date(0) })
  pdf.addPage(LABEL_SIZE)
  const content = labelContent(facts, units, labelSection(facts))
  drawLabel(pdf, content, labelWords(language), { x: 0, y: 0 })
  return pdf.finish()
}

const plain = async (bytes: Uint8Array) => (await textOfPages(bytes)).join(' ').replace(/\s+/g, ' ')

const heavy = { weight: 53, length: 125.9375 }

const CASES: [string, LabelFacts][] = [
  ['a piece without a hand', labelFacts()],
  ['a left piece', labelFacts({ hand: 'left', lowEnd: 'right' })],
  ['a light piece of an order without a P.O.', labelFacts({ length: 60, poNumber: '' })],
  [
    'the longest words',
    labelFacts({
      ...LONG_WORDS,
      ...heavy,
      sequence: 500,
      quantity: 500,
      hand: 'right',
      lowEnd: 'left',
    }),
  ],
  ['twelve bends', labelFacts({ profile: TWELVE_BENDS, mark: 'AB', hand: 'left', lowEnd: 'left' })],
  ['a decimal thickness', labelFacts({ stock: { ...labelFacts().stock, thicknessName: '.032' } })],
]
const MANNERS: [Language, Units][] = [
  ['en', 'fraction'],
  ['en', 'decimal'],
  ['es', 'mm'],
]

describe.each(CASES)('the label of %s', (_name, facts) => {
  it.each(MANNERS)('has room for everything (%s, %s)', async (language, units) => {
    const bytes = await draw(facts, language, units)
    const words = await wordsOf(bytes)
    expect(overlapsOf(words)).toEqual([])
    expect(outsideOf(words, LABEL_SIZE, 5)).toEqual([])
    expect(await codesOnPages(bytes, 203)).toEqual([[`CODE-128:${facts.code}`]])
  })
})

describe('a label', () => {
  it('says all of the longest name and P.O. number', async () => {
    const text = await plain(await draw(labelFacts(LONG_WORDS)))
    for (const word of LONG_WORDS.name.split(' ')) expect(text).toContain(word)
    expect(text).toContain(LONG_WORDS.poNumber)
    expect(text).toContain(LONG_WORDS.mark.slice(0, 10))
  })

  it('turns its arrow about where it is read from the other side', async () => {
    const { profile } = getStarter('gableRake')
    const ends = { hand: 'left', lowEnd: 'left' } as const
    const order = async (colorSide: 'left' | 'right' | 'both' | 'none') => {
      const bytes = await draw(labelFacts({ ...ends, profile: { ...profile, colorSide } }))
      const words = await wordsOf(bytes)
      const at = (word: string) => words.find(({ text }) => text === word)?.xMin ?? NaN
      return at('low') < at('high') ? 'low end left' : 'low end right'
    }
    // Left side up and edge A nearest, the left end lies left; from below it lies right.
    expect(await order('right')).toBe('low end left')
    expect(await order('left')).toBe('low end right')
    // Painted on both sides or on none, it is stuck on the upper side.
    expect(await order('both')).toBe('low end left')
    expect(await order('none')).toBe('low end left')
  })

  it.each([
    [{ weight: 12, length: 60 }, undefined],
    [{ weight: 12, length: 97 }, 'Two people lift'],
    [{ weight: 36, length: 60 }, 'Two people lift'],
    [{ weight: 52, length: 60 }, 'Two people, never one'],
  ])('says who lifts a piece of %o', async (piece, caution) => {
    const text = await plain(await draw(labelFacts(piece)))
    if (caution === undefined) expect(text).not.toContain('people')
    else expect(text).toContain(caution)
  })
})
