// @vitest-environment jsdom
import { describe, expect, it } from 'vitest'
import { composeDisplays } from '#shared/drawing/compose'
import type { DisplayList } from '#shared/drawing/display-list'
import { figureColors } from '#shared/drawing/figure-colors'
import { sectionFigure } from '#shared/drawing/section-figure'
import { drawingBoxes, stripDrawing } from '#shared/drawing/strip-drawing'
import { toSvg } from '#shared/drawing/svg'
import type { PieceEnds } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import { holds, overlap } from '#shared/geometry/bounds'
import { flatStrip } from '#shared/strip/flat-strip'
import { printAngle } from '#shared/units/angle'
import { printRun, printSize } from '#shared/units/print-length'
import { STEEL } from '../../support/arbitrary-profile'
import { gableEnds } from '../../support/end-factories'
import { extentOf } from './figure-faults'
import { NAMED_PROFILES } from './named-profiles'

const labels = {
  length: (inches: number) => printSize(inches, 'fraction'),
  run: (inches: number) => printRun(inches, 'fraction'),
  angle: (turn: number) => printAngle(180 - Math.abs(turn)),
  end: (side: 'left' | 'right') => `${side} end`,
}

const SHEET = { width: 720, height: 960 }

const drawnPiece = (ends: PieceEnds | null) => {
  const profile = NAMED_PROFILES.gable
  if (profile === undefined) throw new Error('The gable is missing.')
  const laid = layStrip({ profile, sheet: STEEL, pieceLength: 126, ends })
  if (!laid.ok) throw new Error(`The strip was refused: ${laid.problems[0]?.code}.`)
  return { profile, sheet: STEEL, strip: flatStrip(profile, STEEL), layout: laid.layout }
}

const drawingOf = (ends: PieceEnds | null): DisplayList => {
  const piece = drawnPiece(ends)
  return stripDrawing(piece, { ...SHEET, labels, boxes: drawingBoxes(piece.layout, SHEET) })
}

const boxOf = ({
  x,
  y,
  width,
  height,
}: {
  x: number
  y: number
  width: number
  height: number
}) => ({
  minX: x,
  minY: y,
  maxX: x + width,
  maxY: y + height,
})

describe('a strip drawing', () => {
  it('puts each part into the box it is given, unscaled', () => {
    const piece = drawnPiece(null)
    const section = { x: 40, y: 30, width: 400, height: 300 }
    const { items } = stripDrawing(piece, { ...SHEET, labels, boxes: { section } })
    const alone = sectionFigure(piece.profile, STEEL, { width: 400, height: 300, labels }).display
    expect(items).toHaveLength(alone.items.length)
    items.forEach((item, index) => {
      const before = alone.items[index]
      if (before === undefined) throw new Error('An item too many.')
      const { minX, minY, maxX, maxY } = extentOf(before)
      const moved = { minX: minX + 40, minY: minY + 30, maxX: maxX + 40, maxY: maxY + 30 }
      for (const [side, value] of Object.entries(extentOf(item))) {
        expect(value).toBeCloseTo(moved[side as keyof typeof moved], 9)
      }
    })
  })

  it('has boxes of its own that lie side by side on the sheet', () => {
    const sheet = { minX: 0, minY: 0, maxX: SHEET.width, maxY: SHEET.height }
    const boxes = Object.values(drawingBoxes(drawnPiece(gableEnds()).layout, SHEET)).map(boxOf)
    expect(boxes).toHaveLength(5)
    for (const [index, box] of boxes.entries()) {
      expect(holds(sheet, box)).toBe(true)
      for (const other of boxes.slice(index + 1)) expect(overlap(box, other)).toBe(false)
    }
  })

  it('shows an outline only where an end is dressed, and of a dressed end alone', () => {
    expect(Object.keys(drawingBoxes(drawnPiece(null).layout, SHEET))).toEqual(['section', 'strip'])
    const oneEnd = { ...gableEnds(26.565, []), left: gableEnds(26.565, []).left }
    expect(Object.keys(drawingBoxes(drawnPiece(oneEnd).layout, SHEET))).toEqual([
      'section',
      'strip',
      'whole',
      'right',
    ])
  })

  it('stays on its sheet and comes out the same twice', () => {
    const display = drawingOf(gableEnds())
    const sheet = { minX: 0, minY: 0, maxX: SHEET.width, maxY: SHEET.height }
    expect(display.items.every((item) => holds(sheet, extentOf(item)))).toBe(true)
    expect(drawingOf(gableEnds())).toEqual(display)
  })
})

describe('the SVG of a strip drawing', () => {
  const parse = (svg: string) => new DOMParser().parseFromString(svg, 'image/svg+xml')

  it('is a document of its own: named, sized on paper, on its ground', () => {
    const colors = figureColors('light', '#8f2f2a')
    const file = { inchesPerUnit: 1 / 72, ground: true }
    const svg = parse(toSvg(drawingOf(gableEnds()), colors, 'North rake', file)).documentElement
    expect(svg.namespaceURI).toBe('http://www.w3.org/2000/svg')
    expect(svg.querySelector('title')?.textContent).toBe('North rake')
    expect(svg.getAttribute('width')).toBe('10in')
    expect(svg.getAttribute('height')).toBe('13.33333in')
    expect(svg.getAttribute('viewBox')).toBe('0 0 720 960')
    expect(svg.querySelector('rect')?.getAttribute('fill')).toBe(colors.ground)
    expect(svg.querySelectorAll('text').length).toBeGreaterThan(20)
  })

  it('can carry any title, even one that XML has no place for', () => {
    const name = 'A <b> & "c" \u0000\u0007\ud800\uffff d'
    const document = parse(toSvg(composeDisplays(SHEET, []), figureColors('dark', null), name))
    expect(document.querySelector('title')?.textContent).toBe('A <b> & "c"  d')
  })
})
