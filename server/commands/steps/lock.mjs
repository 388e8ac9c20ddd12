export { takeLock, waitForLock }

import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { waitUntil } from './child.mjs'
import { identifyProcess, isStillRunning } from './process-identity.mjs'

/**
 * @typedef {object} Taken
 * @property {'taken'} state
 * @property {object | null} previous what the last holder wrote, when it ended without releasing (a crash,
 *   kill -9)
 * @property {(facts: object) => void} note adds facts to what others can read in the lock
 * @property {() => void} release
 */

/**
 * Takes a lock file that names its holder by process number and start time, so that one left behind by a
 * crash is recognised as such. The file appears with its content in one step (a hard link), never
 * half-written.
 * @param {string} file
 * @param {object} facts what to tell others, such as the command's name
 * @returns {Taken | { state: 'held', holder: object }}
 */
function takeLock(file, facts = {}) {
  let mine = { ...identifyProcess(process.pid), ...facts }
  let previous = null
  for (;;) {
    if (publish(file, mine)) {
      return {
        state: 'taken',
        previous,
        note(more) {
          mine = { ...mine, ...more }
          fs.renameSync(writeBeside(file, mine), file)
        },
        release: () => fs.rmSync(file, { force: true }),
      }
    }
    const holder = readLock(file)
    if (holder !== null && isStillRunning(holder)) return { state: 'held', holder }
    previous = holder ?? previous
    setAside(file, holder)
  }
}

/**
 * Takes the lock as soon as its holder is done with it.
 * @param {(holder: object) => void} onWait called once, when there is something to wait for
 */
async function waitForLock(file, facts, onWait) {
  let taken = takeLock(file, facts)
  if (taken.state === 'held') {
    onWait(taken.holder)
    await waitUntil(() => {
      taken = takeLock(file, facts)
      return taken.state === 'taken'
    }, Infinity)
  }
  return taken
}

function publish(file, content) {
  const draft = writeBeside(file, content)
  try {
    fs.linkSync(draft, file)
    return true
  } catch (error) {
    if (error.code === 'EEXIST') return false
    throw error
  } finally {
    fs.rmSync(draft, { force: true })
  }
}

/**
 * Moves a dead holder's lock out of the way; puts it back if another command took the lock in that very
 * moment.
 */
function setAside(file, dead) {
  const aside = `${file}.${process.pid}.aside`
  try {
    fs.renameSync(file, aside)
  } catch (error) {
    if (error.code === 'ENOENT') return
    throw error
  }
  const moved = readLock(aside)
  if (moved !== null && JSON.stringify(moved) !== JSON.stringify(dead)) publish(file, moved)
  fs.rmSync(aside, { force: true })
}

function writeBeside(file, content) {
  const draft = path.join(path.dirname(file), `.${path.basename(file)}.${process.pid}`)
  fs.writeFileSync(draft, JSON.stringify(content))
  return draft
}

function readLock(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'))
  } catch {
    return null
  }
}
