import { describe, expect, it } from 'vitest'
import { DEAD_AFTER_HOURS, RETRY_AFTER_SECONDS, isRefusedForGood } from './retry.ts'

describe('when a mail cannot be sent', () => {
  it('waits a minute, then longer each time, six hours at most', () => {
    expect(RETRY_AFTER_SECONDS[0]).toBe(60)
    expect(RETRY_AFTER_SECONDS.at(-1)).toBe(6 * 3600)
    expect([...RETRY_AFTER_SECONDS].sort((a, b) => a - b)).toEqual(RETRY_AFTER_SECONDS)
    expect(DEAD_AFTER_HOURS).toBe(24)
  })

  it.each([
    [{ responseCode: 550, command: 'RCPT TO' }, true],
    [{ responseCode: 554, command: 'DATA' }, true],
    [{ responseCode: 451, command: 'RCPT TO' }, false],
    [{ responseCode: 421, command: 'CONN' }, false],
    [{ responseCode: 535, command: 'AUTH PLAIN' }, false],
    [{ responseCode: 550, command: 'MAIL FROM' }, false],
    [{ code: 'ETIMEDOUT' }, false],
    [undefined, false],
  ])('gives up at once only for what was refused for good: %j', (error, expected) => {
    expect(isRefusedForGood(error)).toBe(expected)
  })
})
