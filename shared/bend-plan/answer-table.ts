/** Yes, no or not yet asked, by number. */
export interface AnswerTable {
  readonly find: (key: number) => boolean | undefined
  readonly set: (key: number, answer: boolean) => void
}

/** Above this, asked keys are far fewer than possible ones and a map takes less room. */
const LARGEST_ARRAY = 2 ** 22

/** A table for keys from 0 below `size`, filled as questions come. */
export const createAnswerTable = (size: number): AnswerTable => {
  if (size > LARGEST_ARRAY) {
    const known = new Map<number, boolean>()
    return {
      find: (key) => known.get(key),
      set: (key, answer) => {
        known.set(key, answer)
      },
    }
  }
  // Two bits an answer: 0 not asked, 1 yes, 2 no. Small tables spare the collector of garbage.
  let answers: Uint32Array | undefined
  return {
    find: (key) => {
      if (answers === undefined) return undefined
      const answer = ((answers[key >>> 4] ?? 0) >>> (2 * (key & 15))) & 3
      return answer === 0 ? undefined : answer === 1
    },
    set: (key, answer) => {
      answers ??= new Uint32Array(Math.ceil(size / 16))
      const shift = 2 * (key & 15)
      const word = answers[key >>> 4] ?? 0
      answers[key >>> 4] = (word & ~(3 << shift)) | ((answer ? 1 : 2) << shift)
    },
  }
}
