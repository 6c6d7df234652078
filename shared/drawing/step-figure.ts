import type { StepPicture } from '#shared/bend-plan/plan-pictures'
import type { ToolSet } from '#shared/bend-plan/brake.schema'
import type { Bounds } from '#shared/geometry/bounds'
import { boundsOf, contains, grow, heightOf, middleOf, widthOf } from '#shared/geometry/bounds'
import { offsetCorners, roundCorners } from '#shared/geometry/corner-path'
import { segmentsOf } from '#shared/geometry/polyline'
import type { Vector } from '#shared/geometry/vector'
import { rotate, vector } from '#shared/geometry/vector'
import { metalOf } from './clearance'
import { clipPolygon, clipSides } from './clip-polygon'
import type { DisplayItem, DisplayList, Point } from './display-list'
import type { LabelSpace } from './label-space'
import { letterPlaces, linesOfLabel, middleOfLabel } from './label-space'
import type { Pen } from './pen'
import { halfWeight, penFor } from './pen'
import { placeLabels } from './placement'
import { openHems } from './open-hems'
import { path, text } from './strip-items'
import { swingArrow } from './swing-arrow'

export interface StepOptions {
  readonly width: number
  readonly height: number
  /** Which way the front swings. */
  readonly direction: 'up' | 'down'
  /** The brake's tools for that direction in the planner's fold frame; null draws none. */
  readonly tools: ToolSet | null
  readonly textSize?: number
  /** A place to ring, in the picture's inches: where the piece meets something. */
  readonly mark?: Vector
}

/** How much of a deep rear is shown, against the reach of the front; never less than these inches. */
const REAR_SHARE = 1.6
const LEAST_REAR = 2.5

/** Share of the frame left free around the workpiece. */
const MARGIN = 0.09

const reachOf = (points: readonly Vector[]): number =>
  Math.max(0, ...points.map((point) => Math.hypot(point.x, point.y)))

/** The front where the apron leaves it: a hem is flattened after that. */
const swungFront = (picture: StepPicture, direction: 'up' | 'down'): readonly Vector[] => {
  const { frontBefore, frontAfter, swings, swung } = picture
  if (swings.length === 0) return frontAfter
  return frontBefore.map((point) => rotate(point, direction === 'up' ? swung : 0 - swung))
}

/** What must be seen: all fronts, and the rear as far as it helps. */
const boundsToShow = (picture: StepPicture): Bounds => {
  const { frontBefore, frontAfter, swings } = picture
  const fronts = [vector(0, 0), ...frontBefore, ...frontAfter, ...swings.flat()]
  const depth = Math.max(LEAST_REAR, REAR_SHARE * reachOf(fronts))
  const rear = picture.clamped.filter((point) => point.x >= 0 - depth)
  const isCut = rear.length < picture.clamped.length
  return boundsOf([...fronts, ...rear, ...(isCut ? [vector(0 - depth, 0)] : [])])
}

interface StepView {
  readonly pen: Pen
  readonly frame: Bounds
  readonly scale: number
  /** From pixels with y up about the bend line to the frame. */
  readonly place: (point: Vector) => Point
}

const viewOf = (picture: StepPicture, options: StepOptions): StepView => {
  const { width, height } = options
  const pen = penFor(width * 1.3, height * 1.3, options.textSize)
  const shown = boundsToShow(picture)
  const across = width * (1 - 2 * MARGIN) - 2 * pen.text
  const down = height * (1 - 2 * MARGIN) - 2 * pen.text
  const scale = Math.min(
    across / Math.max(widthOf(shown), 1e-6),
    down / Math.max(heightOf(shown), 0.8),
  )
  const middle = middleOf(shown)
  return {
    pen,
    scale,
    frame: { minX: 0, minY: 0, maxX: width, maxY: height },
    place: (point) => ({
      x: width / 2 - middle.x * scale + point.x,
      y: height / 2 + middle.y * scale - point.y,
    }),
  }
}

/**
 * One step in the brake, seen from the end: bend line in the middle, front to the right. The
 * clamped rear and the front as it will be are metal with the color on its side, the front as it
 * is now is dashed, its places on the way are thin, and the apron stands where its swing ends. Hems
 * are opened as in `drawnSection`. Tools are cut by the frame; they are drawn closed on the sheet.
 */
export const stepFigure = (picture: StepPicture, options: StepOptions): DisplayList => {
  const view = viewOf(picture, options)
  const { pen, scale } = view
  const toPixels = (points: readonly Vector[]) =>
    points.map((point) => vector(point.x * scale, point.y * scale))
  const hemRoom = pen.metal + 2 * Math.max(pen.paint, pen.bare) + 2
  const chainWith = (front: readonly Vector[]) =>
    openHems([...toPixels(picture.clamped).toReversed(), ...toPixels(front).slice(1)], hemRoom)
  const after = chainWith(picture.frontAfter)
  const before = openHems(toPixels(picture.frontBefore), hemRoom)
  const items = [
    ...drawTools(picture, options, view),
    ...picture.swings.flatMap((front) => drawOnTheWay(openHems(toPixels(front), hemRoom), view)),
    ...drawGhost(before, view),
    ...drawSheet(after, picture.paintedUp, view),
    ...swingArrow(
      before,
      toPixels(swungFront(picture, options.direction)),
      options.direction,
      pen,
      view,
    ),
    ...drawLetters(after, picture, view),
    ...drawMark(options.mark, view),
  ]
  return { width: options.width, height: options.height, items }
}

const drawMark = (mark: Vector | undefined, { pen, scale, place }: StepView): DisplayItem[] =>
  mark === undefined
    ? []
    : [
        {
          kind: 'circle',
          role: 'problem',
          center: place(vector(mark.x * scale, mark.y * scale)),
          radius: pen.metal * 1.6 + 4,
          width: 2.5,
          filled: false,
        },
      ]

const drawTools = (picture: StepPicture, options: StepOptions, view: StepView): DisplayItem[] => {
  const { tools, direction } = options
  if (tools === null) return []
  const { pen, scale, frame } = view
  const half = halfWeight(pen)
  const upright = (polygon: ToolSet['inner'], lift: number) =>
    polygon.map(([x, y]) => vector(x * scale, y * scale + lift))
  const polygons = [
    upright(tools.inner, half),
    upright(tools.outer, 0 - half),
    upright(tools.apron, 0 - half).map((point) => rotate(point, picture.swung)),
  ]
  return polygons.flatMap((polygon) => {
    const seen = polygon
      .map((point) => (direction === 'up' ? point : vector(point.x, 0 - point.y)))
      .map(view.place)
    const inside = clipPolygon(seen, frame)
    if (inside.length < 3) return []
    return [
      { ...path('tool', inside, 0), closed: true, filled: true },
      ...clipSides(seen, frame).map((side) => path('toolEdge', [side.from, side.to], 1)),
    ]
  })
}

const drawn = (chain: readonly Vector[], left: number, view: StepView): Point[] =>
  roundCorners(offsetCorners(chain, left), halfWeight(view.pen) + 1, left).map(view.place)

/** Open lines cut by the frame, so that nothing is drawn outside it. */
const inFrame = (points: readonly Point[], frame: Bounds, reach: number): Point[][] => {
  const box = grow(frame, 0 - reach)
  const runs: Point[][] = []
  for (const side of segmentsOf(points).flatMap((s) =>
    clipSides([s.from, s.to], box).slice(0, 1),
  )) {
    const last = runs.at(-1)
    const end = last?.at(-1)
    if (last && end && Math.hypot(end.x - side.from.x, end.y - side.from.y) < 1e-6) {
      last.push(side.to)
    } else {
      runs.push([side.from, side.to])
    }
  }
  return runs
}

const drawGhost = (before: readonly Vector[], view: StepView): DisplayItem[] => {
  const width = view.pen.metal
  return inFrame(drawn(before, 0, view), view.frame, width / 2).map((run) => ({
    ...path('ghost', run, width),
    dash: [width * 2.2, width * 1.6],
  }))
}

const drawOnTheWay = (front: readonly Vector[], view: StepView): DisplayItem[] =>
  inFrame(drawn(front, 0, view), view.frame, 1).map((run) => path('ghost', run, 1.5))

const drawSheet = (
  chain: readonly Vector[],
  paintedUp: boolean | null,
  view: StepView,
): DisplayItem[] => {
  const { pen, frame } = view
  // The chain runs from the back to the front: up is its left.
  const bands = [1, -1].flatMap((side) => {
    const isPainted = paintedUp !== null && paintedUp === side > 0
    const band = isPainted ? pen.paint : pen.bare
    const points = drawn(chain, (side * (pen.metal + band - 0.5)) / 2, view)
    return inFrame(points, frame, band / 2 + 1).flatMap((run) => [
      ...(isPainted ? [path('paintEdge', run, band + 1.5)] : []),
      path(isPainted ? 'paint' : 'bare', run, band + 0.5),
    ])
  })
  const metal = inFrame(drawn(chain, 0, view), frame, pen.metal / 2)
  return [...bands, ...metal.map((run) => path('metal', run, pen.metal))]
}

/** Where the sheet, followed from the bend line to the back, leaves the frame. */
const leavingPoint = (points: readonly Point[], frame: Bounds): Point => {
  const leaving = segmentsOf(points).findLast(
    ({ from, to }) => !contains(frame, from) && contains(frame, to),
  )
  const seen = leaving && clipSides([leaving.from, leaving.to], frame)[0]
  return seen?.from ?? { x: frame.minX, y: frame.maxY / 2 }
}

const drawLetters = (
  chain: readonly Vector[],
  picture: StepPicture,
  view: StepView,
): DisplayItem[] => {
  const { pen } = view
  const frame = grow(view.frame, -3)
  const points = chain.map(view.place)
  const space: LabelSpace = {
    metal: metalOf(segmentsOf(points), halfWeight(pen)),
    frame,
    pen,
  }
  const ends = [
    { edge: picture.edgeAtBack, end: points[0], next: points[1] },
    { edge: picture.edgeAtFront, end: points.at(-1), next: points.at(-2) },
  ]
  const labels = ends.flatMap(({ edge, end, next }) => {
    if (end === undefined || next === undefined) return []
    const seen = contains(frame, end) ? end : leavingPoint(points, frame)
    const out = vector(end.x - next.x, end.y - next.y)
    return { edge, weight: 1, streams: [letterPlaces(space, edge, seen, out)] }
  })
  return placeLabels(labels).flatMap((placed, index): DisplayItem[] => {
    const edge = labels[index]?.edge
    if (placed?.radius === undefined || edge === undefined) return []
    const part = { kind: 'edge' as const, edge }
    return [
      ...linesOfLabel(placed).map((points) => path('edge', points, 1, part)),
      {
        kind: 'circle',
        role: 'edge',
        part,
        center: middleOfLabel(placed),
        radius: placed.radius,
        width: 1,
        filled: false,
      },
      text('edge', edge, middleOfLabel(placed), placed.size, part, true),
    ]
  })
}
