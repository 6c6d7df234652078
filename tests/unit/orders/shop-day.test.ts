import { describe, expect, it } from 'vitest'
import { dayIn } from '#server/features/orders/shop-day'

describe("The shop's day", () => {
  it('is still yesterday there when UTC has turned to the next day', () => {
    expect(dayIn('America/Denver', new Date('2026-03-10T03:00:00Z'))).toBe('2026-03-09')
  })

  it('is already tomorrow there when it lies ahead of UTC', () => {
    expect(dayIn('Pacific/Auckland', new Date('2026-03-09T20:00:00Z'))).toBe('2026-03-10')
  })

  it('turns at midnight by the clock of the shop, summer time included', () => {
    expect(dayIn('America/Denver', new Date('2026-07-01T05:59:59Z'))).toBe('2026-06-30')
    expect(dayIn('America/Denver', new Date('2026-07-01T06:00:00Z'))).toBe('2026-07-01')
  })
})
