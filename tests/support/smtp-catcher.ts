import { once } from 'node:events'
import type { AddressInfo } from 'node:net'
import { SMTPServer } from 'smtp-server'

export interface SmtpCatcher {
  readonly url: string
  /** Whole messages as they came through the wire. */
  readonly messages: string[]
  /** What the server says to the next recipients; null: it takes them. */
  refuseWith: { readonly code: number; readonly text: string } | null
  readonly close: () => Promise<void>
}

class SmtpRefusal extends Error {
  constructor(
    message: string,
    readonly responseCode: number,
  ) {
    super(message)
  }
}

/** A mail server on this machine that keeps what it is given. */
export async function startSmtpCatcher(): Promise<SmtpCatcher> {
  const messages: string[] = []
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onRcptTo: (_address, _session, done) => {
      const refusal = catcher.refuseWith
      done(refusal ? new SmtpRefusal(refusal.text, refusal.code) : null)
    },
    onData: (stream, _session, done) => {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.on('end', () => {
        messages.push(Buffer.concat(chunks).toString('utf8'))
        done()
      })
    },
  })
  server.listen(0, '127.0.0.1')
  await once(server.server, 'listening')
  const address = server.server.address() as AddressInfo
  const catcher: SmtpCatcher = {
    url: `smtp://127.0.0.1:${address.port}`,
    messages,
    refuseWith: null,
    close: () => new Promise((resolve) => server.close(resolve)),
  }
  return catcher
}
