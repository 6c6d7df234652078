import type { Request, Response } from 'express'
import { createEventBuffer, createSession, type Session } from 'better-sse'
import type { Db } from '#server/db/knex'
import { notSignedIn } from '#server/http/errors'
import { findLatestEventId, listEventsSince, type CatchUp } from '#server/live/live-events.queries'
import { LiveListener } from '#server/live/live-listener'
import type { LiveMessage, PersonalMessage } from '#server/live/live-message'
import { listOpenSessions } from '#server/live/open-sessions.queries'
import { mayFollow, type Viewer } from '#server/live/may-follow'
import type { LiveEvent } from '#shared/live/live'

const SESSION_CHECK_MS = 5_000
const HEARTBEAT_MS = 15_000
/** A client that does not read is let go; it catches up when it comes back. */
const MOST_UNREAD_BYTES = 1_000_000

interface Stream {
  readonly sse: Session
  readonly response: Response
  readonly sid: string
  readonly personId: string
  viewer: Viewer
}

export interface LiveHubOptions {
  readonly db: Db
  readonly databaseUrl: string
  readonly onError: (message: string, error: unknown) => void
}

/**
 * The event streams of this process. Events: `message` (a LiveEvent), `ready` (first connection:
 * only the id to catch up from), `reset` (too much was missed: read everything anew) and `plan` (a
 * LivePlan, for one person, without an id since it is not kept).
 */
export class LiveHub {
  private readonly streams = new Set<Stream>()
  private readonly listener: LiveListener
  /** 0 before the first message: a connection lost then means a reset. */
  private lastSeenId = 0
  private timer: NodeJS.Timeout | undefined

  constructor(private readonly options: LiveHubOptions) {
    this.listener = new LiveListener({
      databaseUrl: options.databaseUrl,
      onMessage: (message) =>
        'personId' in message ? this.tellPerson(message) : this.receive(message),
      onReconnect: () => this.catchUpAll(),
      onError: options.onError,
    })
  }

  async start(): Promise<void> {
    await this.listener.start()
    this.timer = setInterval(() => this.checkSessionsNow(), SESSION_CHECK_MS)
    this.timer.unref()
  }

  async stop(): Promise<void> {
    clearInterval(this.timer)
    for (const { response } of this.streams) response.end()
    await this.listener.stop()
  }

  /** Answers the request with a stream, beginning with what happened after `lastSeenId`. */
  async follow(request: Request, response: Response, lastSeenId?: number): Promise<void> {
    const { user: person, sessionID: sid } = request
    if (!person) throw notSignedIn()
    const sse = await createSession(request, response, { keepAlive: HEARTBEAT_MS })
    const stream: Stream = { sse, response, sid, personId: person.id, viewer: person }
    this.streams.add(stream)
    sse.once('disconnected', () => this.streams.delete(stream))
    try {
      if (lastSeenId === undefined) {
        push(stream, {}, 'ready', await findLatestEventId(this.options.db))
      } else {
        await this.replay([stream], await listEventsSince(this.options.db, lastSeenId))
      }
    } catch (error) {
      this.options.onError('a live stream could not catch up', error)
      response.end()
    }
  }

  /** Ends the streams whose session is over, and follows a change of role or company. */
  async checkSessions(): Promise<void> {
    if (this.streams.size === 0) return
    const sids = [...this.streams].map(({ sid }) => sid)
    const viewers = await listOpenSessions(this.options.db, sids)
    for (const stream of this.streams) {
      const viewer = viewers.get(stream.sid)
      if (viewer) stream.viewer = viewer
      // A stream that began after the question was asked is judged the next time.
      else if (sids.includes(stream.sid)) stream.response.end()
    }
  }

  private checkSessionsNow(): void {
    this.checkSessions().catch((error: unknown) =>
      this.options.onError('the sessions of live streams could not be checked', error),
    )
  }

  private receive(message: LiveMessage): void {
    this.lastSeenId = Math.max(this.lastSeenId, message.id)
    this.tell(this.streams, message)
    if (message.topic === 'people') this.checkSessionsNow()
  }

  private async catchUpAll(): Promise<void> {
    const missed = await listEventsSince(this.options.db, this.lastSeenId)
    await this.replay(this.streams, missed)
  }

  private async replay(streams: Iterable<Stream>, missed: CatchUp): Promise<void> {
    if (missed.kind === 'events') {
      for (const message of missed.events) this.tell(streams, message)
      this.lastSeenId = Math.max(this.lastSeenId, missed.events.at(-1)?.id ?? 0)
      return
    }
    const latest = await findLatestEventId(this.options.db)
    this.lastSeenId = Math.max(this.lastSeenId, latest)
    for (const stream of streams) push(stream, {}, 'reset', latest)
  }

  private tellPerson({ personId, plan }: PersonalMessage): void {
    for (const stream of this.streams) {
      if (stream.personId === personId) pushUnkept(stream, plan, 'plan', this.options.onError)
    }
  }

  private tell(streams: Iterable<Stream>, { id, topic, entityId, ...message }: LiveMessage): void {
    const event: LiveEvent = { topic, entityId }
    for (const stream of streams) {
      if (mayFollow(stream.viewer, message)) push(stream, event, 'message', id)
    }
  }
}

/** An event without an id: where the client catches up from stays as it was. */
function pushUnkept(
  { sse, response }: Stream,
  data: object,
  name: string,
  onError: LiveHubOptions['onError'],
): void {
  if (!sse.isConnected || response.writableLength > MOST_UNREAD_BYTES) return
  sse
    .batch(createEventBuffer().event(name).data(data).dispatch())
    .catch((error: unknown) => onError('a live event could not be sent', error))
}

function push({ sse, response }: Stream, data: object, name: string, id: number): void {
  if (!sse.isConnected) return
  if (response.writableLength > MOST_UNREAD_BYTES) response.destroy()
  else sse.push(data, name, String(id))
}
