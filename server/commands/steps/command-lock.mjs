export { beAlone, oneSetUpAtATime }

import path from 'node:path'
import { CommandError } from './command-error.mjs'
import { stopLeftovers } from './leftovers.mjs'
import { takeLock, waitForLock } from './lock.mjs'
import { line } from './progress.mjs'

/**
 * Sees to it that this kind of command runs once in a clone, and ends what a killed one has left running.
 * @param {string} localFolder
 * @param {{ kind: string, command: string }} options kind: "start" or "test"; command: as typed
 * @returns {(facts: { address: string }) => void} tells a second command where the first can be reached
 */
async function beAlone(life, localFolder, { kind, command }) {
  const lock = takeLock(path.join(localFolder, `${kind}.lock`), { command, run: life.run })
  if (lock.state === 'held') {
    const { holder } = lock
    const where = holder.address ? ` at ${holder.address}` : ''
    throw new CommandError(
      `\`${holder.command}\` already runs in this folder${where} (process ${holder.pid}).`,
      {
        advice: `${kind === 'test' ? 'Wait for it' : 'Use that one'}, or stop it first (Ctrl-C in its terminal).`,
      },
    )
  }
  life.atEnd(lock.release)
  if (lock.previous?.run) {
    const stopped = await stopLeftovers(lock.previous.run)
    const also = stopped > 0 ? `; ${stopped} of its processes still ran and were stopped` : ''
    line(`• The last \`${lock.previous.command}\` was killed before it could clean up${also}`)
  }
  return lock.note
}

/** Does work that `npm start` and `npm test` must not do in the same clone at the same moment. */
async function oneSetUpAtATime(life, localFolder, work) {
  const lock = await waitForLock(path.join(localFolder, 'set-up.lock'), {}, (holder) =>
    line(`• Waiting for another command that sets this folder up (process ${holder.pid})`),
  )
  const forget = life.atEnd(lock.release)
  await work()
  lock.release()
  forget()
}
