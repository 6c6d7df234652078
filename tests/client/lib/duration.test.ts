import { describe, expect, it } from 'vitest'
import { formatDuration } from '@/lib/format/dates'

describe('seconds of work', () => {
  it('are told to the next five', () => {
    expect(formatDuration(41, 'en')).toBe('45 sec')
    expect(formatDuration(0, 'en')).toBe('5 sec')
  })

  it('become minutes from sixty on, without seconds that are none', () => {
    expect(formatDuration(60, 'en')).toBe('1 min')
    expect(formatDuration(127, 'en')).toBe('2 min 10 sec')
  })

  it('carry over to the next minute', () => {
    expect(formatDuration(117, 'es')).toBe('2 min')
  })
})
