import type { Inches } from '#shared/units/brands'
import type { FoldSetup } from '../fold-setup'
import { FOLD_TESTS } from '../fold-tests/fold-tests'
import type { PlanCheck } from '../plan.schema'
import { cutSetup, runLength } from './cut-setup'
import type { Place } from './cut-setup'

/** How much of which chain's outer end is in the way. */
export interface Overlap {
  readonly length: Inches
  readonly place: Place
}

/** The chains whose length may be at fault, by check; none where length is not. */
const PLACES: Readonly<Partial<Record<PlanCheck, readonly Place[]>>> = {
  throat: ['rear'],
  gauge: ['rear'],
  rearMeetsTool: ['rear'],
  frontMeetsTool: ['front'],
  meetsItself: ['front', 'rear'],
  apronMeetsRear: ['rear'],
  cannotLoad: ['front', 'rear'],
  trapped: ['front', 'rear'],
}

/** The clamp opens by the rear's height, so less of a rear may mean less room; a gauge has a least reach. */
const MAY_FAIL_AGAIN: ReadonlySet<PlanCheck> = new Set(['gauge', 'cannotLoad', 'trapped'])

/** What is always left of a chain. */
export const LEAST: Inches = 1e-6

/** The overlap is known to this. */
const FINENESS: Inches = 1e-8

/** Steps in which a length is looked for where a longer cut may fail again. */
const STEP: Inches = 1 / 8

/** The end of [fails, passes] where the test begins to pass; the test passes there. */
export const bisect = (fails: Inches, passes: Inches, isFree: (cut: Inches) => boolean): Inches => {
  let [low, high] = [fails, passes]
  while (high - low > FINENESS) {
    const middle = (low + high) / 2
    if (isFree(middle)) high = middle
    else low = middle
  }
  return high
}

const leastCut = (
  setup: FoldSetup,
  check: PlanCheck,
  place: Place,
  below: Inches,
): Inches | undefined => {
  const test = FOLD_TESTS.find((each) => each.check === check)
  if (test === undefined) throw new RangeError(`There is no test ${check}.`)
  const isFree = (cut: Inches): boolean => test.find(cutSetup(setup, place, cut)) === undefined
  const most = Math.min(below, runLength(setup[place].chain.points) - LEAST)
  if (!(most > 0)) return undefined
  if (place === 'front' || !MAY_FAIL_AGAIN.has(check)) {
    return isFree(most) ? bisect(0, most, isFree) : undefined
  }
  for (let before = 0; before < most; before += STEP) {
    const cut = Math.min(before + STEP, most)
    if (isFree(cut)) return bisect(before, cut, isFree)
  }
  return undefined
}

/**
 * The least length to cut off the outer end of a chain so that a test which the fold fails passes,
 * found on the test itself by bisection, to 1e-8 in. and never short of it; of two chains that meet,
 * the one with less to cut. Null where no cut helps or none below `below` does.
 *
 * A shorter chain is part of the longer one, so what is clear stays clear. Only where less of the rear
 * may fail again (gauge, loading, removal) is the least cut looked for in steps of 1/8 in. first.
 */
export const findOverlap = (
  setup: FoldSetup,
  check: PlanCheck,
  below: Inches = Infinity,
): Overlap | null => {
  let least: Overlap | null = null
  for (const place of PLACES[check] ?? []) {
    const length = leastCut(setup, check, place, least?.length ?? below)
    if (length !== undefined && length < (least?.length ?? Infinity)) least = { length, place }
  }
  return least
}
