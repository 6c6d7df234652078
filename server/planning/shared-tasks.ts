/** Somebody who waits for a task. */
export interface Asker {
  /** Ends the wait of this asker alone. */
  readonly signal?: AbortSignal
  readonly onNodes?: (nodes: number) => void
}

interface SharedTask<Value> {
  readonly value: Promise<Value>
  readonly askers: Set<Asker>
  readonly ending: AbortController
}

/** What begins a task: ends with the signal, reports to everyone who waits. */
type Start<Value> = (signal: AbortSignal, onNodes: (nodes: number) => void) => Promise<Value>

/** Does once what several ask for at the same time; gives it up when the last one has gone. */
export class SharedTasks<Value> {
  private readonly tasks = new Map<string, SharedTask<Value>>()

  /** Waits for the task under way, or for the one that `start` begins. Throws the signal's reason. */
  async join(key: string, asker: Asker, start: Start<Value>): Promise<Value> {
    asker.signal?.throwIfAborted()
    const task = this.tasks.get(key) ?? this.begin(key, start)
    task.askers.add(asker)
    const { signal } = asker
    if (!signal) return task.value
    return new Promise((resolve, reject) => {
      const goAway = () => {
        task.askers.delete(asker)
        if (task.askers.size === 0) this.giveUp(key, task)
        reject(reasonOf(signal))
      }
      signal.addEventListener('abort', goAway, { once: true })
      task.value
        .finally(() => signal.removeEventListener('abort', goAway))
        .then(resolve, (error: unknown) => reject(asError(error)))
    })
  }

  private begin(key: string, start: Start<Value>): SharedTask<Value> {
    const askers = new Set<Asker>()
    const ending = new AbortController()
    const tellAll = (nodes: number) => {
      for (const { onNodes } of askers) onNodes?.(nodes)
    }
    const value = start(ending.signal, tellAll).finally(() => this.forget(key, task))
    const task: SharedTask<Value> = { value, askers, ending }
    this.tasks.set(key, task)
    return task
  }

  private giveUp(key: string, task: SharedTask<Value>): void {
    this.forget(key, task)
    task.ending.abort()
  }

  /** Whoever asks from now on begins anew. */
  private forget(key: string, task: SharedTask<Value>): void {
    if (this.tasks.get(key) === task) this.tasks.delete(key)
  }
}

const asError = (reason: unknown): Error =>
  reason instanceof Error ? reason : new Error('A shared task failed.', { cause: reason })

const reasonOf = (signal: AbortSignal): Error => asError(signal.reason)
