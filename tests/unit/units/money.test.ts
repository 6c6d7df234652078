import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { printMoney } from '#shared/units/money'

describe('money', () => {
  it.each([
    [0, '$0.00'],
    [5, '$0.05'],
    [1230, '$12.30'],
    [123_456, '$1,234.56'],
    [123_456_789, '$1,234,567.89'],
    [-250, '-$2.50'],
  ])('prints %i cents as %s in both languages', (cents, printed) => {
    expect(printMoney(cents, 'en')).toBe(printed)
    expect(printMoney(cents, 'es')).toBe(printed)
  })

  it('loses no cent', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000_000 }), (cents) => {
        for (const language of ['en', 'es'] as const) {
          expect(Number(printMoney(cents, language).replaceAll(/\D/g, ''))).toBe(cents)
        }
      }),
    )
  })

  it('takes whole cents alone', () => {
    for (const fault of [0.5, NaN, Infinity]) {
      expect(() => printMoney(fault, 'en')).toThrow(RangeError)
    }
  })
})
