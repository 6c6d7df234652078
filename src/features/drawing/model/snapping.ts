import {
  add,
  cross,
  distance,
  dot,
  heading,
  scale,
  subtract,
  vector,
  type Vector,
} from '#shared/geometry/vector'
import type { Degrees, Inches } from '#shared/units/brands'

/** Why a point was moved to where it is; drawn as a guide while the finger is down. */
export type SnapGuide =
  | {
      readonly kind: 'length'
      readonly from: Vector
      readonly length: Inches
      readonly equalLeg: boolean
    }
  | {
      readonly kind: 'angle'
      readonly from: Vector
      readonly heading: Degrees
      readonly fromPitch: boolean
    }

export interface Snapped {
  readonly point: Vector
  readonly guides: readonly SnapGuide[]
}

/** One end of a leg that follows the dragged point: its other corner and the leg before that one. */
export interface Neighbor {
  readonly corner: Vector
  /** Heading of the leg that arrives at or leaves the neighbor; null where the neighbor is an edge. */
  readonly legHeading: Degrees | null
}

export interface SnapRules {
  /** Leg lengths fall on multiples of this. */
  readonly step: Inches
  /** Turns fall on multiples of this. */
  readonly angleStep: Degrees
  /** The job's slope in degrees; its own angle and its complement attract too. */
  readonly pitch: Degrees | null
  /** Lengths of the other legs, which attract a little further than the step. */
  readonly otherLegs: readonly Inches[]
  /** How far a point may be pulled, in inches of the section. */
  readonly reach: Inches
}

interface Ray {
  readonly kind: 'ray'
  readonly from: Vector
  readonly direction: Vector
  readonly guide: SnapGuide
}

interface Ring {
  readonly kind: 'ring'
  readonly from: Vector
  readonly radius: Inches
  readonly guide: SnapGuide
}

type Attractor = Ray | Ring

/**
 * Pulls a dragged corner to round lengths and angles of the legs that meet in it. Every attractor
 * near the pointer is a ray or a ring about a neighbor; the best point is the one that satisfies
 * most of them at once, then the nearest. Returns the point unchanged where nothing is in reach.
 */
export function snapCorner(
  pointer: Vector,
  neighbors: readonly Neighbor[],
  rules: SnapRules,
): Snapped {
  const near = neighbors
    .flatMap((neighbor) => [...rays(pointer, neighbor, rules), ...rings(pointer, neighbor, rules)])
    .filter((attractor) => distanceTo(attractor, pointer) <= rules.reach)
  const candidates = [
    ...near.map((attractor) => project(pointer, attractor)),
    ...near.flatMap((a, index) => near.slice(index + 1).flatMap((b) => meet(a, b))),
  ].filter((point) => distance(point, pointer) <= rules.reach)

  let best: Snapped = { point: pointer, guides: [] }
  for (const point of candidates) {
    const guides = near
      .filter((attractor) => distanceTo(attractor, point) < 1e-7)
      .map(({ guide }) => guide)
    const better =
      guides.length > best.guides.length ||
      (guides.length === best.guides.length &&
        distance(point, pointer) < distance(best.point, pointer))
    if (better) best = { point, guides }
  }
  return best
}

function rays(pointer: Vector, neighbor: Neighbor, rules: SnapRules): Ray[] {
  const base = neighbor.legHeading ?? 0
  const toPointer = subtract(pointer, neighbor.corner)
  const turn = normalize((Math.atan2(toPointer.y, toPointer.x) * 180) / Math.PI - base)
  const round = Math.round(turn / rules.angleStep) * rules.angleStep
  const turns = [{ turn: round, fromPitch: false }]
  if (rules.pitch !== null) {
    const byPitch = [rules.pitch, 90 - rules.pitch, 90 + rules.pitch, 180 - rules.pitch]
    const nearest = byPitch
      .flatMap((angle) => [angle, -angle])
      .reduce((a, b) => (Math.abs(normalize(turn - a)) <= Math.abs(normalize(turn - b)) ? a : b))
    turns.push({ turn: nearest, fromPitch: true })
  }
  return turns.map(({ turn: by, fromPitch }) => ({
    kind: 'ray',
    from: neighbor.corner,
    direction: heading(base + by),
    guide: { kind: 'angle', from: neighbor.corner, heading: base + by, fromPitch },
  }))
}

function rings(pointer: Vector, neighbor: Neighbor, rules: SnapRules): Ring[] {
  const length = distance(pointer, neighbor.corner)
  const round = Math.max(rules.step, Math.round(length / rules.step) * rules.step)
  const equal = rules.otherLegs.filter(
    (other) => Math.abs(other - length) <= rules.reach && other !== round,
  )
  return [
    { radius: round, equalLeg: rules.otherLegs.includes(round) },
    ...equal.map((radius) => ({ radius, equalLeg: true })),
  ].map(({ radius, equalLeg }) => ({
    kind: 'ring',
    from: neighbor.corner,
    radius,
    guide: { kind: 'length', from: neighbor.corner, length: radius, equalLeg },
  }))
}

const normalize = (angle: Degrees): Degrees => ((((angle + 180) % 360) + 360) % 360) - 180

const project = (point: Vector, attractor: Attractor): Vector => {
  const offset = subtract(point, attractor.from)
  if (attractor.kind === 'ray') {
    return add(attractor.from, scale(attractor.direction, dot(offset, attractor.direction)))
  }
  const length = Math.hypot(offset.x, offset.y)
  return length === 0
    ? vector(attractor.from.x + attractor.radius, attractor.from.y)
    : add(attractor.from, scale(offset, attractor.radius / length))
}

const distanceTo = (attractor: Attractor, point: Vector): Inches =>
  attractor.kind === 'ray'
    ? Math.abs(cross(attractor.direction, subtract(point, attractor.from)))
    : Math.abs(distance(attractor.from, point) - attractor.radius)

/** Where two attractors hold at once: none, one or two points. */
function meet(a: Attractor, b: Attractor): Vector[] {
  if (a.kind === 'ray' && b.kind === 'ray') return meetRays(a, b)
  if (a.kind === 'ring' && b.kind === 'ring') return meetRings(a, b)
  return a.kind === 'ray' ? meetRayRing(a, b as Ring) : meetRayRing(b as Ray, a)
}

function meetRays(a: Ray, b: Ray): Vector[] {
  const sine = cross(a.direction, b.direction)
  if (Math.abs(sine) < 1e-9) return []
  const along = cross(subtract(b.from, a.from), b.direction) / sine
  return [add(a.from, scale(a.direction, along))]
}

function meetRayRing(ray: Ray, ring: Ring): Vector[] {
  const offset = subtract(ring.from, ray.from)
  const along = dot(offset, ray.direction)
  const aside = cross(ray.direction, offset)
  const squared = ring.radius * ring.radius - aside * aside
  if (squared < 0) return []
  const half = Math.sqrt(squared)
  return [along - half, along + half].map((t) => add(ray.from, scale(ray.direction, t)))
}

function meetRings(a: Ring, b: Ring): Vector[] {
  const apart = distance(a.from, b.from)
  if (apart < 1e-9) return []
  const along = (apart * apart + a.radius * a.radius - b.radius * b.radius) / (2 * apart)
  const squared = a.radius * a.radius - along * along
  if (squared < 0) return []
  const aside = Math.sqrt(squared)
  const direction = scale(subtract(b.from, a.from), 1 / apart)
  const foot = add(a.from, scale(direction, along))
  return [aside, -aside].map((by) => add(foot, vector(-direction.y * by, direction.x * by)))
}
