import type { Bounds } from '#shared/geometry/bounds'
import type { Vector } from '#shared/geometry/vector'
import { add, between, distance, radians, rotate, scale, subtract } from '#shared/geometry/vector'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { RoundPart, StraightPart, WalkedPart } from '#shared/strip/section-walk'
import type { Measured } from './dimension-labels'
import { dimensionPlaces } from './dimension-labels'
import type { Part, Role } from './display-list'
import type { LabelSpace, PlacedLabel } from './label-space'
import { fanOf, letterPlaces, reachOfText, ringOf, TEXT_CLEARANCE } from './label-space'
import type { Label } from './placement'
import { later } from './placement'
import type { FigureLabels } from './section-figure'
import type { PlacedSection } from './section-view'

/** A label of the section with its candidates and what it says. */
export interface SectionLabel extends Label<PlacedLabel> {
  readonly part: Part
  readonly role: Role
}

const WEIGHT = { leg: 10, edge: 8, hem: 6, angle: 2 }

const HEM_FAN = fanOf(15)

const ANGLE_FAN = fanOf(10)

/** In smaller frames a number stands beside its leg, without dimension lines. */
const NARROWEST_WITH_LINES = 260

export const sectionLabels = (
  profile: Profile,
  section: PlacedSection,
  labels: FigureLabels,
  shown: { readonly dimensions: boolean; readonly angles: boolean; readonly edges: boolean },
  frame: Bounds,
): SectionLabel[] => {
  const space: LabelSpace = { metal: section.metal, frame, pen: section.pen }
  return [
    ...(shown.dimensions ? legLabels(profile, section, labels, space) : []),
    ...(shown.edges ? edgeLabels(section, space) : []),
    ...(shown.dimensions ? hemLabels(profile, section, labels, space) : []),
    ...(shown.angles ? angleLabels(section, labels, space) : []),
  ]
}

/** How far a leg's dimension runs beyond the straight part as drawn, in pixels. */
const beyondStraight = (neighbor: WalkedPart | undefined, section: PlacedSection): number => {
  if (neighbor?.kind !== 'round') return 0
  const outside = neighbor.arc.radius * section.view.scale + section.pen.metal / 2
  const turn = Math.abs(neighbor.turn)
  return turn > 90 ? outside : outside * Math.tan(radians(turn) / 2)
}

/** A direction of the section in the frame. */
const inFrame = (section: PlacedSection, direction: Vector): Vector => {
  const turned = rotate(direction, section.view.rotation)
  return { x: turned.x, y: -turned.y }
}

/** The unit vector in the frame at an angle of the section. */
const headingInFrame = (section: PlacedSection, angle: number): Vector => {
  const turned = radians(angle + section.view.rotation)
  return { x: Math.cos(turned), y: 0 - Math.sin(turned) }
}

const measuredLeg = (
  section: PlacedSection,
  part: StraightPart,
  index: number,
  text: string,
): Measured => {
  const along = headingInFrame(section, part.heading)
  const before = beyondStraight(section.walked[index - 1], section)
  const after = beyondStraight(section.walked[index + 1], section)
  return {
    text,
    from: add(section.toFrame(part.from), scale(along, -before)),
    to: add(section.toFrame(part.to), scale(along, after)),
  }
}

const legLabels = (
  profile: Profile,
  section: PlacedSection,
  labels: FigureLabels,
  space: LabelSpace,
): SectionLabel[] => {
  const { middle } = section
  const ways = { lines: space.frame.maxX >= NARROWEST_WITH_LINES }
  return section.walked.flatMap((part, index) => {
    if (part.kind !== 'straight' || typeof part.of !== 'number') return []
    const leg = part.of
    const text = labels.length(profile.legs[leg - 1] ?? 0)
    const measured = measuredLeg(section, part, index, text)
    return {
      part: { kind: 'leg' as const, leg },
      role: 'dimensionText' as const,
      weight: WEIGHT.leg,
      streams: dimensionPlaces(space, measured, middle, ways),
    }
  })
}

const edgeLabels = (section: PlacedSection, space: LabelSpace): SectionLabel[] => {
  const legs = section.walked.filter(
    (part): part is StraightPart => part.kind === 'straight' && typeof part.of === 'number',
  )
  const first = legs[0]
  const last = legs.at(-1)
  if (first === undefined || last === undefined) return []
  return (['A', 'B'] as const).map((edge) => {
    const part = edge === 'A' ? first : last
    const hem = section.walked.find(
      (other) => other.kind === 'round' && other.fold === `hem${edge}`,
    )
    const out = scale(headingInFrame(section, part.heading), edge === 'A' ? -1 : 1)
    // A hemmed edge is lettered beyond its fold, where the piece ends.
    const end = hem?.kind === 'round' ? hem.mid : edge === 'A' ? part.from : part.to
    return {
      part: { kind: 'edge' as const, edge },
      role: 'edge' as const,
      weight: WEIGHT.edge,
      streams: [letterPlaces(space, edge, section.toFrame(end), out)],
    }
  })
}

const hemLabels = (
  profile: Profile,
  section: PlacedSection,
  labels: FigureLabels,
  space: LabelSpace,
): SectionLabel[] => {
  const label = (edge: 'A' | 'B', hem: Hem | null): SectionLabel[] => {
    const lip = section.walked.find((part) => part.kind === 'straight' && part.of === `lip${edge}`)
    if (hem === null || lip === undefined) return []
    const anchor = section.toFrame(between(lip.from, lip.to, 0.5))
    const leg = edge === 'A' ? profile.legs[0] : profile.legs.at(-1)
    if (leg === undefined || lip.kind !== 'straight') return []
    // The lip heads back along its leg; away from the leg is the side the hem does not turn to.
    const away = headingInFrame(section, lip.heading + (hem.turn > 0 ? -90 : 90))
    return [
      {
        part: { kind: 'hem', edge },
        role: 'dimensionText',
        weight: WEIGHT.hem,
        streams: [
          ringOf(space, {
            text: labels.hem?.(hem.length) ?? labels.length(hem.length),
            size: space.pen.text,
            anchor,
            first: away,
            fan: HEM_FAN,
            gaps: [0.35, 0.8, 1.4, 2.2, 3.5, 5, 7.5].map(
              (rows) => space.metal.half + rows * space.pen.text,
            ),
            leaderFrom: space.metal.half + 0.7 * space.pen.text,
            widest: 180,
            cost: 0,
            costPerTurn: 0.04,
            costPerGap: 1.2,
          }),
        ],
      },
    ]
  }
  return [...label('A', profile.hemA), ...label('B', profile.hemB)]
}

/** Which way the inside of a bend opens (unit). */
const insideOf = (section: PlacedSection, part: RoundPart): Vector => {
  const toCenter = inFrame(section, subtract(part.arc.center, part.mid))
  const length = Math.hypot(toCenter.x, toCenter.y)
  return length === 0 ? { x: 0, y: -1 } : scale(toCenter, 1 / length)
}

/**
 * How far from its corner a text on the inside of a bend must begin so that it clears both legs:
 * its middle lies as far off either leg as its own reach and the metal's.
 */
const snugGap = (
  section: PlacedSection,
  part: RoundPart,
  inside: Vector,
  text: string,
  size: number,
): number => {
  const needed = section.metal.half + TEXT_CLEARANCE
  const half = radians(180 - Math.abs(part.turn)) / 2
  const aside = [part.arc.start + 90, part.arc.start + part.turn + 90].map((turned) => {
    const leg = headingInFrame(section, turned)
    return reachOfText(text, size, leg.y, leg.x)
  })
  const middle = (needed + Math.max(...aside)) / Math.max(Math.sin(half), 0.05)
  // Corner and middle of the bend lie apart, the more the rounder it is drawn.
  const corner = distance(section.toFrame(part.corner), section.toFrame(part.mid))
  return middle - corner - reachOfText(text, size, inside.x, inside.y)
}

const angleLabels = (
  section: PlacedSection,
  labels: FigureLabels,
  space: LabelSpace,
): SectionLabel[] =>
  section.walked.flatMap((part) => {
    if (part.kind !== 'round' || typeof part.fold !== 'number') return []
    const included = 180 - Math.abs(part.turn)
    const { half } = space.metal
    const size = space.pen.text * 0.9
    const text = labels.angle(part.turn)
    // In a sharp bend the metal of both legs leaves no room until this far from the corner.
    const narrow = (half + 2) / Math.sin(radians(included) / 2)
    const inside = insideOf(section, part)
    const snug = Math.max(snugGap(section, part, inside, text, size), half + TEXT_CLEARANCE) + 0.01
    const anchor = section.toFrame(part.mid)
    const within = {
      text,
      size,
      anchor,
      first: inside,
      fan: ANGLE_FAN,
      gaps: ANGLE_ROWS.map((row) => snug + row * size * 0.45),
      leaderFrom: narrow + 1 + 2.4 * size,
      stop: narrow,
      widest: Math.min(70, included / 2),
      cost: 0,
      costPerTurn: 0.02,
      costPerGap: 1,
    }
    // Where the inside is taken, by a hem say, the angle stands outside and a line leads in.
    const without = () => ({
      text,
      size,
      anchor,
      first: scale(inside, -1),
      fan: ANGLE_FAN,
      gaps: [1.2, 2, 3, 4.5].map((rows) => half + rows * size),
      leaderFrom: 0,
      widest: 80,
      cost: 11,
      costPerTurn: 0.02,
      costPerGap: 1,
    })
    return {
      part: { kind: 'bend' as const, bend: part.fold },
      role: 'angleText' as const,
      weight: WEIGHT.angle,
      streams: [ringOf(space, within), later(11, () => [ringOf(space, without())])],
    }
  })

const ANGLE_ROWS = [0, 1, 2, 3, 4, 6, 9]
