import type { Inches } from '#shared/units/brands'

/** A point or a direction of space in inches. Never changed in place. */
export interface Vector3 {
  readonly x: Inches
  readonly y: Inches
  readonly z: Inches
}

export const vector3 = (x: Inches, y: Inches, z: Inches): Vector3 => ({ x, y, z })

export const add3 = (a: Vector3, b: Vector3): Vector3 => vector3(a.x + b.x, a.y + b.y, a.z + b.z)

export const subtract3 = (a: Vector3, b: Vector3): Vector3 =>
  vector3(a.x - b.x, a.y - b.y, a.z - b.z)

export const scale3 = (a: Vector3, factor: number): Vector3 =>
  vector3(a.x * factor, a.y * factor, a.z * factor)

export const dot3 = (a: Vector3, b: Vector3): number => a.x * b.x + a.y * b.y + a.z * b.z

/** Right-handed: x × y = z. */
export const cross3 = (a: Vector3, b: Vector3): Vector3 =>
  vector3(a.y * b.z - a.z * b.y, a.z * b.x - a.x * b.z, a.x * b.y - a.y * b.x)

export const lengthOf3 = (a: Vector3): Inches => Math.hypot(a.x, a.y, a.z)

export const distance3 = (a: Vector3, b: Vector3): Inches =>
  Math.hypot(a.x - b.x, a.y - b.y, a.z - b.z)

/** The same direction, one inch long. Throws a RangeError for a vector without length. */
export const unit3 = (a: Vector3): Vector3 => {
  const length = lengthOf3(a)
  if (!(length > 0)) throw new RangeError('A vector without length has no direction.')
  return scale3(a, 1 / length)
}
