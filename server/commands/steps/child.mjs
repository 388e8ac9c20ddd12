export { RUN_MARK, startChild, stopChild, runToEnd, killQuietly, waitUntil, exitWords }

import { spawn } from 'node:child_process'
import process from 'node:process'
import { setTimeout as pause } from 'node:timers/promises'
import { CommandError } from './command-error.mjs'

/**
 * Environment variable by which every process of one command can be found again, even after its parent is
 * gone.
 */
const RUN_MARK = 'CAMBER_CLAY_RUN'

/**
 * Starts a process of this command in a process group of its own, so that Ctrl-C in the terminal reaches only
 * the command, which then stops its parts in the right order.
 * @param {import('./lifetime.mjs').Lifetime} life
 * @param {string} program
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions} options
 * @returns {import('node:child_process').ChildProcess & { ended: Promise<{ code: number | null, signal:
 *   string | null }> }}
 */
function startChild(life, program, args, options) {
  life.assertNotEnding()
  const env = { ...(options.env ?? process.env), [RUN_MARK]: life.run }
  const child = spawn(program, args, { ...options, env, detached: true })
  child.ended = new Promise((resolve) => {
    child.once('error', (error) => resolve({ code: 127, signal: null, error }))
    child.once('close', (code, signal) => resolve({ code, signal }))
    // A daemon that inherited the pipes would keep them open for ever; what was printed until now is enough
    // then.
    child.once(
      'exit',
      (code, signal) => void pause(1_000, undefined, { ref: false }).then(() => resolve({ code, signal })),
    )
  })
  return child
}

/**
 * Asks a process to end, waits, and then clears away its whole group by force.
 * @param {{ signal?: NodeJS.Signals, patience?: number }} [options] patience in milliseconds
 */
async function stopChild(child, { signal = 'SIGTERM', patience = 10_000 } = {}) {
  if (child.pid === undefined) return
  if (child.exitCode === null && child.signalCode === null) killQuietly(child.pid, signal)
  await Promise.race([child.ended, pause(patience, undefined, { ref: false })])
  killQuietly(-child.pid, 'SIGKILL')
  // What sudo started belongs to root: it cannot be ended from here, and must not be waited for endlessly.
  await Promise.race([child.ended, pause(2_000, undefined, { ref: false })])
}

/**
 * Runs a program to its end without letting it ask anything, and keeps what it prints.
 * @returns {Promise<string>} what it printed on standard output
 * @throws CommandError with `failure` as its message and the end of the output as its detail
 */
async function runToEnd(life, program, args, { failure, advice, input, ...options }) {
  const child = startChild(life, program, args, {
    ...options,
    stdio: [input ? 'pipe' : 'ignore', 'pipe', 'pipe'],
  })
  const forget = life.atEnd(() => stopChild(child))
  let output = ''
  let everything = ''
  child.stdout.setEncoding('utf8').on('data', (text) => {
    output += text
    everything += text
  })
  child.stderr.setEncoding('utf8').on('data', (text) => (everything += text))
  // A program that ends before it has read its input is reported by its exit code.
  child.stdin?.on('error', () => {})
  child.stdin?.end(input)
  const end = await child.ended
  forget()
  if (end.code !== 0) {
    const words = end.error ? String(end.error.message) : lastLines(everything, 40)
    throw new CommandError(`${failure} (${exitWords(end)}).`, { advice, detail: words })
  }
  return output
}

/** Sends a signal to a process (or, negative, to a group) that may be gone already. */
function killQuietly(pid, signal) {
  try {
    process.kill(pid, signal)
  } catch (error) {
    if (error.code !== 'ESRCH' && error.code !== 'EPERM') throw error
  }
}

/**
 * Waits until `condition` holds, looking every 50 ms; false when it did not within `patience` milliseconds.
 */
async function waitUntil(condition, patience) {
  const deadline = Date.now() + patience
  while (!(await condition())) {
    if (Date.now() > deadline) return false
    await pause(50)
  }
  return true
}

function exitWords({ code, signal }) {
  return signal ? `ended by ${signal}` : `exit code ${code}`
}

function lastLines(text, count) {
  return text.trimEnd().split('\n').slice(-count).join('\n')
}
