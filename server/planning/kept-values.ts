/** Keeps the values asked for last, up to `most` of them. */
export class KeptValues<Value extends object> {
  readonly #values = new Map<string, Value>()

  constructor(private readonly most: number) {}

  getOrMake(key: string, make: () => Value): Value {
    const value = this.#values.get(key) ?? make()
    // A Map walks in the order of insertion: what is asked for moves to the end.
    this.#values.delete(key)
    this.#values.set(key, value)
    if (this.#values.size > this.most) {
      for (const oldest of this.#values.keys()) {
        this.#values.delete(oldest)
        break
      }
    }
    return value
  }
}
