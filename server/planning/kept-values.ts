/** Keeps the values asked for last, up to `most` of them. */
export class KeptValues<Value extends object> {
  readonly #values = new Map<string, Value>()

  constructor(private readonly most: number) {}

  find(key: string): Value | undefined {
    const value = this.#values.get(key)
    if (value !== undefined) this.keep(key, value)
    return value
  }

  keep(key: string, value: Value): void {
    // A Map walks in the order of insertion: what is asked for moves to the end.
    this.#values.delete(key)
    this.#values.set(key, value)
    if (this.#values.size <= this.most) return
    for (const oldest of this.#values.keys()) {
      this.#values.delete(oldest)
      break
    }
  }
}
