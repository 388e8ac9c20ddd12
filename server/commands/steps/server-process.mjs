export { startServer, stopServer, waitUntilHealthy, addressOf }

import http from 'node:http'
import process from 'node:process'
import { exitWords, startChild, stopChild, waitUntil } from './child.mjs'
import { CommandError } from './command-error.mjs'

/** Starts server/main.ts; what it prints goes straight to the terminal. */
function startServer(life, root, env) {
  const child = startChild(life, process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    cwd: root,
    env,
    stdio: ['ignore', 'inherit', 'inherit'],
  })
  return child
}

/** The server finishes what it has begun within ten seconds; two more are for slow machines. */
function stopServer(child) {
  return stopChild(child, { signal: 'SIGTERM', patience: 12_000 })
}

/**
 * Waits until the server answers that it and its database are well.
 * @param {{ host: string, port: number }} where
 * @throws CommandError when it ends before that, or needs longer than two minutes
 */
async function waitUntilHealthy(child, where) {
  let end
  void child.ended.then((result) => (end = result))
  const healthy = await waitUntil(async () => end !== undefined || (await isHealthy(where)), 120_000)
  if (end !== undefined)
    throw new CommandError(
      `The server ended before it was ready (${exitWords(end)}); its own words are above.`,
    )
  if (!healthy) throw new CommandError('The server runs, but did not become healthy within two minutes.')
}

function isHealthy({ host, port }) {
  return new Promise((resolve) => {
    const request = http.get(
      { host: reachable(host), port, path: '/api/health', timeout: 2_000 },
      (response) => {
        response.resume()
        resolve(response.statusCode === 200)
      },
    )
    request.on('timeout', () => request.destroy())
    request.on('error', () => resolve(false))
  })
}

/**
 * The address to type into a browser; the same one that server/config.ts takes for the server's own links.
 */
function addressOf({ host, port }, origin) {
  return origin || `http://${host === '0.0.0.0' ? 'localhost' : host}:${port}`
}

function reachable(host) {
  return host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host
}
