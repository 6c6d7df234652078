import { TOLERANCE } from '#shared/geometry/tolerance'
import { radians } from '#shared/geometry/vector'
import { outsideSetback } from '#shared/strip/bend-allowance'
import type { Degrees, Inches } from '#shared/units/brands'

/** One bend made from a measured strip. Legs are outside dimensions. */
export interface TestBend {
  readonly stripWidth: Inches
  readonly legA: Inches
  readonly legB: Inches
  readonly turn: Degrees
  readonly insideRadius: Inches
  readonly thickness: Inches
}

/** Why a measure is no measure; `field` and `found` name the value concerned. */
export interface MeasureProblem {
  readonly code: 'notFinite' | 'notPositive' | 'turnOutOfRange'
  readonly field: keyof TestBend
  readonly found: number
}

export type KFactorResult =
  | { readonly ok: true; readonly kFactor: number; readonly bendDeduction: Inches }
  | ({ readonly ok: false } & MeasureProblem)
  | {
      readonly ok: false
      readonly code: 'kOutOfRange'
      readonly field: 'kFactor'
      readonly found: number
    }

const LENGTHS = ['stripWidth', 'legA', 'legB', 'thickness'] as const

/** The first measure of a test bend that cannot be one; undefined where all can. */
export const measureProblem = (bend: TestBend): MeasureProblem | undefined => {
  const fields = [...LENGTHS, 'insideRadius', 'turn'] as const
  for (const field of fields) {
    if (!Number.isFinite(bend[field])) return { code: 'notFinite', field, found: bend[field] }
  }
  for (const field of LENGTHS) {
    if (bend[field] <= 0) return { code: 'notPositive', field, found: bend[field] }
  }
  if (bend.insideRadius < 0) {
    return { code: 'notPositive', field: 'insideRadius', found: bend.insideRadius }
  }
  const turned = Math.abs(bend.turn)
  if (turned <= TOLERANCE || turned >= 180) {
    return { code: 'turnOutOfRange', field: 'turn', found: bend.turn }
  }
  return undefined
}

/**
 * The shop's own K from a test bend: BD = legA + legB - strip, BA = 2 OSSB - BD and
 * K = (BA / rad(|turn|) - R) / T. A K outside 0 to 1 would put the neutral axis outside the
 * sheet: a wrong measurement, so it is refused with the value found.
 */
export const kFactorFromTestBend = (bend: TestBend): KFactorResult => {
  const problem = measureProblem(bend)
  if (problem) return { ok: false, ...problem }
  const deduction = bend.legA + bend.legB - bend.stripWidth
  const allowance = 2 * outsideSetback({ ...bend, kFactor: 0 }) - deduction
  const kFactor = (allowance / radians(Math.abs(bend.turn)) - bend.insideRadius) / bend.thickness
  return kFactor > 0 && kFactor <= 1
    ? { ok: true, kFactor, bendDeduction: deduction }
    : { ok: false, code: 'kOutOfRange', field: 'kFactor', found: kFactor }
}
