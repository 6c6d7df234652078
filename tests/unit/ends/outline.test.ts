import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { StripLayout } from '#shared/ends/end-layout'
import { mirrorEnds } from '#shared/ends/hands'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import { flatStrip } from '#shared/strip/flat-strip'
import { dressedArbitrary, foldableArbitrary } from '../../support/arbitrary-end'
import { isSimple, naiveArea, offBorder } from '../../support/naive-polygon'

/** Sound ends fail for one reason only: the piece is too short for them. */
const TOO_SHORT = ['endsMeet', 'lapLongerThanPiece', 'tabLongerThanPiece']

/** Whatever can be laid out, laid out. */
const everyLayout = (check: (layout: StripLayout, piece: PieceToLay) => void): void => {
  fc.assert(
    fc.property(dressedArbitrary, (piece) => {
      const laid = layStrip(piece)
      if (laid.ok) check(laid.layout, piece)
      else expect(TOO_SHORT).toEqual(expect.arrayContaining(laid.problems.map(({ code }) => code)))
    }),
    { numRuns: 250 },
  )
}

describe('the outline of any strip with any two ends', () => {
  it('is a simple polygon within the blank', () => {
    everyLayout(({ outline, blankLength, stripWidth }) => {
      expect(isSimple(outline)).toBe(true)
      for (const { along, at } of outline) {
        expect(along).toBeGreaterThanOrEqual(0)
        expect(along).toBeLessThanOrEqual(blankLength)
        expect(at).toBeGreaterThanOrEqual(0)
        expect(at).toBeLessThanOrEqual(stripWidth)
      }
    })
  })

  it('has the area of the blank less the cut-aways, which are simple too', () => {
    everyLayout(({ outline, blankLength, stripWidth, left, right }) => {
      const cutAways = [...left.cutAways, ...right.cutAways]
      expect(cutAways.every(isSimple)).toBe(true)
      const cut = cutAways.reduce((sum, polygon) => sum + naiveArea(polygon), 0)
      expect(naiveArea(outline)).toBeCloseTo(blankLength * stripWidth - cut, 5)
    })
  })

  it('reaches both square ends of the blank, marked from 0', () => {
    everyLayout(({ outline, blankLength, left, right }) => {
      const along = outline.map((point) => point.along)
      expect(Math.min(...along)).toBe(0)
      expect(Math.max(...along)).toBe(blankLength)
      for (const { marks, tabs } of [left, right]) {
        const least = Math.min(...marks.map((mark) => mark.along))
        expect(least).toBeGreaterThanOrEqual(0)
        if (tabs.length === 0) expect(least).toBe(0)
      }
    })
  })

  it('has a mark for each edge and crease of the strip, in their order', () => {
    everyLayout(({ left, right, stripWidth }, { profile, sheet }) => {
      const { creases } = flatStrip(profile, sheet)
      for (const { marks } of [left, right]) {
        expect(marks.map(({ of, crease, at }) => ({ of, crease, at }))).toEqual([
          { of: 'edgeA', crease: null, at: 0 },
          ...creases.map(({ at }, crease) => ({ of: 'crease', crease, at })),
          { of: 'edgeB', crease: null, at: stripWidth },
        ])
      }
    })
  })

  it('is longer than the piece only by what its tabs stand out', () => {
    everyLayout(({ blankLength, left, right }, { pieceLength }) => {
      const standsOut = [left, right].reduce(
        (sum, { marks }) => sum + Math.min(...marks.map(({ along }) => along)),
        0,
      )
      expect(blankLength).toBeCloseTo(pieceLength + standsOut, 9)
    })
  })

  it('holds every tab, whose fold line lies on the cut of its leg', () => {
    everyLayout(({ left, right, outline, blankLength }) => {
      for (const { side, marks, tabs } of [left, right]) {
        for (const { polygon, fold } of tabs) {
          expect(isSimple(polygon)).toBe(true)
          for (const corner of polygon.slice(1, -1)) {
            expect(offBorder(outline, corner)).toBeLessThan(1e-6)
          }
          for (const { along, at } of fold) {
            const after = marks.findIndex((mark) => mark.at >= at)
            const [near, far] = [marks[Math.max(0, after - 1)], marks[after]]
            if (!near || !far) throw new Error('A fold line beyond the strip.')
            const wide = far.at - near.at || 1
            const cut = near.along + ((far.along - near.along) * (at - near.at)) / wide
            expect(side === 'left' ? along : blankLength - along).toBeCloseTo(cut, 6)
          }
        }
      }
    })
  })

  it('is the same turned end for end in the other hand, the marks with it', () => {
    everyLayout(({ outline, blankLength, left, right }, piece) => {
      const ends = piece.ends && mirrorEnds(piece.ends)
      const mirrored = layStrip({ ...piece, ends })
      if (!mirrored.ok) throw new Error('The mirrored piece cannot be laid out.')
      const { layout } = mirrored
      expect(layout.blankLength).toBeCloseTo(blankLength, 9)
      const turned = outline.map(({ along, at }) => ({ at, along: blankLength - along }))
      const off = [
        ...turned.map((point) => offBorder(layout.outline, point)),
        ...layout.outline.map((point) => offBorder(turned, point)),
      ]
      expect(Math.max(...off)).toBeLessThan(1e-6)
      expect(naiveArea(layout.outline)).toBeCloseTo(naiveArea(outline), 5)
      for (const [drawn, other] of [
        [left, layout.right],
        [right, layout.left],
      ] as const) {
        expect(other.openings).toEqual(drawn.openings)
        drawn.marks.forEach((mark, index) => {
          expect(other.marks[index]?.at).toBe(mark.at)
          expect(other.marks[index]?.along).toBeCloseTo(mark.along, 9)
        })
      }
    })
  })
})

describe('a piece without ends', () => {
  it('is its blank: all marks are 0 and nothing is cut away', () => {
    fc.assert(
      fc.property(foldableArbitrary, ({ profile, sheet }) => {
        const laid = layStrip({ profile, sheet, pieceLength: 120, ends: null })
        if (!laid.ok) throw new Error('A piece without ends cannot be laid out.')
        const { outline, left, right, stripWidth, blankLength } = laid.layout
        expect(blankLength).toBe(120)
        expect(outline).toEqual([
          { at: 0, along: 0 },
          { at: stripWidth, along: 0 },
          { at: stripWidth, along: 120 },
          { at: 0, along: 120 },
        ])
        for (const { marks, tabs, cutAways, slits, openings } of [left, right]) {
          expect(marks.every(({ along }) => along === 0)).toBe(true)
          expect([tabs, cutAways, slits, openings]).toEqual([[], [], [], []])
        }
      }),
    )
  })
})
