import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DisplayList, PathShape, TextShape } from '#shared/drawing/display-list'
import type { OutlineFigure } from '#shared/drawing/outline-figure'
import { outlineFigure } from '#shared/drawing/outline-figure'
import { spread } from '#shared/drawing/spread'
import { boxOfText } from '#shared/drawing/text-box'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import type { Bounds } from '#shared/geometry/bounds'
import { boundsOf, holds, overlap } from '#shared/geometry/bounds'
import { flatStrip } from '#shared/strip/flat-strip'
import { printRun, printSize } from '#shared/units/print-length'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { profileOf } from '../../support/arbitrary-profile'

const labels = {
  length: (inches: number) => printSize(inches, 'fraction').replace(/"$/, ''),
  run: (inches: number) => printRun(inches, 'fraction'),
  end: (side: 'left' | 'right') => (side === 'left' ? 'left end, low' : 'right end, high'),
}

interface Frame {
  readonly width: number
  readonly height: number
  readonly side?: 'left' | 'right'
}

const figureOf = (piece: PieceToLay, frame: Frame): OutlineFigure | undefined => {
  const laid = layStrip(piece)
  if (!laid.ok) return undefined
  return outlineFigure(laid.layout, flatStrip(piece.profile, piece.sheet), { ...frame, labels })
}

const texts = ({ items }: DisplayList): TextShape[] =>
  items.filter((item): item is TextShape => item.kind === 'text')

const paths = ({ items }: DisplayList, role: string): PathShape[] =>
  items.filter((item): item is PathShape => item.kind === 'path' && item.role === role)

/** The box of all metal that is shown. */
const metalBox = (display: DisplayList): Bounds =>
  boundsOf(paths(display, 'metal').flatMap(({ points }) => points))

const slack = (box: Bounds): Bounds => ({
  minX: box.minX + 0.01,
  maxX: box.maxX - 0.01,
  minY: box.minY + 0.01,
  maxY: box.maxY - 0.01,
})

/** Texts that meet each other, the metal or the frame's border. */
const faultsOf = ({ display }: OutlineFigure): string[] => {
  const boxes = texts(display).map((shape) => ({ text: shape.text, box: slack(boxOfText(shape)) }))
  const frame = { minX: 0, minY: 0, maxX: display.width, maxY: display.height }
  const metal = display.items.length === 0 ? undefined : metalBox(display)
  return boxes.flatMap(({ text, box }, index) => [
    ...(holds(frame, box) ? [] : [`${text} leaves the frame`]),
    ...(metal && overlap(metal, box) ? [`${text} lies on the metal`] : []),
    ...boxes
      .slice(index + 1)
      .flatMap((other) => (overlap(other.box, box) ? [`${text} meets ${other.text}`] : [])),
  ])
}

const gable: PieceToLay = {
  profile: {
    ...profileOf([5, 6, 0.75], [-90, 45]),
    hemB: { style: 'closed', length: 0.5, turn: -1 },
  },
  sheet: { thickness: 0.0276, insideRadius: 0.0394, kFactor: 0.408 },
  pieceLength: 126,
  ends: {
    left: { kind: 'lap', side: 'over', length: 4, tabs: [] },
    right: {
      kind: 'miter',
      plane: { corner: { slopeIn: 14, slopeOut: 0, plan: 90 } },
      lay: 0,
      legs: [],
      tabs: [{ leg: 2, length: 1 }],
    },
    lowEnd: 'left',
  },
}

const drawn = (frame: Frame): OutlineFigure => {
  const figure = figureOf(gable, frame)
  if (!figure) throw new Error('This piece can be laid out.')
  return figure
}

describe('the whole strip', () => {
  const { display } = drawn({ width: 560, height: 200 })

  it('carries its length, its width, its ends and its edges', () => {
    expect(texts(display).map(({ text }) => text)).toEqual([
      '12 3/16',
      `10' 6"`,
      'A',
      'B',
      'left end, low',
      'right end, high',
    ])
  })

  it('is broken where it is too long, at one scale', () => {
    const sheets = paths(display, 'strip')
    expect(sheets).toHaveLength(2)
    const [left, right] = sheets.map(({ points }) => boundsOf(points))
    expect((right?.minX ?? 0) - (left?.maxX ?? 0)).toBeCloseTo(26, 6)
    expect((left?.maxY ?? 0) - (left?.minY ?? 0)).toBeCloseTo(
      (right?.maxY ?? 0) - (right?.minY ?? 0),
    )
  })

  it('shows a short piece unbroken', () => {
    const short = figureOf({ ...gable, pieceLength: 30 }, { width: 560, height: 200 })
    expect(short && paths(short.display, 'strip')).toHaveLength(1)
  })
})

describe('one end', () => {
  it('has a figure for every mark, from edge A and from the end', () => {
    const { display, leftOut } = drawn({ width: 420, height: 300, side: 'right' })
    expect(leftOut).toEqual([])
    const figures = texts(display).map(({ text }) => text)
    // Mark by mark: 45 degrees in the roof's plane on leg 1, then the wrapped leg and the kick.
    for (const figure of ['5', '10 15/16', '11 11/16', '12 3/16']) expect(figures).toContain(figure)
    expect(figures.filter((text) => text === '0')).toHaveLength(2)
    expect(figures).toContain('right end, high')
  })

  it('names what it leaves out in a frame too small for figures', () => {
    const { leftOut } = drawn({ width: 90, height: 40, side: 'right' })
    expect(leftOut).toHaveLength(5)
  })
})

it('figures never meet each other, the metal or the frame, on any piece at any size', () => {
  let seen = 0
  fc.assert(
    fc.property(
      dressedArbitrary,
      fc.integer({ min: 60, max: 1100 }),
      fc.integer({ min: 40, max: 800 }),
      fc.constantFrom(undefined, 'left' as const, 'right' as const),
      (piece, width, height, side) => {
        const figure = figureOf(piece, { width, height, ...(side ? { side } : {}) })
        if (!figure) return
        seen += 1
        expect(faultsOf(figure)).toEqual([])
      },
    ),
    { numRuns: 400 },
  )
  expect(seen).toBeGreaterThan(150)
})

describe('labels in a column', () => {
  const steps = fc.array(fc.double({ min: -50, max: 250, noNaN: true }), { maxLength: 12 })

  it('stand apart, in order and within bounds, or not at all', () => {
    fc.assert(
      fc.property(steps, (given) => {
        const wanted = given.toSorted((a, b) => a - b)
        const found = spread(wanted, 10, 0, 100)
        if (wanted.length > 11) {
          expect(found).toBeUndefined()
          return
        }
        expect(found).toHaveLength(wanted.length)
        found?.forEach((at, index) => {
          expect(at).toBeGreaterThanOrEqual(-1e-6)
          expect(at).toBeLessThanOrEqual(100 + 1e-6)
          const before = found[index - 1]
          if (before !== undefined) expect(at - before).toBeGreaterThanOrEqual(10 - 1e-6)
        })
      }),
    )
  })

  it('stay where they are when nothing is in the way', () => {
    expect(spread([10, 40, 80], 10, 0, 100)).toEqual([10, 40, 80])
    expect(spread([], 10, 0, 100)).toEqual([])
  })
})
