export { stopLeftovers }

import fs from 'node:fs'
import path from 'node:path'
import process from 'node:process'
import { killQuietly, RUN_MARK, waitUntil } from './child.mjs'
import { identifyProcess, processNumbers } from './process-identity.mjs'

/**
 * Stops what still runs of a command: politely, then after five seconds by force. PostgreSQL is left to the
 * cluster's own steps, because it has to be asked in its own way.
 * @param {string} run mark of the command
 * @returns {Promise<number>} how many were found
 */
async function stopLeftovers(run) {
  const found = leftoversOf(run)
  for (const pid of found) killQuietly(pid, 'SIGTERM')
  const gone = await waitUntil(() => leftoversOf(run).length === 0, 5_000)
  if (!gone) for (const pid of leftoversOf(run)) killQuietly(pid, 'SIGKILL')
  return found.length
}

function leftoversOf(run) {
  return processNumbers().filter((pid) => pid !== process.pid && carriesMark(pid, run) && !isPostgres(pid))
}

function carriesMark(pid, run) {
  try {
    const environment = fs.readFileSync(`/proc/${pid}/environ`, 'latin1').split('\0')
    return environment.includes(`${RUN_MARK}=${run}`) && identifyProcess(pid) !== null
  } catch {
    return false
  }
}

function isPostgres(pid) {
  try {
    return path.basename(fs.readlinkSync(`/proc/${pid}/exe`)) === 'postgres'
  } catch {
    return false
  }
}
