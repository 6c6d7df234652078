import { isAtMost, isEqual, isLess } from '#shared/geometry/tolerance'
import type { RoofLine } from '#shared/roof-line/roof-line.schema'
import type { Inches } from '#shared/units/brands'

/** `single` covers the line alone; `shared` pieces have the remainder spread over them. */
export type RoofPieceKind = 'single' | 'full' | 'remainder' | 'shared' | 'equal'

/** A piece before it is laid. */
export interface RoofCut {
  readonly kind: RoofPieceKind
  readonly length: Inches
}

/**
 * The fewest pieces that cover a total in inches, ceil((total - lap) / (pieceLength - lap)); what
 * is over by less than the tolerance needs no piece of its own.
 */
export const fewestPieces = (total: Inches, { pieceLength, lap }: RoofLine): number => {
  const count = Math.max(1, Math.ceil((total - lap) / (pieceLength - lap)))
  const reachOfOneFewer = (count - 1) * (pieceLength - lap) + lap
  return count > 1 && isAtMost(total, reachOfOneFewer) ? count - 1 : count
}

/**
 * `count` full pieces of which the last gives way; where that one is too short, as few of the last
 * pieces as will do are made alike: two as a rule.
 */
const fullCuts = (count: number, remainder: Inches, line: RoofLine, least: Inches): RoofCut[] => {
  const { pieceLength } = line
  const full = (pieces: number) =>
    Array.from({ length: pieces }, (): RoofCut => ({ kind: 'full', length: pieceLength }))
  if (isEqual(remainder, pieceLength)) return full(count)
  if (!isLess(remainder, least)) {
    return [...full(count - 1), { kind: 'remainder', length: remainder }]
  }
  const shareOf = (pieces: number) => ((pieces - 1) * pieceLength + remainder) / pieces
  let sharing = 2
  while (sharing < count && isLess(shareOf(sharing), least)) sharing += 1
  const length = shareOf(sharing)
  return [
    ...full(count - sharing),
    ...Array.from({ length: sharing }, (): RoofCut => ({ kind: 'shared', length })),
  ]
}

/** The lengths of `count` pieces for a `total` in inches, from the low or left end. */
export const cutsOf = (total: Inches, count: number, line: RoofLine): RoofCut[] => {
  const { pieceLength, lap, minimum, mode, rightExtra } = line
  const equal = (total + (count - 1) * lap) / count
  const length = isEqual(equal, pieceLength) ? pieceLength : equal
  if (count === 1) return [{ kind: 'single', length }]
  if (mode === 'equal') return Array.from({ length: count }, () => ({ kind: 'equal', length }))
  const remainder = total - (count - 1) * (pieceLength - lap)
  return fullCuts(count, remainder, line, Math.max(minimum, rightExtra + lap))
}
