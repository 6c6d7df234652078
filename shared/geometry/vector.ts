import type { Degrees, Inches } from '#shared/units/brands'

/** A point or a direction of the plane in inches: x to the right, y up. Never changed in place. */
export interface Vector {
  readonly x: Inches
  readonly y: Inches
}

export const vector = (x: Inches, y: Inches): Vector => ({ x, y })

export const ORIGIN: Vector = vector(0, 0)

export const radians = (degrees: Degrees): number => (degrees * Math.PI) / 180

export const degrees = (radiansValue: number): Degrees => (radiansValue * 180) / Math.PI

export const add = (a: Vector, b: Vector): Vector => vector(a.x + b.x, a.y + b.y)

export const subtract = (a: Vector, b: Vector): Vector => vector(a.x - b.x, a.y - b.y)

export const scale = (a: Vector, factor: number): Vector => vector(a.x * factor, a.y * factor)

export const dot = (a: Vector, b: Vector): number => a.x * b.x + a.y * b.y

/** The z part of a × b: positive when b lies to the left of a. */
export const cross = (a: Vector, b: Vector): number => a.x * b.y - a.y * b.x

export const lengthOf = (a: Vector): Inches => Math.hypot(a.x, a.y)

export const distance = (a: Vector, b: Vector): Inches => Math.hypot(a.x - b.x, a.y - b.y)

/** The unit vector at an angle counted counter-clockwise from +x. */
export const heading = (angle: Degrees): Vector =>
  vector(Math.cos(radians(angle)), Math.sin(radians(angle)))

/** Turned a quarter counter-clockwise: the left side of a direction. */
export const leftOf = (a: Vector): Vector => vector(-a.y, a.x)

/** Turned counter-clockwise about the origin. */
export const rotate = (a: Vector, angle: Degrees): Vector => {
  const c = Math.cos(radians(angle))
  const s = Math.sin(radians(angle))
  return vector(a.x * c - a.y * s, a.x * s + a.y * c)
}

/** The point a part `t` of the way from a (0) to b (1). */
export const between = (a: Vector, b: Vector, t: number): Vector =>
  vector(a.x + (b.x - a.x) * t, a.y + (b.y - a.y) * t)
