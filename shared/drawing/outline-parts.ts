import type { EndLayout, StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Bounds } from '#shared/geometry/bounds'
import { boundsOf } from '#shared/geometry/bounds'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import { clipPolygon, clipSides } from './clip-polygon'
import type { DisplayItem, Part, Point } from './display-list'
import type { OutlinePart } from './outline-place'
import { partOfCrease } from './strip-figure'
import { path } from './strip-items'

/** The blank's own plane: x along, y from edge A, in inches. */
const flat = ({ along, at }: StripPoint): Point => ({ x: along, y: at })

const windowOf = ({ from, to }: OutlinePart, width: Inches): Bounds => ({
  minX: from,
  maxX: to,
  minY: 0,
  maxY: width,
})

const inFrame =
  ({ toFrame }: OutlinePart) =>
  ({ x, y }: Point): Point =>
    toFrame({ along: x, at: y })

const isOnBreak = (from: Point, to: Point, part: OutlinePart, length: Inches): boolean =>
  [part.from, part.to].some(
    (x) => x > 0 && x < length && Math.abs(from.x - x) < 1e-9 && Math.abs(to.x - x) < 1e-9,
  )

/** What is left of the sheet: filled, its true sides drawn strong. */
export const drawSheet = (layout: StripLayout, part: OutlinePart): DisplayItem[] => {
  const box = windowOf(part, layout.stripWidth)
  const outline = layout.outline.map(flat)
  const place = inFrame(part)
  return [
    { ...path('strip', clipPolygon(outline, box).map(place), 0), closed: true, filled: true },
    ...clipSides(outline, box)
      .filter(({ from, to }) => !isOnBreak(from, to, part, layout.blankLength))
      .map(({ from, to }) => path('metal', [place(from), place(to)], 1.8)),
  ]
}

/** The corners that are cut off the blank, dotted. */
export const drawCutAways = (
  end: EndLayout,
  layout: StripLayout,
  part: OutlinePart,
): DisplayItem[] =>
  end.cutAways.flatMap((polygon) =>
    clipSides(polygon.map(flat), windowOf(part, layout.stripWidth))
      .filter(({ from, to }) => !isOnBreak(from, to, part, layout.blankLength))
      .map(({ from, to }) => ({
        ...path('ghost', [from, to].map(inFrame(part)), 1),
        dash: [2, 3],
      })),
  )

/** Slanting lines across a convex polygon, a step apart. */
const hatchAcross = (polygon: readonly Point[], step: number, part: Part): DisplayItem[] => {
  const { minX, maxX, minY, maxY } = boundsOf(polygon)
  const items: DisplayItem[] = []
  for (let start = minX - (maxY - minY) + step / 2; start < maxX; start += step) {
    // The line that rises to the right from `start` on the polygon's lowest level.
    const height = ({ x, y }: Point): number => x - (maxY - y) - start
    const [first, second] = polygon.flatMap((from, index) => {
      const to = polygon[(index + 1) % polygon.length] ?? from
      const [a, b] = [height(from), height(to)]
      if (a >= 0 === b >= 0) return []
      const share = a / (a - b)
      return [{ x: from.x + (to.x - from.x) * share, y: from.y + (to.y - from.y) * share }]
    })
    if (first && second) items.push(path('hemHatch', [first, second], 1, part))
  }
  return items
}

/** Tabs hatched up to the line they are folded on, slits as short strong lines. */
export const drawTabs = (end: EndLayout, part: OutlinePart): DisplayItem[] => [
  ...end.tabs.flatMap(({ leg, polygon, fold }): DisplayItem[] => {
    const of: Part = { kind: 'leg', leg }
    return [
      ...hatchAcross(polygon.map(part.toFrame), 6, of),
      { ...path('crease', fold.map(part.toFrame), 1.5, of), dash: [5, 4] },
    ]
  }),
  ...end.slits.map(({ from, to }) => path('metal', [part.toFrame(from), part.toFrame(to)], 3)),
]

/** The length over which a hem is opened, hatched along its edge. */
export const drawOpenings = (
  end: EndLayout,
  layout: StripLayout,
  strip: Strip,
  part: OutlinePart,
): DisplayItem[] =>
  end.openings.flatMap(({ edge, length }) => {
    const crease = strip.creases.find(({ fold }) => fold === `hem${edge}`)
    if (!crease) return []
    const [near, far] = edge === 'A' ? [0, crease.at] : [crease.at, strip.stripWidth]
    const [from, to] =
      end.side === 'left' ? [0, length] : [layout.blankLength - length, layout.blankLength]
    const corners = [
      { along: from, at: near },
      { along: to, at: near },
      { along: to, at: far },
      { along: from, at: far },
    ]
    return hatchAcross(corners.map(part.toFrame), 5, { kind: 'hem', edge })
  })

/** Where an end's cut meets a crease, along the blank. */
const cutAt = (layout: StripLayout, end: EndLayout, index: number): Inches => {
  const along = end.marks.find(({ crease }) => crease === index)?.along ?? 0
  return end.side === 'left' ? along : layout.blankLength - along
}

/** A dashed line from cut to cut, with a triangle for its turn towards the break. */
const drawCrease = (
  crease: Crease,
  index: number,
  layout: StripLayout,
  part: OutlinePart,
): DisplayItem[] => {
  const from = Math.max(part.from, cutAt(layout, layout.left, index))
  const to = Math.min(part.to, cutAt(layout, layout.right, index))
  if (from >= to) return []
  const of = partOfCrease(crease)
  const start = part.toFrame({ along: from, at: crease.at })
  const end = part.toFrame({ along: to, at: crease.at })
  const size = Math.min(6, Math.max(3, (end.x - start.x) / 8))
  const x = start.x + (end.x - start.x) * (part.from === 0 ? 0.72 : 0.28)
  const tip = crease.turn > 0 ? start.y - size : start.y + size
  const triangle = [
    { x: x - size * 0.8, y: start.y },
    { x: x + size * 0.8, y: start.y },
    { x, y: tip },
  ]
  return [
    { ...path('crease', [start, end], 1.3, of), dash: [6, 4] },
    { ...path('crease', triangle, 0, of), closed: true, filled: true },
  ]
}

export const drawCreases = (strip: Strip, layout: StripLayout, part: OutlinePart): DisplayItem[] =>
  strip.creases.flatMap((crease, index) => drawCrease(crease, index, layout, part))

const ZIGZAGS = 8

/** A zigzag where the strip is broken off. */
export const drawBreaks = (layout: StripLayout, part: OutlinePart): DisplayItem[] =>
  [part.from, part.to]
    .filter((along) => along > 1e-9 && along < layout.blankLength - 1e-9)
    .map((along) => {
      const bottom = part.toFrame({ along, at: 0 })
      const top = part.toFrame({ along, at: layout.stripWidth })
      const points = Array.from({ length: ZIGZAGS + 1 }, (_, index) => ({
        x: bottom.x + (index % ZIGZAGS === 0 ? 0 : index % 2 === 0 ? -3 : 3),
        y: bottom.y + ((top.y - bottom.y) * index) / ZIGZAGS,
      }))
      return path('dimension', points, 1)
    })
