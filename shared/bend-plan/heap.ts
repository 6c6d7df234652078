/** A binary heap of numbered entries: smallest key first, among equal keys the smallest number. */
export interface Heap {
  readonly push: (entry: number, key: number) => void
  readonly pop: () => number | undefined
  readonly leastKey: () => number | undefined
}

export const createHeap = (): Heap => {
  const entries: number[] = []
  const keys: number[] = []

  const isBefore = (a: number, b: number): boolean => {
    const difference = (keys[a] ?? Infinity) - (keys[b] ?? Infinity)
    return difference === 0 ? (entries[a] ?? Infinity) < (entries[b] ?? Infinity) : difference < 0
  }
  const swap = (a: number, b: number) => {
    const [entryA, entryB, keyA, keyB] = [entries[a], entries[b], keys[a], keys[b]]
    if (entryA === undefined || entryB === undefined || keyA === undefined || keyB === undefined) {
      throw new RangeError('Heap places out of range.')
    }
    entries[a] = entryB
    entries[b] = entryA
    keys[a] = keyB
    keys[b] = keyA
  }

  return {
    push: (entry, key) => {
      let at = entries.length
      entries.push(entry)
      keys.push(key)
      while (at > 0) {
        const parent = (at - 1) >> 1
        if (!isBefore(at, parent)) break
        swap(at, parent)
        at = parent
      }
    },
    pop: () => {
      const top = entries[0]
      if (top === undefined) return undefined
      const last = entries.length - 1
      if (last > 0) swap(0, last)
      entries.pop()
      keys.pop()
      for (let at = 0; ;) {
        let least = at
        for (const child of [2 * at + 1, 2 * at + 2]) {
          if (child < entries.length && isBefore(child, least)) least = child
        }
        if (least === at) return top
        swap(at, least)
        at = least
      }
    },
    leastKey: () => keys[0],
  }
}
