import { describe, expect, it } from 'vitest'
import { LIFT_RULE, liftOf } from '#shared/bundles/lift-rule'

describe('who lifts a bundle', () => {
  // Common practice, no source.
  it.each([
    { weight: 12.4, longest: 60, lift: 'onePerson' },
    { weight: 35, longest: 96, lift: 'onePerson' },
    { weight: 35.01, longest: 96, lift: 'twoPeople' },
    { weight: 4, longest: 96.0625, lift: 'twoPeople' },
    { weight: 51, longest: 126, lift: 'twoPeople' },
    { weight: 51.01, longest: 24, lift: 'neverOne' },
    { weight: 71, longest: 126, lift: 'neverOne' },
    { weight: 0, longest: 0, lift: 'onePerson' },
  ])('$weight lb, $longest in.: $lift', ({ weight, longest, lift }) => {
    expect(liftOf({ weight, longest })).toBe(lift)
  })

  it('a shop may ask for two people sooner', () => {
    const careful = { ...LIFT_RULE, onePersonWeight: 25, onePersonLength: 72 }
    expect(liftOf({ weight: 30, longest: 60 }, careful)).toBe('twoPeople')
    expect(liftOf({ weight: 10, longest: 80 }, careful)).toBe('twoPeople')
    expect(liftOf({ weight: 25, longest: 72 }, careful)).toBe('onePerson')
  })

  it('no setting lets one person lift what is never one', () => {
    const bold = { ...LIFT_RULE, onePersonWeight: 200, onePersonLength: 240 }
    expect(liftOf({ weight: 52, longest: 60 }, bold)).toBe('neverOne')
  })

  it.each([
    { weight: Number.NaN, longest: 10 },
    { weight: -1, longest: 10 },
    { weight: 10, longest: Number.NaN },
    { weight: 10, longest: -1 },
  ])('refuses $weight lb, $longest in.', (bundle) => {
    expect(() => liftOf(bundle)).toThrow(RangeError)
  })
})
