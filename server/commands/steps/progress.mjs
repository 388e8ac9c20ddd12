export { step, done, line, sayError }

import process from 'node:process'
import { CommandError } from './command-error.mjs'

// A reader who closes the pipe (`npm start | head`) must not end the command half-way through its clean-up.
process.stdout.on('error', () => {})
process.stderr.on('error', () => {})

let lineIsOpen = false

/** Prints one whole line, after closing a progress line that is still open. */
function line(text = '') {
  process.stdout.write(`${lineIsOpen ? '\n' : ''}${text}\n`)
  lineIsOpen = false
}

/** Prints a step that took no time: `• npm packages: up to date`. */
function done(name, outcome) {
  line(`• ${name}: ${outcome}`)
}

/**
 * Prints `• name: doing ... ` before the work and its outcome and seconds after it.
 * @template T
 * @param {string} name
 * @param {string} doing
 * @param {() => Promise<T>} work
 * @param {(result: T) => string} [outcome] words for the end of the line
 * @returns {Promise<T>}
 */
async function step(name, doing, work, outcome = () => 'done') {
  if (lineIsOpen) line()
  process.stdout.write(`• ${name}: ${doing} ... `)
  lineIsOpen = true
  const began = Date.now()
  try {
    const result = await work()
    const seconds = ((Date.now() - began) / 1000).toFixed(1)
    if (lineIsOpen) process.stdout.write(`${outcome(result)} (${seconds} s)\n`)
    else line(`• ${name}: ${outcome(result)} (${seconds} s)`)
    lineIsOpen = false
    return result
  } catch (error) {
    if (lineIsOpen) process.stdout.write('failed\n')
    lineIsOpen = false
    throw error
  }
}

/**
 * Prints an error for a person: a CommandError in words, anything else with its stack, because it is our bug.
 */
function sayError(error) {
  if (lineIsOpen) line()
  if (!(error instanceof CommandError)) {
    process.stderr.write(
      `\nThis should not happen; please report it with these lines:\n${error?.stack ?? error}\n`,
    )
    return
  }
  const parts = [error.detail && indent(error.detail), error.message, error.advice].filter(
    (part) => part !== '',
  )
  process.stderr.write(`\n${parts.join('\n')}\n`)
}

function indent(text) {
  return text
    .trimEnd()
    .split('\n')
    .map((row) => `    ${row}`)
    .join('\n')
}
