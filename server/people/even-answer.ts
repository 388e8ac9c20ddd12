export { evenAnswer }

import { setTimeout as wait } from 'node:timers/promises'

/**
 * Answers no sooner than `milliseconds` after the question, also when the work fails. Joining and asking for a mail do
 * more for a known address than for an unknown one; whoever measures the time must not learn which it was. Pick more
 * than the longer of both ways takes.
 */
async function evenAnswer<T>(milliseconds: number, work: () => Promise<T>): Promise<T> {
  const until = performance.now() + milliseconds
  try {
    return await work()
  } finally {
    const left = until - performance.now()
    if (left > 0) await wait(left)
  }
}
