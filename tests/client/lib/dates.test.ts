import { describe, expect, it } from 'vitest'
import { daysUntil, formatCount, formatDay, formatMoment } from '@/lib/format/dates'

/** A Wednesday, by the clock of the device. */
const NOW = new Date(2026, 2, 4, 23, 30)

const at = (day: number, hours: number, minutes: number) =>
  new Date(2026, 2, day, hours, minutes).toISOString()

describe('days', () => {
  it('are counted by the calendar, not by hours', () => {
    expect(daysUntil('2026-03-05', NOW)).toBe(1)
    expect(daysUntil('2026-03-04', NOW)).toBe(0)
    expect(daysUntil('2026-02-28', NOW)).toBe(-4)
  })

  it('across the change of the clocks are still whole', () => {
    expect(daysUntil('2026-11-02', new Date(2026, 9, 31, 12))).toBe(2)
    expect(daysUntil('2026-03-09', new Date(2026, 2, 7, 12))).toBe(2)
  })

  it('are said as a person says them', () => {
    const days = ['2026-03-03', '2026-03-04', '2026-03-05', '2026-03-07', '2026-03-19']
    expect(days.map((day) => formatDay(day, 'en', NOW))).toEqual([
      'yesterday',
      'today',
      'tomorrow',
      'Saturday',
      'Thu, Mar 19',
    ])
    expect(days.slice(0, 4).map((day) => formatDay(day, 'es', NOW))).toEqual([
      'ayer',
      'hoy',
      'mañana',
      'sábado',
    ])
  })

  it('that are none are refused', () => {
    expect(() => formatDay('soon', 'en', NOW)).toThrow(RangeError)
  })
})

describe('moments', () => {
  it('of today are a time, others have their day before it', () => {
    expect(formatMoment(at(4, 13, 42), 'en', NOW)).toBe('13:42')
    expect(formatMoment(at(3, 7, 5), 'en', NOW)).toBe('yesterday 07:05')
  })
})

describe('counts', () => {
  it('are grouped as the language does', () => {
    expect(formatCount(12840, 'en')).toBe('12,840')
  })
})
