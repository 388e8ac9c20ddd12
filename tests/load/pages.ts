import autocannon from 'autocannon'
import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { startServerProcess } from '../support/server-process.ts'

/**
 * `npm run bench:pages`: requests per second of a guide page, from memory and rendered anew, beside a bare node:http server that
 * sends the same bytes, measured in the same run on the same machine. Ratios travel; absolute numbers do not.
 * Needs DATABASE_URL of a seeded database and a build. Loopback only, bounded in time.
 */
const SECONDS = 8
const CONNECTIONS = 32
const path = '/guides/rear-toe'

const databaseUrl = process.env.DATABASE_URL
if (databaseUrl === undefined) throw new Error('DATABASE_URL: name a seeded database')

const cached = await startServerProcess(databaseUrl)
const html = await (await fetch(cached.url + path)).text()
const bare = createServer((_req, res) => res.setHeader('Content-Type', 'text/html; charset=utf-8').end(html))
await new Promise<void>((resolve) => bare.listen(0, '127.0.0.1', resolve))
await report('bare node:http, same bytes', `http://127.0.0.1:${(bare.address() as AddressInfo).port}/`)
bare.close()
await report('guide from memory', cached.url + path)
await report('guide from memory, 304', cached.url + path, { 'If-None-Match': (await fetch(cached.url + path)).headers.get('etag') ?? '' })
await report('guide rendered anew', `${cached.url}${path}?ground=loose`)
await report('GET /api/guides/:slug', `${cached.url}/api${path}`)
await cached.stop()

async function report(name: string, url: string, headers: Record<string, string> = {}): Promise<void> {
  await autocannon({ url, headers, connections: CONNECTIONS, duration: 2 })
  const { requests, latency, non2xx, errors } = await autocannon({ url, headers, connections: CONNECTIONS, duration: SECONDS })
  const failed = headers['If-None-Match'] === undefined ? non2xx + errors : errors
  console.log(
    `${name.padEnd(30)}${requests.average.toFixed(0).padStart(8)} req/s   p50 ${latency.p50} ms   p99 ${latency.p99} ms   failed ${failed}`,
  )
}
