import { foldGroundOf, foldSetup } from '#shared/bend-plan/fold-setup'
import { FOLD_TESTS } from '#shared/bend-plan/fold-tests/fold-tests'
import type { Orientation } from '#shared/bend-plan/orientation'
import type { PlanRequest } from '#shared/bend-plan/planner'
import type { PieceBend } from '#shared/bend-plan/workpiece'

/**
 * Two further opinions on the cheapest sequence, for the tests alone: trying every order in every
 * orientation, and a forward search. They share the tests of a fold with the planner and nothing of
 * its search, its bound or its sums of cost.
 */

/** handling, wideFront, faceGauge. */
export type Cost = readonly [number, number, number]

const ALL: readonly Orientation[] = [true, false].flatMap((leftUp) =>
  [true, false].map((aBack) => ({ leftUp, aBack })),
)

const plus = (a: Cost, b: Cost): Cost => [a[0] + b[0], a[1] + b[1], a[2] + b[2]]

export const isCheaper = (a: Cost, b: Cost): boolean => {
  if (a[0] !== b[0]) return a[0] < b[0]
  return a[1] === b[1] ? a[2] < b[2] : a[1] < b[1]
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)

const openGround = (request: PlanRequest) => {
  const { section, sheet, brake, pieceLength } = request
  const ground = foldGroundOf(section, sheet, brake)
  const { legs, bends } = ground.piece
  const weight = sum(legs) * pieceLength * sheet.thickness * sheet.density
  const isShort = pieceLength <= 60
  const crew = isShort && weight <= 35 ? 1 : weight <= 100 ? 2 : 3

  const moving = (from: Orientation | undefined, to: Orientation): Cost => {
    if (from === undefined) return [0, 0, 0]
    const turned = from.leftUp !== to.leftUp
    const swapped = from.aBack !== to.aBack
    if (turned && swapped) return [2 * crew, 0, 0]
    if (swapped) return [(isShort ? 2 : 3) * crew, 0, 0]
    return turned ? [(isShort ? 4 : 5) * crew, 0, 0] : [0, 0, 0]
  }

  const folding = (made: ReadonlySet<number>, bend: PieceBend, o: Orientation): Cost => {
    const towardsA = sum(legs.slice(0, bend.index + 1))
    const towardsB = sum(legs.slice(bend.index + 1))
    const [front, rear] = o.aBack ? [towardsB, towardsA] : [towardsA, towardsB]
    const isWide = front > rear + 1e-6
    const big = isWide && front > brake.bigFront + 1e-9 ? (isShort ? 2 : 4) * crew : 0
    const behind = bends.filter(
      ({ index }) => made.has(index) && (o.aBack ? index < bend.index : index > bend.index),
    )
    // A closed hem alone is no face.
    const [only] = behind
    const isFlat = only === undefined || (behind.length === 1 && only.hem?.open === false)
    return [big, isWide ? 1 : 0, brake.gauge === null || isFlat ? 0 : 1]
  }

  const known = new Map<string, boolean>()
  const mayFold = (made: ReadonlySet<number>, bend: PieceBend, o: Orientation): boolean => {
    const key = `${bits(made)} ${bend.index} ${o.leftUp} ${o.aBack}`
    const answer =
      known.get(key) ??
      FOLD_TESTS.every((test) => test.find(foldSetup(ground, bits(made), bend, o)) === undefined)
    known.set(key, answer)
    return answer
  }

  return { bends, moving, folding, mayFold }
}

const bits = (made: ReadonlySet<number>): number => sum([...made].map((index) => 2 ** index))

/** Every order, every orientation: the cheapest cost, or undefined when nothing works. */
export const bruteForce = (request: PlanRequest): Cost | undefined => {
  const { bends, moving, folding, mayFold } = openGround(request)
  let best: Cost | undefined
  const attempt = (made: ReadonlySet<number>, at: Orientation | undefined, spent: Cost) => {
    if (made.size === bends.length) {
      if (best === undefined || isCheaper(spent, best)) best = spent
      return
    }
    for (const bend of bends) {
      if (made.has(bend.index)) continue
      for (const o of ALL) {
        if (!mayFold(made, bend, o)) continue
        const cost = plus(plus(spent, moving(at, o)), folding(made, bend, o))
        attempt(new Set([...made, bend.index]), o, cost)
      }
    }
  }
  attempt(new Set(), undefined, [0, 0, 0])
  return best
}

/** Forwards, one bend more at a time, keeping the cheapest way into each set and orientation. */
export const forwardSearch = (request: PlanRequest): Cost | undefined => {
  const { bends, moving, folding, mayFold } = openGround(request)
  interface State {
    readonly made: ReadonlySet<number>
    readonly at: Orientation | undefined
    readonly cost: Cost
  }
  let layer: State[] = [{ made: new Set(), at: undefined, cost: [0, 0, 0] }]
  for (let size = 0; size < bends.length; size++) {
    const next = new Map<string, State>()
    for (const state of layer) {
      for (const bend of bends) {
        if (state.made.has(bend.index)) continue
        for (const o of ALL) {
          if (!mayFold(state.made, bend, o)) continue
          const made = new Set([...state.made, bend.index])
          const cost = plus(plus(state.cost, moving(state.at, o)), folding(state.made, bend, o))
          const key = `${bits(made)} ${o.leftUp} ${o.aBack}`
          const known = next.get(key)
          if (known === undefined || isCheaper(cost, known.cost))
            next.set(key, { made, at: o, cost })
        }
      }
    }
    layer = [...next.values()]
  }
  return layer.reduce<Cost | undefined>(
    (best, { cost }) => (best === undefined || isCheaper(cost, best) ? cost : best),
    undefined,
  )
}
