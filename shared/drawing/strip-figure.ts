import type { Bounds } from '#shared/geometry/bounds'
import { contains } from '#shared/geometry/bounds'
import type { Profile } from '#shared/profile/profile.schema'
import type { Crease, Strip } from '#shared/strip/strip.schema'
import type { DisplayItem, DisplayList, Part, Point } from './display-list'
import { isSamePart } from './display-list'
import type { Pen } from './pen'
import { penFor } from './pen'
import type { FigureLabels } from './section-figure'
import type { RunningMark } from './strip-dimensions'
import { runningDimensions, someRunningDimensions } from './strip-dimensions'
import { dashed, filledPath, hatch, letter, path, text } from './strip-items'
import { TEXT_HEIGHT, textWidth } from './text-box'

export interface StripOptions {
  readonly width: number
  readonly height: number
  readonly labels: FigureLabels
  /** `layout` adds the running distances from edge A at which a shop marks its creases. */
  readonly mode?: 'plain' | 'layout'
  readonly selected?: Part | null
  readonly hovered?: Part | null
  readonly problems?: readonly Part[]
  readonly warnings?: readonly Part[]
  readonly textSize?: number
  readonly targets?: boolean
}

export interface StripFigure {
  readonly display: DisplayList
  /** Pixels an inch. */
  readonly scale: number
  /** From a distance from edge A (inches) to the frame's x. */
  readonly toX: (at: number) => number
  readonly toAt: (x: number) => number
  /** The sheet's border in the frame. */
  readonly sheet: Bounds
  /** The bend or hem whose crease is nearest, if within `reach` pixels. */
  readonly findCrease: (point: Point, reach: number) => Part | undefined
  /** The leg or lip under a point. */
  readonly findFlat: (point: Point) => Part | undefined
  /** Legs whose length found no room; they stand in the section's dimensions. */
  readonly leftOut: readonly Part[]
  /** Running distances that found no room; the caller prints them as a table. */
  readonly unmarked: readonly RunningMark[]
}

/** A flat part between two creases, or between a crease and an edge. */
interface Flat {
  readonly part: Part
  readonly from: number
  readonly to: number
  readonly length: number
}

export const partOfCrease = (crease: Crease): Part => {
  if (crease.fold === 'hemA') return { kind: 'hem', edge: 'A' }
  if (crease.fold === 'hemB') return { kind: 'hem', edge: 'B' }
  return { kind: 'bend', bend: crease.fold }
}

const flatsOf = (profile: Profile, strip: Strip): Flat[] => {
  const stops = [0, ...strip.creases.map((crease) => crease.at), strip.stripWidth]
  const meanings: { part: Part; length: number }[] = [
    ...(profile.hemA
      ? [{ part: { kind: 'hem', edge: 'A' } as const, length: profile.hemA.length }]
      : []),
    ...profile.legs.map((length, index) => ({
      part: { kind: 'leg', leg: index + 1 } as const,
      length,
    })),
    ...(profile.hemB
      ? [{ part: { kind: 'hem', edge: 'B' } as const, length: profile.hemB.length }]
      : []),
  ]
  return meanings.map((meaning, index) => ({
    ...meaning,
    from: stops[index] ?? 0,
    to: stops[index + 1] ?? strip.stripWidth,
  }))
}

interface StripPlace {
  readonly pen: Pen
  readonly scale: number
  readonly sheet: Bounds
  readonly toX: (at: number) => number
  /** Half the size of the triangles; 0 where there is no room for any. */
  readonly arrow: number
  readonly isLettered: boolean
}

/** How tall the strip of a layout is drawn, in lines of text and in parts of the frame. */
interface Tallness {
  readonly lines: number
  readonly share: number
}

const placeStrip = (strip: Strip, options: StripOptions, layout?: Tallness): StripPlace => {
  const { width, height } = options
  const text = options.textSize ?? Math.min(16, Math.max(9, Math.min(width / 28, height / 4)))
  const pen = { ...penFor(width, height), text }
  const wanted = Math.max(4, text * 0.42)
  const arrow = height >= wanted * 7 && width >= wanted * 8 ? wanted : 0
  const above = arrow === 0 ? Math.min(2, height / 4) : arrow * 2 + 3
  const tall = layout
    ? Math.min(text * layout.lines, height * layout.share)
    : Math.min(height - 2 * above, text * 4)
  const top = layout ? above : (height - tall) / 2
  const aroundLetter = text * LETTER_SHARE + 1
  const middle = top + tall / 2
  const isLettered = width >= text * 8 && middle >= aroundLetter && height - middle >= aroundLetter
  const side = isLettered ? text * 2 : Math.min(arrow + 2, width / 4)
  const scale = (width - 2 * side) / Math.max(strip.stripWidth, 1e-6)
  return {
    pen,
    scale,
    arrow,
    isLettered,
    toX: (at) => side + at * scale,
    sheet: { minX: side, maxX: width - side, minY: top, maxY: top + tall },
  }
}

/** The radius of a letter's circle in parts of the type size. */
const LETTER_SHARE = 0.6

interface LaidStrip {
  readonly place: StripPlace
  readonly dimensions: readonly DisplayItem[]
  readonly unmarked: readonly RunningMark[]
}

/** With a tall sheet first: its numbers may need the room of a lower one. */
const TALLNESSES: readonly Tallness[] = [
  { lines: 3, share: 0.3 },
  { lines: 1.8, share: 0.2 },
]

const dimensionRoom = (place: StripPlace, options: StripOptions) => ({
  toX: place.toX,
  top: place.sheet.maxY + place.arrow + 4,
  frame: { minX: 2, minY: 0, maxX: options.width - 2, maxY: options.height - 1 },
  text: place.pen.text,
  length: options.labels.length,
})

const layOut = (strip: Strip, options: StripOptions): LaidStrip => {
  if (options.mode !== 'layout') {
    return { place: placeStrip(strip, options), dimensions: [], unmarked: [] }
  }
  const places = TALLNESSES.map((tallness) => placeStrip(strip, options, tallness))
  for (const step of [1, 0.85, 0.7, 0.55]) {
    for (const place of places) {
      const dimensions = runningDimensions(strip, dimensionRoom(place, options), step)
      if (dimensions) return { place, dimensions, unmarked: [] }
    }
  }
  const place = places.at(-1) ?? placeStrip(strip, options)
  const { items, leftOut } = someRunningDimensions(strip, dimensionRoom(place, options))
  return { place, dimensions: items, unmarked: leftOut }
}

/**
 * The flat strip to scale: edge A left, edge B right, left side up. Creases are dashes with a
 * triangle for their turn, above the strip when the sheet folds up, below when it folds down. Hems
 * are hatched. Lengths stand in their parts and are left out where they do not fit.
 */
export const stripFigure = (profile: Profile, strip: Strip, options: StripOptions): StripFigure => {
  const { place, dimensions, unmarked } = layOut(strip, options)
  const flats = flatsOf(profile, strip)
  const numbers = flats.map((flat) =>
    numberOf(flat, place, options, isSelected(flat.part, options)),
  )
  const { sheet, pen, toX, scale } = place
  const middle = (sheet.minY + sheet.maxY) / 2
  const corners = [
    { x: sheet.minX, y: sheet.minY },
    { x: sheet.maxX, y: sheet.minY },
    { x: sheet.maxX, y: sheet.maxY },
    { x: sheet.minX, y: sheet.maxY },
  ]
  const items: DisplayItem[] = [
    filledPath('strip', corners),
    ...flats.flatMap((flat) => markFlat(flat, place, options)),
    ...flats.flatMap((flat) =>
      flat.part.kind === 'hem' ? hatch(boxOfFlat(flat, place), pen.text * 0.5, flat.part) : [],
    ),
    { ...path('metal', corners, 1.5), closed: true },
    ...strip.creases.flatMap((crease) => drawCrease(crease, place, options)),
    ...numbers.flatMap((number) => number ?? []),
    ...(place.isLettered
      ? [
          ...letter('A', { x: sheet.minX - pen.text, y: middle }, pen.text * 0.85),
          ...letter('B', { x: sheet.maxX + pen.text, y: middle }, pen.text * 0.85),
        ]
      : []),
    ...dimensions,
    ...(options.targets
      ? [...flats.map((flat) => flatTarget(flat, place)), ...creaseTargets(strip, place)]
      : []),
  ]
  return {
    display: { width: options.width, height: options.height, items },
    scale,
    toX,
    toAt: (x) => (x - sheet.minX) / scale,
    sheet,
    findCrease: (point, reach) => {
      const near = strip.creases
        .map((crease) => ({ crease, distance: Math.abs(toX(crease.at) - point.x) }))
        .filter(({ distance }) => distance <= reach)
        .sort((a, b) => a.distance - b.distance)[0]
      return near && partOfCrease(near.crease)
    },
    findFlat: (point) => flats.find((flat) => contains(boxOfFlat(flat, place), point))?.part,
    leftOut: flats.flatMap((flat, index) => (numbers[index] === undefined ? [flat.part] : [])),
    unmarked,
  }
}

const boxOfFlat = (flat: Flat, { toX, sheet }: StripPlace): Bounds => ({
  ...sheet,
  minX: toX(flat.from),
  maxX: toX(flat.to),
})

const markRole = (
  part: Part,
  options: StripOptions,
): 'selected' | 'problem' | 'warning' | 'hovered' | undefined => {
  if (isSelected(part, options)) return 'selected'
  if (options.problems?.some((problem) => isSamePart(part, problem))) return 'problem'
  if (options.warnings?.some((warning) => isSamePart(part, warning))) return 'warning'
  if (options.hovered && isSamePart(part, options.hovered)) return 'hovered'
  return undefined
}

const isSelected = (part: Part, options: StripOptions): boolean =>
  options.selected ? isSamePart(part, options.selected) : false

/** A marked part carries a bar along both its borders. */
const markFlat = (flat: Flat, place: StripPlace, options: StripOptions): DisplayItem[] => {
  const role = markRole(flat.part, options)
  if (role === undefined) return []
  const box = boxOfFlat(flat, place)
  return [box.minY + 2.5, box.maxY - 2.5].map((y) =>
    path(
      role,
      [
        { x: box.minX, y },
        { x: box.maxX, y },
      ],
      4,
      flat.part,
    ),
  )
}

/** The length in its part, smaller if it must be; undefined where it does not fit. */
const numberOf = (
  flat: Flat,
  place: StripPlace,
  options: StripOptions,
  isChosen: boolean,
): DisplayItem | undefined => {
  const label = options.labels.length(flat.length)
  const { minX, maxX, minY, maxY } = boxOfFlat(flat, place)
  const size = [1, 0.85, 0.7]
    .map((step) => place.pen.text * step)
    .find(
      (candidate) =>
        candidate >= 7 &&
        textWidth(label, candidate) + 6 <= maxX - minX &&
        candidate * TEXT_HEIGHT + 2 <= maxY - minY,
    )
  if (size === undefined || flat.part.kind === 'hem') return undefined
  const at = { x: (minX + maxX) / 2, y: (minY + maxY) / 2 }
  return text(isChosen ? 'selected' : 'dimensionText', label, at, size, flat.part, isChosen)
}

const drawCrease = (crease: Crease, place: StripPlace, options: StripOptions): DisplayItem[] => {
  const part = partOfCrease(crease)
  const role = markRole(part, options) ?? 'crease'
  const x = place.toX(crease.at)
  const { minY, maxY } = place.sheet
  const { arrow } = place
  const tip = crease.turn > 0 ? minY - arrow * 1.9 : maxY + arrow * 1.9
  const base = crease.turn > 0 ? minY - 3 : maxY + 3
  const isStrong = role !== 'crease'
  const line = [
    { x, y: minY },
    { x, y: maxY },
  ]
  const triangle = [
    { x: x - arrow * 0.8, y: base },
    { x: x + arrow * 0.8, y: base },
    { x, y: tip },
  ]
  return [
    dashed(role, line, isStrong ? 3 : 1.5, DASH, part),
    ...(arrow > 0 ? [filledPath(role, triangle, part)] : []),
  ]
}

const DASH = [5, 4]

const flatTarget = (flat: Flat, place: StripPlace): DisplayItem => {
  const box = boxOfFlat(flat, place)
  const y = (box.minY + box.maxY) / 2
  return path(
    'target',
    [
      { x: box.minX, y },
      { x: box.maxX, y },
    ],
    box.maxY - box.minY,
    flat.part,
  )
}

const creaseTargets = (strip: Strip, { toX, sheet, arrow }: StripPlace): DisplayItem[] =>
  strip.creases.map((crease) =>
    path(
      'target',
      [
        { x: toX(crease.at), y: sheet.minY - arrow * 2 },
        { x: toX(crease.at), y: sheet.maxY + arrow * 2 },
      ],
      16,
      partOfCrease(crease),
    ),
  )
