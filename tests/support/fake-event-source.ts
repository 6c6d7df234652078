import { vi } from 'vitest'

/** A source of live events that a test opens, feeds and breaks. */
export class FakeEventSource extends EventTarget {
  static readonly CONNECTING = 0
  static readonly OPEN = 1
  static readonly CLOSED = 2
  static all: FakeEventSource[] = []

  readyState = FakeEventSource.CONNECTING
  onopen: (() => void) | null = null
  onerror: (() => void) | null = null
  onmessage: ((message: MessageEvent) => void) | null = null

  constructor(readonly url: string) {
    super()
    FakeEventSource.all.push(this)
  }

  open(): void {
    this.readyState = FakeEventSource.OPEN
    this.onopen?.()
  }

  send(data: unknown): void {
    this.onmessage?.(new MessageEvent('message', { data: JSON.stringify(data) }))
  }

  reset(): void {
    this.dispatchEvent(new MessageEvent('reset', { data: '' }))
  }

  /** The connection broke; the browser tries again by itself unless it was refused. */
  fail({ refused }: { refused: boolean }): void {
    this.readyState = refused ? FakeEventSource.CLOSED : FakeEventSource.CONNECTING
    this.onerror?.()
  }

  close(): void {
    this.readyState = FakeEventSource.CLOSED
  }
}

export function fakeEventSource() {
  FakeEventSource.all = []
  vi.stubGlobal('EventSource', FakeEventSource)
  return {
    all: () => FakeEventSource.all,
    last: () => {
      const source = FakeEventSource.all.at(-1)
      if (!source) throw new Error('No source of live events has been opened.')
      return source
    },
  }
}
