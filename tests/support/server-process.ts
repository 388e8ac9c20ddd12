export { startServerProcess }
export type { ServerProcess }

import { spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { fileURLToPath } from 'node:url'

interface ServerProcess {
  url: string
  /** kill -9: nothing is finished, nothing is cleaned up. */
  kill(): Promise<void>
  /** As Ctrl-C does. @returns the exit code */
  stop(): Promise<number | null>
}

const root = fileURLToPath(new URL('../..', import.meta.url))

/** Starts the real server as a process of its own, as `npm start` does, on a free port. */
async function startServerProcess(databaseUrl: string, environment: Record<string, string> = {}): Promise<ServerProcess> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    cwd: root,
    env: {
      PATH: process.env.PATH,
      HOME: process.env.HOME,
      NODE_ENV: 'production',
      DATABASE_URL: databaseUrl,
      PORT: '0',
      LOG_LEVEL: 'error',
      RENDER_TIMEOUT_MS: '20000',
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  const url = await listeningAddress(child)
  const exited = once(child, 'exit')
  return {
    url,
    async kill() {
      child.kill('SIGKILL')
      await exited
    },
    async stop() {
      child.kill('SIGTERM')
      const [code] = (await exited) as [number | null]
      return code
    },
  }
}

function listeningAddress(child: ChildProcess): Promise<string> {
  return new Promise((resolve, reject) => {
    let output = ''
    const read = (chunk: Buffer): void => {
      output += chunk.toString()
      const address = /listens on (http:\/\/\S+)/.exec(output)?.[1]
      if (address !== undefined) resolve(address)
    }
    child.stdout!.on('data', read)
    child.stderr!.on('data', read)
    child.once('exit', (code) => reject(new Error(`The server ended with ${code} before it listened:\n${output}`)))
  })
}
