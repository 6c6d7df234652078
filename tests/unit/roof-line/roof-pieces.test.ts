import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compare, isAtMost, isEqual, isLess } from '#shared/geometry/tolerance'
import type { RoofLineInput } from '#shared/roof-line/roof-line.schema'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import type { RoofLineProblem } from '#shared/roof-line/roof-line-problem'
import { longestPieceMovement } from '#shared/roof-line/roof-movement'
import { lineLength, roofPieces } from '#shared/roof-line/roof-pieces'
import { rakeLength } from '#shared/roof-line/roof-slopes'
import { pitchAngle } from '#shared/units/angle'

const TEN_FEET: RoofLineInput = { length: 240, pieceLength: 120, lap: 4, mode: 'full' }

const ask = (given: Partial<RoofLineInput>) =>
  roofPieces(roofLineSchema.parse({ ...TEN_FEET, ...given }))

const answered = (given: Partial<RoofLineInput>) => {
  const found = ask(given)
  if (!found.ok) throw new Error(JSON.stringify(found.problems))
  return found.answer
}

const refused = (given: Partial<RoofLineInput>): readonly RoofLineProblem[] => {
  const found = ask(given)
  return found.ok ? [] : found.problems
}

describe('what a roof line asks for', () => {
  it.each<[string, object]>([
    ['neither length nor rake', { length: undefined }],
    ['both', { planRun: 100, rise: 6 }],
    ['a rake without its rise', { length: undefined, planRun: 100 }],
    ['a length of nothing', { length: 0 }],
    ['NaN', { length: NaN }],
    ['a lap under nothing', { lap: -1 }],
    ['another way to split', { mode: 'best' }],
    ['a misspelt key', { minimun: 30 }],
  ])('is not %s', (_, given) => {
    expect(roofLineSchema.safeParse({ ...TEN_FEET, ...given }).success).toBe(false)
  })
})

describe('a rake', () => {
  const rows = readFileSync(new URL('../../cases/published/rafters.csv', import.meta.url), 'utf8')
    .trim()
    .split('\n')
    .map((row) => row.split(',').map(Number))
    .slice(1)

  it('is as long as the framing square says, for each foot of run', () => {
    expect(rows.length).toBeGreaterThanOrEqual(10)
    for (const [rise, , inchesPerFoot] of rows) {
      const line = roofLineSchema.parse({ ...TEN_FEET, length: undefined, planRun: 12, rise })
      expect(lineLength(line)).toBeCloseTo(inchesPerFoot ?? NaN, 2)
    }
  })

  it('is what its slope in degrees gives', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 1000, noNaN: true }),
        fc.double({ min: 0, max: 36, noNaN: true }),
        (planRun, rise) => {
          const line = roofLineSchema.parse({ ...TEN_FEET, length: undefined, planRun, rise })
          expect(lineLength(line)).toBeCloseTo(rakeLength(planRun, pitchAngle(rise)), 8)
        },
      ),
    )
  })
})

describe('each piece', () => {
  it('is told where it lies, from the low or left end', () => {
    expect(answered({ length: 250, pieceLength: 126 }).order).toEqual([
      { kind: 'full', length: 126, from: 0, to: 126 },
      { kind: 'shared', length: 66, from: 122, to: 188 },
      { kind: 'shared', length: 66, from: 184, to: 250 },
    ])
  })

  it('carries the tab or miter point of its end, which lies beyond the line', () => {
    const { order, length, extras, covered } = answered({ leftExtra: 1, rightExtra: 2.5 })
    expect({ length, extras, covered }).toEqual({
      length: 240,
      extras: { left: 1, right: 2.5 },
      covered: 243.5,
    })
    expect(order[0]).toMatchObject({ from: -1, to: 119 })
    expect(order.at(-1)).toMatchObject({ to: 242.5 })
  })

  it('may need one more for them', () => {
    expect(answered({ length: 236 }).order).toHaveLength(2)
    expect(answered({ length: 236, leftExtra: 1 }).order).toHaveLength(3)
  })
})

describe('what has no answer is refused with a cure', () => {
  it.each<[string, Partial<RoofLineInput>, Partial<RoofLineProblem>]>([
    [
      'a lap as long as the piece',
      { pieceLength: 24, lap: 24 },
      { code: 'lapOverPiece', field: 'lap', found: 24, limit: 24, cure: 'shortenLap' },
    ],
    [
      'a least length over the piece',
      { minimum: 121 },
      { code: 'minimumOverPiece', found: 121, limit: 120, cure: 'lowerMinimum' },
    ],
    [
      'no two pieces of 110 in 130',
      { length: 130, minimum: 110 },
      { code: 'pieceUnderMinimum', found: 67, limit: 110, cure: 'lowerMinimum' },
    ],
    [
      'nor equal ones',
      { length: 130, minimum: 110, mode: 'equal' },
      { code: 'pieceUnderMinimum', found: 67, limit: 110, cure: 'lowerMinimum' },
    ],
    [
      'a miter point so long that its lap would lie on it',
      { pieceLength: 40, length: 100, leftExtra: 37 },
      { code: 'lapInExtra', field: 'leftExtra', found: 37, limit: 36, cure: 'shortenExtra' },
    ],
    [
      'more pieces than an order line takes',
      { pieceLength: 4.5, length: 12_000, minimum: 0 },
      { code: 'tooManyPieces', found: 23_992, limit: 500, cure: 'lengthenPieces' },
    ],
    [
      'more than can be counted',
      { pieceLength: 24.00001, length: 12_000, lap: 24, minimum: 0 },
      { code: 'tooManyPieces', limit: 500 },
    ],
  ])('%s', (_, given, problem) => {
    expect(refused(given)).toMatchObject([problem])
  })

  it('and following the cure gives one', () => {
    const [problem] = refused({ length: 130, minimum: 110 })
    expect(answered({ length: 130, minimum: problem?.found ?? NaN }).pieces).toEqual([
      { length: 67, count: 2 },
    ])
  })
})

describe('notes', () => {
  it('say that a lone piece is under the least length because the line is', () => {
    expect(answered({ length: 20 }).notes).toEqual(['lineUnderMinimum'])
    expect(answered({ length: 24 }).notes).toEqual([])
  })

  it('say where three sheets lie on one another', () => {
    const short = { length: 60, pieceLength: 24, minimum: 0 }
    expect(answered({ ...short, lap: 12 }).notes).toEqual([])
    expect(answered({ ...short, lap: 13 }).notes).toEqual(['lapsMeet'])
  })
})

describe('the longest piece', () => {
  it('moves with the heat: 10 ft of zinc over 170 F', () => {
    // A roofing zinc's technical data: 0.022 mm per m and degree C.
    const { pieces } = answered({ length: 300 })
    expect(longestPieceMovement({ pieces }, 'zinc')).toBeCloseTo((120 * 22e-6 * 170) / 1.8, 12)
    expect(longestPieceMovement({ pieces }, 'zinc', 100)).toBeCloseTo(0.147, 3)
  })
})

describe('every answer', () => {
  const tenths = (least: number, most: number) =>
    fc.integer({ min: least * 10, max: most * 10 }).map((count) => count / 10)
  const lines = fc
    .record({
      length: fc.oneof(tenths(1, 900), fc.double({ min: 0.01, max: 900, noNaN: true })),
      pieceLength: fc.oneof(tenths(12, 252), fc.double({ min: 12, max: 252, noNaN: true })),
      lap: tenths(0, 8),
      minimum: tenths(0, 60),
      mode: fc.constantFrom('full' as const, 'equal' as const),
      leftExtra: tenths(0, 4),
      rightExtra: tenths(0, 4),
    })
    .map((line) => roofLineSchema.parse(line))
  /** Lines that full pieces fit exactly, as far as tenths can be told in binary. */
  const exactFits = fc
    .tuple(lines, fc.integer({ min: 1, max: 12 }))
    .map(([line, count]) => {
      const { pieceLength, lap, leftExtra, rightExtra } = line
      const length = count * (pieceLength - lap) + lap - leftExtra - rightExtra
      return { line: { ...line, length }, count }
    })
    .filter(({ line }) => line.length > 0)

  it('covers the line exactly, in order, with pieces within bounds', () => {
    fc.assert(
      fc.property(lines, (line) => {
        const found = roofPieces(line)
        fc.pre(found.ok)
        if (!found.ok) return
        const { pieces, laps, covered, order } = found.answer
        const { lap, pieceLength, minimum, leftExtra, rightExtra } = line
        const total = lineLength(line) + leftExtra + rightExtra
        const sum = pieces.reduce((all, { length, count }) => all + length * count, 0)

        expect(isEqual(sum - laps.length * lap, total)).toBe(true)
        expect(isEqual(covered, total)).toBe(true)
        expect(laps).toHaveLength(order.length - 1)
        for (const { length } of order) {
          expect(length).toBeLessThanOrEqual(pieceLength)
          if (order.length > 1) expect(isLess(length, minimum)).toBe(false)
        }
        // Each lap lies between the two pieces it joins, and the next one further up.
        laps.forEach((at, index) => {
          expect(at).toBe(order[index + 1]?.from)
          expect(isEqual(at + lap, order[index]?.to ?? NaN)).toBe(true)
          if (index > 0) expect(at).toBeGreaterThan(laps[index - 1] ?? NaN)
          expect(isAtMost(0, at) && isAtMost(at + lap, lineLength(line))).toBe(true)
        })
        expect(isEqual(order[0]?.from ?? NaN, -leftExtra)).toBe(true)
        expect(isEqual(order.at(-1)?.to ?? NaN, lineLength(line) + rightExtra)).toBe(true)
        if (line.mode === 'equal') expect(pieces).toHaveLength(1)
      }),
      { numRuns: 2000 },
    )
  })

  it('takes the fewest pieces: one fewer would not reach', () => {
    fc.assert(
      fc.property(lines, (line) => {
        const found = roofPieces(line)
        fc.pre(found.ok)
        if (!found.ok) return
        const fewer = found.answer.order.length - 1
        const reach = fewer * line.pieceLength - (fewer - 1) * line.lap
        const total = lineLength(line) + line.leftExtra + line.rightExtra
        if (fewer > 0) expect(isLess(reach, total)).toBe(true)
      }),
      { numRuns: 2000 },
    )
  })

  it('is full pieces alone where they fit exactly, whatever binary makes of tenths', () => {
    fc.assert(
      fc.property(exactFits, ({ line, count }) => {
        const found = roofPieces(line)
        fc.pre(found.ok)
        if (!found.ok) return
        expect(found.answer.order).toHaveLength(count)
        for (const { length } of found.answer.order) {
          expect(compare(length, line.pieceLength)).toBe(0)
        }
      }),
      { numRuns: 1000 },
    )
  })

  it('is refused only where as many equal pieces would be too short, or a lap meet an end', () => {
    fc.assert(
      fc.property(lines, (line) => {
        const found = roofPieces(line)
        if (found.ok) return
        const { lap, pieceLength, minimum } = line
        for (const { code, found: value } of found.problems) {
          if (code === 'lapOverPiece') expect(isAtMost(pieceLength, lap)).toBe(true)
          if (code === 'minimumOverPiece') expect(isLess(pieceLength, minimum)).toBe(true)
          if (code === 'pieceUnderMinimum') {
            const total = lineLength(line) + line.leftExtra + line.rightExtra
            const count = Math.round((total - lap) / (value - lap))
            expect(isEqual((total + (count - 1) * lap) / count, value)).toBe(true)
            expect(isLess(value, minimum)).toBe(true)
          }
        }
      }),
      { numRuns: 2000 },
    )
  })
})
