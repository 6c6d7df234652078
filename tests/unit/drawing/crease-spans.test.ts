import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { creaseSpans } from '#shared/drawing/crease-spans'
import type { StripPoint } from '#shared/ends/end-layout'
import { layStrip } from '#shared/ends/lay-strip'
import { flatStrip } from '#shared/strip/flat-strip'
import { dressedArbitrary } from '../../support/arbitrary-end'

/** [along, at] for each corner. */
const polygon = (...corners: [number, number][]) => corners.map(([along, at]) => ({ along, at }))

/** Inside where the border goes once round the point, by the sum of the angles it is seen under. */
const isInside = (outline: readonly StripPoint[], point: StripPoint): boolean => {
  const angles = outline.map(({ along, at }) => Math.atan2(at - point.at, along - point.along))
  const turned = angles.reduce((sum, angle, index) => {
    const turn = (angles[(index + 1) % angles.length] ?? 0) - angle
    return sum + turn - 2 * Math.PI * Math.round(turn / (2 * Math.PI))
  }, 0)
  return Math.abs(turned) > Math.PI
}

describe('what is left of a crease', () => {
  it('runs from cut to cut', () => {
    const trapeze = polygon([0, 0], [10, 0], [8, 4], [2, 4])
    expect(creaseSpans(trapeze, 2)).toEqual([{ from: 1, to: 9 }])
  })

  it('ends where the lip beside it is cut away, even though metal stands on its other side', () => {
    const relieved = polygon([4, 0], [10, 0], [10, 6], [0, 6], [0, 1], [4, 1])
    expect(creaseSpans(relieved, 1)).toEqual([{ from: 4, to: 10 }])
  })

  it('is in two where a notch lies between', () => {
    const notched = polygon([0, 0], [10, 0], [10, 3], [6, 3], [6, 1], [4, 1], [4, 3], [0, 3])
    expect(creaseSpans(notched, 2)).toEqual([
      { from: 0, to: 4 },
      { from: 6, to: 10 },
    ])
  })

  it('is nothing on the edge or off the strip', () => {
    const sheet = polygon([0, 0], [10, 0], [10, 3], [0, 3])
    for (const at of [-1, 0, 3, 4]) expect(creaseSpans(sheet, at)).toEqual([])
  })
})

it('has metal on both sides of it, and nowhere else, on any dressed strip', () => {
  let asked = 0
  fc.assert(
    fc.property(dressedArbitrary, fc.double({ min: 0, max: 1, noNaN: true }), (piece, part) => {
      const laid = layStrip(piece)
      if (!laid.ok) return
      const { outline, blankLength } = laid.layout
      const along = part * blankLength
      for (const { at } of flatStrip(piece.profile, piece.sheet).creases) {
        const spans = creaseSpans(outline, at)
        // A hair from the end of a stretch a slanting cut decides by less than the hair.
        if (
          spans.some(
            ({ from, to }) => Math.min(Math.abs(along - from), Math.abs(along - to)) < 1e-3,
          )
        )
          continue
        const isMetal = [-1e-6, 1e-6].every((aside) => isInside(outline, { along, at: at + aside }))
        expect(spans.some(({ from, to }) => from < along && along < to)).toBe(isMetal)
        asked += 1
      }
    }),
    { seed: 20_260_801, numRuns: 150 },
  )
  expect(asked).toBeGreaterThan(200)
})
