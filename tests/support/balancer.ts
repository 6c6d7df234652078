import { createServer, request, type IncomingMessage, type ServerResponse } from 'node:http'

export interface Balancer {
  readonly url: string
  /** How many requests each server has got, in the order of the servers. */
  readonly counts: () => readonly number[]
  readonly close: () => Promise<void>
}

/** Passes request after request to the next server in turn, as a balancer without memory does. */
export async function startBalancer(servers: readonly string[]): Promise<Balancer> {
  const counts = servers.map(() => 0)
  let turn = 0

  const pass = (incoming: IncomingMessage, outgoing: ServerResponse) => {
    const index = turn
    turn = (turn + 1) % servers.length
    counts[index] = (counts[index] ?? 0) + 1
    const { method, headers, url } = incoming
    const passed = request(new URL(url ?? '/', servers[index]), { method, headers }, (answer) => {
      outgoing.writeHead(answer.statusCode ?? 502, answer.headers)
      outgoing.flushHeaders()
      answer.pipe(outgoing)
    })
    passed.on('error', () => outgoing.destroy())
    outgoing.on('close', () => passed.destroy())
    incoming.pipe(passed)
  }

  const server = createServer(pass)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('It listens on no port.')
  return {
    url: `http://127.0.0.1:${address.port}`,
    counts: () => counts,
    close: () =>
      new Promise((resolve, reject) => {
        server.close((error) => (error ? reject(error) : resolve()))
        server.closeAllConnections()
      }),
  }
}
