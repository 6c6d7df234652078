import { Complex } from 'complex.js'
import type { Corner, Side } from '#shared/ends/end.schema'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { FoldingSheet } from '#shared/strip/flat-parts'

/**
 * The cut of an end computed once more and another way, sharing nothing with the program: the
 * section is walked with complex numbers, the piece is turned into the world by rotation matrices,
 * and the lines along the piece are cut with the plane by solving three equations.
 */

export type Triple = readonly [number, number, number]

const rad = (degrees: number): number => (degrees / 180) * Math.PI

/** What the middle of the sheet is shorter than the outside at a bend, R and T as in the sheet. */
const lostAtBend = (turn: number, { insideRadius: R, thickness: T }: FoldingSheet): number => {
  const tangent = Math.tan(rad(Math.abs(turn)) / 2)
  return Math.abs(turn) <= 90 ? (T / 2) * tangent : R + T - (R + T / 2) * tangent
}

const radiusOf = (hem: Hem): number => (hem.style === 'open' ? hem.gap / 2 : 0)

/** Edge A, sharp corners and middles of hem folds, edge B; leg 1 begins at 0. */
export const naiveMarkPoints = (profile: Profile, sheet: FoldingSheet, lay: number): Complex[] => {
  const { legs, bends, hemA, hemB } = profile
  const half = sheet.thickness / 2
  const lost = (bend: number, hem: Hem | null): number => {
    const turn = bends[bend]?.turn
    return turn === undefined ? (hem ? half : 0) : lostAtBend(turn, sheet)
  }
  let at = new Complex(0)
  let along = new Complex({ abs: 1, arg: rad(lay) })
  const points: Complex[] = []
  /** Across a hem's fold from its leg, then along the lip, which lies back along the leg or on it. */
  const hemPoints = (hem: Hem, from: Complex, lipWay: Complex): [Complex, Complex] => {
    const across = along.mul(new Complex(0, hem.turn)).mul(radiusOf(hem) + half)
    const lip = lipWay.mul(hem.length - half)
    return [from.add(across), from.add(across.mul(2)).add(lip)]
  }
  if (hemA) {
    const [middle, edge] = hemPoints(hemA, at, along)
    points.push(edge, middle)
  } else {
    points.push(at)
  }
  legs.forEach((leg, index) => {
    const first = index === 0
    const last = index === legs.length - 1
    const before = first ? (hemA ? half : 0) : lost(index - 1, null)
    const after = last ? (hemB ? half : 0) : lost(index, null)
    at = at.add(along.mul(leg - before - after))
    const turn = bends[index]?.turn
    if (turn === undefined) return
    points.push(at)
    along = along.mul(new Complex({ abs: 1, arg: rad(turn) }))
  })
  if (hemB) {
    const [middle, edge] = hemPoints(hemB, at, along.neg())
    points.push(middle, edge)
  } else {
    points.push(at)
  }
  return points
}

const dot = (a: Triple, b: Triple): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2]

const turnAboutZ = ([x, y, z]: Triple, angle: number): Triple => [
  x * Math.cos(rad(angle)) - y * Math.sin(rad(angle)),
  x * Math.sin(rad(angle)) + y * Math.cos(rad(angle)),
  z,
]

/** A level piece along x tipped up by the slope, its u axis staying level. */
const tip = ([x, y, z]: Triple, slope: number): Triple => [
  x * Math.cos(rad(slope)) - z * Math.sin(rad(slope)),
  y,
  x * Math.sin(rad(slope)) + z * Math.cos(rad(slope)),
]

/** The axes t, u, v of the piece on a side of the corner, in the world. */
export const naiveAxes = (
  { slopeIn, slopeOut, plan }: Corner,
  side: Side,
): [Triple, Triple, Triple] => {
  const turn = (axis: Triple): Triple =>
    side === 'right' ? tip(axis, slopeIn) : turnAboutZ(tip(axis, slopeOut), plan)
  return [turn([1, 0, 0]), turn([0, 1, 0]), turn([0, 0, 1])]
}

const determinant = (a: Triple, b: Triple, c: Triple): number =>
  a[0] * (b[1] * c[2] - b[2] * c[1]) -
  a[1] * (b[0] * c[2] - b[2] * c[0]) +
  a[2] * (b[0] * c[1] - b[1] * c[0])

const withColumn = (row: Triple, column: number, value: number): Triple => [
  column === 0 ? value : row[0],
  column === 1 ? value : row[1],
  column === 2 ? value : row[2],
]

/** The point x of which row i times x is value i (Cramer's rule). */
export const solveThree = (rows: [Triple, Triple, Triple], values: Triple): Triple => {
  const all = determinant(...rows)
  const part = (column: number): number =>
    determinant(
      withColumn(rows[0], column, values[0]),
      withColumn(rows[1], column, values[1]),
      withColumn(rows[2], column, values[2]),
    ) / all
  return [part(0), part(1), part(2)]
}

/** Where the corner's plane cuts the lines along the piece, in the world and along the piece. */
export const naiveCornerCut = (
  corner: Corner,
  side: Side,
  points: readonly Complex[],
): { readonly world: Triple; readonly t: number }[] => {
  const into = naiveAxes(corner, 'right')[0]
  const outOf = naiveAxes(corner, 'left')[0]
  const normal: Triple = [into[0] + outOf[0], into[1] + outOf[1], into[2] + outOf[2]]
  const [t, u, v] = naiveAxes(corner, side)
  return points.map(({ re, im }) => {
    const world = solveThree([u, v, normal], [re, im, 0])
    return { world, t: dot(t, world) }
  })
}

export const apart = (a: Triple, b: Triple): number =>
  Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2])
