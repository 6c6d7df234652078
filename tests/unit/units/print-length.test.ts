import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assumedUnit, UNITS } from '#shared/units/length-units'
import { parseLength } from '#shared/units/parse-length'
import type { Denominator, LengthStyle } from '#shared/units/print-length'
import { printLength, printRun, printSize, roundLength } from '#shared/units/print-length'

const STYLES: LengthStyle[] = ['feetInches', 'fraction', 'decimal', 'millimeters']
const style = fc.constantFrom(...STYLES)
const denominator = fc.constantFrom<Denominator>(16, 32, 64)

describe('printLength', () => {
  it.each<[number, LengthStyle, Denominator, string]>([
    [63.5, 'feetInches', 16, `5' 3 1/2"`],
    [60, 'feetInches', 16, `5'`],
    [60.5, 'feetInches', 16, `5' 1/2"`],
    [11.99, 'feetInches', 16, `1'`],
    [3.5, 'feetInches', 16, `3 1/2"`],
    [0, 'feetInches', 16, `0"`],
    [63.5, 'fraction', 16, `63 1/2"`],
    [5.75, 'fraction', 16, `5 3/4"`],
    [0.75, 'fraction', 16, `3/4"`],
    [9.1875, 'fraction', 16, `9 3/16"`],
    [9.15625, 'fraction', 16, `9 3/16"`],
    [9.15625, 'fraction', 32, `9 5/32"`],
    [9.171875, 'fraction', 64, `9 11/64"`],
    [5.99, 'fraction', 16, `6"`],
    [-0.75, 'fraction', 16, `-3/4"`],
    [-0.001, 'fraction', 16, `0"`],
    [5.75, 'decimal', 16, `5.75"`],
    [1 / 16, 'decimal', 16, `0.0625"`],
    [2 / 3, 'decimal', 16, `0.6667"`],
    [146 / 25.4, 'millimeters', 16, '146 mm'],
    [14.66 / 25.4, 'millimeters', 16, '14.7 mm'],
  ])('%s as %s to 1/%s is %s', (inches, as, to, wanted) => {
    expect(printLength(inches, as, to)).toBe(wanted)
  })

  it.each([NaN, Infinity, -Infinity])('throws on %s', (inches) => {
    expect(() => printLength(inches, 'decimal')).toThrow(RangeError)
  })

  it('is read back as the rounded value', () => {
    const length = fc.double({ min: 0, max: 2000, noNaN: true })
    fc.assert(
      fc.property(length, style, denominator, (inches, as, to) => {
        const printed = printLength(inches, as, to)
        expect(parseLength(printed, 'inches')).toEqual({
          ok: true,
          inches: roundLength(inches, as, to),
        })
      }),
      { numRuns: 2000 },
    )
  })

  it('is read back to the bit on the grid of its style', () => {
    const grid: Record<LengthStyle, (count: number, to: Denominator) => number> = {
      feetInches: (count, to) => count / to,
      fraction: (count, to) => count / to,
      decimal: (count) => count / 10_000,
      millimeters: (count) => count / 10 / 25.4,
    }
    fc.assert(
      fc.property(fc.nat({ max: 200_000 }), style, denominator, (count, as, to) => {
        const inches = grid[as](count, to)
        expect(parseLength(printLength(inches, as, to), 'inches')).toEqual({ ok: true, inches })
      }),
      { numRuns: 2000 },
    )
  })

  it('never moves a length by more than half a step', () => {
    const length = fc.double({ min: -500, max: 500, noNaN: true })
    fc.assert(
      fc.property(length, denominator, (inches, to) => {
        expect(Math.abs(roundLength(inches, 'fraction', to) - inches)).toBeLessThanOrEqual(0.5 / to)
      }),
    )
  })
})

describe("a person's units", () => {
  it('print a size of the profile without feet and a run with them', () => {
    expect(UNITS.map((units) => printSize(63.5, units))).toEqual([`63 1/2"`, `63.5"`, '1612.9 mm'])
    expect(UNITS.map((units) => printRun(63.5, units))).toEqual([`5' 3 1/2"`, `63.5"`, '1612.9 mm'])
    expect(printSize(9.15625, 'fraction', 32)).toBe(`9 5/32"`)
  })

  it('say what a bare number means', () => {
    expect(UNITS.map(assumedUnit)).toEqual(['inches', 'inches', 'millimeters'])
  })
})
