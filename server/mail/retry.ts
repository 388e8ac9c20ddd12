export { DEAD_AFTER_HOURS, RETRY_AFTER_SECONDS, isRefusedForGood }

/** A mail that could not be sent for this long is given up. */
const DEAD_AFTER_HOURS = 24

/** Seconds from one attempt to the next: 1 minute, then four times as long each time, 6 hours at most and from then on. */
const RETRY_AFTER_SECONDS = [60, 240, 960, 3_840, 15_360, 21_600]

/**
 * Whether the receiving server refused this very mail for good (RFC 5321, 4.2.1: a 5yz reply to the recipient or the
 * text). A 5yz to signing in or to the sender means that our settings are wrong, which someone will put right.
 */
function isRefusedForGood(error: unknown): boolean {
  const { responseCode, command } = (error ?? {}) as { responseCode?: unknown; command?: unknown }
  return typeof responseCode === 'number' && responseCode >= 500 && (command === 'RCPT TO' || command === 'DATA')
}
