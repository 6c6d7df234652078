/** One fold put into the queue of a search: its state, and the entry of the fold made after it. */
export interface SearchEntry {
  /** The bends made before the fold. */
  readonly made: number
  readonly bend: number
  readonly orientation: number
  /** Packed cost from this fold to the end. */
  readonly cost: number
  /** -1 for the last fold. */
  readonly next: number
}

const FIRST_ROOM = 256

/** Entries by number, kept as rows of numbers: a search puts hundreds of thousands of them away. */
export interface SearchEntries {
  readonly count: () => number
  /** Answers with the number of the entry. */
  readonly add: (
    made: number,
    bend: number,
    orientation: number,
    cost: number,
    next: number,
  ) => number
  /** Throws RangeError where there is no such entry. */
  readonly get: (entry: number) => SearchEntry
}

export const createSearchEntries = (): SearchEntries => {
  let mades = new Int32Array(FIRST_ROOM)
  /** Bend and orientation. */
  let folds = new Uint8Array(FIRST_ROOM)
  let costs = new Float64Array(FIRST_ROOM)
  let nexts = new Int32Array(FIRST_ROOM)
  let count = 0

  const grow = () => {
    const room = 2 * count
    const more = {
      mades: new Int32Array(room),
      folds: new Uint8Array(room),
      costs: new Float64Array(room),
      nexts: new Int32Array(room),
    }
    more.mades.set(mades)
    more.folds.set(folds)
    more.costs.set(costs)
    more.nexts.set(nexts)
    ;({ mades, folds, costs, nexts } = more)
  }

  return {
    count: () => count,
    add: (made, bend, orientation, cost, next) => {
      if (count === mades.length) grow()
      mades[count] = made
      folds[count] = bend * 4 + orientation
      costs[count] = cost
      nexts[count] = next
      return count++
    },
    get: (entry) => {
      if (!(entry >= 0 && entry < count)) throw new RangeError(`No entry ${entry}.`)
      const fold = folds[entry] ?? NaN
      return {
        made: mades[entry] ?? NaN,
        bend: fold >> 2,
        orientation: fold & 3,
        cost: costs[entry] ?? NaN,
        next: nexts[entry] ?? NaN,
      }
    },
  }
}
