import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DisplayList, PathShape, Role } from '#shared/drawing/display-list'
import type { EndTemplate } from '#shared/drawing/end-template'
import { endTemplate } from '#shared/drawing/end-template'
import { TILE_OVERLAP, tilesOf } from '#shared/drawing/template-tiles'
import type { StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Side } from '#shared/ends/end.schema'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import { contains, holds } from '#shared/geometry/bounds'
import { distanceToPath } from '#shared/geometry/polyline'
import { flatStrip } from '#shared/strip/flat-strip'
import { printAngle } from '#shared/units/angle'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { profileOf, STEEL } from '../../support/arbitrary-profile'
import { plumbEnd, squareEnd } from '../../support/end-factories'
import { extentOf } from './figure-faults'
import { outlineFaults } from './outline-faults'

const words = {
  mark: 'F-2047 north rake L',
  angle: (turn: number) => printAngle(180 - Math.abs(turn)),
  check: (length: string) => `Measure this line: it must be ${length} long.`,
}

/** What a letter page leaves free for it, in points. */
const TILE = { width: 540, height: 640 }

const layoutOf = (piece: PieceToLay): StripLayout | undefined => {
  const laid = layStrip(piece)
  return laid.ok ? laid.layout : undefined
}

const templateOf = (piece: PieceToLay, layout: StripLayout, side: Side): EndTemplate =>
  endTemplate(layout, flatStrip(piece.profile, piece.sheet), { ...TILE, side, words })

const paths = ({ items }: DisplayList, role: Role): PathShape[] =>
  items.filter((item): item is PathShape => item.kind === 'path' && item.role === role)

const textsOf = ({ items }: DisplayList): string[] =>
  items.flatMap((item) => (item.kind === 'text' ? [item.text] : []))

const corner: PieceToLay = {
  profile: profileOf([3, 3.5], [-90]),
  sheet: STEEL,
  pieceLength: 60,
  ends: {
    left: squareEnd([{ leg: 2, length: 1 }]),
    right: plumbEnd(30),
    lowEnd: 'left',
  },
}

const drawn = (piece: PieceToLay, side: Side): { layout: StripLayout; template: EndTemplate } => {
  const layout = layoutOf(piece)
  if (layout === undefined) throw new Error('This piece can be laid out.')
  return { layout, template: templateOf(piece, layout, side) }
}

/** Where a place of the blank lies on a tile that was cut for it. */
const onTile = (layout: StripLayout, side: Side, index: number) => {
  const paper = { width: TILE.width / 72, height: (TILE.height - 44) / 72 }
  const { window } = tilesOf(layout, side, paper).tiles[index] ?? { window: undefined }
  if (window === undefined) throw new Error('No such tile.')
  return ({ along, at }: StripPoint) => ({
    x: (along - window.minX) * 72,
    y: (window.maxY - at) * 72,
  })
}

describe('a template of an end', () => {
  const { layout, template } = drawn(corner, 'right')
  const [tile, ...others] = template.tiles
  if (tile === undefined) throw new Error('A tile at least.')
  const { display } = tile

  it('fits one page where it can', () => {
    expect(others).toEqual([])
    expect([template.columns, template.rows]).toEqual([1, 1])
  })

  it('shows the cut at full size: 72 points are an inch', () => {
    const place = onTile(layout, 'right', 0)
    const cut = paths(display, 'outline').map(({ points }) => points)
    for (const mark of layout.right.marks) {
      const at = place({ at: mark.at, along: layout.blankLength - mark.along })
      expect(Math.min(...cut.map((chain) => distanceToPath(chain, at)))).toBeLessThan(1e-6)
    }
    const [first, last] = [layout.right.marks[0], layout.right.marks.at(-1)].map((mark) =>
      place({ at: mark?.at ?? 0, along: layout.blankLength - (mark?.along ?? 0) }),
    )
    const asked = Math.hypot(
      (layout.right.marks[0]?.along ?? 0) - (layout.right.marks.at(-1)?.along ?? 0),
      layout.stripWidth,
    )
    if (!first || !last) throw new Error('Two edges.')
    expect(Math.hypot(first.x - last.x, first.y - last.y) / 72).toBeCloseTo(asked, 9)
  })

  it('crosses each mark, dashes the crease, letters the edges and names the piece', () => {
    // Two lines a cross; the check lines below are drawn alike.
    const crosses = paths(display, 'mark').filter(({ points }) => (points[0]?.y ?? 999) < 590)
    expect(crosses).toHaveLength(2 * layout.right.marks.length)
    expect(paths(display, 'crease')[0]?.dash).toBeDefined()
    expect(textsOf(display)).toEqual(expect.arrayContaining(['A', 'B', words.mark, '90° ↓']))
  })

  it('has lines of 6 in. and of 150 mm to check the print', () => {
    const lengths = paths(display, 'mark').map(({ points: [from, to] }) =>
      from && to ? Math.abs(to.x - from.x) / 72 : 0,
    )
    expect(lengths.filter((length) => Math.abs(length - 6) < 1e-9)).toHaveLength(1)
    expect(lengths.filter((length) => Math.abs(length - 150 / 25.4) < 1e-9)).toHaveLength(1)
    expect(textsOf(display)).toEqual(
      expect.arrayContaining([words.check('6 in.'), words.check('150 mm')]),
    )
  })

  it('hatches tabs up to their fold line', () => {
    const left = drawn(corner, 'left').template.tiles[0]?.display
    if (left === undefined) throw new Error('A tile at least.')
    expect(paths(left, 'tabFold')).toHaveLength(1)
    expect(paths(left, 'tabHatch').length).toBeGreaterThan(10)
  })

  it('refuses a tile that cannot hold its check line, naming the least', () => {
    const strip = flatStrip(corner.profile, corner.sheet)
    const narrow = { width: 400, height: 640, side: 'left' as const, words }
    expect(() => endTemplate(layout, strip, narrow)).toThrow(/at least 450 by 216/)
  })
})

describe('an end wider than a page', () => {
  const wide: PieceToLay = { ...corner, profile: profileOf([9, 9, 6], [-90, 60]) }
  const { layout, template } = drawn(wide, 'right')

  it('is split into tiles that overlap, joined by letters that both of them carry', () => {
    expect(template.tiles.length).toBeGreaterThan(1)
    const joins = template.tiles.map(({ display }) =>
      textsOf(display).filter((text) => /^[a-z]$/.test(text)),
    )
    const all = joins.flat()
    expect(new Set(all).size).toBeGreaterThan(0)
    for (const letter of new Set(all)) {
      expect(all.filter((one) => one === letter)).toHaveLength(2)
    }
  })

  it('carries its check lines on every tile', () => {
    for (const { display } of template.tiles) {
      expect(textsOf(display)).toContain(words.check('6 in.'))
    }
  })

  it('shows in the overlap the same crosses at the same places of the strip', () => {
    const tiles = template.tiles.filter(({ column }) => column === 0)
    const [upper, lower] = tiles
    if (!upper || !lower) throw new Error('Two rows.')
    const paper = { width: TILE.width / 72, height: (TILE.height - 44) / 72 }
    const rows = tilesOf(layout, 'right', paper).tiles.filter(({ column }) => column === 0)
    const crosses = (tile: typeof upper, row: number) =>
      paths(tile.display, 'dimension')
        .filter(({ closed, points }) => !closed && points[0]?.y === points[1]?.y)
        .map(({ points }) => (rows[row]?.window.maxY ?? NaN) - (points[0]?.y ?? NaN) / 72)
    const shared = crosses(upper, 0).filter((y) =>
      crosses(lower, 1).some((other) => Math.abs(other - y) < 1e-9),
    )
    expect(shared.length).toBeGreaterThanOrEqual(2)
  })
})

describe('any dressed end', () => {
  it('lies on its tiles as a whole, each of them overlapping the next', () => {
    let seen = 0
    fc.assert(
      fc.property(
        dressedArbitrary,
        fc.constantFrom('left' as const, 'right' as const),
        (piece, side) => {
          const layout = layoutOf(piece)
          if (!layout) return
          seen += 1
          const paper = { width: TILE.width / 72, height: (TILE.height - 44) / 72 }
          const { tiles, columns, rows } = tilesOf(layout, side, paper)
          expect(tiles).toHaveLength(columns * rows)
          const places = layout[side].marks.map(({ at, along }) => ({
            y: at,
            x: side === 'left' ? along : layout.blankLength - along,
          }))
          for (const place of places) {
            expect(tiles.some(({ window }) => contains(window, place))).toBe(true)
          }
          tiles.forEach(({ window, column }, index) => {
            const next = tiles[index + 1]
            if (!next || next.column !== column + 1) return
            expect(window.maxX - next.window.minX).toBeCloseTo(TILE_OVERLAP, 9)
          })
        },
      ),
      { seed: 20_260_801, numRuns: 200 },
    )
    expect(seen).toBeGreaterThan(100)
  })

  it('is written on clear of its lines and stays on its paper', () => {
    fc.assert(
      fc.property(
        dressedArbitrary,
        fc.constantFrom('left' as const, 'right' as const),
        (piece, side) => {
          const layout = layoutOf(piece)
          if (!layout) return
          for (const { display } of templateOf(piece, layout, side).tiles.slice(0, 6)) {
            expect(outlineFaults(display)).toEqual([])
            const page = { minX: 0, minY: 0, maxX: display.width, maxY: display.height }
            expect(display.items.every((item) => holds(page, extentOf(item)))).toBe(true)
          }
        },
      ),
      { seed: 20_260_801, numRuns: 60 },
    )
  })
})
