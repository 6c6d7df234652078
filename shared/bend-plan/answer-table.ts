/** Yes, no or not yet asked, by number. */
export interface AnswerTable {
  readonly find: (key: number) => boolean | undefined
  readonly set: (key: number, answer: boolean) => void
}

/** Above this, asked keys are far fewer than possible ones and a map takes less room. */
const LARGEST_ARRAY = 2 ** 21

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
  let answers: Uint8Array | undefined
  return {
    find: (key) => {
      const answer = answers?.[key] ?? 0
      return answer === 0 ? undefined : answer === 1
    },
    set: (key, answer) => {
      answers ??= new Uint8Array(size)
      answers[key] = answer ? 1 : 2
    },
  }
}
