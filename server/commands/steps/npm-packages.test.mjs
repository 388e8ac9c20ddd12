import { expect, test } from 'vitest'
import { differsFromLock } from './npm-packages.mjs'

const lock = (packages) => ({ packages: { '': { name: 'camber-and-clay', version: '0.1.0' }, ...packages } })
const vue = { version: '3.5.45', integrity: 'sha512-a' }

test('nothing differs when every wanted package is installed as wanted', () => {
  expect(differsFromLock(lock({ 'node_modules/vue': vue }), lock({ 'node_modules/vue': vue }))).toBe(false)
})

test('a package added by hand is no reason to install', () => {
  expect(differsFromLock(lock({}), lock({ 'node_modules/vue': vue }))).toBe(false)
})

test.each([
  ['nothing is installed, or an installation was interrupted', null],
  ['a package is missing', lock({})],
  ['another version is installed', lock({ 'node_modules/vue': { ...vue, version: '3.5.44' } })],
  [
    'the same version from elsewhere is installed',
    lock({ 'node_modules/vue': { ...vue, integrity: 'sha512-b' } }),
  ],
])('it differs when %s', (_, installed) => {
  expect(differsFromLock(lock({ 'node_modules/vue': vue }), installed)).toBe(true)
})

test('a package for another processor may be missing, but an installed one has to be the wanted one', () => {
  const wanted = lock({ 'node_modules/@x/arm64': { ...vue, optional: true } })
  expect(differsFromLock(wanted, lock({}))).toBe(false)
  expect(differsFromLock(wanted, lock({ 'node_modules/@x/arm64': { ...vue, version: '1.0.0' } }))).toBe(true)
})
