import type { PieceState } from '#shared/pieces/piece-state'

/** What was done to a piece that is in a state: "was … by Wren". */
export const DONE: Record<PieceState, string> = {
  queued: 'put into the queue',
  bent: 'marked bent',
  bundled: 'bundled',
  pickedUp: 'handed over',
  scrapped: 'scrapped',
  withdrawn: 'withdrawn',
}

/** What a piece in a state is: "it is … now". */
export const IS: Record<PieceState, string> = {
  queued: 'queued',
  bent: 'bent',
  bundled: 'bundled',
  pickedUp: 'picked up',
  scrapped: 'scrapped',
  withdrawn: 'withdrawn',
}

/** `13:42 UTC on 2026-03-09`: the server does not know the reader's time zone or language. */
export const momentWords = (at: Date): string => {
  const text = at.toISOString()
  return `${text.slice(11, 16)} UTC on ${text.slice(0, 10)}`
}
