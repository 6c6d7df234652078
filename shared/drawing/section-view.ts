import type { Bounds } from '#shared/geometry/bounds'
import { heightOf, middleOf, widthOf } from '#shared/geometry/bounds'
import type { Segment } from '#shared/geometry/segment'
import type { Vector } from '#shared/geometry/vector'
import { between, distance, radians, rotate, vector } from '#shared/geometry/vector'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { FlatParts } from '#shared/strip/flat-parts'
import type { WalkedPart } from '#shared/strip/section-walk'
import { offsetChain } from '#shared/strip/section-walk'
import type { Metal } from './clearance'
import { metalOfChain } from './clearance'
import type { Part, Point } from './display-list'
import { drawnSection } from './drawn-section'
import type { Pen } from './pen'
import { halfWeight, withWeight } from './pen'

/** Where the section's origin lies in the frame (pixels), pixels an inch and the turn of the piece. */
export interface FrameView {
  readonly origin: Point
  readonly scale: number
  readonly rotation: number
}

/** A part of the piece with the middle line that is drawn for it, in pixels. */
export interface DrawnPart {
  readonly part: Part
  readonly points: readonly Point[]
}

export interface PlacedSection {
  readonly view: FrameView
  readonly toFrame: (point: Vector) => Point
  readonly toSection: (point: Point) => Vector
  readonly walked: readonly WalkedPart[]
  readonly pen: Pen
  /** Every part with the line it is drawn with; worked out when it is asked for. */
  readonly parts: () => readonly DrawnPart[]
  /** The middle of the figure. */
  readonly middle: Point
  readonly metal: Metal
  /** The line at an offset from the middle of the metal, pixels to the left of the walk. */
  readonly chain: (left: number) => Point[]
}

export const frameTransform = ({ origin, scale, rotation }: FrameView) => {
  const along = Math.cos(radians(rotation)) * scale
  const aside = Math.sin(radians(rotation)) * scale
  return {
    toFrame: (point: Vector): Point => ({
      x: origin.x + point.x * along - point.y * aside,
      y: origin.y - point.x * aside - point.y * along,
    }),
    toSection: (point: Point): Vector =>
      rotate(vector((point.x - origin.x) / scale, (origin.y - point.y) / scale), -rotation),
  }
}

interface FitOptions {
  readonly width: number
  readonly height: number
  readonly rotation?: number
  readonly view?: FrameView
}

/** Lightens the pen where it would swallow the shortest leg. */
const penForScale = (pen: Pen, profile: Profile, sheet: Sheet, scale: number): Pen => {
  const shortest = Math.min(...profile.legs.filter((leg) => leg > 0)) * scale
  const heaviest = Math.max(1.2, shortest * 0.4)
  const lighter = pen.metal > heaviest ? withWeight(pen, heaviest / pen.metal) : pen
  const trueWeight = sheet.thickness * scale
  return trueWeight > lighter.metal ? { ...lighter, metal: trueWeight } : lighter
}

/** For clearances half a pixel is fine enough, and fewer chords are sooner looked through. */
const chordsOf = (
  walked: readonly WalkedPart[],
  scale: number,
  toFrame: (point: Vector) => Point,
): Point[] => offsetChain(walked, 0, { maxStep: 60, tolerance: 0.4 / scale }).map(toFrame)

/**
 * Where a bend is tighter than its bands are wide, the inner band runs out to a point between the
 * legs: a line to there.
 */
const spursOf = (
  walked: readonly WalkedPart[],
  half: number,
  toFrame: (point: Vector) => Point,
): Segment[] =>
  walked.flatMap((part) => {
    if (part.kind !== 'round' || part.arc.radius >= half) return []
    const inside = offsetChain([part], half * Math.sign(part.turn), { maxStep: 180, tolerance: 1 })
    return inside.map((tip) => ({ from: toFrame(part.mid), to: toFrame(tip) }))
  })

const flatnessAt = (scale: number) => ({ maxStep: 24, tolerance: 0.06 / scale })

const partOf = (walked: WalkedPart): Part => {
  if (walked.kind === 'straight') {
    if (walked.of === 'lipA') return { kind: 'hem', edge: 'A' }
    if (walked.of === 'lipB') return { kind: 'hem', edge: 'B' }
    return { kind: 'leg', leg: walked.of }
  }
  if (walked.fold === 'hemA') return { kind: 'hem', edge: 'A' }
  if (walked.fold === 'hemB') return { kind: 'hem', edge: 'B' }
  return { kind: 'bend', bend: walked.fold }
}

/** The box around the middle line when the piece is turned. */
const turnedBounds = (walked: readonly WalkedPart[], rotation: number): Bounds => {
  const c = Math.cos(radians(rotation))
  const s = Math.sin(radians(rotation))
  let minX = Infinity
  let minY = Infinity
  let maxX = -Infinity
  let maxY = -Infinity
  const take = (x: number, y: number) => {
    if (x < minX) minX = x
    if (x > maxX) maxX = x
    if (y < minY) minY = y
    if (y > maxY) maxY = y
  }
  for (const part of walked) {
    for (const { x, y } of [part.from, part.to]) take(x * c - y * s, x * s + y * c)
    if (part.kind === 'straight') continue
    // Where an arc runs level or upright it reaches furthest.
    const { center, radius, start, sweep } = part.arc
    const x = center.x * c - center.y * s
    const y = center.x * s + center.y * c
    const low = start + rotation + Math.min(0, sweep)
    for (let quarter = Math.ceil(low / 90); quarter * 90 <= low + Math.abs(sweep); quarter += 1) {
      const side = ((quarter % 4) + 4) % 4
      take(x + radius * (UPRIGHT[side] ?? 0), y + radius * (UPRIGHT[(side + 3) % 4] ?? 0))
    }
  }
  return { minX, minY, maxX, maxY }
}

/** The cosine of no, one, two and three quarter turns. */
const UPRIGHT = [1, 0, -1, 0]

/** A scale this near to the one before, in parts of it, is not worth another fit. */
const NEAR_ENOUGH = 0.001

/**
 * Fits the section into the frame with `room` pixels free on each side. The pen's weight depends
 * on the scale and the drawn section on both, so the fit is made again until it stays: for the bare
 * line first, then with its bands and hems.
 */
export const placeSection = (
  profile: Profile,
  sheet: Sheet,
  parts: FlatParts,
  options: FitOptions,
  framePen: Pen,
  room: number,
): PlacedSection => {
  const rotation = options.view?.rotation ?? options.rotation ?? 0
  let scale = 1
  let pen = framePen
  let walked = drawnSection(profile, parts, sheet, 1000, withWeight(framePen, 0))
  let bounds = turnedBounds(walked, rotation)
  for (let pass = 0; pass < 3; pass += 1) {
    const fitted = options.view?.scale ?? scaleToFit(bounds, options, room + halfWeight(pen))
    if (pass > 0 && Math.abs(fitted - scale) <= NEAR_ENOUGH * scale) break
    scale = fitted
    pen = penForScale(framePen, profile, sheet, scale)
    walked = drawnSection(profile, parts, sheet, scale, pen)
    bounds = turnedBounds(walked, rotation)
  }
  const middle = middleOf(bounds)
  const origin = options.view?.origin ?? {
    x: options.width / 2 - middle.x * scale,
    y: options.height / 2 + middle.y * scale,
  }
  const view = { origin, scale, rotation }
  const transform = frameTransform(view)
  const chainOf = (pieces: readonly WalkedPart[], left: number): Point[] =>
    offsetChain(pieces, left / scale, flatnessAt(scale)).map(transform.toFrame)
  let drawn: readonly DrawnPart[] | undefined
  return {
    view,
    ...transform,
    walked,
    pen,
    parts: () => (drawn ??= drawnParts(walked, scale, (pieces) => chainOf(pieces, 0))),
    middle: { x: origin.x + middle.x * scale, y: origin.y - middle.y * scale },
    metal: metalOfChain(
      chordsOf(walked, scale, transform.toFrame),
      halfWeight(pen),
      spursOf(walked, halfWeight(pen) / scale, transform.toFrame),
    ),
    chain: (left) => chainOf(walked, left),
  }
}

const scaleToFit = (bounds: Bounds, frame: FitOptions, margin: number): number => {
  const across = Math.max(frame.width - 2 * margin, frame.width * 0.2)
  const down = Math.max(frame.height - 2 * margin, frame.height * 0.2)
  return Math.min(across / Math.max(widthOf(bounds), 1e-6), down / Math.max(heightOf(bounds), 1e-6))
}

/** How far a bend's mark runs into the legs beside it, pixels and share of the leg. */
const MARK_REACH = 9
const MARK_SHARE = 0.35

/** The piece of a straight part next to the bend, so that a marked bend can be seen. */
const besideBend = (
  neighbor: WalkedPart | undefined,
  end: 'from' | 'to',
  scale: number,
): WalkedPart[] => {
  if (neighbor?.kind !== 'straight') return []
  const length = distance(neighbor.from, neighbor.to)
  const share = length === 0 ? 0 : Math.min(MARK_SHARE, MARK_REACH / scale / length)
  return end === 'from'
    ? [{ ...neighbor, to: between(neighbor.from, neighbor.to, share) }]
    : [{ ...neighbor, from: between(neighbor.to, neighbor.from, share) }]
}

/** One entry a part, bends and hems before the legs they lie on: a hem's lip and fold together. */
const drawnParts = (
  walked: readonly WalkedPart[],
  scale: number,
  chain: (parts: readonly WalkedPart[]) => Point[],
): DrawnPart[] => {
  const parts = walked.flatMap((piece, index): { part: Part; pieces: WalkedPart[] }[] => {
    const part = partOf(piece)
    const before = walked[index - 1]
    const after = walked[index + 1]
    if (part.kind === 'leg') return [{ part, pieces: [piece] }]
    if (part.kind === 'bend') {
      const pieces = [
        ...besideBend(before, 'to', scale),
        piece,
        ...besideBend(after, 'from', scale),
      ]
      return [{ part, pieces }]
    }
    // A hem is entered once, at its fold, with the lip on its far side.
    if (piece.kind !== 'round') return []
    const pieces = piece.fold === 'hemA' ? [before, piece] : [piece, after]
    return [{ part, pieces: pieces.filter((each) => each !== undefined) }]
  })
  const order = (part: Part) => (part.kind === 'leg' ? 1 : 0)
  return parts
    .toSorted((a, b) => order(a.part) - order(b.part))
    .map(({ part, pieces }) => ({ part, points: chain(pieces) }))
}
