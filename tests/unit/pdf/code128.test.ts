import bwipjs from 'bwip-js/node'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { barsOf, code128, QUIET_MODULES } from '#server/adapters/pdf/code128'
import { DOTS_PER_MODULE, LABEL_DPI, snapToDot } from '#server/adapters/pdf/draw-code128'
import { checkOf, readCode128, widthsOf } from '../../support/read-code128'
import { readPublished } from '../../support/published-values'

const examplesSchema = z.object({
  examples: z.array(
    z.object({
      text: z.string(),
      values: z.array(z.int()),
      weightedSum: z.int(),
      check: z.int(),
      modules: z.int(),
      source: z.string(),
    }),
  ),
})
const { examples } = examplesSchema.parse(JSON.parse(readPublished('code128.json')))

/** The encoder told which characters to use, start included; it adds the check itself. */
const encodeValues = (values: readonly number[]): number[] => {
  const text = values.map((value) => `^${String(value).padStart(3, '0')}`).join('')
  const symbolSchema = z.tuple([z.object({ sbs: z.array(z.int()) })])
  return symbolSchema.parse(bwipjs.raw('code128', text, 'raw'))[0].sbs
}

describe('published symbols', () => {
  it('are five', () => expect(examples).toHaveLength(5))

  it.each(examples.map((example) => [example.text, example] as const))(
    '%s has the check character that was published',
    (_text, { values, weightedSum, check, modules }) => {
      const widths = encodeValues(values)
      expect(readCode128(widths)).toEqual([...values, check])
      expect(weightedSum % 103).toBe(check)
      expect(checkOf(values)).toBe(check)
      expect(barsOf(widths).modules).toBe(modules)
    },
  )
})

/** What the values of a symbol in the sets B and C say: the texts of our codes. */
function textOf(values: readonly number[]): string {
  const START_B = 104
  const TO_C = 99
  const TO_B = 100
  let set = values[0] === START_B ? 'B' : 'C'
  let text = ''
  for (const value of values.slice(1, -1)) {
    if (set === 'B' && value === TO_C) set = 'C'
    else if (set === 'C' && value === TO_B) set = 'B'
    else text += set === 'B' ? String.fromCharCode(value + 32) : String(value).padStart(2, '0')
  }
  return text
}

describe('the symbol of a code', () => {
  it('says the code, with the right check character', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[PBR][0-9A-HJKMNP-TV-Z]{7}$/), (code) => {
        const symbol = code128(code)
        const values = readCode128(widthsOf(symbol.bars))
        expect(values.at(-1)).toBe(checkOf(values.slice(0, -1)))
        expect(textOf(values)).toBe(code)
        // 11 modules a character and 13 for the stop.
        expect(symbol.modules).toBe(11 * values.length + 13)
      }),
    )
  })

  it('is printed in whole dots, of 0.33 mm or more, with ten modules blank on either side', () => {
    expect(Number.isInteger(DOTS_PER_MODULE)).toBe(true)
    expect((DOTS_PER_MODULE / LABEL_DPI) * 25.4).toBeGreaterThanOrEqual(0.33)
    // The least that does: one dot less is below what a hand scanner reads well.
    expect(((DOTS_PER_MODULE - 1) / LABEL_DPI) * 25.4).toBeLessThan(0.33)
    expect(QUIET_MODULES).toBe(10)
  })

  it('begins at the border of a dot, moved by less than one', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 900, noNaN: true }), (points) => {
        const snapped = snapToDot(points)
        const dots = (snapped / 72) * LABEL_DPI
        expect(Math.abs(dots - Math.round(dots))).toBeLessThan(1e-6)
        expect(points - snapped).toBeGreaterThan(-1e-6)
        expect(points - snapped).toBeLessThan(72 / LABEL_DPI)
      }),
    )
  })

  it.each(['', 'Łódź', 'a\tb'])('is refused where scanners would differ: %j', (text) => {
    expect(() => code128(text)).toThrow(RangeError)
  })
})
