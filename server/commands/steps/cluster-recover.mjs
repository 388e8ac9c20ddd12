export { clearAfterCrash }

import fs from 'node:fs'
import path from 'node:path'
import { killQuietly, waitUntil } from './child.mjs'
import { CommandError } from './command-error.mjs'
import { identifyProcess, processNumbers } from './process-identity.mjs'

/**
 * Puts a data folder into a state from which PostgreSQL can start: ends the processes that an earlier, killed
 * command left running on it, and removes a `postmaster.pid` that nobody owns any more. That file must never
 * be removed while one of the cluster's processes lives (two servers on one folder destroy it), so they are
 * looked for by the folder they work in, which is the data folder for every one of them.
 * @param {string} data
 * @returns {Promise<boolean>} whether there was something to clear
 */
async function clearAfterCrash(data) {
  const pidFile = path.join(data, 'postmaster.pid')
  const found = fs.existsSync(pidFile) || processesOf(data).length > 0
  if (!found || processNumbers().length === 0) return found
  const leader = readLeader(pidFile)
  // SIGINT to the first process is PostgreSQL's fast stop, SIGQUIT its emergency stop; force comes last.
  for (const [signal, patience] of [
    ['SIGINT', 15_000],
    ['SIGQUIT', 5_000],
    ['SIGKILL', 5_000],
  ]) {
    const alive = processesOf(data)
    if (alive.length === 0) break
    const asked = signal === 'SIGINT' && alive.includes(leader) ? [leader] : alive
    for (const pid of asked) killQuietly(pid, signal)
    await waitUntil(() => processesOf(data).length === 0, patience)
  }
  if (processesOf(data).length > 0) {
    throw new CommandError(`PostgreSQL from an earlier run still works in ${data} and does not end.`, {
      advice: `End these processes, then run the command again: ${processesOf(data).join(' ')}`,
    })
  }
  fs.rmSync(pidFile, { force: true })
  return true
}

function readLeader(pidFile) {
  try {
    return Number(fs.readFileSync(pidFile, 'utf8').split('\n')[0])
  } catch {
    return undefined
  }
}

function processesOf(data) {
  return processNumbers().filter((pid) => {
    try {
      const isPostgres = path.basename(fs.readlinkSync(`/proc/${pid}/exe`)).startsWith('postgres')
      return (
        isPostgres &&
        fs.readlinkSync(`/proc/${pid}/cwd`) === fs.realpathSync(data) &&
        identifyProcess(pid) !== null
      )
    } catch {
      return false
    }
  })
}
