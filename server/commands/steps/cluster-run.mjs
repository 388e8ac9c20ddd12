export { runCluster }

import fs from 'node:fs'
import path from 'node:path'
import { exitWords, startChild, stopChild, waitUntil } from './child.mjs'
import { CommandError } from './command-error.mjs'
import { readAccess, writeAccess } from './cluster-create.mjs'
import { clearAfterCrash } from './cluster-recover.mjs'
import { databaseEnvironment } from './database-environment.mjs'
import { isPortFree, randomFreePort } from './ports.mjs'
import { line } from './progress.mjs'

// A server that fails this often in a row has a reason that another start will not cure.
const RESTARTS_PER_MINUTE = 5

/**
 * Starts PostgreSQL on loopback, keeps it running until the command ends, and stops it then.
 * @param {import('./cluster-place.mjs').ClusterPlace} place
 * @param {{ bin: string, settings: Record<string, string> }} options settings for this start only
 * @returns {Promise<{ port: number, access: object }>}
 */
async function runCluster(life, place, options) {
  const access = readAccess(place)
  let port =
    access.port !== undefined && (await isPortFree(access.port)) ? access.port : await randomFreePort()
  let server
  let isStopping = false
  life.atEnd(async () => {
    isStopping = true
    // SIGINT is PostgreSQL's fast stop: connections are closed, everything is written, nothing has to be
    // recovered.
    if (server) await stopChild(server, { signal: 'SIGINT', patience: 20_000 })
  })
  const start = async () => {
    server = launch(life, place, { ...options, port })
    await waitUntilReady(server, place)
  }

  for (let tries = 1; ; tries += 1) {
    try {
      await start()
      break
    } catch (error) {
      // Another program may have taken the port since it was looked at.
      if (life.ending || tries === 5 || (await isPortFree(port))) throw error
      port = await randomFreePort()
    }
  }
  if (port !== access.port) writeAccess(place, { ...access, port })

  void keepRunning()
  return { port, access }

  async function keepRunning() {
    let recent = []
    for (;;) {
      const end = await server.ended
      if (isStopping || life.ending) return
      recent = [...recent.filter((moment) => Date.now() - moment < 60_000), Date.now()]
      try {
        if (recent.length > RESTARTS_PER_MINUTE)
          throw new CommandError('PostgreSQL keeps stopping.', { detail: logTail(place) })
        line(`• PostgreSQL: stopped by itself (${exitWords(end)}); starting it again`)
        await clearAfterCrash(place.data)
        await start()
      } catch (error) {
        if (!life.ending) life.fail(error)
        return
      }
    }
  }
}

function launch(life, place, { bin, settings, port }) {
  const log = fs.openSync(place.log, 'a', 0o600)
  if (place.user) fs.fchownSync(log, place.user.uid, place.user.gid)
  // No socket file: its path would be too long in a deep folder, and the port with its password is enough.
  const all = { port, listen_addresses: '127.0.0.1', unix_socket_directories: '', ...settings }
  try {
    return startChild(
      life,
      path.join(bin, 'postgres'),
      ['-D', place.data, ...Object.entries(all).flatMap(([name, value]) => ['-c', `${name}=${value}`])],
      {
        ...(place.user ? { uid: place.user.uid, gid: place.user.gid } : {}),
        cwd: place.data,
        env: databaseEnvironment(),
        stdio: ['ignore', log, log],
      },
    )
  } finally {
    fs.closeSync(log)
  }
}

/**
 * PostgreSQL writes its state into line 8 of postmaster.pid; after a crash it replays its log first, which
 * may take minutes.
 */
async function waitUntilReady(server, place) {
  let end
  void server.ended.then((result) => (end = result))
  const isReady = () => {
    const [pid, , , , , , , state = ''] = readLines(path.join(place.data, 'postmaster.pid'))
    return Number(pid) === server.pid && state.trim() === 'ready'
  }
  const came = await waitUntil(() => end !== undefined || isReady(), 300_000)
  if (end === undefined && came) return
  const why = end === undefined ? 'was not ready after five minutes' : `did not start (${exitWords(end)})`
  throw new CommandError(`PostgreSQL ${why}.`, { detail: logTail(place), advice: `Its log is ${place.log}` })
}

function logTail(place) {
  return readLines(place.log).slice(-16).join('\n')
}

function readLines(file) {
  try {
    return fs.readFileSync(file, 'utf8').split('\n')
  } catch {
    return []
  }
}
