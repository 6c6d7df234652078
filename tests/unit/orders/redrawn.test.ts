import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readRedrawn, redrawnText } from '#shared/orders/redrawn'

const marksArbitrary = fc
  .array(fc.stringMatching(/^[A-Za-z0-9:/∡→ ]{1,8}$/).map((mark) => mark.trim() || 'A'))
  .map((marks) => marks.join(', '))

describe('What an order says when its drawings followed the roof', () => {
  it('names both pitches, the marks drawn anew and the mitered ones', () => {
    const all = { from: 6, to: 8, drawn: 'A, B', mitered: 'C' }
    expect(redrawnText(all)).toBe('6/12 → 8/12: A, B\n∡ 6/12: C')
    expect(redrawnText({ ...all, mitered: '' })).toBe('6/12 → 8/12: A, B')
    expect(redrawnText({ ...all, drawn: '', from: 4.5 })).toBe('4.5/12 → 8/12\n∡ 4.5/12: C')
  })

  it('is read back as it was written, whatever the marks', () => {
    const rise = fc.integer({ min: 0, max: 96 }).map((quarters) => quarters / 4)
    fc.assert(
      fc.property(rise, rise, marksArbitrary, marksArbitrary, (from, to, drawn, mitered) => {
        const redrawn = { from, to, drawn, mitered }
        expect(readRedrawn(redrawnText(redrawn))).toEqual(redrawn)
      }),
    )
  })

  it.each(['', 'Amended by phone.', '6/12', '∡ 6/12: C'])('is not found in “%s”', (text) => {
    expect(readRedrawn(text)).toBeNull()
  })
})
