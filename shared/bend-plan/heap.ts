/** A binary heap of numbered entries: smallest key first, among equal keys the smallest number. */
export interface Heap {
  readonly push: (entry: number, key: number) => void
  readonly pop: () => number | undefined
  readonly leastKey: () => number | undefined
}

const FIRST_ROOM = 256

export const createHeap = (): Heap => {
  let entries = new Int32Array(FIRST_ROOM)
  let keys = new Float64Array(FIRST_ROOM)
  let count = 0

  const grow = () => {
    const [moreEntries, moreKeys] = [new Int32Array(2 * count), new Float64Array(2 * count)]
    moreEntries.set(entries)
    moreKeys.set(keys)
    entries = moreEntries
    keys = moreKeys
  }
  const isBefore = (entry: number, key: number, place: number): boolean => {
    const other = keys[place] ?? Infinity
    return key < other || (key === other && entry < (entries[place] ?? Infinity))
  }
  const put = (place: number, entry: number, key: number) => {
    entries[place] = entry
    keys[place] = key
  }
  const move = (from: number, to: number) => {
    put(to, entries[from] ?? NaN, keys[from] ?? NaN)
  }

  return {
    push: (entry, key) => {
      if (count === entries.length) grow()
      let at = count++
      while (at > 0) {
        const parent = (at - 1) >> 1
        if (!isBefore(entry, key, parent)) break
        move(parent, at)
        at = parent
      }
      put(at, entry, key)
    },
    pop: () => {
      if (count === 0) return undefined
      const top = entries[0]
      count--
      const entry = entries[count] ?? NaN
      const key = keys[count] ?? NaN
      let at = 0
      for (let child = 1; child < count; child = 2 * at + 1) {
        const other = child + 1
        const least =
          other < count && isBefore(entries[other] ?? NaN, keys[other] ?? NaN, child)
            ? other
            : child
        if (isBefore(entry, key, least)) break
        move(least, at)
        at = least
      }
      put(at, entry, key)
      return top
    },
    leastKey: () => (count === 0 ? undefined : keys[0]),
  }
}
