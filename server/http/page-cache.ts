export { createPageCache }
export type { CachedPage, PageCache }

import { createHash } from 'node:crypto'
import { promisify } from 'node:util'
import { brotliCompress, constants, gzip } from 'node:zlib'

const compressBrotli = promisify(brotliCompress)
const compressGzip = promisify(gzip)

interface CachedPage {
  /** Of the page's bytes before compression. */
  hash: string
  contentType: string
  identity: Buffer
  gzip: Buffer
  brotli: Buffer
}

interface PageCache {
  get(key: string): CachedPage | undefined
  /**
   * Keeps a rendered page.
   * @param generation what `generation()` said before the page was rendered; a page rendered before the last emptying
   *   may be out of date and is not kept
   */
  put(key: string, generation: number, page: { contentType: string; html: string }): Promise<CachedPage>
  generation(): number
  /** Forgets everything: an edition was published. */
  clear(): void
  /** Stops answering from memory while news of publishing cannot be heard; `resume` begins afresh. */
  pause(): void
  resume(): void
  bytes(): number
}

/** Rendered pages for visitors, ready as bytes in three encodings, bounded in bytes; the longest unused goes first. */
function createPageCache(maxBytes: number): PageCache {
  const pages = new Map<string, CachedPage>()
  let total = 0
  let current = 0
  let paused = false

  const sizeOf = (page: CachedPage) => page.identity.length + page.gzip.length + page.brotli.length

  function clear(): void {
    pages.clear()
    total = 0
    current += 1
  }

  function forget(key: string): void {
    const page = pages.get(key)
    if (page === undefined) return
    pages.delete(key)
    total -= sizeOf(page)
  }

  return {
    get(key) {
      const page = pages.get(key)
      if (page === undefined || paused) return undefined
      pages.delete(key)
      pages.set(key, page)
      return page
    },
    async put(key, generation, { contentType, html }) {
      const identity = Buffer.from(html)
      const [zipped, brotli] = await Promise.all([
        compressGzip(identity, { level: 6 }),
        compressBrotli(identity, { params: { [constants.BROTLI_PARAM_QUALITY]: 6 } }),
      ])
      const hash = createHash('sha256').update(identity).digest('base64url').slice(0, 27)
      const page = { hash, contentType, identity, gzip: zipped, brotli }
      if (generation === current && !paused && sizeOf(page) <= maxBytes) {
        forget(key)
        pages.set(key, page)
        total += sizeOf(page)
        for (const oldest of pages.keys()) {
          if (total <= maxBytes) break
          forget(oldest)
        }
      }
      return page
    },
    generation: () => current,
    clear,
    pause() {
      paused = true
      clear()
    },
    resume() {
      clear()
      paused = false
    },
    bytes: () => total,
  }
}
