import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseLength } from '#shared/units/parse-length'

const inches = (text: string, assumed: 'inches' | 'millimeters' = 'inches') => {
  const result = parseLength(text, assumed)
  if (!result.ok) throw new Error(`${text} was refused: ${result.code}`)
  return result.inches
}

describe('parseLength', () => {
  it.each([
    ['5 3/4', 5.75],
    ['5-3/4', 5.75],
    ['5 - 3/4', 5.75],
    ['5.75', 5.75],
    ['5.', 5],
    ['.75', 0.75],
    ['3/4', 0.75],
    ['7/4', 1.75],
    ['5 3/4"', 5.75],
    ['5 3/4 in', 5.75],
    ['5 3/4 inches', 5.75],
    ['63"', 63],
    ['63in.', 63],
    [`5' 3 1/2"`, 63.5],
    [`5'3-1/2"`, 63.5],
    [`5'-3 1/2"`, 63.5],
    [`5' 3 1/2`, 63.5],
    [`5' 3''`, 63],
    ['5ft 3in', 63],
    ['5 ft. 3 in.', 63],
    ['5 feet 3 inches', 63],
    ['1 foot', 12],
    [`10'`, 120],
    [`5.5'`, 66],
    [`5 1/2'`, 66],
    [`5' 0"`, 60],
    ['5½', 5.5],
    ['5 ½"', 5.5],
    ['⅝', 0.625],
    ['5\u2032 3\u00bd\u2033', 63.5],
    ['5\u2019 3\u201d', 63],
    ['3\u20444', 0.75],
    ['5\u20133/4', 5.75],
    ['\u00a05\u00a03/4 ', 5.75],
    ['0', 0],
    ['1/64', 1 / 64],
  ])('%s is %s in.', (text, wanted) => {
    expect(inches(text)).toBe(wanted)
    // A unit that is written outranks the one assumed; a bare number does not.
    if (/["'\u2032\u2033\u2019]|in|f/.test(text)) {
      expect(inches(text, 'millimeters')).toBe(wanted)
    }
  })

  it.each([
    ['146mm', 146 / 25.4],
    ['146 MM', 146 / 25.4],
    ['14.6 cm', 146 / 25.4],
    ['1.5 m', 1500 / 25.4],
  ])('%s is metric whatever is assumed', (text, wanted) => {
    expect(inches(text)).toBeCloseTo(wanted, 12)
    expect(inches(text, 'millimeters')).toBeCloseTo(wanted, 12)
  })

  it('reads a bare number in the assumed unit', () => {
    expect(inches('254', 'millimeters')).toBe(10)
    expect(inches('254', 'inches')).toBe(254)
  })

  it.each([
    ['5,75', 'comma', ['5.75']],
    ['14,6 cm', 'comma', ['14.6 cm']],
    ['1,250', 'comma', ['1.250', '1250']],
    ['1,250,000', 'malformed', []],
    ['5,5-', 'malformed', []],
    ['90,000,5', 'malformed', []],
    ['', 'empty', []],
    ['   ', 'empty', []],
    ['-5', 'negative', []],
    ['\u22125', 'negative', []],
    ['3/0', 'zeroDenominator', []],
    ['5 4/4', 'fractionTooBig', []],
    ['five', 'malformed', []],
    ['5 3', 'malformed', []],
    ['5.75 1/2', 'malformed', []],
    ['5..7', 'malformed', []],
    ['1e3', 'malformed', []],
    ['0x10', 'malformed', []],
    ['Infinity', 'malformed', []],
    ['NaN', 'malformed', []],
    ['5 mm 3', 'malformed', []],
    ['5 3/4 mm', 'malformed', []],
    [`5' 3'`, 'malformed', []],
    [`5.5' 3"`, 'malformed', []],
    [`'`, 'malformed', []],
    ['"', 'malformed', []],
    ['.', 'malformed', []],
    ['100001', 'tooLarge', []],
    ['9'.repeat(50), 'tooLarge', []],
    ['9'.repeat(400), 'malformed', []],
  ])('refuses %s as %s', (text, code, cures) => {
    expect(parseLength(text, 'inches')).toEqual({ ok: false, code, cures })
  })

  it('refuses a bare fraction where millimeters are assumed, with the cure', () => {
    expect(parseLength('5 3/4', 'millimeters')).toEqual({
      ok: false,
      code: 'fractionWithoutUnit',
      cures: ['5 3/4"'],
    })
  })

  it('offers cures that are themselves read', () => {
    for (const text of ['5,75', '1,250', '14,6 cm', '0,5"']) {
      const result = parseLength(text, 'inches')
      if (result.ok) throw new Error(`${text} was read.`)
      expect(result.cures.length).toBeGreaterThan(0)
      for (const cure of result.cures) expect(parseLength(cure, 'inches').ok).toBe(true)
    }
  })

  it('answers anything at all, and only with lengths that make sense', () => {
    const signs = fc.string({
      unit: fc.constantFrom(...`0123456789 ./-'",½⅛′″ftincm°e+`),
      maxLength: 14,
    })
    fc.assert(
      fc.property(fc.oneof(signs, fc.string()), (text) => {
        const result = parseLength(text, 'inches')
        if (result.ok) {
          expect(result.inches).toBeGreaterThanOrEqual(0)
          expect(result.inches).toBeLessThanOrEqual(100_000)
        } else {
          expect(result.code).not.toBe('')
          for (const cure of result.cures) expect(parseLength(cure, 'inches').ok).toBe(true)
        }
      }),
      { numRuns: 2000 },
    )
  })
})
