import { brotliDecompressSync, gunzipSync } from 'node:zlib'
import { describe, expect, it } from 'vitest'
import { createPageCache } from './page-cache.ts'

const page = (html: string) => ({ contentType: 'text/html; charset=utf-8', html })

describe('the page cache', () => {
  it('keeps the same page in three encodings', async () => {
    const cache = createPageCache(1_000_000)
    await cache.put('a', cache.generation(), page('<p>words</p>'))
    const kept = cache.get('a')!
    expect(kept.identity.toString()).toBe('<p>words</p>')
    expect(gunzipSync(kept.gzip).toString()).toBe('<p>words</p>')
    expect(brotliDecompressSync(kept.brotli).toString()).toBe('<p>words</p>')
  })

  it('does not keep a page that was rendered before the last emptying', async () => {
    const cache = createPageCache(1_000_000)
    const before = cache.generation()
    cache.clear()
    await cache.put('a', before, page('old news'))
    expect(cache.get('a')).toBeUndefined()
  })

  it('stays within its bytes and lets the longest unused go first', async () => {
    const cache = createPageCache(3_000)
    const put = (key: string) => cache.put(key, cache.generation(), page(key.repeat(1_000)))
    await put('a')
    await put('b')
    cache.get('a')
    await put('c')
    expect(cache.bytes()).toBeLessThanOrEqual(3_000)
    expect(cache.get('b')).toBeUndefined()
    expect(cache.get('a')).toBeDefined()
  })

  it('answers nothing while news of publishing cannot be heard', async () => {
    const cache = createPageCache(1_000_000)
    await cache.put('a', cache.generation(), page('words'))
    cache.pause()
    expect(cache.get('a')).toBeUndefined()
    await cache.put('a', cache.generation(), page('words'))
    cache.resume()
    expect(cache.get('a')).toBeUndefined()
  })
})
