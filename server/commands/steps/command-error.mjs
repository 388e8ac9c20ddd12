export { CommandError }

/**
 * Something that a person can put right: `message` says what is wrong, `advice` what to do, `detail` what a
 * tool printed.
 */
class CommandError extends Error {
  /**
   * @param {string} message
   * @param {{ advice?: string, detail?: string, exitCode?: number, cause?: unknown }} [more]
   */
  constructor(message, more = {}) {
    super(message, { cause: more.cause })
    this.name = 'CommandError'
    this.advice = more.advice ?? ''
    this.detail = more.detail ?? ''
    this.exitCode = more.exitCode ?? 1
  }
}
