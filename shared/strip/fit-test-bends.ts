import { isLess, TOLERANCE } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import { outsideSetback } from '#shared/strip/bend-allowance'
import { measureProblem, type TestBend } from '#shared/strip/calibrate-k-factor'
import type { Inches } from '#shared/units/brands'

/** A test bend whose radius may not have been measured. */
export type MeasuredBend = Omit<TestBend, 'insideRadius'> & { readonly insideRadius: Inches | null }

export const FIT_PROBLEM_CODES = [
  'noBends',
  'notFinite',
  'notPositive',
  'turnOutOfRange',
  'radiusUnknown',
  'anglesTooAlike',
  'contradicting',
  'kOutOfRange',
  'radiusOutOfRange',
] as const

export type FitProblemCode = (typeof FIT_PROBLEM_CODES)[number]

export type TestBendFit =
  | {
      readonly ok: true
      readonly kFactor: number
      readonly insideRadius: Inches
      /** The most by which the strip of a bend differs from what K and R make of its legs. */
      readonly spread: Inches
    }
  | {
      readonly ok: false
      readonly code: FitProblemCode
      /** Place in the list, from 0, where one bend is to blame. */
      readonly bend: number | null
      readonly found: number
      /** What `found` may be at most, or for `anglesTooAlike` must be at least. */
      readonly limit: number | null
    }

/** Bends that lie further off were not measured alike: K from 0 to 1 is itself little more. No source. */
const MOST_SPREAD: Inches = 1 / 64

/** Two steps of a radius gauge. Common practice, no source. */
const MOST_RADIUS_RANGE: Inches = 1 / 32

/**
 * How much the bends must differ in `leverage`: below it an error of the tape becomes one of ten
 * times its size in R. 45 beside 90 degrees differ by 0.22, 75 beside 90 by 0.10.
 */
const LEAST_LEVERAGE = 0.15

const MOST_RADIUS: Inches = 1

/** y = a R + b K of one bend, see `fitTestBends`. */
interface Equation {
  readonly a: number
  readonly b: number
  readonly y: number
}

const equationOf = ({ stripWidth, legA, legB, turn, thickness }: MeasuredBend): Equation => {
  const angle = radians(Math.abs(turn))
  /** OSSB of an outside radius of 1: tan(θ/2), over 90 degrees 1. */
  const reach = outsideSetback({ turn, insideRadius: 1, thickness: 0, kFactor: 0 })
  return {
    a: 2 * reach - angle,
    b: -angle * thickness,
    y: legA + legB - stripWidth - 2 * reach * thickness,
  }
}

/** How much a radius shows in a bend against its angle. 60 and 104 degrees are alike in it. */
const leverage = (bend: MeasuredBend): number => {
  const angle = radians(Math.abs(bend.turn))
  return equationOf(bend).a / angle
}

const rangeOf = (values: readonly number[]): number => Math.max(...values) - Math.min(...values)

const refuse = (
  code: FitProblemCode,
  found: number,
  limit: number | null = null,
  bend: number | null = null,
): TestBendFit => ({ ok: false, code, bend, found, limit })

const sumOf = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0)

/** K by least squares where R is known. */
const fitK = (equations: readonly Equation[], insideRadius: Inches): number =>
  sumOf(equations.map(({ a, b, y }) => b * (y - a * insideRadius))) /
  sumOf(equations.map(({ b }) => b * b))

/** R and K by least squares: the normal equations of two unknowns. */
const fitBoth = (equations: readonly Equation[]): { insideRadius: Inches; kFactor: number } => {
  const aa = sumOf(equations.map(({ a }) => a * a))
  const ab = sumOf(equations.map(({ a, b }) => a * b))
  const bb = sumOf(equations.map(({ b }) => b * b))
  const ay = sumOf(equations.map(({ a, y }) => a * y))
  const by = sumOf(equations.map(({ b, y }) => b * y))
  const determinant = aa * bb - ab * ab
  return {
    insideRadius: (ay * bb - by * ab) / determinant,
    kFactor: (aa * by - ab * ay) / determinant,
  }
}

/**
 * K and inside radius of a stock on one brake, from bends that were measured: what brings the
 * strips of all of them closest to what was cut. With T the measured thickness and θ = rad(|turn|),
 * 2 OSSB - (legA + legB - strip) = θ (R + K T) becomes
 *
 *     legA + legB - strip - 2 s T = R (2 s - θ) - K θ T     s = tan(θ/2), over 90 degrees 1
 *
 * which is linear in R and K. R is the mean of the radii that were measured; where none was, R and
 * K come from two or more bends at different angles by least squares. The sign of a turn plays no
 * part. One bend with its radius gives what `kFactorFromTestBend` gives.
 *
 * Refused by code: values that are none; one angle and no radius; angles too alike to tell R from
 * K; strips more than 1/64 in. off the fit, radii more than 1/32 in. apart; a K outside the sheet.
 */
export const fitTestBends = (bends: readonly MeasuredBend[]): TestBendFit => {
  for (const [index, bend] of bends.entries()) {
    const problem = measureProblem({ ...bend, insideRadius: bend.insideRadius ?? 0 })
    if (problem) return refuse(problem.code, problem.found, null, index)
  }
  if (bends.length === 0) return refuse('noBends', 0)
  const radii = bends.flatMap(({ insideRadius }) => (insideRadius === null ? [] : [insideRadius]))
  if (radii.length > 0 && isLess(MOST_RADIUS_RANGE, rangeOf(radii))) {
    return refuse('contradicting', rangeOf(radii), MOST_RADIUS_RANGE)
  }
  const equations = bends.map(equationOf)
  if (radii.length > 0) {
    const insideRadius = sumOf(radii) / radii.length
    return judge(equations, insideRadius, fitK(equations, insideRadius))
  }
  if (bends.length === 1) return refuse('radiusUnknown', 1, 2)
  const different = rangeOf(bends.map(leverage))
  if (isLess(different, LEAST_LEVERAGE)) {
    return refuse('anglesTooAlike', different, LEAST_LEVERAGE)
  }
  const { insideRadius, kFactor } = fitBoth(equations)
  return judge(equations, insideRadius, kFactor)
}

const judge = (
  equations: readonly Equation[],
  insideRadius: Inches,
  kFactor: number,
): TestBendFit => {
  const spread = Math.max(
    ...equations.map(({ a, b, y }) => Math.abs(y - a * insideRadius - b * kFactor)),
  )
  if (isLess(MOST_SPREAD, spread)) return refuse('contradicting', spread, MOST_SPREAD)
  // What is solved for carries the rounding of the measures: a sharp bend may come out below 0.
  const radius = Math.abs(insideRadius) <= TOLERANCE ? 0 : insideRadius
  if (radius < 0 || radius > MOST_RADIUS) {
    return refuse('radiusOutOfRange', insideRadius, MOST_RADIUS)
  }
  if (!(kFactor > 0 && kFactor <= 1)) return refuse('kOutOfRange', kFactor, 1)
  return { ok: true, kFactor, insideRadius: radius, spread }
}
