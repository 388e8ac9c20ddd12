export { findPostgres, findChromium, OLDEST_POSTGRES }

import fs from 'node:fs'
import path from 'node:path'

const OLDEST_POSTGRES = 15

/**
 * PostgreSQL's server programs. Debian keeps them out of PATH, one folder a version.
 * @param {{ root?: string, version?: number }} [options] version: take only this one (a cluster is bound to
 *   its own)
 * @returns {{ version: number, bin: string } | null} the newest that is complete
 */
function findPostgres({ root = '/', version } = {}) {
  const versions = path.join(root, 'usr/lib/postgresql')
  const found = listFolder(versions)
    .map(Number)
    .filter((number) => number >= OLDEST_POSTGRES && (version === undefined || number === version))
    .map((number) => ({ version: number, bin: path.join(versions, String(number), 'bin') }))
    .filter(({ bin }) => ['postgres', 'initdb', 'psql'].every((name) => isProgram(path.join(bin, name))))
  return found.sort((a, b) => b.version - a.version)[0] ?? null
}

/**
 * The browser for the tests.
 * @param {{ root?: string, given?: string }} [options] given: CHROMIUM_PATH; else it is where Debian puts it
 * @returns {string | null}
 */
function findChromium({ root = '/', given } = {}) {
  if (given) return isProgram(given) ? given : null
  const chromium = path.join(root, 'usr/bin/chromium')
  return isProgram(chromium) ? chromium : null
}

function listFolder(folder) {
  try {
    return fs.readdirSync(folder)
  } catch {
    return []
  }
}

function isProgram(file) {
  try {
    fs.accessSync(file, fs.constants.X_OK)
    return true
  } catch {
    return false
  }
}
