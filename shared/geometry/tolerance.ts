/**
 * The one comparator of the kernel. A billionth of an inch (or degree) is far below anything a
 * shop can make and far above the rounding of a few hundred additions.
 */
export const TOLERANCE = 1e-9

/** -1, 0 or 1; values within the tolerance are equal. */
export const compare = (a: number, b: number): -1 | 0 | 1 =>
  Math.abs(a - b) <= TOLERANCE ? 0 : a < b ? -1 : 1

export const isEqual = (a: number, b: number): boolean => compare(a, b) === 0

export const isLess = (a: number, b: number): boolean => compare(a, b) < 0

export const isAtMost = (a: number, b: number): boolean => compare(a, b) <= 0
