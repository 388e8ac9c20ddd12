import fs from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { isNewEnough } from './check-node.mjs'
import { installCommand, missingPackages } from './debian-packages.mjs'
import { findChromium, findPostgres } from './programs.mjs'

let root
beforeEach(() => (root = fs.mkdtempSync(path.join(os.tmpdir(), 'machine-'))))
afterEach(() => fs.rmSync(root, { recursive: true }))

function program(file) {
  fs.mkdirSync(path.dirname(path.join(root, file)), { recursive: true })
  fs.writeFileSync(path.join(root, file), '', { mode: 0o755 })
}
const postgres = (version, programs = ['postgres', 'initdb', 'psql']) =>
  programs.forEach((name) => program(`usr/lib/postgresql/${version}/bin/${name}`))

test('on a bare machine everything asked for is missing, and the command for it is exact', () => {
  expect(missingPackages({ postgres: true, chromium: true, root })).toEqual(['postgresql', 'chromium'])
  expect(missingPackages({ postgres: false, chromium: false, root })).toEqual([])
  expect(installCommand(['postgresql', 'chromium'])).toBe(
    'sudo apt-get update && sudo apt-get install -y postgresql chromium',
  )
})

test('the newest complete PostgreSQL is taken', () => {
  postgres(15)
  postgres(16)
  postgres(17, ['psql'])
  expect(findPostgres({ root })).toEqual({ version: 16, bin: path.join(root, 'usr/lib/postgresql/16/bin') })
  expect(findPostgres({ root, version: 15 })?.version).toBe(15)
  expect(missingPackages({ postgres: true, chromium: false, root })).toEqual([])
})

test('a PostgreSQL that is too old counts as missing', () => {
  postgres(13)
  expect(findPostgres({ root })).toBeNull()
})

test('the browser is the one given, else the one of Debian', () => {
  expect(findChromium({ root })).toBeNull()
  program('usr/bin/chromium')
  expect(findChromium({ root })).toBe(path.join(root, 'usr/bin/chromium'))
  expect(findChromium({ root, given: path.join(root, 'nowhere') })).toBeNull()
})

test.each([
  ['20.19.0', true],
  ['20.18.3', false],
  ['18.20.0', false],
  ['22.0.0', true],
])('Node.js %s is new enough: %s', (version, expected) => {
  expect(isNewEnough(version)).toBe(expected)
})
