import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  includedAngle,
  parseAngle,
  pitchAngle,
  printAngle,
  printBend,
  roundAngle,
  turnOfIncluded,
} from '#shared/units/angle'
import { printWeight } from '#shared/units/weight'

describe('parseAngle', () => {
  it.each([
    ['135', 135],
    ['135°', 135],
    ['135 °', 135],
    ['45 deg', 45],
    ['45deg.', 45],
    ['1 degree', 1],
    ['22.5 degrees', 22.5],
    ['22 1/2', 22.5],
    ['45 grados', 45],
    ['-45', -45],
    ['\u221245°', -45],
    ['0', 0],
  ])('%s is %s degrees', (text, degrees) => {
    expect(parseAngle(text)).toEqual({ ok: true, degrees })
  })

  it.each([
    ['', 'empty'],
    ['°', 'malformed'],
    ['ninety', 'malformed'],
    ['45"', 'malformed'],
    ['45,5', 'comma'],
    ['361', 'tooLarge'],
    ['--45', 'malformed'],
  ])('refuses %s as %s', (text, code) => {
    expect(parseAngle(text)).toMatchObject({ ok: false, code })
  })

  it('answers anything at all, and only with angles of at most a whole turn', () => {
    const signs = fc.string({
      unit: fc.constantFrom(...`0123456789 ./-,°º½degrado\u2212e+`),
      maxLength: 12,
    })
    fc.assert(
      fc.property(fc.oneof(signs, fc.string()), (text) => {
        const result = parseAngle(text)
        if (result.ok) {
          expect(Math.abs(result.degrees)).toBeLessThanOrEqual(360)
        } else {
          for (const cure of result.cures) expect(parseAngle(cure).ok).toBe(true)
          expect(result.code).not.toBe('')
        }
      }),
      { numRuns: 2000 },
    )
  })

  it('reads back what is printed as the rounded value', () => {
    fc.assert(
      fc.property(fc.double({ min: -360, max: 360, noNaN: true }), (angle) => {
        const result = parseAngle(printAngle(angle))
        if (!result.ok) expect.fail(`refused: ${result.code}`)
        expect(result.degrees).toBeCloseTo(roundAngle(angle), 12)
      }),
    )
  })
})

describe('a bend', () => {
  it('is read as included angle or as degrees of bend, without its side', () => {
    expect(printBend(-45, 'included')).toBe('135°')
    expect(printBend(-45, 'bend')).toBe('45°')
    expect(printBend(63.43494882, 'included')).toBe('116.6°')
  })

  it('keeps its side when the included angle is set', () => {
    fc.assert(
      fc.property(fc.integer({ min: -179, max: 179 }), (turn) => {
        fc.pre(turn !== 0)
        expect(turnOfIncluded(includedAngle(turn), turn)).toBe(turn)
      }),
    )
  })

  it('cannot print what is no number', () => {
    expect(() => printAngle(NaN)).toThrow(RangeError)
  })
})

describe('pitchAngle', () => {
  it.each([
    [0, 0],
    [4, 18.4349],
    [6, 26.5651],
    [12, 45],
  ])('%s in 12 is %s degrees', (rise, wanted) => {
    expect(pitchAngle(rise)).toBeCloseTo(wanted, 4)
  })
})

describe('printWeight', () => {
  it('is pounds, or kilograms where millimeters are read', () => {
    expect(printWeight(12.34, 'fraction')).toBe('12.3 lb')
    expect(printWeight(12.34, 'mm')).toBe('5.6 kg')
    expect(() => printWeight(NaN, 'mm')).toThrow(RangeError)
  })
})
