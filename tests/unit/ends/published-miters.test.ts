import { describe, expect, it } from 'vitest'
import { planeNormal } from '#shared/ends/cut-plane'
import type { Corner, End, Side } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import { SQUARE_END } from '#shared/ends/strip-borders'
import { degrees, radians } from '#shared/geometry/vector'
import { cross3, dot3, unit3, vector3 } from '#shared/geometry/vector3'
import { profileOf, STEEL } from '../../support/arbitrary-profile'
import { expectPrinted, publishedRows } from '../../support/published-values'

const LEG = 4

const levelCorner = (sides: number): Corner => ({ slopeIn: 0, slopeOut: 0, plan: 360 / sides })

const miter = (corner: Corner, lay: number): End => ({
  kind: 'miter',
  plane: { corner },
  lay,
  legs: [],
  tabs: [],
})

/** Degrees from square at which a flat leg is cut, read off the marks of its strip. */
const cutAngle = (corner: Corner, lay: number, side: Side): number => {
  const end = miter(corner, lay)
  const ends =
    side === 'left'
      ? { left: end, right: SQUARE_END, lowEnd: null }
      : { left: SQUARE_END, right: end, lowEnd: null }
  const laid = layStrip({ profile: profileOf([LEG]), sheet: STEEL, pieceLength: 60, ends })
  if (!laid.ok) throw new Error('The piece cannot be laid out.')
  const [a, b] = laid.layout[side].marks
  if (!a || !b) throw new Error('A leg has two edges.')
  expect(b.at - a.at).toBeCloseTo(LEG, 12)
  return degrees(Math.atan(Math.abs(b.along - a.along) / LEG))
}

/**
 * Degrees between the corner's plane and the plane through the cut that stands square on the leg's
 * face: what a blade is tilted by.
 */
const bevel = (corner: Corner, lay: number, side: Side): number => {
  const normal = unit3(planeNormal({ corner }, side))
  const face = vector3(0, 0 - Math.sin(radians(lay)), Math.cos(radians(lay)))
  const cut = unit3(cross3(normal, face))
  const squareOnFace = cross3(face, cut)
  return degrees(Math.acos(Math.min(1, Math.abs(dot3(normal, squareOnFace)))))
}

const rows = publishedRows('compound-miter.csv').map((row) => ({
  sides: row.number('number_of_sides'),
  slope: row.number('side_pitch_from_flat_deg'),
  miter: row.number('miter_deg'),
  bevel: row.number('bevel_deg'),
}))

/** Printed 23.56; the chart's own rule, tan miter = cos S tan(180 / N), gives 23.58. */
const isMisprint = ({ sides, slope }: { sides: number; slope: number }): boolean =>
  sides === 7 && slope === 25

/*
 * Source: "Cutting compound miters" (table-saw manuals Craftsman 315.21212, Ryobi TSS121): miter
 * and bevel of the sides of a box of N sides pitched S degrees from flat. Ours are the cut of a leg
 * laid at S round a level corner of 360 / N degrees.
 */
describe('published chart of compound miters', () => {
  it('has its 82 pairs, one of them a misprint', () => {
    expect(rows).toHaveLength(82)
    expect(rows.filter(isMisprint)).toEqual([{ sides: 7, slope: 25, miter: 23.56, bevel: 10.57 }])
  })

  it.each(rows)('$sides sides at $slope degrees: $miter and $bevel', (row) => {
    const corner = levelCorner(row.sides)
    const printed = isMisprint(row) ? 23.58 : row.miter
    for (const side of ['left', 'right'] as const) {
      expect(Math.abs(cutAngle(corner, row.slope, side) - printed)).toBeLessThanOrEqual(0.01)
      expect(Math.abs(bevel(corner, row.slope, side) - row.bevel)).toBeLessThanOrEqual(0.01)
    }
  })
})

/*
 * Sources: a compound miter saw's manual, table A (Makita LS1017, p. 14): 31.6 and 33.9, 35.3 and
 * 30.0; a public table of crown angles: 31.6190 and 33.8629. The spring angle counts from the wall,
 * so that the face lies at 90 less it from flat.
 */
describe('published crown angles round a square corner', () => {
  it.each([
    ['52/38', 38, '31.6', '33.9'],
    ['52/38 with more places', 38, '31.6190', '33.8629'],
    ['45/45', 45, '35.3', '30.0'],
  ])('%s', (_, spring, miterPrinted, bevelPrinted) => {
    const corner = levelCorner(4)
    expectPrinted(cutAngle(corner, 90 - spring, 'right'), miterPrinted)
    expectPrinted(bevel(corner, 90 - spring, 'right'), bevelPrinted)
  })
})
