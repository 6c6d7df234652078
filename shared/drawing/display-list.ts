/**
 * A drawing as data: shapes with roles, in the pixels (or points) of a frame whose origin is its
 * top left corner, y down. Konva, SVG and paper draw the same list; only the colors of the roles
 * differ by theme.
 */

export interface Point {
  readonly x: number
  readonly y: number
}

/** What a shape means; a renderer maps it to a color of the theme. */
export type Role =
  | 'metal'
  | 'bare'
  | 'paint'
  | 'paintEdge'
  | 'dimension'
  | 'dimensionText'
  | 'angleText'
  | 'edge'
  | 'strip'
  | 'crease'
  | 'hemHatch'
  | 'selected'
  | 'hovered'
  | 'problem'
  | 'warning'
  | 'tool'
  | 'toolEdge'
  | 'ghost'
  /** The ground's color around a line that crosses paint of any color. */
  | 'halo'
  /** The border of a dressed strip, as it is cut. */
  | 'outline'
  /** What is cut off the blank. */
  | 'cutAway'
  | 'slit'
  | 'tabHatch'
  /** The line a tab is folded on. */
  | 'tabFold'
  /** Where a hem is opened again. */
  | 'opening'
  /** A place to prick. */
  | 'mark'
  /** Words beside a drawing. */
  | 'word'
  /** Never seen; a wide target for a finger. */
  | 'target'

/**
 * The part of the piece that a shape stands for, so that a touch on one view lights the other.
 * Legs and bends count from 1 at edge A.
 */
export type Part =
  | { readonly kind: 'leg'; readonly leg: number }
  | { readonly kind: 'bend'; readonly bend: number }
  | { readonly kind: 'hem'; readonly edge: 'A' | 'B' }
  | { readonly kind: 'edge'; readonly edge: 'A' | 'B' }

interface Shape {
  readonly role: Role
  readonly part?: Part
}

/** An open or closed chain of straight segments. `width` is the stroke, 0 for none. */
export interface PathShape extends Shape {
  readonly kind: 'path'
  readonly points: readonly Point[]
  readonly closed: boolean
  readonly width: number
  readonly filled: boolean
  readonly dash?: readonly number[]
}

export interface CircleShape extends Shape {
  readonly kind: 'circle'
  readonly center: Point
  readonly radius: number
  readonly width: number
  readonly filled: boolean
}

/** One line of text, centred on `at`, turned clockwise by `rotation` degrees. */
export interface TextShape extends Shape {
  readonly kind: 'text'
  readonly at: Point
  readonly text: string
  readonly size: number
  readonly rotation: number
  readonly bold: boolean
}

export type DisplayItem = PathShape | CircleShape | TextShape

export interface DisplayList {
  readonly width: number
  readonly height: number
  readonly items: readonly DisplayItem[]
}

export const isSamePart = (a: Part, b: Part): boolean => {
  if (a.kind === 'leg') return b.kind === 'leg' && a.leg === b.leg
  if (a.kind === 'bend') return b.kind === 'bend' && a.bend === b.bend
  return a.kind === b.kind && a.edge === b.edge
}
