import type { ClosedEnds } from '#shared/ends/close-ends'
import type { Corner } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { foldedEnd } from '#shared/ends/folded-end'
import type { RunFrame } from '#shared/ends/run-frame'
import { cornerFrames } from '#shared/ends/run-frame'
import { boundsOf } from '#shared/geometry/bounds'
import type { Vector3 } from '#shared/geometry/vector3'
import { add3, cross3, dot3, scale3, subtract3, vector3 } from '#shared/geometry/vector3'
import type { ColorSide } from '#shared/profile/profile.schema'
import type { Inches } from '#shared/units/brands'
import type { Face, View } from './axonometry'
import { faceOf, paintersOrder, project, viewFrom } from './axonometry'
import type { NamedPiece } from './corner-names'
import { meanOf, placeNames } from './corner-names'
import type { DisplayItem, DisplayList, Point } from './display-list'
import { penFor } from './pen'
import { textWidth } from './text-box'

/** The second piece of a corner, and how the two close. */
export interface CornerPartner {
  readonly piece: EndOfPiece
  readonly closed: Extract<ClosedEnds, { ok: true }>
}

export interface CornerOptions {
  readonly width: number
  readonly height: number
  /** What is written at the far end of the piece, and of its partner. */
  readonly names: readonly [string, string]
  /** How much of a piece is shown behind its cut; inches. */
  readonly stub?: Inches
  /** Turns the eye from where most of the color is seen, degrees. */
  readonly turn?: number
}

interface CornerFace extends Face {
  /** The face's left side is turned to the eye where this points towards it. */
  readonly left: Vector3
  readonly cut: readonly [Vector3, Vector3]
  readonly colorSide: ColorSide
  readonly closes: boolean
}

/** The corner that an end itself names; a plumb or square end lies on a run of its own slope. */
const ownCorner = ({ end }: EndOfPiece): Corner => {
  const planes = end.kind === 'miter' ? [end.plane, ...end.legs.map(({ plane }) => plane)] : []
  for (const plane of planes) if ('corner' in plane) return plane.corner
  const [slope] = planes.flatMap((plane) => ('plumb' in plane ? [plane.plumb] : []))
  return { slopeIn: slope ?? 0, slopeOut: slope ?? 0, plan: 0 }
}

const inWorld = ({ x, y, z }: Vector3, { t, u, v }: RunFrame, shift: Vector3): Vector3 =>
  add3(shift, add3(add3(scale3(t, x), scale3(u, y)), scale3(v, z)))

/** Legs that close on none of the partner's; all close while there is no partner. */
const openLegs = (legs: readonly { leg: number; closesOn: number | null }[]): Set<number> =>
  new Set(legs.filter(({ closesOn }) => closesOn === null).map(({ leg }) => leg))

const facesOf = (
  piece: EndOfPiece,
  frame: RunFrame,
  shift: Vector3,
  stub: Inches,
  open: ReadonlySet<number>,
): CornerFace[] =>
  foldedEnd({ ...piece, stub }).map(({ of, polygon, cut: [from, to] }) => {
    const [cutFrom, cutTo] = [inWorld(from, frame, shift), inWorld(to, frame, shift)]
    // Seen from the right end the walk goes to the right and its left side lies up: t × walk.
    const walk = subtract3(cutTo, cutFrom)
    return {
      ...faceOf(polygon.map((corner) => inWorld(corner, frame, shift))),
      left: cross3(frame.t, walk),
      cut: [cutFrom, cutTo],
      colorSide: piece.profile.colorSide,
      closes: !(typeof of === 'number' && open.has(of)),
    }
  })

const showsColor = ({ left, colorSide }: CornerFace, { toEye }: View): boolean => {
  if (colorSide === 'both') return true
  if (colorSide === 'none') return false
  return dot3(left, toEye) > 0 === (colorSide === 'left')
}

const AZIMUTHS = Array.from({ length: 12 }, (_, index) => 15 + 30 * index)
const ELEVATIONS = [20, 35]

/** From where most color is seen, and as little of the bare side as may be. */
const bestView = (faces: readonly CornerFace[], turn: number): View => {
  const views = ELEVATIONS.flatMap((elevation) =>
    AZIMUTHS.map((azimuth) => ({ azimuth, elevation, view: viewFrom(azimuth, elevation) })),
  )
  const scored = views.map((one) => ({
    ...one,
    score: faces.reduce((sum, face) => {
      const area = Math.abs(dot3(face.normal, one.view.toEye))
      const wanted = face.colorSide === 'none' ? dot3(face.left, one.view.toEye) > 0 : null
      return sum + ((wanted ?? showsColor(face, one.view)) ? area : -0.5 * area)
    }, 0),
  }))
  const best = scored.reduce((most, one) => (one.score > most.score + 1e-9 ? one : most))
  return viewFrom(best.azimuth + turn, best.elevation)
}

const drawFace = (
  face: CornerFace,
  view: View,
  place: (point: Vector3) => Point,
  weight: number,
): DisplayItem[] => {
  const points = face.corners.map(place)
  const common = { kind: 'path', points, closed: true } as const
  const cut = { kind: 'path', points: face.cut.map(place), closed: false, filled: false } as const
  return [
    { ...common, role: showsColor(face, view) ? 'paint' : 'bare', width: 0, filled: true },
    { ...common, role: 'paintEdge', width: 1, filled: false },
    // Paint may have any color, that of the cut's line too.
    { ...cut, role: 'halo', width: weight * (face.closes ? 1 : 1.6) + 2 },
    {
      ...cut,
      role: face.closes ? 'metal' : 'problem',
      width: weight * (face.closes ? 1 : 1.6),
    },
  ]
}

const drawName = (name: string, at: Point, size: number): DisplayItem => ({
  kind: 'text',
  role: 'edge',
  text: name,
  at,
  size,
  rotation: 0,
  bold: true,
})

/** Where a piece is broken off and where it is cut, on the picture. */
const endsOf = (faces: readonly CornerFace[], place: (point: Vector3) => Point): NamedPiece => ({
  broken: meanOf(
    faces.flatMap(({ corners }) => [corners[0], corners[3]].filter(isThere)).map(place),
  ),
  cut: meanOf(faces.flatMap((face) => face.cut).map(place)),
})

const isThere = (point: Vector3 | undefined): point is Vector3 => point !== undefined

/**
 * A corner as it will stand on the roof: the end of a piece and, where there is one, the piece that
 * meets it, folded, in parallel projection. Color where the painted side is seen, plain metal where
 * it is not; cuts are strong lines, in the color of a problem on a leg that closes on none. The eye
 * stands where most of the color is seen.
 *
 * Throws a RangeError for an end with problems: ask `endProblems` first.
 */
export const cornerFigure = (
  piece: EndOfPiece,
  partner: CornerPartner | null,
  { width, height, names, stub = 9, turn = 0 }: CornerOptions,
): DisplayList => {
  const corner = partner?.closed.corner ?? ownCorner(piece)
  const frames = cornerFrames(corner)
  const none = vector3(0, 0, 0)
  const first = facesOf(
    piece,
    frames[piece.side],
    none,
    stub,
    partner ? openLegs(partner.closed.a) : new Set(),
  )
  const second = partner
    ? facesOf(
        partner.piece,
        frames[partner.piece.side],
        partner.closed.shift,
        stub,
        openLegs(partner.closed.b),
      )
    : []
  const faces = [...first, ...second]
  const view = bestView(faces, turn)
  const size = Math.max(11, Math.min(18, Math.min(width, height) / 20))
  // Names give way to the picture in a small frame.
  const longest = Math.max(...names.map((name) => textWidth(name, size))) / 2
  const marginX = Math.min(size * 2 + longest, width / 4)
  const marginY = Math.min(size * 2 + longest, height / 4)
  const box = boundsOf(faces.flatMap(({ corners }) => corners.map((at) => project(at, view))))
  const perInch = Math.min(
    (width - 2 * marginX) / Math.max(box.maxX - box.minX, 1e-6),
    (height - 2 * marginY) / Math.max(box.maxY - box.minY, 1e-6),
  )
  const place = (at: Vector3): Point => {
    const { x, y } = project(at, view)
    return {
      x: width / 2 + (x - (box.minX + box.maxX) / 2) * perInch,
      y: height / 2 - (y - (box.minY + box.maxY) / 2) * perInch,
    }
  }
  const weight = penFor(width, height).metal * 1.2
  const shapes = faces.map(({ corners }) => corners.map(place))
  const frame = { minX: 2, minY: 2, maxX: width - 2, maxY: height - 2 }
  const placed = placeNames(
    [
      [names[0], endsOf(first, place)],
      ...(partner ? [[names[1], endsOf(second, place)] as const] : []),
    ],
    { taken: shapes, frame, size },
  )
  return {
    width,
    height,
    items: [
      ...paintersOrder(faces, view).flatMap((face) => drawFace(face, view, place, weight)),
      ...placed.map(({ name, at }) => drawName(name, at, size)),
    ],
  }
}
