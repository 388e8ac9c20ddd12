import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { fingerprint } from './build-pages.mjs'

let root
beforeEach(() => {
  root = fs.mkdtempSync(path.join(os.tmpdir(), 'build-'))
  write('pages/index/+Page.vue', 'a page')
  write('server/guides/service.ts', 'a service')
  write('package-lock.json', '{}')
})
afterEach(() => fs.rmSync(root, { recursive: true }))

function write(file, content) {
  fs.mkdirSync(path.dirname(path.join(root, file)), { recursive: true })
  fs.writeFileSync(path.join(root, file), content)
}

test('the fingerprint depends on content, not on times', () => {
  const before = fingerprint(root)
  write('pages/index/+Page.vue', 'a page')
  fs.utimesSync(path.join(root, 'pages/index/+Page.vue'), 0, 0)
  expect(fingerprint(root)).toBe(before)
})

test.each([
  ['a changed page', () => write('pages/index/+Page.vue', 'another page')],
  ['a changed service behind a page', () => write('server/guides/service.ts', 'another')],
  ['another set of packages', () => write('package-lock.json', '{"x":1}')],
  ['a new file', () => write('shared/units/length.ts', 'mm')],
  ['a removed file', () => fs.rmSync(path.join(root, 'server/guides/service.ts'))],
  [
    'a renamed file',
    () =>
      fs.renameSync(
        path.join(root, 'server/guides/service.ts'),
        path.join(root, 'server/guides/services.ts'),
      ),
  ],
])('%s makes the build stale', (_, change) => {
  const before = fingerprint(root)
  change()
  expect(fingerprint(root)).not.toBe(before)
})

test('tests and these commands are no part of the build', () => {
  const before = fingerprint(root)
  write('server/guides/service.test.ts', 'a test')
  write('server/commands/start.mjs', 'a command')
  expect(fingerprint(root)).toBe(before)
})
