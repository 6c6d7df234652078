/** Non-negative integers by number; undefined where none was set. */
export interface NumberTable {
  readonly find: (key: number) => number | undefined
  readonly set: (key: number, value: number) => void
}

/** Above this, set keys are far fewer than possible ones and a map takes less room. */
const LARGEST_ARRAY = 2 ** 22

export const createNumberTable = (size: number): NumberTable => {
  if (size > LARGEST_ARRAY) {
    const known = new Map<number, number>()
    return {
      find: (key) => known.get(key),
      set: (key, value) => {
        known.set(key, value)
      },
    }
  }
  // Stored one up, so that a fresh array means nothing set.
  const values = new Int32Array(size)
  return {
    find: (key) => {
      const value = values[key] ?? 0
      return value === 0 ? undefined : value - 1
    },
    set: (key, value) => {
      values[key] = value + 1
    },
  }
}
