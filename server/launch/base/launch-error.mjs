/** A failure that the person at the terminal can act on: its message is shown without a stack. */
export class LaunchError extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message)
    this.name = 'LaunchError'
  }
}
