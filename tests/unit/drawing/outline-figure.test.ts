import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DisplayList, PathShape, Role, TextShape } from '#shared/drawing/display-list'
import type { OutlineFigure, OutlineOptions } from '#shared/drawing/outline-figure'
import { outlineFigure } from '#shared/drawing/outline-figure'
import type { PieceEnds } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import { boundsOf } from '#shared/geometry/bounds'
import { flatStrip } from '#shared/strip/flat-strip'
import { printAngle } from '#shared/units/angle'
import { printRun, printSize } from '#shared/units/print-length'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { closedHem, profileOf } from '../../support/arbitrary-profile'
import { lapEnd, squareEnd } from '../../support/end-factories'
import { outlineFaults } from './outline-faults'

const labels = {
  length: (inches: number) => printSize(inches, 'fraction').replace(/"$/, ''),
  run: (inches: number) => printRun(inches, 'fraction'),
  end: (side: 'left' | 'right') => (side === 'left' ? 'left end, low' : 'right end, high'),
  angle: (turn: number) => printAngle(180 - Math.abs(turn)),
  tab: (inches: number) => `tab ${printSize(inches, 'fraction')}`,
  opening: (inches: number) => `open ${printSize(inches, 'fraction')}`,
}

type Frame = Omit<OutlineOptions, 'labels'>

const figureOf = (piece: PieceToLay, frame: Frame): OutlineFigure | undefined => {
  const laid = layStrip(piece)
  if (!laid.ok) return undefined
  return outlineFigure(laid.layout, flatStrip(piece.profile, piece.sheet), { ...frame, labels })
}

const textsOf = ({ items }: DisplayList): string[] =>
  items.flatMap((item) => (item.kind === 'text' ? [item.text] : []))

const paths = ({ items }: DisplayList, role: Role): PathShape[] =>
  items.filter((item): item is PathShape => item.kind === 'path' && item.role === role)

const gable: PieceToLay = {
  profile: profileOf([5, 6, 0.75], [-90, 45], { hemB: closedHem(0.5, -1) }),
  sheet: { thickness: 0.0276, insideRadius: 0.0394, kFactor: 0.408 },
  pieceLength: 126,
  ends: {
    left: lapEnd(4, 'over'),
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

const drawn = (frame: Frame, piece: PieceToLay = gable): OutlineFigure => {
  const figure = figureOf(piece, frame)
  if (!figure) throw new Error('This piece can be laid out.')
  return figure
}

describe('the whole strip', () => {
  const { display, leftOut } = drawn({ width: 720, height: 260, hand: 'L' })

  it('carries length and width, ends, edges, the hand, turns, tabs and opened hems', () => {
    expect(leftOut).toEqual([])
    expect(textsOf(display).toSorted()).toEqual(
      [
        '12 3/16',
        `10' 6"`,
        'A',
        'B',
        'L',
        'left end, low',
        'right end, high',
        '90°',
        '135°',
        'tab 1"',
        'open 4"',
      ].toSorted(),
    )
  })

  it('is broken where it is too long, at one scale', () => {
    const sheets = paths(display, 'strip')
    expect(sheets).toHaveLength(2)
    const [left, right] = sheets.map(({ points }) => boundsOf(points))
    if (!left || !right) throw new Error('Two parts of a sheet.')
    expect(right.minX).toBeGreaterThan(left.maxX + 10)
    expect(left.maxY - left.minY).toBeCloseTo(right.maxY - right.minY, 6)
    expect(paths(display, 'ghost')).toHaveLength(2)
  })

  it('shows a short piece unbroken', () => {
    const short = drawn({ width: 560, height: 200 }, { ...gable, pieceLength: 20 })
    expect(paths(short.display, 'strip')).toHaveLength(1)
    expect(paths(short.display, 'ghost')).toEqual([])
  })

  it('dots the border that is cut away, marks the opened hem and folds the tab on its line', () => {
    expect(paths(display, 'cutAway').length).toBeGreaterThan(0)
    const [opening] = paths(display, 'opening')
    expect(opening?.part).toEqual({ kind: 'hem', edge: 'B' })
    expect(paths(display, 'tabFold')).toHaveLength(1)
    expect(paths(display, 'tabHatch').length).toBeGreaterThan(2)
  })

  it('tells creases that fold up from those that fold down by their dashes', () => {
    const dashes = (bend: number) =>
      paths(display, 'crease').find(
        ({ part, dash }) => part?.kind === 'bend' && part.bend === bend && dash,
      )?.dash
    expect(dashes(1)).not.toEqual(dashes(2))
  })
})

describe('slits', () => {
  it('are strong short lines between the tabs', () => {
    const ends: PieceEnds = {
      left: squareEnd([
        { leg: 1, length: 1 },
        { leg: 2, length: 1 },
      ]),
      right: squareEnd(),
      lowEnd: null,
    }
    const { display } = drawn({ width: 420, height: 300, side: 'left' }, { ...gable, ends })
    const [slit] = paths(display, 'slit')
    const [outline] = paths(display, 'outline')
    expect(slit?.width ?? 0).toBeGreaterThan(outline?.width ?? Infinity)
  })
})

describe('one end', () => {
  const { display, leftOut, scale } = drawn({ width: 460, height: 320, side: 'right' })

  it('has for every mark its distance from edge A and from the end', () => {
    expect(leftOut).toEqual([])
    const texts = textsOf(display)
    for (const figure of ['5', '10 15/16', '11 11/16', '12 3/16']) expect(texts).toContain(figure)
    expect(texts.filter((text) => text === '0')).toHaveLength(2)
    expect(texts).toContain('right end, high')
  })

  it('pricks each mark to scale both ways', () => {
    const dots = display.items.flatMap((item) => (item.role === 'mark' ? [extent(item)] : []))
    const laid = layStrip(gable)
    if (!laid.ok) throw new Error('This piece can be laid out.')
    const marks = laid.layout.right.marks
    expect(dots).toHaveLength(marks.length)
    marks.forEach((mark, index) => {
      const [dot, first] = [dots[index], dots[0]]
      if (!dot || !first) throw new Error('A dot a mark.')
      // The right end lies at the right: what lies further in lies further left.
      expect(first.x - dot.x).toBeCloseTo((mark.along - (marks[0]?.along ?? 0)) * scale, 6)
      expect(first.y - dot.y).toBeCloseTo(mark.at * scale, 6)
    })
  })

  it('lights the crease that is chosen, with its figures', () => {
    const chosen = drawn({
      width: 460,
      height: 320,
      side: 'right',
      selected: { kind: 'bend', bend: 1 },
    })
    const lit = chosen.display.items.filter(({ role }) => role === 'selected')
    expect(lit.some((item): item is TextShape => item.kind === 'text' && item.text === '5')).toBe(
      true,
    )
    expect(lit.every(({ part }) => part?.kind === 'bend' && part.bend === 1)).toBe(true)
  })

  it('lists what finds no room in a frame too small for figures, and still draws the end', () => {
    const small = drawn({ width: 60, height: 36, side: 'right' })
    expect(small.leftOut.filter(({ of }) => of === 'at')).toHaveLength(5)
    expect(small.leftOut.filter(({ of }) => of === 'along').map(({ text }) => text)).toContain(
      '5 1/8',
    )
    expect(paths(small.display, 'outline').length).toBeGreaterThan(0)
  })
})

const extent = (item: DisplayList['items'][number]) =>
  item.kind === 'circle' ? item.center : { x: NaN, y: NaN }

/** From a thumbnail to a page, in either direction. */
const frameArbitrary = fc.record({
  width: fc.oneof(fc.integer({ min: 20, max: 200 }), fc.integer({ min: 200, max: 1400 })),
  height: fc.oneof(fc.integer({ min: 16, max: 150 }), fc.integer({ min: 150, max: 1000 })),
})

const sideArbitrary = fc.constantFrom(undefined, 'left' as const, 'right' as const)

it('sets no figure on another, on the strip, on a dimension line or beyond the frame, at any size', () => {
  let seen = 0
  fc.assert(
    fc.property(dressedArbitrary, frameArbitrary, sideArbitrary, (piece, frame, side) => {
      const figure = figureOf(piece, { ...frame, hand: 'R', ...(side ? { side } : {}) })
      if (!figure) return
      seen += 1
      expect(outlineFaults(figure.display)).toEqual([])
    }),
    { seed: 20_260_801, numRuns: 250 },
  )
  expect(seen).toBeGreaterThan(150)
})

it('draws or lists every mark of an end, on a phone and on a page', () => {
  fc.assert(
    fc.property(
      dressedArbitrary,
      fc.constantFrom([320, 240], [390, 300], [540, 700]),
      fc.constantFrom('left' as const, 'right' as const),
      (piece, [width = 0, height = 0], side) => {
        const laid = layStrip(piece)
        if (!laid.ok) return
        const { display, leftOut } = drawn({ width, height, side }, piece)
        const texts = textsOf(display)
        const count = (text: string, of: readonly string[]) =>
          of.filter((one) => one === text).length
        for (const key of ['at', 'along'] as const) {
          const wanted = laid.layout[side].marks.map((mark) => labels.length(mark[key]))
          const missing = leftOut.filter(({ of }) => of === key).map(({ text }) => text)
          for (const text of new Set(wanted)) {
            expect(count(text, texts) + count(text, missing)).toBeGreaterThanOrEqual(
              count(text, wanted),
            )
          }
        }
        // Eleven legs and their edges find room on a phone.
        expect(leftOut.filter(({ of }) => of === 'at' || of === 'along')).toEqual([])
      },
    ),
    { seed: 20_260_801, numRuns: 120 },
  )
})

it('comes out the same twice', () => {
  const frame = { width: 390, height: 300, side: 'left' } as const
  expect(drawn(frame)).toEqual(drawn(frame))
})
