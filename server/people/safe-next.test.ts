import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { safeNext } from './safe-next.ts'

describe('safeNext', () => {
  it.each([
    ['/', '/'],
    ['/you', '/you'],
    ['/guides/front-diff-fluid?edition=3#effects', '/guides/front-diff-fluid?edition=3#effects'],
    ['/edits/7f0c?said=saved', '/edits/7f0c?said=saved'],
    ['/a/../b', '/b'],
    ['/search?q=http://else.example', '/search?q=http://else.example'],
    ['/caf%C3%A9', '/caf%C3%A9'],
  ])('keeps a path of this site: %j', (next, expected) => {
    expect(safeNext(next)).toBe(expected)
  })

  it.each([
    '', 'you', 'https://else.example', 'http:else.example', 'http:/else.example', '//else.example', '///else.example', '////else.example',
    '/\\else.example', '\\/else.example', '\\\\else.example', '/\\/else.example', '/\t/else.example', '/\n/else.example', '/\r/else.example',
    '\t//else.example', ' //else.example', ' /you', '/\u0000/else.example', 'javascript:alert(1)', 'java\nscript:alert(1)', 'data:text/html,x',
    'mailto:a@b.example', '/%2f/else.example', '/%2Felse.example', '/%5celse.example', '/%5Celse.example', '/%09/else.example',
    '/%0a/else.example', '%2f%2felse.example', '/./ /else.example', '/.//else.example', '/..//else.example', '/x/..//else.example',
    '/./%2felse.example', '/you\r\nSet-Cookie: a=b', '/you%0d%0aSet-Cookie: a=b', '//else.example/%2f..', '/／else.example', '/@else.example\u2028',
    '@else.example', '?next=//else.example', '#x', '/'.padEnd(501, 'a'),
  ])('falls back for %j', (next) => {
    expect(safeNext(next)).toBe('/')
  })

  it.each([undefined, null, 3, ['/you', '//else.example'], { toString: () => '/you' }])('falls back for what is no text: %j', (next) => {
    expect(safeNext(next)).toBe('/')
  })

  it('never leaves the origin, whatever it is given', () => {
    const parts = fc.constantFrom('/', '\\', '%2f', '%5c', '\t', '\n', '\r', '.', '..', ':', '@', 'else.example', 'http', '?', '#', ' ', 'a', '\u0000')
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.array(parts, { maxLength: 12 }).map((list) => list.join(''))), (next) => {
        const origin = 'https://book.example'
        const went = new URL(safeNext(next), origin)
        expect(went.origin).toBe(origin)
        // The same once more after one decoding too many.
        expect(safeNext(next)).not.toMatch(/^\/(?:[/\\]|%2f|%5c)/i)
      }),
      { numRuns: 2_000 },
    )
  })
})
