/** One line of a report: how long a thing takes, by percentiles. */
export interface BenchRow {
  readonly name: string
  readonly unit: string
  readonly p50: number
  readonly p95: number
  readonly p99: number
  readonly note?: string
}

export interface Percentiles {
  readonly p50: number
  readonly p95: number
  readonly p99: number
}

/** Nearest-rank percentiles. Throws RangeError where there is nothing to rank. */
export const percentiles = (values: readonly number[]): Percentiles => {
  const sorted = values.toSorted((a, b) => a - b)
  const rank = (percent: number): number => {
    const value = sorted[Math.max(0, Math.ceil((percent / 100) * sorted.length) - 1)]
    if (value === undefined) throw new RangeError('There is nothing to rank.')
    return value
  }
  return { p50: rank(50), p95: rank(95), p99: rank(99) }
}

/** Runs before the clock is read, so that the compiler has seen the code. */
const WARM_UP = 200

/** Milliseconds that `run` takes, called `times` times after a warm-up. */
export const sample = (run: (index: number) => unknown, times: number): Percentiles => {
  for (let index = 0; index < Math.min(WARM_UP, times); index += 1) run(index)
  const took: number[] = []
  for (let index = 0; index < times; index += 1) {
    const start = performance.now()
    run(index)
    took.push(performance.now() - start)
  }
  return percentiles(took)
}

/** The same for work that is awaited, one call after another. */
export const sampleAsync = async (
  run: (index: number) => Promise<unknown>,
  times: number,
): Promise<Percentiles> => {
  for (let index = 0; index < Math.min(WARM_UP, times); index += 1) await run(index)
  const took: number[] = []
  for (let index = 0; index < times; index += 1) {
    const start = performance.now()
    await run(index)
    took.push(performance.now() - start)
  }
  return percentiles(took)
}
