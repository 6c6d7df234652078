import { LaunchError } from '../base/launch-error.mjs'
import { findFreePort, isPortFree, parsePort } from '../process/ports.mjs'

const DEFAULT_PORT = 4310
const PORTS_TRIED = 50

/**
 * Where the product listens: HOST (loopback when not set) and PORT. A port that somebody asked for
 * is used or refused; the default one gives way to the next free one.
 * @param {(line: string) => void} note
 * @returns {Promise<{ host: string, port: number, origin: string, probe: string }>} `origin` is
 *   for people, `probe` the same server for this process, which may not resolve names
 */
export const chooseAddress = async (note) => {
  const host = process.env.HOST || '127.0.0.1'
  const port = await choosePort(host, note)
  const everywhere = ['0.0.0.0', '::'].includes(host)
  const name = everywhere || ['127.0.0.1', '::1'].includes(host) ? 'localhost' : bracketed(host)
  const near = everywhere ? '127.0.0.1' : bracketed(host)
  return { host, port, origin: `http://${name}:${port}`, probe: `http://${near}:${port}` }
}

/**
 * @param {string} host
 * @returns {string} as it stands in an address
 */
const bracketed = (host) => (host.includes(':') ? `[${host}]` : host)

/**
 * @param {string} host
 * @param {(line: string) => void} note
 */
const choosePort = async (host, note) => {
  if (process.env.PORT) {
    const port = parsePort(process.env.PORT)
    if (await isPortFree(port, host)) return port
    throw new LaunchError(
      `Port ${port} (from PORT) is in use. Stop what uses it, or set another PORT.`,
    )
  }
  const port = await findFreePort(DEFAULT_PORT, PORTS_TRIED, host)
  if (port === undefined) {
    throw new LaunchError(`No free port from ${DEFAULT_PORT} on. Set PORT to a free one.`)
  }
  if (port !== DEFAULT_PORT) note(`${DEFAULT_PORT} is in use, taking ${port}`)
  return port
}
