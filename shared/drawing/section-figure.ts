import { grow } from '#shared/geometry/bounds'
import { distanceToPath } from '#shared/geometry/polyline'
import type { Vector } from '#shared/geometry/vector'
import type { Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'
import type { FlatParts } from '#shared/strip/flat-parts'
import { flatParts } from '#shared/strip/flat-parts'
import type { DisplayList, Part, Point } from './display-list'
import type { PlacedLabel } from './label-space'
import type { Pen } from './pen'
import { penFor } from './pen'
import { placeLabels } from './placement'
import { drawMetal, drawLabel, drawTargets } from './section-items'
import type { SectionLabel } from './section-labels'
import { sectionLabels } from './section-labels'
import type { FrameView, PlacedSection } from './section-view'
import { placeSection } from './section-view'

/** Words and numbers come from the caller, in the person's units and language. */
export interface FigureLabels {
  /** Inches as text. */
  readonly length: (inches: number) => string
  /** The signed turn of a bend as text: the included angle, or degrees of bend. */
  readonly angle: (turn: number) => string
  /** A hem's length as text, where it should say that it is a hem; otherwise as any length. */
  readonly hem?: (inches: number) => string
}

export interface SectionOptions {
  /** The frame in pixels (or points). */
  readonly width: number
  readonly height: number
  readonly labels: FigureLabels
  /** All shown unless switched off; all off is a thumbnail. */
  readonly show?: {
    readonly dimensions?: boolean
    readonly angles?: boolean
    readonly edges?: boolean
  }
  readonly selected?: Part | null
  readonly hovered?: Part | null
  /** What cannot be made. */
  readonly problems?: readonly Part[]
  /** What can be made but deserves a look. */
  readonly warnings?: readonly Part[]
  /** Turns the piece counter-clockwise, degrees. */
  readonly rotation?: number
  /** Type size in pixels instead of the one that suits the frame. */
  readonly textSize?: number
  /** Adds wide unseen shapes that carry their part, for a finger. */
  readonly targets?: boolean
  /** Keeps scale and place, so that nothing jumps under a finger: the `view` of an earlier figure. */
  readonly view?: FrameView
}

/** What found no place at this size. */
export interface LeftOut {
  readonly legs: readonly number[]
  readonly bends: readonly number[]
  readonly hems: readonly ('A' | 'B')[]
  readonly edges: readonly ('A' | 'B')[]
}

export interface Figure {
  readonly display: DisplayList
  /** From inches in the frame of `foldedSection` to pixels. */
  readonly toFrame: (point: Vector) => Point
  readonly toSection: (point: Point) => Vector
  /** Pixels an inch. */
  readonly scale: number
  readonly view: FrameView
  /** The part nearest to a point, if within `reach` pixels. */
  readonly findPart: (point: Point, reach: number) => Part | undefined
  readonly leftOut: LeftOut
}

/** Smallest type, pixels. */
const SMALLEST_TEXT = 9

interface Trial {
  /** Free room on each side, in lines of text. */
  readonly margin: number
  /** In parts of the frame's type size. */
  readonly text: number
}

/** Layouts tried one after another, by the number of legs up to which they are. */
const TRIALS: readonly { readonly legs: number; readonly trials: readonly Trial[] }[] = [
  {
    legs: 6,
    trials: [
      { margin: 2.4, text: 1 },
      { margin: 3.6, text: 1 },
      { margin: 2.4, text: 0.8 },
      { margin: 4, text: 0.8 },
      { margin: 2.4, text: 0.65 },
    ],
  },
  // Each further layout costs more here and gains less.
  {
    legs: 12,
    trials: [
      { margin: 3, text: 1 },
      { margin: 4, text: 0.8 },
      { margin: 2.4, text: 0.65 },
    ],
  },
  {
    legs: Infinity,
    trials: [
      { margin: 2.4, text: 0.8 },
      { margin: 2.4, text: 0.65 },
    ],
  },
]

/** With so few legs a layout with room for everything may still be improved on. */
const FEW_LEGS = 6

/** A layout whose worst label costs less than this is not improved on. */
const GOOD_ENOUGH = 13

interface Layout {
  readonly pen: Pen
  readonly section: PlacedSection
  readonly labels: readonly SectionLabel[]
  readonly placed: readonly (PlacedLabel | undefined)[]
  readonly cost: number
}

/**
 * Draws a section with its dimensions outside, angles inside the bends and edges lettered, fitted
 * into the frame. Text never touches metal or other text; what finds no place even at the smallest
 * type is left out (angles first) and named in `leftOut`.
 *
 * The piece is drawn as it is walked: leg 1 to the right, y up. See `drawnSection` for what is to
 * scale. Also draws drafts that cannot be made. Same input, same list.
 */
export const sectionFigure = (profile: Profile, sheet: Sheet, options: SectionOptions): Figure => {
  const layout = bestLayout(profile, sheet, options)
  const { section, pen } = layout
  const { toFrame, toSection, view } = section
  const marks = {
    selected: options.selected ?? null,
    hovered: options.hovered ?? null,
    problems: options.problems ?? [],
    warnings: options.warnings ?? [],
  }
  const items = [
    ...drawMetal(profile, section, pen, marks),
    ...layout.placed.flatMap((label, index) => {
      const meaning = layout.labels[index]
      return label && meaning ? drawLabel(label, meaning, pen, marks) : []
    }),
    ...(options.targets ? drawTargets(section) : []),
  ]
  const missing = layout.labels.filter((_, index) => layout.placed[index] === undefined)
  return {
    display: { width: options.width, height: options.height, items },
    toFrame,
    toSection,
    scale: view.scale,
    view,
    findPart: (point, reach) => findPart(section, point, reach),
    leftOut: leftOutOf(missing),
  }
}

const bestLayout = (profile: Profile, sheet: Sheet, options: SectionOptions): Layout => {
  const pen = penFor(options.width, options.height, options.textSize)
  const parts = flatParts(profile, sheet)
  const legs = profile.legs.length
  const trials = TRIALS.find((row) => legs <= row.legs)?.trials ?? []
  let best: Layout | undefined
  for (const [tried, trial] of trials.entries()) {
    const text = Math.max(Math.min(pen.text, SMALLEST_TEXT), pen.text * trial.text)
    const layout = layOut(profile, sheet, parts, options, { ...pen, text }, trial)
    const cost = layout.cost + 5 * tried
    if (best === undefined || cost < best.cost) best = { ...layout, cost }
    const worst = Math.max(0, ...layout.placed.map((label) => label?.cost ?? Infinity))
    if (worst < GOOD_ENOUGH) return best
    const next = trials[tried + 1]
    const isComplete = best.placed.every((label) => label !== undefined)
    if (isComplete && (legs > FEW_LEGS || (next !== undefined && next.text < trial.text)))
      return best
  }
  if (best === undefined) throw new Error('No layout was tried.')
  return best
}

const layOut = (
  profile: Profile,
  sheet: Sheet,
  parts: FlatParts,
  options: SectionOptions,
  pen: Pen,
  trial: Trial,
): Layout => {
  const shown = {
    dimensions: options.show?.dimensions ?? true,
    angles: options.show?.angles ?? true,
    edges: options.show?.edges ?? true,
  }
  const isBare = !shown.dimensions && !shown.angles && !shown.edges
  const room = isBare ? 1 : shown.dimensions ? trial.margin * pen.text : 2 * pen.text
  const section = placeSection(profile, sheet, parts, options, pen, room)
  const frame = grow({ minX: 0, minY: 0, maxX: options.width, maxY: options.height }, -2)
  const labels = sectionLabels(profile, section, options.labels, shown, frame)
  const placed = placeLabels(labels)
  const cost = placed.reduce(
    (sum, label, index) => sum + (label?.cost ?? (labels[index]?.weight ?? 0) * 100),
    0,
  )
  return { pen: section.pen, section, labels, placed, cost }
}

const findPart = (section: PlacedSection, point: Point, reach: number): Part | undefined => {
  let best: { part: Part; distance: number } | undefined
  for (const { part, points } of section.parts()) {
    const distance = distanceToPath(points, point)
    if (distance <= reach && (best === undefined || distance < best.distance)) {
      best = { part, distance }
    }
  }
  return best?.part
}

const leftOutOf = (missing: readonly SectionLabel[]): LeftOut => {
  const parts = missing.map((label) => label.part)
  return {
    legs: parts.flatMap((part) => (part.kind === 'leg' ? part.leg : [])),
    bends: parts.flatMap((part) => (part.kind === 'bend' ? part.bend : [])),
    hems: parts.flatMap((part) => (part.kind === 'hem' ? part.edge : [])),
    edges: parts.flatMap((part) => (part.kind === 'edge' ? part.edge : [])),
  }
}
