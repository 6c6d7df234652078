import { bitCount } from './bit-count'
import type { FoldGround } from './fold-setup'
import { isEverOpen } from './open-orientation'
import type { OperationCost } from './operation-cost'
import { ORIENTATIONS } from './orientation'
import type { Orientation } from './orientation'
import { allBends, closedHemsOf } from './workpiece'

/** Cheapest walk over a set of orientations that ends in one of them; the start is free. */
const cheapestWalk = (visit: number, end: number, move: OperationCost['move']): number => {
  const rest = visit & ~(1 << end)
  if (rest === 0) return 0
  let best = Infinity
  ORIENTATIONS.forEach((_, before) => {
    if ((rest & (1 << before)) === 0) return
    best = Math.min(best, cheapestWalk(rest, before, move) + move(before, end))
  })
  return best
}

/** Bends are taken four at a time: small tables, few look-ups. */
const CHUNK = 4
const CHUNK_SETS = 2 ** CHUNK

/** What a choice among some orientations costs at least. */
interface Choice {
  readonly walk: number
  /** Sums of the least fixed costs, by chunk of the bend set and the bends in it. */
  readonly sums: readonly (readonly number[])[]
  /** Bends whose least fixed cost has edge A (or B) at the back, closed hems left out. */
  readonly onA: number
  readonly onB: number
}

/**
 * How many bends must be gauged on a formed face, at least. One gauged from edge A before anything is
 * bent behind it comes before all bends nearer to A, one gauged from B before all nearer to B: so one
 * from A and one from B that lies nearer to A cannot both find their edge flat. The flat ones are those
 * from A up to some bend and those from B beyond it; the best border is looked for. A closed hem does
 * not make a face.
 */
const leastFaces = (onA: number, onB: number): number => {
  let faces = bitCount(onA)
  let least = faces
  for (let rest = onA | onB; rest !== 0; rest &= rest - 1) {
    const bit = rest & -rest
    // The border moves past this bend.
    if ((onA & bit) !== 0) faces--
    else faces++
    if (faces < least) least = faces
  }
  return least
}

/** For each orientation, the choices that hold it, cheapest walk first. */
const choicesByEnd = (ground: FoldGround, cost: OperationCost): readonly (readonly Choice[])[] => {
  const { piece, brake } = ground
  const { bends } = piece
  const fixed = bends.map((bend) =>
    ORIENTATIONS.map((o, number) =>
      isEverOpen(ground, bend, o) ? cost.fixed(bend, number) : Infinity,
    ),
  )
  const makesFace = brake.gauge === null ? 0 : allBends(piece) & ~closedHemsOf(piece)

  const choiceOf = (visit: number): Omit<Choice, 'walk'> => {
    const leastOf = (each: readonly number[], isWanted: (o: Orientation) => boolean) =>
      ORIENTATIONS.reduce(
        (least, o, number) =>
          ((visit >> number) & 1) === 1 && isWanted(o)
            ? Math.min(least, each[number] ?? Infinity)
            : least,
        Infinity,
      )
    const onA = fixed.map((each) => leastOf(each, ({ aBack }) => aBack))
    const onB = fixed.map((each) => leastOf(each, ({ aBack }) => !aBack))
    const setOf = (one: readonly number[], other: readonly number[]) =>
      one.reduce((set, least, i) => (least < (other[i] ?? NaN) ? set | (1 << i) : set), 0)
    const least = onA.map((cost, i) => Math.min(cost, onB[i] ?? NaN))
    const sums = Array.from({ length: Math.ceil(bends.length / CHUNK) }, (_, chunk) => {
      const table = [0]
      for (let bits = 1; bits < CHUNK_SETS; bits++) {
        const bend = chunk * CHUNK + 31 - Math.clz32(bits & -bits)
        table.push((table[bits & (bits - 1)] ?? NaN) + (least[bend] ?? 0))
      }
      return table
    })
    return { sums, onA: setOf(onA, onB) & makesFace, onB: setOf(onB, onA) & makesFace }
  }

  const choices = Array.from({ length: 16 }, (_, visit) => choiceOf(visit))
  return ORIENTATIONS.map((_, end) =>
    choices
      .flatMap((choice, visit): readonly Choice[] =>
        (visit & (1 << end)) === 0
          ? []
          : [{ ...choice, walk: cheapestWalk(visit, end, cost.move) }],
      )
      .sort((a, b) => a.walk - b.walk),
  )
}

/** Bounds kept at a time, each in the place of its key's last bits: a power of 2. */
const MOST_KEPT = 2 ** 14

/**
 * A lower bound on what the bends of a set still cost before a given orientation is reached, packed.
 *
 * Tests that look at made bends are dropped. What stays is exact: a bend needs an orientation that is
 * ever open to it, each has its fixed cost there, the walk over the orientations used is at least the
 * cheapest one, and some bends must be gauged on a formed face. Admissible because every sequence pays
 * at least that; consistent because one bend fewer never costs more than its own cost and move: a bend
 * that finds its edge flat is at odds with none of the set, and one that leaves its least fixed cost
 * pays more for it than all faces together.
 */
export const createLowerBound = (ground: FoldGround, cost: OperationCost) => {
  const kept = Math.min(MOST_KEPT, 2 ** (ground.piece.bends.length + 2))
  // Made when a bound is first asked for: a piece that cannot be bent needs none.
  let tables:
    | {
        readonly ends: readonly (readonly Choice[])[]
        /** One up, so that a fresh array means none. */
        readonly keys: Int32Array
        readonly bounds: Float64Array
      }
    | undefined

  const boundOf = (choices: readonly Choice[], bits: number): number => {
    let best = Infinity
    for (const { walk, sums, onA, onB } of choices) {
      if (walk >= best) break
      let sum = walk
      for (let chunk = 0; chunk < sums.length; chunk++) {
        sum += sums[chunk]?.[(bits >>> (chunk * CHUNK)) & (CHUNK_SETS - 1)] ?? NaN
      }
      if (sum < best) sum += leastFaces(bits & onA, bits & onB)
      if (sum < best) best = sum
    }
    return best
  }

  return (bits: number, end: number): number => {
    tables ??= {
      ends: choicesByEnd(ground, cost),
      keys: new Int32Array(kept),
      bounds: new Float64Array(kept),
    }
    const key = bits * 4 + end
    const place = key & (kept - 1)
    if (tables.keys[place] === key + 1) return tables.bounds[place] ?? NaN
    const bound = boundOf(tables.ends[end] ?? [], bits)
    tables.keys[place] = key + 1
    tables.bounds[place] = bound
    return bound
  }
}
