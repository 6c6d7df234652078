import type { Mark } from '#shared/ends/end-layout'

const toSixteenth = (length: number): number => Math.round(length * 16) / 16

/**
 * The marks to the nearest 1/16 in., as a person lays them out with a tape. For show only: each is
 * rounded by itself from its exact value, and nothing is computed from rounded ones.
 */
export const roundMarks = (marks: readonly Mark[]): Mark[] =>
  marks.map((mark) => ({ ...mark, at: toSixteenth(mark.at), along: toSixteenth(mark.along) }))
