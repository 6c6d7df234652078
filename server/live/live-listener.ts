import { setTimeout as delay } from 'node:timers/promises'
import pg from 'pg'
import {
  channelMessageSchema,
  LIVE_CHANNEL,
  type LiveMessage,
  type PersonalMessage,
} from '#server/live/live-message'

const FIRST_RETRY_MS = 100
const LONGEST_RETRY_MS = 5_000

export interface LiveListenerOptions {
  readonly databaseUrl: string
  readonly onMessage: (message: LiveMessage | PersonalMessage) => void
  /** Called after the connection was lost and made again: messages may have been missed. */
  readonly onReconnect: () => Promise<void>
  readonly onError: (message: string, error: unknown) => void
}

/** The one connection of this process that listens to PostgreSQL; it comes back when it is lost. */
export class LiveListener {
  private client: pg.Client | undefined
  private readonly stopping = new AbortController()

  constructor(private readonly options: LiveListenerOptions) {}

  /** Resolves when listening, or when the first try failed and others will follow. */
  async start(): Promise<void> {
    try {
      this.client = await this.connect()
    } catch (error) {
      this.options.onError('live connection not made yet', error)
      void this.reconnect()
    }
  }

  async stop(): Promise<void> {
    this.stopping.abort()
    await this.client?.end()
  }

  private async connect(): Promise<pg.Client> {
    const client = new pg.Client({
      connectionString: this.options.databaseUrl,
      application_name: 'foldyard live',
      keepAlive: true,
      connectionTimeoutMillis: 10_000,
    })
    client.on('notification', ({ payload }) => this.receive(payload))
    client.on('error', (error) => this.options.onError('live connection failed', error))
    try {
      await client.connect()
      await client.query(`listen ${LIVE_CHANNEL}`)
    } catch (error) {
      await client.end()
      throw error
    }
    client.once('end', () => void this.reconnect())
    return client
  }

  private async reconnect(): Promise<void> {
    let wait = FIRST_RETRY_MS
    while (await this.waitUnlessStopping(wait)) {
      try {
        this.client = await this.connect()
        break
      } catch (error) {
        this.options.onError('live connection not made again yet', error)
        wait = Math.min(2 * wait, LONGEST_RETRY_MS)
      }
    }
    if (this.stopping.signal.aborted) await this.client?.end()
    else await this.catchUp()
  }

  private async catchUp(): Promise<void> {
    try {
      await this.options.onReconnect()
    } catch (error) {
      this.options.onError('what was missed could not be read', error)
      // Its end begins the next reconnection.
      await this.client?.end()
    }
  }

  /** False as soon as this listener stops. */
  private async waitUnlessStopping(milliseconds: number): Promise<boolean> {
    const { signal } = this.stopping
    try {
      await delay(milliseconds, undefined, { signal })
    } catch (error) {
      if (!signal.aborted) throw error
    }
    return !signal.aborted
  }

  private receive(payload: string | undefined): void {
    try {
      this.options.onMessage(channelMessageSchema.parse(JSON.parse(payload ?? '')))
    } catch (error) {
      this.options.onError('a live message could not be read', error)
    }
  }
}
