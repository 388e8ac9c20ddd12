export { identifyProcess, isStillRunning, processNumbers }

import fs from 'node:fs'
import process from 'node:process'

/**
 * A process number alone is no identity: numbers are given out again, soonest of all in a container. With the
 * moment the process began (clock ticks since boot) and the boot it belongs to, it is.
 * @typedef {{ pid: number, began: string, boot: string }} ProcessIdentity
 */

/**
 * @returns {ProcessIdentity | null} null when no such process runs (one that only waits to be reaped does not
 * run)
 */
function identifyProcess(pid) {
  try {
    const stat = fs.readFileSync(`/proc/${pid}/stat`, 'utf8')
    // The name in parentheses may hold spaces and parentheses; after the last one: state, parent, ... field
    // 22 is the start.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
    if (fields[0] === 'Z' || fields[0] === 'X') return null
    return { pid, began: fields[19], boot: bootId() }
  } catch {
    return fs.existsSync('/proc/self/stat') ? null : identifyWithoutProc(pid)
  }
}

function identifyWithoutProc(pid) {
  try {
    process.kill(pid, 0)
  } catch (error) {
    if (error.code === 'ESRCH') return null
  }
  return { pid, began: '', boot: '' }
}

/** @param {ProcessIdentity} identity */
function isStillRunning(identity) {
  const now = identifyProcess(identity.pid)
  return now !== null && now.began === identity.began && now.boot === identity.boot
}

/** Numbers of all processes that can be seen; empty where there is no /proc. */
function processNumbers() {
  try {
    return fs
      .readdirSync('/proc')
      .filter((name) => /^\d+$/.test(name))
      .map(Number)
  } catch {
    return []
  }
}

function bootId() {
  return fs.readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()
}
