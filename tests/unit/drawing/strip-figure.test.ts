import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DisplayList } from '#shared/drawing/display-list'
import { spreadAlong } from '#shared/drawing/strip-dimensions'
import { stripFigure } from '#shared/drawing/strip-figure'
import { boxOfText } from '#shared/drawing/text-box'
import { grow, holds, overlap } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import { meetsBox } from '#shared/geometry/segment'
import { flatStrip } from '#shared/strip/flat-strip'
import { printAngle } from '#shared/units/angle'
import { printSize } from '#shared/units/print-length'
import { STEEL } from '../../support/arbitrary-profile'
import { anyProfileArbitrary, frameArbitrary } from './arbitrary-frame'
import { extentOf } from './figure-faults'
import { NAMED_PROFILES } from './named-profiles'

const labels = {
  length: (inches: number) => printSize(inches, 'fraction'),
  angle: (turn: number) => printAngle(180 - Math.abs(turn)),
}

const textFaults = (display: DisplayList): string[] => {
  const frame = { minX: 0, minY: 0, maxX: display.width, maxY: display.height }
  const texts = display.items.flatMap((item) => (item.kind === 'text' ? [item] : []))
  const lines = display.items.flatMap((item) =>
    item.kind === 'path' && (item.role === 'dimension' || item.role === 'crease')
      ? segmentsOf(item.points, item.closed)
      : [],
  )
  const overlaps = texts.flatMap((a, index) =>
    texts
      .slice(index + 1)
      .filter((b) => overlap(boxOfText(a), boxOfText(b)))
      .map((b) => `${a.text} lies on ${b.text}`),
  )
  const crossed = texts
    .filter((item) => lines.some((line) => meetsBox(line, grow(boxOfText(item), -0.01))))
    .map((item) => `${item.text} lies on a line`)
  const outside = display.items
    .filter((item) => !holds(frame, extentOf(item)))
    .map((item) => `${item.role} ${item.kind} leaves the frame`)
  return [...overlaps, ...crossed, ...outside]
}

describe.each(Object.entries(NAMED_PROFILES))('%s', (_, profile) => {
  const strip = flatStrip(profile, STEEL)

  it.each([
    [200, 48],
    [390, 90],
    [900, 120],
  ])('keeps its numbers apart at %d x %d', (width, height) => {
    expect(textFaults(stripFigure(profile, strip, { width, height, labels }).display)).toEqual([])
  })

  it.each([
    [390, 140],
    [900, 200],
  ])('gives every crease its distance from edge A at %d x %d', (width, height) => {
    const { display } = stripFigure(profile, strip, { width, height, labels, mode: 'layout' })
    expect(textFaults(display)).toEqual([])
    const written = display.items.flatMap((item) =>
      item.kind === 'text' && (item.part?.kind === 'bend' || item.part?.kind === 'hem')
        ? [item.text]
        : [],
    )
    expect(written).toEqual(strip.creases.map((crease) => labels.length(crease.at)))
  })
})

describe('any strip at any size', () => {
  const mode = fc.constantFrom('plain' as const, 'layout' as const)

  it('keeps its numbers apart, off its lines and in the frame', () => {
    fc.assert(
      fc.property(anyProfileArbitrary, frameArbitrary, mode, (profile, frame, shown) => {
        const strip = flatStrip(profile, STEEL)
        const { display } = stripFigure(profile, strip, { ...frame, labels, mode: shown })
        expect(textFaults(display)).toEqual([])
      }),
      { seed: 20_260_801, numRuns: 300 },
    )
  })

  it('draws or lists the distance of every crease', () => {
    let listed = 0
    fc.assert(
      fc.property(anyProfileArbitrary, frameArbitrary, (profile, frame) => {
        const strip = flatStrip(profile, STEEL)
        const { display, unmarked } = stripFigure(profile, strip, {
          ...frame,
          labels,
          mode: 'layout',
        })
        const drawn = display.items.filter(
          (item) =>
            item.kind === 'text' && (item.part?.kind === 'bend' || item.part?.kind === 'hem'),
        )
        const missing = unmarked.filter(({ part }) => part.kind !== 'edge')
        expect(drawn.length + missing.length).toBe(strip.creases.length)
        listed += missing.length
      }),
      { seed: 20_260_801, numRuns: 200 },
    )
    expect(listed).toBeGreaterThan(0)
  })
})

describe('the strip of a gable', () => {
  const gable = NAMED_PROFILES.gable
  if (gable === undefined) throw new Error('The gable is missing.')
  const strip = flatStrip(gable, STEEL)
  const figure = stripFigure(gable, strip, { width: 390, height: 90, labels })

  it('is to scale from edge A at the left', () => {
    expect(figure.toX(0)).toBeCloseTo(figure.sheet.minX, 9)
    expect(figure.toX(strip.stripWidth)).toBeCloseTo(figure.sheet.maxX, 9)
    expect(figure.toAt(figure.toX(3.25))).toBeCloseTo(3.25, 9)
  })

  it('sets the triangle above a crease that folds up and below one that folds down', () => {
    const triangles = figure.display.items.flatMap((item) =>
      item.role === 'crease' && item.kind === 'path' && item.filled ? [item] : [],
    )
    const isAbove = triangles.map(({ points }) => points.every((p) => p.y < figure.sheet.minY))
    expect(isAbove).toEqual(strip.creases.map((crease) => crease.turn > 0))
  })

  it('finds creases and parts under a point', () => {
    const first = strip.creases[0]?.at ?? NaN
    expect(figure.findCrease({ x: figure.toX(first) + 3, y: 40 }, 8)).toEqual({
      kind: 'bend',
      bend: 1,
    })
    expect(figure.findCrease({ x: figure.toX(2), y: 40 }, 8)).toBeUndefined()
    expect(figure.findFlat({ x: figure.toX(2), y: 45 })).toEqual({ kind: 'leg', leg: 1 })
    expect(figure.findFlat({ x: figure.toX(strip.stripWidth - 0.1), y: 45 })).toEqual({
      kind: 'hem',
      edge: 'B',
    })
  })
})

describe('spreading marks along a row', () => {
  it('keeps order and widths and stays in the row', () => {
    const marks = fc.array(fc.tuple(fc.nat(300), fc.integer({ min: 4, max: 30 })), {
      minLength: 1,
      maxLength: 12,
    })
    fc.assert(
      fc.property(marks, (given) => {
        const wanted = given.map(([x]) => x).sort((a, b) => a - b)
        const widths = given.map(([, width]) => width)
        const placed = spreadAlong(wanted, widths, 0, 380)
        expect(placed).toHaveLength(given.length)
        placed?.forEach((x, index) => {
          const half = (widths[index] ?? 0) / 2
          expect(x - half).toBeGreaterThanOrEqual(-1e-9)
          expect(x + half).toBeLessThanOrEqual(380 + 1e-9)
          const next = placed[index + 1]
          if (next === undefined) return
          expect(next - x).toBeGreaterThanOrEqual(half + (widths[index + 1] ?? 0) / 2 - 1e-9)
        })
      }),
      { seed: 20_260_801 },
    )
  })

  it('leaves marks alone that have room, and says when the row is too short', () => {
    expect(spreadAlong([10, 50, 90], [10, 10, 10], 0, 100)).toEqual([10, 50, 90])
    expect(spreadAlong([50, 50], [20, 20], 0, 100)).toEqual([40, 60])
    expect(spreadAlong([10, 20], [60, 60], 0, 100)).toBeUndefined()
  })
})
