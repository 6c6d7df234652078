import { createServer } from 'node:net'
import { LaunchError } from '../base/launch-error.mjs'

/**
 * @param {number} port
 * @param {string} host
 * @returns {Promise<boolean>}
 */
export const isPortFree = (port, host) =>
  new Promise((resolve, reject) => {
    const probe = createServer()
    probe.once('error', (error) => {
      const code = 'code' in error ? error.code : undefined
      if (code === 'EADDRINUSE') resolve(false)
      else if (code === 'EACCES') {
        reject(new LaunchError(`Port ${port} needs rights that this account does not have.`))
      } else reject(new LaunchError(`Cannot listen on ${host}, port ${port}: ${error.message}`))
    })
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)))
  })

/**
 * @param {number} first
 * @param {number} count
 * @param {string} host
 * @returns {Promise<number | undefined>} the first free port of `first` to `first + count - 1`
 */
export const findFreePort = async (first, count, host) => {
  for (let port = first; port < first + count; port += 1) {
    if (await isPortFree(port, host)) return port
  }
  return undefined
}

/**
 * @param {string} text the PORT variable
 * @returns {number} 1 to 65535
 */
export const parsePort = (text) => {
  const port = /^\d{1,5}$/.test(text) ? Number(text) : 0
  if (port < 1 || port > 65535) {
    throw new LaunchError(`PORT is "${text}": give a whole number from 1 to 65535.`)
  }
  return port
}
