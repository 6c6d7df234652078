import { createServer } from 'node:net'
import { describe, expect, it, onTestFinished } from 'vitest'
import { findFreePort, isPortFree, parsePort } from '../../../server/launch/process/ports.mjs'

const HOST = '127.0.0.1'

const busyPort = () =>
  new Promise<number>((resolve, reject) => {
    const server = createServer()
    onTestFinished(() => {
      server.close()
    })
    server.listen(0, HOST, () => {
      const address = server.address()
      if (address === null || typeof address === 'string') reject(new Error('no port'))
      else resolve(address.port)
    })
  })

describe('ports', () => {
  it('are read from text', () => {
    expect(parsePort('4310')).toBe(4310)
    expect(parsePort('65535')).toBe(65535)
  })

  it.each(['0', '65536', '-1', '43.1', 'http', '4310 ', '123456'])('are not %j', (text) => {
    expect(() => parsePort(text)).toThrow(`PORT is "${text}"`)
  })

  it('in use are passed over', async () => {
    const port = await busyPort()
    expect(await isPortFree(port, HOST)).toBe(false)
    expect(await findFreePort(port, 1, HOST)).toBeUndefined()
    expect(await findFreePort(port, 20, HOST)).toBeGreaterThan(port)
  })
})
