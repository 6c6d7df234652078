import { liveEventSchema, type LiveEvent } from '#shared/live/live'
import type { ApiAgent } from './api-agent'

export interface ReceivedEvent {
  readonly name: string
  readonly id: number
  readonly data: unknown
}

/** An open GET /api/live, read event by event; comments (heartbeats) are passed over. */
export class LiveStream {
  private text = ''
  private readonly decoder = new TextDecoder()

  private constructor(
    readonly headers: Headers,
    private readonly reader: ReadableStreamDefaultReader<Uint8Array>,
    private readonly abort: AbortController,
  ) {}

  static async open(agent: ApiAgent, lastEventId?: string): Promise<LiveStream> {
    const abort = new AbortController()
    const headers = new Headers(lastEventId === undefined ? {} : { 'last-event-id': lastEventId })
    const response = await agent.fetch('/live', { headers, signal: abort.signal })
    if (response.status !== 200 || !response.body) {
      throw new Error(`The stream was refused: ${response.status}.`)
    }
    return new LiveStream(response.headers, response.body.getReader(), abort)
  }

  /** The next event, or null when the server has ended the stream. */
  async next(): Promise<ReceivedEvent | null> {
    for (;;) {
      const end = this.text.indexOf('\n\n')
      if (end < 0) {
        const { done, value } = await this.reader.read()
        if (done) return null
        this.text += this.decoder.decode(value, { stream: true })
        continue
      }
      const event = parseEvent(this.text.slice(0, end))
      this.text = this.text.slice(end + 2)
      if (event) return event
    }
  }

  /** The next change, which must be one. */
  async nextChange(): Promise<LiveEvent> {
    const event = await this.next()
    if (event?.name !== 'message') throw new Error(`No change but ${JSON.stringify(event)}.`)
    return liveEventSchema.parse(event.data)
  }

  /** Leaves, as a closed page does. */
  close(): void {
    this.abort.abort()
  }
}

function parseEvent(block: string): ReceivedEvent | null {
  const fields = new Map(
    block.split('\n').map((line): [string, string] => {
      const colon = line.indexOf(':')
      return [line.slice(0, colon), line.slice(colon + 1).trim()]
    }),
  )
  const data = fields.get('data')
  if (data === undefined) return null
  return {
    name: fields.get('event') ?? 'message',
    id: Number(fields.get('id')),
    data: JSON.parse(data),
  }
}
