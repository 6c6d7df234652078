import type { Response } from 'express'

/** The connection closed before the answer was out: nobody is left to be answered. */
export class AskerGone extends Error {
  constructor() {
    super('Who asked has gone before the answer.')
    this.name = 'AskerGone'
  }
}

/** Aborts with `AskerGone` when the connection closes before this answer is out. */
export function signalOfAsker(response: Response): AbortSignal {
  const leaving = new AbortController()
  response.once('close', () => {
    if (!response.writableFinished) leaving.abort(new AskerGone())
  })
  return leaving.signal
}
