export { runCommand }

import { randomBytes } from 'node:crypto'
import os from 'node:os'
import process from 'node:process'
import { CommandError } from './command-error.mjs'
import { stopLeftovers } from './leftovers.mjs'
import { line, sayError } from './progress.mjs'

/**
 * @typedef {object} Lifetime
 * @property {string} run mark that every process of this command carries in its environment
 * @property {boolean} ending
 * @property {number | undefined} exitCodeOnSignal undefined: 128 + number of the signal, as shells do
 * @property {(undo: () => unknown) => () => void} atEnd adds a thing to undo, newest first; returns how to
 *   forget it
 * @property {() => void} assertNotEnding
 * @property {(error: unknown) => void} fail ends the command with this error from outside its main flow
 */

/**
 * Runs a command so that whatever ends it (its own end, an error, Ctrl-C, kill, a closed terminal) undoes
 * everything exactly once before the process exits.
 * @param {(life: Lifetime) => Promise<number>} main returns the exit code
 * @param {{ lastWords?: () => void }} [options] lastWords: printed after everything else
 */
async function runCommand(main, { lastWords = () => {} } = {}) {
  const undo = new Set()
  let ended
  const life = {
    run: randomBytes(12).toString('hex'),
    ending: false,
    exitCodeOnSignal: undefined,
    atEnd(action) {
      undo.add(action)
      return () => undo.delete(action)
    },
    assertNotEnding() {
      if (life.ending) throw new CommandError('Stopped.')
    },
    fail: (error) => void endWith(error?.exitCode ?? 1, () => sayError(error)),
  }

  async function undoAll() {
    for (const action of [...undo].reverse()) {
      try {
        await action()
      } catch (error) {
        sayError(error)
      }
    }
    await stopLeftovers(life.run)
  }

  /**
   * The first caller decides how the command ends; later ones (npm passes Ctrl-C on a second time) change
   * nothing.
   */
  function endWith(exitCode, explain) {
    ended ??= (async () => {
      life.ending = true
      explain()
      await undoAll()
      lastWords()
      process.exit(exitCode)
    })()
    return ended
  }

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      const exitCode = life.exitCodeOnSignal ?? 128 + os.constants.signals[signal]
      void endWith(exitCode, () => line('Stopping ...'))
    })
  }
  stopWithNpm(() => void endWith(life.exitCodeOnSignal ?? 1, () => line('Stopping ...')))
  process.on('uncaughtException', life.fail)
  process.on('unhandledRejection', life.fail)

  try {
    const exitCode = await main(life)
    await endWith(exitCode, () => {})
  } catch (error) {
    await endWith(error?.exitCode ?? 1, () => sayError(error))
  }
}

/**
 * npm passes signals to the shell between it and this process, which ends without passing them on, and
 * SIGKILL is passed on by nobody. In both cases this process finds itself with another parent.
 */
function stopWithNpm(stop) {
  if (process.env.npm_lifecycle_event === undefined) return
  const parent = process.ppid
  setInterval(() => process.ppid !== parent && stop(), 500).unref()
}
