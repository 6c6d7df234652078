import { ConfigError } from '#server/config'

/** A setting that is missing is told in words, without a stack. */
export function exitOnConfigError<T>(read: () => T): T {
  try {
    return read()
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error
    process.stderr.write(`${error.message}\n`)
    process.exit(1)
  }
}
