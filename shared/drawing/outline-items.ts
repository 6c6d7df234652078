import type { EndLayout, StripLayout, StripPoint } from '#shared/ends/end-layout'
import type { Bounds } from '#shared/geometry/bounds'
import { segmentsOf } from '#shared/geometry/polyline'
import type { Segment } from '#shared/geometry/segment'
import { isEqual } from '#shared/geometry/tolerance'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import { clipBorder, clipPolygon, hatchPolygon } from './clip-polygon'
import { creaseSpans } from './crease-spans'
import type { DisplayItem, Part, PathShape, Point } from './display-list'
import type { OutlineView, StripWindow } from './outline-view'
import { toFrame, xIn, yOf } from './outline-view'
import { partOfCrease } from './strip-figure'
import { dashed, filledPath, path } from './strip-items'

/** A crease as it is seen in one window: a level line. */
export interface DrawnCrease {
  readonly index: number
  readonly crease: Crease
  readonly part: Part
  readonly y: number
  readonly from: number
  readonly to: number
}

export const outlineWeight = (view: OutlineView): number => Math.min(2, Math.max(1, view.text / 7))

/** The window's stretch of the frame, from edge B down to edge A. */
const boxOf = (view: OutlineView, window: StripWindow): Bounds => ({
  minX: xIn(view, window, window.from),
  maxX: xIn(view, window, window.to),
  minY: view.yB - 1e-6,
  maxY: view.yA + 1e-6,
})

const inWindow = (
  view: OutlineView,
  window: StripWindow,
  polygon: readonly StripPoint[],
): Point[] => polygon.map((point) => toFrame(view, window, point))

/** What is left of each crease, window by window. */
export const drawnCreases = (layout: StripLayout, strip: Strip, view: OutlineView): DrawnCrease[] =>
  strip.creases.flatMap((crease, index) =>
    creaseSpans(layout.outline, crease.at).flatMap((span) =>
      view.windows.flatMap((window) => {
        const from = Math.max(span.from, window.from)
        const to = Math.min(span.to, window.to)
        if (to <= from) return []
        return {
          index,
          crease,
          part: partOfCrease(crease),
          y: yOf(view, crease.at),
          from: xIn(view, window, from),
          to: xIn(view, window, to),
        }
      }),
    ),
  )

/** Both ends, as far as a window shows them. */
export const endsIn = (
  layout: StripLayout,
  view: OutlineView,
): { end: EndLayout; window: StripWindow }[] =>
  [layout.left, layout.right].flatMap((end) => {
    const tip = end.side === 'left' ? 0 : layout.blankLength
    const window = view.windows.find((one) => one.from <= tip && tip <= one.to)
    return window ? { end, window } : []
  })

const DOTS = [1.5, 3]
const FOLD_DASH = [7, 3]

interface Hatched {
  readonly part: Part
  readonly line: Segment
}

const hatchStep = (view: OutlineView): number => Math.max(4, view.text * 0.5)

/** The lip between an edge and the fold of its hem, less where it is opened again. */
const lipOf = (layout: StripLayout, strip: Strip, edge: 'A' | 'B'): Bounds | undefined => {
  const fold = strip.creases.find((crease) => crease.fold === `hem${edge}`)
  if (fold === undefined) return undefined
  const opened = ({ openings }: EndLayout) =>
    Math.max(0, ...openings.filter((one) => one.edge === edge).map((one) => one.length))
  const box = {
    minX: opened(layout.left),
    maxX: layout.blankLength - opened(layout.right),
    minY: edge === 'A' ? 0 : fold.at,
    maxY: edge === 'A' ? fold.at : layout.stripWidth,
  }
  return box.maxX > box.minX ? box : undefined
}

const hatchedLips = (layout: StripLayout, strip: Strip, view: OutlineView): Hatched[] =>
  (['A', 'B'] as const).flatMap((edge) => {
    const box = lipOf(layout, strip, edge)
    if (box === undefined) return []
    const part: Part = { kind: 'hem', edge }
    const outline = layout.outline.map(({ along, at }) => ({ x: along, y: at }))
    const lip = clipPolygon(outline, box).map(({ x, y }) => ({ along: x, at: y }))
    return view.windows.flatMap((window) =>
      hatchPolygon(
        clipPolygon(inWindow(view, window, lip), boxOf(view, window)),
        hatchStep(view),
      ).map((line) => ({ part, line })),
    )
  })

/** A kinked line across the strip where it is broken off. */
const breakLine = (view: OutlineView, x: number): PathShape => {
  const { yA, yB, text } = view
  const kink = Math.min(text * 0.35, (yA - yB) / 6)
  const middle = (yA + yB) / 2
  const points = [
    [0, yB],
    [0, middle - kink],
    [0 - kink, middle - kink / 3],
    [kink, middle + kink / 3],
    [0, middle + kink],
    [0, yA],
  ].map(([dx = 0, y = 0]) => ({ x: x + dx, y }))
  return path('ghost', points, 1)
}

const breakLines = (layout: StripLayout, view: OutlineView): PathShape[] =>
  view.windows.flatMap((window) =>
    [window.from, window.to]
      .filter((along) => along > 0 && along < layout.blankLength)
      .map((along) => breakLine(view, xIn(view, window, along))),
  )

/** Of what is cut away only the blank's own border is dotted: the rest is the cut. */
const dottedSides = (
  layout: StripLayout,
  end: EndLayout,
  view: OutlineView,
  window: StripWindow,
): PathShape[] =>
  end.cutAways.flatMap((polygon) =>
    polygon.flatMap((from, index) => {
      const to = polygon[(index + 1) % polygon.length] ?? from
      const lie = (value: (point: StripPoint) => number, border: number) =>
        isEqual(value(from), border) && isEqual(value(to), border)
      const isBorder =
        lie(({ along }) => along, 0) ||
        lie(({ along }) => along, layout.blankLength) ||
        lie(({ at }) => at, 0) ||
        lie(({ at }) => at, layout.stripWidth)
      if (!isBorder) return []
      const points = [toFrame(view, window, from), toFrame(view, window, to)]
      return dashed('cutAway', points, 1, DOTS)
    }),
  )

/** The edge of a hem where it is opened again. */
const openedEdges = (
  layout: StripLayout,
  end: EndLayout,
  view: OutlineView,
  window: StripWindow,
): PathShape[] =>
  end.openings.map(({ edge, length }) => {
    const at = edge === 'A' ? 0 : layout.stripWidth
    const { blankLength } = layout
    const [from, to] = end.side === 'left' ? [0, length] : [blankLength - length, blankLength]
    const points = [from, to].map((along) => toFrame(view, window, { along, at }))
    return path('opening', points, outlineWeight(view) * 2.2, { kind: 'hem', edge })
  })

export interface DrawnOutline {
  /** Drawn before the creases. */
  readonly under: readonly DisplayItem[]
  /** Drawn over them. */
  readonly over: readonly DisplayItem[]
  /** All lines of it, for labels to keep clear of. */
  readonly lines: readonly Segment[]
}

/**
 * The strip as it is cut, without its creases: the sheet, hatched lips and tabs, the blank's
 * dotted border where it is cut away, the strong outline, slits, the lines that tabs are folded on,
 * opened hems and breaks.
 */
export const drawOutline = (layout: StripLayout, strip: Strip, view: OutlineView): DrawnOutline => {
  const weight = outlineWeight(view)
  const ends = endsIn(layout, view)
  const sheets = view.windows.map((window) => ({
    border: inWindow(view, window, layout.outline),
    box: boxOf(view, window),
  }))
  const lips = hatchedLips(layout, strip, view)
  const tabs = ends.flatMap(({ end, window }) =>
    end.tabs.map(({ leg, polygon, fold }) => ({
      part: { kind: 'leg', leg } as const,
      polygon: inWindow(view, window, polygon),
      fold: inWindow(view, window, fold),
    })),
  )
  const hatchedTabs = tabs.flatMap(({ part, polygon }) =>
    hatchPolygon(polygon, hatchStep(view) * 0.75).map((line) => ({ part, line })),
  )
  const cut = [
    ...ends.flatMap(({ end, window }) => dottedSides(layout, end, view, window)),
    ...sheets.flatMap(({ border, box }) =>
      clipBorder(border, box).map((chain) => path('outline', chain, weight)),
    ),
    ...ends.flatMap(({ end, window }) => openedEdges(layout, end, view, window)),
    ...ends.flatMap(({ end, window }) =>
      end.slits.map(({ from, to }) =>
        path('slit', inWindow(view, window, [from, to]), weight * 1.6),
      ),
    ),
    ...breakLines(layout, view),
  ]
  const hatch = (role: 'hemHatch' | 'tabHatch', hatched: readonly Hatched[]) =>
    hatched.map(({ part, line }) => path(role, [line.from, line.to], 1, part))
  const folds = tabs.map(({ part, fold }) => dashed('tabFold', fold, 1.5, FOLD_DASH, part))
  return {
    under: [
      ...sheets.map(({ border, box }) => filledPath('strip', clipPolygon(border, box))),
      ...hatch('hemHatch', lips),
      ...hatch('tabHatch', hatchedTabs),
    ],
    over: [...folds, ...cut],
    lines: [
      ...[...folds, ...cut].flatMap(({ points }) => segmentsOf(points)),
      // Every third line keeps any text off the hatching.
      ...[...lips, ...hatchedTabs].filter((_, index) => index % 3 === 0).map(({ line }) => line),
    ],
  }
}
