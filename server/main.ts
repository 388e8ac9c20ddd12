import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { createApp } from './app.ts'
import { ConfigError, readConfig } from './config.ts'
import { renewRenderings } from './guides/index.ts'
import { describeDemoSignIns, ensureDemoSignIns } from './people/index.ts'

// Longest time to finish what is under way after Ctrl-C; a slow client is cut then.
const GRACE_MS = 8_000

async function main(): Promise<void> {
  const config = readConfig(process.env)
  const running = await createApp(config)
  if (!config.production) await ensureDemoSignIns(running.app)
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 10_000 }, running.express)
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(config.port, config.host, resolve)
  })
  const { port } = server.address() as AddressInfo
  process.stdout.write(`Camber & Clay listens on http://${config.host}:${port}\n`)
  if (!config.production) process.stdout.write(`${describeDemoSignIns()}\n`)

  // Guides that an older renderer made are readable as they are; they are renewed beside the reading.
  renewRenderings(running.app).catch((error: unknown) => running.app.log.error({ err: error }, 'renewing stopped'))

  let stopping = false
  const stop = (): void => {
    if (stopping) return
    stopping = true
    const cut = setTimeout(() => server.closeAllConnections(), GRACE_MS)
    server.close(() => {
      clearTimeout(cut)
      running.close().then(
        () => process.exit(0),
        () => process.exit(1),
      )
    })
    server.closeIdleConnections()
  }
  process.once('SIGTERM', stop)
  process.once('SIGINT', stop)
}

main().catch((error: unknown) => {
  process.stderr.write(error instanceof ConfigError ? `${error.message}\n` : `${String((error as Error).stack ?? error)}\n`)
  process.exit(1)
})
